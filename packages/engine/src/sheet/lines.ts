import type { Intermediate, Piece, Quantity, Table, Bound, WorkedCheck } from './common-schema.js';
import type { CorrelationDefinition, PropertyEquationDefinition } from './definition.js';

export type LineKind = 'group' | 'intermediate' | 'result' | 'coefficient';

/** One equation of a sheet, whatever part of the definition it comes from. */
export interface Line {
  kind: LineKind;
  symbol: string;
  tex?: string | undefined;
  name: string;
  unit: string;
  /** Numbers go in and come out in the sheet's units; no dimension is proved. */
  dimensional: boolean;
  expression?: string | undefined;
  pieces?: Piece[] | undefined;
  /** Key of the part it belongs to; null for lines shared by all parts. */
  part: string | null;
  /** Path in the definition, for messages. */
  path: string;
}

/** Path of a member of a line; a property equation's answer stands at the top of its definition, without a path. */
export function memberPath({ path }: Pick<Line, 'path'>, member: string): string {
  return path ? `${path}.${member}` : member;
}

/** What correlations and property equations have in common: all that is checked, compiled and evaluated. */
export interface Calculable {
  quantities: Quantity[];
  tables: Table[];
  bounds: Bound[];
  lines: Line[];
  checks: WorkedCheck[];
  /** Symbol of the line that is the answer of each part, in order. */
  answers: string[];
}

export function linesOfCorrelation(definition: CorrelationDefinition): Calculable {
  const groups = definition.groups.map((group, i): Line => ({
    ...group,
    kind: 'group',
    unit: '1',
    dimensional: false,
    part: null,
    path: `groups[${i}]`,
  }));
  const parts = definition.parts.flatMap((part, i): Line[] => [
    {
      ...part.result,
      kind: 'result',
      name: part.title,
      dimensional: part.result.dimensional ?? false,
      part: part.key,
      path: `parts[${i}].result`,
    },
    ...(part.coefficient
      ? [
          {
            ...part.coefficient,
            kind: 'coefficient' as const,
            name: part.title,
            dimensional: false,
            part: part.key,
            path: `parts[${i}].coefficient`,
          },
        ]
      : []),
  ]);
  return {
    quantities: definition.quantities,
    tables: definition.tables ?? [],
    bounds: definition.bounds,
    lines: [...groups, ...intermediateLines(definition.intermediates), ...parts],
    checks: definition.checks,
    answers: definition.parts.map((part) => part.result.symbol),
  };
}

/** The answer of a property equation is a line of its own, by this symbol. */
export const PROPERTY_ANSWER = 'value';

export function linesOfPropertyEquation(definition: PropertyEquationDefinition): Calculable {
  return {
    quantities: definition.quantities,
    tables: definition.tables ?? [],
    bounds: definition.bounds,
    lines: [
      ...intermediateLines(definition.intermediates),
      {
        kind: 'result',
        symbol: PROPERTY_ANSWER,
        name: definition.title,
        unit: definition.unit,
        dimensional: definition.dimensional ?? false,
        expression: definition.expression,
        pieces: definition.pieces,
        part: null,
        path: '',
      },
    ],
    checks: definition.checks,
    answers: [PROPERTY_ANSWER],
  };
}

function intermediateLines(intermediates: Intermediate[] = []): Line[] {
  return intermediates.map((intermediate, i) => ({
    ...intermediate,
    kind: 'intermediate',
    dimensional: intermediate.dimensional ?? false,
    part: null,
    path: `intermediates[${i}]`,
  }));
}
