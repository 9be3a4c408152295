import { existsSync } from 'node:fs';
import { findCommand } from './prerequisites.mjs';
import { run } from './run-command.mjs';

/** @returns {string} where the browser for the tests is expected */
export const chromiumPath = () => process.env.MERESTONE_CHROMIUM ?? '/usr/bin/chromium';

const missingTools = () => {
  const missing = [];
  if (!existsSync(chromiumPath())) missing.push('chromium');
  if (findCommand('units') === undefined) missing.push('units');
  return missing;
};

/**
 * The browser for the journeys and GNU units, which the engine's conversions are held against.
 * Installs them with apt where this user may; where not, says what to do.
 * @returns {Promise<string[]>} one sentence per tool that is still missing
 */
export const ensureTestTools = async () => {
  const missing = missingTools();
  if (missing.length === 0) return [];
  const named = process.env.MERESTONE_CHROMIUM;
  const mayInstall = process.getuid?.() === 0 && findCommand('apt-get') !== undefined;
  const toInstall = missing.filter((name) => name !== 'chromium' || named === undefined);
  if (mayInstall && toInstall.length > 0) {
    console.log(`Installing ${toInstall.join(' and ')} for the tests …`);
    const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
    const updated = await run('apt-get', ['update'], { env, quiet: true });
    if (updated === 0)
      await run('apt-get', ['install', '-y', '--no-install-recommends', ...toInstall], { env, quiet: true });
  }
  return missingTools().map((name) =>
    name === 'chromium' && named !== undefined
      ? `There is no browser at ${named}, which MERESTONE_CHROMIUM names.`
      : `${name} is missing and could not be installed here: as root, apt-get install ${name}` +
        (name === 'chromium' ? ', or name another Chromium in MERESTONE_CHROMIUM.' : '.'),
  );
};
