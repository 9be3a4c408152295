import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { fromRoot, root } from './house/paths.mjs';

/** Seeding a new demo office goes through the real services, so it takes its time on a busy machine. */
const startLimit = 150_000;

/** @returns {Promise<number>} a port of this machine that nobody listens on */
const freePort = () =>
  new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address();
      const port = typeof address === 'object' && address !== null ? address.port : 0;
      probe.close(() => resolve(port));
    });
  });

/**
 * @typedef {object} TestOffice
 * @property {string} origin such as `http://localhost:43127`
 * @property {string} data its data folder
 * @property {() => Promise<void>} stop ends the server and removes its data
 * @property {() => string} output what it has printed so far
 */

/**
 * Starts the built product on a free port with a new data folder and waits until it answers.
 * @param {object} [options]
 * @param {Record<string, string>} [options.env] settings on top, such as MERESTONE_DEMO
 * @param {number} [options.port]
 * @param {string} [options.main] the server's own file, absolute
 * @returns {Promise<TestOffice>}
 * @throws {Error} with the server's own output when it ends early or does not answer in time
 */
export const serveForTests = async ({ env = {}, port, main = fromRoot('api', 'dist', 'main.js') } = {}) => {
  if (!existsSync(main)) throw new Error('There is no built server: run `npm run build` first.');
  const data = await mkdtemp(join(tmpdir(), 'merestone-data-'));
  const chosen = port ?? (await freePort());
  const origin = `http://localhost:${String(chosen)}`;

  const inherited = Object.entries(process.env).filter(([name]) => !name.startsWith('MERESTONE_'));
  const server = spawn(process.execPath, ['--enable-source-maps', main], {
    cwd: root,
    env: {
      ...Object.fromEntries(inherited),
      MERESTONE_PORT: String(chosen),
      MERESTONE_DATA: data,
      MERESTONE_ORIGIN: origin,
      ...env,
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let output = '';
  for (const stream of [server.stdout, server.stderr]) {
    stream.setEncoding('utf8');
    stream.on('data', (/** @type {string} */ text) => (output += text));
  }
  const state = { ended: false };
  const ended = new Promise((/** @type {(value: void) => void} */ resolve) => {
    server.once('exit', () => {
      state.ended = true;
      resolve();
    });
  });

  const stop = async () => {
    if (!state.ended) {
      server.kill('SIGTERM');
      const impatient = setTimeout(() => server.kill('SIGKILL'), 10_000);
      await ended;
      clearTimeout(impatient);
    }
    await rm(data, { recursive: true, force: true, maxRetries: 5 });
  };

  const deadline = Date.now() + startLimit;
  while (!(await answers(`${origin}/api/health`))) {
    if (state.ended || Date.now() > deadline) {
      await stop();
      const what = state.ended
        ? 'ended before it answered'
        : `did not answer within ${String(startLimit / 1000)} s`;
      throw new Error(`The server ${what}. It printed:\n${output}`);
    }
    await pause(100);
  }
  return { origin, data, stop, output: () => output };
};

/** @param {string} url */
const answers = async (url) => {
  try {
    return (await fetch(url, { signal: AbortSignal.timeout(2000) })).ok;
  } catch {
    return false;
  }
};
