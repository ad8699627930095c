import { degFromRad, dot3, radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/foldedParts';
import type { Operation } from '../../types';
import { LEAST_BEVEL_DEG } from '../joint';
import { type Face, inSpace, type Line, lineNamed, onFlat, type Shell } from './shell';

// The ends of a skin. A panel ends in one plane, which leans differently against each face of the skin: each edge is bevelled to it.

type End = 'root' | 'tip';

export interface Edging {
  /** Whether the edges of this end are bevelled to its plane; a free or butted end is cut square. */
  readonly root: boolean;
  readonly tip: boolean;
}

/** How the end's plane leans from square to a sheet with this outward normal, degrees: positive leaves its inner face the longer one. */
const leanDeg = (normal: Face['normal'], plane: Shell['ends']['root']): number =>
  degFromRad(Math.asin(Math.max(-1, Math.min(1, dot3(normal, plane.normal)))));

const isCut = (lean: number): boolean => Math.abs(lean) >= LEAST_BEVEL_DEG;

/** How far the sheet's longer face reaches past the outer one, square to the edge, mm. */
const reachMm = (lean: number, thicknessMm: number): number =>
  isCut(lean) && lean > 0 ? thicknessMm * Math.tan((lean * Math.PI) / 180) : 0;

const outerCorner = (line: Line, end: End): Vec2 => onFlat(line, end === 'root' ? line.from : line.to);

/** How far a corner moves along its line for one face's edge to reach as far as its bevel needs. */
function slide(shell: Shell, face: Face, line: Line, end: End): number {
  const reach = reachMm(leanDeg(face.normal, shell.ends[end]), shell.thicknessMm);
  if (reach === 0) return 0;
  const [a, b] = [outerCorner(face.aft, end), outerCorner(face.fore, end)];
  const along: Vec2 = [line.flatTip[0] - line.flatRoot[0], line.flatTip[1] - line.flatRoot[1]];
  const turn = along[0] * (b[1] - a[1]) - along[1] * (b[0] - a[0]);
  const sine = Math.abs(turn) / (Math.hypot(...along) * Math.hypot(b[0] - a[0], b[1] - a[1]));
  return reach / sine;
}

/**
 * Where a line ends on the flat sheet: as far as the longer face of the edges on both its sides. The nose stays: there the foam is
 * bevelled away, and the outer face is all there is.
 */
export function cornerOf(shell: Shell, line: Line, end: End, bevelled: boolean): Vec2 {
  const at = outerCorner(line, end);
  if (!bevelled || line.name === 'nose') return at;
  const beside = shell.faces.filter(({ aft, fore }) => aft === line || fore === line);
  const mm = beside.reduce((sum, face) => sum + slide(shell, face, line, end), 0) / beside.length;
  const size = Math.hypot(line.flatTip[0] - line.flatRoot[0], line.flatTip[1] - line.flatRoot[1]);
  const sign = end === 'root' ? -1 : 1;
  const [ux, uy] = [(line.flatTip[0] - line.flatRoot[0]) / size, (line.flatTip[1] - line.flatRoot[1]) / size];
  return [at[0] + ux * mm * sign, at[1] + uy * mm * sign];
}

/** Faces of the shell between some of its lines, aft first. */
const facesBetween = (shell: Shell, lines: readonly Line[]): Face[] =>
  shell.faces.filter(({ aft, fore }) => lines.includes(aft) && lines.includes(fore));

/** Where the bevel of the leading edge begins to thin the foam, on one face's edge and as far out as that edge's longer face reaches. */
function thinningFrom(shell: Shell, face: Face, end: End): Vec2 | null {
  const nose = face.fore.name === 'nose' ? face.fore : face.aft;
  const lean = leanDeg(face.normal, shell.ends[end]);
  if (nose.name !== 'nose' || !isCut(lean) || lean < 0) return null;
  const other = nose === face.fore ? face.aft : face.fore;
  const [a, b] = [outerCorner(nose, end), outerCorner(other, end)];
  const along: Vec2 = [nose.flatTip[0] - nose.flatRoot[0], nose.flatTip[1] - nose.flatRoot[1]];
  const away = Math.abs(along[0] * (b[1] - a[1]) - along[1] * (b[0] - a[0])) / Math.hypot(...along);
  const share = noseWidthMm(shell) / away;
  if (share >= 1) return null;
  const size = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const reach = reachMm(lean, shell.thicknessMm) * (end === 'root' ? -1 : 1);
  const side = b[1] > a[1] ? 1 : -1;
  // Square to the edge, away from the panel: out along x.
  const out: Vec2 = [((b[1] - a[1]) / size) * side, (-(b[0] - a[0]) / size) * side];
  return [a[0] + (b[0] - a[0]) * share + out[0] * reach, a[1] + (b[1] - a[1]) * share + out[1] * reach];
}

/** One end of the skin between some lines as it is cut, from the aft line on. */
export function endPath(shell: Shell, lines: readonly Line[], end: End, bevelled: boolean): Vec2[] {
  const faces = facesBetween(shell, lines);
  return lines.flatMap((line): Vec2[] => {
    const corner = cornerOf(shell, line, end, bevelled);
    const face = faces.find(({ aft }) => aft === line);
    const thinning = bevelled && face ? thinningFrom(shell, face, end) : null;
    return thinning ? [corner, thinning] : [corner];
  });
}

/** Bevels along one end of the faces between some lines. Where the leading edge thins the foam, the bevel runs out with it. */
export function edgeBevels(shell: Shell, lines: readonly Line[], end: End, bevelled: boolean): Operation[] {
  if (!bevelled) return [];
  const { thicknessMm } = shell;
  return facesBetween(shell, lines).flatMap((face): Operation[] => {
    const lean = leanDeg(face.normal, shell.ends[end]);
    if (!isCut(lean)) return [];
    const corners: [Vec2, Vec2] = [cornerOf(shell, face.aft, end, true), cornerOf(shell, face.fore, end, true)];
    const bevel = (id: string, path: readonly Vec2[], depthMm: number): Operation => ({
      id: `${end}-bevel-${face.aft.name}${id}`,
      kind: 'bevel',
      path,
      closed: false,
      face: lean > 0 ? 'outer' : 'inner',
      angleDeg: Math.abs(lean),
      depthMm,
    });
    const thinning = thinningFrom(shell, face, end);
    if (!thinning) return [bevel('', corners, thicknessMm)];
    const [aft, fore] = corners;
    const runOut = { note: texts.notes.bevelRunsOut };
    return face.fore.name === 'nose'
      ? [bevel('', [aft, thinning], thicknessMm), { ...bevel('-nose', [thinning, fore], thicknessMm / 2), ...runOut }]
      : [{ ...bevel('-nose', [aft, thinning], thicknessMm / 2), ...runOut }, bevel('', [thinning, fore], thicknessMm)];
  });
}

/** How far the leading edge's bevels reach to both sides of its fold, over the sheet's thickness, mm. */
export const noseWidthMm = (shell: Shell): number =>
  shell.thicknessMm * Math.tan(radFromDeg(foldDeg(shell, lineNamed(shell, 'nose')) / 2));

/** How far the sheet turns about a line between two faces, degrees: positive where the outside bulges there. */
export function foldDeg({ faces, thicknessMm }: Shell, line: Line): number {
  const before = faces.find(({ fore }) => fore === line);
  const after = faces.find(({ aft }) => aft === line);
  if (!before || !after) throw new RangeError(`no fold at ${line.name}`);
  const angle = degFromRad(Math.acos(Math.max(-1, Math.min(1, dot3(before.normal, after.normal)))));
  const beyond = inSpace(after.fore, 0);
  const off = dot3(before.normal, [beyond[0] - line.root[0], beyond[1] - line.root[1], beyond[2] - line.root[2]]);
  return Math.abs(off) < thicknessMm * 1e-9 ? 0 : off < 0 ? angle : -angle;
}
