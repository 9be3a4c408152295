import type { DefinitionTex, LineTex } from '@merestone/engine';

/** The lines of a sheet that carry a number, in the order in which they are set. */
export function numberedLines({ intermediates, parts }: DefinitionTex): LineTex[] {
  return [
    ...intermediates,
    ...parts.flatMap(({ result, coefficient }) => (coefficient ? [result, coefficient] : [result])),
  ];
}
