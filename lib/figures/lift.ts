import type { Corrections } from '@/lib/aero/corrections';
import type { AeroModel } from '@/lib/aero/model';
import { type AeroMemory, wholeAircraft } from '@/lib/aero/wholeAircraft';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Result } from '@/lib/numerics/result';
import type { Vec3 } from '@/lib/numerics/vec';
import type { WingReference } from './reference';

/** Aerodynamics of the whole aircraft about a point; problems point into the document. */
export function liftOf(
  airframe: Airframe,
  resolved: ResolvedAirframe,
  wing: WingReference,
  point: Vec3,
  corrections: Corrections,
  memory?: AeroMemory,
): Result<AeroModel> {
  const reference = { area: wing.areaMm2, chord: wing.macMm, span: wing.spanMm, point };
  const result = wholeAircraft(airframe, resolved, reference, corrections, memory);
  if (result.ok) return result;
  const indexOf = (id: string) => airframe.surfaces.findIndex((surface) => surface.id === id);
  return {
    ok: false,
    problems: result.problems.map((p) => (indexOf(p.path) >= 0 ? { ...p, path: `surfaces.${indexOf(p.path)}` } : p)),
  };
}
