import type { CslItem } from '@merestone/engine';
import { index, integer, sqliteTable, text, unique } from 'drizzle-orm/sqlite-core';
import { LICENCES, MEDIA_TYPES, OWNER_KINDS, type ActiveContent } from '../../common/attachment.js';

/**
 * A document attached to a source of a revision, or to a calculation. The bytes are in the data folder under their
 * SHA-256, written before the row; rows stay as written, but for the licence.
 */
export const attachment = sqliteTable(
  'attachment',
  {
    id: text('id').primaryKey(),
    ownerKind: text('owner_kind', { enum: OWNER_KINDS }).notNull(),
    /** Id of the row that owns it. */
    ownerId: text('owner_id').notNull(),
    /** The citation it was attached to, as it was then: by it the source is found again when sources change places. */
    source: text('source', { mode: 'json' }).$type<CslItem>(),
    name: text('name').notNull(),
    /** Told from the bytes, never from the name. */
    mediaType: text('media_type', { enum: MEDIA_TYPES }).notNull(),
    size: integer('size').notNull(),
    sha256: text('sha256').notNull(),
    licence: text('licence', { enum: LICENCES }).notNull(),
    /** What of it would act when opened; empty where nothing was found. */
    activeContent: text('active_content', { mode: 'json' }).$type<ActiveContent[]>().notNull(),
    at: text('at').notNull(),
    byId: text('by_id').notNull(),
    byName: text('by_name').notNull(),
  },
  (table) => [
    unique('attachment_once').on(table.ownerKind, table.ownerId, table.sha256),
    index('attachment_by_owner').on(table.ownerKind, table.ownerId, table.at),
  ],
);
