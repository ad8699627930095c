import type { Vec2 } from '@/lib/numerics/vec';

/** What a drag needs of a handle: see `Handle` in lib/airframe/handles. */
export interface Draggable {
  readonly value: number;
  readonly at: Vec2;
  readonly direction: Vec2;
  readonly perMm: number;
}

/** Where on the handle the pointer took hold: pointer less handle, mm. */
export const grip = (pointer: Vec2, handle: Draggable): Vec2 => [pointer[0] - handle.at[0], pointer[1] - handle.at[1]];

/**
 * The value that brings a handle under the pointer, measured from where the handle stands now. It is one Newton step, so a
 * value that moves its handle along a curve (an angle) catches up within a frame or two, and after a stop the handle comes
 * away from it exactly where it met it.
 */
export function follow(pointer: Vec2, offset: Vec2, handle: Draggable): number {
  const along =
    (pointer[0] - offset[0] - handle.at[0]) * handle.direction[0] +
    (pointer[1] - offset[1] - handle.at[1]) * handle.direction[1];
  return handle.value + along * handle.perMm;
}
