import { describe, expect, test } from 'vitest';
import { SYSTEM_ACTOR, type Actor } from '../common/actor.js';
import type { Role } from '../common/roles.js';
import { STANDINGS, type Standing } from '../common/standing.js';
import type { Verdict } from '../common/verdict.js';
import {
  mayApprove,
  mayDecline,
  mayEdit,
  mayEvaluate,
  mayReinstate,
  maySee,
  maySubmit,
  maySuspend,
  mayWithdraw,
} from './revision.policy.js';
import { mayReview as mayReviewIn, tally } from './reviewing.policy.js';
import type { RevisionFacts, VerdictFact } from './revision-facts.js';

const actor = (id: string, ...roles: Role[]): Actor => ({ id, name: id, roles });
const originator = actor('originator', 'engineer', 'reviewer', 'authority');
const engineer = actor('engineer', 'engineer');
const reviewer = actor('reviewer', 'reviewer');
const authority = actor('authority', 'authority');
const auditor = actor('auditor', 'auditor');
const administrator = actor('administrator', 'administrator');

const NOW = 3;
const BEFORE = 2;
const revision = (standing: Standing): RevisionFacts => ({
  standing,
  originatorId: originator.id,
  iteration: NOW,
  inForce: standing === 'approved',
});
const verdict = (reviewerId: string, word: Verdict = 'recommend', iteration = NOW): VerdictFact => ({
  reviewerId,
  verdict: word,
  iteration,
  round: iteration,
});
const mayReview = (who: Actor, facts: RevisionFacts) => mayReviewIn(who, facts, 'reviewers');
const TWO = [verdict('r1'), verdict('r2')];
const GROUND = { appointed: true, reviewsNeeded: 2 };
const standingsWhere = (rule: (standing: Standing) => { allowed: boolean }): Standing[] =>
  STANDINGS.filter((standing) => rule(standing).allowed);

describe('seeing', () => {
  test('what is or was in use is for everybody', () => {
    for (const standing of ['approved', 'suspended', 'superseded', 'withdrawn'] as const) {
      for (const who of [engineer, reviewer, authority, auditor, administrator]) {
        expect(maySee(who, revision(standing))).toBe(true);
      }
    }
  });

  test('what is not approved is for those concerned', () => {
    for (const standing of ['draft', 'in review', 'declined'] as const) {
      for (const who of [originator, reviewer, authority, auditor]) {
        expect(maySee(who, revision(standing))).toBe(true);
      }
      for (const who of [engineer, administrator]) expect(maySee(who, revision(standing))).toBe(false);
    }
  });

  test('drafts that came with the library are for every engineer, not for the administrator', () => {
    const ofLibrary = { ...revision('draft'), originatorId: SYSTEM_ACTOR.id };
    expect(maySee(engineer, ofLibrary)).toBe(true);
    expect(maySee(administrator, ofLibrary)).toBe(false);
  });
});

describe('the standings in which an act is possible', () => {
  test.each([
    ['edit', (standing: Standing) => mayEdit(originator, revision(standing)), ['draft', 'in review']],
    ['submit', (standing: Standing) => maySubmit(originator, revision(standing)), ['draft']],
    ['review', (standing: Standing) => mayReview(reviewer, revision(standing)), ['in review']],
    [
      'approve',
      (standing: Standing) => mayApprove(authority, revision(standing), TWO, GROUND),
      ['in review'],
    ],
    ['decline', (standing: Standing) => mayDecline(authority, revision(standing), GROUND), ['in review']],
    [
      'suspend',
      (standing: Standing) => maySuspend(authority, revision(standing)),
      ['approved', 'superseded'],
    ],
    ['reinstate', (standing: Standing) => mayReinstate(authority, revision(standing)), ['suspended']],
    [
      'withdraw',
      (standing: Standing) => mayWithdraw(authority, revision(standing)),
      ['approved', 'suspended', 'superseded'],
    ],
    [
      'evaluate, as an engineer',
      (standing: Standing) => mayEvaluate(engineer, revision(standing)),
      ['approved', 'superseded'],
    ],
    [
      'evaluate, as a reviewer',
      (standing: Standing) => mayEvaluate(reviewer, revision(standing)),
      ['draft', 'in review', 'approved', 'superseded'],
    ],
  ])('%s', (_act, rule, expected) => {
    expect(standingsWhere(rule)).toEqual(expected);
  });
});

describe('four eyes', () => {
  test('an originator neither reviews nor approves, whatever the roles', () => {
    expect(mayReview(originator, revision('in review'))).toMatchObject({ allowed: false, code: 'forbidden' });
    expect(mayApprove(originator, revision('in review'), TWO, GROUND)).toMatchObject({
      allowed: false,
      code: 'forbidden',
    });
  });

  test('a reviewer does not approve, on whatever content and with whatever verdict', () => {
    const both = actor('r3', 'reviewer', 'authority');
    const before = [verdict('r3', 'ask-for-changes', BEFORE), ...TWO];
    expect(mayApprove(both, revision('in review'), before, GROUND)).toMatchObject({
      allowed: false,
      code: 'forbidden',
    });
    expect(mayApprove(both, revision('in review'), TWO, GROUND)).toMatchObject({ allowed: true });
  });

  test('who lacks the permission is refused first', () => {
    for (const who of [engineer, reviewer, auditor, administrator]) {
      expect(mayApprove(who, revision('in review'), TWO, GROUND)).toMatchObject({
        allowed: false,
        code: 'forbidden',
      });
    }
  });

  test('only the originator edits and submits', () => {
    expect(mayEdit(engineer, revision('draft'))).toMatchObject({ allowed: false, code: 'forbidden' });
    expect(maySubmit(engineer, revision('draft'))).toMatchObject({ allowed: false, code: 'forbidden' });
  });
});

describe('what an approval rests on', () => {
  const outcome = (...verdicts: VerdictFact[]) =>
    mayApprove(authority, revision('in review'), verdicts, GROUND);

  test.each<[string, VerdictFact[]]>([
    ['no review', []],
    ['one', [verdict('r1')]],
    ['one, given twice', [verdict('r1'), verdict('r1')]],
    ['two, one on former content', [verdict('r1'), verdict('r2', 'recommend', BEFORE)]],
    ['two and a third that asks for changes', [...TWO, verdict('r3', 'ask-for-changes')]],
    ['two, of which one was taken back', [...TWO, verdict('r2', 'ask-for-changes')]],
  ])('%s is not enough', (_name, verdicts) => {
    expect(outcome(...verdicts)).toMatchObject({ allowed: false, code: 'conflict' });
  });

  test('two on the present content are', () => {
    expect(outcome(...TWO)).toEqual({ allowed: true });
  });

  test('a reviewer who asked for changes and then recommends the present content counts', () => {
    expect(outcome(verdict('r1', 'ask-for-changes'), ...TWO)).toEqual({ allowed: true });
    expect(tally(NOW, [verdict('r1', 'ask-for-changes'), ...TWO])).toEqual({ favourable: 2, open: 0 });
  });
});
