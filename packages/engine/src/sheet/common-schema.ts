import { Type, type Static } from '@sinclair/typebox';

const closed = { additionalProperties: false } as const;

/** Symbols are ASCII names that an expression can hold: `rho`, `p_BM`, `Re`. Typeset forms come from `tex` or the symbol itself. */
export const SymbolName = Type.String({ pattern: '^[A-Za-z][A-Za-z0-9]*(_[A-Za-z0-9]+)?$', maxLength: 24 });
/** Slugs name sheets, property equations, geometries and table rows. */
export const Slug = Type.String({ pattern: '^[a-z0-9]+(-[a-z0-9]+)*$', maxLength: 80 });
const Text = Type.String({ minLength: 1, maxLength: 2000 });
const ShortText = Type.String({ minLength: 1, maxLength: 300 });
const ExpressionText = Type.String({ minLength: 1, maxLength: 2000 });
/** A unit as people write it: `m/s`, `kg/(m^2 s)`, `degC`; `1` for none. */
const UnitText = Type.String({ minLength: 1, maxLength: 40 });

/** Where a bound's figure comes from. `none`: no limit is on record for the symbol. */
export const BoundBasis = Type.Union([
  Type.Literal('stated'),
  Type.Literal('handbook'),
  Type.Literal('common-practice'),
  Type.Literal('none'),
]);
export type BoundBasis = Static<typeof BoundBasis>;

/** What a bound protects: the data behind it, a flow regime, the formula's meaning, or physics itself. */
export const BoundNature = Type.Union([
  Type.Literal('data'),
  Type.Literal('regime'),
  Type.Literal('definition'),
  Type.Literal('physical'),
]);
export type BoundNature = Static<typeof BoundNature>;

export const BoundEnd = Type.Object(
  {
    value: Type.Number(),
    nature: BoundNature,
    /** Whether the limit itself still belongs to the range. Default true. */
    closed: Type.Optional(Type.Boolean()),
    /** Factor past the limit up to which a deviation may be recorded. Default 2 on a positive limit of data. */
    reach: Type.Optional(Type.Number({ exclusiveMinimum: 1, maximum: 1000 })),
    /** Sheets that hold on the other side. */
    beyond: Type.Optional(Type.Array(Slug)),
  },
  closed,
);
export type BoundEnd = Static<typeof BoundEnd>;

export const Stretch = Type.Object({ lo: Type.Optional(BoundEnd), hi: Type.Optional(BoundEnd) }, closed);
export type Stretch = Static<typeof Stretch>;

export const Bound = Type.Object(
  {
    on: SymbolName,
    /** Ascending, apart from each other. Empty where the basis is `none`. Values are in the symbol's own unit on the sheet. */
    stretches: Type.Array(Stretch, { maxItems: 8 }),
    basis: BoundBasis,
    /** Where in the source the limits stand, or who says so. */
    place: Type.Optional(ShortText),
    note: Type.Optional(Text),
  },
  closed,
);
export type Bound = Static<typeof Bound>;

export const Quantity = Type.Object(
  {
    symbol: SymbolName,
    /** Name in the quantity dictionary; two sheets may call different things D or L. */
    is: Slug,
    unit: UnitText,
    tex: Type.Optional(ShortText),
    role: Type.Optional(
      Type.Union([
        Type.Literal('characteristic-length'),
        Type.Literal('velocity'),
        /** Serves property equations, basis conversion or bounds, not the expression. */
        Type.Literal('state'),
      ]),
    ),
    /** The state at which the source takes a property. */
    at: Type.Optional(
      Type.Union([
        Type.Literal('film'),
        Type.Literal('bulk'),
        Type.Literal('interface'),
        Type.Literal('wall'),
        Type.Literal('inlet'),
      ]),
    ),
    /** What the symbol means here, where the dictionary's words are not enough. */
    meaning: Type.Optional(Text),
    /** Property equations that may fill the quantity, by slug. */
    equations: Type.Optional(Type.Array(Slug, { maxItems: 12 })),
    /** Table whose chosen row fills the quantity. */
    table: Type.Optional(Slug),
  },
  closed,
);
export type Quantity = Static<typeof Quantity>;

export const TableRow = Type.Object(
  {
    key: Slug,
    label: ShortText,
    /** Values by quantity symbol, in the quantity's unit on the sheet. */
    values: Type.Record(Type.String(), Type.Number()),
    note: Type.Optional(Text),
  },
  closed,
);
export const Table = Type.Object(
  {
    name: Slug,
    title: ShortText,
    source: Type.Optional(Text),
    rows: Type.Array(TableRow, { minItems: 1, maxItems: 400 }),
  },
  closed,
);
export type Table = Static<typeof Table>;

export const Group = Type.Object(
  {
    symbol: SymbolName,
    name: ShortText,
    expression: ExpressionText,
    tex: Type.Optional(ShortText),
    note: Type.Optional(Text),
  },
  closed,
);
export type Group = Static<typeof Group>;

