import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type LiftingLine, type LiftingLineStation, liftingLine, liftingLineEfficiency } from './liftingLine';

// What must hold for any straight wing; Glauert's own results stand in tests/published.

const station = (y: number, chord: number, incidenceRad = 0): LiftingLineStation => ({ y, chord, incidenceRad });

function line(stations: readonly LiftingLineStation[], terms?: number): LiftingLine {
  const solved = liftingLine(stations, undefined, terms);
  if (!solved) throw new RangeError('no lifting line');
  return solved;
}

const wing = fc
  .record({
    half: fc.double({ min: 1.5, max: 12, noNaN: true }),
    joint: fc.double({ min: 0.2, max: 0.8, noNaN: true }),
    middle: fc.double({ min: 0.5, max: 1.3, noNaN: true }),
    tip: fc.double({ min: 0.1, max: 1, noNaN: true }),
  })
  .map(({ half, joint, middle, tip }) => [station(0, 1), station(half * joint, middle), station(half, tip)]);

describe('any straight wing', () => {
  it('never does better than the ellipse: delta is not below 0, efficiency not above 1', () => {
    fc.assert(
      fc.property(wing, (stations) => {
        expect(line(stations).delta).toBeGreaterThan(-1e-9);
        expect(liftingLineEfficiency(stations)).toBeLessThanOrEqual(1 + 1e-9);
      }),
      { numRuns: 40 },
    );
  });

  it('is the same at any size, and lifts by a set incidence as by angle of attack', () => {
    fc.assert(
      fc.property(wing, fc.double({ min: 0.01, max: 300, noNaN: true }), (stations, k) => {
        const one = line(stations);
        const other = line(stations.map(({ y, chord }) => station(y * k, chord * k, 0.07)));
        expect(other.liftSlope / one.liftSlope).toBeCloseTo(1, 10);
        expect(other.rollDamping / one.rollDamping).toBeCloseTo(1, 10);
        expect(other.baseLift / (0.07 * one.liftSlope)).toBeCloseTo(1, 9);
        expect(other.inducedDrag(-0.07)).toBeLessThan(1e-12);
      }),
      { numRuns: 20 },
    );
  });

  it('has settled at its number of terms: 200 change slope, delta and roll damping by less than 1 in 2000', () => {
    for (const tip of [0.1, 0.4, 1]) {
      const stations = [station(0, 1), station(3, tip)];
      const [used, many] = [line(stations), line(stations, 200)];
      expect(Math.abs(used.liftSlope / many.liftSlope - 1)).toBeLessThan(5e-4);
      expect(Math.abs(used.rollDamping / many.rollDamping - 1)).toBeLessThan(5e-4);
      expect(Math.abs(used.delta - many.delta)).toBeLessThan(5e-4);
    }
  });
});

describe('incidence', () => {
  const washedOut = [station(0, 1, 0.05), station(4, 1, 0)];

  it('washout lifts less than the same incidence all along, and leaves the slope alone', () => {
    const even = [station(0, 1, 0.05), station(4, 1, 0.05)];
    expect(line(washedOut).baseLift).toBeGreaterThan(0.01);
    expect(line(washedOut).baseLift).toBeLessThan(line(even).baseLift * 0.8);
    expect(line(washedOut).liftSlope).toBeCloseTo(line(even).liftSlope, 12);
  });

  it('a twisted wing at no lift still drags', () => {
    const { baseLift, liftSlope, inducedDrag } = line(washedOut);
    expect(inducedDrag(-baseLift / liftSlope)).toBeGreaterThan(1e-5);
  });
});

describe('where a lifting line does not apply', () => {
  it.each([
    ['no station', []],
    ['one station', [station(0, 1)]],
    ['no span', [station(0, 1), station(0, 0.5)]],
    ['no area', [station(0, 0), station(4, 0)]],
    ['a gap at the centre', [station(0.3, 1), station(4, 1)]],
    ['a wing that folds back', [station(0, 1), station(4, 1), station(3, 1)]],
  ])('%s', (_, stations) => {
    expect(liftingLine(stations)).toBeNull();
    expect(liftingLineEfficiency(stations)).toBeNull();
  });
});

describe('a step in chord', () => {
  const stepped = (outer: number) => line([station(0, 1), station(1.7, 1), station(1.7, outer), station(4, outer)]);

  it('that shrinks to nothing is no step, and a smaller outer part rolls more easily', () => {
    const smooth = line([station(0, 1), station(4, 1)]);
    expect(stepped(1).liftSlope).toBeCloseTo(smooth.liftSlope, 12);
    expect(stepped(1 - 1e-9).liftSlope).toBeCloseTo(smooth.liftSlope, 8);
    const damped = (outer: number) => stepped(outer).rollDamping * (1.7 + 2.3 * outer);
    expect(damped(0.6)).toBeGreaterThan(damped(1));
  });
});
