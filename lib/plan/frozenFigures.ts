import { z } from 'zod';
import type { Figures } from '@/lib/figures/types';
import { list, mm, name, point3, problem } from './frozenFields';

// Figures as they were frozen. Whatever the plan prints of them keeps to what a page can hold; the rest keeps its shape.

const text = z.string().max(4000);
const degrees = z.number().min(-360).max(360);
const share = z.number().min(0).max(1);
const pair = z.tuple([z.number(), z.number()]);
const few = <T extends z.ZodType>(of: T) => z.array(of).max(40);

const figure = z.object({
  value: z.number().nullable(),
  band: z.object({ low: z.number(), high: z.number(), cause: text }).optional(),
  verdict: z.object({ level: z.enum(['good', 'watch', 'bad']), words: text }).optional(),
  inputs: list(z.object({ name, value: z.number(), unit: name })).optional(),
  problem: problem.optional(),
});

const marks = z.object({
  mac: z.object({ lengthMm: z.number(), leXMm: z.number(), yMm: z.number(), zMm: z.number() }).nullable(),
  aerodynamicCentreXMm: z.number().nullable(),
  neutralPointXMm: z.number().nullable(),
  neutralPointBandXMm: pair.nullable(),
  cgRangeXMm: pair.nullable(),
  firstFlightCgXMm: z.number().nullable(),
  cg: point3.nullable(),
});

const MASS_GROUPS = ['foam', 'covering', 'glue', 'tube', 'item', 'drive', 'gear'] as const;
const CHARTS = ['powerRequired', 'trimSpeed', 'pitchStep', 'rollStep', 'yawRelease', 'throwTravel'] as const;

const axis = z.object({ label: name, unit: name });
const chart = z.object({
  id: z.enum(CHARTS),
  title: name,
  x: axis,
  y: axis,
  series: list(
    z.object({
      name,
      points: list(pair),
      kind: z.enum(['main', 'limit', 'other']),
    }),
  ),
  marks: list(z.object({ x: z.number(), label: name })),
  note: text,
});

const stick = z.enum(['pitch', 'roll', 'yaw', 'flap']);
const move = z.object({
  way: z.enum(['up', 'down', 'stbd', 'port', 'none']),
  deg: degrees.min(0),
  mm: mm.min(0),
});

const linkage = z.object({
  suggested: z.boolean(),
  armMm: mm,
  hornMm: mm,
  servo: name.nullable(),
  rod: z.object({ stuff: z.enum(['wire', 'carbon']), diameterMm: mm, lengthMm: mm }).nullable(),
  travel: z.object({ upDeg: degrees, downDeg: degrees, usedPct: z.number().min(0).max(100_000) }).nullable(),
});

const control = z.object({
  id: name.min(1),
  surface: name,
  control: name,
  mirrored: z.boolean(),
  neutral: move,
  widestMm: mm,
  lowShare: share,
  differential: share,
  throws: few(z.object({ stick, high: move, low: move.nullable() })),
  moves: few(
    z.object({
      sticks: z.array(stick).min(1).max(2),
      sides: z
        .array(move.extend({ side: z.enum(['stbd', 'port', 'centre']) }))
        .min(1)
        .max(2),
      overShared: z.boolean(),
    }),
  ),
  linkage: linkage.nullable(),
});

/** A document holds at most 20 surfaces with 12 controls each. */
const MOST_CONTROLS = 240;

const setUp = z.object({
  lowRate: share,
  expo: share,
  sharedThrowDeg: degrees,
  controls: z.array(control).max(MOST_CONTROLS),
  incidences: few(z.object({ id: name, name, deg: degrees })),
  thrusts: few(z.object({ id: name, name, downDeg: degrees, rightDeg: degrees })),
  problems: list(problem),
});

/** The figures of a revision. Those of earlier engines hold neither charts nor a set-up sheet, nor what was counted. */
export const figures: z.ZodType<Figures> = z.object({
  engine: name,
  depth: z.enum(['live', 'full']),
  counted: z.object({ bodies: z.boolean(), propellers: z.boolean() }).optional(),
  values: z.record(z.string(), figure),
  marks,
  masses: list(z.object({ key: name, name, group: z.enum(MASS_GROUPS), massG: z.number(), at: point3 })),
  problems: list(problem),
  charts: list(chart).optional(),
  setUp: setUp.nullable().optional(),
});
