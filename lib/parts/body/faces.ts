import type { Material } from '@/lib/airframe/schema/stock';
import { add3, scale3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { normalOf } from '../shape/frame';
import { heightAt, type Polyline } from '../shape/polyline';
import { cleanRing } from '../shape/ring';
import type { Operation, PartFrame } from '../types';
import { type Shell, shellOf, type Unrolled, unroll } from './unroll';

// The four faces of a box body as flat sheets. Each is bent along one line seen edge on and bounded by two others.

export type BodyFace = 'stbd' | 'port' | 'top' | 'bottom';

/** A face ready to be cut: its outline and folds, and how a place on the body is found on it. */
export interface FacePiece {
  readonly outline: Vec2[];
  readonly folds: readonly Operation[];
  readonly frame: PartFrame;
  readonly unrolled: Unrolled;
  /** Part axes of a place: length along the sheet, place across it. */
  readonly place: (s: number, across: number) => Vec2;
  readonly middle: (x: number) => number;
  readonly low: Polyline;
  readonly high: Polyline;
}

/** A sheer bend this sharp crushes the foam unless it is grooved. Common practice, no source. */
export const MOST_CREASE_DEG = 15;

function foldOperations(shell: Shell, place: FacePiece['place'], material: Material): Operation[] {
  return shell.folds.flatMap(({ sMm, low, high, angleDeg, face }, index): Operation[] => {
    const path = [place(sMm, low), place(sMm, high)];
    const sharp = angleDeg > MOST_CREASE_DEG;
    const kind = sharp && material.kind === 'paperFacedBoard' ? 'cutToPaper' : 'crease';
    const fold: Operation = { id: `fold-${index + 1}`, kind, path, closed: false, face, angleDeg };
    if (!sharp) return [fold];
    const depthMm = material.thicknessMm;
    return [
      fold,
      {
        ...fold,
        id: `fold-${index + 1}-bevel`,
        kind: 'bevel',
        angleDeg: angleDeg / 2,
        depthMm,
        note: texts.notes.foldGroove,
      },
    ];
  });
}

const negated = (line: Polyline): Vec2[] => line.map(([x, y]): Vec2 => [x, -y]);

/**
 * The flat sheet whose outer face follows `outer`. Seen from outside: a side with the nose to the right, top and bottom
 * with the nose up. `origin` is the body's, in the aircraft's axes.
 */
export function facePiece(
  face: Exclude<BodyFace, 'port'>,
  outer: Polyline,
  low: Polyline,
  high: Polyline,
  material: Material,
  origin: Vec3,
): FacePiece {
  const outward = face === 'bottom' ? negated(outer) : outer;
  const unrolled = unroll(outward, material.thicknessMm);
  const shell = shellOf(unrolled, low, high);
  const upright = face === 'stbd';
  const place = (s: number, across: number): Vec2 => (upright ? [0 - s, across] : [across, 0 - s]);
  // Nose corner first, so that the frame is that of the foremost piece; counter-clockwise seen from outside.
  const points = upright
    ? [shell.low[0], ...shell.high, ...[...shell.low].reverse().slice(0, -1)]
    : [...shell.low, ...[...shell.high].reverse()];
  const outline = cleanRing(points.flatMap((p) => (p ? [place(p[0], p[1])] : [])));
  return {
    outline,
    folds: foldOperations(shell, place, material),
    frame: faceFrame(face, outward, material.thicknessMm, origin),
    unrolled,
    place,
    middle: (x) => (heightAt(low, x) + heightAt(high, x)) / 2,
    low,
    high,
  };
}

function faceFrame(face: Exclude<BodyFace, 'port'>, outward: Polyline, thicknessMm: number, origin: Vec3): PartFrame {
  const [a, b] = outward;
  if (!a || !b) throw new RangeError('a body needs two stations');
  const size = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const [c, s] = [(b[0] - a[0]) / size, (b[1] - a[1]) / size];
  const inward = (frame: PartFrame, at: Vec3): PartFrame => ({
    ...frame,
    origin: add3(add3(origin, at), scale3(normalOf(frame), -thicknessMm / 2)),
  });
  switch (face) {
    case 'stbd':
      return inward({ origin, ex: [-c, 0 - s, 0], ey: [0, 0, 1] }, [a[0], a[1], 0]);
    case 'top':
      return inward({ origin, ex: [0, 1, 0], ey: [-c, 0, 0 - s] }, [a[0], 0, a[1]]);
    case 'bottom':
      return inward({ origin, ex: [0, -1, 0], ey: [-c, 0, s] }, [a[0], 0, -a[1]]);
  }
}
