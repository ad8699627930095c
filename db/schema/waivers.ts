import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, text, uniqueIndex } from 'drizzle-orm/pg-core';
import { byUser, ofWorkshop } from './belongs';
import { at, countOf, filled, together } from './columns';
import { design, draftSave } from './design';
import { revision } from './revision';

/**
 * A rule of the before-you-cut check, or a limit of the power set, that somebody lets pass at one place, and why. Given on
 * a draft it holds for the saves that follow; given on a revision it holds for that one. Taken back, never removed.
 */
export const waiver = pgTable(
  'waiver',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    designId: text('design_id').notNull(),
    revisionId: text('revision_id'),
    draftVersion: integer('draft_version'),
    ruleId: text('rule_id').notNull(),
    /** Key of the part or element that the rule is pinned to; empty for a rule about the whole aircraft. */
    placeKey: text('place_key').notNull(),
    reason: text('reason').notNull(),
    waivedBy: byUser('waived_by').notNull(),
    waivedAt: at('waived_at').notNull(),
    withdrawnBy: byUser('withdrawn_by'),
    withdrawnAt: at('withdrawn_at'),
  },
  (table) => [
    foreignKey({
      name: 'waiver_design',
      columns: [table.designId, table.workshopId],
      foreignColumns: [design.id, design.workshopId],
    }).onDelete('cascade'),
    foreignKey({
      name: 'waiver_revision',
      columns: [table.revisionId, table.designId],
      foreignColumns: [revision.id, revision.designId],
    }).onDelete('cascade'),
    foreignKey({
      name: 'waiver_draft',
      columns: [table.designId, table.draftVersion],
      foreignColumns: [draftSave.designId, draftSave.version],
    }).onDelete('cascade'),
    check('waiver_source', sql`${countOf(table.revisionId, table.draftVersion)} = 1`),
    check('waiver_reason', filled(table.reason)),
    check('waiver_withdrawn', together(table.withdrawnBy, table.withdrawnAt)),
    uniqueIndex('waiver_revision_rule')
      .on(table.revisionId, table.ruleId, table.placeKey)
      .where(sql`${table.withdrawnAt} is null`),
    uniqueIndex('waiver_draft_rule')
      .on(table.designId, table.ruleId, table.placeKey)
      .where(sql`${table.withdrawnAt} is null and ${table.revisionId} is null`),
    index('waiver_workshop_idx').on(table.workshopId),
    index('waiver_design_idx').on(table.designId),
  ],
);
