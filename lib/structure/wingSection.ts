import type { Panel, SectionShape } from '@/lib/airframe/schema/surface';
import { edges } from '@/lib/geometry/polygons';
import { type Layer, type Stack, stackOf, stripTorsion } from './sheet';

// Stiffness of a whole chordwise section, whichever way it is built. The part behind a hinge carries nothing.

/** Bending up and down and torsion, N mm2, and where the section's own shear centre lies, share of the chord from its leading edge. */
export interface SectionStiffness {
  readonly bendingNmm2: number;
  readonly torsionNmm2: number;
  readonly axisShare: number;
}

/** A sheet by its id. */
export type SheetOf = (materialId: string) => Stack;

/**
 * Stiffness of a section of a panel at a chord, mm, up to `endShare` of it (the hinge line; 1 without a control).
 * Flat and stepped sections are open strips, a folded one is a closed cell of its two skins, a slab is solid foam.
 */
export function sectionStiffness(
  panel: Pick<Panel, 'section' | 'materialId'>,
  chordMm: number,
  endShare: number,
  sheetOf: SheetOf,
): SectionStiffness {
  const own = sheetOf(panel.materialId);
  const { section } = panel;
  switch (section.kind) {
    case 'flat':
      return steppedSection([], own, chordMm, endShare, sheetOf);
    case 'stepped':
      return steppedSection(section.layers, own, chordMm, endShare, sheetOf);
    case 'folded':
      return foldedSection(section, own, chordMm, endShare);
    case 'slab':
      return slabSection(section, own, chordMm, endShare);
  }
}

type Step = Extract<SectionShape, { kind: 'stepped' }>['layers'][number];

/** From step to step along the chord, sheets glued on each other act as one. */
function steppedSection(
  steps: readonly Step[],
  own: Stack,
  chordMm: number,
  endShare: number,
  sheetOf: SheetOf,
): SectionStiffness {
  if (steps.length === 0) {
    const whole = endShare * chordMm;
    return {
      bendingNmm2: own.bendingPerWidth * whole,
      torsionNmm2: stripTorsion(own, whole),
      axisShare: endShare / 2,
    };
  }
  const ends = steps.flatMap(({ from, to }) => [from, to]).filter((x) => x > 0 && x < endShare);
  const cuts = [...new Set([0, ...ends, endShare])].sort((a, b) => a - b);
  let [bending, torsion, moment] = [0, 0, 0];
  for (const [i, to] of cuts.entries()) {
    const from = cuts[i - 1];
    if (from === undefined) continue;
    const middle = (from + to) / 2;
    const on = (face: Step['face']) =>
      steps
        .filter((s) => s.face === face && s.from < middle && s.to > middle)
        .flatMap((s) => sheetOf(s.materialId).layers);
    const stack = stackOf([...on('lower'), ...own.layers, ...on('upper')]);
    const piece = stack.bendingPerWidth * (to - from) * chordMm;
    bending += piece;
    moment += piece * middle;
    // The faces' loss at the edges is that of the whole strip, not of each piece of it.
    torsion += (stripTorsion(stack, endShare * chordMm) * (to - from)) / endShare;
  }
  return { bendingNmm2: bending, torsionNmm2: torsion, axisShare: moment / bending };
}

type Folded = Extract<SectionShape, { kind: 'folded' }>;

/** A cell closed by its lower skin: Bredt and Batho, G J = 4 A^2 / (integral of ds / G t); bending by the skins' distance apart. */
function foldedSection(
  { thicknessShare, maxAt, lowerTo }: Folded,
  own: Stack,
  chordMm: number,
  endShare: number,
): SectionStiffness {
  const closesAt = Math.min(lowerTo, endShare);
  const sheetMm = own.layers.reduce((sum, { thicknessMm }) => sum + thicknessMm, 0);
  // Two skins can lie no closer than on each other.
  const gapMm = Math.max(thicknessShare * chordMm - sheetMm, sheetMm);
  const height = (x: number) => (x <= maxAt ? x / maxAt : (1 - x) / (1 - maxAt));
  const heights = [0, Math.min(maxAt, closesAt), closesAt].map((x) => ({ x, h: height(x) * gapMm }));
  let [area, square] = [0, 0];
  for (const [i, b] of heights.entries()) {
    const a = heights[i - 1];
    if (!a) continue;
    const width = (b.x - a.x) * chordMm;
    area += (width * (a.h + b.h)) / 2;
    square += (width * (a.h ** 2 + a.h * b.h + b.h ** 2)) / 3;
  }
  const skin = (modulus: (layer: Layer) => number) =>
    own.layers.reduce((sum, layer) => sum + modulus(layer) * layer.thicknessMm, 0);
  const around = 2 * closesAt * chordMm + height(closesAt) * gapMm;
  return {
    bendingNmm2: (skin((l) => l.modulusMpa) / 2) * square + 2 * own.bendingPerWidth * closesAt * chordMm,
    torsionNmm2: (4 * area ** 2 * skin((l) => l.shearMpa)) / around + 2 * stripTorsion(own, closesAt * chordMm),
    axisShare: closesAt / 2,
  };
}

type Slab = Extract<SectionShape, { kind: 'slab' }>;
/** Places along the chord at which a carved profile's thickness is read. */
const SLAB_CUTS = 40;

/**
 * Solid foam, as a row of narrow strips: thickness cubed over 12 in bending and over 3 in torsion (Roark, table 10.1, thin sections).
 * The profile gives the shape, `thicknessShare` how thick its thickest place is.
 */
function slabSection(
  { thicknessShare, profile }: Slab,
  own: Stack,
  chordMm: number,
  endShare: number,
): SectionStiffness {
  const core = own.layers.find(({ face }) => !face);
  if (!core) throw new RangeError('a sheet without a core');
  const thickest = Math.max(...Array.from({ length: SLAB_CUTS }, (_, i) => depthAt(profile, (i + 0.5) / SLAB_CUTS)));
  const scale = (thicknessShare * chordMm) / thickest;
  let [cubes, moment] = [0, 0];
  for (let i = 0; i < SLAB_CUTS; i++) {
    const x = (endShare * (i + 0.5)) / SLAB_CUTS;
    const piece = ((depthAt(profile, x) * scale) ** 3 * endShare * chordMm) / SLAB_CUTS;
    cubes += piece;
    moment += piece * x;
  }
  return {
    bendingNmm2: (core.modulusMpa * cubes) / 12,
    torsionNmm2: (core.shearMpa * cubes) / 3,
    axisShare: moment / cubes,
  };
}

/** Between the upper and lower side of a closed profile. */
function depthAt(profile: Slab['profile'], x: number): number {
  const heights = edges(profile).flatMap(([a, b]) =>
    a[0] === b[0] || (a[0] - x) * (b[0] - x) > 0 ? [] : [a[1] + ((b[1] - a[1]) * (x - a[0])) / (b[0] - a[0])],
  );
  return heights.length > 1 ? Math.max(...heights) - Math.min(...heights) : 0;
}
