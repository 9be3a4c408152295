const SMALL = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten'];

/** How many notices wait to be read, in words as far as words are short. */
export function noticeCountWords(unread: number): string {
  const count = SMALL[unread] ?? String(unread);
  return `${count} new ${unread === 1 ? 'notice' : 'notices'}`;
}
