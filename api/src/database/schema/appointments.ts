import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { person } from './people.js';

/**
 * Technical authorities: proposed by one person, confirmed by a second, ended once. Who did what when is written as it
 * happens and stays; the guards refuse any other change.
 */
export const appointment = sqliteTable(
  'appointment',
  {
    id: text('id').primaryKey(),
    personId: text('person_id')
      .notNull()
      .references(() => person.id),
    /** Slugs of the geometries; null for all of them and for property equations too. */
    geometries: text('geometries', { mode: 'json' }).$type<string[]>(),
    /** Last day, UTC. */
    until: text('until').notNull(),
    proposedAt: text('proposed_at').notNull(),
    proposedById: text('proposed_by_id').notNull(),
    proposedByName: text('proposed_by_name').notNull(),
    confirmedAt: text('confirmed_at'),
    confirmedById: text('confirmed_by_id'),
    confirmedByName: text('confirmed_by_name'),
    endedAt: text('ended_at'),
    endedById: text('ended_by_id'),
    endedByName: text('ended_by_name'),
    endReason: text('end_reason'),
  },
  (table) => [index('appointment_by_person').on(table.personId)],
);
