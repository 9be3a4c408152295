import type { CorrelationDefinition, DefinitionTex } from '@merestone/engine';
import type { ReactNode } from 'react';

/** One field of a sheet as a reviewer goes through it. */
export interface SheetField {
  /** Path in the definition, to which comments are anchored. */
  path: string;
  /** What the field is called; `ownLabel`: its content says so itself. */
  label: string;
  ownLabel?: boolean;
  content: ReactNode;
}

export interface FieldGroup {
  title: string;
  fields: SheetField[];
}

export interface FieldParts {
  definition: CorrelationDefinition;
  /** Null where the definition does not hold together. */
  tex: DefinitionTex | null;
  /** Sets a worked check by its place. */
  check: (place: number) => ReactNode;
}
