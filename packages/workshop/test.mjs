// npm test: everything, from a bare clone. The last line is `N passed, N failed`.
import { mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { answer } from './house/answer.mjs';
import { ensureBuilt } from './house/build-product.mjs';
import { ensureTestTools } from './house/chromium.mjs';
import { ensureInstalled } from './house/install.mjs';
import { cacheFolder, fromRoot, root } from './house/paths.mjs';
import { CannotGoOn } from './house/prerequisites.mjs';
import { runNode } from './house/run-command.mjs';
import { runStage, sourceStages } from './house/stages.mjs';
import { countTests, readReport } from './house/test-counts.mjs';

/** @type {{ name: string, passed: number, failed: number, remarks: string[] }[]} */
const results = [];

/** An office of this machine must not be touched by a test: none of its settings is handed on. */
const testEnvironment = Object.fromEntries(
  Object.entries(process.env).filter(
    ([name]) => !name.startsWith('MERESTONE_') || name === 'MERESTONE_CHROMIUM',
  ),
);

/**
 * @param {string} name
 * @param {boolean} passed
 * @param {string[]} [remarks]
 */
const record = (name, passed, remarks = []) => {
  results.push({ name, passed: passed ? 1 : 0, failed: passed ? 0 : 1, remarks });
};

/** @param {string} project a project of vitest.config.ts */
const runProject = async (project) => {
  const report = join(cacheFolder, 'test-reports', `${project}.json`);
  mkdirSync(join(cacheFolder, 'test-reports'), { recursive: true });
  rmSync(report, { force: true });
  console.log(`\n── tests: ${project}`);
  const code = await runNode(
    fromRoot('node_modules', 'vitest', 'vitest.mjs'),
    ['run', '--project', project, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`],
    { cwd: root, env: testEnvironment },
  );
  results.push({ name: `tests: ${project}`, ...countTests(readReport(report), code) });
};

const buildProduct = async () => {
  console.log('\n── build');
  try {
    await ensureBuilt();
    record('build', true);
    return true;
  } catch (error) {
    if (!(error instanceof CannotGoOn)) throw error;
    record('build', false, [error.message]);
    return false;
  }
};

const printResults = () => {
  console.log('\n── summary');
  for (const { name, passed, failed, remarks } of results) {
    const remark = remarks.length > 0 ? ` (${remarks.join('; ')})` : '';
    console.log(
      `${failed > 0 ? 'FAILED' : 'passed'}  ${name}: ${String(passed)} passed, ${String(failed)} failed${remark}`,
    );
  }
};

const sum = (/** @type {'passed' | 'failed'} */ key) =>
  results.reduce((total, result) => total + result[key], 0);

await answer(async () => {
  try {
    await ensureInstalled();
    const missing = await ensureTestTools();
    for (const sentence of missing) console.error(sentence);
    record('tools for the tests', missing.length === 0, missing);
    for (const stage of sourceStages) record(stage.name, await runStage(stage, testEnvironment));
    for (const project of ['workshop', 'engine', 'api', 'web']) await runProject(project);
    if (await buildProduct()) await runProject('browser');
    else record('tests: browser', false, ['not run, since there is no build']);
  } catch (error) {
    if (!(error instanceof CannotGoOn)) throw error;
    console.error(error.message);
    record('preparation', false, [error.message]);
  }
  printResults();
  console.log(`${String(sum('passed'))} passed, ${String(sum('failed'))} failed`);
  return sum('failed') === 0 ? 0 : 1;
});
