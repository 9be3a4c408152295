// The engine's whole public surface, written by hand.
export { ENGINE_VERSION } from './engine-version.js';

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
export { checkStructure, checkPropertyStructure, type Structure } from './sheet/check-structure.js';
export { compileCorrelation, compilePropertyEquation, type Compilation } from './sheet/compile-sheet.js';
export type {
  CompiledCorrelation,
  CompiledEquation,
  CompiledSheet,
  PropertyLibrary,
} from './sheet/compiled.js';
export {
  definitionTex,
  propertyTex,
  type DefinitionTex,
  type LineTex,
  type PartTex,
} from './sheet/definition-tex.js';

export {
  sketchLines,
  type DimensionOfSketch,
  type LineSketch,
  type SketchLine,
  type SketchSymbol,
} from './sheet/sketch-lines.js';

export * from './evaluation/outcome.js';
export { evaluate } from './evaluation/evaluate.js';
export {
  runChecks,
  runPropertyChecks,
  propertyValue,
  type CheckReport,
  type CheckedValue,
} from './evaluation/run-checks.js';
export { kernelFor, POINT, type Kernel, type PointStatus } from './evaluation/kernel.js';
export { SHORTEST_REASON, LONGEST_REASON } from './evaluation/check-deviations.js';
export { unitTex, valueTex, valueText } from './evaluation/explain.js';

export { compareDefinitions, type Difference } from './comparison/compare-definitions.js';
export { inspectCorrelation, type InspectionReport } from './inspection/inspect-correlation.js';
export { INSPECTION_TOPICS, type InspectionTopic, type Remark } from './inspection/remark.js';

export { holdAgainstBound } from './bounds/hold-against-bound.js';
export { DEFAULT_REACH, TEMPERATURE_REACH } from './bounds/reach.js';
export { stripGeometry } from './bounds/strip.js';
export type { StripGeometry, StripInput, StripRun, StripRunKind, StripStone } from './bounds/strip.js';
export type { StripAxis, StripScale } from './bounds/strip-axis.js';

export { convertBasis, BASES, type CoefficientInSI, type FluidState } from './basis/convert-basis.js';
export { logMean } from './basis/flux.js';

export { parse, type ExpressionFault, type Parsed } from './expression/parse.js';
export { formatNumber, numberTex } from './expression/number-text.js';
export { symbolTex } from './expression/symbol-tex.js';

export { QUANTITIES, serves, servingQuantity } from './quantity/dictionary.js';
export type { DictionaryEntry, Sign } from './quantity/dictionary-entry.js';
export { GROUPS, GROUP_SLOTS, type GroupEntry, type GroupSlot } from './quantity/group-dictionary.js';
export { groupForSheet, type GroupForSheet } from './quantity/group-for-sheet.js';
export { readUnit, type Unit, type UnitReading } from './quantity/unit.js';
export { printedUnit } from './quantity/printed-unit.js';
export { unitsFor, usualUnitFor, convert } from './quantity/unit-choices.js';
export { CONSTANTS } from './quantity/constants.js';

export { formatCitation, type Citation, type CitationParts } from './citation/format-citation.js';
export { readDoi, doiKey, type DoiName } from './citation/doi.js';
export {
  citationKey,
  findDuplicates,
  sameWork,
  type CitationKey,
  type DuplicatePair,
  type Likeness,
} from './citation/same-work.js';
