import type { DeviationRequest, EvaluationRequest, Finding, Problem } from './outcome.js';

export const SHORTEST_REASON = 20;
export const LONGEST_REASON = 2000;

/** Each deviation names one symbol, once, and says why in a sentence. */
export function checkDeviationForm({ deviations = [] }: EvaluationRequest): Problem[] {
  const seen = new Set<string>();
  return deviations.flatMap(({ symbol, reason }, i) => {
    const problems: Problem[] = [];
    const length = reason.trim().length;
    if (length < SHORTEST_REASON || length > LONGEST_REASON)
      problems.push(
        malformed(
          `deviations[${i}].reason`,
          `A deviation's reason has ${SHORTEST_REASON} to ${LONGEST_REASON} characters; this one has ${length}.`,
        ),
      );
    if (seen.has(symbol))
      problems.push(malformed(`deviations[${i}].symbol`, `${symbol} has two deviations.`));
    seen.add(symbol);
    return problems;
  });
}

/** A deviation answers a finding; one that answers nothing is a mistake worth telling. */
export function checkDeviationTargets(
  { deviations = [] }: EvaluationRequest,
  findings: readonly Finding[],
): Problem[] {
  return deviations.flatMap(({ symbol }, i) => {
    const field = `deviations[${i}].symbol`;
    const found = findings.filter((finding) => finding.symbol === symbol);
    if (found.length === 0) return [malformed(field, `There is no bound on ${symbol}.`)];
    const outside = found.some(
      ({ kind }) => kind === 'outside' || kind === 'past-reach' || kind === 'between',
    );
    return outside ? [] : [malformed(field, `${symbol} needs no deviation: it is not outside its bound.`)];
  });
}

/** The deviations that cover the findings, or null when one is not covered. */
export function coveringDeviations(
  { deviations = [] }: EvaluationRequest,
  outside: readonly Finding[],
): DeviationRequest[] | null {
  const covering = outside.map((finding) =>
    finding.deviable ? deviations.find(({ symbol }) => symbol === finding.symbol) : undefined,
  );
  return covering.every((deviation) => deviation !== undefined)
    ? covering.map(({ symbol, reason }) => ({ symbol, reason: reason.trim() }))
    : null;
}

function malformed(field: string, message: string): Problem {
  return { code: 'malformed', field, message };
}
