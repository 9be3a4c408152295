import { copyFileSync, existsSync, mkdirSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';
import { filesBelow, fingerprint, readStamp, writeStamp } from './fingerprint.mjs';
import { cacheFolder, fromRoot, root } from './paths.mjs';
import { CannotGoOn } from './prerequisites.mjs';
import { runNode } from './run-command.mjs';

const everywhere = ['package-lock.json', 'tsconfig.base.json', 'tsconfig.json'].map((name) => fromRoot(name));
const packages = ['engine', 'api-client'].flatMap((name) => [
  fromRoot('packages', name, 'src'),
  fromRoot('packages', name, 'package.json'),
  fromRoot('packages', name, 'tsconfig.json'),
]);

const typescript = fromRoot('node_modules', 'typescript', 'bin', 'tsc');
const vite = fromRoot('node_modules', 'vite', 'bin', 'vite.js');

/**
 * The compiler copies no SQL: what the server reads beside its modules follows it to dist.
 */
export const copyServerAssets = () => {
  const source = fromRoot('api', 'src');
  for (const file of filesBelow(source).filter((name) => name.endsWith('.sql'))) {
    const target = join(fromRoot('api', 'dist'), relative(source, file));
    mkdirSync(dirname(target), { recursive: true });
    copyFileSync(file, target);
  }
};

/**
 * @typedef {object} Product
 * @property {string} name
 * @property {string[]} sources what it is made from
 * @property {string} outcome the file that must be there afterwards
 * @property {() => Promise<number>} make
 */

/** @type {Product} */
const server = {
  name: 'server',
  sources: [...everywhere, ...packages, fromRoot('api', 'src'), fromRoot('api', 'tsconfig.json')],
  outcome: fromRoot('api', 'dist', 'main.js'),
  make: async () => {
    const code = await runNode(typescript, ['-b', 'packages/engine', 'packages/api-client', 'api'], {
      cwd: root,
    });
    if (code === 0) copyServerAssets();
    return code;
  },
};

/** @type {Product} */
const screens = {
  name: 'screens',
  sources: [
    ...everywhere,
    ...packages,
    ...['src', 'public', 'index.html', 'vite.config.ts', 'package.json', 'tsconfig.json'].map((name) =>
      fromRoot('web', name),
    ),
  ],
  outcome: fromRoot('web', 'dist', 'index.html'),
  make: () => runNode(vite, ['build', '--logLevel', 'warn'], { cwd: fromRoot('web') }),
};

/**
 * Builds one product where its sources changed since it last built well.
 * @param {Product} product
 */
const ensure = async ({ name, sources, outcome, make }) => {
  const stampFile = join(cacheFolder, 'built', name);
  const wanted = fingerprint(root, sources, [process.versions.node]);
  if (existsSync(outcome) && readStamp(stampFile) === wanted) return;
  console.log(`Building the ${name} …`);
  const code = await make();
  if (code !== 0) throw new CannotGoOn([`The ${name} did not build; see above.`]);
  writeStamp(stampFile, wanted);
};

/** Needs an install, as the next one does. */
export const ensureServerBuilt = () => ensure(server);

/** @returns {Promise<void>} */
export const ensureBuilt = async () => {
  await ensure(server);
  await ensure(screens);
};
