import { readFileSync } from 'node:fs';
import { Parser } from 'expr-eval';
import { compile } from 'mathjs';
import { parse } from 'yaml';
import { checkStructure, compileCorrelation, kernelFor, POINT } from '@merestone/engine';
import { fromRoot } from '../house/paths.mjs';

const points = 4096;
const rounds = 9;

/** Gilliland and Sherwood by hand: two groups, two bounds, one power law. */
const byHand = (
  /** @type {number} */ u,
  /** @type {number} */ d,
  /** @type {number} */ rho,
  /** @type {number} */ mu,
  /** @type {number} */ D,
) => {
  const Re = (rho * u * d) / mu;
  const Sc = mu / (rho * D);
  if (!(Re >= 2000 && Re <= 35000)) return Number.NaN;
  if (!(Sc >= 0.6 && Sc <= 2.5)) return Number.NaN;
  return 0.023 * Re ** 0.83 * Sc ** 0.44;
};

/** @typedef {{ u: number, d: number, rho: number, mu: number, D: number }} Duty */

/** Duties inside the bounds, none like the other, so that nothing can be remembered. */
const duties = Array.from({ length: points }, (_, i) => ({
  u: 3 + (i % 97) * 0.06,
  d: 0.04 + (i % 13) * 0.0005,
  rho: 1.1 + (i % 7) * 0.01,
  mu: 1.8e-5 + (i % 5) * 1e-8,
  D: 2.2e-5 + (i % 11) * 1e-8,
}));

const sheet = () => {
  const path = fromRoot('fixtures', 'correlations', 'wetted-wall', 'wetted-wall-gilliland-sherwood.yaml');
  const structure = checkStructure(parse(readFileSync(path, 'utf8')));
  if (!structure.ok) throw new Error(JSON.stringify(structure.problems));
  const result = compileCorrelation(structure.definition);
  if (!result.ok) throw new Error(JSON.stringify(result.problems));
  return result.compiled.sheet;
};

const ours = () => {
  const kernel = kernelFor(sheet(), ['u', 'd', 'rho', 'mu', 'D']);
  const { values, answerSlot } = kernel;
  const [u, d, rho, mu, D] = ['u', 'd', 'rho', 'mu', 'D'].map((symbol) => kernel.slotOf(symbol));
  return (/** @type {Duty} */ duty) => {
    values[u ?? 0] = duty.u;
    values[d ?? 0] = duty.d;
    values[rho ?? 0] = duty.rho;
    values[mu ?? 0] = duty.mu;
    values[D ?? 0] = duty.D;
    return kernel.run() === POINT.within ? values[answerSlot] : Number.NaN;
  };
};

/** The same three expressions and the same bounds around another evaluator. */
const around = (/** @type {(text: string) => (scope: Record<string, number>) => number} */ prepare) => {
  const Re = prepare('rho*u*d/mu');
  const Sc = prepare('mu/(rho*D)');
  const Sh = prepare('0.023*Re^0.83*Sc^0.44');
  return (/** @type {Duty} */ duty) => {
    const scope = { ...duty, Re: 0, Sc: 0 };
    scope.Re = Re(scope);
    if (!(scope.Re >= 2000 && scope.Re <= 35000)) return Number.NaN;
    scope.Sc = Sc(scope);
    if (!(scope.Sc >= 0.6 && scope.Sc <= 2.5)) return Number.NaN;
    return Sh(scope);
  };
};

/** Median time of one call over several rounds; the sum keeps the work from being dropped. */
const nanoseconds = (/** @type {(duty: Duty) => number | undefined} */ evaluate) => {
  const times = [];
  let sum = 0;
  for (let round = 0; round < rounds + 3; round += 1) {
    const start = process.hrtime.bigint();
    for (let repeat = 0; repeat < 20; repeat += 1) for (const duty of duties) sum += evaluate(duty) ?? 0;
    if (round >= 3) times.push(Number(process.hrtime.bigint() - start) / (20 * points));
  }
  if (!Number.isFinite(sum)) throw new Error('A duty of the bench lies outside the bounds.');
  return times.sort((a, b) => a - b)[Math.floor(rounds / 2)] ?? Number.NaN;
};

/** @returns {Promise<import('./bench-table.mjs').BenchTable>} */
export const run = () => {
  const hand = nanoseconds((duty) => byHand(duty.u, duty.d, duty.rho, duty.mu, duty.D));
  const engine = nanoseconds(ours());
  const mathjs = nanoseconds(
    around((text) => {
      const code = compile(text);
      return (scope) => code.evaluate(scope);
    }),
  );
  const exprEval = nanoseconds(
    around((text) => {
      const tree = new Parser().parse(text);
      const method = /** @type {const} */ ('evaluate');
      return (scope) => tree[method](scope);
    }),
  );
  const ratio = engine / hand;
  return Promise.resolve({
    title: 'One bounded evaluation (two groups, two bounds, Sh; no steps)',
    rows: [
      { what: 'hand-written function', value: hand, unit: 'ns' },
      { what: 'this engine', value: engine, unit: 'ns' },
      { what: 'mathjs, compiled', value: mathjs, unit: 'ns' },
      { what: "expr-eval's own evaluate", value: exprEval, unit: 'ns' },
      { what: 'engine : hand-written', value: ratio, unit: '×', aim: '≤ 2.5', met: ratio <= 2.5 },
    ],
    notes: [`median of ${String(rounds)} rounds over ${String(points)} duties, all in one process`],
  });
};
