import { describe, expect, it } from 'vitest';
import type { Part } from './types';
import { assertPart, assertParts } from './validate';

const part = (over: Partial<Part> = {}): Part => ({
  key: 'wing/p1/sheet/stbd',
  name: 'Wing',
  elementId: 'wing',
  side: 'stbd',
  materialId: 'board',
  thicknessMm: 5,
  face: 'upper',
  outline: [
    [0, 0],
    [90, 10],
    [80, 60],
    [5, 70],
  ],
  holes: [],
  operations: [],
  labels: [],
  grainDeg: null,
  frame: { origin: [0, 0, 0], ex: [0, 1, 0], ey: [-1, 0, 0] },
  ...over,
});

describe('assertPart', () => {
  it('accepts a part that can be cut, with a hole that runs clockwise', () => {
    const holes = [
      [
        [30, 30],
        [30, 40],
        [45, 40],
        [45, 30],
      ],
    ] satisfies [number, number][][];
    expect(() => assertPart(part({ holes }))).not.toThrow();
  });

  it.each([
    { name: 'a clockwise outline', over: { outline: [...part().outline].reverse() }, says: 'clockwise' },
    { name: 'two points', over: { outline: part().outline.slice(0, 2) }, says: 'needs 3 points' },
    {
      name: 'a repeated point',
      over: { outline: [...part().outline, part().outline[0] ?? [0, 0]] },
      says: 'repeats the point',
    },
    {
      name: 'a crossing',
      over: {
        outline: [
          [0, 0],
          [90, 60],
          [90, 0],
          [0, 50],
        ],
      },
      says: 'crosses itself',
    },
    {
      name: 'an edge that touches another',
      over: {
        outline: [
          [0, 0],
          [90, 0],
          [90, 60],
          [40, 0],
          [0, 60],
        ],
      },
      says: 'crosses itself',
    },
    {
      name: 'a number that is none',
      over: {
        outline: [
          [0, 0],
          [90, Number.NaN],
          [80, 60],
        ],
      },
      says: 'finite',
    },
    {
      name: 'a counter-clockwise hole',
      over: {
        holes: [
          [
            [30, 30],
            [45, 30],
            [45, 40],
            [30, 40],
          ],
        ],
      },
      says: 'hole 0',
    },
    {
      name: 'a hole over the edge',
      over: {
        holes: [
          [
            [70, 30],
            [70, 40],
            [95, 40],
            [95, 30],
          ],
        ],
      },
      says: 'leaves the part',
    },
    {
      name: 'an operation off the sheet',
      over: {
        operations: [
          {
            id: 'x',
            kind: 'crease',
            path: [
              [10, 10],
              [200, 10],
            ],
            closed: false,
            face: 'upper',
          },
        ],
      },
      says: 'leaves the part',
    },
    {
      name: 'a label off the sheet',
      over: { labels: [{ at: [200, 0], text: 'Wing', heightMm: 4, angleDeg: 0 }] },
      says: 'lies off the part',
    },
    {
      name: 'a frame that is not square',
      over: { frame: { origin: [0, 0, 0], ex: [0, 1, 0], ey: [-1, 0.01, 0] } },
      says: 'square',
    },
    { name: 'a key without a side', over: { key: 'wing/p1/sheet' }, says: 'part key' },
    { name: 'the key of another side', over: { side: 'port' }, says: 'side port' },
    { name: 'no thickness', over: { thicknessMm: 0 }, says: 'thickness' },
  ] satisfies { name: string; over: Partial<Part>; says: string }[])('refuses $name', ({ over, says }) => {
    expect(() => assertPart(part(over))).toThrow(RangeError);
    expect(() => assertPart(part(over))).toThrow(says);
  });

  it('refuses the same key twice', () => {
    expect(() => assertParts([part(), part()])).toThrow('share a key');
  });
});
