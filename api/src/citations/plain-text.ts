const SUPERSCRIPTS = paired('0123456789+-()ni', '⁰¹²³⁴⁵⁶⁷⁸⁹⁺⁻⁽⁾ⁿⁱ');
const SUBSCRIPTS = paired('0123456789+-()', '₀₁₂₃₄₅₆₇₈₉₊₋₍₎');
const ENTITIES: ReadonlyMap<string, string> = new Map([
  ['amp', '&'],
  ['lt', '<'],
  ['gt', '>'],
  ['quot', '"'],
  ['apos', "'"],
  ['nbsp', ' '],
  ['ndash', '–'],
  ['mdash', '—'],
]);

/**
 * One line of text without markup: character references decoded, raised and lowered digits as such, tags of HTML
 * removed, invisible and direction-changing characters left out, spaces joined.
 */
export function plainText(text: string): string {
  return (
    withoutTags(
      decodeReferences(text)
        .replace(/<sup>([^<>]{1,12})<\/sup>/gi, (_, raised: string) => shifted(raised, SUPERSCRIPTS, '^'))
        .replace(/<sub>([^<>]{1,12})<\/sub>/gi, (_, lowered: string) => shifted(lowered, SUBSCRIPTS, '')),
    )
      .replace(/[\p{Cf}\p{Surrogate}\p{Co}\p{Cn}\uFFFD]/gu, '')
      .replace(/[\s\p{Cc}]+/gu, ' ')
      .trim()
      // TeX sets its accents on an i without a dot.
      .replace(/ı(?=\p{M})/gu, 'i')
      .normalize('NFC')
  );
}

function decodeReferences(text: string): string {
  return text.replace(
    /&(?:#(\d{1,7})|#[xX]([0-9a-fA-F]{1,6})|([a-z]{2,5}));/g,
    (whole, ...groups: unknown[]) => {
      const [decimal, hex, name] = groups as [string | undefined, string | undefined, string | undefined];
      if (name !== undefined) return ENTITIES.get(name) ?? whole;
      const point = decimal === undefined ? Number.parseInt(hex ?? '', 16) : Number(decimal);
      return point <= 0x10ffff ? String.fromCodePoint(point) : whole;
    },
  );
}

/** Again until nothing changes: what is left between two tags may be a tag itself. */
function withoutTags(text: string): string {
  for (let before = text; ;) {
    const after = before.replace(/<(?:\/?[a-z][^<>]*|!--[^<>]*--)>/gi, '');
    if (after === before) return after;
    before = after;
  }
}

function shifted(text: string, table: ReadonlyMap<string, string>, otherwise: string): string {
  const signs = Array.from(text, (sign) => table.get(sign));
  return signs.includes(undefined) ? otherwise + text : signs.join('');
}

function paired(signs: string, others: string): ReadonlyMap<string, string> {
  return new Map(Array.from(signs, (sign, i) => [sign, others[i] ?? '']));
}
