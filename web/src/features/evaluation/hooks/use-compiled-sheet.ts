import {
  compileCorrelation,
  compilePropertyEquation,
  type CompiledCorrelation,
  type CompiledEquation,
  type Problem,
  type PropertyLibrary,
} from '@merestone/engine';
import { useMemo } from 'react';
import type { EvaluatedSheet } from '../model/evaluated-sheet';

export type CompiledSheet =
  { ok: true; compiled: CompiledCorrelation; library: PropertyLibrary } | { ok: false; problems: Problem[] };

/** The sheet and its property equations in the form the engine runs; compiled once per sheet. */
export function useCompiledSheet(sheet: Pick<EvaluatedSheet, 'definition' | 'equations'>): CompiledSheet {
  const { definition, equations } = sheet;
  return useMemo(() => {
    const correlation = compileCorrelation(definition);
    if (!correlation.ok) return { ok: false, problems: correlation.problems };
    const library = new Map<string, CompiledEquation>();
    for (const { slug, definition: equation } of equations) {
      const result = compilePropertyEquation(slug, equation);
      if (result.ok) library.set(slug, result.compiled);
    }
    return { ok: true, compiled: correlation.compiled, library: (slug) => library.get(slug) };
  }, [definition, equations]);
}
