import type { Vec2 } from '@/lib/numerics/vec';
import { MM_PER_IN } from '@/lib/units/factors';
import { trimmedDigits } from '@/lib/units/number';
import { shown } from '@/lib/units/quantity';
import { type Sheet, screenFromMm } from './fold';
import { type HangingMass, type HungMass, hang, massSquarePx } from './masses';
import type { Picture } from './paintSheet';
import { cgSign, lineBetween, npSign, type Pen, words } from './pen';

/** Heights on the balance rule from its top edge, px. Its sliders, 24 px high, read the same ones: rows of masses keep clear of each other. */
export const RULE_ROWS = { ticks: 0, numbers: 17, bar: 46, hang: [71, 96, 121] } as const;

const TICK_GAP_PX = 64;
const STEPS = [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000] as const;

const ruleX = (sheet: Sheet, xMm: number): number => screenFromMm(sheet.rule, [xMm, 0])[0];

/** Masses closer than this on one row, px, would cover each other. */
const MASS_ROOM_PX = 26;

/** The masses with the row that each hangs on at this zoom. */
export const hungOn = (sheet: Sheet, masses: readonly HangingMass[]): readonly HungMass[] =>
  hang(masses, MASS_ROOM_PX / sheet.scale);

/** Place of a hanging mass on the sheet, px. */
export const hangingAt = (sheet: Sheet, { xMm, row }: HungMass): Vec2 => [
  ruleX(sheet, xMm),
  sheet.rule.box.y + RULE_ROWS.hang[row],
];

/** From this width on, px, the rule has room to say its numbers at its left end. */
const WORDS_FROM_PX = 700;

function paintTicks(pen: Pen, { sheet, palette, system }: Picture): void {
  const unitMm = system === 'metric' ? 1 : MM_PER_IN;
  const wanted = TICK_GAP_PX / (sheet.scale * unitMm);
  const step = STEPS.find((each) => each >= wanted) ?? 1000;
  const { box } = sheet.rule;
  const left = (box.x - sheet.rule.origin[0]) / sheet.scale / unitMm;
  const right = (box.x + box.w - sheet.rule.origin[0]) / sheet.scale / unitMm;
  const minor = step / 5;
  for (let index = Math.ceil(left / minor); index * minor <= right; index += 1) {
    const x = Math.round(ruleX(sheet, index * minor * unitMm)) + 0.5;
    const isMajor = index % 5 === 0;
    lineBetween(pen, [x, box.y], [x, box.y + (isMajor ? 9 : 5)], { colour: palette.inkSoft, width: 1 });
    if (isMajor) words(pen, trimmedDigits(index * minor, 2), [x, box.y + RULE_ROWS.numbers], palette.inkSoft, 'center');
  }
}

/** The CG range: a hard fore edge, and an aft edge that fades as far as the neutral point is uncertain. */
function paintRange(pen: Pen, { sheet, marks, palette }: Picture, y: number): void {
  if (!marks?.cgRangeXMm) return;
  const [fore, aft] = marks.cgRangeXMm;
  const band = marks.neutralPointBandXMm;
  const soft = Math.max(((band ? band[1] - band[0] : 0) / 2) * sheet.scale, 4);
  const x0 = ruleX(sheet, fore);
  const x1 = Math.max(ruleX(sheet, aft), x0 + 1);
  const fade = pen.createLinearGradient(x0, 0, x1 + soft, 0);
  const solidTo = Math.min(Math.max((x1 - soft - x0) / (x1 + soft - x0), 0), 1);
  fade.addColorStop(0, palette.air);
  fade.addColorStop(solidTo, palette.air);
  fade.addColorStop(1, `${palette.air}00`);
  pen.globalAlpha = 0.34;
  pen.fillStyle = fade;
  pen.fillRect(x0, y - 9, x1 + soft - x0, 18);
  pen.globalAlpha = 1;
  lineBetween(pen, [x0, y - 11], [x0, y + 11], { colour: palette.air, width: 2 });
}

