import { sql } from 'drizzle-orm';
import {
  type AnyPgColumn,
  check,
  customType,
  doublePrecision,
  integer,
  pgTable,
  text,
  unique,
} from 'drizzle-orm/pg-core';
import type { RevisionState } from '@/lib/contract/answers';
import { user } from './auth';
import { at } from './columns';
import { design } from './design';

/** Bytes as the drivers give them: one answers with a Buffer, the other with a plain array. */
const bytes = customType<{ data: Uint8Array; driverData: Uint8Array }>({ dataType: () => 'bytea' });

/** A frozen, numbered airframe. Nothing of it changes after the release but `state`, which follows the verdicts. */
export const revision = pgTable(
  'revision',
  {
    id: text('id').primaryKey(),
    designId: text('design_id')
      .notNull()
      .references(() => design.id, { onDelete: 'cascade' }),
    number: integer('number').notNull(),
    /** The revision it was drawn from; for a variant it belongs to another design. */
    parentRevisionId: text('parent_revision_id').references((): AnyPgColumn => revision.id),
    draftVersion: integer('draft_version').notNull(),
    /** Canonical JSON, exactly the text that `sha256` was taken of. */
    body: text('body').notNull(),
    sha256: text('sha256').notNull(),
    engine: text('engine').notNull(),
    state: text('state').$type<RevisionState>().notNull().default('released'),
    reason: text('reason').notNull(),
    expectedEffect: text('expected_effect').notNull(),
    releasedBy: text('released_by')
      .notNull()
      .references(() => user.id),
    releasedAt: at('released_at').notNull(),
    spanMm: doublePrecision('span_mm'),
    wingAreaDm2: doublePrecision('wing_area_dm2'),
    allUpMassG: doublePrecision('all_up_mass_g'),
    staticMarginPct: doublePrecision('static_margin_pct'),
  },
  (table) => [
    unique('revision_number').on(table.designId, table.number),
    unique('revision_in_design').on(table.id, table.designId),
    check('revision_state', sql`${table.state} in ('released', 'goodToCut', 'held')`),
  ],
);

export const ARTEFACT_KINDS = ['figures', 'parts', 'layout'] as const;
export type ArtefactKind = (typeof ARTEFACT_KINDS)[number];

/** What the engine worked out at the release, gzip of JSON. A page reprinted in a year must match its neighbours, so it is read and never computed again, and neither it nor its revision goes along with something else that is removed. */
export const artefact = pgTable(
  'artefact',
  {
    id: text('id').primaryKey(),
    revisionId: text('revision_id')
      .notNull()
      .references(() => revision.id, { onDelete: 'restrict' }),
    kind: text('kind').$type<ArtefactKind>().notNull(),
    engine: text('engine').notNull(),
    body: bytes('body').notNull(),
    sha256: text('sha256').notNull(),
  },
  (table) => [
    unique('artefact_revision_kind').on(table.revisionId, table.kind),
    check('artefact_kind', sql`${table.kind} in ('figures', 'parts', 'layout')`),
  ],
);
