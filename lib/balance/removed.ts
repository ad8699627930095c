import type { Material } from '@/lib/airframe/schema/stock';
import { edges, signedArea } from '@/lib/geometry/polygons';
import { SAME_POINT_MM } from '@/lib/numerics/tolerances';
import { add3, radFromDeg, scale3, type Vec2 } from '@/lib/numerics/vec';
import type { Facet } from '@/lib/parts/shape/facets';
import { fromPart, normalOf } from '@/lib/parts/shape/frame';
import { type Ring, turnOf } from '@/lib/parts/shape/ring';
import type { Operation, Part } from '@/lib/parts/types';
import { facetAt } from './facetAt';
import { type Piece, rodPiece } from './piece';

// Foam and paper that work on a sheet takes away without parting it: bevels, channels, foam out, paper off. Openings and gaps are
// cut into the outline already. What a knife or wire turns to dust (the kerf) is not counted.

/** What is taken away along a line: g per mm of it, how deep the middle of it lies below the worked face, how far beside the line. */
interface Strip {
  readonly gPerMm: number;
  readonly depthMm: number;
  readonly asideMm: number;
}

interface Sheet {
  readonly coreGPerMm3: number;
  readonly faceGPerMm2: number;
  readonly thicknessMm: number;
}

const sheetOf = ({ arealMassGm2, facesGm2, thicknessMm }: Material): Sheet => ({
  coreGPerMm3: (arealMassGm2 - facesGm2) / 1e6 / thicknessMm,
  faceGPerMm2: facesGm2 / 2 / 1e6,
  thicknessMm,
});

/** How far the sheet reaches to either side of the line from a to b, mm. */
function reach(outline: Ring, a: Vec2, b: Vec2): readonly [left: number, right: number] {
  const size = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const off = outline.map((p) => turnOf(a, b, p) / size);
  return [Math.max(0, ...off), Math.max(0, ...off.map((d) => -d))];
}

/** A bevel takes a triangle as wide as the blade leans over its depth, and the paper of the worked face over that width; no more than the sheet reaches. */
function bevelStrip({ angleDeg = 0, depthMm }: Operation, sheet: Sheet, outline: Ring, a: Vec2, b: Vec2): Strip {
  const depth = Math.min(depthMm ?? sheet.thicknessMm, sheet.thicknessMm);
  const slope = Math.tan(radFromDeg(Math.min(angleDeg, 89)));
  const [left, right] = reach(outline, a, b);
  const wide = depth * slope;
  const width = Math.min(wide, Math.max(left, right));
  const section = wide > 0 ? width * depth * (1 - width / (2 * wide)) : 0;
  // On an edge the sheet lies to one side only, and the triangle with it; inside a sheet the groove is about its line.
  const onEdge = Math.min(left, right) < SAME_POINT_MM;
  return {
    gPerMm: section * sheet.coreGPerMm3 + width * sheet.faceGPerMm2,
    depthMm: depth / 3,
    asideMm: onEdge ? ((left > right ? 1 : -1) * width) / 3 : 0,
  };
}

/** Whether a bevel is one half of the groove that a fold closes: it lies on the fold's own line and leans by half of its angle. */
function isFoldGroove(bevel: Operation, operations: readonly Operation[]): boolean {
  return operations.some(
    ({ kind, path, angleDeg = 0 }) =>
      (kind === 'crease' || kind === 'cutToPaper') &&
      Math.abs(Math.abs(angleDeg) - 2 * (bevel.angleDeg ?? 0)) < 1e-9 &&
      path.length === bevel.path.length &&
      path.every(([x, y], index) => x === bevel.path[index]?.[0] && y === bevel.path[index]?.[1]),
  );
}

/** What one operation takes along a stretch of its path, or null when it takes nothing away. */
function stripOf(operation: Operation, part: Part, sheet: Sheet, a: Vec2, b: Vec2): Strip | null {
  const { kind, widthMm = 0, depthMm = sheet.thicknessMm } = operation;
  switch (kind) {
    case 'bevel': {
      const strip = bevelStrip(operation, sheet, part.outline, a, b);
      return isFoldGroove(operation, part.operations) ? { ...strip, gPerMm: 2 * strip.gPerMm } : strip;
    }
    case 'foamOut': {
      const gPerMm = widthMm * (depthMm * sheet.coreGPerMm3 + sheet.faceGPerMm2);
      return { gPerMm, depthMm: depthMm / 2, asideMm: 0 };
    }
    case 'paperOff':
      return { gPerMm: widthMm * sheet.faceGPerMm2, depthMm: 0, asideMm: 0 };
    case 'cut':
    case 'cutToPaper':
    case 'crease':
    case 'glue':
    case 'tape':
    case 'reference':
    case 'register':
      return null;
  }
}

/** Mass taken from within a closed path, g; 0 for work along a line. */
function areaMass({ kind, closed, path, depthMm }: Operation, sheet: Sheet): number {
  if (!closed || (kind !== 'foamOut' && kind !== 'paperOff')) return 0;
  const core = kind === 'foamOut' ? (depthMm ?? sheet.thicknessMm) * sheet.coreGPerMm3 : 0;
  return Math.abs(signedArea(path)) * (core + sheet.faceGPerMm2);
}

/** What one operation takes away, as pieces of negative mass where the folds bring them. */
function takenBy(operation: Operation, part: Part, sheet: Sheet, facets: readonly Facet[]): Piece[] {
  const { path, closed, face } = operation;
  const stretches = closed ? edges(path) : edges(path).slice(0, -1);
  const whole = areaMass(operation, sheet);
  const around = stretches.reduce((sum, [a, b]) => sum + Math.hypot(b[0] - a[0], b[1] - a[1]), 0);
  return stretches.flatMap(([a, b]): Piece[] => {
    const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
    if (length === 0) return [];
    const strip =
      whole > 0 ? { gPerMm: whole / around, depthMm: 0, asideMm: 0 } : stripOf(operation, part, sheet, a, b);
    if (!strip || strip.gPerMm === 0) return [];
    const [ux, uy] = [(b[0] - a[0]) / length, (b[1] - a[1]) / length];
    const aside = ([x, y]: Vec2): Vec2 => [x - uy * strip.asideMm, y + ux * strip.asideMm];
    const { frame } = facetAt(facets, aside([(a[0] + b[0]) / 2, (a[1] + b[1]) / 2]));
    const height = (face === part.face ? 1 : -1) * (sheet.thicknessMm / 2 - strip.depthMm);
    const place = (p: Vec2) => add3(fromPart(frame, aside(p)), scale3(normalOf(frame), height));
    return [rodPiece(-strip.gPerMm * length, place(a), place(b))];
  });
}

/**
 * Foam and paper that bevels, channels, foam out and paper off take from a part, as pieces of negative mass: triangles and strips
 * along the paths by the core's and the face's own mass. Within a closed path the mass is taken off evenly along the path.
 */
export function removedPieces(part: Part, material: Material, facets: readonly Facet[]): Piece[] {
  const sheet = sheetOf(material);
  return part.operations.flatMap((operation) => takenBy(operation, part, sheet, facets));
}
