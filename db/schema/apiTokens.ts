import { sql } from 'drizzle-orm';
import { check, foreignKey, index, pgTable, text } from 'drizzle-orm/pg-core';
import type { Act } from '@/lib/contract/roles';
import { byUser, ofWorkshop } from './belongs';
import { at, filled, isSha256, together } from './columns';
import { membership } from './workshop';

/** Lets a program act as a member, within `scopes` and never beyond the member's roles. It goes with the membership; only its hash is kept. */
export const apiToken = pgTable(
  'api_token',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    userId: text('user_id').notNull(),
    name: text('name').notNull(),
    tokenHash: text('token_hash').notNull().unique(),
    scopes: text('scopes').array().$type<Act[]>().notNull(),
    createdAt: at('created_at').notNull(),
    /** Null: until it is revoked. */
    expiresAt: at('expires_at'),
    lastUsedAt: at('last_used_at'),
    revokedBy: byUser('revoked_by'),
    revokedAt: at('revoked_at'),
  },
  (table) => [
    foreignKey({
      name: 'api_token_member',
      columns: [table.workshopId, table.userId],
      foreignColumns: [membership.workshopId, membership.userId],
    }).onDelete('cascade'),
    check('api_token_name', filled(table.name)),
    check('api_token_hash', isSha256(table.tokenHash)),
    check('api_token_scopes', sql`cardinality(${table.scopes}) > 0`),
    check('api_token_expires', sql`${table.expiresAt} > ${table.createdAt}`),
    check('api_token_revoked', together(table.revokedBy, table.revokedAt)),
    index('api_token_member_idx').on(table.workshopId, table.userId),
  ],
);
