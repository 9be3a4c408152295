import { symbolTex, type CorrelationDefinition } from '@merestone/engine';

/** TeX of a symbol as its sheet sets it. */
export function setSymbol(definition: CorrelationDefinition, symbol: string): string {
  const lines = [
    ...definition.quantities,
    ...definition.groups,
    ...(definition.intermediates ?? []),
    ...definition.parts.flatMap(({ result, coefficient }) =>
      coefficient ? [result, coefficient] : [result],
    ),
  ];
  return symbolTex(symbol, lines.find((line) => line.symbol === symbol)?.tex);
}

/** TeX of a coefficient on one of the bases; `k_Ga` is k_G times the area per volume. */
export function setBasis(symbol: string): string {
  return symbol.length > 1 && symbol.endsWith('a') ? `${symbolTex(symbol.slice(0, -1))}a` : symbolTex(symbol);
}
