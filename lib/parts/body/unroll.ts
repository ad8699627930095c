import { degFromRad, type Vec2 } from '@/lib/numerics/vec';
import { heightAt, type Polyline } from '../shape/polyline';

// A sheet bent along a line of straight pieces, laid flat again. The line is the sheet's outer face seen edge on:
// x aft, height outward. At each corner the sheet folds about the face that stays whole: the outer face where it bends
// inward, the inner face where it bends outward, so there is nothing to allow for; only where the inner face is kept is
// the sheet longer than the outer line, by thickness times the tangent of half the angle on each side of the fold.

export interface Fold {
  readonly xMm: number;
  /** Length along the sheet. */
  readonly sMm: number;
  readonly angleDeg: number;
  /** The face that closes, and is worked from. */
  readonly face: 'inner' | 'outer';
}

export interface Unrolled {
  readonly folds: readonly Fold[];
  readonly lengthMm: number;
  /** Length along the sheet at an x of the line. */
  readonly sAt: (x: number) => number;
  readonly line: Polyline;
}

/** A bend below this, degrees, is no fold: over a metre it moves the end by less than 0.02 mm. */
const LEAST_FOLD_DEG = 0.001;

/** Lays a bent sheet flat. Throws RangeError when the line does not run aft. */
export function unroll(line: Polyline, thicknessMm: number): Unrolled {
  const pieces = line.slice(1).map((to, index) => {
    const from = line[index] ?? to;
    if (!(to[0] > from[0])) throw new RangeError(`a body line must run aft, got x ${from[0]} then ${to[0]}`);
    return {
      from,
      to,
      lengthMm: Math.hypot(to[0] - from[0], to[1] - from[1]),
      heading: Math.atan2(to[1] - from[1], to[0] - from[0]),
    };
  });
  const folds: Fold[] = [];
  const starts: { x: number; s: number; end: number; from: number; to: number }[] = [];
  let run = 0;
  let before = 0;
  for (const [index, piece] of pieces.entries()) {
    const next = pieces[index + 1];
    const bend = next ? piece.heading - next.heading : 0;
    const after = bend < 0 ? thicknessMm * Math.tan(-bend / 2) : 0;
    starts.push({
      x: piece.from[0],
      s: run + before,
      end: run + before + piece.lengthMm,
      from: piece.from[0],
      to: piece.to[0],
    });
    run += before + piece.lengthMm + after;
    const angleDeg = degFromRad(Math.abs(bend));
    if (next && angleDeg > LEAST_FOLD_DEG) {
      folds.push({ xMm: piece.to[0], sMm: run, angleDeg, face: bend > 0 ? 'inner' : 'outer' });
    }
    before = after;
  }
  const sAt = (x: number): number => {
    const fold = folds.find(({ xMm }) => Math.abs(xMm - x) < 1e-9);
    if (fold) return fold.sMm;
    const piece = starts.find(({ to }) => x <= to) ?? starts.at(-1);
    return piece ? piece.s + ((x - piece.from) / (piece.to - piece.from)) * (piece.end - piece.s) : 0;
  };
  return { folds, lengthMm: run, sAt, line };
}

/** A sheet between two edges that run along it, flat: (length along it, place across it). */
export interface Shell {
  readonly high: Vec2[];
  readonly low: Vec2[];
  readonly folds: readonly (Fold & { readonly low: number; readonly high: number })[];
  readonly unrolled: Unrolled;
}

/** The flat shape of a bent sheet whose edges across it are given at each x. */
export function shellOf(unrolled: Unrolled, low: Polyline, high: Polyline): Shell {
  const from = unrolled.line[0]?.[0] ?? 0;
  const to = unrolled.line.at(-1)?.[0] ?? 0;
  const stops = [...unrolled.line, ...low, ...high].map(([x]) => x).filter((x) => x > from && x < to);
  const xs = [from, ...[...new Set(stops)].sort((a, b) => a - b), to].filter(
    (x, index, all) => index === 0 || x - (all[index - 1] ?? x) > 1e-9,
  );
  const edge = (line: Polyline): Vec2[] => xs.map((x): Vec2 => [unrolled.sAt(x), heightAt(line, x)]);
  return {
    low: edge(low),
    high: edge(high),
    folds: unrolled.folds.map((fold) => ({ ...fold, low: heightAt(low, fold.xMm), high: heightAt(high, fold.xMm) })),
    unrolled,
  };
}

/** The stretch of a line between two x. */
export function stretch(line: Polyline, from: number, to: number): Vec2[] {
  return [
    [from, heightAt(line, from)],
    ...line.filter(([x]) => x > from + 1e-9 && x < to - 1e-9),
    [to, heightAt(line, to)],
  ];
}
