import type { ResolvedSurface, Section } from '@/lib/airframe/resolved';
import { sectionOfPanel } from '@/lib/airframe/section';
import { FINGER_MM } from '@/lib/figures/trimBands';
import { lerp3, radFromDeg, type Vec3 } from '@/lib/numerics/vec';
import { unit3 } from '@/lib/parts/shape/frame';
import { type AidSource, sheetMm } from './source';

// Where fingers can carry the aircraft at its first-flight CG: the wing above, the body and what hangs beside it out of the way.

/** Reach of the stand fore and aft of the CG line, mm: what hangs within it must pass between or beside the uprights. */
export const STAND_HALF_MM = 45;
const STEP_MM = 1;
/** Fingers nearer to each other than twice this share of the half span let the aircraft roll off. */
const LEAST_SPREAD_SHARE = 0.12;

/** Something under the wing near the CG: what it takes of the span (as distance from the centre line) and how low it hangs. mm. */
interface Obstacle {
  readonly fromY: number;
  readonly toY: number;
  readonly lowZ: number;
}

export interface CgPlace {
  readonly surface: ResolvedSurface;
  readonly section: Section;
  readonly thicknessMm: number;
  /** Where a finger touches: on the lower face, under the CG line. */
  readonly touch: Vec3;
  /** Unit vector from leading to trailing edge here. */
  readonly aft: Vec3;
  /** From the leading edge to the touched place along the lower face. mm. */
  readonly behindEdgeMm: number;
  /** Lowest thing between and beside the uprights, at most as high as the touched place. mm. */
  readonly lowZ: number;
}

const around = (y: number, halfMm: number, lowZ: number): Obstacle => ({
  fromY: Math.max(0, Math.abs(y) - halfMm),
  toY: Math.abs(y) + halfMm,
  lowZ,
});

function obstacles({ airframe, resolved }: AidSource, x: number): Obstacle[] {
  const near = (fromX: number, toX: number): boolean => toX >= x - STAND_HALF_MM && fromX <= x + STAND_HALF_MM;
  const bodies = airframe.bodies.flatMap(({ id, stations, materialId, kind }) => {
    const at = resolved.places.get(id)?.at;
    if (!at) return [];
    return stations.flatMap((b, i) => {
      const a = stations[i - 1];
      if (!a || !near(at[0] + Math.min(a.xMm, b.xMm), at[0] + Math.max(a.xMm, b.xMm))) return [];
      const wide = kind === 'profile' ? sheetMm(airframe, materialId) : Math.max(a.widthMm, b.widthMm);
      return [around(at[1], wide / 2, at[2] + Math.min(a.bottomMm, b.bottomMm))];
    });
  });
  const booms = resolved.booms.flatMap(({ boomId, fore, aft }) => {
    const tubeId = airframe.booms.find(({ id }) => id === boomId)?.tubeId;
    const outer = airframe.tubes.find(({ id }) => id === tubeId)?.outerMm ?? [0, 0];
    const halfMm = Math.max(...outer) / 2;
    if (!near(fore[0], aft[0])) return [];
    const share = Math.min(1, Math.max(0, (x - fore[0]) / (aft[0] - fore[0])));
    const [, y, z] = lerp3(fore, aft, Number.isFinite(share) ? share : 0);
    return [around(y, halfMm, z - halfMm)];
  });
  const gear = airframe.gear.flatMap(({ id, wheelMm = 10, legMm = 0 }) => {
    const at = resolved.places.get(id)?.at;
    if (!at || !near(at[0] - wheelMm / 2, at[0] + wheelMm / 2)) return [];
    return [around(at[1], wheelMm / 2, at[2] - legMm - wheelMm / 2)];
  });
  return [...bodies, ...booms, ...gear];
}

/** The section of a surface at a distance from the centre line; null beyond its ends. */
function sectionAtY({ panels }: ResolvedSurface, y: number): { section: Section; materialId: string } | null {
  for (const panel of panels) {
    const [a, b] = [panel.root.le[1], panel.tip.le[1]];
    if (b <= a || y < a || y > b) continue;
    return { section: sectionOfPanel(panel, (y - a) / (b - a)), materialId: panel.panel.materialId };
  }
  return null;
}

/** The place on the lower face under a line x; the face stands half a sheet below the chord. */
function touchPlace(section: Section, rollDeg: number, thicknessMm: number, x: number) {
  const aft = unit3([section.te[0] - section.le[0], section.te[1] - section.le[1], section.te[2] - section.le[2]]);
  const drop = thicknessMm / 2 / Math.cos(radFromDeg(rollDeg));
  const [lx, ly, lz]: Vec3 = [section.le[0] + drop * aft[2], section.le[1], section.le[2] - drop * aft[0]];
  const behindEdgeMm = (x - lx) / aft[0];
  const touch: Vec3 = [x, ly + behindEdgeMm * aft[1], lz + behindEdgeMm * aft[2]];
  return { aft, behindEdgeMm, touch };
}

/** How far out a surface reaches, mm. */
const reachOf = ({ panels }: ResolvedSurface): number => Math.max(0, ...panels.map(({ tip }) => tip.le[1]));

function placeOn(
  source: AidSource,
  surface: ResolvedSurface,
  x: number,
  marginMm: number,
  fromY: number,
): CgPlace | null {
  const hindrances = obstacles(source, x);
  const reach = reachOf(surface);
  for (let y = Math.ceil(fromY); y <= reach; y += STEP_MM) {
    const here = sectionAtY(surface, y);
    if (!here) continue;
    const { le, te, station } = here.section;
    if (x - marginMm < le[0] || x + marginMm > te[0]) continue;
    if (hindrances.some((one) => y > one.fromY - marginMm && y < one.toY + marginMm)) continue;
    const panel = surface.panels.find(({ tip }) => station <= tip.station) ?? surface.panels[0];
    const thicknessMm = sheetMm(source.airframe, here.materialId);
    const { aft, behindEdgeMm, touch } = touchPlace(here.section, panel?.rollDeg ?? 0, thicknessMm, x);
    const lowZ = Math.min(touch[2], ...hindrances.filter((one) => one.fromY < y).map((one) => one.lowZ));
    return { surface, section: here.section, thicknessMm, aft, behindEdgeMm, touch, lowZ };
  }
  return null;
}

/**
 * The place nearest the centre line where the CG line has wing above it and nothing hangs in the way, starboard side: far enough out to be
 * steady and with a finger's room all round, else wherever a finger of sheet finds wing; null when the line passes under no mirrored wing.
 */
export function cgPlace(source: AidSource, firstFlightCgXMm: number): CgPlace | null {
  const wings = source.resolved.surfaces.filter(({ surface }) => surface.role === 'wing' && surface.mirrored);
  const thin = source.material.thicknessMm;
  for (const wing of wings) {
    const apart = LEAST_SPREAD_SHARE * reachOf(wing);
    const place =
      placeOn(source, wing, firstFlightCgXMm, FINGER_MM.value, Math.max(apart, FINGER_MM.value)) ??
      placeOn(source, wing, firstFlightCgXMm, thin, thin);
    if (place) return place;
  }
  return null;
}
