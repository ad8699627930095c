import type { ViewOutline } from '@/lib/airframe/outlines';
import type { FigureMarks } from '@/lib/figures/types';
import type { Palette } from '@/lib/look/tokens';
import type { Vec2, Vec3 } from '@/lib/numerics/vec';
import type { UnitSystem } from '@/lib/units/quantity';
import { type Box, mmFromScreen, type Sheet, screenFromMm, type View } from './fold';
import { gridStep } from './grid';
import { paintRule } from './paintRule';
import { CHAIN_DASH, cgSign, HIDDEN_DASH, ink, lineBetween, npSign, type Pen, SCORE_DASH, trace, words } from './pen';
import type { Scene } from './scene';

/** Everything one picture is made of. */
export interface Picture {
  readonly sheet: Sheet;
  readonly scene: Scene;
  /** The newest figures' places; those of the scene are of this very frame. */
  readonly marks: FigureMarks | null;
  readonly cg: Vec3 | null;
  readonly selected: string;
  readonly palette: Palette;
  readonly system: UnitSystem;
  readonly labels: PictureLabels;
}

export interface PictureLabels {
  readonly plan: string;
  readonly side: string;
  readonly front: string;
  readonly mac: string;
  readonly cg: string;
  readonly np: string;
  readonly range: string;
  readonly rule: Readonly<Record<UnitSystem, string>>;
}

function clipTo(pen: Pen, { x, y, w, h }: Box, paint: () => void): void {
  pen.save();
  pen.beginPath();
  pen.rect(x, y, w, h);
  pen.clip();
  paint();
  pen.restore();
}

/** Grid lines of one view: whole steps of its own mm. */
function paintGrid(pen: Pen, view: View, { palette, sheet, system }: Picture): void {
  const { stepMm, heavyEvery } = gridStep(sheet.scale, system);
  const { x, y, w, h } = view.box;
  const one = mmFromScreen(view, [x, y]);
  const other = mmFromScreen(view, [x + w, y + h]);
  for (const heavy of [false, true]) {
    pen.beginPath();
    for (const axis of [0, 1] as const) {
      const first = Math.ceil(Math.min(one[axis], other[axis]) / stepMm);
      const last = Math.floor(Math.max(one[axis], other[axis]) / stepMm);
      for (let index = first; index <= last; index += 1) {
        if ((index % heavyEvery === 0) !== heavy) continue;
        const along = index * stepMm;
        const [px, py] = screenFromMm(view, axis === 0 ? [along, 0] : [0, along]);
        const upright = (axis === 0) === (view.matrix[0] !== 0);
        const at = Math.round(upright ? px : py) + 0.5;
        pen.moveTo(upright ? at : x, upright ? y : at);
        pen.lineTo(upright ? at : x + w, upright ? y + h : at);
      }
    }
    pen.globalAlpha = heavy ? 0.9 : 0.45;
    ink(pen, { colour: palette.rule, width: 1 });
  }
  pen.globalAlpha = 1;
}

function paintOutline(pen: Pen, view: View, outline: ViewOutline, { palette, selected }: Picture): void {
  const { kind, closed, points, elementId } = outline;
  const isSelected = elementId === selected && kind !== 'control';
  trace(pen, view, points, closed);
  if (closed) {
    pen.globalAlpha = kind === 'control' ? 0.14 : kind === 'surface' ? 0.82 : 0.5;
    pen.fillStyle = kind === 'control' ? palette.control : kind === 'item' ? palette.mass : palette.paper;
    if (kind === 'item') pen.globalAlpha = 0.18;
    pen.fill();
    pen.globalAlpha = 1;
  }
  const quiet = kind === 'item' || kind === 'drive';
  const colour = kind === 'control' ? palette.control : kind === 'item' ? palette.mass : palette.ink;
  ink(pen, {
    colour: isSelected ? palette.tape : colour,
    width: isSelected ? 2 : quiet ? 1 : 1.4,
    dash: kind === 'drive' ? HIDDEN_DASH : undefined,
  });
}

