import { existsSync, readFileSync, statSync } from 'node:fs';
import { isBuiltin } from 'node:module';
import { dirname, resolve as resolvePath } from 'node:path';
import { fromRoot } from '../house/paths.mjs';

/** Our own packages by name, and the file that each one's bare name stands for. */
const ownPackages = {
  '@merestone/engine': { folder: fromRoot('packages', 'engine'), entry: 'src/index.ts' },
  '@merestone/api-client': { folder: fromRoot('packages', 'api-client'), entry: 'src/index.ts' },
  '@merestone/workshop': { folder: fromRoot('packages', 'workshop'), entry: 'package.json' },
  '@merestone/api': { folder: fromRoot('api'), entry: 'src/main.ts' },
  '@merestone/web': { folder: fromRoot('web'), entry: 'src/main.tsx' },
};

const isFile = (/** @type {string} */ path) => statSync(path, { throwIfNoEntry: false })?.isFile() ?? false;

/**
 * @param {string} path absolute, as an import writes it: `./x.js` may mean x.ts, `./x` may mean x.tsx or x/index.ts
 * @returns {string} the source file; where there is none yet, the name it would have
 */
const sourceFileOf = (path) => {
  const bare = path.replace(/\.(js|jsx)$/, '');
  const candidates = [
    `${bare}.ts`,
    `${bare}.tsx`,
    path,
    `${bare}.d.ts`,
    `${path}/index.ts`,
    `${path}/index.tsx`,
  ];
  return candidates.find(isFile) ?? (/\.(ts|tsx|mjs|cjs|json|css|svg)$/.test(path) ? path : `${bare}.ts`);
};

/**
 * @param {string} folder of one of our packages
 * @param {string} subpath after the name, such as `./browser`
 * @returns {string}
 */
const exportedFile = (folder, subpath) => {
  const manifest = resolvePath(folder, 'package.json');
  if (existsSync(manifest)) {
    /** @type {{ exports?: Record<string, string | Record<string, string>> }} */
    const { exports = {} } = JSON.parse(readFileSync(manifest, 'utf8'));
    const target = exports[subpath];
    const file = typeof target === 'object' ? (target.source ?? target.default) : target;
    if (file !== undefined) return resolvePath(folder, file);
  }
  return sourceFileOf(resolvePath(folder, subpath));
};

/**
 * Where an import of ours leads, by the rules that the sources are written in. A file that does not exist still gets
 * its path, so that the dependency rule can judge by place alone.
 * @param {string} specifier
 * @param {string} importer absolute
 * @returns {string | null | undefined} a path; null for a module of Node itself; undefined for a package of others
 */
export const resolveImport = (specifier, importer) => {
  if (isBuiltin(specifier)) return null;
  if (/^\.\.?(\/|$)/.test(specifier))
    return sourceFileOf(resolvePath(dirname(importer), specifier.replace(/\?.*$/, '')));
  for (const [name, { folder, entry }] of Object.entries(ownPackages)) {
    if (specifier === name) return resolvePath(folder, entry);
    if (specifier.startsWith(`${name}/`)) return exportedFile(folder, `.${specifier.slice(name.length)}`);
  }
  return undefined;
};

// The two names below are the interface that ESLint's import plugins ask a resolver for.
export const interfaceVersion = 2;

/**
 * @param {string} specifier
 * @param {string} importer
 * @returns {{ found: boolean, path?: string | null }}
 */
export const resolve = (specifier, importer) => {
  const path = resolveImport(specifier, importer);
  return path === undefined ? { found: false } : { found: true, path };
};
