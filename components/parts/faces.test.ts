import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { LINE_TYPE_KINDS } from '@/lib/look/lineTypes';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Operation } from '@/lib/parts/types';
import { makePart, rectangle } from '@/tests/support/parts';
import { faceDrawing, OPPOSITE, pictureDeg, strokeOf } from './faces';

const operation = (more: Partial<Operation>): Operation => ({
  id: 'line',
  kind: 'crease',
  path: [
    [10, 0],
    [10, 40],
  ],
  closed: false,
  face: 'upper',
  ...more,
});
/** A corner cut off at the upper left, so that the two faces differ. */
const outline: readonly Vec2[] = [
  [0, 0],
  [100, 0],
  [100, 40],
  [20, 40],
  [0, 30],
];
const kindsOf = (part: Parameters<typeof faceDrawing>[0], face: 'upper' | 'lower') =>
  faceDrawing(part, face).lines.map(({ kind }) => kind);

describe('faceDrawing', () => {
  it('shows the face it is drawn on as it is, and the other mirrored left to right', () => {
    const part = makePart('side', outline);
    expect(faceDrawing(part, 'upper').edge).toBe('M0 40L100 40L100 0L20 0L0 10Z');
    expect(faceDrawing(part, 'lower').edge).toBe('M100 40L0 40L0 0L80 0L100 10Z');
  });

  it('mirrors every line with the face', () => {
    const part = makePart('side', outline, { operations: [operation({ face: 'lower' })] });
    expect(faceDrawing(part, 'lower').lines).toEqual([{ kind: 'crease', d: 'M90 40L90 0' }]);
  });

  it('puts each operation on the face it is worked from, and what goes through on both', () => {
    const operations = [
      operation({ id: 'fold' }),
      operation({ id: 'glue', kind: 'glue', face: 'lower' }),
      operation({ id: 'slit', kind: 'cut' }),
      operation({ id: 'pin', kind: 'register', path: [[50, 20]] }),
    ];
    const part = makePart('side', outline, { operations });
    expect(kindsOf(part, 'upper')).toEqual(['cut', 'crease', 'register']);
    expect(kindsOf(part, 'lower')).toEqual(['cut', 'glue', 'register']);
  });

  it('draws a pin as a cross, and lines of a kind as one path', () => {
    const pins = [
      operation({ id: 'a', kind: 'register', path: [[50, 20]] }),
      operation({ id: 'b', kind: 'register', path: [[60, 20]] }),
    ];
    const [lines, ...rest] = faceDrawing(makePart('side', outline, { operations: pins }), 'upper').lines;
    expect(rest).toEqual([]);
    expect(lines?.d).toBe('M47 20h6M50 17v6M57 20h6M60 17v6');
  });

  it('lays a tall part on its side: turned, never mirrored, its back mirrored left to right', () => {
    // A notch at the upper left of a tall part: a quarter turn clockwise brings it to the upper right.
    const tall = makePart('bottom', [
      [0, 0],
      [40, 0],
      [40, 100],
      [10, 100],
      [0, 80],
    ]);
    expect(faceDrawing(tall, 'upper')).toMatchObject({
      widthMm: 100,
      heightMm: 40,
      edge: 'M0 0L0 40L100 40L100 10L80 0Z',
    });
    expect(faceDrawing(tall, 'lower').edge).toBe('M100 0L100 40L0 40L0 10L20 0Z');
    expect([pictureDeg(tall, 90), pictureDeg(tall, null)]).toEqual([0, null]);
    expect(pictureDeg(makePart('side', outline), 90)).toBe(90);
  });

  it('holds openings in its edge and writes a tenth of a millimetre', () => {
    const hole = rectangle(10.04, 10).toReversed();
    const part = makePart('side', rectangle(30, 20), { holes: [hole] });
    expect(faceDrawing(part, 'upper').edge).toBe('M0 20L30 20L30 0L0 0ZM0 10L10 10L10 20L0 20Z');
  });

  it('keeps every point inside the picture, wherever the part lies in its axes', () => {
    const at = fc.double({ min: -900, max: 900, noNaN: true });
    fc.assert(
      fc.property(at, at, fc.constantFrom('upper' as const, 'lower' as const), (dx, dy, face) => {
        const part = makePart(
          'side',
          outline.map(([x, y]): Vec2 => [x + dx, y + dy]),
        );
        const { edge, widthMm, heightMm } = faceDrawing(part, face);
        expect([widthMm, heightMm]).toEqual([100, 40]);
        const numbers = [...edge.matchAll(/([\d.-]+) ([\d.-]+)/g)].map(([, x, y]) => [Number(x), Number(y)]);
        expect(numbers).toHaveLength(outline.length);
        for (const [x = Number.NaN, y = Number.NaN] of numbers) {
          expect(x >= 0 && x <= 100).toBe(true);
          expect(y >= 0 && y <= 40).toBe(true);
        }
      }),
    );
  });
});

it('every face has another behind it', () => {
  for (const face of ['upper', 'lower', 'inner', 'outer'] as const) {
    expect(OPPOSITE[face]).not.toBe(face);
    expect(OPPOSITE[OPPOSITE[face]]).toBe(face);
  }
});

it('no two operations are drawn with the same line', () => {
  const kinds = LINE_TYPE_KINDS.filter((kind) => kind !== 'check');
  const looks = kinds.map((kind) => JSON.stringify(strokeOf(kind)));
  expect(new Set(looks).size).toBe(looks.length);
  expect(strokeOf('crease').strokeDasharray).toBe('15 3.8');
});
