import type { Vec2 } from '@/lib/numerics/vec';

// The folded drafting sheet: plan view with the side view below it on a shared x (nose left), the front view beside it on
// a shared y, and the balance rule at the foot on the same x. One scale for all, so that what lines up on the aircraft
// lines up on the sheet. Views take millimetres in their own axes: plan (x, y), side (x, z), front (y, z).

export interface Box {
  readonly x: number;
  readonly y: number;
  readonly w: number;
  readonly h: number;
}

export type Range = readonly [min: number, max: number];

/** What has to be seen, aircraft axes, mm. */
export interface Extents {
  readonly x: Range;
  readonly y: Range;
  readonly z: Range;
}

/** px = origin + matrix * mm, with the matrix in px per mm, by rows. */
export interface View {
  readonly box: Box;
  readonly origin: Vec2;
  readonly matrix: readonly [number, number, number, number];
}

export interface Sheet {
  readonly width: number;
  readonly height: number;
  /** px per mm. */
  readonly scale: number;
  readonly plan: View;
  readonly side: View | null;
  readonly front: View | null;
  /** Only x counts on the rule. */
  readonly rule: View;
}

export interface SheetRoom {
  readonly width: number;
  readonly height: number;
  /** Width at the right that a docked slip covers, px. */
  readonly insetRight: number;
}

/** Space in px: around the drawing, between views, height of the balance rule. */
export const SHEET_SPACING = { edge: 26, gap: 30, rule: 136 } as const;
/** Below this room, px, a second view would make both too small to work in. */
export const SHEET_LEAST = { frontWidth: 820, sideHeight: 400 } as const;

const length = ([min, max]: Range) => Math.max(max - min, 1);
const middle = ([min, max]: Range) => (min + max) / 2;

/** The mm that are shown at a place on the sheet. */
export function mmFromScreen({ origin, matrix }: View, [px, py]: Vec2): Vec2 {
  const [a, b, c, d] = matrix;
  const determinant = a * d - b * c;
  const dx = px - origin[0];
  const dy = py - origin[1];
  return [(d * dx - b * dy) / determinant, (a * dy - c * dx) / determinant];
}

/** Where a point of the aircraft, in the view's axes, lies on the sheet. */
export function screenFromMm({ origin, matrix }: View, [u, v]: Vec2): Vec2 {
  const [a, b, c, d] = matrix;
  return [origin[0] + a * u + b * v, origin[1] + c * u + d * v];
}

/** True when the place on the sheet lies in the view's box. */
export const inBox = ({ x, y, w, h }: Box, [px, py]: Vec2): boolean => px >= x && px <= x + w && py >= y && py <= y + h;

const upright = (box: Box, originX: number, originY: number, scale: number): View => ({
  box,
  origin: [originX, originY],
  matrix: [scale, 0, 0, -scale],
});

/**
 * Lays the views out so that the extents just fit the room. Throws RangeError when there is no room at all.
 * Side and front view are left out where they would take too much from the plan.
 */
export function foldSheet(room: SheetRoom, extents: Extents): Sheet {
  const { edge, gap, rule } = SHEET_SPACING;
  if (!(room.width > 0 && room.height > 0)) throw new RangeError(`no room for a sheet: ${room.width} x ${room.height}`);
  const upper = Math.max(room.height - rule, 40);
  const usedWidth = Math.max(room.width - room.insetRight, 40);
  const hasSide = room.height >= SHEET_LEAST.sideHeight;
  const hasFront = usedWidth >= SHEET_LEAST.frontWidth;
  const wide = length(extents.x) + (hasFront ? length(extents.z) : 0);
  const tall = length(extents.y) + (hasSide ? length(extents.z) : 0);
  const scale = Math.min(
    Math.max(usedWidth - 2 * edge - (hasFront ? gap : 0), 20) / wide,
    Math.max(upper - 2 * edge - (hasSide ? gap : 0), 20) / tall,
  );

  const sideHeight = hasSide ? length(extents.z) * scale + gap : 0;
  const frontWidth = hasFront ? length(extents.z) * scale + gap + edge : 0;
  const planBox: Box = { x: 0, y: 0, w: usedWidth - frontWidth, h: upper - sideHeight };
  const originX = planBox.w / 2 - middle(extents.x) * scale;
  const planY = planBox.h / 2 + middle(extents.y) * scale;
  const sideBox: Box = { x: 0, y: planBox.h, w: planBox.w, h: sideHeight };
  const frontBox: Box = { x: planBox.w, y: 0, w: frontWidth, h: planBox.h };
  const ruleBox: Box = { x: 0, y: upper, w: usedWidth, h: room.height - upper };
  return {
    width: room.width,
    height: room.height,
    scale,
    plan: upright(planBox, originX, planY, scale),
    side: hasSide ? upright(sideBox, originX, sideBox.y + sideBox.h / 2 + middle(extents.z) * scale, scale) : null,
    front: hasFront
      ? {
          box: frontBox,
          // Folded over the plan's edge: y keeps its height on the sheet, up points away from the plan.
          origin: [frontBox.x + frontBox.w / 2 - middle(extents.z) * scale, planY],
          matrix: [0, scale, -scale, 0],
        }
      : null,
    rule: upright(ruleBox, originX, ruleBox.y + ruleBox.h / 2, scale),
  };
}

/** True when the extents reach past what the sheet shows of the plan. */
export function outgrown(sheet: Sheet, extents: Extents): boolean {
  const corners: readonly Vec2[] = [
    [extents.x[0], extents.y[0]],
    [extents.x[1], extents.y[1]],
  ];
  return corners.some((corner) => !inBox(sheet.plan.box, screenFromMm(sheet.plan, corner)));
}

/** The sheet after a zoom about a place, which keeps its mm. */
export function zoomSheet(sheet: Sheet, factor: number, [px, py]: Vec2): Sheet {
  const scaled = (view: View, at: Vec2): View => {
    const [a, b, c, d] = view.matrix;
    return {
      box: view.box,
      origin: [at[0] + (view.origin[0] - at[0]) * factor, at[1] + (view.origin[1] - at[1]) * factor],
      matrix: [a * factor, b * factor, c * factor, d * factor],
    };
  };
  const { side, front, plan, rule } = sheet;
  // Shared axes stay shared: the side view follows in x and grows about its own middle height, the front view likewise.
  const middleOf = (view: View): Vec2 => [view.box.x + view.box.w / 2, view.box.y + view.box.h / 2];
  return {
    ...sheet,
    scale: sheet.scale * factor,
    plan: scaled(plan, [px, py]),
    side: side && scaled(side, [px, middleOf(side)[1]]),
    front: front && scaled(front, [middleOf(front)[0], py]),
    rule: scaled(rule, [px, middleOf(rule)[1]]),
  };
}

/** The sheet moved under the window by some px; the views keep sharing their axes. */
export function panSheet(sheet: Sheet, [dx, dy]: Vec2): Sheet {
  const moved = (view: View, x: number, y: number): View => ({
    ...view,
    origin: [view.origin[0] + x, view.origin[1] + y],
  });
  return {
    ...sheet,
    plan: moved(sheet.plan, dx, dy),
    side: sheet.side && moved(sheet.side, dx, 0),
    front: sheet.front && moved(sheet.front, 0, dy),
    rule: moved(sheet.rule, dx, 0),
  };
}
