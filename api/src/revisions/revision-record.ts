import type { Standing } from '../common/standing.js';

export type SubjectKind = 'correlation' | 'property-equation';

/** Names one revision of a correlation or a property equation. */
export interface RevisionKey {
  readonly kind: SubjectKind;
  readonly slug: string;
  readonly number: number;
}

/** Names a revision of a correlation, as the path does. */
export interface RevisionPath {
  readonly slug: string;
  readonly number: number;
}

/** A revision as it stands now: identity, standing at this moment and latest content. */
export interface RevisionRecord extends RevisionKey {
  readonly id: number;
  /** Null for a property equation. */
  readonly geometry: string | null;
  readonly originatorId: string;
  readonly createdAt: string;
  readonly standing: Standing;
  /** When it got that standing. */
  readonly standingAt: string;
  readonly standingNote: string | null;
  readonly iteration: number;
  readonly hash: string;
  readonly title: string;
  /** Null for a property equation. */
  readonly phase: string | null;
  /** The moment from which on its approval holds; null before any approval. */
  readonly effectiveFrom: string | null;
  /** When the office wants to look at it again. */
  readonly reviewDue: string | null;
  /** Approved, its effective date has come, and no later revision is in force. */
  readonly inForce: boolean;
}

const PATHS: Record<SubjectKind, string> = {
  correlation: 'correlations',
  'property-equation': 'property-equations',
};

/** The revision's path as in the API; the journal names it so. */
export function subjectOf(key: RevisionKey): string {
  return `${PATHS[key.kind]}/${key.slug}/revisions/${key.number}`;
}
