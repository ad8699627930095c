import { type Folded, reflexFrom, upperHeight } from '@/lib/airframe/foldedSection';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Panel, SectionShape } from '@/lib/airframe/schema/surface';
import { edges } from '@/lib/geometry/polygons';
import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import type { Kink, MeanLine } from './lattice/types';

// The line midway between the faces of a section is all that the lattice knows of its camber: shares of the chord, z up, slopes against
// the line that incidence is measured by (a stepped section's own sheet, else leading to trailing edge).

/** A step from one thickness to another is spread over this many times its height: the air bridges it. Common practice, no source. */
const STEP_RUN = 4;
/** Places along the chord at which a free profile's two sides are read. */
const PROFILE_CUTS = 24;

/** Mean line of a panel where its chord is `chordMm`; empty for a flat sheet. In a pointed tip no layer is thicker than the chord is long. */
export function meanLineOf(airframe: Airframe, { section, materialId }: Panel, chordMm: number): MeanLine {
  const share = (id: string) => {
    const thickness = airframe.materials.find((m) => m.id === id)?.thicknessMm ?? 0;
    return thickness / Math.max(chordMm, thickness);
  };
  switch (section.kind) {
    case 'flat':
      return [];
    case 'stepped':
      return section.layers.flatMap((layer) => layerKinks(layer, share(layer.materialId)));
    case 'folded':
      return foldedKinks(section, share(materialId));
    case 'slab':
      return kinksOf(profileMiddle(section.profile));
  }
}

type Layer = Extract<SectionShape, { kind: 'stepped' }>['layers'][number];

/** A layer lifts the middle by half its thickness between its ends, above, and lowers it likewise below. At the edges of the wing it has no step. */
function layerKinks({ from, to, face }: Layer, thickness: number): Kink[] {
  const rise = ((face === 'upper' ? 1 : -1) * thickness) / 2;
  return [...(from > 0 ? ramp(from, rise, thickness) : []), ...(to < 1 ? ramp(to, -rise, thickness) : [])];
}

/** A rise at a place, as two kinks that cancel each other. */
function ramp(at: number, rise: number, height: number): Kink[] {
  const run = Math.min(STEP_RUN * height, 2 * at, 2 * (1 - at));
  const slope = rise / run;
  return [
    { at: at - run / 2, slope },
    { at: at + run / 2, slope: -slope },
  ];
}

/**
 * Two straight skins over a flat lower one: up to the thickest place and down to the trailing edge. Where both skins are there the middle
 * is half the height; behind the lower skin it is the single sheet's own, half a thickness under its top.
 */
function foldedKinks(section: Folded, sheet: number): Kink[] {
  const { thicknessShare, maxAt, lowerTo, reflexDeg = 0 } = section;
  const kinks = kinksOf([
    [0, 0],
    [maxAt, thicknessShare / 2],
    [1, 0],
  ]);
  if (lowerTo < 1 && lowerTo > maxAt) {
    const height = upperHeight(section, lowerTo);
    // From half the height to the single sheet, which runs on twice as steep.
    kinks.push(...ramp(lowerTo, height / 2 - Math.min(sheet, height) / 2, height));
    kinks.push({ at: lowerTo, slope: -thicknessShare / (2 * (1 - maxAt)) });
  }
  const from = reflexFrom(section);
  if (from !== null) kinks.push({ at: from, slope: Math.tan(radFromDeg(reflexDeg)) });
  return kinks;
}

/** The middle between the upper and lower side of a closed profile, at even places along the chord. */
function profileMiddle(profile: readonly Vec2[]): Vec2[] {
  return Array.from({ length: PROFILE_CUTS + 1 }, (_, i): Vec2 => {
    // A little inside the ends, where both sides meet in a point or in a blunt edge.
    const x = Math.min(1 - 1e-6, Math.max(1e-6, i / PROFILE_CUTS));
    const heights = edges(profile).flatMap(([a, b]) => {
      if (a[0] === b[0] || (a[0] - x) * (b[0] - x) > 0) return [];
      return [a[1] + ((b[1] - a[1]) * (x - a[0])) / (b[0] - a[0])];
    });
    return [i / PROFILE_CUTS, heights.length === 0 ? 0 : (Math.min(...heights) + Math.max(...heights)) / 2];
  });
}

/** The slope a line begins with, and every change of it after. */
function kinksOf(line: readonly Vec2[]): Kink[] {
  let before = 0;
  return line.slice(1).map(([x1, z1], i) => {
    const [x0, z0] = line[i] ?? [0, 0];
    const slope = (z1 - z0) / (x1 - x0);
    const kink = { at: x0, slope: slope - before };
    before = slope;
    return kink;
  });
}
