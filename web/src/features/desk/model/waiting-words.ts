import type { DeskSection } from '../../../shared/api/types';

/** How much waits, as the page's first sentence. */
export function waitingWords(sections: readonly DeskSection[]): string {
  const count = sections.reduce((sum, { items }) => sum + items.length, 0);
  if (count === 0) return 'Nothing waits for you.';
  return count === 1 ? 'One thing waits for you.' : `${count} things wait for you.`;
}
