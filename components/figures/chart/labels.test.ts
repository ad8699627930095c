import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Box, crosses, extentAt, LABEL_HEIGHT_PX, overlap, widthOf } from './boxes';
import { chartFrame, shareOf } from './frame';
import { lineLabels, NARROWEST } from './labels';
import type { ChartLine, Point } from './lines';
import { type MarkFlag, markFlags } from './marks';

const line = (name: string, ...runs: readonly (readonly Point[])[]): ChartLine => ({
  name,
  runs,
  look: { stroke: 'black', widthPx: 1, dash: '', shape: 'disc' },
});
const frameOf = (lines: readonly ChartLine[], marks: readonly { x: number }[] = []) => {
  const frame = chartFrame(lines, marks);
  if (frame === null) throw new RangeError('nothing to draw');
  return frame;
};

describe('chartFrame', () => {
  it('holds every point and every mark', () => {
    const { x, y } = frameOf(
      [
        line('a', [
          [3, -2],
          [8, 5],
        ]),
      ],
      [{ x: 11 }],
    );
    expect([x.from, x.to]).toEqual([3, 11]);
    expect(y.from).toBeLessThan(-2);
    expect(y.to).toBeGreaterThan(5);
  });
  it('goes down to zero when the lowest value is less than half of the highest, and not otherwise', () => {
    const spread = frameOf([
      line('a', [
        [0, 4],
        [1, 9],
      ]),
    ]);
    const level = frameOf([
      line('a', [
        [0, 7],
        [1, 9],
      ]),
    ]);
    expect(spread.y.from).toBe(0);
    expect(level.y.from).toBeGreaterThan(6);
  });
  it('gives room to a single point and to a level line', () => {
    const { x, y } = frameOf([line('a', [[3, 0]])]);
    expect(x.to).toBeGreaterThan(x.from);
    expect(y.to).toBeGreaterThan(y.from);
    expect(shareOf(y, 0)).toBeGreaterThanOrEqual(0);
    expect(shareOf(y, 0)).toBeLessThanOrEqual(1);
  });
  it('is nothing without a point', () => expect(chartFrame([], [{ x: 3 }])).toBeNull());
});

describe('crosses', () => {
  const box: Box = { left: 10, right: 30, top: 5, bottom: 15 };
  it.each([
    { name: 'through', a: [0, 0], b: [40, 20], hit: true },
    { name: 'inside', a: [12, 7], b: [14, 9], hit: true },
    { name: 'stops before', a: [0, 10], b: [9, 11], hit: false },
    { name: 'passes by a corner', a: [0, 12], b: [12, 22], hit: false },
    { name: 'level, above', a: [0, 2], b: [40, 2], hit: false },
    { name: 'upright, inside', a: [20, 0], b: [20, 40], hit: true },
  ] as const)('$name', ({ a, b, hit }) => expect(crosses(a, b, box)).toBe(hit));
});

