import { existsSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { fingerprint, readStamp, writeStamp } from './fingerprint.mjs';
import { fromRoot, root } from './paths.mjs';
import { CannotGoOn, demand, missingForInstalling, missingForRunning } from './prerequisites.mjs';
import { run } from './run-command.mjs';

const lockFile = fromRoot('package-lock.json');
/** npm's own note of what it put into node_modules. */
const hiddenLockFile = fromRoot('node_modules', '.package-lock.json');
const stampFile = fromRoot('node_modules', '.merestone-installed');

/** The compiled SQLite binding fits one Node ABI only, so the ABI is part of what must not change. */
const wanted = () =>
  fingerprint(root, [lockFile], [process.platform, process.arch, process.versions.modules]);

/**
 * @typedef {{ version?: string, integrity?: string, link?: boolean, optional?: boolean, devOptional?: boolean }} LockedPackage
 */

/**
 * @param {string} file a lock file, npm's own or the hidden one in node_modules
 * @returns {Map<string, LockedPackage>}
 */
const lockedPackages = (file) => {
  /** @type {{ packages?: Record<string, LockedPackage> }} */
  const lock = JSON.parse(readFileSync(file, 'utf8'));
  return new Map(
    Object.entries(lock.packages ?? {}).filter(
      ([path, entry]) => /(^|\/)node_modules\//.test(path) && !entry.link,
    ),
  );
};

/**
 * Whether a node_modules that somebody else installed is what the lock file asks for.
 * Packages for other platforms may be absent.
 * @param {string} lock
 * @param {string} hidden
 * @returns {boolean}
 */
export const installedAsLocked = (lock, hidden) => {
  if (!existsSync(hidden)) return false;
  const asked = lockedPackages(lock);
  const found = lockedPackages(hidden);
  for (const [path, entry] of asked) {
    const there = found.get(path);
    if (there === undefined ? !entry.optional && !entry.devOptional : there.version !== entry.version)
      return false;
  }
  return [...found.keys()].every((path) => asked.has(path));
};

/**
 * Whether every package has its folder, those of single workspaces included: a stamp does not notice one being deleted.
 * @param {string} lock
 * @param {string} base folder that the lock file's paths start from
 * @returns {boolean}
 */
export const foldersAreThere = (lock, base) =>
  [...lockedPackages(lock)].every(
    ([path, entry]) => entry.optional || entry.devOptional || existsSync(join(base, path)),
  );

/** Whether the compiled SQLite opens under this Node; it fits one ABI only. */
const sqliteOpens = () => {
  try {
    /** @type {new (path: string) => { close(): void }} */
    const Database = createRequire(fromRoot('api', 'package.json'))('better-sqlite3');
    new Database(':memory:').close();
    return true;
  } catch {
    return false;
  }
};

/** @returns {boolean} */
export const installIsCurrent = () =>
  foldersAreThere(lockFile, root) &&
  (readStamp(stampFile) === wanted() || (installedAsLocked(lockFile, hiddenLockFile) && sqliteOpens()));

/**
 * Where this Node brings its own headers, node-gyp need not fetch them.
 * @returns {Record<string, string>}
 */
const ownHeaders = () => {
  const prefix = dirname(dirname(process.execPath));
  try {
    const header = readFileSync(join(prefix, 'include', 'node', 'node_version.h'), 'utf8');
    const part = (/** @type {string} */ name) =>
      new RegExp(`#define NODE_${name}_VERSION (\\d+)`).exec(header)?.[1];
    const version = ['MAJOR', 'MINOR', 'PATCH'].map(part).join('.');
    return version === process.versions.node ? { npm_package_config_node_gyp_nodedir: prefix } : {};
  } catch {
    return {};
  }
};

/**
 * Installs exactly what the lock file says, unless that is there already. Names a missing tool before it begins.
 * SQLite is compiled, never fetched: `.prebuild-installrc` at the top says so for every install.
 * @returns {Promise<void>}
 */
export const ensureInstalled = async () => {
  demand(missingForRunning());
  if (installIsCurrent()) {
    writeStamp(stampFile, wanted());
    return;
  }
  demand(missingForInstalling());
  console.log(
    'Installing the packages of the lock file (SQLite is compiled; a few minutes the first time) …',
  );
  const code = await run('npm', ['ci', '--no-audit', '--no-fund'], {
    cwd: root,
    env: { ...process.env, ...ownHeaders() },
  });
  if (code !== 0) throw new CannotGoOn([`npm ci ended with code ${String(code)}: nothing was started.`]);
  writeStamp(stampFile, wanted());
};
