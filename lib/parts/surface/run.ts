import type { ResolvedPanel, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Material } from '@/lib/airframe/schema/stock';
import { bounds } from '@/lib/geometry/polygons';
import { add3, dot3, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { fitsSheet } from '../fit';
import { normalOf, offPart, toPart, unit3 } from '../shape/frame';
import { mirror2 } from '../shape/ring';
import type { PartFrame } from '../types';

// Which panels of a surface are cut as one piece. A builder leaves a sheet whole where it stays flat and fits the board:
// a tailplane of one piece is stronger than two halves. Part axes: x from root to tip, y forward, seen from above.

/** A flat piece may stand off the surface it is cut for by this much at most, mm: less than a builder can hold or see. */
export const FLAT_MM = 0.25;

/** One flat piece of a surface: panels that lie in one plane; `centre` when both sides are one piece. */
export interface Run {
  readonly surface: ResolvedSurface;
  readonly panels: readonly ResolvedPanel[];
  readonly centre: boolean;
  readonly material: Material;
  readonly frame: PartFrame;
}

/** A mirrored surface whose root section stands on the centre plane, so that its two sides meet. */
export function meetsItsMirror({ surface, panels }: ResolvedSurface): boolean {
  const root = panels[0]?.root;
  return surface.mirrored && root !== undefined && Math.abs(quarterPoint(root).at(1) ?? 0) <= FLAT_MM;
}

export const quarterPoint = ({ le, te }: { readonly le: Vec3; readonly te: Vec3 }): Vec3 =>
  add3(scale3(le, 0.75), scale3(te, 0.25));

/** The panel's own plane: x outboard at right angles to the chord, y forward; its normal leaves the upper face. */
export function panelFrame({ root, tip }: ResolvedPanel): PartFrame {
  const aft = unit3(sub3(root.te, root.le));
  const out = sub3(quarterPoint(tip), quarterPoint(root));
  const ex = unit3(sub3(out, scale3(aft, dot3(out, aft))));
  return { origin: root.le, ex, ey: scale3(aft, -1) };
}

const cornersOf = (panels: readonly ResolvedPanel[]): Vec3[] =>
  panels.flatMap(({ root, tip }) => [root.le, root.te, tip.le, tip.te]);

/** The frame moved to the middle of the points' departures from it, or null when they depart too far to be one flat piece. */
function levelled(frame: PartFrame, points: readonly Vec3[]): PartFrame | null {
  const off = points.map((p) => offPart(frame, p));
  const high = Math.max(...off);
  const low = Math.min(...off);
  if (high - low > 2 * FLAT_MM) return null;
  // Rounding noise must not move a frame that already fits.
  const shift = high - low < 1e-9 ? 0 : (high + low) / 2;
  return { ...frame, origin: add3(frame.origin, scale3(normalOf(frame), shift)) };
}

function centreFrame(panels: readonly ResolvedPanel[]): PartFrame | null {
  const root = panels[0]?.root;
  if (!root) return null;
  const chord = sub3(root.te, root.le);
  const aft = unit3([chord[0], 0, chord[2]]);
  return levelled({ origin: [root.le[0], 0, root.le[2]], ex: [0, 1, 0], ey: scale3(aft, -1) }, cornersOf(panels));
}

function runSize(frame: PartFrame, panels: readonly ResolvedPanel[], centre: boolean): Vec2 {
  const points = cornersOf(panels).map((p) => toPart(frame, p));
  const { minX, minY, maxX, maxY } = bounds(centre ? [...points, ...points.map(mirror2)] : points);
  return [maxX - minX, maxY - minY];
}

/** Neighbouring panels of one sheet that lie in the plane of the first. */
function flatGroups(panels: readonly ResolvedPanel[]): ResolvedPanel[][] {
  const groups: ResolvedPanel[][] = [];
  for (const panel of panels) {
    const group = groups.at(-1);
    const [first] = group ?? [];
    const next =
      group && first && panel.index === first.index + group.length && panel.panel.materialId === first.panel.materialId;
    if (group && first && next && levelled(panelFrame(first), cornersOf([...group, panel]))) group.push(panel);
    else groups.push([panel]);
  }
  return groups;
}

/**
 * The flat pieces of a surface's buildable panels, from root to tip. Panels stay together where they are flat, of one
 * material and fit a sheet; both sides are one piece when the root stands on the centre plane and the whole is flat.
 */
export function runsOf(
  surface: ResolvedSurface,
  buildable: readonly ResolvedPanel[],
  materials: ReadonlyMap<string, Material>,
): Run[] {
  const runs: Run[] = [];
  const push = (panels: readonly ResolvedPanel[], centre: boolean, force: boolean): boolean => {
    const [first] = panels;
    const material = materials.get(first?.panel.materialId ?? '');
    if (!first || !material) return false;
    const frame = centre ? centreFrame(panels) : levelled(panelFrame(first), cornersOf(panels));
    if (!frame && force) throw new RangeError(`panel ${first.panel.id} of ${surface.surface.id} is not flat`);
    if (!frame) return false;
    if (!force && !fitsSheet(material, ...runSize(frame, panels, centre))) return false;
    runs.push({ surface, panels, centre, material, frame });
    return true;
  };
  for (const group of flatGroups(buildable)) {
    if (group[0]?.index === 0 && meetsItsMirror(surface) && push(group, true, false)) continue;
    if (group.length > 1 && push(group, false, false)) continue;
    for (const panel of group) push([panel], false, true);
  }
  return runs;
}
