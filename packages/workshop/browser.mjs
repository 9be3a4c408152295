import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium } from 'playwright-core';
import { chromiumPath } from './house/chromium.mjs';

/** Nothing but the pages asked for may go over the network; a container has no sandbox and no graphics card. */
const args = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/**
 * @typedef {object} Browser
 * @property {import('playwright-core').BrowserContext} context
 * @property {() => Promise<void>} close ends the browser and removes its data
 */

/**
 * Starts Debian's Chromium (or the one MERESTONE_CHROMIUM names) with data of its own that nobody used before.
 * @param {import('playwright-core').BrowserContextOptions} [options] of the context: viewport, colorScheme, locale …
 * @returns {Promise<Browser>}
 */
export const launchBrowser = async (options = {}) => {
  const userData = await mkdtemp(join(tmpdir(), 'merestone-browser-'));
  const removeData = () => rm(userData, { recursive: true, force: true, maxRetries: 5 });
  try {
    const context = await chromium.launchPersistentContext(userData, {
      ...options,
      executablePath: chromiumPath(),
      args,
      headless: true,
    });
    return {
      context,
      close: async () => {
        await context.close();
        await removeData();
      },
    };
  } catch (error) {
    await removeData();
    throw error;
  }
};
