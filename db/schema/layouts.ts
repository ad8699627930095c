import { sql } from 'drizzle-orm';
import {
  bigint,
  boolean,
  check,
  doublePrecision,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  unique,
  uniqueIndex,
} from 'drizzle-orm/pg-core';
import type { LaidSheet } from '@/lib/layout/types';
import { byUser, ofWorkshop } from './belongs';
import { at, countOf, isSha256, notNegative } from './columns';
import { design, draftSave } from './design';
import { revision } from './revision';

/**
 * Where each part lies on the workshop's own sheets, for a revision or for a draft at one version. The layout frozen at a
 * release is an artefact; this one is what somebody laid out since, and only a drawing: it goes with its design.
 */
export const layout = pgTable(
  'layout',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    designId: text('design_id').notNull(),
    revisionId: text('revision_id'),
    draftVersion: integer('draft_version'),
    /** sha256 of the stock that it was laid out on: other stock, other layout. */
    stockHash: text('stock_hash').notNull(),
    engine: text('engine').notNull(),
    /** The same seed and as many steps give the same layout again. */
    seed: bigint('seed', { mode: 'number' }).notNull(),
    steps: integer('steps').notNull(),
    spacingMm: doublePrecision('spacing_mm').notNull(),
    marginMm: doublePrecision('margin_mm').notNull(),
    placements: jsonb('placements').$type<readonly LaidSheet[]>().notNull(),
    /** Keys of the parts that a search must leave where they lie. */
    locks: text('locks').array().notNull(),
    /** The one that is printed and cut. */
    chosen: boolean('chosen').notNull(),
    createdBy: byUser('created_by').notNull(),
    createdAt: at('created_at').notNull(),
  },
  (table) => [
    unique('layout_in_workshop').on(table.id, table.workshopId),
    foreignKey({
      name: 'layout_design',
      columns: [table.designId, table.workshopId],
      foreignColumns: [design.id, design.workshopId],
    }).onDelete('cascade'),
    foreignKey({
      name: 'layout_revision',
      columns: [table.revisionId, table.designId],
      foreignColumns: [revision.id, revision.designId],
    }).onDelete('cascade'),
    foreignKey({
      name: 'layout_draft',
      columns: [table.designId, table.draftVersion],
      foreignColumns: [draftSave.designId, draftSave.version],
    }).onDelete('cascade'),
    check('layout_source', sql`${countOf(table.revisionId, table.draftVersion)} = 1`),
    check('layout_stock_hash', isSha256(table.stockHash)),
    check('layout_sizes', notNegative(table.seed, table.steps, table.spacingMm, table.marginMm)),
    uniqueIndex('layout_chosen_revision').on(table.revisionId).where(sql`${table.chosen}`),
    uniqueIndex('layout_chosen_draft').on(table.designId, table.draftVersion).where(sql`${table.chosen}`),
    index('layout_workshop_idx').on(table.workshopId, table.createdAt),
    index('layout_design_idx').on(table.designId, table.createdAt),
    index('layout_revision_idx').on(table.revisionId),
  ],
);
