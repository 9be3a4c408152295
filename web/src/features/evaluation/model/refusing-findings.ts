import type { Finding } from '@merestone/engine';

const REFUSING = new Set<Finding['kind']>(['outside', 'past-reach', 'between']);

/** The findings that keep a number from being given. */
export function refusingFindings(findings: readonly Finding[]): Finding[] {
  return findings.filter((finding) => REFUSING.has(finding.kind));
}

/** Findings worth a word beside a number: near a bound, unchecked, or outside under a deviation. */
export function notableFindings(findings: readonly Finding[]): Finding[] {
  return findings.filter((finding) => finding.kind !== 'within');
}
