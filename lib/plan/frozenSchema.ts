import { z } from 'zod';
import { OPERATION_KINDS } from '@/lib/parts/types';
import type { Frozen } from './job';

// The frozen artefacts of a revision as they stand in a file. A file may have been edited by hand, so every field that the
// plan reads is checked before it is printed.

const MAX_POINTS = 20_000;
const MAX_ENTRIES = 10_000;

const mm = z.number().min(-100_000).max(100_000);
const name = z.string().max(400);
const point = z.tuple([mm, mm]);
const point3 = z.tuple([z.number(), z.number(), z.number()]);
const path = z.array(point).max(MAX_POINTS);
const list = <T extends z.ZodType>(of: T) => z.array(of).max(MAX_ENTRIES);

const problem = z.object({
  code: name,
  path: name,
  message: z.string().max(4000),
  fix: z.string().max(4000).optional(),
});
const face = z.enum(['upper', 'lower', 'inner', 'outer']);

const part = z.object({
  key: name.min(1),
  name,
  elementId: name,
  side: z.enum(['stbd', 'port', 'centre']),
  materialId: name,
  thicknessMm: z.number().positive().max(1000),
  mirrorOf: name.optional(),
  face,
  outline: path.min(3),
  holes: list(path.min(3)),
  operations: list(
    z.object({
      id: name,
      kind: z.enum(OPERATION_KINDS),
      path,
      closed: z.boolean(),
      face,
      angleDeg: z.number().optional(),
      widthMm: z.number().optional(),
      depthMm: z.number().optional(),
      sharedBy: z.number().optional(),
      note: name.optional(),
    }),
  ),
  labels: list(z.object({ at: point, text: name, heightMm: z.number().positive().max(200), angleDeg: z.number() })),
  grainDeg: z.number().nullable(),
  frame: z.object({ origin: point3, ex: point3, ey: point3 }),
});

const stockPiece = z.object({
  key: name,
  name,
  tubeId: name,
  lengthMm: z.number(),
  count: z.number(),
  from: point3,
  to: point3,
});

const failure = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('too-large'), partKey: name, sizeMm: point }),
  z.object({ kind: z.literal('no-stock'), partKey: name, materialId: name }),
  z.object({ kind: z.literal('no-room'), partKey: name, sheetsTried: z.number() }),
  z.object({ kind: z.literal('too-many-parts'), partKey: name, count: z.number(), most: z.number() }),
  z.object({ kind: z.literal('too-many-sheets'), partKey: name, most: z.number() }),
]);

const layout = z.object({
  options: z.object({ spacingMm: z.number(), marginMm: z.number(), seed: z.number() }),
  sheets: list(
    z.object({
      id: name.min(1),
      stockId: name,
      materialId: name,
      thicknessMm: z.number(),
      wMm: z.number().positive().max(20_000),
      hMm: z.number().positive().max(20_000),
      placements: list(z.object({ partKey: name, turnDeg: z.number(), moveMm: point })),
      checkSquareMm: point.nullable(),
      utilisation: z.number(),
    }),
  ),
  failures: list(failure),
});

const figure = z.object({
  value: z.number().nullable(),
  band: z.object({ low: z.number(), high: z.number(), cause: z.string() }).optional(),
  verdict: z.object({ level: z.enum(['good', 'watch', 'bad']), words: z.string() }).optional(),
  inputs: list(z.object({ name, value: z.number(), unit: name })).optional(),
  problem: problem.optional(),
});

const marks = z.object({
  mac: z.object({ lengthMm: z.number(), leXMm: z.number(), yMm: z.number(), zMm: z.number() }).nullable(),
  aerodynamicCentreXMm: z.number().nullable(),
  neutralPointXMm: z.number().nullable(),
  neutralPointBandXMm: z.tuple([z.number(), z.number()]).nullable(),
  cgRangeXMm: z.tuple([z.number(), z.number()]).nullable(),
  firstFlightCgXMm: z.number().nullable(),
  cg: point3.nullable(),
});

const MASS_GROUPS = ['foam', 'covering', 'glue', 'tube', 'item', 'drive', 'gear'] as const;

const figures = z.object({
  engine: name,
  depth: z.enum(['live', 'full']),
  values: z.record(z.string(), figure),
  marks,
  masses: list(z.object({ key: name, name, group: z.enum(MASS_GROUPS), massG: z.number(), at: point3 })),
  problems: list(problem),
});

export const FrozenShape: z.ZodType<Frozen> = z.object({
  figures,
  development: z.object({ parts: list(part), stockPieces: list(stockPiece), problems: list(problem) }),
  layout,
});