/** A condition on one symbol; the limits of a piece are where the expression changes. */
export const Condition = Type.Object(
  {
    on: SymbolName,
    lo: Type.Optional(Type.Number()),
    hi: Type.Optional(Type.Number()),
    /** Default: closed below, open above, so that neighbours meet without overlap. */
    loClosed: Type.Optional(Type.Boolean()),
    hiClosed: Type.Optional(Type.Boolean()),
  },
  closed,
);
export type Condition = Static<typeof Condition>;

export const Piece = Type.Object(
  {
    title: Type.Optional(ShortText),
    when: Type.Array(Condition, { minItems: 1, maxItems: 8 }),
    expression: ExpressionText,
  },
  closed,
);
export type Piece = Static<typeof Piece>;

/** One formula or pieces of one, never both: checked by `checkDefinition`. */
export const formula = {
  expression: Type.Optional(ExpressionText),
  pieces: Type.Optional(Type.Array(Piece, { minItems: 2, maxItems: 24 })),
};

export const Intermediate = Type.Object(
  {
    symbol: SymbolName,
    name: ShortText,
    unit: UnitText,
    tex: Type.Optional(ShortText),
    ...formula,
    /** A published formula whose constant carries units: numbers go in and come out in the sheet's units. */
    dimensional: Type.Optional(Type.Boolean()),
    note: Type.Optional(Text),
  },
  closed,
);
export type Intermediate = Static<typeof Intermediate>;

/** A citation item of the CSL-JSON standard (the members we rely on; others are kept). */
export const CslItem = Type.Object(
  {
    type: Type.String(),
    title: Type.Optional(Type.String()),
    author: Type.Optional(
      Type.Array(
        Type.Object({
          family: Type.Optional(Type.String()),
          given: Type.Optional(Type.String()),
          literal: Type.Optional(Type.String()),
        }),
      ),
    ),
    issued: Type.Optional(
      Type.Object({ 'date-parts': Type.Array(Type.Array(Type.Union([Type.Integer(), Type.String()]))) }),
    ),
    'container-title': Type.Optional(Type.String()),
    publisher: Type.Optional(Type.String()),
    edition: Type.Optional(Type.Union([Type.String(), Type.Integer()])),
    volume: Type.Optional(Type.Union([Type.String(), Type.Integer()])),
    issue: Type.Optional(Type.Union([Type.String(), Type.Integer()])),
    page: Type.Optional(Type.String()),
    DOI: Type.Optional(Type.String()),
  },
  { additionalProperties: true },
);
export type CslItem = Static<typeof CslItem>;

export const Source = Type.Object(
  {
    csl: CslItem,
    /** Equation, table or page. */
    place: ShortText,
    /** What this source gave: the expression, the range, the constants. */
    gives: Type.Optional(Text),
    read: Type.Union([Type.Literal('seen'), Type.Literal('memory')]),
  },
  closed,
);
export type Source = Static<typeof Source>;

export const GivenValue = Type.Object({ value: Type.Number(), unit: Type.Optional(UnitText) }, closed);
export type GivenValue = Static<typeof GivenValue>;

export const WorkedCheck = Type.Object(
  {
    title: ShortText,
    /** `published`: a worked example or table in print; `computed`: our own evaluation, guards against slips only. */
    kind: Type.Union([Type.Literal('published'), Type.Literal('computed')]),
    source: Type.Optional(Text),
    inputs: Type.Record(Type.String(), GivenValue),
    rows: Type.Optional(Type.Record(Type.String(), Slug)),
    equations: Type.Optional(Type.Record(Type.String(), Slug)),
    /** Expected values by symbol (group, intermediate, result or coefficient). */
    expected: Type.Record(Type.String(), GivenValue),
    tolerancePercent: Type.Number({ exclusiveMinimum: 0, maximum: 50 }),
    note: Type.Optional(Text),
  },
  closed,
);
export type WorkedCheck = Static<typeof WorkedCheck>;

export const Accuracy = Type.Object(
  {
    valuePercent: Type.Union([Type.Number({ exclusiveMinimum: 0 }), Type.Null()]),
    statistic: Type.Union([
      Type.Literal('max'),
      Type.Literal('mean'),
      Type.Literal('rms'),
      Type.Literal('95 %'),
      Type.Literal('not-stated'),
    ]),
    /** Of which quantity, against which data. */
    of: Type.Optional(ShortText),
    text: Text,
  },
  closed,
);

export const Verification = Type.Object(
  {
    status: Type.Union([
      Type.Literal('published-example'),
      Type.Literal('expression-seen'),
      Type.Literal('from-memory'),
    ]),
    note: Text,
  },
  closed,
);

export const closedObject = closed;
export { ShortText, Text, UnitText };
