import type { CorrelationDefinition } from '@merestone/engine';
import { RESULT_WORDS } from './plain-words';

type Part = CorrelationDefinition['parts'][number];

/** What a part's result is: `Sherwood number`; of a method with several parts with the part it belongs to. */
export function nameOfResult(
  { parts }: Pick<CorrelationDefinition, 'parts'>,
  key: string,
): string | undefined {
  const part = parts.find((one) => one.key === key);
  if (!part) return undefined;
  const words = RESULT_WORDS[part.result.kind];
  return parts.length > 1 ? `${part.title}: ${words}` : `${words.charAt(0).toUpperCase()}${words.slice(1)}`;
}

/** What a part's coefficient is; a title that says `coefficient` already says enough. */
export function coefficientTitle({ title }: Pick<Part, 'title'>): string {
  return /coefficient/i.test(title) ? title : `${title}: coefficient`;
}
