import { LINE_STYLES, LINE_TYPE_KINDS, type LineTypeKind } from '@/lib/look/lineTypes';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Face, Operation, Part } from '@/lib/parts/types';

// A part's two faces as pictures: lines by type, mm to a tenth, x to the right and y down from the upper left.

export const OPPOSITE: Readonly<Record<Face, Face>> = {
  upper: 'lower',
  lower: 'upper',
  inner: 'outer',
  outer: 'inner',
};

/** Half the size of the cross that marks a point to be pinned through, mm. */
const PIN_MM = 3;

export interface FaceDrawing {
  readonly face: Face;
  readonly widthMm: number;
  readonly heightMm: number;
  /** What is cut square through: edge and openings. */
  readonly edge: string;
  /** One path a line type, all its lines together, in the order of the line types. */
  readonly lines: readonly { readonly kind: LineTypeKind; readonly d: string }[];
}

/** What goes through the sheet shows on both faces. */
const showsThrough = ({ kind }: Operation): boolean => kind === 'cut' || kind === 'register';

/** What is seen on a face: what is worked from it, and what goes through. */
const operationsOn = ({ operations }: Part, face: Face): Operation[] =>
  operations.filter((operation) => operation.face === face || showsThrough(operation));

const short = (value: number): number => Math.round(value * 10) / 10 + 0;

type Place = (point: Vec2) => Vec2;

const ring = (points: readonly Vec2[], closed: boolean, place: Place): string =>
  points.length < 2 ? '' : `M${points.map((point) => place(point).map(short).join(' ')).join('L')}${closed ? 'Z' : ''}`;

function linePath({ path, closed }: Operation, place: Place): string {
  const [first] = path;
  if (!first || path.length > 1) return ring(path, closed, place);
  const [x, y] = place(first).map(short);
  return `M${short((x ?? 0) - PIN_MM)} ${y}h${2 * PIN_MM}M${x} ${short((y ?? 0) - PIN_MM)}v${2 * PIN_MM}`;
}

/** Parts taller than this over their width lie on their side in the picture, so that there is something to see. */
const TALL = 1.5;

interface Lie {
  readonly widthMm: number;
  readonly heightMm: number;
  /** Whether the part's y runs to the right in the picture, and not up. */
  readonly turned: boolean;
  /** On the face that the part is drawn on. */
  readonly place: Place;
}

/** How a part lies in its picture. */
function lieOf({ outline }: Pick<Part, 'outline'>): Lie {
  const xs = outline.map(([x]) => x);
  const ys = outline.map(([, y]) => y);
  const [x0, x1, y0, y1] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  return y1 - y0 > TALL * (x1 - x0)
    ? { widthMm: y1 - y0, heightMm: x1 - x0, turned: true, place: ([x, y]) => [y - y0, x - x0] }
    : { widthMm: x1 - x0, heightMm: y1 - y0, turned: false, place: ([x, y]) => [x - x0, y1 - y] };
}

/** A direction of the part's axes in its picture, degrees from level, rising to the right positive; null stays null. */
export const pictureDeg = (part: Pick<Part, 'outline'>, deg: number | null): number | null =>
  deg !== null && lieOf(part).turned ? deg - 90 : deg;

/** A face of a part as it is seen when that face lies up: the one it is drawn on as it is, the other mirrored left to right. */
export function faceDrawing(part: Part, face: Face): FaceDrawing {
  const { widthMm, heightMm, place: own } = lieOf(part);
  const other: Place = (point) => {
    const [x, y] = own(point);
    return [widthMm - x, y];
  };
  const place = face === part.face ? own : other;
  const seen = operationsOn(part, face);
  return {
    face,
    widthMm: short(widthMm),
    heightMm: short(heightMm),
    edge: [part.outline, ...part.holes].map((points) => ring(points, true, place)).join(''),
    lines: LINE_TYPE_KINDS.flatMap((kind) => {
      const d = seen
        .filter((operation) => operation.kind === kind)
        .map((operation) => linePath(operation, place))
        .join('');
      return d === '' ? [] : [{ kind, d }];
    }),
  };
}

/** Width of a cut line on the screen, px. */
const STROKE_PX = 1.25;

/** How a line type is drawn on the screen, in px. */
export function strokeOf(kind: LineTypeKind): { readonly strokeWidth: number; readonly strokeDasharray?: string } {
  const { widthShare, dash } = LINE_STYLES[kind];
  const strokeWidth = short(STROKE_PX * widthShare);
  return dash.length === 0
    ? { strokeWidth }
    : { strokeWidth, strokeDasharray: dash.map((length) => short(length * STROKE_PX)).join(' ') };
}
