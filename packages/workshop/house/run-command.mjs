import { spawn } from 'node:child_process';
import { constants } from 'node:os';

/**
 * @typedef {object} CommandOptions
 * @property {string} [cwd]
 * @property {NodeJS.ProcessEnv} [env] the whole environment of the child
 * @property {boolean} [quiet] drop its standard output
 */

/**
 * What a shell would report: the exit code, or 128 + the signal's number.
 * @param {number | null} code
 * @param {NodeJS.Signals | null} signal
 * @returns {number}
 */
export const exitCodeOf = (code, signal) => code ?? 128 + (signal === null ? 0 : constants.signals[signal]);

/**
 * Runs a program to its end with this terminal's input and output.
 * @param {string} command
 * @param {string[]} args
 * @param {CommandOptions} [options]
 * @returns {Promise<number>} its exit code
 */
export const run = (command, args, { cwd, env, quiet = false } = {}) =>
  new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      ...(cwd === undefined ? {} : { cwd }),
      ...(env === undefined ? {} : { env }),
      stdio: ['inherit', quiet ? 'ignore' : 'inherit', 'inherit'],
    });
    child.once('error', reject);
    child.once('exit', (code, signal) => {
      resolve(exitCodeOf(code, signal));
    });
  });

/**
 * Runs the script of an installed package with this very Node, whatever the PATH says.
 * @param {string} script absolute path of a JavaScript file
 * @param {string[]} args
 * @param {CommandOptions} [options]
 */
export const runNode = (script, args, options) => run(process.execPath, [script, ...args], options);

/**
 * Stays in front of a long-running child: hands signals on to it and answers with its exit code. A child that ends by
 * the very signal that was asked for has ended well: 0.
 * @param {import('node:child_process').ChildProcess} child
 * @returns {Promise<number>}
 */
export const standInFrontOf = (child) =>
  new Promise((resolve, reject) => {
    /** @type {NodeJS.Signals[]} */
    const signals = ['SIGINT', 'SIGTERM', 'SIGHUP'];
    /** @type {NodeJS.Signals | undefined} */
    let asked;
    /** @param {NodeJS.Signals} signal */
    const handOn = (signal) => {
      asked = signal;
      // Ctrl-C in a terminal reaches the child by itself; a second one would cut its tidy end short.
      if (signal === 'SIGINT' && process.stdin.isTTY) return;
      child.kill(signal);
    };
    for (const signal of signals) process.on(signal, handOn);
    child.once('error', reject);
    child.once('exit', (code, signal) => {
      for (const name of signals) process.off(name, handOn);
      resolve(signal !== null && signal === asked ? 0 : exitCodeOf(code, signal));
    });
  });

/**
 * Lives as long as all of its children: a signal, or the end of one, ends the others.
 * @param {{ name: string, child: import('node:child_process').ChildProcess }[]} children
 * @returns {Promise<number>} 0 after a signal, else what the first one ended with (never 0)
 */
export const endTogether = (children) =>
  new Promise((/** @type {(code: number) => void} */ resolve) => {
    let running = children.length;
    let answerCode = 0;
    let ending = false;
    const endAll = () => {
      ending = true;
      for (const { child } of children) child.kill('SIGTERM');
    };
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, endAll);
    for (const { name, child } of children) {
      child.once('exit', (code, signal) => {
        if (!ending) {
          console.error(`${name} ended; the others end with it.`);
          answerCode = exitCodeOf(code, signal) || 1;
          endAll();
        }
        running -= 1;
        if (running === 0) resolve(answerCode);
      });
    }
  });
