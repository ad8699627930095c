import { sql } from 'drizzle-orm';
import { check, doublePrecision, foreignKey, index, integer, jsonb, pgTable, text, unique } from 'drizzle-orm/pg-core';
import type { Material, Tube } from '@/lib/airframe/schema/stock';
import type { Vec2 } from '@/lib/numerics/vec';
import { byUser, ofWorkshop } from './belongs';
import { at, countOf, filled, notNegative, oneOf, positive, price, priceHolds } from './columns';
import { layout } from './layouts';

export const STOCK_KINDS = ['sheet', 'remnant', 'tube'] as const;
export type StockKind = (typeof STOCK_KINDS)[number];

const SHEET_MATERIALS = [
  'paperFacedBoard',
  'xps',
  'epp',
  'balsa',
  'ply',
] as const satisfies readonly Material['kind'][];
const TUBE_MATERIALS = ['tube', 'rod', 'strip', 'foamBox'] as const satisfies readonly Tube['kind'][];
const GRAINS = ['alongWidth', 'alongHeight', 'none'] as const satisfies readonly Material['grain'][];

/**
 * What the stock coupon said of one kind of board: the workshop's own record of it. Append-only: measured again is
 * another row, and a sheet names the one that speaks for it.
 */
export const stockCoupon = pgTable(
  'stock_coupon',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    material: text('material').$type<Material['kind']>().notNull(),
    name: text('name').notNull(),
    /** Of the 100 x 100 mm piece. */
    massG: doublePrecision('mass_g').notNull(),
    thicknessMm: doublePrecision('thickness_mm').notNull(),
    /** Of the bending strip, with the load and the free length that it was bent with. */
    deflectionMm: doublePrecision('deflection_mm'),
    loadG: doublePrecision('load_g'),
    freeLengthMm: doublePrecision('free_length_mm'),
    /** Width of the narrowest slot of the comb that the board slides into and is held by. */
    slotMm: doublePrecision('slot_mm'),
    measuredBy: byUser('measured_by').notNull(),
    measuredAt: at('measured_at').notNull(),
  },
  (table) => [
    unique('stock_coupon_in_workshop').on(table.id, table.workshopId),
    check('stock_coupon_material', oneOf(table.material, SHEET_MATERIALS)),
    check('stock_coupon_name', filled(table.name)),
    check(
      'stock_coupon_sizes',
      positive(table.massG, table.thicknessMm, table.deflectionMm, table.loadG, table.freeLengthMm, table.slotMm),
    ),
    check('stock_coupon_bending', sql`${countOf(table.deflectionMm, table.loadG, table.freeLengthMm)} in (0, 3)`),
    index('stock_coupon_workshop_idx').on(table.workshopId, table.measuredAt),
  ],
);

/** Sheets, what is left of sheets, and lengths of tube, rod and strip that a workshop has or can buy. */
export const stock = pgTable(
  'stock',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    kind: text('kind').$type<StockKind>().notNull(),
    material: text('material').$type<Material['kind'] | Tube['kind']>().notNull(),
    name: text('name').notNull(),
    /** Null: as many as it takes. */
    count: integer('count'),
    thicknessMm: doublePrecision('thickness_mm'),
    /** Of a remnant: of the box around its outline. */
    widthMm: doublePrecision('width_mm'),
    heightMm: doublePrecision('height_mm'),
    arealMassGm2: doublePrecision('areal_mass_g_m2'),
    grain: text('grain').$type<Material['grain']>(),
    /** Counter-clockwise, lower left corner of the box at 0, 0. */
    outlineMm: jsonb('outline_mm').$type<readonly Vec2[]>(),
    couponId: text('coupon_id'),
    /** The layout that left this remnant over. */
    leftByLayoutId: text('left_by_layout_id').references(() => layout.id, { onDelete: 'set null' }),
    outerWidthMm: doublePrecision('outer_width_mm'),
    outerHeightMm: doublePrecision('outer_height_mm'),
    /** None for a solid rod or strip. */
    wallMm: doublePrecision('wall_mm'),
    lengthMm: doublePrecision('length_mm'),
    massPerMetreG: doublePrecision('mass_per_metre_g'),
    eGpa: doublePrecision('e_gpa'),
    ...price(),
    createdBy: byUser('created_by').notNull(),
    createdAt: at('created_at').notNull(),
    updatedAt: at('updated_at').notNull(),
  },
  (table) => [
    foreignKey({
      name: 'stock_measured_by_coupon',
      columns: [table.couponId, table.workshopId],
      foreignColumns: [stockCoupon.id, stockCoupon.workshopId],
    }),
    check(
      'stock_kind',
      sql`case ${table.kind} when 'tube' then ${oneOf(table.material, TUBE_MATERIALS)} when 'sheet' then ${oneOf(table.material, SHEET_MATERIALS)} when 'remnant' then ${oneOf(table.material, SHEET_MATERIALS)} else false end`,
    ),
    check(
      'stock_is_flat_or_long',
      sql`case when ${table.kind} = 'tube' then ${countOf(table.outerWidthMm, table.outerHeightMm, table.lengthMm, table.massPerMetreG)} = 4 and ${countOf(table.thicknessMm, table.widthMm, table.heightMm, table.arealMassGm2, table.grain, table.couponId)} = 0 else ${countOf(table.thicknessMm, table.widthMm, table.heightMm, table.grain)} = 4 and ${countOf(table.outerWidthMm, table.outerHeightMm, table.wallMm, table.lengthMm, table.massPerMetreG)} = 0 end`,
    ),
    check('stock_outline', sql`(${table.kind} = 'remnant') = (${table.outlineMm} is not null)`),
    check('stock_grain', oneOf(table.grain, GRAINS)),
    check('stock_count', notNegative(table.count)),
    check(
      'stock_sizes',
      positive(
        table.thicknessMm,
        table.widthMm,
        table.heightMm,
        table.arealMassGm2,
        table.outerWidthMm,
        table.outerHeightMm,
        table.wallMm,
        table.lengthMm,
        table.massPerMetreG,
        table.eGpa,
      ),
    ),
    check('stock_price', priceHolds(table)),
    index('stock_workshop_idx').on(table.workshopId, table.kind, table.material),
  ],
);
