import type { ResolvedAirframe, ResolvedSurface, Section } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { add3, lerp3, radFromDeg, type Vec3 } from '@/lib/numerics/vec';
import { bodyHalfWidthMm } from './bodyWidth';
import { sameMeanLine } from './lattice/stations';
import type { LatticeSection } from './lattice/types';
import { meanLineOf } from './meanLine';

/** A wing whose root stands this much outside the body's side, in mm, is still fixed to it: play of a slot and a doubler. */
const AT_THE_BODY_MM = 3;

/** A surface as the lattice and the reference areas see it. */
export interface FlatSurface {
  /** Root to tip, mm; each lies along x through its own quarter chord. Two at one place make a step in chord. */
  readonly sections: readonly LatticeSection[];
  /** Length carried through the body from the centre plane to the surface's root, mm; 0 for a surface that begins there. */
  readonly carriedMm: number;
  readonly lengthMm: number;
}

/**
 * Lays a resolved surface flat along x, incidence kept as an angle, and carries a wing or tail that begins at a body's side on to
 * the centre plane with its root section: the lift of the covered part is taken as the wing's own (common practice; Raymer,
 * "Aircraft Design", ch. 12, on exposed and reference area). A gap with no body in it stays open.
 */
export function flatSurface(
  airframe: Airframe,
  resolved: ResolvedAirframe,
  { surface, panels, lengthMm }: ResolvedSurface,
): FlatSurface {
  const sections: LatticeSection[] = [];
  const start = panels[0]?.root;
  let quarter: Vec3 = start ? lerp3(start.le, start.te, 0.25) : [0, 0, 0];
  for (const { panel, root, tip, rollDeg } of panels) {
    const lineAt = (chordMm: number) => meanLineOf(airframe, panel, chordMm);
    const flat = { ...flatSection(quarter, root), meanLine: lineAt(root.chordMm) };
    const before = sections.at(-1);
    if (!before || !continues(before, flat)) sections.push(flat);
    const roll = radFromDeg(rollDeg);
    const aft = panel.lengthMm * Math.tan(radFromDeg(panel.sweepDeg));
    quarter = add3(quarter, [aft, panel.lengthMm * Math.cos(roll), panel.lengthMm * Math.sin(roll)]);
    sections.push({ ...flatSection(quarter, tip), meanLine: lineAt(tip.chordMm) });
  }
  const first = sections[0];
  const lies = Math.abs(panels[0]?.rollDeg ?? 0) < 45;
  const y = first?.le[1] ?? 0;
  if (!first || !surface.mirrored || !lies || y <= 0) return { sections, carriedMm: 0, lengthMm };
  const half = bodyHalfWidthMm(airframe, resolved, first.le[0], first.le[0] + first.chord);
  if (half + AT_THE_BODY_MM < y) return { sections, carriedMm: 0, lengthMm };
  const centre: LatticeSection = { ...first, le: [first.le[0], 0, first.le[2]] };
  return { sections: [centre, ...sections], carriedMm: y, lengthMm: lengthMm + y };
}

/** True when a panel begins with the very section that the one before it ends with. */
const continues = (before: LatticeSection, next: LatticeSection) =>
  before.chord === next.chord &&
  before.incidenceRad === next.incidenceRad &&
  sameMeanLine(before.meanLine ?? [], next.meanLine ?? []);

/** A section along x about its quarter point. That is where the plate has it before incidence turns it: the angle is kept apart. */
function flatSection([x, y, z]: Vec3, { chordMm, incidenceDeg }: Section): LatticeSection {
  return { le: [x - chordMm / 4, y, z], chord: chordMm, incidenceRad: radFromDeg(incidenceDeg) };
}
