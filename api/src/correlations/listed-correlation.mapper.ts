import { QUANTITIES, type CorrelationDefinition } from '@merestone/engine';
import type { RevisionRecord } from '../revisions/revision-record.js';
import type { ListedBound, ListedCorrelation } from './dto/correlation-page.dto.js';

export function listedCorrelation(
  record: RevisionRecord,
  definition: CorrelationDefinition,
  geometryNames: ReadonlyMap<string, string>,
): ListedCorrelation {
  return {
    slug: record.slug,
    title: definition.title,
    authors: definition.authors,
    year: definition.year,
    geometry: definition.geometry,
    geometryName: geometryNames.get(definition.geometry) ?? definition.geometry,
    phase: definition.phase,
    standing: record.standing,
    revision: record.number,
    summary: definition.summary,
    verification: definition.verification.status,
    bounds: definition.bounds.map(({ on, basis, stretches }): ListedBound => ({
      symbol: on,
      ...nameAndUnit(definition, on),
      basis,
      stretches,
    })),
  };
}

/** What a bounded symbol is called and measured in on the sheet. */
function nameAndUnit(definition: CorrelationDefinition, symbol: string): { name: string; unit: string } {
  const quantity = definition.quantities.find((one) => one.symbol === symbol);
  if (quantity) return { name: QUANTITIES[quantity.is]?.title ?? quantity.is, unit: quantity.unit };
  const group = definition.groups.find((one) => one.symbol === symbol);
  if (group) return { name: group.name, unit: '1' };
  const intermediate = definition.intermediates?.find((one) => one.symbol === symbol);
  if (intermediate) return { name: intermediate.name, unit: intermediate.unit };
  const result = definition.parts.find((part) => part.result.symbol === symbol);
  return { name: result?.title ?? symbol, unit: result?.result.unit ?? '1' };
}
