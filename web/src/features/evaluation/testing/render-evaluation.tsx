import {
  compileCorrelation,
  compilePropertyEquation,
  evaluate,
  type EvaluationRequest,
} from '@merestone/engine';
import { fireEvent, render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { vi } from 'vitest';
import type { Sheet } from '../../../shared/api/types';
import { gillilandSherwood, idealGasDryAir } from '../../../shared/samples/gilliland-sherwood';
import { sampleSheet } from '../../../shared/samples/sheets';
import { DutyPanel } from '../components/duty-panel';
import { OutcomePanel } from '../components/outcome-panel';
import { useEvaluation } from '../hooks/use-evaluation';
import { fieldId } from '../model/field-id';

function Evaluation({ sheet, notInUse }: { sheet: Sheet; notInUse: string | null }) {
  const evaluation = useEvaluation(sheet, 'p-engineer');
  return (
    <>
      <DutyPanel evaluation={evaluation} notInUse={notInUse} />
      <OutcomePanel evaluation={evaluation} firstNumber={3} notInUse={notInUse} />
    </>
  );
}

/** Draws the duty and its outcome for a sheet, as the page of a sheet does. */
export function renderEvaluation(sheet: Sheet = sampleSheet(), notInUse: string | null = null) {
  const user = userEvent.setup();
  const view = render(
    <MemoryRouter>
      <Evaluation sheet={sheet} notInUse={notInUse} />
    </MemoryRouter>,
  );
  return { user, ...view };
}

/** The input of a field by its key. */
export function field(key: string): HTMLInputElement {
  const found = document.getElementById(fieldId(key));
  if (!(found instanceof HTMLInputElement)) throw new Error(`there is no field ${key}`);
  return found;
}

/** Puts in a whole duty at once. */
export function fillIn(duty: Readonly<Record<string, string>>): void {
  for (const [key, value] of Object.entries(duty)) fireEvent.change(field(key), { target: { value } });
}

/** Stands in for the server: computes with the same engine and answers as the contract has it. */
export function serveEvaluations() {
  const correlation = compileCorrelation(gillilandSherwood);
  const equation = compilePropertyEquation('ideal-gas-dry-air', idealGasDryAir);
  if (!correlation.ok || !equation.ok) throw new Error('the samples do not compile');
  const asked: (EvaluationRequest & { revision?: number })[] = [];
  const answer = (status: number, body: unknown) => new Response(JSON.stringify(body), { status });
  vi.stubGlobal('fetch', async (call: Request) => {
    const { revision, ...request } = (await call.json()) as EvaluationRequest & { revision?: number };
    asked.push({ revision, ...request });
    const evaluation = evaluate(correlation.compiled, request, () => equation.compiled);
    if (!evaluation.ok)
      return answer(400, {
        title: 'Not possible',
        type: 'urn:merestone:problem:malformed',
        detail: 'Some fields cannot be used.',
        fields: evaluation.problems,
      });
    const { outcome } = evaluation;
    if (outcome.outcome === 'refused')
      return answer(422, {
        type: `urn:merestone:problem:${outcome.code}`,
        title: 'No number is given here',
        detail: outcome.message,
        findings: outcome.findings,
        alternatives: [{ slug: 'linton-sherwood', title: 'Pipe, turbulent', geometry: 'pipe' }],
      });
    return answer(200, {
      ...outcome,
      id: 'ev-0001',
      at: '2026-03-04T11:22:00Z',
      slug: 'gilliland-sherwood',
      revision: 2,
      standing: 'approved',
      provenance: {
        slug: 'gilliland-sherwood',
        revision: 2,
        hash: 'abc',
        engine: '0.1.0',
        equations: [],
        rows: {},
      },
      caution: 'An estimate from a published correlation.',
    });
  });
  return asked;
}
