import { LINE_STYLES, LINE_TYPE_KINDS } from '@/lib/look/lineTypes';
import { type Segment, segmentsOf } from '../draw/segments';
import type { Drawing, DrawnLine, LineType } from '../drawing';
import type { Typefaces } from './fonts';
import { grey, group, letter, lineStyle, path } from './ink';
import { keepClear } from './keepClear';

/** Segments of every line that must stay one clean line to follow. */
export const cutSegments = (drawing: Drawing): Segment[] =>
  drawing.lines
    .filter(({ type }) => type === 'cut' || type === 'check')
    .flatMap(({ points, closed }) => segmentsOf(points, closed));

/** Content of a drawing in sheet mm. All its pages share it, each through its own window. */
export function sheetContent(drawing: Drawing, faces: Typefaces): string {
  const byType = new Map<LineType, DrawnLine[]>();
  for (const line of drawing.lines) byType.set(line.type, [...(byType.get(line.type) ?? []), line]);
  const cuts = cutSegments(drawing);
  const strokes = LINE_TYPE_KINDS.flatMap((type) => {
    const lines = byType.get(type);
    if (!lines) return [];
    const { widthShare, dash } = LINE_STYLES[type];
    const style = lineStyle(
      drawing.strokeMm * widthShare,
      dash.map((widths) => widths * drawing.strokeMm),
    );
    const whole = type === 'cut' || type === 'check';
    const paths = lines.flatMap((line) =>
      whole ? [path(line.points, line.closed)] : keepClear(line, cuts).map((piece) => path(piece, false)),
    );
    return [style, ...paths];
  });
  const texts = drawing.texts.map((text) => {
    // Texts stand on their middle line, so that a label stays where its room was found at any angle.
    const rad = (text.angleDeg * Math.PI) / 180;
    const down = text.heightMm / 2;
    return letter(faces, text.text, [text.at[0] + Math.sin(rad) * down, text.at[1] - Math.cos(rad) * down], {
      face: text.font === 'mono' ? 'mono' : 'text',
      capMm: text.heightMm,
      align: text.align,
      angleDeg: text.angleDeg,
    });
  });
  return group(grey(0), ...strokes, ...texts);
}
