import type { Problem } from '../evaluation/outcome.js';
import { endsBefore, type Interval } from '../bounds/interval.js';
import { definition } from './check-symbols.js';
import type { Bound, Piece, Stretch } from './common-schema.js';
import { memberPath, type Calculable } from './lines.js';
import { piecesApart } from './piece-intervals.js';

/** Bounds stand on known symbols, are ordered and not empty; pieces do not overlap. */
export function checkBounds(calculable: Calculable): Problem[] {
  const known = new Set([...calculable.quantities, ...calculable.lines].map(({ symbol }) => symbol));
  const seen = new Set<string>();
  const problems: Problem[] = [];
  for (const [i, bound] of calculable.bounds.entries()) {
    const field = `bounds[${i}]`;
    if (!known.has(bound.on)) problems.push(definition(`${field}.on`, `There is no symbol ${bound.on}.`));
    if (seen.has(bound.on))
      problems.push(definition(`${field}.on`, `${bound.on} has two bounds; use stretches.`));
    seen.add(bound.on);
    problems.push(...checkStretches(bound, field));
  }
  for (const line of calculable.lines)
    problems.push(...checkPieces(line.pieces ?? [], memberPath(line, 'pieces'), known));
  return problems;
}

function checkStretches({ basis, stretches }: Bound, field: string): Problem[] {
  if (basis === 'none' && stretches.length > 0)
    return [definition(`${field}.basis`, 'A bound of basis "none" has no stretches.')];
  if (basis !== 'none' && stretches.length === 0)
    return [definition(`${field}.stretches`, 'A bound has a stretch at least, or the basis "none".')];
  return stretches.flatMap((stretch, i) =>
    checkStretch(stretch, stretches[i + 1], `${field}.stretches[${i}]`),
  );
}

function checkStretch(stretch: Stretch, next: Stretch | undefined, field: string): Problem[] {
  const { lo, hi } = stretch;
  const problems: Problem[] = [];
  if (!lo && !hi) problems.push(definition(field, 'A stretch has one limit at least.'));
  if (lo && hi && lo.value >= hi.value)
    problems.push(definition(field, `The lower limit ${lo.value} is not below the upper limit ${hi.value}.`));
  for (const [side, end] of [
    ['lo', lo],
    ['hi', hi],
  ] as const)
    if (end?.reach !== undefined && end.nature !== 'data')
      problems.push(definition(`${field}.${side}.reach`, 'Only a bound of data has a reach.'));
  if (next && !endsBefore(span(stretch), span(next)))
    problems.push(definition(field, 'Stretches ascend and share no value.'));
  return problems;
}

function span({ lo, hi }: Stretch): Interval {
  return { lo: lo?.value, hi: hi?.value, loClosed: lo?.closed ?? true, hiClosed: hi?.closed ?? true };
}

function checkPieces(pieces: Piece[], path: string, known: ReadonlySet<string>): Problem[] {
  const problems: Problem[] = [];
  for (const [i, piece] of pieces.entries()) {
    for (const [j, { on, lo, hi }] of piece.when.entries()) {
      const field = `${path}[${i}].when[${j}]`;
      if (!known.has(on)) problems.push(definition(`${field}.on`, `There is no symbol ${on}.`));
      if (lo === undefined && hi === undefined)
        problems.push(definition(field, 'A condition has one limit at least.'));
      if (lo !== undefined && hi !== undefined && lo > hi)
        problems.push(definition(field, `The lower limit ${lo} is above the upper limit ${hi}.`));
    }
    for (const [j, other] of pieces.entries())
      if (j > i && !piecesApart(piece, other))
        problems.push(definition(`${path}[${j}].when`, `Pieces ${i + 1} and ${j + 1} overlap.`));
  }
  return problems;
}
