// No file of ours imports itself by a detour, and no feature of the server uses itself by a detour. Types count too:
// two files that describe each other belong together, or need a third.
import { readFileSync } from 'node:fs';
import { relative, sep } from 'node:path';
import ts from 'typescript';
import { findCycles } from './lint/find-cycles.mjs';
import { resolveImport } from './lint/resolve-import.mjs';
import { filesBelow } from './house/fingerprint.mjs';
import { fromRoot, root } from './house/paths.mjs';

const folders = ['packages/engine/src', 'packages/api-client/src', 'packages/workshop', 'api/src', 'web/src'];
const isSource = (/** @type {string} */ file) => /\.(ts|tsx|mjs)$/.test(file) && !file.endsWith('.d.ts');
const isTest = (/** @type {string} */ file) => /\.test\.tsx?$/.test(file);
const named = (/** @type {string} */ file) => relative(root, file).split(sep).join('/');

/** @type {Map<string, string[]>} */
const imports = new Map();
for (const file of folders.flatMap((folder) => filesBelow(fromRoot(folder))).filter(isSource)) {
  const found = ts.preProcessFile(readFileSync(file, 'utf8'), true, true).importedFiles;
  const targets = found
    .map(({ fileName }) => resolveImport(fileName, file))
    .filter((path) => typeof path === 'string');
  imports.set(named(file), [...new Set(targets.map(named))]);
}

/** @param {string} file */
const featureOf = (file) => /^api\/src\/(?!common\/|database\/)([^/]+)\//.exec(file)?.[1];

/** @type {Map<string, string[]>} */
const features = new Map();
for (const [file, targets] of imports) {
  const from = featureOf(file);
  if (from === undefined || isTest(file)) continue;
  const to = targets.map(featureOf).filter((name) => name !== undefined && name !== from);
  features.set(
    from,
    [...new Set([...(features.get(from) ?? []), ...to])].filter((name) => name !== undefined),
  );
}

const cycles = [...findCycles(imports), ...findCycles(features)];
for (const cycle of cycles) console.error(`Cycle: ${cycle.join(' → ')}`);
if (cycles.length > 0) process.exitCode = 1;
else
  console.log(
    `No cycle in ${String(imports.size)} files and ${String(features.size)} features of the server.`,
  );
