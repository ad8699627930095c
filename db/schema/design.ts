import { sql } from 'drizzle-orm';
import { check, doublePrecision, index, integer, jsonb, pgTable, text, unique } from 'drizzle-orm/pg-core';
import type { Thumbnail } from '@/lib/contract/answers';
import { user } from './auth';
import { at } from './columns';
import { workshop } from './workshop';

/** `draftVersion` names the newest draft save; the columns after it are worked out from that save so that a list needs no airframe. */
export const design = pgTable(
  'design',
  {
    id: text('id').primaryKey(),
    workshopId: text('workshop_id')
      .notNull()
      .references(() => workshop.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    createdBy: text('created_by')
      .notNull()
      .references(() => user.id),
    createdAt: at('created_at').notNull(),
    updatedAt: at('updated_at').notNull(),
    archivedAt: at('archived_at'),
    draftVersion: integer('draft_version').notNull(),
    spanMm: doublePrecision('span_mm').notNull(),
    massG: doublePrecision('mass_g'),
    thumbnail: jsonb('thumbnail').$type<Thumbnail>().notNull(),
  },
  (table) => [
    unique('design_in_workshop').on(table.id, table.workshopId),
    index('design_workshop_idx').on(table.workshopId, table.updatedAt),
  ],
);

/** Append-only: a save is never changed or removed, so nothing that was drawn is lost. The body is text: parsing jsonb costs more than storing it. */
export const draftSave = pgTable(
  'draft_save',
  {
    id: text('id').primaryKey(),
    designId: text('design_id')
      .notNull()
      .references(() => design.id, { onDelete: 'cascade' }),
    version: integer('version').notNull(),
    /** Version this save was made from; null for the first. */
    base: integer('base'),
    body: text('body').notNull(),
    sha256: text('sha256').notNull(),
    authorId: text('author_id')
      .notNull()
      .references(() => user.id),
    createdAt: at('created_at').notNull(),
  },
  (table) => [
    unique('draft_save_version').on(table.designId, table.version),
    check('draft_save_base', sql`${table.base} is null or ${table.base} < ${table.version}`),
  ],
);
