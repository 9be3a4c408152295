import type { CorrelationDefinition, Group } from '@merestone/engine';
import { namesIn } from './names-in';

export interface GivenGroups {
  /** Groups to be asked for in place of their quantities. */
  groups: Group[];
  /** Symbols of quantities that serve only those groups, and are not asked for then. */
  replaced: Set<string>;
}

/**
 * What changes when somebody has the groups and not the quantities: a group is asked for when one of its own
 * quantities serves nothing else; such quantities are left out. All others are still computed or asked for.
 */
export function givenGroups(definition: CorrelationDefinition): GivenGroups {
  const elsewhere = namesOutsideGroups(definition);
  const quantities = new Set(definition.quantities.filter((q) => q.role !== 'state').map((q) => q.symbol));
  const replaced = new Set<string>();
  const groups = definition.groups.filter((group) => {
    const own = namesIn(group.expression).filter((name) => quantities.has(name) && !elsewhere.has(name));
    for (const name of own) replaced.add(name);
    return own.length > 0;
  });
  return { groups, replaced };
}

function namesOutsideGroups(definition: CorrelationDefinition): Set<string> {
  const formulas = [
    ...(definition.intermediates ?? []),
    ...definition.parts.map((part) => part.result),
    ...definition.parts.flatMap((part) => (part.coefficient ? [part.coefficient] : [])),
  ];
  const names = formulas.flatMap((formula) => [
    ...namesIn(formula.expression ?? ''),
    ...('pieces' in formula ? (formula.pieces ?? []) : []).flatMap((piece) => [
      ...namesIn(piece.expression),
      ...piece.when.map((condition) => condition.on),
    ]),
  ]);
  return new Set(names);
}
