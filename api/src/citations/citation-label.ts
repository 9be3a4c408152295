import type { CslItem } from '@merestone/engine';

/** Short names for citations, each its own within the list: `gilliland1934`, `akita1973b`. */
export function citationLabels(items: readonly CslItem[]): string[] {
  const stems = items.map(stemOf);
  return stems.map((stem, i) => {
    const earlier = stems.slice(0, i).filter((other) => other === stem).length;
    const alone = earlier === 0 && !stems.includes(stem, i + 1);
    return alone ? stem : `${stem}${letters(earlier)}`;
  });
}

function stemOf({ author, issued, title }: CslItem): string {
  const first = author?.[0];
  const name = ascii(first?.family ?? first?.literal ?? '') || ascii(title ?? '').slice(0, 20) || 'source';
  return `${name}${issued?.['date-parts'][0]?.[0] ?? ''}`;
}

function ascii(text: string): string {
  return text
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[^a-z0-9]/g, '');
}

/** a … z, aa … */
function letters(index: number): string {
  const rest = Math.floor(index / 26);
  return (rest > 0 ? letters(rest - 1) : '') + String.fromCharCode(97 + (index % 26));
}
