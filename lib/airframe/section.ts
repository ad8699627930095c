import { add3, degFromRad, length3, lerp3, radFromDeg, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import type { ResolvedPanel, ResolvedSurface, Section } from './resolved';
import type { Surface } from './schema/surface';

// A surface as chordwise sections in the aircraft's axes (x aft, y to starboard, z up; mm). The quarter-chord line runs from
// panel to panel. Incidence turns the surface as the flat plate it is cut from, about its root's quarter-chord point: a swept
// quarter-chord line follows the plate's own chord, so that both halves of a wing without dihedral stay in one plane. Washout
// turns each section about its own quarter-chord point; between the two ends of a panel the surface is ruled, as a sheet is,
// so its leading and trailing edges are straight.

/** Unit vector from leading to trailing edge at an incidence (positive leading edge up) and a roll (0 flat, 90 upright). */
export function chordDirection(incidenceDeg: number, rollDeg: number): Vec3 {
  const i = radFromDeg(incidenceDeg);
  const r = radFromDeg(rollDeg);
  return [Math.cos(i), Math.sin(i) * Math.sin(r), -Math.sin(i) * Math.cos(r)];
}

function sectionAbout(
  quarter: Vec3,
  chordMm: number,
  incidenceDeg: number,
  rollDeg: number,
  lengthMm: number,
  station: number,
): Section {
  const d = chordDirection(incidenceDeg, rollDeg);
  const along = (share: number): Vec3 =>
    add3(quarter, [d[0] * chordMm * share, d[1] * chordMm * share, d[2] * chordMm * share]);
  return { lengthMm, station, le: along(-0.25), te: along(0.75), chordMm, incidenceDeg };
}

/** Works a surface's panels out from its mount, which is the root section's leading edge at zero incidence. */
export function panelled(surface: Surface, index: number, mount: Vec3): ResolvedSurface {
  const whole = surface.panels.reduce((sum, panel) => sum + panel.lengthMm, 0);
  const panels: ResolvedPanel[] = [];
  let quarter: Vec3 = add3(mount, [(surface.panels[0]?.rootChordMm ?? 0) / 4, 0, 0]);
  let run = 0;
  let incidenceDeg = surface.incidenceDeg;
  for (const [panelIndex, panel] of surface.panels.entries()) {
    const rollDeg = surface.cantDeg + panel.dihedralDeg;
    const r = radFromDeg(rollDeg);
    const root = sectionAbout(quarter, panel.rootChordMm, incidenceDeg, rollDeg, run, run / whole);
    const aft = scale3(
      chordDirection(surface.incidenceDeg, rollDeg),
      panel.lengthMm * Math.tan(radFromDeg(panel.sweepDeg)),
    );
    quarter = add3(add3(quarter, aft), [0, panel.lengthMm * Math.cos(r), panel.lengthMm * Math.sin(r)]);
    run += panel.lengthMm;
    incidenceDeg -= panel.washoutDeg;
    const last = panelIndex === surface.panels.length - 1;
    const tip = sectionAbout(quarter, panel.tipChordMm, incidenceDeg, rollDeg, run, last ? 1 : run / whole);
    panels.push({ panel, index: panelIndex, root, tip, rollDeg });
  }
  return { surface, index, lengthMm: whole, panels };
}

/**
 * The panel that a station lies on, and how far along it (0 root, 1 tip). A station on a joint belongs to the inner panel.
 * Throws RangeError for a station outside 0 to 1.
 */
export function panelAt(surface: ResolvedSurface, station: number): { panel: ResolvedPanel; along: number } {
  if (!(station >= 0 && station <= 1)) throw new RangeError(`station must lie in 0 to 1, got ${station}`);
  const panel = surface.panels.find(({ tip }) => station <= tip.station) ?? surface.panels.at(-1);
  if (!panel) throw new RangeError(`surface ${surface.surface.id} has no panel`);
  const { root, tip } = panel;
  return { panel, along: (station - root.station) / (tip.station - root.station) };
}

/** The section inside a panel at a share of the panel's length, on the ruled surface between its ends. */
export function sectionOfPanel({ root, tip, rollDeg }: ResolvedPanel, along: number): Section {
  if (along <= 0) return root;
  if (along >= 1) return tip;
  const le = lerp3(root.le, tip.le, along);
  const te = lerp3(root.te, tip.te, along);
  const r = radFromDeg(rollDeg);
  const chord = sub3(te, le);
  const rise = chord[1] * Math.sin(r) - chord[2] * Math.cos(r);
  const turned = root.incidenceDeg !== tip.incidenceDeg;
  return {
    lengthMm: root.lengthMm + (tip.lengthMm - root.lengthMm) * along,
    station: root.station + (tip.station - root.station) * along,
    le,
    te,
    chordMm: length3(chord),
    // Without twist the angle is the ends' own: no rounding noise where nothing turns.
    incidenceDeg: turned ? degFromRad(Math.atan2(rise, chord[0])) : root.incidenceDeg,
  };
}

/**
 * The chordwise section at a station (share of the surface's length, 0 root, 1 tip), starboard side.
 * On a joint it is the inner panel's. Throws RangeError for a station outside 0 to 1.
 */
export function sectionAt(surface: ResolvedSurface, station: number): Section {
  const { panel, along } = panelAt(surface, station);
  return sectionOfPanel(panel, along);
}

/** The point at a station and a share of the local chord (0 leading edge, 1 trailing edge; outside 0 to 1 it lies ahead or aft). */
export function pointAt(surface: ResolvedSurface, station: number, chordShare: number): Vec3 {
  const { le, te } = sectionAt(surface, station);
  return lerp3(le, te, chordShare);
}
