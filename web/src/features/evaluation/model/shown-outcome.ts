import type { EvaluationRequest, Finding, Numbers, Outcome } from '@merestone/engine';
import type { ApiProblem } from '../../../shared/api/api-problem';
import type { KeptEvaluation, OtherSheet } from '../../../shared/api/types';
import type { Keeping } from './keeping';
import type { Preview } from './preview';

export type Computed = Exclude<Outcome, { outcome: 'refused' }>;

/** What stands under the duty: a kept number, a preview of one, a refusal, or nothing yet. */
export type Shown =
  | { kind: 'nothing' }
  | { kind: 'preview'; outcome: Computed; request: EvaluationRequest }
  | { kind: 'kept'; outcome: KeptEvaluation; request: EvaluationRequest }
  | { kind: 'refusal'; findings: Finding[]; message: string; alternatives: OtherSheet[] | null };

/** The kept number as long as the duty is still the one it was computed for; else what the preview says. */
export function shownOutcome(preview: Preview, keeping: Keeping, asked: string): Shown {
  if (keeping.state === 'kept' && keeping.asked === asked)
    return { kind: 'kept', outcome: keeping.kept, request: keeping.request };
  if (keeping.state === 'refused' && keeping.asked === asked) return refusalOf(keeping.problem);
  if (preview.state !== 'outcome') return { kind: 'nothing' };
  const { outcome } = preview;
  return outcome.outcome === 'refused'
    ? { kind: 'refusal', findings: outcome.findings, message: outcome.message, alternatives: null }
    : { kind: 'preview', outcome, request: preview.request };
}

function refusalOf(problem: ApiProblem): Shown {
  return {
    kind: 'refusal',
    findings: problem.findings,
    message: problem.detail || problem.title,
    alternatives: problem.alternatives,
  };
}

/** Findings of what is shown, for the strips. */
export function findingsOf(shown: Shown): Finding[] {
  if (shown.kind === 'nothing') return [];
  return shown.kind === 'refusal' ? shown.findings : shown.outcome.findings;
}

/** The numbers of what is shown, where there are any. */
export function numbersOf(shown: Shown): Numbers | null {
  return shown.kind === 'preview' || shown.kind === 'kept' ? shown.outcome : null;
}
