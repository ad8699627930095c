import { sql } from 'drizzle-orm';
import { check, doublePrecision, foreignKey, index, integer, pgTable, text, unique } from 'drizzle-orm/pg-core';
import { byUser, ofWorkshop } from './belongs';
import { build } from './builds';
import { at, notNegative, onlyOf, positive } from './columns';

/** What a pilot picks from to say how it flew. */
export const BEHAVIOURS = [
  'porpoises',
  'wags',
  'climbsWithPower',
  'divesWithPower',
  'rollsWithPower',
  'needsUpInTurns',
  'floats',
  'buzzes',
  'wanders',
  'dropsAWing',
  'tucks',
  'glitched',
] as const;
export type Behaviour = (typeof BEHAVIOURS)[number];

/** One flight of a build; number 1 is its maiden. */
export const flight = pgTable(
  'flight',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    designId: text('design_id').notNull(),
    buildId: text('build_id').notNull(),
    number: integer('number').notNull(),
    pilotId: byUser('pilot_id').notNull(),
    flownAt: at('flown_at').notNull(),
    durationS: doublePrecision('duration_s'),
    windMs: doublePrecision('wind_ms'),
    temperatureC: doublePrecision('temperature_c'),
    /** Site, gusts, grass, launch: whatever the numbers leave out. */
    conditions: text('conditions').notNull(),
    /** As it flew: the pack moves, and ballast comes and goes. */
    massG: doublePrecision('mass_g'),
    cgXMm: doublePrecision('cg_x_mm'),
    usedMah: doublePrecision('used_mah'),
    /** Trim that it needed: pitch as trailing edge down, roll as starboard trailing edge up, yaw as trailing edge to starboard. */
    trimPitchDeg: doublePrecision('trim_pitch_deg'),
    trimRollDeg: doublePrecision('trim_roll_deg'),
    trimYawDeg: doublePrecision('trim_yaw_deg'),
    behaviours: text('behaviours').array().$type<Behaviour[]>().notNull(),
    expected: text('expected').notNull(),
    observed: text('observed').notNull(),
    createdAt: at('created_at').notNull(),
  },
  (table) => [
    unique('flight_number').on(table.buildId, table.number),
    unique('flight_in_design').on(table.id, table.designId),
    foreignKey({
      name: 'flight_build',
      columns: [table.buildId, table.workshopId],
      foreignColumns: [build.id, build.workshopId],
    }),
    foreignKey({
      name: 'flight_build_design',
      columns: [table.buildId, table.designId],
      foreignColumns: [build.id, build.designId],
    }),
    check('flight_number_positive', positive(table.number)),
    check('flight_sizes', notNegative(table.durationS, table.windMs, table.usedMah)),
    check('flight_mass', positive(table.massG)),
    check('flight_temperature', sql`${table.temperatureC} between -60 and 60`),
    check('flight_behaviours', onlyOf(table.behaviours, BEHAVIOURS)),
    index('flight_design_idx').on(table.designId, table.flownAt),
    index('flight_workshop_idx').on(table.workshopId, table.flownAt),
  ],
);
