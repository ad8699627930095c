import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { airAt } from '@/lib/aero/atmosphere';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { airframe, panel, surface } from '@/tests/support/airframe';
import { drive } from '@/tests/support/drive';
import { handModel } from '@/tests/support/handModel';
import { bestClimb, bestGlide, leastSink, levelDragN, levelLift, topLevelSpeedMs } from './level';
import { type AircraftPolar, aircraftPolar } from './polar';
import { stallOf, turnRadiusM } from './speeds';

const AREA = 2 * 600 * 200;
const plain = airframe({
  surfaces: [surface({ panels: [panel({ lengthMm: 600, rootChordMm: 200, tipChordMm: 200 })] })],
});

function polarOf(document: Airframe = plain, massG = 650, heightM = 0): AircraftPolar {
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('does not resolve');
  const model = handModel(AREA, 1200, 200);
  return aircraftPolar({
    airframe: document,
    resolved: resolved.value,
    model,
    areaMm2: AREA,
    massG,
    air: airAt(heightM),
  });
}

const straight = (staticN: number, spentMs: number) => ({
  spentMs,
  thrustN: (speedMs: number) => staticN * Math.max(0, 1 - speedMs / spentMs),
});

describe('stall', () => {
  it('is faster in thinner air by the root of the densities', () => {
    fc.assert(
      fc.property(fc.double({ min: 100, max: 4000, noNaN: true }), (heightM) => {
        const [low, high] = [stallOf(plain, AREA, 650, airAt(0)), stallOf(plain, AREA, 650, airAt(heightM))];
        const ratio = Math.sqrt(airAt(0).densityKgM3 / airAt(heightM).densityKgM3);
        expect(high.speedMs / low.speedMs).toBeCloseTo(ratio, 9);
      }),
    );
  });

  it('is faster with more mass by its root, as every speed at one lift coefficient is', () => {
    fc.assert(
      fc.property(fc.double({ min: 1.1, max: 4, noNaN: true }), (times) => {
        const ratio = stallOf(plain, AREA, 500 * times, airAt(0)).speedMs / stallOf(plain, AREA, 500, airAt(0)).speedMs;
        expect(ratio).toBeCloseTo(Math.sqrt(times), 9);
      }),
    );
  });

  it('of a small folded wing is solved with the Reynolds number of that very speed', () => {
    const section = { kind: 'folded', thicknessShare: 0.08, maxAt: 0.3, lowerTo: 0.6, webAt: 0.3 } as const;
    const tiny = airframe({
      surfaces: [surface({ panels: [panel({ lengthMm: 150, rootChordMm: 60, tipChordMm: 60, section })] })],
    });
    const { speedMs, clMax } = stallOf(tiny, 18_000, 30, airAt(0));
    // Weight over dynamic pressure and area.
    expect((2 * 0.03 * 9.80665) / (1.225 * 0.018 * speedMs ** 2)).toBeCloseTo(clMax.value, 5);
    expect(clMax.value).toBeLessThan(1);
  });
});

describe('level flight and glide', () => {
  const polar = polarOf();

  it('sinks by power over weight, speed over glide ratio', () => {
    for (const { speedMs, ratio, sinkMs } of [bestGlide(polar), leastSink(polar), bestGlide(polar, 'high')])
      expect(sinkMs * ratio).toBeCloseTo(speedMs, 9);
    const { speedMs, sinkMs } = leastSink(polar);
    expect(sinkMs * polar.weightN).toBeCloseTo(levelDragN(polar, speedMs, 'off') * speedMs, 9);
  });

  it('no other speed glides flatter or sinks slower', () => {
    const [flattest, slowest] = [bestGlide(polar), leastSink(polar)];
    expect(slowest.speedMs).toBeLessThanOrEqual(flattest.speedMs);
    for (let stalls = 1; stalls < 4; stalls += 0.05) {
      const speedMs = polar.stallMs * stalls;
      const drag = levelDragN(polar, speedMs, 'off');
      expect(polar.weightN / drag).toBeLessThanOrEqual(flattest.ratio * (1 + 1e-6));
      expect((drag * speedMs) / polar.weightN).toBeGreaterThanOrEqual(slowest.sinkMs * (1 - 1e-6));
    }
  });

  it('glides flatter at the low end of the drag', () => {
    expect(bestGlide(polar, 'low').ratio).toBeGreaterThan(bestGlide(polar).ratio);
    expect(bestGlide(polar, 'high').ratio).toBeLessThan(bestGlide(polar).ratio);
  });

  it('a stopped propeller costs glide, and nothing while it pulls', () => {
    const motor = polarOf({ ...plain, drives: [drive()] });
    const speed = 1.5 * motor.stallMs;
    expect(levelDragN(motor, speed, 'off')).toBeGreaterThan(levelDragN(motor, speed, 'on'));
    expect(levelDragN(polar, speed, 'off')).toBe(levelDragN(polar, speed, 'on'));
  });

  it('carries its weight at each speed, and refuses the ones below the stall', () => {
    expect(levelLift(polar, polar.stallMs)).toBeCloseTo(polar.stall.clMax.value, 9);
    expect(() => levelDragN(polar, 0.9 * polar.stallMs, 'on')).toThrow(RangeError);
  });
});

