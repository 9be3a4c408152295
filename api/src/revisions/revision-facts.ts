import type { Standing } from '../common/standing.js';
import type { Verdict } from '../common/verdict.js';

/** What the rules of a revision's life look at. */
export interface RevisionFacts {
  readonly standing: Standing;
  readonly originatorId: string;
  readonly iteration: number;
  /** Approved, its effective date has come, and no later revision is in force. */
  readonly inForce: boolean;
}

/** One verdict, in the order in which they were given. */
export interface VerdictFact {
  readonly reviewerId: string;
  readonly verdict: Verdict;
  readonly iteration: number;
  readonly round: number;
}

/** The last time that a revision was put forward. */
export interface RoundFact {
  readonly round: number;
  readonly iteration: number;
}

/** Whose turn it is on a revision in review. */
export type Hands = 'originator' | 'reviewers';

/** What the rules on a comment look at. */
export interface CommentFacts {
  readonly byId: string;
  readonly resolved: boolean;
  readonly answers: number;
}
