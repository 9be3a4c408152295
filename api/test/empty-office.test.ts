import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Sheet } from '../src/correlations/dto/sheet.dto.js';
import { FixtureFiles } from '../src/database/seed/fixture-files.js';
import { SeedService } from '../src/database/seed/seed.service.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { signedInWith, type SignedIn } from './support/people.js';

const SLUG = 'wetted-wall-gilliland-sherwood';

/** An office of its own: nobody in it, and the library as drafts that belong to nobody. */
let office: TestApp;
let engineer: SignedIn;
let otherEngineer: SignedIn;
let reviewer: SignedIn;

beforeAll(async () => {
  office = await createTestApp();
  await office.app.get(SeedService).fill(false);
  engineer = await signedInWith(office, 'engineer');
  otherEngineer = await signedInWith(office, 'engineer');
  reviewer = await signedInWith(office, 'reviewer');
});
afterAll(() => office.close());

describe('an empty office', () => {
  test('has the library as drafts for every engineer to take up', async () => {
    const { body } = await engineer.agent.get('/api/correlations?limit=1').expect(200);
    const { total, facets } = body as {
      total: number;
      facets: { standing: { value: string; count: number }[] };
    };
    const count = new FixtureFiles().correlations().length;
    expect(total).toBe(count);
    expect(facets.standing).toEqual([{ value: 'draft', label: 'Draft', count }]);
    const sheet = (await engineer.agent.get(`/api/correlations/${SLUG}`).expect(200)).body as Sheet;
    expect(sheet.abilities).toMatchObject({ edit: true, submit: true });
    expect(sheet.standingNote).toContain('to be checked');
  });

  test('makes whoever submits one its originator, from then on alone', async () => {
    await engineer.agent.post(`/api/correlations/${SLUG}/revisions/1/submission`).send({}).expect(201);
    const sheet = (await reviewer.agent.get(`/api/correlations/${SLUG}`).expect(200)).body as Sheet;
    expect(sheet).toMatchObject({ standing: 'in review', originator: { id: engineer.actor.id } });
    await otherEngineer.agent.get(`/api/correlations/${SLUG}`).expect(404);
  });

  test('makes whoever edits one its originator', async () => {
    const path = '/api/correlations/sphere-ranz-marshall';
    const { hash, definition } = (await engineer.agent.get(path).expect(200)).body as Sheet;
    const edited = { ...definition, title: `${definition.title}, second look` };
    const response = await otherEngineer.agent
      .put(`${path}/revisions/1`)
      .set('If-Match', `"${hash}"`)
      .send({ definition: edited })
      .expect(200);
    expect(response.body).toMatchObject({ originator: { id: otherEngineer.actor.id }, iteration: 2 });
    await engineer.agent.get(path).expect(404);
  });
});
