import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Vec2 } from '@/lib/numerics/vec';
import { type Extents, foldSheet, inBox, mmFromScreen, outgrown, panSheet, screenFromMm, zoomSheet } from './fold';

const extents: Extents = { x: [-180, 520], y: [-310, 310], z: [-60, 110] };
const room = { width: 1440, height: 760, insetRight: 280 };
const mm = fc.tuple(
  fc.double({ min: -2000, max: 2000, noNaN: true }),
  fc.double({ min: -2000, max: 2000, noNaN: true }),
);
const px = fc.tuple(fc.double({ min: 0, max: 1400, noNaN: true }), fc.double({ min: 0, max: 760, noNaN: true }));

describe('foldSheet', () => {
  it('takes a point to the screen and back in every view', () => {
    const sheet = foldSheet(room, extents);
    const views = [sheet.plan, sheet.side, sheet.front, sheet.rule].filter((view) => view !== null);
    expect(views).toHaveLength(4);
    fc.assert(
      fc.property(mm, (point: Vec2) => {
        for (const view of views) {
          const back = mmFromScreen(view, screenFromMm(view, point));
          expect(back[0]).toBeCloseTo(point[0], 6);
          expect(back[1]).toBeCloseTo(point[1], 6);
        }
      }),
    );
  });

  it('keeps everything inside its box at every size of window', () => {
    const size = fc.record({ width: fc.integer({ min: 320, max: 2600 }), height: fc.integer({ min: 300, max: 1500 }) });
    fc.assert(
      fc.property(size, ({ width, height }) => {
        const sheet = foldSheet({ width, height, insetRight: 0 }, extents);
        expect(outgrown(sheet, extents)).toBe(false);
        if (sheet.side) {
          expect(inBox(sheet.side.box, screenFromMm(sheet.side, [extents.x[0], extents.z[0]]))).toBe(true);
          expect(inBox(sheet.side.box, screenFromMm(sheet.side, [extents.x[1], extents.z[1]]))).toBe(true);
        }
        if (sheet.front) {
          expect(inBox(sheet.front.box, screenFromMm(sheet.front, [extents.y[0], extents.z[0]]))).toBe(true);
          expect(inBox(sheet.front.box, screenFromMm(sheet.front, [extents.y[1], extents.z[1]]))).toBe(true);
        }
      }),
    );
  });

  it('has the nose left, starboard up, and the same x in plan, side and rule', () => {
    const sheet = foldSheet(room, extents);
    const [noseX] = screenFromMm(sheet.plan, [-180, 0]);
    const [tailX, centreY] = screenFromMm(sheet.plan, [520, 0]);
    expect(noseX).toBeLessThan(tailX);
    expect(screenFromMm(sheet.plan, [0, 310])[1]).toBeLessThan(centreY);
    for (const x of [-180, 47, 520]) {
      const [planX] = screenFromMm(sheet.plan, [x, 13]);
      expect(sheet.side && screenFromMm(sheet.side, [x, 29])[0]).toBeCloseTo(planX, 9);
      expect(screenFromMm(sheet.rule, [x, 0])[0]).toBeCloseTo(planX, 9);
    }
    expect(sheet.front && screenFromMm(sheet.front, [222, 17])[1]).toBeCloseTo(
      screenFromMm(sheet.plan, [3, 222])[1],
      9,
    );
  });

  it('refuses a room of no size', () => {
    expect(() => foldSheet({ width: 0, height: 500, insetRight: 0 }, extents)).toThrow(RangeError);
  });
});

describe('zoom and pan', () => {
  it('zooms about the pointer: what lies under it stays there', () => {
    const sheet = foldSheet(room, extents);
    fc.assert(
      fc.property(px, fc.double({ min: 0.25, max: 8, noNaN: true }), (at: Vec2, factor) => {
        const under = mmFromScreen(sheet.plan, at);
        const after = screenFromMm(zoomSheet(sheet, factor, at).plan, under);
        expect(after[0]).toBeCloseTo(at[0], 6);
        expect(after[1]).toBeCloseTo(at[1], 6);
      }),
    );
  });

  it('keeps x shared between plan, side and rule', () => {
    const moved = panSheet(zoomSheet(foldSheet(room, extents), 2.5, [333, 222]), [-41, 77]);
    const [planX] = screenFromMm(moved.plan, [88, 5]);
    expect(moved.side && screenFromMm(moved.side, [88, -9])[0]).toBeCloseTo(planX, 9);
    expect(screenFromMm(moved.rule, [88, 0])[0]).toBeCloseTo(planX, 9);
  });
});
