import type { CorrelationDefinition, PropertyEquationDefinition } from '@merestone/engine';

/** What a sheet of the library starts as in the demo office, and why it is not more. */
export type StartingStanding =
  { readonly standing: 'approved' } | { readonly standing: 'in review' | 'draft'; readonly reason: string };

const APPROVED: StartingStanding = { standing: 'approved' };

/**
 * Approved where the expression was seen, at least one limit comes from the source or a handbook, and no limit on a
 * symbol that the formula stands on is common practice only. That nothing is on record for a symbol (`none`) does not
 * stand in the way: the evaluation says so each time.
 */
export function correlationStanding(definition: CorrelationDefinition): StartingStanding {
  const { verification, bounds } = definition;
  if (verification.status === 'from-memory') {
    return inReview(
      'The expression is from memory and has to be held against the source before it may be approved.',
      verification.note,
    );
  }
  const limited = bounds.filter(({ stretches }) => stretches.length > 0);
  const founded = limited.filter(({ basis }) => basis === 'stated' || basis === 'handbook');
  if (founded.length === 0) {
    return inReview('No limit of its range is on record from the source or from a handbook.');
  }
  const stoodOn = symbolsStoodOn(definition);
  const habit = limited.filter(({ on, basis }) => basis === 'common-practice' && stoodOn.has(on));
  if (habit.length > 0) {
    const symbols = habit.map(({ on }) => on).join(', ');
    return inReview(
      `The limits of ${symbols} are common practice; no source or handbook was found that states them.`,
    );
  }
  return APPROVED;
}

/**
 * Of a property equation the values are the proof: approved where its expression was seen or it reproduces published
 * values. The basis of its bounds is told with every finding.
 */
export function propertyEquationStanding({
  verification,
  checks,
}: PropertyEquationDefinition): StartingStanding {
  if (verification.status !== 'from-memory' || checks.some(({ kind }) => kind === 'published'))
    return APPROVED;
  return inReview(
    'The expression is from memory and no published value stands beside it.',
    verification.note,
  );
}

function inReview(...sentences: string[]): StartingStanding {
  return { standing: 'in review', reason: sentences.join(' ') };
}

/** Every symbol in the results' formulas, and in the intermediate steps that these use. */
function symbolsStoodOn({ parts, intermediates = [] }: CorrelationDefinition): ReadonlySet<string> {
  const formulas = new Map(intermediates.map((one) => [one.symbol, one]));
  const found = new Set<string>();
  const visit = (formula: Formula): void => {
    for (const symbol of symbolsIn(formula)) {
      if (found.has(symbol)) continue;
      found.add(symbol);
      const inner = formulas.get(symbol);
      if (inner) visit(inner);
    }
  };
  for (const { result } of parts) visit(result);
  return found;
}

interface Formula {
  readonly expression?: string | undefined;
  readonly pieces?: readonly { expression: string; when: readonly { on: string }[] }[] | undefined;
}

function symbolsIn({ expression = '', pieces = [] }: Formula): string[] {
  const text = [expression, ...pieces.map((piece) => piece.expression)].join(' ');
  return text.match(/[A-Za-z][A-Za-z0-9_]*/g) ?? [];
}
