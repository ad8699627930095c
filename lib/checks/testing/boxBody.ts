import type { Item } from '@/lib/airframe/schema/equipment';
import type { Body } from '@/lib/airframe/schema/fuselage';

/** A straight box 400 mm long and 60 mm square outside, nose at x = 0, its middle on the x axis; 5 mm board leaves 50 mm inside. */
export const straightBody = (over: Partial<Body> = {}): Body => ({
  id: 'body',
  kind: 'box',
  mount: { to: 'datum', at: [0, 0, 0] },
  materialId: 'board',
  stations: [
    { id: 's1', xMm: 0, widthMm: 60, topMm: 30, bottomMm: -30, cornerMm: 0 },
    { id: 's2', xMm: 400, widthMm: 60, topMm: 30, bottomMm: -30, cornerMm: 0 },
  ],
  doublers: [],
  formers: [],
  openings: [],
  ...over,
});

/** A former of the body's own board. */
export const former = (
  id: string,
  xMm: number,
  over: Partial<Body['formers'][number]> = {},
): Body['formers'][number] => ({
  id,
  xMm,
  role: 'former',
  materialId: 'board',
  tiltDeg: [0, 0],
  ...over,
});

/** Something of a size with its middle at a place. */
export const item = (
  id: string,
  kind: Item['kind'],
  [x, y, z]: readonly [number, number, number],
  [length, width, height]: readonly [number, number, number],
  over: Partial<Item> = {},
): Item => ({
  id,
  kind,
  massG: 50,
  sizeMm: [length, width, height],
  mount: { to: 'datum', at: [x, y, z] },
  ...over,
});
