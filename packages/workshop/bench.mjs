// npm run bench [name …]: runs bench/*.bench.mjs one after the other, each in a process of its own, and prints tables.
import { fork } from 'node:child_process';
import { readdirSync } from 'node:fs';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { answer } from './house/answer.mjs';
import { tableText } from './bench/bench-table.mjs';
import { ensureBuilt } from './house/build-product.mjs';
import { ensureInstalled } from './house/install.mjs';
import { fromRoot, root } from './house/paths.mjs';

const folder = fromRoot('packages', 'workshop', 'bench');
const oneFile = '--only';

/** @param {string} file */
const measureHere = async (file) => {
  /** @type {{ run: () => Promise<import('./bench/bench-table.mjs').BenchTable> }} */
  const { run } = await import(pathToFileURL(file).href);
  process.send?.(await run());
};

/**
 * @param {string} file
 * @returns {Promise<import('./bench/bench-table.mjs').BenchTable | undefined>} nothing when it failed
 */
const measureApart = (file) =>
  new Promise((resolve, reject) => {
    const child = fork(fileURLToPath(import.meta.url), [oneFile, file], { cwd: root });
    /** @type {import('./bench/bench-table.mjs').BenchTable | undefined} */
    let table;
    child.once('message', (message) => {
      table = /** @type {import('./bench/bench-table.mjs').BenchTable} */ (message);
      child.disconnect();
    });
    child.once('error', reject);
    child.once('exit', (code) => {
      resolve(code === 0 ? table : undefined);
    });
  });

const benchAll = async () => {
  await ensureInstalled();
  await ensureBuilt();
  const wanted = process.argv.slice(2);
  const files = readdirSync(folder)
    .filter((name) => name.endsWith('.bench.mjs'))
    .filter((name) => wanted.length === 0 || wanted.some((word) => name.startsWith(word)))
    .sort();
  const failed = [];
  for (const file of files) {
    const table = await measureApart(fromRoot('packages', 'workshop', 'bench', file));
    if (table === undefined) failed.push(file);
    else console.log(`\n${tableText(table)}`);
  }
  if (failed.length > 0) console.error(`\nCould not be measured: ${failed.join(', ')}.`);
  else if (files.length === 0) console.error(`No benchmark is called ${wanted.join(' or ')}.`);
  return failed.length === 0 && files.length > 0 ? 0 : 1;
};

const [flag, file] = process.argv.slice(2);
if (flag === oneFile && file !== undefined) await measureHere(file);
else await answer(benchAll);
