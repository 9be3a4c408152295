import { compareDefinitions, inspectCorrelation, type CorrelationDefinition } from '@merestone/engine';
import type { Review, ReviewComment } from '../../../shared/api/types';
import { gillilandSherwood } from '../../../shared/samples/gilliland-sherwood';

export const HASH = 'aa7b4f1df527aa7b4f1df527aa7b4f1df527aa7b4f1df527aa7b4f1df5271234';
const FIRST_HASH = `1${HASH.slice(1)}`;

export const people = {
  originator: { id: 'p-engineer', name: 'Edda Krantz' },
  reviewer: { id: 'p-reviewer', name: 'Tomas Lindqvist' },
  second: { id: 'p-second', name: 'Wanda Ferrell' },
};

const CHECKED = {
  expression: true,
  definitions: true,
  ranges: true,
  basis: true,
  recalculated: true,
  duplicates: true,
};

/** The content of the first iteration: its exponent was read wrongly, its range too wide. */
export const firstContent: CorrelationDefinition = {
  ...gillilandSherwood,
  bounds: gillilandSherwood.bounds.map((bound) =>
    bound.on === 'Re'
      ? {
          ...bound,
          stretches: [{ lo: { value: 2000, nature: 'regime' }, hi: { value: 40000, nature: 'data' } }],
        }
      : bound,
  ),
  parts: gillilandSherwood.parts.map((part) => ({
    ...part,
    result: { ...part.result, expression: '0.023*Re^0.81*Sc^0.44' },
  })),
};

export function sampleComment(over: Partial<ReviewComment> = {}): ReviewComment {
  return {
    id: 7,
    field: 'bounds[0]',
    text: 'The table goes to 27 000 only.',
    by: people.reviewer,
    at: '2026-02-22T09:00:00Z',
    iteration: 1,
    resolved: null,
    answers: [],
    abilities: { answer: true, resolve: true },
    ...over,
  };
}

const NO_ABILITIES: Review['abilities'] = {
  take: false,
  comment: true,
  resolve: false,
  verdict: false,
  putForward: false,
  approve: false,
  decline: false,
  edit: false,
  suspend: false,
  reinstate: false,
  withdraw: false,
};

/** A review in its second iteration, as the server would send it. Made for tests. */
export function sampleReview(
  over: Partial<Omit<Review, 'abilities'>> = {},
  abilities: Partial<Review['abilities']> = {},
): Review {
  return {
    slug: 'gilliland-sherwood',
    title: gillilandSherwood.title,
    revision: 2,
    iteration: 2,
    hash: HASH,
    standing: 'in review',
    originator: people.originator,
    hands: 'reviewers',
    definition: gillilandSherwood,
    inspection: inspectCorrelation(gillilandSherwood, () => undefined),
    reviewersNeeded: 2,
    assignments: [{ reviewer: people.reviewer, how: 'named', at: '2026-02-21T09:00:00Z' }],
    verdicts: [
      {
        reviewer: people.second,
        verdict: 'recommend',
        checklist: CHECKED,
        note: 'Two points recomputed.',
        at: '2026-02-22T10:00:00Z',
        iteration: 1,
        hash: FIRST_HASH,
        current: false,
      },
      {
        reviewer: people.reviewer,
        verdict: 'recommend',
        checklist: CHECKED,
        note: null,
        at: '2026-02-24T10:00:00Z',
        iteration: 2,
        hash: HASH,
        current: true,
      },
    ],
    comments: [sampleComment()],
    rounds: [
      { round: 1, iteration: 1, at: '2026-02-21T09:00:00Z', note: null, by: people.originator },
      {
        round: 2,
        iteration: 2,
        at: '2026-02-23T09:00:00Z',
        note: 'Exponent and range are those of the source again.',
        by: people.originator,
      },
    ],
    iterations: [
      { number: 1, at: '2026-02-21T09:00:00Z', hash: FIRST_HASH, differences: [] },
      {
        number: 2,
        at: '2026-02-23T09:00:00Z',
        hash: HASH,
        differences: compareDefinitions(firstContent, gillilandSherwood),
      },
    ],
    approvals: { favourable: 1, needed: 2 },
    ...over,
    abilities: { ...NO_ABILITIES, ...abilities },
  };
}
