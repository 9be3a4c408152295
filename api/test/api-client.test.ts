import { readFileSync } from 'node:fs';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { inRepository } from '../src/config/paths.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import supertest from 'supertest';
import { clientTypes } from '../../packages/workshop/client-types.mjs';

let office: TestApp;

beforeAll(async () => {
  office = await createTestApp();
});
afterAll(() => office.close());

test("the client's types are those of the contract that is served", async () => {
  const { body } = await supertest(office.server).get('/api/openapi.json').expect(200);
  const types = await clientTypes(body as Parameters<typeof clientTypes>[0]);
  const kept = readFileSync(inRepository('packages/api-client/src/schema.generated.ts'), 'utf8');
  // When this fails: npm run client.
  expect(kept).toBe(types);
});
