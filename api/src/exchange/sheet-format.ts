import { CorrelationDefinition } from '@merestone/engine';
import { Type, type Static } from '@sinclair/typebox';
import { STANDINGS, WITHDRAWAL_CLASSES } from '../common/standing.js';
import { VERDICTS } from '../common/verdict.js';
import { Hash, LongText, Moment, Name, OneOf, closed } from './format-terms.js';

/** One revision as a file. A change that older files would not survive gets a new number. */
export const EXCHANGE_FORMAT = 'merestone-exchange/1';

/**
 * A sheet on its way from one office to another. The three fields that a reader needs are required; the others say
 * where it stood when it left, and are kept by nobody who reads it in: there it starts as a draft.
 */
export const ExchangedSheet = Type.Object(
  {
    format: Type.Literal(EXCHANGE_FORMAT),
    slug: Type.String({ pattern: '^[a-z0-9]+(-[a-z0-9]+)*$', maxLength: 80 }),
    definition: CorrelationDefinition,
    revision: Type.Optional(Type.Integer({ minimum: 1 })),
    iteration: Type.Optional(Type.Integer({ minimum: 1 })),
    hash: Type.Optional(Hash),
    standing: Type.Optional(OneOf(STANDINGS)),
    originator: Type.Optional(Name),
    standings: Type.Optional(
      Type.Array(
        Type.Object(
          {
            standing: OneOf(STANDINGS),
            at: Moment,
            by: Name,
            note: Type.Union([LongText, Type.Null()]),
            class: Type.Union([OneOf(WITHDRAWAL_CLASSES), Type.Null()]),
          },
          closed,
        ),
      ),
    ),
    reviews: Type.Optional(
      Type.Array(
        Type.Object(
          {
            reviewer: Name,
            verdict: OneOf(VERDICTS),
            hash: Hash,
            at: Moment,
            note: Type.Union([LongText, Type.Null()]),
          },
          closed,
        ),
      ),
    ),
    signatures: Type.Optional(
      Type.Array(Type.Object({ by: Name, at: Moment, meaning: LongText, hash: Hash }, closed)),
    ),
    caution: Type.Optional(LongText),
  },
  closed,
);
export type ExchangedSheet = Static<typeof ExchangedSheet>;

/** The published JSON Schema of that file. */
export const SHEET_FILE_SCHEMA: Readonly<Record<string, unknown>> = {
  $schema: 'http://json-schema.org/draft-07/schema#',
  $id: 'urn:merestone:schema:exchange:1',
  title: 'A sheet of the register of mass transfer correlations',
  ...(JSON.parse(JSON.stringify(ExchangedSheet)) as Record<string, unknown>),
};
