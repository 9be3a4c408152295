import { createHash } from 'node:crypto';
import { mkdirSync, readFileSync, readdirSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';

const passedOver = new Set(['node_modules', 'dist', '.data', '.cache', '.git']);

/**
 * @param {string} path a file or a folder; a missing one counts as empty
 * @returns {string[]} absolute paths of all files below, sorted
 */
export const filesBelow = (path) => {
  const stats = statSync(path, { throwIfNoEntry: false });
  if (stats === undefined) return [];
  if (stats.isFile()) return [path];
  return readdirSync(path, { withFileTypes: true })
    .filter((entry) => !passedOver.has(entry.name) && !entry.name.endsWith('.tsbuildinfo'))
    .flatMap((entry) => filesBelow(join(path, entry.name)))
    .sort();
};

/**
 * One SHA-256 over names and contents: a checkout that only touches times changes nothing.
 * @param {string} base folder that the names are taken from
 * @param {string[]} paths files and folders, absolute
 * @param {string[]} [extra] other words the result depends on
 * @returns {string}
 */
export const fingerprint = (base, paths, extra = []) => {
  const hash = createHash('sha256');
  for (const word of extra) hash.update(`${word}\0`);
  for (const file of paths.flatMap(filesBelow)) {
    hash.update(`${relative(base, file)}\0`);
    hash.update(createHash('sha256').update(readFileSync(file)).digest());
  }
  return hash.digest('hex');
};

/**
 * @param {string} file
 * @returns {string | undefined} what was remembered there
 */
export const readStamp = (file) => {
  try {
    return readFileSync(file, 'utf8').trim();
  } catch {
    return undefined;
  }
};

/**
 * @param {string} file
 * @param {string} value
 */
export const writeStamp = (file, value) => {
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, `${value}\n`);
};
