import {
  compileCorrelation,
  compilePropertyEquation,
  runChecks,
  type CorrelationDefinition,
} from '@merestone/engine';
import type { Sheet } from '../api/types';
import { gillilandSherwood, idealGasDryAir } from './gilliland-sherwood';

/** A sheet as the server would send it, about a sample definition. Made for tests. */
export function sampleSheet(
  definition: CorrelationDefinition = gillilandSherwood,
  over: Partial<Sheet> = {},
): Sheet {
  const compiled = compileCorrelation(definition);
  if (!compiled.ok) throw new Error(compiled.problems.map((p) => `${p.field}: ${p.message}`).join('; '));
  const equation = compilePropertyEquation('ideal-gas-dry-air', idealGasDryAir);
  const hash = '7f3ac19e04b27f3ac19e04b27f3ac19e04b27f3ac19e04b27f3ac19e04b21234';
  const originator = { id: 'p-engineer', name: 'Edda Krantz' };
  return {
    slug: 'gilliland-sherwood',
    title: definition.title,
    geometry: definition.geometry,
    geometryName: 'Wetted wall',
    standing: 'approved',
    revision: 2,
    iteration: 1,
    hash,
    definition,
    originator,
    revisions: [
      { number: 1, standing: 'superseded', hash: `1${hash.slice(1)}`, at: '2026-01-12T09:00:00Z' },
      { number: 2, standing: 'approved', hash, at: '2026-03-03T10:00:00Z' },
    ],
    history: [
      { standing: 'draft', at: '2026-02-20T09:00:00Z', by: originator, note: null, class: null },
      { standing: 'in review', at: '2026-02-21T09:00:00Z', by: originator, note: null, class: null },
      {
        standing: 'approved',
        at: '2026-03-03T10:00:00Z',
        by: { id: 'p-authority', name: 'Ines Vauquelin' },
        note: 'After two reviews.',
        class: null,
      },
    ],
    reviews: [
      {
        reviewer: { id: 'p-reviewer', name: 'Tomas Lindqvist' },
        verdict: 'recommend',
        at: '2026-02-25T09:00:00Z',
        note: 'Recomputed by hand.',
        hash,
        current: true,
      },
    ],
    comments: [],
    approval: {
      by: { id: 'p-authority', name: 'Ines Vauquelin' },
      at: '2026-03-03T10:00:00Z',
      meaning: 'Approved for gas-side design in wetted walls by this office.',
      hash,
    },
    checks: runChecks(compiled.compiled, () => (equation.ok ? equation.compiled : undefined)),
    standingNote: null,
    effectiveFrom: '2026-03-03T10:00:00Z',
    reviewDue: '2029-03-03T10:00:00Z',
    inForce: true,
    successor: null,
    withdrawal: null,
    suspension: null,
    openReports: 0,
    inspection: { passed: true, warnings: 1, errors: 0 },
    usage: { evaluations: 12, calculations: 4 },
    equations: [{ slug: 'ideal-gas-dry-air', revision: 1, hash, definition: idealGasDryAir }],
    abilities: {
      evaluate: true,
      edit: false,
      submit: false,
      comment: false,
      review: false,
      approve: false,
      decline: false,
      suspend: false,
      reinstate: false,
      withdraw: false,
    },
    caution:
      'An estimate from a published correlation. It does not replace vendor data, pilot tests, local codes, or the judgement of the engineer responsible for the design.',
    ...over,
  };
}
