import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, text, unique } from 'drizzle-orm/pg-core';
import { byUser, ofWorkshop } from './belongs';
import { benchTest } from './benchTests';
import { build } from './builds';
import { at, countOf, filled, positive } from './columns';
import { design } from './design';
import { flight } from './flights';
import { comment } from './review';
import { revision } from './revision';

/** A finding that the next revision has to answer, and where it was found. */
export const openPoint = pgTable(
  'open_point',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    designId: text('design_id').notNull(),
    number: integer('number').notNull(),
    finding: text('finding').notNull(),
    flightId: text('flight_id'),
    buildId: text('build_id'),
    benchTestId: text('bench_test_id'),
    commentId: text('comment_id').references(() => comment.id),
    raisedBy: byUser('raised_by').notNull(),
    raisedAt: at('raised_at').notNull(),
    answeredByRevisionId: text('answered_by_revision_id'),
    answer: text('answer'),
    answeredBy: byUser('answered_by'),
    answeredAt: at('answered_at'),
  },
  (table) => [
    unique('open_point_number').on(table.designId, table.number),
    foreignKey({
      name: 'open_point_design',
      columns: [table.designId, table.workshopId],
      foreignColumns: [design.id, design.workshopId],
    }).onDelete('cascade'),
    foreignKey({
      name: 'open_point_flight',
      columns: [table.flightId, table.designId],
      foreignColumns: [flight.id, flight.designId],
    }),
    foreignKey({
      name: 'open_point_build',
      columns: [table.buildId, table.designId],
      foreignColumns: [build.id, build.designId],
    }),
    foreignKey({
      name: 'open_point_bench_test',
      columns: [table.benchTestId, table.workshopId],
      foreignColumns: [benchTest.id, benchTest.workshopId],
    }),
    foreignKey({
      name: 'open_point_answer',
      columns: [table.answeredByRevisionId, table.designId],
      foreignColumns: [revision.id, revision.designId],
    }),
    check('open_point_source', sql`${countOf(table.flightId, table.buildId, table.benchTestId, table.commentId)} = 1`),
    check('open_point_number_positive', positive(table.number)),
    check('open_point_finding', filled(table.finding)),
    check(
      'open_point_answered',
      sql`${countOf(table.answeredByRevisionId, table.answer, table.answeredBy, table.answeredAt)} in (0, 4)`,
    ),
    index('open_point_unanswered_idx').on(table.designId).where(sql`${table.answeredByRevisionId} is null`),
    index('open_point_answer_idx').on(table.answeredByRevisionId),
    index('open_point_workshop_idx').on(table.workshopId),
  ],
);