function paintMacBar(pen: Pen, { sheet, scene, palette, labels }: Picture, y: number): void {
  if (scene.mac === null) return;
  const { leXMm, lengthMm } = scene.mac;
  const stroke = { colour: palette.air, width: 2 };
  const [x0, xq, x1] = [leXMm, leXMm + lengthMm / 4, leXMm + lengthMm].map((x) => ruleX(sheet, x));
  if (x0 === undefined || xq === undefined || x1 === undefined) return;
  lineBetween(pen, [x0, y], [x1, y], stroke);
  for (const x of [x0, x1]) lineBetween(pen, [x, y - 5], [x, y + 5], stroke);
  lineBetween(pen, [xq, y - 8], [xq, y + 8], { colour: palette.air, width: 1.5 });
  words(pen, labels.mac, [x0 - 6, y], palette.air, 'right');
}

function paintNeutralPoint(pen: Pen, { sheet, marks, palette, labels }: Picture, y: number): void {
  if (!marks || marks.neutralPointXMm === null) return;
  if (marks.neutralPointBandXMm) {
    const [from, to] = marks.neutralPointBandXMm.map((x) => ruleX(sheet, x));
    if (from !== undefined && to !== undefined) {
      lineBetween(pen, [from, y + 12], [to, y + 12], { colour: palette.air, width: 1 });
      for (const x of [from, to]) lineBetween(pen, [x, y + 9], [x, y + 15], { colour: palette.air, width: 1 });
    }
  }
  const x = ruleX(sheet, marks.neutralPointXMm);
  npSign(pen, [x, y], 7, palette.air, palette.paper);
  words(pen, labels.np, [x, y + 24], palette.air, 'center');
}

function paintMasses(pen: Pen, { sheet, scene, palette, selected }: Picture): void {
  for (const mass of hungOn(sheet, scene.masses)) {
    const [x, y] = hangingAt(sheet, mass);
    const side = massSquarePx(mass.massG);
    const colour = mass.elementId === selected ? palette.tape : palette.mass;
    lineBetween(pen, [x, sheet.rule.box.y + RULE_ROWS.bar], [x, y - side / 2], { colour, width: 1 });
    pen.fillStyle = colour;
    pen.fillRect(x - side / 2, y - side / 2, side, side);
  }
}

/** The rule's numbers at its left end, where no mass hangs. */
function paintReadings(pen: Pen, { sheet, marks, cg, palette, system, labels }: Picture): void {
  const { box } = sheet.rule;
  if (box.w < WORDS_FROM_PX) return;
  const mm = (value: number) => shown(value, 'mm', 0, system).number;
  const range = marks?.cgRangeXMm;
  const lines = [
    [labels.rule[system], palette.inkSoft],
    [cg === null ? '' : `${labels.cg} ${mm(cg[0])}`, palette.mass],
    [range ? `${labels.range} ${mm(range[0])}…${mm(range[1])}` : '', palette.air],
    [marks === null || marks.neutralPointXMm === null ? '' : `${labels.np} ${mm(marks.neutralPointXMm)}`, palette.air],
  ] as const;
  for (const [index, [text, colour]] of lines.entries())
    words(pen, text, [box.x + 12, box.y + 44 + index * 19], colour);
}

/** The balance rule at the foot of the sheet. */
export function paintRule(pen: Pen, picture: Picture): void {
  const { sheet, cg, palette, labels } = picture;
  const { box } = sheet.rule;
  const y = box.y + RULE_ROWS.bar;
  pen.save();
  pen.beginPath();
  pen.rect(box.x, box.y, box.w, box.h);
  pen.clip();
  pen.fillStyle = palette.paper;
  pen.fillRect(box.x, box.y, box.w, box.h);
  paintTicks(pen, picture);
  lineBetween(pen, [box.x, y], [box.x + box.w, y], { colour: palette.rule, width: 1 });
  paintReadings(pen, picture);
  paintMasses(pen, picture);
  paintRange(pen, picture, y);
  paintMacBar(pen, picture, y);
  paintNeutralPoint(pen, picture, y);
  if (cg !== null) {
    const x = ruleX(sheet, cg[0]);
    lineBetween(pen, [x, y - 13], [x, y + 13], { colour: palette.mass, width: 1.5 });
    cgSign(pen, [x, y], 7, palette.mass, palette.paper);
    words(pen, labels.cg, [x, y - 16], palette.mass, 'center');
  }
  pen.restore();
}
