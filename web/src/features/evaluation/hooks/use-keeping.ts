import type { DeviationRequest, EvaluationRequest } from '@merestone/engine';
import { useCallback, useState } from 'react';
import { asApiProblem } from '../../../shared/api/api-problem';
import { keepEvaluation } from '../api/keep-evaluation';
import { withDeviations } from '../model/build-request';
import { askedOf, type Keeping } from '../model/keeping';

const REFUSALS = new Set(['out-of-bounds', 'past-reach', 'between-pieces']);

/** Sends duties to the server to be computed and kept there. */
export function useKeeping(slug: string, revision: number) {
  const [keeping, setKeeping] = useState<Keeping>({ state: 'none' });
  const keep = useCallback(
    async (request: EvaluationRequest, deviations: DeviationRequest[] = []) => {
      const asked = askedOf(request);
      const whole = withDeviations(request, deviations);
      setKeeping({ state: 'sending', asked });
      try {
        const kept = await keepEvaluation(slug, revision, whole);
        setKeeping({ state: 'kept', asked, kept, request: whole });
      } catch (thrown) {
        const problem = asApiProblem(thrown);
        setKeeping({ state: REFUSALS.has(problem.code) ? 'refused' : 'failed', asked, problem });
      }
    },
    [slug, revision],
  );
  const forget = useCallback(() => setKeeping({ state: 'none' }), []);
  return { keeping, keep, forget };
}
