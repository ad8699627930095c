import { sql } from 'drizzle-orm';
import { check, doublePrecision, index, integer, jsonb, pgTable, text, unique, uniqueIndex } from 'drizzle-orm/pg-core';
import { byUser, ofWorkshop } from './belongs';
import { at, filled, notNegative, oneOf, price, priceHolds } from './columns';

export const COMPONENT_KINDS = [
  'motor',
  'pack',
  'controller',
  'propeller',
  'fan',
  'servo',
  'receiver',
  'other',
] as const;
export type ComponentKind = (typeof COMPONENT_KINDS)[number];

/** By a name that carries the unit: { kvRpmV: 1400, resistanceOhm: 0.06 }. Which names a kind has is for the parser of that kind to say. */
export type ComponentFigures = Readonly<Record<string, number | string | null>>;

/** What a workshop can put into an aircraft, described by its figures. Sheets and tubes are stock. */
export const component = pgTable(
  'component',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    kind: text('kind').$type<ComponentKind>().notNull(),
    name: text('name').notNull(),
    figures: jsonb('figures').$type<ComponentFigures>().notNull(),
    massG: doublePrecision('mass_g'),
    /** Where the figures are from: stated, measured here, estimated. */
    source: text('source').notNull(),
    ...price(),
    /** On the shelf; null when nobody counts them. */
    count: integer('count'),
    createdBy: byUser('created_by').notNull(),
    createdAt: at('created_at').notNull(),
    updatedAt: at('updated_at').notNull(),
    /** Out of the list, and still named by the bench tests that used it. */
    archivedAt: at('archived_at'),
  },
  (table) => [
    unique('component_in_workshop').on(table.id, table.workshopId),
    uniqueIndex('component_name').on(table.workshopId, table.kind, table.name).where(sql`${table.archivedAt} is null`),
    check('component_kind', oneOf(table.kind, COMPONENT_KINDS)),
    check('component_name_filled', filled(table.name)),
    check('component_figures', sql`jsonb_typeof(${table.figures}) = 'object'`),
    check('component_sizes', notNegative(table.massG, table.count)),
    check('component_price', priceHolds(table)),
    index('component_workshop_idx').on(table.workshopId, table.kind),
  ],
);
