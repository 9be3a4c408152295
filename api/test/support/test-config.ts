import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Config, type Settings } from '../../src/config/config.js';

/** The least that argon2 takes: tests sign in often and guard nothing. */
const LIGHT = { memoryKiB: 8, passes: 1, lanes: 1 };
const GENEROUS = { windowSeconds: 60, perAddress: 10_000, perPerson: 10_000 };

/** Settings of a server with a data folder of its own. */
export function testConfig(overrides: Partial<Settings> = {}): Config {
  return new Config({
    port: 0,
    dataFolder: mkdtempSync(join(tmpdir(), 'merestone-test-')),
    demo: false,
    webFolder: '',
    passwordCost: LIGHT,
    signInLimits: GENEROUS,
    ...overrides,
  });
}
