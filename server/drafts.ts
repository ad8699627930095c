import type { DesignRecord, DraftRecord } from '@/db/queries/designs';
import { planOutlines } from '@/lib/airframe/outlines';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { DraftAnswer, Thumbnail } from '@/lib/contract/answers';
import { analyse } from '@/lib/figures/analyse';
import { invalidDocument } from './problems';

/** What a list shows of a design without reading its airframe. */
export interface DesignDigest {
  readonly spanMm: number;
  readonly massG: number | null;
  readonly thumbnail: Thumbnail;
}

/** A tenth of a millimetre is far under a thumbnail's pixel. Adding zero makes zero of minus zero, which JSON does not know. */
const rounded = (value: number): number => Math.round(value * 10) / 10 + 0;

/** Works out what the list shows. Throws AppError when the airframe cannot be resolved. */
export function digest(airframe: Airframe): DesignDigest {
  const resolved = resolve(airframe);
  if (!resolved.ok) throw invalidDocument('airframe', resolved.problems);
  const outlines = planOutlines(airframe)
    .filter((outline) => outline.kind !== 'item')
    .map((outline) => outline.points.map(([x, y]): [number, number] => [rounded(x), rounded(y)]));
  const figures = analyse(airframe, { depth: 'live' });
  const y = outlines.flatMap((points) => points.map(([, across]) => across));
  const spanMm = figures.values.spanMm?.value ?? Math.max(...y) - Math.min(...y);
  return { spanMm, massG: figures.values.allUpMassG?.value ?? null, thumbnail: { outlines } };
}

/** A stored body is what the parser let in, written by us. */
export const storedAirframe = (body: string): Airframe => JSON.parse(body);

export const draftAnswer = (row: DesignRecord, draft: DraftRecord): DraftAnswer => ({
  designId: row.id,
  designName: row.name,
  version: draft.version,
  savedAt: draft.savedAt.toISOString(),
  savedBy: draft.savedBy,
  airframe: storedAirframe(draft.body),
});
