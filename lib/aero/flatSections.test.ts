import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { airframe, body, panel, surface } from '@/tests/support/airframe';
import { bodyHalfWidthMm } from './bodyWidth';
import { flatSurface } from './flatSections';

function flat(document: Airframe) {
  const resolved = resolve(document);
  const first = resolved.ok ? resolved.value.surfaces[0] : undefined;
  if (!resolved.ok || !first) throw new RangeError('does not resolve');
  return { ...flatSurface(document, resolved.value, first), resolved: resolved.value };
}

const rootAt = (y: number, over = {}) =>
  surface({
    mount: { to: 'datum', at: [0, y, 0] },
    panels: [panel({ lengthMm: 400, rootChordMm: 200, tipChordMm: 120 })],
    ...over,
  });

describe('bodyHalfWidthMm', () => {
  // Widths 50, 64, 60, 24 mm at x -120, -30, 140, 400.
  const document = airframe({ bodies: [body()] });
  const { resolved } = flat(document);
  it.each([
    { from: -30, to: -30, half: 32, what: 'at a station' },
    { from: 0, to: 200, half: (64 - (4 * 30) / 170) / 2, what: 'the widest of a stretch, straight between stations' },
    { from: 270, to: 270, half: 21, what: 'half way between two stations' },
    { from: 401, to: 500, half: 0, what: 'behind it' },
  ])('$what', ({ from, to, half }) => expect(bodyHalfWidthMm(document, resolved, from, to)).toBeCloseTo(half, 9));

  it('does not see a body off the centre plane', () => {
    const off = airframe({ bodies: [body({ mount: { to: 'datum', at: [-120, 60, 0] } })] });
    expect(bodyHalfWidthMm(off, flat(off).resolved, 0, 100)).toBe(0);
  });
});

describe('flatSurface', () => {
  it('carries a wing that begins at the body side to the centre plane', () => {
    const { sections, carriedMm, lengthMm } = flat(airframe({ surfaces: [rootAt(32)], bodies: [body()] }));
    expect(carriedMm).toBe(32);
    expect(lengthMm).toBe(432);
    expect(sections.map((s) => [s.le[1], s.chord])).toEqual([
      [0, 200],
      [32, 200],
      [432, 120],
    ]);
  });

  it('leaves a gap open when no body fills it', () => {
    expect(flat(airframe({ surfaces: [rootAt(32)] })).carriedMm).toBe(0);
    expect(flat(airframe({ surfaces: [rootAt(60)], bodies: [body()] })).carriedMm).toBe(0);
  });

  it('does not carry a fin', () => {
    expect(flat(airframe({ surfaces: [rootAt(20, { cantDeg: 90 })], bodies: [body()] })).carriedMm).toBe(0);
  });

  it('keeps incidence as an angle about the quarter chord, which stays where it is', () => {
    const { sections } = flat(airframe({ surfaces: [rootAt(0, { incidenceDeg: 6 })] }));
    expect(sections[0]?.le[0]).toBeCloseTo(0, 9);
    expect(sections[0]?.le[2]).toBeCloseTo(0, 9);
    expect(sections[0]?.incidenceRad).toBeCloseTo((6 * Math.PI) / 180, 12);
  });

  it('lays a swept plate set at an incidence level: the angle is no anhedral', () => {
    const panels = [panel({ lengthMm: 400, rootChordMm: 200, tipChordMm: 120, sweepDeg: 45 })];
    const { sections } = flat(airframe({ surfaces: [rootAt(0, { incidenceDeg: 6, panels })] }));
    expect(sections[1]?.le[0]).toBeCloseTo(50 + 400 - 30, 9);
    expect(sections[1]?.le[2]).toBeCloseTo(0, 9);
  });

  it('keeps a step in chord as two sections at one place', () => {
    const panels = [
      panel({ id: 'p1', lengthMm: 100, rootChordMm: 200, tipChordMm: 200 }),
      panel({ id: 'p2', lengthMm: 100, rootChordMm: 150, tipChordMm: 150 }),
    ];
    const { sections } = flat(airframe({ surfaces: [surface({ panels })] }));
    expect(sections.map((s) => s.chord)).toEqual([200, 200, 150, 150]);
    // Both meet at the quarter chord.
    expect(sections[1]?.le[0]).toBeCloseTo(0, 9);
    expect(sections[2]?.le[0]).toBeCloseTo(50 - 150 / 4, 9);
  });
});