function paintView(pen: Pen, view: View, outlines: readonly ViewOutline[], label: string, picture: Picture): void {
  clipTo(pen, view.box, () => {
    paintGrid(pen, view, picture);
    for (const outline of outlines) paintOutline(pen, view, outline, picture);
    words(pen, label, [view.box.x + 12, view.box.y + 16], picture.palette.inkSoft);
  });
}

function paintCentreLine(pen: Pen, view: View, colour: string): void {
  const { x, w } = view.box;
  const [, y] = screenFromMm(view, [0, 0]);
  lineBetween(pen, [x, y], [x + w, y], { colour, width: 1, dash: CHAIN_DASH });
}

/** The mean chord where it stands on the plan, both sides, with its quarter point. */
function paintMac(pen: Pen, view: View, { scene, palette, labels }: Picture): void {
  if (scene.mac === null) return;
  const { leXMm, lengthMm, yMm } = scene.mac;
  const stroke = { colour: palette.air, width: 2 };
  for (const y of yMm === 0 ? [0] : [yMm, -yMm]) {
    const from = screenFromMm(view, [leXMm, y]);
    const to = screenFromMm(view, [leXMm + lengthMm, y]);
    const quarter = screenFromMm(view, [leXMm + lengthMm / 4, y]);
    lineBetween(pen, from, to, stroke);
    for (const [x, sy] of [from, to]) lineBetween(pen, [x, sy - 5], [x, sy + 5], stroke);
    lineBetween(pen, [quarter[0], quarter[1] - 8], [quarter[0], quarter[1] + 8], { colour: palette.air, width: 1.5 });
    if (y >= 0) words(pen, labels.mac, [to[0] + 6, to[1]], palette.air);
  }
}

/** CG range along the centre line, neutral point and CG, where the views show them. */
function paintBalancePoints(pen: Pen, view: View, height: (z: number) => number, picture: Picture): void {
  const { cg, marks, palette } = picture;
  const z = cg === null ? 0 : height(cg[2]);
  const at = (x: number): Vec2 => screenFromMm(view, [x, z]);
  if (marks?.cgRangeXMm) {
    const [fore, aft] = marks.cgRangeXMm;
    const [x0, y] = at(fore);
    const [x1] = at(aft);
    pen.globalAlpha = 0.28;
    pen.fillStyle = palette.air;
    pen.fillRect(x0, y - 5, Math.max(x1 - x0, 0), 10);
    pen.globalAlpha = 1;
  }
  if (marks?.neutralPointXMm !== null && marks?.neutralPointXMm !== undefined) {
    npSign(pen, at(marks.neutralPointXMm), 7, palette.air, palette.paper);
  }
  if (cg !== null) cgSign(pen, at(cg[0]), 7, palette.mass, palette.paper);
}

function paintFolds(pen: Pen, { sheet, palette }: Picture): void {
  const stroke = { colour: palette.inkSoft, width: 1, dash: SCORE_DASH };
  const { plan, side, front, rule } = sheet;
  if (side) lineBetween(pen, [0, side.box.y + 0.5], [side.box.w, side.box.y + 0.5], stroke);
  if (front) lineBetween(pen, [front.box.x + 0.5, 0], [front.box.x + 0.5, plan.box.h], stroke);
  lineBetween(pen, [0, rule.box.y + 0.5], [rule.box.w, rule.box.y + 0.5], stroke);
}

/** Draws the whole folded sheet. Reads the picture, changes nothing but the canvas. */
export function paintSheet(pen: Pen, picture: Picture): void {
  const { sheet, scene, palette, labels } = picture;
  pen.lineJoin = 'round';
  pen.lineCap = 'butt';
  paintView(pen, sheet.plan, scene.plan, labels.plan, picture);
  clipTo(pen, sheet.plan.box, () => {
    paintCentreLine(pen, sheet.plan, palette.inkSoft);
    paintMac(pen, sheet.plan, picture);
    paintBalancePoints(pen, sheet.plan, () => 0, picture);
  });
  const { side, front } = sheet;
  if (side) {
    paintView(pen, side, scene.side, labels.side, picture);
    clipTo(pen, side.box, () => paintBalancePoints(pen, side, (z) => z, picture));
  }
  if (front) paintView(pen, front, scene.front, labels.front, picture);
  paintRule(pen, picture);
  paintFolds(pen, picture);
}
