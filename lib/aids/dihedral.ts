import { elementName } from '@/lib/airframe/names';
import type { ResolvedPanel, ResolvedSurface } from '@/lib/airframe/resolved';
import { sectionOfPanel } from '@/lib/airframe/section';
import { add3, dot3, lerp3, radFromDeg, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/aids';
import { fill } from '@/lib/text/fill';
import { fixedDigits, trimmedDigits } from '@/lib/units/number';
import { across, pairOf } from './piece';
import { slotWidthMm } from './slots';
import { type AidSource, sheetMm } from './source';

const words = texts.dihedral;

/** A panel lifted by less than this is blocked up with scraps of sheet, mm. */
const LEAST_RISE_MM = 6;
/** Steeper panels are stood up square, not propped. */
const MOST_ROLL_DEG = 60;
/** A prop carries the chord from here on, ahead of the controls, and no longer than this. */
const FROM_SHARE = 0.15;
const ALONG_SHARE = 0.4;
const MOST_MM = 120;
/** The cross piece stays below the panel by this much, mm. */
const BELOW_MM = 2;
const CROSS_MM = 50;

/** Heights over the bench at both ends of a prop, with the root lying flat on the bench. */
interface Lift {
  readonly widthMm: number;
  readonly stationMm: number;
  readonly frontMm: number;
  readonly rearMm: number;
  readonly inverted: boolean;
  /** Bench under the prop's front corner, and the bench's axes: aft along the root's chord, and up. */
  readonly foot: Vec3;
  readonly aft: Vec3;
  readonly up: Vec3;
}

function liftOf(source: AidSource, { panels }: ResolvedSurface, panel: ResolvedPanel): Lift | null {
  const root = panels[0];
  if (!root || Math.abs(panel.rollDeg) > MOST_ROLL_DEG) return null;
  const i = radFromDeg(root.root.incidenceDeg);
  const aft: Vec3 = [Math.cos(i), 0, -Math.sin(i)];
  const up: Vec3 = [Math.sin(i), 0, Math.cos(i)];
  const inside = (source.material.thicknessMm / 2 + 2) / (panel.tip.lengthMm - panel.root.lengthMm);
  const section = sectionOfPanel(panel, Math.max(0.5, 1 - inside));
  const along = Math.min(ALONG_SHARE * section.chordMm, MOST_MM);
  const ends = [0, along].map((mm) => lerp3(section.le, section.te, FROM_SHARE + mm / section.chordMm));
  // The root's lower edge lies on the bench; a tilted sheet reaches further down for its thickness.
  const half = (panelOf: ResolvedPanel): number =>
    sheetMm(source.airframe, panelOf.panel.materialId) / 2 / Math.cos(radFromDeg(panelOf.rollDeg));
  const [front, rear] = ends.map((p) => dot3(sub3(p, root.root.le), up));
  const [at] = ends;
  if (front === undefined || rear === undefined || !at) return null;
  const inverted = front + rear < 0;
  const side = inverted ? -1 : 1;
  const off = half(root) - half(panel);
  const [frontMm, rearMm] = [side * front + off, side * rear + off];
  if (!(Math.min(frontMm, rearMm) >= LEAST_RISE_MM) || !(along > 4 * source.material.thicknessMm)) return null;
  const foot = add3(at, scale3(up, -side * (frontMm + half(panel))));
  return { widthMm: along, stationMm: section.lengthMm, frontMm, rearMm, inverted, foot, aft, up: scale3(up, side) };
}

function propsOf(source: AidSource, { surface }: ResolvedSurface, panel: ResolvedPanel, lift: Lift): Part[] {
  const { material, airframe } = source;
  const { widthMm: w, frontMm, rearMm, foot, aft, up } = lift;
  const [mid, half, slot] = [w / 2, (frontMm + rearMm) / 4, slotWidthMm(material.thicknessMm, airframe.build) / 2];
  const outline: Vec2[] = [
    [0, 0],
    [mid - slot, 0],
    [mid - slot, half],
    [mid + slot, half],
    [mid + slot, 0],
    [w, 0],
    [w, rearMm],
    [0, frontMm],
  ];
  const high = Math.min(frontMm, rearMm) - BELOW_MM;
  const wide = Math.max(CROSS_MM, high) / 2;
  const crossing: Vec2[] = [
    [-wide, 0],
    [wide, 0],
    [wide, high],
    [slot, high],
    [slot, half],
    [-slot, half],
    [-slot, high],
    [-wide, high],
  ];
  const values = { surface: elementName(airframe, surface.id), panel: panel.panel.id };
  const key = `aid/dihedral/${surface.id}/${panel.panel.id}`;
  const use = lift.inverted ? words.inverted : words.upright;
  const about = fill(words.about, {
    height: fixedDigits(Math.max(frontMm, rearMm), 1),
    station: trimmedDigits(lift.stationMm, 0),
  });
  const prop = { key: `${key}/prop`, name: fill(words.prop, values), about: [about, use], material, outline };
  const cross = {
    key: `${key}/cross`,
    name: fill(words.cross, values),
    about: [words.crossAbout],
    material,
    outline: crossing,
  };
  return [
    ...pairOf({ ...prop, frame: { origin: foot, ex: aft, ey: up } }),
    ...(high > half + 1 ? pairOf({ ...cross, frame: across(add3(foot, scale3(aft, mid))) }) : []),
  ];
}

/** Props that hold the panels of mirrored surfaces at their height while a dihedral joint sets, each with a cross piece to stand on. */
export function dihedralProps(source: AidSource): Part[] {
  return source.resolved.surfaces
    .filter(({ surface }) => surface.mirrored)
    .flatMap((surface) =>
      surface.panels.flatMap((panel) => {
        const lift = liftOf(source, surface, panel);
        return lift ? propsOf(source, surface, panel, lift) : [];
      }),
    );
}
