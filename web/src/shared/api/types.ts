import type {
  Bound,
  CheckReport,
  CorrelationDefinition,
  Finding,
  Outcome,
  PropertyEquationDefinition,
  Stretch,
} from '@merestone/engine';

/** Shapes of the server's answers. */

export interface FieldProblem {
  field: string;
  code: string;
  message: string;
}
export interface OtherSheet {
  slug: string;
  title: string;
  geometry: string;
}
export interface ProblemBody {
  type?: string;
  title: string;
  status?: number;
  detail?: string;
  fields?: FieldProblem[];
  findings?: Finding[];
  alternatives?: OtherSheet[];
}

export type Role = 'engineer' | 'reviewer' | 'authority' | 'auditor' | 'administrator';
export interface PersonName {
  id: string;
  name: string;
}
export interface SessionAnswer {
  person: PersonName & { email: string; roles: Role[] };
  permissions: string[];
}
export interface DemoPeople {
  items: { name: string; email: string; roles: Role[] }[];
  password: string;
}

export type Standing =
  'draft' | 'in review' | 'approved' | 'suspended' | 'superseded' | 'withdrawn' | 'declined';
export type Phase = CorrelationDefinition['phase'];
export type Verification = CorrelationDefinition['verification']['status'];

export interface Geometry {
  slug: string;
  name: string;
  summary: string;
  characteristicLength: string;
  velocity: string;
  cautions: string[];
  total: number;
  approved: number;
}

export interface FacetCount {
  value: string;
  label: string;
  count: number;
}
export interface ListedBound {
  symbol: string;
  name: string;
  unit: string;
  basis: Bound['basis'];
  stretches: Stretch[];
}
export interface ListedCorrelation {
  slug: string;
  title: string;
  authors: string[];
  year: number | null;
  geometry: string;
  geometryName: string;
  phase: Phase;
  standing: Standing;
  revision: number;
  summary: string;
  verification: Verification;
  bounds: ListedBound[];
}
export interface CorrelationPage {
  items: ListedCorrelation[];
  nextCursor: string | null;
  total: number;
  facets: { geometry: FacetCount[]; phase: FacetCount[]; standing: FacetCount[] };
}

export interface SheetEquation {
  slug: string;
  revision: number;
  hash: string;
  definition: PropertyEquationDefinition;
}
export interface Sheet {
  slug: string;
  title: string;
  geometry: string;
  geometryName: string;
  standing: Standing;
  revision: number;
  iteration: number;
  hash: string;
  definition: CorrelationDefinition;
  originator: PersonName;
  revisions: { number: number; standing: Standing; hash: string; at: string }[];
  history: { standing: Standing; at: string; by: PersonName; note: string | null }[];
  reviews: {
    reviewer: PersonName;
    verdict: 'recommend' | 'ask-for-changes' | 'decline';
    at: string;
    note: string | null;
  }[];
  approval: { by: PersonName; at: string; meaning: string; hash: string } | null;
  checks: CheckReport[];
  standingNote: string | null;
  usage: { evaluations: number; calculations: number };
  equations: SheetEquation[];
  abilities: Record<'evaluate' | 'edit' | 'submit' | 'review' | 'approve' | 'suspend' | 'withdraw', boolean>;
  caution: string;
}

export interface Provenance {
  slug: string;
  revision: number;
  hash: string;
  engine: string;
  equations: { key: string; revision: number; hash: string }[];
  rows: Record<string, string>;
}
export type KeptEvaluation = Exclude<Outcome, { outcome: 'refused' }> & {
  id: string;
  at: string;
  slug: string;
  revision: number;
  standing: Standing;
  provenance: Provenance;
  caution: string;
};

export interface ListedPropertyEquation {
  slug: string;
  title: string;
  fluid: string;
  gives: string;
  unit: string;
  revision: number;
  hash: string;
  standing: Standing;
}
export interface PropertyEquationSheet extends ListedPropertyEquation {
  definition: PropertyEquationDefinition;
  checks: CheckReport[];
  /** Why it is not approved. */
  standingNote: string | null;
  caution: string;
}

export interface JournalEntry {
  index: number;
  at: string;
  actor: PersonName | null;
  act: string;
  subject: string;
  detail: unknown;
  leaf: string;
}
export interface JournalPage {
  items: JournalEntry[];
  nextCursor: string | null;
  size: number;
  /** Null when stored hashes are gone. */
  root: string | null;
}
export interface JournalVerification {
  ok: boolean;
  entries: number;
  firstFault?: { index: number; kind: string; message: string };
}
