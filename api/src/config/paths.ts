import { fileURLToPath } from 'node:url';

/** Absolute path of something in the repository; works from the sources and from the build alike. */
export function inRepository(relative: string): string {
  return fileURLToPath(new URL(`../../../${relative}`, import.meta.url));
}
