import type { ResolvedSurface } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Tube } from '@/lib/airframe/schema/stock';
import type { Control } from '@/lib/airframe/schema/surface';
import { panelAt, sectionAt } from '@/lib/airframe/section';
import { radFromDeg } from '@/lib/numerics/vec';
import { barSection } from './barSection';
import type { BeamPiece } from './beam';
import { BAR, type Stiffness } from './moduli';
import { sheetLayers, stackOf } from './sheet';
import { sectionStiffness } from './wingSection';

// One side of a surface cut into strips, from its root to its tip, along its own length: what bending and twist are worked out on.

/** A strip; places in its own plane, x aft and s along the surface from the root, mm. */
export interface WingStrip {
  readonly station: number;
  readonly sMm: number;
  readonly widthMm: number;
  readonly chordMm: number;
  /** Quarter chord, where lift acts, and the axis about which the section twists. */
  readonly quarterXMm: number;
  readonly axisXMm: number;
  /** Across the swept axis. */
  readonly bendingNmm2: number;
  readonly torsionNmm2: number;
  /** Place of the quarter chord in the aircraft, and how far the strip is rolled. */
  readonly yMm: number;
  readonly zMm: number;
  readonly rollRad: number;
  /** What of it each control turns, by the control's id. */
  readonly controls: ReadonlyMap<string, ControlPiece>;
}

/** The piece of a control that lies on a strip. */
export interface ControlPiece {
  /** Its chord as a share of the strip's. */
  readonly chordShare: number;
  /** Share of the strip's width that it covers. */
  readonly covered: number;
}

/** Enough for reversal and divergence speeds within half a per cent (own test against the closed solution). */
const STRIPS = 16;

/** Strips of one side of a surface, at one of the stiffnesses that its stock may have. */
export function halfWing(airframe: Airframe, surface: ResolvedSurface, stiffness: Stiffness): WingStrip[] {
  const sheets = new Map(airframe.materials.map((m) => [m.id, stackOf(sheetLayers(m, stiffness))]));
  const sheetOf = (id: string) => {
    const found = sheets.get(id);
    if (!found) throw new RangeError(`no material ${id}`);
    return found;
  };
  return Array.from({ length: STRIPS }, (_, i): WingStrip => {
    const station = (i + 0.5) / STRIPS;
    const section = sectionAt(surface, station);
    const { panel, rollDeg } = panelAt(surface, station).panel;
    const controls = controlsAt(surface.surface.controls, station);
    const sheet = sectionStiffness(panel, section.chordMm, hingeShare(surface, controls), sheetOf);
    // A swept wing is narrower across its axis than along the stream; a spar runs along it.
    const across = Math.cos(radFromDeg(panel.sweepDeg));
    let bending = sheet.bendingNmm2 * across;
    let moment = bending * sheet.axisShare;
    let torsion = sheet.torsionNmm2 * across;
    for (const bar of sparsAt(airframe, surface, station, stiffness)) {
      bending += bar.bendingNmm2;
      moment += bar.bendingNmm2 * bar.chordShare;
      torsion += bar.torsionNmm2;
    }
    const { le, te, chordMm } = section;
    return {
      station,
      sMm: station * surface.lengthMm,
      widthMm: surface.lengthMm / STRIPS,
      chordMm,
      quarterXMm: le[0] + (te[0] - le[0]) / 4,
      // Each part bends about itself, so the section turns about the middle of their stiffnesses.
      axisXMm: le[0] + (te[0] - le[0]) * (moment / bending),
      bendingNmm2: bending,
      torsionNmm2: torsion,
      yMm: le[1] + (te[1] - le[1]) / 4,
      zMm: le[2] + (te[2] - le[2]) / 4,
      rollRad: radFromDeg(rollDeg),
      controls,
    };
  });
}

function controlsAt(controls: readonly Control[], station: number): Map<string, ControlPiece> {
  const pieces = new Map<string, ControlPiece>();
  for (const { id, kind, from, to, chordShare } of controls) {
    const inner = Math.max(from, station - 0.5 / STRIPS);
    const outer = Math.min(to, station + 0.5 / STRIPS);
    if (!(outer > inner)) continue;
    const along = ((inner + outer) / 2 - from) / (to - from);
    const share = chordShare[0] + (chordShare[1] - chordShare[0]) * along;
    pieces.set(id, { chordShare: kind === 'allMoving' ? 1 : share, covered: (outer - inner) * STRIPS });
  }
  return pieces;
}

/** Where the sheet that carries ends: at the hinge, or at the trailing edge. A whole surface that turns carries all the same. */
function hingeShare({ surface }: ResolvedSurface, pieces: ReadonlyMap<string, ControlPiece>): number {
  const hinged = surface.controls.filter(({ kind }) => kind !== 'allMoving').flatMap(({ id }) => pieces.get(id) ?? []);
  return (
    1 -
    Math.min(
      1,
      hinged.reduce((sum, { chordShare, covered }) => sum + chordShare * covered, 0),
    )
  );
}

/** Sweep of the axis at a strip, from its neighbours'. */
export function axisSweepRad(strips: readonly WingStrip[], index: number): number {
  const inner = strips[Math.max(0, index - 1)];
  const outer = strips[Math.min(strips.length - 1, index + 1)];
  if (!inner || !outer || inner === outer) return 0;
  return Math.atan2(outer.axisXMm - inner.axisXMm, outer.sMm - inner.sMm);
}

/** The strips as one beam along the swept axis. */
export function beamOf(strips: readonly WingStrip[]): BeamPiece[] {
  let at = 0;
  return strips.map(({ widthMm, bendingNmm2 }, index) => {
    const fromMm = at;
    at += widthMm / Math.cos(axisSweepRad(strips, index));
    return { fromMm, toMm: at, bendingNmm2 };
  });
}

/** A spar where it passes a station: its own bending and torsion, and its place on the chord. */
export interface SparAt {
  readonly index: number;
  readonly tube: Tube;
  readonly chordShare: number;
  readonly bendingNmm2: number;
  readonly torsionNmm2: number;
}

/** The bought spars that pass a station of a surface. Strips of sheet are not counted, nor is how far a spar lies off the sheet's middle. */
export function sparsAt(
  airframe: Airframe,
  { surface }: ResolvedSurface,
  station: number,
  stiffness: Stiffness,
): SparAt[] {
  return surface.spars.flatMap(({ tubeId, chordShare, from, to }, index): SparAt[] => {
    const tube = airframe.tubes.find(({ id }) => id === tubeId);
    if (!tube || !(to > from) || station < from || station > to) return [];
    const { inertiaMm4, torsionMm4 } = barSection(tube);
    const [inner, outer] = chordShare;
    const foam = tube.kind === 'foamBox';
    const gpa = tube.eGpa ?? (foam ? BAR.foamBoxGpa.value : BAR.gpa.value);
    return [
      {
        index,
        tube,
        chordShare: inner + ((outer - inner) * (station - from)) / (to - from),
        bendingNmm2: gpa * 1000 * inertiaMm4,
        torsionNmm2: (foam ? gpa * FOAM_SHEAR_SHARE : BAR.shearGpa.value[stiffness]) * 1000 * torsionMm4,
      },
    ];
  });
}

/** Shear modulus over modulus of foam: a Poisson's ratio of a quarter. */
const FOAM_SHEAR_SHARE = 0.4;
