import { sql } from 'drizzle-orm';
import { check, doublePrecision, foreignKey, index, integer, pgTable, text, unique } from 'drizzle-orm/pg-core';
import { byUser, ofWorkshop } from './belongs';
import { at, notNegative, oneOf, positive, together } from './columns';
import { design } from './design';
import { revision } from './revision';

export const BUILD_STATES = ['building', 'flying', 'lost', 'retired'] as const;
export type BuildState = (typeof BUILD_STATES)[number];

/** One aircraft made from one revision by one builder. */
export const build = pgTable(
  'build',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    designId: text('design_id').notNull(),
    revisionId: text('revision_id').notNull(),
    /** Counts the aircraft made of a design, over all its revisions. */
    number: integer('number').notNull(),
    state: text('state').$type<BuildState>().notNull(),
    builderId: byUser('builder_id').notNull(),
    /** What differs from the plan, in the builder's words. */
    differences: text('differences').notNull(),
    startedAt: at('started_at').notNull(),
    finishedAt: at('finished_at'),
    updatedAt: at('updated_at').notNull(),
  },
  (table) => [
    unique('build_number').on(table.designId, table.number),
    unique('build_in_workshop').on(table.id, table.workshopId),
    unique('build_in_design').on(table.id, table.designId),
    foreignKey({
      name: 'build_design',
      columns: [table.designId, table.workshopId],
      foreignColumns: [design.id, design.workshopId],
    }),
    foreignKey({
      name: 'build_revision',
      columns: [table.revisionId, table.designId],
      foreignColumns: [revision.id, revision.designId],
    }),
    check('build_number_positive', positive(table.number)),
    check('build_state', oneOf(table.state, BUILD_STATES)),
    index('build_workshop_idx').on(table.workshopId, table.startedAt),
    index('build_revision_idx').on(table.revisionId),
  ],
);

/** One line of a build's checklist: a step of a part. */
export const buildPart = pgTable(
  'build_part',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    buildId: text('build_id').notNull(),
    partKey: text('part_key').notNull(),
    step: text('step').notNull(),
    tickedBy: byUser('ticked_by'),
    tickedAt: at('ticked_at'),
  },
  (table) => [
    foreignKey({
      name: 'build_part_build',
      columns: [table.buildId, table.workshopId],
      foreignColumns: [build.id, build.workshopId],
    }).onDelete('cascade'),
    unique('build_part_step').on(table.buildId, table.partKey, table.step),
    check('build_part_ticked', together(table.tickedBy, table.tickedAt)),
    index('build_part_workshop_idx').on(table.workshopId),
  ],
);

export const WEIGHED = ['part', 'item', 'assembly', 'allUp'] as const;
export type Weighed = (typeof WEIGHED)[number];

/** What the scale said, and for the whole aircraft where it balanced. Append-only: weighed again is another row. */
export const weighing = pgTable(
  'weighing',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    buildId: text('build_id').notNull(),
    what: text('what').$type<Weighed>().notNull(),
    /** Key of the part, id of the item, or the builder's name for an assembly; none for the whole aircraft. */
    key: text('key'),
    massG: doublePrecision('mass_g').notNull(),
    /** Axes of the airframe. */
    cgXMm: doublePrecision('cg_x_mm'),
    cgYMm: doublePrecision('cg_y_mm'),
    weighedBy: byUser('weighed_by').notNull(),
    weighedAt: at('weighed_at').notNull(),
  },
  (table) => [
    foreignKey({
      name: 'weighing_build',
      columns: [table.buildId, table.workshopId],
      foreignColumns: [build.id, build.workshopId],
    }).onDelete('cascade'),
    check('weighing_what', oneOf(table.what, WEIGHED)),
    check('weighing_key', sql`(${table.what} = 'allUp') = (${table.key} is null)`),
    check('weighing_mass', notNegative(table.massG)),
    check('weighing_cg', sql`${table.what} = 'allUp' or (${table.cgXMm} is null and ${table.cgYMm} is null)`),
    index('weighing_build_idx').on(table.buildId, table.weighedAt),
    index('weighing_workshop_idx').on(table.workshopId),
  ],
);
