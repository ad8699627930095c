import { describe, expect, it } from 'vitest';
import type { AeroModel } from '@/lib/aero/model';
import { control } from '@/tests/support/airframe';
import { plain, tail, wing } from '@/tests/support/plainAircraft';
import { levelTrim } from './levelTrim';

const NONE = { side: 0, roll: 0, yaw: 0 };
const model = (over: Partial<AeroModel> = {}): AeroModel => ({
  reference: { area: 180_000, chord: 182, span: 1000, point: [40, 0, 0] },
  base: { lift: 0.05, pitch: 0.02 },
  alpha: { lift: 4.6, pitch: -0.7 },
  pitchRate: { lift: 8, pitch: -12 },
  controls: new Map([['tail/elevator', { lift: 0.5, pitch: -1.6 }]]),
  neutralPointX: 68,
  contributions: [],
  lateral: () => ({ beta: NONE, rollRate: NONE, yawRate: NONE, controls: new Map() }),
  inducedDrag: () => 0,
  spanEfficiency: 1,
  ...over,
});

describe('level trim', () => {
  it('leaves no moment and carries the weight', () => {
    const state = levelTrim(plain(), model(), 0.45);
    const elevator = state?.deflectionsRad.get('tail/elevator') ?? 0;
    const alpha = state?.alphaRad ?? 0;
    expect(0.05 + 4.6 * alpha + 0.5 * elevator).toBeCloseTo(0.45, 10);
    expect(0.02 - 0.7 * alpha - 1.6 * elevator).toBeCloseTo(0, 10);
    expect(elevator).toBeLessThan(0);
  });

  it('without a pitch control it carries the weight with the controls at rest, reflex and all', () => {
    const reflexed = plain({
      surfaces: [wing({ controls: [control({ neutralDeg: -3 })] }), tail(560, { controls: [] })],
    });
    const aileron = { lift: 0.8, pitch: -0.1 };
    const state = levelTrim(reflexed, model({ controls: new Map([['wing/aileron', aileron]]) }), 0.45);
    const rest = (-3 * Math.PI) / 180;
    expect(state?.deflectionsRad.get('wing/aileron')).toBeCloseTo(rest, 12);
    expect(0.05 + 4.6 * (state?.alphaRad ?? 0) + 0.8 * rest).toBeCloseTo(0.45, 12);
  });

  it('is null when nothing lifts', () =>
    expect(levelTrim(plain(), model({ alpha: { lift: 0, pitch: 0 } }), 0.45)).toBeNull());
});
