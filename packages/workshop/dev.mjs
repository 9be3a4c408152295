// npm run dev: Vite with hot reload on http://localhost:4170, in front of a server that follows its sources.
import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { answer } from './house/answer.mjs';
import { copyServerAssets } from './house/build-product.mjs';
import { ensureInstalled } from './house/install.mjs';
import { fromRoot, root } from './house/paths.mjs';
import { CannotGoOn } from './house/prerequisites.mjs';
import { endTogether, runNode } from './house/run-command.mjs';

const screensPort = '4170';
const typescript = fromRoot('node_modules', 'typescript', 'bin', 'tsc');
const serverFile = fromRoot('api', 'dist', 'main.js');
const serverProjects = ['packages/engine', 'packages/api-client', 'api'];

/**
 * @param {string} name
 * @param {string[]} args for node
 * @param {string} cwd
 * @param {NodeJS.ProcessEnv} env
 */
const startChild = (name, args, cwd, env) => {
  const child = spawn(process.execPath, args, { cwd, env, stdio: ['ignore', 'inherit', 'inherit'] });
  return { name, child };
};

await answer(async () => {
  await ensureInstalled();
  // Errors are shown by the watching compiler as well; the first pass only makes sure that there is something to run.
  await runNode(typescript, ['-b', ...serverProjects], { cwd: root });
  copyServerAssets();
  if (!existsSync(serverFile))
    throw new CannotGoOn(['There is no server to run yet: it did not compile; see above.']);

  const port = process.env.MERESTONE_PORT ?? '4171';
  const env = {
    ...process.env,
    MERESTONE_PORT: port,
    MERESTONE_API_PORT: port,
    MERESTONE_ORIGIN: process.env.MERESTONE_ORIGIN ?? `http://localhost:${screensPort}`,
  };
  return endTogether([
    startChild(
      'The compiler',
      [typescript, '-b', '-w', '--preserveWatchOutput', ...serverProjects],
      root,
      env,
    ),
    startChild(
      'The server',
      ['--watch', '--watch-preserve-output', '--enable-source-maps', serverFile],
      root,
      env,
    ),
    startChild(
      'Vite',
      [
        fromRoot('node_modules', 'vite', 'bin', 'vite.js'),
        '--port',
        screensPort,
        '--strictPort',
        '--clearScreen',
        'false',
      ],
      fromRoot('web'),
      env,
    ),
  ]);
});
