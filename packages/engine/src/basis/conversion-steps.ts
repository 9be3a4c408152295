import { parse } from '../expression/parse.js';
import { putInTex } from '../expression/number-text.js';
import { symbolTex } from '../expression/symbol-tex.js';
import { treeTex } from '../expression/tree-tex.js';
import type { Tree } from '../expression/tree.js';
import { valueTex } from '../evaluation/explain.js';
import type { CoefficientBasis, Conversion, Step } from '../evaluation/outcome.js';
import { CONSTANTS } from '../quantity/constants.js';
import { BASES, liquidConcentration, type CoefficientInSI, type FluidState } from './convert-basis.js';

/** How a coefficient on concentration, k, is put on each basis. */
const FORMULAS: Readonly<Record<CoefficientBasis, string>> = {
  k_c: 'k',
  k_G: 'k/(R*T)',
  k_y: 'k*P/(R*T)',
  F: 'k*p_BM/(R*T)',
  k_L: 'k',
  k_x: 'k*c_L',
};
const LOW_FLUX_F = 'k*P/(R*T)';

const TREES = new Map<string, Tree>();

/** The written-out line of a conversion; none where the basis is the coefficient's own or has no value. */
export function conversionStep(
  part: string,
  own: string,
  from: CoefficientInSI,
  state: FluidState,
  { basis, symbol, value, unit, assumes }: Conversion,
): Step | null {
  if (value === null || symbol === own) return null;
  const letter = symbolTex(symbol);
  const simple = from.basis === 'concentration' && from.rateForm !== 'drift-free';
  const tree = simple ? formula(assumes && basis === 'F' ? LOW_FLUX_F : FORMULAS[basis]) : null;
  const symbolic =
    tree && treeTex(tree, (name) => ({ tex: symbolTex(name === 'k' ? own : name), compound: false }));
  // The same number under another name needs no arithmetic written out.
  const numbers =
    tree && tree.kind !== 'symbol' && treeTex(tree, (name) => putInTex(valueFor(name, from, state)));
  const shown = valueTex(value, unit);
  const words = `${part}, ${BASES[basis].words}`;
  return {
    kind: 'conversion',
    symbol,
    symbolTex: letter,
    tex: symbolic ? `${letter} = ${symbolic}` : letter,
    texWithNumbers: numbers ? `${letter} = ${numbers} = ${shown}` : `${letter} = ${shown}`,
    value,
    unit,
    note: assumes ? `${words}; assumes that ${assumes}` : words,
  };
}

function formula(text: string): Tree | null {
  const kept = TREES.get(text);
  if (kept) return kept;
  const parsed = parse(text);
  if (!parsed.ok) return null;
  TREES.set(text, parsed.tree);
  return parsed.tree;
}

function valueFor(name: string, from: CoefficientInSI, state: FluidState): number {
  const values: Readonly<Record<string, number | null>> = {
    k: from.value,
    T: state.temperature,
    P: state.pressure,
    p_BM: state.inertPressure,
    c_L: liquidConcentration(state),
    R: CONSTANTS['R']?.value ?? null,
  };
  return values[name] ?? Number.NaN;
}
