import { describe, expect, it } from 'vitest';
import type { Vec2 } from '@/lib/numerics/vec';
import { gridStep } from './grid';
import { distanceToPath, elementAt, insideRing } from './hit';

const notched: readonly Vec2[] = [
  [0, 0],
  [40, 0],
  [40, 30],
  [25, 30],
  [25, 10],
  [15, 10],
  [15, 30],
  [0, 30],
];

describe('hit test', () => {
  it('knows a notch is outside', () => {
    expect(insideRing(notched, [7, 20])).toBe(true);
    expect(insideRing(notched, [20, 20])).toBe(false);
    expect(insideRing(notched, [20, 5])).toBe(true);
  });

  it('measures to the nearest segment, and to the closing one only when closed', () => {
    const path: readonly Vec2[] = [
      [0, 0],
      [30, 0],
      [30, 40],
    ];
    expect(distanceToPath(path, false, [12, -5])).toBeCloseTo(5, 9);
    // Distance of (0, 40) to the line from (0,0) to (30,40): 30 * 40 / 50.
    expect(distanceToPath(path, true, [0, 40])).toBeCloseTo(24, 9);
    expect(distanceToPath(path, false, [0, 40])).toBeCloseTo(30, 9);
  });

  it('picks the one drawn last, takes a line within reach, and nothing over bare board', () => {
    const outlines = [
      { elementId: 'wing', points: notched, closed: true },
      {
        elementId: 'boom',
        points: [
          [5, -50],
          [5, 80],
        ] as const,
        closed: false,
      },
    ];
    expect(elementAt(outlines, [6, 20], 2)).toBe('boom');
    expect(elementAt(outlines, [10, 20], 2)).toBe('wing');
    expect(elementAt(outlines, [90, 90], 2)).toBeNull();
  });
});

describe('grid', () => {
  it.each([
    [0.4, 'metric', 50],
    [1.2, 'metric', 10],
    [9.5, 'metric', 1],
    [1, 'imperial', 12.7],
  ] as const)('%d px a mm in %s is a line every %d mm', (scale, system, step) => {
    expect(gridStep(scale, system).stepMm).toBeCloseTo(step, 9);
  });
});
