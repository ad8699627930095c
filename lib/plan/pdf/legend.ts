import { LINE_STYLES, LINE_TYPE_KINDS } from '@/lib/look/lineTypes';
import { plan } from '@/lib/text/en/plan';
import type { Drawing, LineType } from '../drawing';
import type { Column } from './column';
import type { Typefaces } from './fonts';
import { letter, line, lineStyle } from './ink';

/** Line types that occur in the drawings, in the order of the legend. */
export function usedLineTypes(drawings: readonly Drawing[]): LineType[] {
  const used = new Set(drawings.flatMap(({ lines }) => lines.map(({ type }) => type)));
  return LINE_TYPE_KINDS.filter((type) => used.has(type));
}

const SAMPLE_MM = 26;
const STEP_MM = 5.4;

/** A sample of each line type used, at its true width and dashes, with what it asks for. */
export function legend(faces: Typefaces, drawings: readonly Drawing[], { x }: Column, top: number): string {
  const strokeMm = drawings[0]?.strokeMm ?? 0.2;
  return usedLineTypes(drawings)
    .flatMap((type, i) => {
      const y = top - 2 - i * STEP_MM;
      const { widthShare, dash } = LINE_STYLES[type];
      return [
        lineStyle(
          strokeMm * widthShare,
          dash.map((widths) => widths * strokeMm),
        ),
        line([x, y], [x + SAMPLE_MM, y]),
        letter(faces, plan.lines[type], [x + SAMPLE_MM + 3, y - 1], { face: 'text', capMm: 2 }),
      ];
    })
    .join('\n');
}
