import { mkdirSync, mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { codeOf } from './support/problem-of.js';

let office: TestApp;

beforeAll(async () => {
  const webFolder = mkdtempSync(join(tmpdir(), 'merestone-web-'));
  mkdirSync(join(webFolder, 'assets'));
  writeFileSync(join(webFolder, 'index.html'), '<!doctype html><title>Merestone</title>');
  writeFileSync(join(webFolder, 'assets', 'main-abc.js'), 'export {};');
  office = await createTestApp({ settings: { webFolder } });
});
afterAll(() => office.close());

const get = (path: string) => supertest(office.server).get(path);

describe('the screens', () => {
  it.each(['/', '/register', '/register/some-slug', '/apiary'])('are served at %s', async (path) => {
    const answer = await get(path).expect(200);
    expect(answer.type).toBe('text/html');
    expect(answer.text).toContain('<title>Merestone</title>');
    expect(answer.headers['cache-control']).toBe('no-cache');
  });

  it('have files that may be kept, and no page in place of one that is not there', async () => {
    const file = await get('/assets/main-abc.js').expect(200);
    expect(file.headers['cache-control']).toContain('immutable');
    await get('/assets/main-gone.js').expect(404);
  });

  it('do not stand in for an address of the API', async () => {
    for (const path of ['/api', '/api/', '/api/nothing']) {
      expect(codeOf(await get(path).set('Accept', 'text/html').expect(404))).toBe('not-found');
    }
  });

  it.each([
    '/../package.json',
    '/..%2f..%2fetc/passwd',
    '/%2e%2e/%2e%2e/etc/passwd',
    '/.env',
    '/assets/..%2f..%2f..%2fetc/passwd',
  ])('give nothing away at %s', async (path) => {
    const { text } = await get(path);
    expect(text).not.toMatch(/root:|"version"/);
  });
});

describe('headers', () => {
  it('let a page load and run nothing from elsewhere', async () => {
    const { headers } = await get('/register');
    const policy = headers['content-security-policy'] ?? '';

    expect(policy).toContain("default-src 'self'");
    expect(policy).toContain("script-src 'self';");
    expect(policy).toContain("style-src 'self' 'unsafe-inline'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toMatch(/unsafe-eval|https?:|\*/);
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['x-powered-by']).toBeUndefined();
  });

  it('ask for TLS only behind TLS', async () => {
    const { headers } = await get('/api/health');
    expect(headers['strict-transport-security']).toBeUndefined();
    expect(headers['content-security-policy']).not.toContain('upgrade-insecure-requests');
  });

  it('keep answers of the API out of caches', async () => {
    expect((await get('/api/health')).headers['cache-control']).toBe('no-store');
  });
});

describe('health', () => {
  it('tells what runs', async () => {
    const { body } = (await get('/api/health').expect(200)) as { body: Record<string, unknown> };
    expect(Object.keys(body)).toEqual(['status', 'version', 'revision', 'demo']);
    expect(body).toMatchObject({
      status: 'ok',
      version: expect.stringMatching(/^\d+\.\d+\.\d+/) as string,
      demo: false,
    });
  });
});

interface OpenApi {
  openapi: string;
  paths: Record<
    string,
    Record<string, { operationId: string; responses: Record<string, { content?: unknown }> }>
  >;
  components: { schemas: Record<string, { properties?: object }> };
}

describe('the contract', () => {
  it('names every route of the foundation with what it answers', async () => {
    const { body } = (await get('/api/openapi.json').expect(200)) as { body: OpenApi };
    const operations = Object.entries(body.paths).flatMap(([path, methods]) =>
      Object.entries(methods).map(([method, { operationId }]) => `${method} ${path} ${operationId}`),
    );

    expect(body.openapi).toMatch(/^3\./);
    expect(operations).toEqual(
      expect.arrayContaining([
        'get /api/health health',
        'post /api/session signIn',
        'get /api/session currentSession',
        'delete /api/session signOut',
        'get /api/session/demo-people listDemoPeople',
        'get /api/people listPeople',
        'get /api/journal listJournal',
        'post /api/journal/verification verifyJournal',
        'get /api/journal/checkpoints listCheckpoints',
        'get /api/mail/outbox listOutbox',
      ]),
    );
    expect(new Set(operations.map((line) => line.split(' ')[2])).size).toBe(operations.length);
  });

  it('leads nowhere with no reference', async () => {
    const { text, body } = (await get('/api/openapi.json')) as unknown as { text: string; body: OpenApi };
    const references = [...text.matchAll(/"#\/components\/schemas\/([^"]+)"/g)].map(([, name]) => name ?? '');

    expect(references).toContain('ProblemResponse');
    for (const name of references) expect(Object.keys(body.components.schemas)).toContain(name);
  });

  it('can be read on a page that loads from here alone', async () => {
    const { text } = await get('/api/docs').expect(200);
    const urls = [...text.matchAll(/(?:src|href)="([^"]+)"/g)].map(([, url]) => url ?? '');

    expect(urls.length).toBeGreaterThan(2);
    for (const url of urls) {
      expect(url).not.toMatch(/^(https?:)?\/\//);
      await get(new URL(url, 'http://localhost/api/docs').pathname).expect(200);
    }
    expect(text).not.toMatch(/<script>[^<]/);
  });
});
