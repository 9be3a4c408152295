import { Type, type Static } from '@sinclair/typebox';
import {
  Accuracy,
  Bound,
  Group,
  Intermediate,
  Quantity,
  ShortText,
  Slug,
  Source,
  SymbolName,
  Table,
  Text,
  UnitText,
  Verification,
  WorkedCheck,
  closedObject,
  formula,
} from './common-schema.js';

/** The sheet format. A change that old sheets would not survive gets a new number (docs/decisions/0003). */
export const SHEET_FORMAT = 'merestone-sheet/1';

export const ResultKind = Type.Union([
  Type.Literal('Sherwood'),
  Type.Literal('Stanton'),
  Type.Literal('j-factor'),
  Type.Literal('coefficient'),
  Type.Literal('volumetric-coefficient'),
  Type.Literal('interfacial-area'),
]);
export type ResultKind = Static<typeof ResultKind>;

export const Coefficient = Type.Object(
  {
    symbol: SymbolName,
    tex: Type.Optional(ShortText),
    unit: UnitText,
    /** What the driving force is counted in. */
    basis: Type.Union([
      Type.Literal('concentration'),
      Type.Literal('partial-pressure'),
      Type.Literal('mole-fraction'),
    ]),
    /** Per unit area (m/s) or per unit volume (1/s). */
    per: Type.Union([Type.Literal('area'), Type.Literal('volume')]),
    /**
     * `dilute-or-equimolar`: the low-flux coefficient (k′). `stagnant-inert`: through a gas that does not move,
     * the drift factor P/p_BM is in the expression. `drift-free`: F, for the logarithmic flux law.
     */
    rateForm: Type.Union([
      Type.Literal('dilute-or-equimolar'),
      Type.Literal('stagnant-inert'),
      Type.Literal('drift-free'),
    ]),
    expression: Type.String({ minLength: 1, maxLength: 2000 }),
  },
  closedObject,
);
export type Coefficient = Static<typeof Coefficient>;

/** One equation of a method: its result and, where it has one, the coefficient that follows. */
export const Part = Type.Object(
  {
    key: Slug,
    title: ShortText,
    phase: Type.Optional(Type.Union([Type.Literal('gas'), Type.Literal('liquid')])),
    result: Type.Object(
      {
        symbol: SymbolName,
        tex: Type.Optional(ShortText),
        kind: ResultKind,
        /** `1` for groups; a coefficient or an area has its own. */
        unit: UnitText,
        ...formula,
        dimensional: Type.Optional(Type.Boolean()),
      },
      closedObject,
    ),
    /** Null where the result is itself the coefficient or only an area. */
    coefficient: Type.Union([Coefficient, Type.Null()]),
  },
  closedObject,
);
export type Part = Static<typeof Part>;

/**
 * A correlation as plain data. It drives form, steps, bound strips, table, chart, CSV and PDF;
 * adding one never needs code. Most sheets have one part; a method (wetted area, gas side,
 * liquid side) has several, approved and pinned together. The last part is the principal one.
 */
export const CorrelationDefinition = Type.Object(
  {
    format: Type.Literal(SHEET_FORMAT),
    title: ShortText,
    /** Surnames, as a reader would look the sheet up. */
    authors: Type.Array(ShortText, { minItems: 1, maxItems: 12 }),
    year: Type.Union([Type.Integer({ minimum: 1800, maximum: 2100 }), Type.Null()]),
    geometry: Slug,
    phase: Type.Union([
      Type.Literal('gas'),
      Type.Literal('liquid'),
      Type.Literal('gas-or-liquid'),
      Type.Literal('gas-and-liquid'),
    ]),
    /** What exactly was measured: flow direction, boundary condition, which side. */
    summary: Text,
    averaging: Type.Union([Type.Literal('average'), Type.Literal('local'), Type.Literal('not-stated')]),
    wall: Type.Union([
      Type.Literal('constant-concentration'),
      Type.Literal('constant-flux'),
      Type.Literal('not-applicable'),
      Type.Literal('not-stated'),
    ]),
    /** What the authors reduced their data with; a log mean needs it to be so. */
    drivingForce: Type.Union([
      Type.Literal('local'),
      Type.Literal('log-mean'),
      Type.Literal('inlet'),
      Type.Literal('not-stated'),
    ]),
    propertyState: Type.Union([
      Type.Literal('film'),
      Type.Literal('bulk'),
      Type.Literal('interface'),
      Type.Literal('inlet'),
      Type.Literal('not-stated'),
    ]),
    quantities: Type.Array(Quantity, { minItems: 1, maxItems: 60 }),
    tables: Type.Optional(Type.Array(Table, { maxItems: 4 })),
    groups: Type.Array(Group, { maxItems: 30 }),
    intermediates: Type.Optional(Type.Array(Intermediate, { maxItems: 30 })),
    bounds: Type.Array(Bound, { maxItems: 40 }),
    parts: Type.Array(Part, { minItems: 1, maxItems: 6 }),
    accuracy: Type.Union([Accuracy, Type.Null()]),
    restrictions: Type.Array(Text, { maxItems: 20 }),
    cautions: Type.Array(Text, { maxItems: 20 }),
    sources: Type.Array(Source, { minItems: 1, maxItems: 20 }),
    checks: Type.Array(WorkedCheck, { minItems: 1, maxItems: 40 }),
    verification: Verification,
  },
  closedObject,
);
export type CorrelationDefinition = Static<typeof CorrelationDefinition>;

export const PROPERTY_FORMAT = 'merestone-property/1';

/** A published equation for a fluid property, kept and revised like a sheet. */
export const PropertyEquationDefinition = Type.Object(
  {
    format: Type.Literal(PROPERTY_FORMAT),
    title: ShortText,
    fluid: ShortText,
    /** Dictionary name of what it gives, or a family of names: `gas-diffusivity`. */
    gives: Slug,
    unit: UnitText,
    /** What a value from here takes for granted, said beside it. */
    assumes: Type.Optional(Text),
    quantities: Type.Array(Quantity, { maxItems: 20 }),
    tables: Type.Optional(Type.Array(Table, { maxItems: 2 })),
    intermediates: Type.Optional(Type.Array(Intermediate, { maxItems: 12 })),
    bounds: Type.Array(Bound, { maxItems: 12 }),
    ...formula,
    /** Most property fits are dimensional; where not, dimensions are proved. */
    dimensional: Type.Optional(Type.Boolean()),
    accuracy: Type.Union([Accuracy, Type.Null()]),
    cautions: Type.Array(Text, { maxItems: 12 }),
    sources: Type.Array(Source, { minItems: 1, maxItems: 12 }),
    checks: Type.Array(WorkedCheck, { minItems: 1, maxItems: 40 }),
    verification: Verification,
  },
  closedObject,
);
export type PropertyEquationDefinition = Static<typeof PropertyEquationDefinition>;
