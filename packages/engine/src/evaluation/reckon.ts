import type { CompiledSheet, PropertyLibrary } from '../sheet/compiled.js';
import type { EvaluationRequest } from './outcome.js';
import { Reckoner } from './reckoner.js';
import { suppliesFor, type Supplies } from './supplies.js';

export interface Work {
  reckoner: Reckoner;
  supplies: Supplies;
  /** Keys of the parts worked out. */
  parts: Set<string>;
  /** What the principal part lacks. */
  missing: Set<string>;
  /** What other parts lack, by part title. */
  lacking: Map<string, Set<string>>;
}

/** Works out every part as far as the inputs go; the principal one must be possible. */
export function reckon(
  sheet: CompiledSheet,
  request: EvaluationRequest,
  given: ReadonlyMap<string, number>,
  library: PropertyLibrary,
): Work {
  const supplies = suppliesFor(sheet, request, given, library);
  const groups = new Map([...given].filter(([symbol]) => sheet.lines.has(symbol)));
  const reckoner = new Reckoner(sheet, supplies.supply, groups);
  supplies.attach(reckoner);
  const parts = new Set<string>();
  const lacking = new Map<string, Set<string>>();
  let missing = new Set<string>();
  for (const answer of sheet.answers) {
    const line = sheet.lines.get(answer)?.line;
    missing = new Set<string>();
    if (reckoner.solve(answer, missing) && line?.part) parts.add(line.part);
    else if (line) lacking.set(line.name, missing);
  }
  for (const [symbol, { line }] of sheet.lines)
    if (line.kind === 'coefficient' && line.part !== null && parts.has(line.part)) reckoner.solve(symbol);
  return { reckoner, supplies, parts, missing, lacking };
}
