import { sql } from 'drizzle-orm';
import { check, index, integer, jsonb, pgTable, primaryKey, text } from 'drizzle-orm/pg-core';
import { user } from './auth';
import { at } from './columns';
import { design } from './design';
import { revision } from './revision';

/** Who did what, written in the same transaction as the act. No foreign keys: the record outlives what it tells of. */
export const auditEvent = pgTable(
  'audit_event',
  {
    id: text('id').primaryKey(),
    workshopId: text('workshop_id'),
    actorId: text('actor_id').notNull(),
    act: text('act').notNull(),
    subjectId: text('subject_id').notNull(),
    detail: jsonb('detail').$type<Readonly<Record<string, string | number | boolean | null>>>().notNull(),
    at: at('at').notNull(),
  },
  (table) => [index('audit_event_workshop_idx').on(table.workshopId, table.at)],
);

/** The answer to a creating request, kept so that the same request sent again gets the same answer and has no second effect. */
export const idempotencyKey = pgTable(
  'idempotency_key',
  {
    userId: text('user_id')
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    key: text('key').notNull(),
    /** sha256 of method, path and body. */
    requestHash: text('request_hash').notNull(),
    /** JSON of what was made. */
    answer: text('answer').notNull(),
    createdAt: at('created_at').notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.userId, table.key] }),
    index('idempotency_key_created_idx').on(table.createdAt),
  ],
);

/** How often something was tried within a window that ends at `endsAt`; the key names what, and by whom or against whom, as a hash. */
export const throttle = pgTable(
  'throttle',
  {
    key: text('key').primaryKey(),
    count: integer('count').notNull(),
    endsAt: at('ends_at').notNull(),
  },
  (table) => [index('throttle_ends_idx').on(table.endsAt)],
);

/** Every mail goes through here first, so that an act that rolls back has sent nothing. */
export const mailOutbox = pgTable(
  'mail_outbox',
  {
    id: text('id').primaryKey(),
    recipient: text('recipient').notNull(),
    kind: text('kind').$type<'verify' | 'reset' | 'invitation' | 'alreadyRegistered'>().notNull(),
    subject: text('subject').notNull(),
    text: text('text').notNull(),
    createdAt: at('created_at').notNull(),
    sentAt: at('sent_at'),
    triedAt: at('tried_at'),
    attempts: integer('attempts').notNull().default(0),
    failure: text('failure'),
  },
  (table) => [index('mail_outbox_created_idx').on(table.createdAt)],
);

/** Which pages exist on paper somewhere: of a revision, or of a draft at one version. */
export const printLog = pgTable(
  'print_log',
  {
    id: text('id').primaryKey(),
    designId: text('design_id')
      .notNull()
      .references(() => design.id, { onDelete: 'cascade' }),
    revisionId: text('revision_id').references(() => revision.id, { onDelete: 'cascade' }),
    draftVersion: integer('draft_version'),
    paper: text('paper').notNull(),
    pages: integer('pages').notNull(),
    pdfSha256: text('pdf_sha256').notNull(),
    printedBy: text('printed_by')
      .notNull()
      .references(() => user.id),
    printedAt: at('printed_at').notNull(),
  },
  (table) => [
    index('print_log_design_idx').on(table.designId, table.printedAt),
    check('print_log_source', sql`(${table.revisionId} is null) <> (${table.draftVersion} is null)`),
  ],
);

/** Demo data that has been put in once; a name here is never put in again. */
export const seedRun = pgTable('seed_run', {
  name: text('name').primaryKey(),
  ranAt: at('ran_at').notNull(),
});