describe('with thrust', () => {
  const polar = polarOf();

  it('thrust equals drag at the highest level speed, and is less beyond', () => {
    const curve = straight(5, 24);
    const top = topLevelSpeedMs(polar, curve) ?? Number.NaN;
    expect(curve.thrustN(top)).toBeCloseTo(levelDragN(polar, top, 'on'), 6);
    expect(curve.thrustN(1.05 * top)).toBeLessThan(levelDragN(polar, 1.05 * top, 'on'));
  });

  it('more thrust flies faster and climbs better', () => {
    const [weak, strong] = [straight(3, 24), straight(6, 24)];
    expect(topLevelSpeedMs(polar, strong) ?? 0).toBeGreaterThan(topLevelSpeedMs(polar, weak) ?? 99);
    expect(bestClimb(polar, strong)?.climbMs ?? 0).toBeGreaterThan(bestClimb(polar, weak)?.climbMs ?? 99);
  });

  it('climbs by excess power over weight, at the best of all speeds', () => {
    const curve = straight(5, 24);
    const climb = bestClimb(polar, curve);
    const at = (v: number) => ((curve.thrustN(v) - levelDragN(polar, v, 'on')) * v) / polar.weightN;
    expect(climb?.climbMs).toBeCloseTo(at(climb?.speedMs ?? 0), 9);
    for (let v = polar.stallMs; v < 24; v += 0.5) expect(at(v)).toBeLessThanOrEqual((climb?.climbMs ?? 0) + 1e-6);
    expect(climb?.straightUp).toBe(false);
  });

  it('goes straight up when thrust less drag is more than the weight: never faster than it flies', () => {
    const climb = bestClimb(polar, straight(40, 30));
    expect(climb?.straightUp).toBe(true);
    expect(climb?.climbMs).toBeLessThanOrEqual(climb?.speedMs ?? 0);
    expect(climb?.climbMs).toBeCloseTo(climb?.speedMs ?? 0, 1);
  });

  it('without enough thrust there is no level speed, and it sinks', () => {
    expect(topLevelSpeedMs(polar, straight(0.2, 24))).toBeNull();
    expect(bestClimb(polar, straight(0.2, 24))?.climbMs).toBeLessThan(0);
    expect(topLevelSpeedMs(polar, straight(9, 0.8 * polar.stallMs))).toBeNull();
    expect(bestClimb(polar, straight(9, 0.8 * polar.stallMs))).toBeNull();
  });
});

describe('scale', () => {
  it('a heavier aircraft glides a little flatter, and much faster', () => {
    // Reynolds numbers move a little, so the ratio may gain a few per cent, never lose.
    const [light, heavy] = [polarOf(plain, 500), polarOf(plain, 1000)];
    expect(bestGlide(heavy).speedMs).toBeGreaterThan(1.3 * bestGlide(light).speedMs);
    expect(bestGlide(heavy).ratio).toBeGreaterThan(bestGlide(light).ratio);
    expect(bestGlide(heavy).ratio).toBeLessThan(1.12 * bestGlide(light).ratio);
  });

  it('a turn is four times as wide at twice the speed', () => {
    expect(turnRadiusM(24, 2) / turnRadiusM(12, 2)).toBeCloseTo(4, 12);
  });
});
