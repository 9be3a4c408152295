import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The top folder of the repository, absolute. */
export const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..', '..');

/**
 * @param {...string} parts path below the top folder
 * @returns {string}
 */
export const fromRoot = (...parts) => join(root, ...parts);

/** Everything the scripts remember between two runs lies here and may be deleted at any time. */
export const cacheFolder = fromRoot('.cache');
