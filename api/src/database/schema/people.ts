import { sql } from 'drizzle-orm';
import { check, index, integer, primaryKey, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { ROLES } from '../../common/roles.js';

/** People are never deleted, since journal, reviews and approvals name them; they are made inactive. */
export const person = sqliteTable(
  'person',
  {
    id: text('id').primaryKey(),
    name: text('name').notNull(),
    /** In lower case: addresses are compared without regard to case. */
    email: text('email').notNull(),
    /** argon2id in PHC form; null until a password was chosen. */
    passwordHash: text('password_hash'),
    active: integer('active', { mode: 'boolean' }).notNull().default(true),
    createdAt: text('created_at').notNull(),
  },
  (table) => [
    uniqueIndex('person_email').on(table.email),
    check('person_email_lower', sql`${table.email} = lower(${table.email})`),
  ],
);

export const personRole = sqliteTable(
  'person_role',
  {
    personId: text('person_id')
      .notNull()
      .references(() => person.id),
    role: text('role', { enum: [...ROLES] }).notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.personId, table.role] }),
    check(
      'person_role_known',
      sql`${table.role} IN ('engineer', 'reviewer', 'authority', 'auditor', 'administrator')`,
    ),
    index('person_role_by_role').on(table.role),
  ],
);
