import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import type { ThrowRow } from '../throwRows';
import { type Column, heading } from './column';
import type { Typefaces } from './fonts';
import { type Lettering, letter, line, lineStyle, shorten } from './ink';
import { fittedLine, HEADING_MM } from './rows';

const words = plan.throws;

const CELL = { face: 'text', capMm: 2 } as const satisfies Lettering;
const HEAD = { face: 'bold', capMm: 1.8 } as const satisfies Lettering;
const SMALL = { face: 'text', capMm: 1.8 } as const satisfies Lettering;
const ROW_MM = 4.6;
/** Column heads with the rule under them. */
const HEADS_MM = 4.6;
const HOW_MM = 5.8;
/** Under a baseline, to the rule between rows. */
const RULE_MM = 1.3;
/** Of the width: what moves, then two ends at each rate. */
const NAME_SHARE = 0.24;
const PAD_MM = 2;

/** Height of the table without its rows. */
export const THROW_TABLE_MM = HEADING_MM + HEADS_MM + HOW_MM;
export const throwTableMm = (rows: number): number => THROW_TABLE_MM + rows * ROW_MM;
/** Rows that a height has room for. */
export const throwRowsIn = (roomMm: number): number => Math.floor((roomMm - THROW_TABLE_MM) / ROW_MM);

/** A surface with a long name loses the end of its name, not what follows it. */
function nameOf(faces: Typefaces, { surface, control }: ThrowRow, widthMm: number): string {
  const room = widthMm - faces.text.width(control, CELL.capMm);
  const name = `${shorten(faces, surface, Math.max(room, 0), CELL)}${control}`;
  return shorten(faces, name, widthMm, CELL);
}

function rowInk(faces: Typefaces, row: ThrowRow, { x, widthMm }: Column, base: number): string[] {
  const first = x + widthMm * NAME_SHARE;
  const cellMm = (widthMm * (1 - NAME_SHARE)) / 4;
  const cell = (text: string, i: number): string =>
    fittedLine(faces, text, { x: first + i * cellMm, widthMm: cellMm - PAD_MM }, base, CELL);
  const low = row.low ?? [words.oneRate];
  return [
    letter(faces, nameOf(faces, row, widthMm * NAME_SHARE - PAD_MM), [x, base], CELL),
    ...low.map((text, i) => cell(text, i)),
    ...row.high.map((text, i) => cell(text, 2 + i)),
  ];
}

/** The throws at both rates, at most so many rows; the last of more counts the rest. */
export function throwTable(
  faces: Typefaces,
  rows: readonly ThrowRow[],
  most: number,
  column: Column,
  top: number,
): { ink: string; top: number } {
  const { x, widthMm } = column;
  const head = heading(faces, words.title, column, top);
  const shown = rows.length > most ? rows.slice(0, Math.max(0, most - 1)) : rows;
  const rest = rows.length - shown.length;
  const cellMm = (widthMm * (1 - NAME_SHARE)) / 4;
  const lowX = x + widthMm * NAME_SHARE;
  const headBase = head.top - HEAD.capMm;
  const from = head.top - HEADS_MM;
  const bases = [...shown, ...(rest > 0 ? [null] : [])].map((_, i) => from - CELL.capMm - i * ROW_MM);
  const end = from - bases.length * ROW_MM;
  const ink = [
    head.ink,
    letter(faces, words.low, [lowX, headBase], HEAD),
    letter(faces, words.high, [lowX + 2 * cellMm, headBase], HEAD),
    lineStyle(0.12),
    ...bases.slice(0, -1).map((base) => line([x, base - RULE_MM], [x + widthMm, base - RULE_MM])),
    ...shown.flatMap((row, i) => rowInk(faces, row, column, bases[i] ?? end)),
    rest > 0 ? letter(faces, fill(plan.build.moreThrows, { count: rest }), [x, bases.at(-1) ?? end], CELL) : '',
    fittedLine(faces, words.how, column, end - SMALL.capMm, SMALL),
  ];
  return { ink: ink.filter(Boolean).join('\n'), top: end - HOW_MM };
}
