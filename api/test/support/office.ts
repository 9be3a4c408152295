import type { CorrelationDefinition } from '@merestone/engine';
import type { Actor } from '../../src/common/actor.js';
import { DraftingService } from '../../src/correlations/drafting.service.js';
import { PropertyEquationsService } from '../../src/property-equations/property-equations.service.js';
import { ApprovalService } from '../../src/reviews/approval.service.js';
import { ReviewingService } from '../../src/reviews/reviewing.service.js';
import { SubmissionService } from '../../src/reviews/submission.service.js';
import type { RevisionKey, RevisionRecord } from '../../src/revisions/revision-record.js';
import { appointed, namePrincipal } from './appointments.js';
import { createTestApp, type TestApp } from './create-test-app.js';
import { signedInWith, TEST_PASSWORD, type SignedIn } from './people.js';
import { addGeometries, gasDensity, tubeSheet } from './sheets.js';

export const CHECKED = {
  expression: true,
  definitions: true,
  ranges: true,
  basis: true,
  recalculated: true,
  duplicates: true,
};

/** A small office: somebody for each part in the life of a revision, two geometries, an approved gas density. */
export interface TestOffice {
  readonly test: TestApp;
  readonly engineer: SignedIn;
  readonly otherEngineer: SignedIn;
  readonly reviewer: SignedIn;
  readonly secondReviewer: SignedIn;
  readonly authority: SignedIn;
  readonly secondAuthority: SignedIn;
  readonly auditor: SignedIn;
  readonly administrator: SignedIn;
  close(): Promise<void>;
}

export async function openOffice(): Promise<TestOffice> {
  const test = await createTestApp();
  addGeometries(test);
  const office: TestOffice = {
    test,
    engineer: await signedInWith(test, 'engineer'),
    otherEngineer: await signedInWith(test, 'engineer'),
    reviewer: await signedInWith(test, 'reviewer'),
    secondReviewer: await signedInWith(test, 'reviewer'),
    authority: await signedInWith(test, 'authority'),
    secondAuthority: await signedInWith(test, 'authority'),
    auditor: await signedInWith(test, 'auditor'),
    administrator: await signedInWith(test, 'administrator'),
    close: () => test.close(),
  };
  await appointAuthorities(office);
  const density = test.app
    .get(PropertyEquationsService)
    .draft(office.engineer.actor, 'test-gas-density', gasDensity());
  await approved(office, density);
  return office;
}

/** For all geometries, proposed by the administrator and confirmed by the office's principal. */
async function appointAuthorities(office: TestOffice): Promise<void> {
  const { test, administrator, otherEngineer: principal } = office;
  namePrincipal(test, administrator, principal);
  for (const authority of [office.authority, office.secondAuthority]) {
    await appointed(test, { proposer: administrator, confirmer: principal }, authority.actor.id);
  }
}

/** A correlation of its own, as a draft of the engineer. */
export function draft(
  { test, engineer }: TestOffice,
  slug: string,
  overrides: Partial<CorrelationDefinition> = {},
  by: Actor = engineer.actor,
): RevisionRecord {
  return test.app.get(DraftingService).create(by, slug, tubeSheet(overrides));
}

export function submitted({ test }: TestOffice, key: RevisionKey, by: Actor): RevisionRecord {
  return test.app.get(SubmissionService).submit(by, key, {});
}

/** In review and recommended by both reviewers. */
export function recommended(
  office: TestOffice,
  key: RevisionKey,
  by = office.engineer.actor,
): RevisionRecord {
  const record = submitted(office, key, by);
  for (const { actor } of [office.reviewer, office.secondReviewer]) {
    office.test.app.get(ReviewingService).review(actor, key, { verdict: 'recommend', checklist: CHECKED });
  }
  return record;
}

export async function approved(office: TestOffice, key: RevisionKey): Promise<RevisionRecord> {
  const { hash } = recommended(office, key);
  return office.test.app.get(ApprovalService).approve(office.authority.actor, key, {
    password: TEST_PASSWORD,
    meaning: 'Approved for tests',
    hash,
  });
}

/** Number of rows of every table, to show that a refused request changed nothing. */
export function rowCounts({ test }: Pick<TestOffice, 'test'>): Record<string, number> {
  const { sqlite } = test.connection;
  const tables = sqlite
    .prepare<[], { name: string }>(
      "SELECT name FROM sqlite_schema WHERE type = 'table' AND name NOT LIKE 'sqlite_%'",
    )
    .all();
  return Object.fromEntries(
    tables.map(({ name }) => {
      const row = sqlite.prepare<[], { n: number }>(`SELECT count(*) AS n FROM "${name}"`).get();
      return [name, row?.n ?? 0];
    }),
  );
}
