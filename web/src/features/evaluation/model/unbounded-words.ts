import type { Finding } from '@merestone/engine';
import { inWords } from '../../../shared/format/in-words';
import { findingLabel } from './finding-label';
import { unboundedSymbols } from './refusing-findings';

/** What is left to the engineer, where a sheet has no bound for some symbols; null where it has one for each. */
export function unboundedWords(findings: readonly Finding[]): string | null {
  const symbols = unboundedSymbols(findings);
  return symbols.length === 0
    ? null
    : `No bound is on record for ${inWords(symbols.map(findingLabel))}: whether the sheet holds here is the engineer's to judge.`;
}
