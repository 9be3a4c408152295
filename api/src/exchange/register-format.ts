import { Type, type Static } from '@sinclair/typebox';
import { REPORT_OUTCOMES, REPORT_SEVERITIES } from '../common/problem-report.js';
import { STANDINGS, WITHDRAWAL_CLASSES } from '../common/standing.js';
import { CHECKLIST_POINTS, VERDICTS } from '../common/verdict.js';
import { Count, Hash, LongText, Moment, Name, OneOf, Slug, closed } from './format-terms.js';

/** A whole register as a file. A change that older files would not survive gets a new number. */
export const REGISTER_FORMAT = 'merestone-register/1';

const PersonId = Type.String({ minLength: 1, maxLength: 60 });
const Note = Type.Union([LongText, Type.Null()]);
const by = { by: PersonId, byName: Name, at: Moment };

const ExchangedContent = Type.Object(
  {
    iteration: Count,
    format: Name,
    /** The definition as RFC 8785 text, which the hash is of. */
    text: Type.String({ maxLength: 1_000_000 }),
    hash: Hash,
    at: Moment,
    by: PersonId,
  },
  closed,
);

const ExchangedStanding = Type.Object(
  {
    standing: OneOf(STANDINGS),
    hash: Hash,
    ...by,
    note: Note,
    class: Type.Union([OneOf(WITHDRAWAL_CLASSES), Type.Null()]),
    successor: Type.Union([Slug, Type.Null()]),
    /** The problem report that was looked into: number of its revision, and its place there from 0. */
    problemReport: Type.Union([
      Type.Object({ revision: Count, place: Type.Integer({ minimum: 0 }) }, closed),
      Type.Null(),
    ]),
  },
  closed,
);

const ExchangedComment = Type.Object(
  {
    hash: Hash,
    iteration: Count,
    field: Type.String({ maxLength: 200 }),
    text: LongText,
    ...by,
    answers: Type.Array(Type.Object({ text: LongText, ...by }, closed)),
    resolution: Type.Union([Type.Object(by, closed), Type.Null()]),
  },
  closed,
);

const ExchangedReport = Type.Object(
  {
    hash: Hash,
    severity: OneOf(REPORT_SEVERITIES),
    text: LongText,
    ...by,
    answer: Type.Union([
      Type.Object({ outcome: OneOf(REPORT_OUTCOMES), text: LongText, ...by }, closed),
      Type.Null(),
    ]),
  },
  closed,
);

export const ExchangedRevision = Type.Object(
  {
    number: Count,
    originator: PersonId,
    createdAt: Moment,
    contents: Type.Array(ExchangedContent, { minItems: 1 }),
    standings: Type.Array(ExchangedStanding, { minItems: 1 }),
    submissions: Type.Array(
      Type.Object(
        {
          hash: Hash,
          iteration: Count,
          round: Count,
          note: Note,
          ...by,
          engine: Name,
          /** What the machine found, as it was kept. */
          report: Type.Unknown(),
        },
        closed,
      ),
    ),
    assignments: Type.Array(Type.Object({ reviewer: PersonId, at: Moment, by: PersonId }, closed)),
    reviews: Type.Array(
      Type.Object(
        {
          hash: Hash,
          iteration: Count,
          round: Count,
          ...by,
          verdict: OneOf(VERDICTS),
          checklist: Type.Object(
            Object.fromEntries(CHECKLIST_POINTS.map((point) => [point, Type.Boolean()])) as Record<
              (typeof CHECKLIST_POINTS)[number],
              ReturnType<typeof Type.Boolean>
            >,
            closed,
          ),
          note: Note,
        },
        closed,
      ),
    ),
    comments: Type.Array(ExchangedComment),
    approval: Type.Union([
      Type.Object(
        {
          hash: Hash,
          ...by,
          meaning: LongText,
          note: Note,
          effectiveFrom: Type.Union([Moment, Type.Null()]),
          reviewDue: Type.Union([Moment, Type.Null()]),
        },
        closed,
      ),
      Type.Null(),
    ]),
    problemReports: Type.Array(ExchangedReport),
  },
  closed,
);
export type ExchangedRevision = Static<typeof ExchangedRevision>;

const subject = {
  slug: Slug,
  createdAt: Moment,
  createdBy: PersonId,
  revisions: Type.Array(ExchangedRevision, { minItems: 1 }),
};

export const ExchangedJournal = Type.Object(
  {
    /** Canonical texts, in order from the first act on. */
    entries: Type.Array(Type.String({ maxLength: 1_000_000 })),
    checkpoints: Type.Array(
      Type.Object(
        { size: Count, root: Hash, at: Moment, keyId: Name, text: LongText, signature: LongText },
        closed,
      ),
    ),
    keys: Type.Array(Type.Object({ keyId: Name, pem: LongText, since: Moment }, closed)),
  },
  closed,
);
export type ExchangedJournal = Static<typeof ExchangedJournal>;

/** Every record of a register, and the journals that tell how each came to be. */
export const ExchangedRegister = Type.Object(
  {
    format: Type.Literal(REGISTER_FORMAT),
    geometries: Type.Array(
      Type.Object(
        {
          slug: Slug,
          name: Name,
          summary: LongText,
          characteristicLength: LongText,
          velocity: LongText,
          cautions: Type.Array(LongText),
        },
        closed,
      ),
    ),
    /** Names of the people whom the records name by id. */
    people: Type.Array(Type.Object({ id: PersonId, name: Name }, closed)),
    propertyEquations: Type.Array(Type.Object(subject, closed)),
    correlations: Type.Array(Type.Object({ ...subject, geometry: Slug }, closed)),
    /** The earliest office first; the exporting one last, if it acted on the register. */
    journals: Type.Array(ExchangedJournal),
  },
  closed,
);
export type ExchangedRegister = Static<typeof ExchangedRegister>;
