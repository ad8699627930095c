// Boxes of labels on a plot in px, x to the right, y down.

export type Anchor = 'start' | 'middle' | 'end';

export interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Mean advance of a letter of the text face at 12 px, rounded up. */
const LETTER_PX = 6.4;
export const LABEL_HEIGHT_PX = 14;

export const widthOf = (text: string): number => text.length * LETTER_PX;

const SHARE_LEFT: Readonly<Record<Anchor, number>> = { start: 0, middle: 0.5, end: 1 };

/** Left and right of a text that hangs at x. */
export function extentAt(x: number, width: number, anchor: Anchor): { readonly left: number; readonly right: number } {
  const left = x - width * SHARE_LEFT[anchor];
  return { left, right: left + width };
}

export const overlap = (a: Box, b: Box): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

type Spot = readonly [x: number, y: number];

/** True when the straight line between two spots enters the box: clipped against its four sides, something is left. */
export function crosses([ax, ay]: Spot, [bx, by]: Spot, { left, right, top, bottom }: Box): boolean {
  let enters = 0;
  let leaves = 1;
  for (const [step, room] of [
    [ax - bx, ax - left],
    [bx - ax, right - ax],
    [ay - by, ay - top],
    [by - ay, bottom - ay],
  ] as const) {
    if (step === 0) {
      if (room < 0) return false;
    } else if (step < 0) enters = Math.max(enters, room / step);
    else leaves = Math.min(leaves, room / step);
  }
  return enters <= leaves;
}
