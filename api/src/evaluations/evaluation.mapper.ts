import type { Outcome } from '@merestone/engine';
import type { Standing } from '../common/standing.js';
import type { Provenance } from '../database/schema/evaluation.js';
import { CAUTION } from '../revisions/caution.js';
import type { EvaluationResponse } from './dto/evaluation-response.dto.js';

export type NumberedOutcome = Exclude<Outcome, { outcome: 'refused' }>;

/** What belongs to a kept number besides the number. */
export interface Keeping {
  readonly id: string;
  readonly at: string;
  readonly standing: Standing;
  readonly provenance: Provenance;
}

export function evaluationResponse(outcome: NumberedOutcome, keeping: Keeping): EvaluationResponse {
  const { id, at, standing, provenance } = keeping;
  const common = {
    id,
    at,
    slug: provenance.slug,
    revision: provenance.revision,
    standing,
    groups: outcome.groups,
    intermediates: outcome.intermediates,
    result: outcome.result,
    coefficient: outcome.coefficient,
    conversions: outcome.conversions,
    parts: outcome.parts,
    flux: outcome.flux,
    findings: outcome.findings,
    steps: outcome.steps,
    equations: outcome.equations,
    rows: outcome.rows,
    remarks: outcome.remarks,
    provenance,
    caution: CAUTION,
  };
  switch (outcome.outcome) {
    case 'within':
      return { outcome: 'within', ...common };
    case 'unchecked':
      return { outcome: 'unchecked', ...common };
    case 'deviating':
      return { outcome: 'deviating', mark: outcome.mark, deviations: outcome.deviations, ...common };
  }
}
