import { sql } from 'drizzle-orm';
import { check, foreignKey, index, pgTable, text } from 'drizzle-orm/pg-core';
import { byUser, ofWorkshop } from './belongs';
import { at, isSha256, oneOf, together } from './columns';
import { design } from './design';
import { revision } from './revision';

export const SHARE_SCOPES = ['read', 'print', 'comment'] as const;
export type ShareScope = (typeof SHARE_SCOPES)[number];

/** Lets somebody without an account see one revision, or every released one of a design; never a draft. Only the token's hash is kept. */
export const shareLink = pgTable(
  'share_link',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    tokenHash: text('token_hash').notNull().unique(),
    scope: text('scope').$type<ShareScope>().notNull(),
    designId: text('design_id').notNull(),
    /** Null: every released revision. */
    revisionId: text('revision_id'),
    createdBy: byUser('created_by').notNull(),
    createdAt: at('created_at').notNull(),
    expiresAt: at('expires_at').notNull(),
    lastUsedAt: at('last_used_at'),
    revokedBy: byUser('revoked_by'),
    revokedAt: at('revoked_at'),
  },
  (table) => [
    foreignKey({
      name: 'share_link_design',
      columns: [table.designId, table.workshopId],
      foreignColumns: [design.id, design.workshopId],
    }).onDelete('cascade'),
    foreignKey({
      name: 'share_link_revision',
      columns: [table.revisionId, table.designId],
      foreignColumns: [revision.id, revision.designId],
    }).onDelete('cascade'),
    check('share_link_token_hash', isSha256(table.tokenHash)),
    check('share_link_scope', oneOf(table.scope, SHARE_SCOPES)),
    check('share_link_expires', sql`${table.expiresAt} > ${table.createdAt}`),
    check('share_link_revoked', together(table.revokedBy, table.revokedAt)),
    index('share_link_design_idx').on(table.designId),
    index('share_link_workshop_idx').on(table.workshopId),
  ],
);
