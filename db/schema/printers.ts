import { check, doublePrecision, pgTable, text, unique } from 'drizzle-orm/pg-core';
import { byUser, ofWorkshop } from './belongs';
import { at, filled, positive, together } from './columns';

/** What a printer makes of a known length. The first check page is `measured…`, the second, which confirms a driver that resizes, is `confirmed…`. */
export const printerProfile = pgTable(
  'printer_profile',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    name: text('name').notNull(),
    /** What the check page had drawn. */
    drawnXMm: doublePrecision('drawn_x_mm').notNull(),
    drawnYMm: doublePrecision('drawn_y_mm').notNull(),
    measuredXMm: doublePrecision('measured_x_mm').notNull(),
    measuredYMm: doublePrecision('measured_y_mm').notNull(),
    measuredBy: byUser('measured_by').notNull(),
    measuredAt: at('measured_at').notNull(),
    confirmedXMm: doublePrecision('confirmed_x_mm'),
    confirmedYMm: doublePrecision('confirmed_y_mm'),
    confirmedBy: byUser('confirmed_by'),
    confirmedAt: at('confirmed_at'),
  },
  (table) => [
    unique('printer_profile_name').on(table.workshopId, table.name),
    check('printer_profile_name_filled', filled(table.name)),
    check(
      'printer_profile_sizes',
      positive(
        table.drawnXMm,
        table.drawnYMm,
        table.measuredXMm,
        table.measuredYMm,
        table.confirmedXMm,
        table.confirmedYMm,
      ),
    ),
    check(
      'printer_profile_confirmed',
      together(table.confirmedXMm, table.confirmedYMm, table.confirmedBy, table.confirmedAt),
    ),
  ],
);
