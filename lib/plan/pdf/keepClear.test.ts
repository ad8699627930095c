import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Vec2 } from '@/lib/numerics/vec';
import { pointToSegment, type Segment } from '../draw/segments';
import { CLEAR_MM, keepClear } from './keepClear';

const lengthOf = (pieces: readonly (readonly Vec2[])[]): number =>
  pieces.reduce(
    (sum, piece) =>
      sum +
      piece.slice(1).reduce((part, [x, y], i) => {
        const [px, py] = piece[i] ?? [x, y];
        return part + Math.hypot(x - px, y - py);
      }, 0),
    0,
  );

const wall: Segment = [
  [0, 0],
  [0, 50],
];

describe('keepClear', () => {
  it('ends a fold line a millimetre from the cut it runs into', () => {
    const [piece, ...rest] = keepClear(
      {
        points: [
          [0, 20],
          [40, 20],
        ],
        closed: false,
      },
      [wall],
    );
    expect(rest).toEqual([]);
    expect(piece?.[0]?.[0]).toBeCloseTo(1, 6);
    expect(piece?.[1]).toEqual([40, 20]);
  });

  it('leaves a gap where it crosses one, and drops what runs along it', () => {
    const crossing = keepClear(
      {
        points: [
          [-10, 20],
          [10, 20],
        ],
        closed: false,
      },
      [wall],
    );
    expect(crossing).toHaveLength(2);
    expect(lengthOf(crossing)).toBeCloseTo(18, 6);
    expect(
      keepClear(
        {
          points: [
            [0.4, 5],
            [0.4, 45],
          ],
          closed: false,
        },
        [wall],
      ),
    ).toEqual([]);
  });

  it('keeps a line through its corners in one piece when nothing is near', () => {
    const points: Vec2[] = [
      [10, 0],
      [20, 5],
      [20, 30],
    ];
    expect(keepClear({ points, closed: false }, [wall])).toEqual([points]);
    expect(keepClear({ points, closed: true }, [wall])).toEqual([[...points, [10, 0]]]);
  });

  it('keeps exactly what lies far enough from every cut', () => {
    const coordinate = fc.double({ min: -20, max: 20, noNaN: true });
    const segment = fc.tuple(coordinate, coordinate, coordinate, coordinate).map(
      ([a, b, c, d]): Segment => [
        [a, b],
        [c, d],
      ],
    );
    fc.assert(
      fc.property(segment, fc.array(segment, { minLength: 1, maxLength: 4 }), (line, cuts) => {
        const [a, b] = line;
        const pieces = keepClear({ points: [a, b], closed: false }, cuts);
        const steps = 400;
        let far = 0;
        for (let i = 0; i < steps; i++) {
          const t = (i + 0.5) / steps;
          const point: Vec2 = [a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t];
          if (cuts.every((cut) => pointToSegment(point, cut) >= CLEAR_MM)) far++;
        }
        const whole = Math.hypot(b[0] - a[0], b[1] - a[1]);
        // Each end of a piece may fall anywhere within one step of the sampling.
        expect(Math.abs(lengthOf(pieces) - (whole * far) / steps)).toBeLessThanOrEqual((whole / steps) * 10 + 1e-6);
      }),
      { numRuns: 200, seed: 3 },
    );
  });
});
