import { LONGEST_REASON, SHORTEST_REASON } from '@merestone/engine';
import { findingLabel } from './finding-label';

/** Fewest and most characters of a reason, as the engine and so the server ask for. */
export const MIN_REASON = SHORTEST_REASON;
export const MAX_REASON = LONGEST_REASON;

/** What is wrong with a reason, or null. */
export function reasonError(symbol: string, reason: string): string | null {
  const { length } = reason.trim();
  if (length === 0) return `Say why ${findingLabel(symbol)} may be outside its bound.`;
  if (length < MIN_REASON)
    return `The reason for ${findingLabel(symbol)} needs ${MIN_REASON - length} more characters.`;
  if (length > MAX_REASON)
    return `The reason for ${findingLabel(symbol)} may have ${MAX_REASON} characters at most.`;
  return null;
}
