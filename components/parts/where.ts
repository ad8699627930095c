import type { ViewOutline } from '@/lib/airframe/outlines';
import type { Vec2 } from '@/lib/numerics/vec';
import { fromPart } from '@/lib/parts/shape/frame';
import type { Part } from '@/lib/parts/types';
import { type Frame, frameAround, pathData } from '../thumbnail/frame';
import { inDrawingOrder } from '../thumbnail/outline';
import type { Fellows } from './elements';

// The plan view as pieces that are drawn once on the page and shown in many small pictures.

export interface PlanPiece {
  /** Id of the piece on the page. */
  readonly id: string;
  readonly key: string;
  readonly side: ViewOutline['side'];
  readonly d: string;
}

export interface PlanSprite {
  readonly frame: Frame;
  readonly pieces: readonly PlanPiece[];
}

/** The plan view in pieces, one an element and side; null when there is nothing to draw. */
export function planSprite(outlines: readonly ViewOutline[]): PlanSprite | null {
  const frame = frameAround(
    outlines.map(({ points }) => points),
    0.06,
  );
  if (frame === null) return null;
  const paths = new Map<string, Omit<PlanPiece, 'id'>>();
  for (const { key, side, points, closed } of inDrawingOrder(outlines)) {
    const name = `${key} ${side}`;
    paths.set(name, { key, side, d: `${paths.get(name)?.d ?? ''}${pathData(frame, points, closed)}` });
  }
  return { frame, pieces: [...paths.values()].map((piece, index) => ({ id: `where-${index}`, ...piece })) };
}

const onSides = (pieces: readonly PlanPiece[], sides: readonly Part['side'][]): PlanPiece[] => {
  const own = pieces.filter(({ side }) => side === 'centre' || sides.includes('centre') || sides.includes(side));
  return own.length > 0 ? own : [...pieces];
};

/** Where a drawing's parts go: the pieces of the plan that are filled, and a place inside them where that says too little. */
export interface Where {
  readonly pieces: readonly string[];
  /** Aircraft mm. */
  readonly at: Vec2 | null;
}

export const NOWHERE: Where = { pieces: [], at: null };

/** Middle of a part's box in the plan view; a folded part lies as the piece that holds its first corner. */
function middleOf({ outline, frame }: Part): Vec2 {
  const middle = (values: readonly number[]): number => (Math.min(...values) + Math.max(...values)) / 2;
  const [x, y] = fromPart(frame, [middle(outline.map(([u]) => u)), middle(outline.map(([, v]) => v))]);
  return [x, y];
}

/** The control itself where it is one, else the whole element on the parts' sides; a former or a doubler with its place in the body. */
export function whereOf({ part, mirrored }: Fellows, owner: string, sprite: PlanSprite): Where {
  const keyed = (key: string) => sprite.pieces.filter((piece) => piece.key === key);
  const control = keyed(`${owner}/${part.elementId}`);
  const whole = control.length > 0 ? control : keyed(owner);
  const inside = part.elementId !== owner && control.length === 0;
  return {
    pieces: onSides(whole, [part.side, ...mirrored.map(({ side }) => side)]).map(({ id }) => id),
    at: inside ? middleOf(part) : null,
  };
}
