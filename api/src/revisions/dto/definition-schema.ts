import { CorrelationDefinition, PropertyEquationDefinition } from '@merestone/engine';
import type { ApiPropertyOptions } from '@nestjs/swagger';

type Json = Record<string, unknown>;

export const CORRELATION_DEFINITION: ApiPropertyOptions = {
  allOf: [{ $ref: '#/components/schemas/CorrelationDefinition' }],
};
export const PROPERTY_EQUATION_DEFINITION: ApiPropertyOptions = {
  allOf: [{ $ref: '#/components/schemas/PropertyEquationDefinition' }],
};

/** The sheet formats as schemas for `components.schemas` of the OpenAPI document: the engine's own, declared once. */
export const DEFINITION_SCHEMAS: Readonly<Record<string, Json>> = {
  CorrelationDefinition: inOpenApi(CorrelationDefinition),
  PropertyEquationDefinition: inOpenApi(PropertyEquationDefinition),
};

/** A JSON Schema in the dialect of OpenAPI 3.0, which says some things in other words. */
function inOpenApi(schema: object): Json {
  return JSON.parse(JSON.stringify(schema), (_key, value: unknown) =>
    isObject(value) ? maps(limits(alternatives(constants(value)))) : value,
  ) as Json;
}

function constants({ const: only, ...rest }: Json): Json {
  return only === undefined ? rest : { ...rest, enum: [only] };
}

/** Alternatives of literals are one enumeration; an alternative `null` makes the other one nullable. */
function alternatives(schema: Json): Json {
  const { anyOf, ...rest } = schema;
  if (!Array.isArray(anyOf)) return schema;
  const some = anyOf.filter(isObject);
  const others = some.filter(({ type }) => type !== 'null');
  const nullable = others.length < some.length ? { nullable: true } : {};
  const [first] = others;
  if (others.length === 1 && first) return { ...rest, ...first, ...nullable };
  if (others.every((one) => Array.isArray(one.enum))) {
    return { ...rest, type: 'string', enum: others.flatMap((one) => one.enum as unknown[]), ...nullable };
  }
  return { ...rest, anyOf: others, ...nullable };
}

function limits({ exclusiveMinimum, ...rest }: Json): Json {
  return exclusiveMinimum === undefined
    ? rest
    : { ...rest, minimum: exclusiveMinimum, exclusiveMinimum: true };
}

/** Maps are written by pattern in the engine's schema; OpenAPI knows them by their values. */
function maps({ patternProperties, ...rest }: Json): Json {
  if (!isObject(patternProperties)) return rest;
  const [values] = Object.values(patternProperties);
  return { ...rest, additionalProperties: values };
}

function isObject(value: unknown): value is Json {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
