import { sql } from 'drizzle-orm';
import { check, integer, pgTable, text, unique } from 'drizzle-orm/pg-core';
import { byUser, ofWorkshop } from './belongs';
import { at, filled, notNegative } from './columns';

/** An address that is told of what happens. The secret is kept as it is, because every message is signed with it; no answer shows it again. */
export const webhook = pgTable(
  'webhook',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    url: text('url').notNull(),
    secret: text('secret').notNull(),
    /** Acts as the audit names them. */
    events: text('events').array().notNull(),
    createdBy: byUser('created_by').notNull(),
    createdAt: at('created_at').notNull(),
    disabledAt: at('disabled_at'),
    deliveredAt: at('delivered_at'),
    /** In a row, since the last one that arrived. */
    failures: integer('failures').notNull(),
    failure: text('failure'),
  },
  (table) => [
    unique('webhook_url').on(table.workshopId, table.url),
    check('webhook_address', sql`${table.url} ~ '^https?://'`),
    check('webhook_secret', filled(table.secret)),
    check('webhook_events', sql`cardinality(${table.events}) > 0`),
    check('webhook_failures', notNegative(table.failures)),
  ],
);
