import { fromRoot, root } from './paths.mjs';
import { runNode } from './run-command.mjs';

const script = (/** @type {string[]} */ ...parts) => fromRoot('node_modules', ...parts);

/**
 * @typedef {object} Stage
 * @property {string} name
 * @property {string} script
 * @property {string[]} args
 */

/** @type {Stage[]} What can be said about the sources without running them. */
export const sourceStages = [
  { name: 'types of the product', script: script('typescript', 'bin', 'tsc'), args: ['-b'] },
  {
    name: 'types of the tests and scripts',
    script: script('typescript', 'bin', 'tsc'),
    args: ['-p', 'tsconfig.test.json'],
  },
  { name: 'lint', script: script('eslint', 'bin', 'eslint.js'), args: ['.', '--max-warnings', '0'] },
  { name: 'cycles', script: fromRoot('packages', 'workshop', 'no-cycles.mjs'), args: [] },
  {
    name: 'format',
    script: script('prettier', 'bin', 'prettier.cjs'),
    args: ['--check', '--log-level', 'warn', '.'],
  },
];

/**
 * @param {Stage} stage
 * @param {NodeJS.ProcessEnv} [env]
 * @returns {Promise<boolean>} whether it passed
 */
export const runStage = async ({ name, script: file, args }, env = process.env) => {
  const begun = Date.now();
  console.log(`\n── ${name}`);
  const code = await runNode(file, args, { cwd: root, env });
  console.log(
    `── ${name}: ${code === 0 ? 'passed' : 'FAILED'} in ${((Date.now() - begun) / 1000).toFixed(1)} s`,
  );
  return code === 0;
};
