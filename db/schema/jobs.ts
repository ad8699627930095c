import { sql } from 'drizzle-orm';
import { check, doublePrecision, foreignKey, index, integer, jsonb, pgTable, text } from 'drizzle-orm/pg-core';
import { byUser, ofWorkshop } from './belongs';
import { at, isSha256, notNegative, oneOf, together } from './columns';
import { design } from './design';

export const JOB_STATES = ['queued', 'running', 'done', 'failed', 'stopped'] as const;
export type JobState = (typeof JOB_STATES)[number];

/** Work that takes longer than a request: a plan, a search for a layout. Any process may take a queued one, and takes over one whose process fell silent. */
export const job = pgTable(
  'job',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    designId: text('design_id'),
    /** No closed list: later work adds its own kinds, and a process leaves alone what it does not know. */
    kind: text('kind').notNull(),
    state: text('state').$type<JobState>().notNull(),
    input: jsonb('input').notNull(),
    /** sha256 of kind and input: the same work asked for twice at once is done once. */
    inputHash: text('input_hash').notNull(),
    /** Share that is done. */
    progress: doublePrecision('progress').notNull(),
    progressNote: text('progress_note').notNull(),
    requestedBy: byUser('requested_by').notNull(),
    createdAt: at('created_at').notNull(),
    cancelRequestedAt: at('cancel_requested_at'),
    attempts: integer('attempts').notNull(),
    /** The process that works on it, and when it last gave a sign of life. */
    workerId: text('worker_id'),
    aliveAt: at('alive_at'),
    startedAt: at('started_at'),
    finishedAt: at('finished_at'),
    result: jsonb('result'),
    /** Where the object storage keeps the file that came of it. */
    resultKey: text('result_key'),
    failure: text('failure'),
  },
  (table) => [
    foreignKey({
      name: 'job_design',
      columns: [table.designId, table.workshopId],
      foreignColumns: [design.id, design.workshopId],
    }).onDelete('cascade'),
    check('job_state', oneOf(table.state, JOB_STATES)),
    check('job_input_hash', isSha256(table.inputHash)),
    check('job_progress', sql`${table.progress} between 0 and 1`),
    check('job_attempts', notNegative(table.attempts)),
    check('job_worker', together(table.workerId, table.aliveAt)),
    check(
      'job_running',
      sql`${table.state} <> 'running' or (${table.startedAt} is not null and ${table.workerId} is not null)`,
    ),
    check('job_finished', sql`(${table.state} in ('done', 'failed', 'stopped')) = (${table.finishedAt} is not null)`),
    check('job_failure', sql`(${table.state} = 'failed') = (${table.failure} is not null)`),
    index('job_waiting_idx').on(table.createdAt).where(sql`${table.state} in ('queued', 'running')`),
    index('job_same_work_idx').on(table.workshopId, table.inputHash),
    index('job_workshop_idx').on(table.workshopId, table.createdAt),
    index('job_design_idx').on(table.designId),
  ],
);
