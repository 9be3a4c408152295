import { existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser } from './browser.mjs';
import { serveForTests } from './serve-for-tests.mjs';

const server = `
  import { createServer } from 'node:http';
  const { MERESTONE_DATA, MERESTONE_PORT, MERESTONE_DEMO } = process.env;
  console.log('data in ' + MERESTONE_DATA);
  createServer((request, response) => {
    if (request.url === '/api/health') return response.end('{"status":"ok"}');
    response.setHeader('content-type', 'text/html');
    response.end('<h1>demo ' + MERESTONE_DEMO + '</h1>');
  }).listen(Number(MERESTONE_PORT));`;

describe('an office and a browser for the journeys', () => {
  let folder: string;
  const put = (name: string, text: string) => {
    writeFileSync(join(folder, name), text);
    return join(folder, name);
  };
  beforeAll(() => (folder = mkdtempSync(join(tmpdir(), 'merestone-serve-'))));
  afterAll(() => {
    rmSync(folder, { recursive: true });
  });

  it('starts on a free port with new data, is seen in the browser and leaves nothing behind', async () => {
    const office = await serveForTests({ main: put('server.mjs', server), env: { MERESTONE_DEMO: '0' } });
    const browser = await launchBrowser({ viewport: { width: 390, height: 844 } });
    const page = await browser.context.newPage();
    await page.goto(office.origin);
    expect(await page.getByRole('heading').innerText()).toBe('demo 0');
    expect(page.viewportSize()).toEqual({ width: 390, height: 844 });
    expect(existsSync(office.data)).toBe(true);
    expect(office.output()).toContain(`data in ${office.data}`);
    await browser.close();
    await office.stop();
    expect(existsSync(office.data)).toBe(false);
    await expect(fetch(office.origin)).rejects.toThrow();
  });

  it('tells what the server printed when it ends early', async () => {
    const main = put('broken.mjs', `console.error('no such table: person'); process.exit(3);`);
    await expect(serveForTests({ main })).rejects.toThrow(
      /ended before it answered[^]*no such table: person/,
    );
  });

  it('says what to do when nothing was built', async () => {
    await expect(serveForTests({ main: join(folder, 'nowhere.mjs') })).rejects.toThrow(/npm run build/);
  });
});
