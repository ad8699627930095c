import { expect } from 'vitest';
import { type Derivatives, derivatives } from '@/lib/aero/lattice/derivatives';
import type { LatticeControl, LatticeInput, LatticeOptions, LatticeSection } from '@/lib/aero/lattice/types';

// Planforms as others print them, laid as a lattice in their own units.

export interface Mesh {
  readonly strips: number;
  readonly rows: number;
  readonly options?: Partial<LatticeOptions>;
}

/** The lattice that the tolerances of the published rows are fair to: ten to twelve strips by four or five rows, tips inset. */
export const FAIR: Mesh = { strips: 12, rows: 4 };
/** For rectangles so long that they count as two-dimensional: without tips there is nothing to inset. */
export const TWO_DIMENSIONAL: Mesh = { strips: 8, rows: 4, options: { tipInset: 0 } };

export const section = (x: number, y: number, chord: number, z = 0): LatticeSection => ({
  le: [x, y, z],
  chord,
  incidenceRad: 0,
});

/** Solves a lattice, or says why it was refused. */
export function solved(input: LatticeInput): Derivatives {
  const result = derivatives(input, 'both');
  if (!result.ok) throw new RangeError(result.problems.map((p) => p.message).join('; '));
  return result.value;
}

/** A wing alone by its starboard sections. Unless said otherwise moments are about the origin, by a chord of 1. */
export function wingOf(
  sections: readonly LatticeSection[],
  { strips, rows, options }: Mesh,
  reference: Partial<LatticeInput['reference']> = {},
  controls: readonly LatticeControl[] = [],
): Derivatives {
  let half = 0;
  for (const [i, b] of sections.entries()) {
    const a = sections[i - 1];
    if (a) half += ((b.le[1] - a.le[1]) * (a.chord + b.chord)) / 2;
  }
  const span = 2 * (sections.at(-1)?.le[1] ?? 0);
  return solved({
    surfaces: [{ id: 'wing', mirrored: true, strips, rows, sections }],
    controls,
    reference: { area: 2 * half, chord: 1, span, point: [0, 0, 0], ...reference },
    options,
  });
}

export interface Trapezoid {
  readonly span: number;
  readonly root: number;
  readonly tip: number;
  readonly leSweepRad: number;
}

export const trapezoid = ({ span, root, tip, leSweepRad }: Trapezoid): LatticeSection[] => [
  section(0, 0, root),
  section((span / 2) * Math.tan(leSweepRad), span / 2, tip),
];

export const rectangle = (aspectRatio: number): LatticeSection[] => [section(0, 0, 1), section(0, aspectRatio / 2, 1)];

/** A pointed delta of root chord 1. */
export const delta = (aspectRatio: number): LatticeSection[] => [section(0, 0, 1), section(1, aspectRatio / 4, 0)];

/**
 * An elliptic chord between straight panels whose ends bunch towards the tip as a cosine does, its line at `straightShare` of the
 * chord straight across the span and through the origin.
 */
export function ellipse(span: number, rootChord: number, straightShare: number, panels = 24): LatticeSection[] {
  return Array.from({ length: panels + 1 }, (_, i) => {
    const t = (i / panels) * (Math.PI / 2);
    const chord = i === panels ? 0 : rootChord * Math.cos(t);
    return section(-straightShare * chord, (span / 2) * Math.sin(t), chord);
  });
}

/** Sweep of the leading edge from that of the line at a share of the chord. */
export const leSweep = (sweepRad: number, share: number, span: number, root: number, tip: number): number =>
  Math.atan(Math.tan(sweepRad) + (share * (root - tip)) / (span / 2));

/** Fails unless the value lies within a share of the expected one. */
export const within = (got: number, expected: number, share: number, what = ''): void =>
  expect(Math.abs(got / expected - 1), `${what} ${got} against ${expected}`).toBeLessThanOrEqual(share);
