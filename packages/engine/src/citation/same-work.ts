import type { CslItem } from '../sheet/common-schema.js';
import { doiKey, readDoi } from './doi.js';

/** How two citations were found to name one work: by their DOI, or by first author, year, container and first page. */
export type Likeness = 'doi' | 'place';

export interface DuplicatePair {
  /** Indices in the list, `first` below `second`. */
  readonly first: number;
  readonly second: number;
  readonly by: Likeness;
}

/** What a citation is recognised by. Make it once for each item that is compared often. */
export interface CitationKey {
  readonly doi: string;
  /** First author, year and first page, or for want of pages the title; empty where they do not tell enough. */
  readonly place: string;
  /** Words of the container, full or abbreviated; empty for what stands alone. */
  readonly container: readonly string[];
}

export function citationKey(item: CslItem): CitationKey {
  const author = firstAuthor(item);
  const year = String(item.issued?.['date-parts'][0]?.[0] ?? '');
  const page = /[A-Za-z]*\d+/.exec((item.page ?? '').slice(0, TELLING))?.[0].toLowerCase() ?? '';
  const container = item['container-title'] ?? '';
  const within = container !== '' && page !== '' ? `p ${page}` : `t ${wordsOf(item.title ?? '').join(' ')}`;
  const doi = readDoi(item.DOI ?? '');
  return {
    doi: doi === undefined ? '' : doiKey(doi.name),
    place: author === '' || year === '' || within === 't ' ? '' : `${author} ${year} ${within}`,
    container: wordsOf(container).filter((word) => !LINKING.has(word)),
  };
}

/** Whether two citations name the same work, and what tells so; undefined where nothing does. */
export function sameWork(a: CitationKey, b: CitationKey): Likeness | undefined {
  if (a.doi !== '' && a.doi === b.doi) return 'doi';
  return a.place !== '' && a.place === b.place && sameContainer(a.container, b.container)
    ? 'place'
    : undefined;
}

/** Every pair in a list of citations that names one work. */
export function findDuplicates(items: readonly CslItem[]): DuplicatePair[] {
  const keys = items.map(citationKey);
  return keys.flatMap((key, second) =>
    keys.slice(0, second).flatMap((earlier, first) => {
      const by = sameWork(earlier, key);
      return by === undefined ? [] : [{ first, second, by }];
    }),
  );
}

/** Characters of a text that are compared: whatever agrees so far is the same. */
const TELLING = 500;

/** Words that an abbreviated name of a journal leaves out. */
const LINKING = new Set([
  'the',
  'a',
  'an',
  'of',
  'and',
  'for',
  'in',
  'on',
  'der',
  'die',
  'das',
  'fur',
  'und',
  'de',
  'la',
  'et',
]);

function firstAuthor({ author }: CslItem): string {
  const first = author?.[0];
  // With the given name in front, as some write it, the last word is the family's.
  const name = first?.family ?? first?.literal?.replace(/^([^,]+),.*$/s, '$1') ?? '';
  return wordsOf(name).at(-1) ?? '';
}

function wordsOf(text: string): string[] {
  const plain = text
    .slice(0, TELLING)
    .replaceAll('ß', 'ss')
    .replace(/[øØ]/g, 'o')
    .normalize('NFKD')
    .replace(/\p{M}+/gu, '')
    .toLowerCase();
  return plain.match(/[\p{L}\p{N}]+/gu) ?? [];
}

/** `Ind. Eng. Chem.` is `Industrial & Engineering Chemistry`: word by word, one shortens the other. */
function sameContainer(a: readonly string[], b: readonly string[]): boolean {
  return a.length === b.length && a.every((word, i) => shortens(word, b[i] ?? ''));
}

function shortens(a: string, b: string): boolean {
  const [short, long] = a.length < b.length ? [a, b] : [b, a];
  if (short[0] !== long[0]) return false;
  let at = 0;
  for (const letter of long) if (letter === short[at]) at += 1;
  return at === short.length;
}
