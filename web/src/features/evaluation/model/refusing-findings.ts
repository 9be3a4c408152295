import type { Finding } from '@merestone/engine';

const REFUSING = new Set<Finding['kind']>(['outside', 'past-reach', 'between']);

/** The findings that keep a number from being given. */
export function refusingFindings(findings: readonly Finding[]): Finding[] {
  return findings.filter((finding) => REFUSING.has(finding.kind));
}

/** Symbols that the sheet has no bound for at all; one sentence does for them. */
export function unboundedSymbols(findings: readonly Finding[]): string[] {
  return findings.filter(isUnbounded).map(({ symbol }) => symbol);
}

function isUnbounded({ kind, basis, value }: Finding): boolean {
  return kind === 'unchecked' && basis === 'none' && value !== null;
}

/** Findings worth a sentence of their own beside a number: near a bound, not held, or outside under a deviation. */
export function notableFindings(findings: readonly Finding[]): Finding[] {
  return findings.filter((finding) => finding.kind !== 'within' && !isUnbounded(finding));
}
