// The engine's whole public surface, written by hand.
export {
  SHEET_FORMAT,
  PROPERTY_FORMAT,
  CorrelationDefinition,
  PropertyEquationDefinition,
} from './sheet/definition.js';
export type { Coefficient, Part, ResultKind } from './sheet/definition.js';
export type {
  Bound,
  BoundBasis,
  BoundEnd,
  BoundNature,
  Condition,
  CslItem,
  GivenValue,
  Group,
  Intermediate,
  Piece,
  Quantity,
  Source,
  Stretch,
  Table,
  WorkedCheck,
} from './sheet/common-schema.js';
export * from './evaluation/outcome.js';
export { stripGeometry } from './bounds/strip.js';
export type { StripGeometry, StripInput, StripRun, StripRunKind } from './bounds/strip.js';
