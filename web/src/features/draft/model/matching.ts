/** One entry of a list that is searched by its words. */
export interface SearchChoice {
  value: string;
  label: string;
  /** Said beside it, and searched as well. */
  detail?: string;
}

const MOST = 40;

/** The choices that have every typed word; those that begin with what was typed come first. */
export function matching(choices: readonly SearchChoice[], typed: string): SearchChoice[] {
  const words = plain(typed).split(/\s+/).filter(Boolean);
  const found = choices.filter(({ label, value, detail = '' }) => {
    const text = plain(`${label} ${value} ${detail}`);
    return words.every((word) => text.includes(word));
  });
  const start = plain(typed).trim();
  const first = found.filter(({ label }) => start !== '' && plain(label).startsWith(start));
  return [...first, ...found.filter((choice) => !first.includes(choice))].slice(0, MOST);
}

function plain(text: string): string {
  return text
    .normalize('NFKD')
    .replace(/[\u0300-\u036f]/g, '')
    .toLowerCase();
}
