import { QUANTITIES, type CorrelationDefinition, type CslItem } from '@merestone/engine';

/** What the full-text search of the register looks into, column by column. */
export interface SearchText {
  readonly title: string;
  readonly authors: string;
  readonly geometry: string;
  readonly summary: string;
  readonly symbols: string;
  readonly cautions: string;
  readonly sources: string;
}

export function searchTextOf(definition: CorrelationDefinition, geometryName: string): SearchText {
  const { quantities, groups, intermediates = [], parts } = definition;
  const symbols = [
    ...quantities.flatMap(({ symbol, is, meaning }) => [symbol, QUANTITIES[is]?.title ?? is, meaning]),
    ...groups.flatMap(({ symbol, name }) => [symbol, name]),
    ...intermediates.flatMap(({ symbol, name }) => [symbol, name]),
    ...parts.flatMap(({ title, result, coefficient }) => [
      title,
      result.symbol,
      result.kind,
      coefficient?.symbol,
    ]),
  ];
  return {
    title: definition.title,
    authors: words([...definition.authors, definition.year === null ? undefined : String(definition.year)]),
    geometry: words([geometryName, definition.geometry.replaceAll('-', ' ')]),
    summary: definition.summary,
    symbols: words(symbols),
    cautions: words([...definition.cautions, ...definition.restrictions]),
    sources: words(definition.sources.flatMap(({ csl, place, gives }) => [citationText(csl), place, gives])),
  };
}

function citationText(csl: CslItem): string {
  const authors = csl.author?.map(({ family, given, literal }) => words([family, given, literal])) ?? [];
  return words([...authors, csl.title, csl['container-title'], csl.publisher, csl.DOI]);
}

function words(parts: readonly (string | undefined)[]): string {
  return parts.filter((part) => part !== undefined && part !== '').join(' ');
}
