import { QUANTITIES } from '@merestone/engine';
import type { DraftForm } from './draft-form';

/** A symbol of the draft as others refer to it. */
export interface DraftSymbol {
  symbol: string;
  /** In words. */
  name: string;
  unit: string;
  tex: string | undefined;
  kind: 'quantity' | 'group' | 'step' | 'result' | 'coefficient';
}

/** Every symbol that the draft has so far, in the order of its lists. */
export function symbolsOfDraft(form: DraftForm): DraftSymbol[] {
  const all: DraftSymbol[] = [
    ...form.quantities.map(({ symbol, is, unit, tex }) => ({
      symbol,
      name: QUANTITIES[is]?.title ?? is,
      unit,
      tex,
      kind: 'quantity' as const,
    })),
    ...form.groups.map(({ symbol, name, tex }) => ({ symbol, name, unit: '1', tex, kind: 'group' as const })),
    ...form.intermediates.map(({ symbol, name, unit, tex }) => ({
      symbol,
      name,
      unit,
      tex,
      kind: 'step' as const,
    })),
    ...form.parts.flatMap(({ title, result, coefficient }) => [
      { ...result, name: title, kind: 'result' as const },
      ...(coefficient.present ? [{ ...coefficient, name: title, kind: 'coefficient' as const }] : []),
    ]),
  ];
  return all
    .map(({ symbol, name, unit, tex, kind }) => ({
      symbol: symbol.trim(),
      name,
      unit: unit.trim(),
      tex: tex?.trim() || undefined,
      kind,
    }))
    .filter(({ symbol }) => symbol !== '');
}
