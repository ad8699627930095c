import { sql } from 'drizzle-orm';
import { check, index, pgTable, text, unique } from 'drizzle-orm/pg-core';
import type { Role } from '@/lib/contract/roles';
import { user } from './auth';
import { at } from './columns';

const rolesHold = sql.raw(
  `cardinality("roles") > 0 and "roles" <@ array['owner','designer','builder','reviewer']::text[]`,
);

export const workshop = pgTable('workshop', {
  id: text('id').primaryKey(),
  name: text('name').notNull(),
  createdAt: at('created_at').notNull(),
});

/** A removed member has no row; what they did stays under their user. */
export const membership = pgTable(
  'membership',
  {
    id: text('id').primaryKey(),
    workshopId: text('workshop_id')
      .notNull()
      .references(() => workshop.id, { onDelete: 'cascade' }),
    userId: text('user_id')
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    roles: text('roles').array().$type<Role[]>().notNull(),
    createdAt: at('created_at').notNull(),
  },
  (table) => [
    unique('membership_workshop_user').on(table.workshopId, table.userId),
    index('membership_user_idx').on(table.userId),
    check('membership_roles', rolesHold),
  ],
);

/** Only the hash of the token is kept: whoever reads the table cannot accept an invitation. */
export const invitation = pgTable(
  'invitation',
  {
    id: text('id').primaryKey(),
    workshopId: text('workshop_id')
      .notNull()
      .references(() => workshop.id, { onDelete: 'cascade' }),
    tokenHash: text('token_hash').notNull().unique(),
    email: text('email').notNull(),
    roles: text('roles').array().$type<Role[]>().notNull(),
    invitedBy: text('invited_by')
      .notNull()
      .references(() => user.id),
    createdAt: at('created_at').notNull(),
    expiresAt: at('expires_at').notNull(),
    acceptedAt: at('accepted_at'),
    acceptedBy: text('accepted_by').references(() => user.id),
    revokedAt: at('revoked_at'),
  },
  (table) => [index('invitation_workshop_idx').on(table.workshopId), check('invitation_roles', rolesHold)],
);
