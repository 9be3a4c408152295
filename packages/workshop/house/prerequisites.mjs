import { accessSync, constants, statSync } from 'node:fs';
import { delimiter, join } from 'node:path';

/** What better-sqlite3 is compiled with, and how a Debian system gets it. */
const compilerTools = [
  { command: 'python3', debian: 'python3' },
  { command: 'make', debian: 'make' },
  { command: 'g++', debian: 'g++' },
];

/**
 * @param {string} command
 * @param {string} [searchPath] a PATH value
 * @returns {string | undefined} the absolute path of the first executable of that name
 */
export const findCommand = (command, searchPath = process.env.PATH ?? '') => {
  for (const folder of searchPath.split(delimiter)) {
    const candidate = join(folder, command);
    try {
      accessSync(candidate, constants.X_OK);
      if (folder !== '' && statSync(candidate).isFile()) return candidate;
    } catch {
      // Not in this folder: the next one may have it.
    }
  }
  return undefined;
};

/**
 * The range of package.json's `engines`, checked without a dependency: 20.19 or a later 20, 22.12 or anything newer.
 * @param {string} version such as `20.19.1`
 * @returns {boolean}
 */
export const nodeIsSupported = (version) => {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  return (major === 20 && minor >= 19) || (major === 22 && minor >= 12) || major > 22;
};

/** @returns {string[]} one sentence per thing that is missing, empty when all is there */
export const missingForRunning = () =>
  nodeIsSupported(process.versions.node)
    ? []
    : [
        `Node.js ${process.versions.node} is too old or between releases: take 20.19 or later of the 20 line, or 22.12 or later.`,
      ];

/**
 * @param {string} [searchPath]
 * @returns {string[]}
 */
export const missingForInstalling = (searchPath) => {
  const missing = [];
  if (findCommand('npm', searchPath) === undefined)
    missing.push('npm is missing: it comes with Node.js, or as the Debian package npm.');
  for (const { command, debian } of compilerTools) {
    if (findCommand(command, searchPath) === undefined)
      missing.push(
        `${command} is missing: SQLite is compiled at install (Debian: apt-get install ${debian}).`,
      );
  }
  return missing;
};

/** A reason to stop that a person can act on; printed as it is, without a stack. */
export class CannotGoOn extends Error {
  /** @param {string[]} reasons */
  constructor(reasons) {
    super(reasons.join('\n'));
    this.name = 'CannotGoOn';
  }
}

/** @param {string[]} missing */
export const demand = (missing) => {
  if (missing.length > 0) throw new CannotGoOn(missing);
};
