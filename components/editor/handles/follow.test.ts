import { describe, expect, it } from 'vitest';
import type { Vec2 } from '@/lib/numerics/vec';
import { type Draggable, follow, grip } from './follow';

/** A tip 200 mm out whose x is the tangent of its sweep: the pointer moves mm, the value is degrees. */
const sweepHandle = (deg: number): Draggable => ({
  value: deg,
  at: [200 * Math.tan((deg * Math.PI) / 180), 200],
  direction: [1, 0],
  perMm: ((180 / Math.PI) * Math.cos((deg * Math.PI) / 180) ** 2) / 200,
});

/** A length that stops at 400 mm. */
const stopped = (value: number): Draggable => ({
  value: Math.min(value, 400),
  at: [0, Math.min(value, 400)],
  direction: [0, 1],
  perMm: 2,
});

describe('follow', () => {
  it('is exact for a straight handle and ignores movement across it', () => {
    const handle: Draggable = { value: 620, at: [40, 310], direction: [0, 1], perMm: 2 };
    expect(follow([75, 331], grip([42, 307], handle), handle)).toBeCloseTo(620 + 2 * 24, 9);
  });

  it('brings a curved handle under the pointer within three frames', () => {
    let handle = sweepHandle(5);
    const target: Vec2 = [130, 200];
    const offset: Vec2 = [0, 0];
    for (let frame = 0; frame < 3; frame += 1) handle = sweepHandle(follow(target, offset, handle));
    expect(handle.at[0]).toBeCloseTo(130, 2);
  });

  it('leaves a stop where it met it', () => {
    const start: Draggable = { value: 390, at: [0, 390], direction: [0, 1], perMm: 1 };
    const offset = grip([3, 388], start);
    const past = stopped(follow([3, 900], offset, start));
    expect(past.value).toBe(400);
    expect(follow([3, 393], offset, { ...past, perMm: 1 })).toBeCloseTo(395, 9);
  });
});
