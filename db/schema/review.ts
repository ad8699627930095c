import { sql } from 'drizzle-orm';
import { boolean, check, integer, jsonb, pgTable, text, unique } from 'drizzle-orm/pg-core';
import type { Anchor, VerdictKind } from '@/lib/contract/bodies';
import { user } from './auth';
import { at } from './columns';
import { revision } from './revision';

/** Pinned to a place, element, part, figure, sheet or rule of one revision; numbered within it. */
export const commentThread = pgTable(
  'comment_thread',
  {
    id: text('id').primaryKey(),
    revisionId: text('revision_id')
      .notNull()
      .references(() => revision.id, { onDelete: 'cascade' }),
    number: integer('number').notNull(),
    anchor: jsonb('anchor').$type<Anchor>().notNull(),
    state: text('state').$type<'open' | 'closed'>().notNull().default('open'),
    createdBy: text('created_by')
      .notNull()
      .references(() => user.id),
    createdAt: at('created_at').notNull(),
    closedBy: text('closed_by').references(() => user.id),
    closedAt: at('closed_at'),
  },
  (table) => [
    unique('comment_thread_number').on(table.revisionId, table.number),
    check('comment_thread_state', sql`${table.state} in ('open', 'closed')`),
    check('comment_thread_closed', sql`(${table.state} = 'closed') = (${table.closedBy} is not null)`),
  ],
);

export const comment = pgTable(
  'comment',
  {
    id: text('id').primaryKey(),
    threadId: text('thread_id')
      .notNull()
      .references(() => commentThread.id, { onDelete: 'cascade' }),
    /** Order within the thread. */
    number: integer('number').notNull(),
    authorId: text('author_id')
      .notNull()
      .references(() => user.id),
    text: text('text').notNull(),
    createdAt: at('created_at').notNull(),
  },
  (table) => [unique('comment_number').on(table.threadId, table.number)],
);

/** Append-only: a changed mind is a new row, and the newest row of each person is the one in force. */
export const verdict = pgTable(
  'verdict',
  {
    id: text('id').primaryKey(),
    revisionId: text('revision_id')
      .notNull()
      .references(() => revision.id, { onDelete: 'cascade' }),
    userId: text('user_id')
      .notNull()
      .references(() => user.id),
    /** Order within the revision: two verdicts can carry the same time. */
    number: integer('number').notNull(),
    verdict: text('verdict').$type<VerdictKind>().notNull(),
    note: text('note').notNull(),
    /** False for a verdict on one's own release: kept and shown, and of no weight. */
    counts: boolean('counts').notNull(),
    createdAt: at('created_at').notNull(),
  },
  (table) => [
    unique('verdict_number').on(table.revisionId, table.number),
    check('verdict_kind', sql`${table.verdict} in ('goodToCut', 'hold', 'seen')`),
    check('verdict_hold_has_note', sql`${table.verdict} <> 'hold' or length(${table.note}) > 0`),
  ],
);
