import { sql } from 'drizzle-orm';
import {
  boolean,
  check,
  doublePrecision,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  unique,
} from 'drizzle-orm/pg-core';
import { byUser, ofWorkshop } from './belongs';
import { build } from './builds';
import { at, countOf, notNegative, positive } from './columns';
import { component } from './components';
import { design } from './design';
import { upload } from './uploads';

/** Constants fitted to the readings, each with its standard uncertainty, by a name that carries the unit. */
export type BenchFit = Readonly<Record<string, { readonly value: number; readonly plusMinus: number }>>;

/** A static test of a power set, in an aircraft or on a stand. What was measured keeps the components from being removed. */
export const benchTest = pgTable(
  'bench_test',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    designId: text('design_id'),
    buildId: text('build_id'),
    motorId: text('motor_id'),
    packId: text('pack_id'),
    controllerId: text('controller_id'),
    propellerId: text('propeller_id'),
    fanId: text('fan_id'),
    airTemperatureC: doublePrecision('air_temperature_c'),
    airPressureHpa: doublePrecision('air_pressure_hpa'),
    photoId: text('photo_id'),
    note: text('note').notNull(),
    fit: jsonb('fit').$type<BenchFit>(),
    testedBy: byUser('tested_by').notNull(),
    testedAt: at('tested_at').notNull(),
    createdAt: at('created_at').notNull(),
  },
  (table) => {
    const part = (name: string, column: typeof table.motorId) =>
      foreignKey({
        name: `bench_test_${name}`,
        columns: [column, table.workshopId],
        foreignColumns: [component.id, component.workshopId],
      });
    return [
      unique('bench_test_in_workshop').on(table.id, table.workshopId),
      foreignKey({
        name: 'bench_test_design',
        columns: [table.designId, table.workshopId],
        foreignColumns: [design.id, design.workshopId],
      }),
      foreignKey({
        name: 'bench_test_build',
        columns: [table.buildId, table.designId],
        foreignColumns: [build.id, build.designId],
      }),
      part('motor', table.motorId),
      part('pack', table.packId),
      part('controller', table.controllerId),
      part('propeller', table.propellerId),
      part('fan', table.fanId),
      foreignKey({
        name: 'bench_test_photo',
        columns: [table.photoId, table.workshopId],
        foreignColumns: [upload.id, upload.workshopId],
      }),
      // Without its design a build would slip past the key that holds the two together.
      check('bench_test_build_has_design', sql`${table.buildId} is null or ${table.designId} is not null`),
      check('bench_test_one_thruster', sql`${countOf(table.propellerId, table.fanId)} <= 1`),
      check('bench_test_pressure', positive(table.airPressureHpa)),
      index('bench_test_workshop_idx').on(table.workshopId, table.testedAt),
      index('bench_test_design_idx').on(table.designId),
      index('bench_test_motor_idx').on(table.motorId),
    ];
  },
);

/** One line of readings, as measured; a line that a person leaves out of the fit stays and says why. */
export const benchReading = pgTable(
  'bench_reading',
  {
    id: text('id').primaryKey(),
    workshopId: ofWorkshop(),
    benchTestId: text('bench_test_id').notNull(),
    /** Order within the test. */
    number: integer('number').notNull(),
    throttlePct: doublePrecision('throttle_pct'),
    voltageV: doublePrecision('voltage_v'),
    currentA: doublePrecision('current_a'),
    powerW: doublePrecision('power_w'),
    speedRpm: doublePrecision('speed_rpm'),
    thrustN: doublePrecision('thrust_n'),
    motorC: doublePrecision('motor_c'),
    controllerC: doublePrecision('controller_c'),
    packC: doublePrecision('pack_c'),
    leftOut: boolean('left_out').notNull(),
    note: text('note').notNull(),
  },
  (table) => [
    foreignKey({
      name: 'bench_reading_test',
      columns: [table.benchTestId, table.workshopId],
      foreignColumns: [benchTest.id, benchTest.workshopId],
    }).onDelete('cascade'),
    unique('bench_reading_number').on(table.benchTestId, table.number),
    check('bench_reading_throttle', sql`${table.throttlePct} between 0 and 100`),
    check(
      'bench_reading_sizes',
      notNegative(table.voltageV, table.currentA, table.powerW, table.speedRpm, table.thrustN),
    ),
    check(
      'bench_reading_measured',
      sql`${countOf(table.voltageV, table.currentA, table.powerW, table.speedRpm, table.thrustN)} > 0`,
    ),
    check('bench_reading_left_out', sql`not ${table.leftOut} or length(${table.note}) > 0`),
    index('bench_reading_workshop_idx').on(table.workshopId),
  ],
);
