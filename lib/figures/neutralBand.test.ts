import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Contribution } from '@/lib/aero/model';
import { startFrom } from '@/lib/airframe/layouts';
import { airframe, body } from '@/tests/support/airframe';
import { pitchModel } from '@/tests/support/pitchContext';
import { neutralPointBand } from './neutralBand';

const by = (name: Contribution['name'], lift: number, pitch: number): Contribution => ({
  name,
  alpha: { lift, pitch },
  beta: { side: 0, roll: 0, yaw: 0 },
});
const bodied = airframe({ bodies: [body()] });
const pusher = airframe({
  drives: startFrom('pusher', 'Test').drives.map((d) => ({ ...d, mount: { to: 'datum', at: [150, 0, 0] } })),
});

describe('the band of the neutral point', () => {
  it.each([
    { name: 'bare', document: airframe(), pct: 2, cause: 'flexes' },
    { name: 'with a body', document: bodied, pct: 3, cause: 'body' },
    { name: 'with a pusher', document: pusher, pct: 5, cause: 'propeller' },
  ])('is never under $pct % $name, and says so', ({ document, pct, cause }) => {
    const band = neutralPointBand(document, pitchModel());
    expect(band.pct).toBe(pct);
    expect(band.cause).toContain(cause);
    expect(band.cause).toContain('lattice 0.5 %');
    expect(band.bodiesPct).toBeNull();
  });

  it('is the lattice, half of the body and half of the propeller once these come to more', () => {
    // 0.36 of moment on a lift slope of 4.5 is 8 % of the chord; 0.045 is 1 %.
    const model = pitchModel({ contributions: [by('bodies', 0, 0.36), by('propellers', 0, 0.045)] });
    const band = neutralPointBand(bodied, model);
    expect(band.bodiesPct).toBeCloseTo(-8, 9);
    expect(band.propellersPct).toBeCloseTo(-1, 9);
    expect(band.pct).toBeCloseTo(0.5 + 4 + 0.5, 9);
    expect(band.cause).toContain('bodies do 4.0 %');
    expect(band.cause).toContain('propellers do 0.5 %');
  });

  it('counts lift that acts at the neutral point as no shift', () => {
    // The model's neutral point is 0.5 / 4.5 of the chord behind its point.
    const band = neutralPointBand(bodied, pitchModel({ contributions: [by('propellers', 0.3, (-0.3 * 0.5) / 4.5)] }));
    expect(band.propellersPct).toBeCloseTo(0, 9);
  });

  it('grows with the shift and never shrinks', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true }), (a, b) => {
        const width = (pitch: number) =>
          neutralPointBand(bodied, pitchModel({ contributions: [by('bodies', 0, pitch)] })).pct;
        expect(width(Math.max(a, b))).toBeGreaterThanOrEqual(width(Math.min(a, b)));
        expect(width(-a)).toBeCloseTo(width(a), 9);
      }),
    );
  });
});
