import { describe, expect, test } from 'vitest';
import type { Actor } from '../common/actor.js';
import type { Role } from '../common/roles.js';
import type { Verdict } from '../common/verdict.js';
import {
  handsOf,
  isCurrent,
  mayAnswer,
  mayPutForward,
  mayResolve,
  mayReview,
  mayTakeReview,
  tally,
} from './reviewing.policy.js';
import type { CommentFacts, RevisionFacts, VerdictFact } from './revision-facts.js';

const actor = (id: string, ...roles: Role[]): Actor => ({ id, name: id, roles });
const originator = actor('originator', 'engineer', 'reviewer');
const reviewer = actor('reviewer', 'reviewer');
const engineer = actor('engineer', 'engineer');
const inReview: RevisionFacts = {
  standing: 'in review',
  originatorId: 'originator',
  iteration: 3,
  inForce: false,
};
const verdict = (word: Verdict, iteration = 3, round = 1, reviewerId = 'reviewer'): VerdictFact => ({
  reviewerId,
  verdict: word,
  iteration,
  round,
});

describe('whose turn it is', () => {
  const put = { round: 1, iteration: 3 };

  test('the reviewers have it once the present content was put forward', () => {
    expect(handsOf(inReview, put, [])).toBe('reviewers');
    expect(handsOf(inReview, put, [verdict('recommend')])).toBe('reviewers');
  });

  test.each([
    ['before anything was put forward', undefined, []],
    ['after an edit', { round: 1, iteration: 2 }, []],
    ['after somebody asked for changes', put, [verdict('ask-for-changes'), verdict('recommend')]],
  ])('the originator has it %s', (_name, last, verdicts) => {
    expect(handsOf(inReview, last, verdicts)).toBe('originator');
  });

  test('goes back with the next round, even on the same content', () => {
    expect(handsOf(inReview, { round: 2, iteration: 3 }, [verdict('ask-for-changes', 3, 1)])).toBe(
      'reviewers',
    );
  });

  test('decides on verdicts and on putting it forward', () => {
    expect(mayReview(reviewer, inReview, 'reviewers').allowed).toBe(true);
    expect(mayReview(reviewer, inReview, 'originator')).toMatchObject({ allowed: false, code: 'conflict' });
    expect(mayPutForward(originator, inReview, 'originator').allowed).toBe(true);
    expect(mayPutForward(originator, inReview, 'reviewers')).toMatchObject({ code: 'conflict' });
    for (const who of [reviewer, engineer]) {
      expect(mayPutForward(who, inReview, 'originator')).toMatchObject({ code: 'forbidden' });
    }
    expect(mayPutForward(originator, { ...inReview, standing: 'draft' }, 'originator')).toMatchObject({
      code: 'conflict',
    });
  });

  test('nobody takes the review of what they originated', () => {
    expect(mayTakeReview(originator, inReview)).toMatchObject({ code: 'forbidden' });
    expect(mayTakeReview(engineer, inReview)).toMatchObject({ code: 'forbidden' });
    expect(mayTakeReview(reviewer, inReview).allowed).toBe(true);
  });
});

describe('verdicts', () => {
  test('count for their own iteration alone, even when a later one has the same words', () => {
    const verdicts = [verdict('recommend', 2), verdict('recommend', 3, 2, 'other')];
    expect(tally(3, verdicts)).toEqual({ favourable: 1, open: 0 });
    expect(verdicts.map((one) => isCurrent(one, 3, verdicts))).toEqual([false, true]);
  });

  test('give way to the last word of the same person', () => {
    const verdicts = [verdict('ask-for-changes'), verdict('recommend', 3, 2)];
    expect(tally(3, verdicts)).toEqual({ favourable: 1, open: 0 });
    expect(verdicts.map((one) => isCurrent(one, 3, verdicts))).toEqual([false, true]);
  });
});

describe('comments', () => {
  const comment = (facts: Partial<CommentFacts> = {}): CommentFacts => ({
    byId: 'reviewer',
    resolved: false,
    answers: 0,
    ...facts,
  });

  test('are resolved by whoever made them, or by the originator once answered', () => {
    expect(mayResolve(reviewer, inReview, comment()).allowed).toBe(true);
    expect(mayResolve(originator, inReview, comment())).toMatchObject({ code: 'conflict' });
    expect(mayResolve(originator, inReview, comment({ answers: 1 })).allowed).toBe(true);
    expect(mayResolve(engineer, inReview, comment({ answers: 1 }))).toMatchObject({ code: 'forbidden' });
  });

  test('are over once resolved', () => {
    expect(mayResolve(reviewer, inReview, comment({ resolved: true }))).toMatchObject({ code: 'conflict' });
    expect(mayAnswer(reviewer, comment({ resolved: true }))).toMatchObject({ code: 'conflict' });
    expect(mayAnswer(actor('auditor', 'auditor'), comment())).toMatchObject({ code: 'forbidden' });
  });
});
