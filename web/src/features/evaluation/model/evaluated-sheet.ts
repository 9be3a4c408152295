import type { CorrelationDefinition, PropertyEquationDefinition } from '@merestone/engine';

/** What the evaluation needs to know of a sheet. */
export interface EvaluatedSheet {
  slug: string;
  title: string;
  revision: number;
  standing: string;
  hash: string;
  definition: CorrelationDefinition;
  equations: readonly { slug: string; definition: PropertyEquationDefinition }[];
  caution: string;
}
