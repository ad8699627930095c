import type { Vec2 } from '@/lib/numerics/vec';

/** Handles nearer than this, px, cannot be told apart by a finger or a pointer. */
const ROOM_PX = 25;

const WAYS: readonly Vec2[] = [
  [0, 0],
  [1, 0],
  [0, -1],
  [-1, 0],
  [0, 1],
  [1, -1],
  [1, 1],
  [-1, -1],
  [-1, 1],
];

const near = (a: Vec2, b: Vec2) => Math.abs(a[0] - b[0]) < ROOM_PX && Math.abs(a[1] - b[1]) < ROOM_PX;

/**
 * Shifts in px that keep handles from covering each other: the first stays, a later one on the same spot steps aside.
 * A handle that finds no room within three steps stays where it belongs.
 */
export function spread(places: readonly { readonly id: string; readonly at: Vec2 }[]): ReadonlyMap<string, Vec2> {
  const taken: Vec2[] = [];
  const shifts = new Map<string, Vec2>();
  for (const { id, at } of places) {
    const free = [1, 2, 3]
      .flatMap((step) => WAYS.map(([x, y]): Vec2 => [x * step * ROOM_PX, y * step * ROOM_PX]))
      .find(([dx, dy]) => !taken.some((other) => near(other, [at[0] + dx, at[1] + dy])));
    const shift = free ?? [0, 0];
    shifts.set(id, shift);
    taken.push([at[0] + shift[0], at[1] + shift[1]]);
  }
  return shifts;
}
