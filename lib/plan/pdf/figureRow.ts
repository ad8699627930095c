import { plan } from '@/lib/text/en/plan';
import type { CardFigure } from '../cardFigures';
import type { Typefaces } from './fonts';
import { letter, shorten, wrap } from './ink';
import type { Frame } from './map';
import { fittedLine } from './rows';

const NAME = { face: 'text', capMm: 1.9 } as const;
const UNIT = { face: 'text', capMm: 2.6 } as const;
const VALUE = { face: 'mono', capMm: 4.6 } as const;
const NO_VALUE = { face: 'mono', capMm: 2.4 } as const;
const UNIT_GAP_MM = 1.4;
const NOTE_MM = 3.5;
const MOST_NOTES = 3;
/** Between neighbours. */
const GUTTER_MM = 4;
export const FIGURE_ROW_MM = 23;

/** Notes in lines, each begun anew; what there is no room for ends in an ellipsis. */
function noteLines(faces: Typefaces, notes: readonly string[], widthMm: number): string[] {
  const lines = notes.flatMap((note) => wrap(faces, note, widthMm, NAME));
  if (lines.length <= MOST_NOTES) return lines;
  const last = lines.slice(MOST_NOTES - 1).join(' ');
  return [...lines.slice(0, MOST_NOTES - 1), shorten(faces, last, widthMm, NAME)];
}

function figureInk(faces: Typefaces, figure: CardFigure, x: number, top: number, widthMm: number): string[] {
  const { name, value, unit, notes } = figure;
  const base = top - 8.6;
  const valueMm = widthMm - UNIT_GAP_MM - faces.text.width(unit, UNIT.capMm);
  return [
    letter(faces, shorten(faces, name, widthMm, NAME), [x, top - 2], NAME),
    ...(value === null
      ? [letter(faces, plan.cover.notKnown, [x, base], NO_VALUE)]
      : [
          fittedLine(faces, value, { x, widthMm: valueMm }, base, VALUE),
          letter(faces, unit, [x + Math.min(valueMm, faces.mono.width(value, VALUE.capMm)) + UNIT_GAP_MM, base], UNIT),
        ]),
    ...noteLines(faces, notes, widthMm).map((line, i) => letter(faces, line, [x, top - 12.4 - i * NOTE_MM], NAME)),
  ];
}

/** Figures side by side from the top of a frame down, each with its notes under it. */
export function figureRow(faces: Typefaces, figures: readonly CardFigure[], frame: Frame): string {
  const shares = figures.reduce((sum, { share }) => sum + share, 0);
  let x = frame.x;
  const ink = figures.flatMap((figure) => {
    const w = (frame.w * figure.share) / shares;
    const made = figureInk(faces, figure, x, frame.y + frame.h, w - GUTTER_MM);
    x += w;
    return made;
  });
  return ink.filter(Boolean).join('\n');
}