describe('lineLabels', () => {
  const boxOf = (name: string, x: number, baselinePx: number, anchor: 'start' | 'middle' | 'end'): Box => ({
    ...extentAt(x * NARROWEST.widthPx, widthOf(name), anchor),
    top: baselinePx + 3 - LABEL_HEIGHT_PX,
    bottom: baselinePx + 3,
  });

  it('writes each name at its own line where there is room', () => {
    const lines = [
      line('low', [
        [0, 1],
        [10, 1],
      ]),
      line('high', [
        [0, 9],
        [10, 9],
      ]),
    ];
    const frame = frameOf(lines);
    const { labels, rest } = lineLabels(lines, frame);
    expect(rest).toEqual([]);
    const [low, high] = labels;
    expect(low?.line.name).toBe('low');
    expect(low?.baselinePx).toBeGreaterThan(high?.baselinePx ?? Number.POSITIVE_INFINITY);
  });
  it('leaves a name to the key when its line is buried among others', () => {
    const crowd = Array.from({ length: 24 }, (_, index) =>
      line(`line ${index}`, [
        [0, index],
        [10, index],
      ]),
    );
    const { labels, rest } = lineLabels(crowd, frameOf(crowd));
    expect(rest.length).toBeGreaterThan(0);
    expect(labels.length + rest.length).toBe(24);
  });
  it('covers no line, no other name and no edge, on a plot of any width', () => {
    const height = fc.double({ min: -20, max: 50, noNaN: true });
    const run = fc.array(height, { minLength: 2, maxLength: 9 });
    fc.assert(
      fc.property(
        fc.array(run, { minLength: 2, maxLength: 5 }),
        fc.integer({ min: 250, max: 900 }),
        (runs, widthPx) => {
          const lines = runs.map((heights, index) =>
            line(
              `line ${index}`,
              heights.map((y, at): Point => [at, y]),
            ),
          );
          const frame = frameOf(lines);
          const { labels } = lineLabels(lines, frame);
          const px = ([x, y]: Point): Point => [
            shareOf(frame.x, x) * widthPx,
            (1 - shareOf(frame.y, y)) * NARROWEST.heightPx,
          ];
          const boxes = labels.map(({ line: { name }, x, baselinePx, anchor }) => {
            const { top, bottom } = boxOf(name, x, baselinePx, anchor);
            const { left, right } = extentAt(x * widthPx, widthOf(name), anchor);
            return { left: left + 0.01, right: right - 0.01, top: top + 0.01, bottom: bottom - 0.01 };
          });
          for (const [index, box] of boxes.entries()) {
            expect(box.left).toBeGreaterThanOrEqual(0);
            expect(box.right).toBeLessThanOrEqual(widthPx);
            expect(boxes.slice(index + 1).some((other) => overlap(other, box))).toBe(false);
            for (const { runs: own } of lines)
              for (const points of own)
                for (const [at, point] of points.entries())
                  if (at > 0) expect(crosses(px(points[at - 1] ?? point), px(point), box)).toBe(false);
          }
        },
      ),
    );
  });
});

describe('markFlags', () => {
  const frame = frameOf([
    line('a', [
      [0, 0],
      [10, 5],
    ]),
  ]);
  const at = (flag: MarkFlag) => ({
    px: flag.x * NARROWEST.widthPx,
    ...extentAt(flag.x * NARROWEST.widthPx, widthOf(flag.label), flag.anchor),
  });
  it('keeps marks that lie apart in the lane on the plot', () => {
    const flags = markFlags(
      [
        { x: 1, label: 'stall' },
        { x: 8, label: 'cruise' },
      ],
      frame,
    );
    expect(flags.map(({ lane }) => lane)).toEqual([0, 0]);
  });
  it('lifts one of two that lie together, and turns back what would leave the plot', () => {
    const flags = markFlags(
      [
        { x: 9.6, label: 'level speed' },
        { x: 9.9, label: 'top speed' },
      ],
      frame,
    );
    expect(new Set(flags.map(({ lane }) => lane)).size).toBe(2);
    for (const flag of flags) expect(at(flag).right).toBeLessThanOrEqual(NARROWEST.widthPx);
  });
  it('lets no name touch another name or the leader of another mark', () => {
    const mark = fc.record({
      x: fc.integer({ min: 0, max: 10 }),
      label: fc.constantFrom('stall', 'glide', 'cruise'),
    });
    fc.assert(
      fc.property(fc.uniqueArray(mark, { minLength: 1, maxLength: 4, selector: ({ x }) => x }), (marks) => {
        const flags = markFlags(marks, frame);
        expect(flags).toHaveLength(marks.length);
        for (const one of flags)
          for (const other of flags) {
            if (one === other) continue;
            if (one.lane === other.lane)
              expect(at(one).left < at(other).right && at(other).left < at(one).right).toBe(false);
            if (one.lane > other.lane)
              expect(at(other).left + 3 < at(one).px && at(one).px < at(other).right - 3).toBe(false);
          }
      }),
    );
  });
  it('tells two marks at one place apart', () => {
    const flags = markFlags(
      [
        { x: 5, label: 'glide' },
        { x: 5, label: 'cruise' },
      ],
      frame,
    );
    expect(flags.map(({ label, x }) => [label, x])).toEqual([
      ['glide', 0.5],
      ['cruise', 0.5],
    ]);
    const [one, other] = flags;
    if (one === undefined || other === undefined) throw new RangeError('a mark went missing');
    const apart = one.lane !== other.lane || at(one).right <= at(other).left || at(other).right <= at(one).left;
    expect(apart).toBe(true);
  });
  it('gives every one of many marks a lane of its own', () => {
    const marks = Array.from({ length: 8 }, (_, index) => ({ x: 5, label: `mark ${index}` }));
    expect(new Set(markFlags(marks, frame).map(({ lane }) => lane)).size).toBe(8);
  });
});
