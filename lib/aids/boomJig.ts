import type { ResolvedBoom } from '@/lib/airframe/resolved';
import { lerp3, mirror3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/aids';
import { fill } from '@/lib/text/fill';
import { fixedDigits, trimmedDigits } from '@/lib/units/number';
import { across, markLine, onePiece } from './piece';
import { slotWidthMm } from './slots';
import type { AidSource } from './source';

const words = texts.boomJig;

/** A jig's plates stand off the wing and the tail by this much, and at least this far apart. mm. */
const OFF_MM = 15;
const LEAST_APART_MM = 60;
/** Sheet under the lowest boom and beside the outermost one. mm. */
const UNDER_MM = 35;
const BESIDE_MM = 22;
/** Sheet over the highest boom, so that a band or a strip of tape holds it down. mm. */
const OVER_MM = 3;
/** Between two notches, mm. */
const TOOTH_MM = 10;

/** A boom's axis, and its size across and up. */
interface Axis {
  readonly fore: Vec3;
  readonly aft: Vec3;
  readonly wideMm: number;
  readonly highMm: number;
}

function axesOf({ airframe, resolved }: AidSource): Axis[] {
  const axis = ({ boomId, fore, aft }: ResolvedBoom): Axis[] => {
    const boom = airframe.booms.find(({ id }) => id === boomId);
    const tube = airframe.tubes.find(({ id }) => id === boom?.tubeId);
    if (!boom || !tube || !(aft[0] > fore[0])) return [];
    const [wideMm, highMm] = tube.outerMm;
    const own = { fore, aft, wideMm, highMm };
    return boom.mirrored ? [own, { ...own, fore: mirror3(fore), aft: mirror3(aft) }] : [own];
  };
  return resolved.booms.flatMap(axis);
}

/** Both places along x where a plate can stand: behind the wing and ahead of what the booms carry; null when there is no room for two. */
function platesX({ resolved }: AidSource, axes: readonly Axis[]): readonly [number, number] | null {
  const fore = Math.max(...axes.map((axis) => axis.fore[0]));
  const aft = Math.min(...axes.map((axis) => axis.aft[0]));
  const reach = (role: 'wing' | 'tail') =>
    resolved.surfaces
      .filter(({ surface }) => (surface.role === 'wing') === (role === 'wing'))
      .flatMap(({ panels }) => panels.flatMap(({ root, tip }) => [root, tip]));
  const behind = reach('wing')
    .map(({ te }) => te[0])
    .filter((x) => x < aft);
  const front = Math.max(fore + OFF_MM, ...behind.map((x) => x + OFF_MM));
  const ahead = reach('tail')
    .map(({ le }) => le[0])
    .filter((x) => x > front + OFF_MM);
  const rear = Math.min(aft - OFF_MM, ...ahead.map((x) => x - OFF_MM));
  return rear - front >= LEAST_APART_MM ? [front, rear] : null;
}

/** Where a boom passes a plate, and the notch it needs there. */
interface Notch {
  readonly y: number;
  readonly lowZ: number;
  readonly highZ: number;
  readonly widthMm: number;
}

function notchesAt({ airframe, material }: AidSource, axes: readonly Axis[], x: number): Notch[] {
  const thick = material.thicknessMm;
  return axes
    .map(({ fore, aft, wideMm, highMm }): Notch => {
      const share = (x - fore[0]) / (aft[0] - fore[0]);
      const [, y, z] = lerp3(fore, aft, share);
      // A boom that runs askew takes more room in a plate that stands square.
      const askew = (thick * Math.abs(aft[1] - fore[1])) / (aft[0] - fore[0]);
      return { y, lowZ: z - highMm / 2, highZ: z + highMm / 2, widthMm: slotWidthMm(wideMm + askew, airframe.build) };
    })
    .sort((a, b) => b.y - a.y);
}

const apart = (notches: readonly Notch[]): boolean =>
  notches.every((one, i) => {
    const next = notches[i + 1];
    return !next || one.y - next.y >= (one.widthMm + next.widthMm) / 2 + TOOTH_MM;
  });

interface Plate {
  readonly end: 'front' | 'rear';
  readonly x: number;
  readonly notches: readonly Notch[];
}

function plate(source: AidSource, { end, x, notches }: Plate, benchZ: number, betweenMm: number): Part {
  const top = Math.max(...notches.map(({ highZ }) => highZ)) + OVER_MM - benchZ;
  const ys = notches.map(({ y }) => y);
  const beside = BESIDE_MM + Math.max(...notches.map(({ widthMm }) => widthMm)) / 2;
  const [left, right] = [Math.min(...ys) - beside, Math.max(...ys) + beside];
  const cuts = notches.flatMap(({ y, lowZ, widthMm }): Vec2[] => [
    [y + widthMm / 2, top],
    [y + widthMm / 2, lowZ - benchZ],
    [y - widthMm / 2, lowZ - benchZ],
    [y - widthMm / 2, top],
  ]);
  const gaps = notches.slice(1).map(({ y }, i) => trimmedDigits((notches[i]?.y ?? y) - y, 1));
  const heights = [...new Set(notches.map(({ lowZ }) => fixedDigits(lowZ - benchZ, 1)))];
  const middle = (left + right) / 2;
  return onePiece({
    key: `aid/boom-jig/${end}`,
    name: words[end],
    about: [
      fill(words.apart, { spacing: gaps.join(', ') }),
      fill(words.height, { heights: heights.join(', ') }),
      fill(words.between, { length: fixedDigits(betweenMm, 1) }),
      words.stands,
    ],
    material: source.material,
    outline: [[left, 0], [right, 0], [right, top], ...cuts, [left, top]],
    operations: [
      markLine(
        'middle',
        [
          [middle, 1],
          [middle, 12],
        ],
        words.middle,
        'outer',
      ),
    ],
    frame: across([x, 0, benchZ]),
  });
}

/** Two plates that hold the booms at their spacing and height while they are glued; nothing where fewer than two booms run side by side. */
export function boomJig(source: AidSource): Part[] {
  const axes = axesOf(source);
  if (axes.length < 2) return [];
  const x = platesX(source, axes);
  if (!x) return [];
  const sets = x.map((at) => notchesAt(source, axes, at));
  if (!sets.every(apart)) return [];
  const benchZ = Math.min(...sets.flat().map(({ lowZ }) => lowZ)) - UNDER_MM;
  const ends = ['front', 'rear'] as const;
  return ends.flatMap((end, i) => {
    const [at, notches] = [x[i], sets[i]];
    return at === undefined || !notches ? [] : [plate(source, { end, x: at, notches }, benchZ, x[1] - x[0])];
  });
}
