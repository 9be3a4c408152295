import { gzipSync } from 'node:zlib';
import { launchBrowser } from '../browser.mjs';
import { serveForTests } from '../serve-for-tests.mjs';
import { approvedSheet, signIn } from './demo-office.mjs';

/**
 * Loads one page with nothing cached and weighs every script that came over.
 * @param {string} origin
 * @param {string} path
 * @param {string} cookie empty for nobody
 * @param {string} sign a selector for what is to be seen on that page and on no other
 * @returns {Promise<{ total: number, largest: number }>} gzip kB
 */
const weigh = async (origin, path, cookie, sign) => {
  const browser = await launchBrowser();
  try {
    await browser.context.addCookies(
      cookie
        .split('; ')
        .filter((pair) => pair !== '')
        .map((pair) => {
          const [name = '', ...value] = pair.split('=');
          return { name, value: value.join('='), url: origin };
        }),
    );
    const page = await browser.context.newPage();
    /** @type {import('playwright-core').Response[]} */
    const scripts = [];
    page.on('response', (response) => {
      if (/javascript/.test(response.headers()['content-type'] ?? '')) scripts.push(response);
    });
    await page.goto(origin + path, { waitUntil: 'networkidle' });
    await page.locator(sign).first().waitFor();
    if (new URL(page.url()).pathname !== path) throw new Error(`${path} led to ${page.url()}.`);
    const weights = await Promise.all(
      scripts.map(async (response) => gzipSync(await response.body()).length / 1000),
    );
    return { total: weights.reduce((sum, weight) => sum + weight, 0), largest: Math.max(0, ...weights) };
  } finally {
    await browser.close();
  }
};

/** @returns {Promise<import('./bench-table.mjs').BenchTable>} */
export const run = async () => {
  const office = await serveForTests();
  try {
    const cookie = await signIn(office.origin);
    const { slug, title } = await approvedSheet(office.origin, cookie);
    const pages = [
      { what: 'sign-in', path: '/sign-in', cookie: '', sign: 'input[type=password]', limit: 200 },
      { what: 'register', path: '/register', cookie, sign: `text=${title}`, limit: 400 },
      {
        what: `sheet (${slug})`,
        path: `/register/${slug}`,
        cookie,
        sign: `h1:has-text(${JSON.stringify(title)})`,
        limit: 400,
      },
    ];
    const rows = [];
    let largest = 0;
    for (const page of pages) {
      const weight = await weigh(office.origin, page.path, page.cookie, page.sign);
      largest = Math.max(largest, weight.largest);
      const met = weight.total <= page.limit;
      rows.push({ what: page.what, value: weight.total, unit: 'kB', aim: `≤ ${String(page.limit)}`, met });
    }
    rows.push({
      what: 'largest single script',
      value: largest,
      unit: 'kB',
      aim: '≤ 260',
      met: largest <= 260,
    });
    return {
      title: 'First-load JavaScript, gzip',
      rows,
      notes: ['Built product in Chromium, empty cache, every script until the network is quiet.'],
    };
  } finally {
    await office.stop();
  }
};
