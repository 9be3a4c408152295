import { CorrelationDefinition, PropertyEquationDefinition } from '@merestone/engine';

type JsonSchema = Record<string, unknown>;

export const CORRELATION_DEFINITION = {
  allOf: [{ $ref: '#/components/schemas/CorrelationDefinition' }],
};
export const PROPERTY_EQUATION_DEFINITION = {
  allOf: [{ $ref: '#/components/schemas/PropertyEquationDefinition' }],
};

/** The sheet formats as schemas for `components.schemas` of the OpenAPI document: the engine's own, declared once. */
export const DEFINITION_SCHEMAS: Readonly<Record<string, JsonSchema>> = {
  CorrelationDefinition: plain(CorrelationDefinition),
  PropertyEquationDefinition: plain(PropertyEquationDefinition),
};

/** Maps are written by pattern in the engine's schema; generators understand `additionalProperties` better. */
function plain(schema: object): JsonSchema {
  return JSON.parse(JSON.stringify(schema), (_key, value: unknown) => {
    if (typeof value !== 'object' || value === null || !('patternProperties' in value)) return value;
    const { patternProperties, ...rest } = value;
    const [values] = Object.values(patternProperties as Record<string, unknown>);
    return { ...rest, additionalProperties: values };
  }) as JsonSchema;
}
