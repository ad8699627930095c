import {
  Colors,
  DxfWriter,
  LWPolylineFlags,
  point2d,
  point3d,
  TextHorizontalAlignment,
  TextVerticalAlignment,
  Units,
} from '@tarikjabiri/dxf';
import { LINE_TYPE_KINDS, type LineTypeKind } from '@/lib/look/lineTypes';
import type { Drawing } from '../drawing';

// One sheet as ASCII DXF (AC1021): millimetres, one layer an operation, every stroke in one colour.

/** Layer of each operation: plain capitals, which every reader accepts. */
export const LAYERS: Readonly<Record<LineTypeKind, string>> = {
  cut: 'CUT_THROUGH',
  cutToPaper: 'CUT_TO_FAR_PAPER',
  crease: 'CREASE',
  bevel: 'BEVEL',
  paperOff: 'PAPER_OFF',
  foamOut: 'FOAM_OUT',
  glue: 'GLUE',
  tape: 'TAPE',
  reference: 'PLACE_LINES',
  register: 'REGISTER',
  sheetEdge: 'SHEET_EDGE',
  check: 'TEST_SQUARE',
};
const TEXT_LAYER = 'NAMES';
const ALIGNMENT = {
  left: TextHorizontalAlignment.Left,
  centre: TextHorizontalAlignment.Center,
  right: TextHorizontalAlignment.Right,
} as const;

/** A DXF text is one line; a caret would begin a control code and a percent pair a symbol, so neither passes. */
const plainText = (text: string): string => text.replaceAll(/[\p{Cc}^]/gu, ' ').replaceAll('%%', '%');

const round = (value: number): number => Math.round(value * 1e4) / 1e4 + 0;

/** The drawing as DXF text: closed outlines as closed LWPOLYLINE, sheet origin at the lower left. The same input gives the same text. */
export function writeDxf(drawing: Drawing): string {
  const dxf = new DxfWriter();
  dxf.setUnits(Units.Millimeters);
  dxf.setVariable('$LASTSAVEDBY', { 1: 'Foldspar' });
  const used = LINE_TYPE_KINDS.filter((kind) => drawing.lines.some(({ type }) => type === kind));
  for (const kind of used) dxf.addLayer(LAYERS[kind], Colors.White, 'Continuous');
  dxf.addLayer(TEXT_LAYER, Colors.White, 'Continuous');
  for (const { type, points, closed } of drawing.lines) {
    const vertices = points.map(([x, y]) => ({ point: point2d(round(x), round(y)) }));
    const flags = closed ? LWPolylineFlags.Closed : LWPolylineFlags.None;
    dxf.addLWPolyline(vertices, { flags, layerName: LAYERS[type] });
  }
  for (const { at, text, heightMm, angleDeg, align } of drawing.texts) {
    const place = point3d(round(at[0]), round(at[1]));
    dxf.addText(place, round(heightMm), plainText(text), {
      layerName: TEXT_LAYER,
      rotation: round(angleDeg),
      horizontalAlignment: ALIGNMENT[align],
      verticalAlignment: TextVerticalAlignment.Middle,
      // A text that is not aligned at its left foot stands on its second point.
      secondAlignmentPoint: place,
    });
  }
  // The key stands beside the sheet, where no cutter goes.
  drawing.key.forEach(({ mark, text }, i) => {
    const words = plainText(mark === null ? text : `${mark} = ${text}`);
    const at = point3d(round(drawing.sheetMm[0] + 10), round(drawing.sheetMm[1] - 5 - 5 * i));
    dxf.addText(at, 2.5, words, { layerName: TEXT_LAYER });
  });
  return dxf.stringify();
}
