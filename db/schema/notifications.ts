import { sql } from 'drizzle-orm';
import { foreignKey, index, jsonb, pgTable, text } from 'drizzle-orm/pg-core';
import { ofWorkshop } from './belongs';
import { at } from './columns';
import { membership } from './workshop';

/** Something that a member should see. It goes with the membership: who is no member any more is told nothing. */
export const notification = pgTable(
  'notification',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    userId: text('user_id').notNull(),
    /** No closed list: each later act adds its own, and one that is not known any more is not shown. */
    kind: text('kind').notNull(),
    subjectId: text('subject_id').notNull(),
    detail: jsonb('detail').$type<Readonly<Record<string, string | number | boolean | null>>>().notNull(),
    createdAt: at('created_at').notNull(),
    readAt: at('read_at'),
  },
  (table) => [
    foreignKey({
      name: 'notification_member',
      columns: [table.workshopId, table.userId],
      foreignColumns: [membership.workshopId, membership.userId],
    }).onDelete('cascade'),
    index('notification_member_idx').on(table.workshopId, table.userId, table.createdAt),
    index('notification_unread_idx').on(table.userId, table.createdAt).where(sql`${table.readAt} is null`),
  ],
);
