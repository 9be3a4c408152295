import { SymbolMark } from '../../../shared/ui/symbol-mark';

/** The symbol of a finding; of a property equation's own bound with what the equation fills: T (for ρ). */
export function FindingSymbol({ symbol }: { symbol: string }) {
  const [head = symbol, inner] = symbol.split('.');
  if (inner === undefined) return <SymbolMark symbol={head} />;
  return (
    <>
      <SymbolMark symbol={inner} /> (for <SymbolMark symbol={head} />)
    </>
  );
}
