import { Type, type TLiteral, type TUnion } from '@sinclair/typebox';

/** Terms that the exchange formats are written in. */
export const closed = { additionalProperties: false } as const;

/** SHA-256 in hexadecimal. */
export const Hash = Type.String({ pattern: '^[0-9a-f]{64}$' });
/** ISO 8601 in UTC, to the millisecond. */
export const Moment = Type.String({ pattern: '^\\d{4}-\\d{2}-\\d{2}T\\d{2}:\\d{2}:\\d{2}\\.\\d{3}Z$' });
export const Name = Type.String({ minLength: 1, maxLength: 300 });
export const LongText = Type.String({ maxLength: 10_000 });
export const Count = Type.Integer({ minimum: 1, maximum: 1_000_000 });
export const Slug = Type.String({ pattern: '^[a-z0-9]+(-[a-z0-9]+)*$', maxLength: 80 });

/** One of several words. */
export function OneOf<const T extends readonly string[]>(words: T): TUnion<TLiteral<T[number]>[]> {
  return Type.Union(words.map((word: T[number]) => Type.Literal(word)));
}
