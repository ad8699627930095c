import type { Vec2 } from '@/lib/numerics/vec';
import { pointToSegment, type Segment } from '../draw/segments';
import { MARK_REACH_MM, type Mark } from '../tiling/marks';
import type { Typefaces } from './fonts';
import { letter, lineStyle, path } from './ink';
import { keepClear } from './keepClear';

const RING_MM = 1.2;
const STROKE_MM = 0.13;
/** Where the letter's middle may stand, from the mark's own middle. */
const QUARTERS: readonly Vec2[] = [
  [2.4, 2.2],
  [-2.4, 2.2],
  [2.4, -2.2],
  [-2.4, -2.2],
];

const clearance = (at: Vec2, cuts: readonly Segment[]): number =>
  cuts.reduce((least, cut) => Math.min(least, pointToSegment(at, cut)), Infinity);

/** A match mark in sheet mm: a cross with a small ring and its letter in the clearest quarter, all stopping short of cut lines. */
export function matchMark(faces: Typefaces, { at: [x, y], letter: name }: Mark, cuts: readonly Segment[]): string {
  const r = MARK_REACH_MM;
  const ring = Array.from({ length: 24 }, (_, i): Vec2 => {
    const angle = (i / 24) * 2 * Math.PI;
    return [x + RING_MM * Math.cos(angle), y + RING_MM * Math.sin(angle)];
  });
  const strokes: { points: Vec2[]; closed: boolean }[] = [
    {
      points: [
        [x - r, y],
        [x + r, y],
      ],
      closed: false,
    },
    {
      points: [
        [x, y - r],
        [x, y + r],
      ],
      closed: false,
    },
    { points: ring, closed: true },
  ];
  const places = QUARTERS.map(([dx, dy]): Vec2 => [x + dx, y + dy]);
  let place = places[0] ?? [x, y];
  for (const other of places) if (clearance(other, cuts) > clearance(place, cuts) + 1e-9) place = other;
  const capMm = name.length > 1 ? 1.5 : 2;
  return [
    lineStyle(STROKE_MM),
    ...strokes.flatMap((stroke) => keepClear(stroke, cuts).map((piece) => path(piece, false))),
    letter(faces, name, [place[0], place[1] - capMm / 2], { face: 'mono', capMm, align: 'centre' }),
  ].join('\n');
}
