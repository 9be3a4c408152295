import { QUANTITIES, symbolTex, type CorrelationDefinition } from '@merestone/engine';

/** A symbol as its sheet sets and names it, with the unit it has there. */
export interface SymbolOnSheet {
  tex: string;
  name: string;
  unit: string;
}

type Symbols = Pick<CorrelationDefinition, 'quantities' | 'groups' | 'intermediates'>;

/** A quantity, group or intermediate of a sheet by its symbol; what the sheet does not have is named by its symbol. */
export function symbolOnSheet(definition: Symbols, symbol: string): SymbolOnSheet {
  const quantity = definition.quantities.find((one) => one.symbol === symbol);
  if (quantity)
    return { tex: symbolTex(symbol, quantity.tex), name: quantityName(quantity.is), unit: quantity.unit };
  const group = definition.groups.find((one) => one.symbol === symbol);
  if (group) return { tex: symbolTex(symbol, group.tex), name: group.name, unit: '1' };
  const line = definition.intermediates?.find((one) => one.symbol === symbol);
  return { tex: symbolTex(symbol, line?.tex), name: line?.name ?? symbol, unit: line?.unit ?? '1' };
}

/** The dictionary's title of a quantity: `Tube inside diameter`. */
export function quantityName(is: string): string {
  return QUANTITIES[is]?.title ?? is.replaceAll('-', ' ');
}
