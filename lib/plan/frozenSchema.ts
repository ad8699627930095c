import { z } from 'zod';
import { OPERATION_KINDS } from '@/lib/parts/types';
import { checks } from './frozenChecks';
import { list, name, point, point3, problem } from './frozenFields';
import { figures } from './frozenFigures';
import type { Frozen } from './job';

// The frozen artefacts of a revision as they stand in a file. A file may have been edited by hand, so every field that the
// plan reads is checked before it is printed.

const MAX_POINTS = 20_000;

const path = z.array(point).max(MAX_POINTS);
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

export const FrozenShape: z.ZodType<Frozen> = z.object({
  figures,
  development: z.object({ parts: list(part), stockPieces: list(stockPiece), problems: list(problem) }),
  layout,
  checks: checks.optional(),
});
