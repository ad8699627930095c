import type { Folded } from '@/lib/airframe/foldedSection';
import type { Section } from '@/lib/airframe/resolved';
import { unrollStrip } from '@/lib/geometry/unroll/strip';
import { add3, cross3, dot3, length3, lerp3, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { normalOf, unit3 } from '../../shape/frame';
import type { PartFrame } from '../../types';
import type { Run } from '../run';
import { type LineName, type OuterPoint, outerPoints } from './outer';
import { type Plane, shareAt } from './plane';

// The outside of a folded panel in space and unrolled. Its sections are similar, so it is a cone (a cylinder without taper), and each
// face between two of its lines is flat. The skins' outer paper does not stretch: it is what is unrolled, with nothing to allow for.

/** A straight line along the panel on its outer surface, in space and flat; `from` and `to`: where the panel's ends cut it, 0 to 1 root to tip. */
export interface Line extends OuterPoint {
  readonly root: Vec3;
  readonly tip: Vec3;
  readonly flatRoot: Vec2;
  readonly flatTip: Vec2;
  readonly from: number;
  readonly to: number;
}

/** A flat face of the panel: aft line first on the upper skin, nose first on the lower. */
export interface Face {
  readonly aft: Line;
  readonly fore: Line;
  /** Out of the wing. */
  readonly normal: Vec3;
  /** Lays the unrolled skin on this face: the middle of the sheet. */
  readonly frame: PartFrame;
}

export interface Shell {
  readonly section: Folded;
  /** From the trailing edge forward and round the nose. */
  readonly lines: readonly Line[];
  /** One less than lines: face i lies between line i and the next. */
  readonly faces: readonly Face[];
  readonly ends: { readonly root: Plane; readonly tip: Plane };
  readonly up: Vec3;
  readonly thicknessMm: number;
}

const lerp2 = (a: Vec2, b: Vec2, t: number): Vec2 => [a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t];

/** A line's point in space, 0 root to 1 tip. */
export const inSpace = ({ root, tip }: Line, along: number): Vec3 => lerp3(root, tip, along);
/** The same point on the unrolled skin. */
export const onFlat = ({ flatRoot, flatTip }: Line, along: number): Vec2 => lerp2(flatRoot, flatTip, along);

/** A point on the outside of a section. */
export const outside = ({ le, te, chordMm }: Section, up: Vec3, share: number, height: number): Vec3 =>
  add3(lerp3(le, te, share), scale3(up, height * chordMm));

function faceOf(aft: Line, fore: Line, thicknessMm: number): Face {
  const along = unit3(sub3(aft.tip, aft.root));
  const normal = unit3(cross3(along, sub3(fore.root, aft.root)));
  const size = Math.hypot(aft.flatTip[0] - aft.flatRoot[0], aft.flatTip[1] - aft.flatRoot[1]);
  const [c, s] = [(aft.flatTip[0] - aft.flatRoot[0]) / size, (aft.flatTip[1] - aft.flatRoot[1]) / size];
  const left = cross3(normal, along);
  const ex = sub3(scale3(along, c), scale3(left, s));
  const ey = add3(scale3(along, s), scale3(left, c));
  const [x, y] = aft.flatRoot;
  const middle = sub3(aft.root, scale3(normal, thicknessMm / 2));
  return { aft, fore, normal, frame: { origin: sub3(sub3(middle, scale3(ex, x)), scale3(ey, y)), ex, ey } };
}

/** The outside of a folded panel, cut off at its ends, in space and unrolled. Throws RangeError for a panel without a chord. */
export function shellOf(run: Run, section: Folded, ends: Shell['ends']): Shell {
  const [panel] = run.panels;
  if (!panel) throw new RangeError('a folded piece needs a panel');
  const up = normalOf(run.frame);
  const points = outerPoints(section);
  const root = points.map(({ share, height }) => outside(panel.root, up, share, height));
  const tip = points.map(({ share, height }) => outside(panel.tip, up, share, height));
  const flat = unrollStrip(root, tip);
  const lines = points.flatMap((point, i): Line[] => {
    const [a, b, flatRoot, flatTip] = [root[i], tip[i], flat.a[i], flat.b[i]];
    if (!a || !b || !flatRoot || !flatTip) return [];
    return [
      { ...point, root: a, tip: b, flatRoot, flatTip, from: shareAt(ends.root, a, b), to: shareAt(ends.tip, a, b) },
    ];
  });
  const { thicknessMm } = run.material;
  const faces = lines.slice(1).flatMap((fore, i): Face[] => {
    const aft = lines[i];
    return aft ? [faceOf(aft, fore, thicknessMm)] : [];
  });
  return { section, lines, faces, ends, up, thicknessMm };
}

/** One of the shell's lines. Throws RangeError for one that this section has not. */
export function lineNamed(shell: Shell, name: LineName): Line {
  const line = shell.lines.find((entry) => entry.name === name);
  if (!line) throw new RangeError(`a folded section has no line ${name}`);
  return line;
}

/** The face whose outside holds a share of the chord, on the upper or the lower skin. */
export function faceAt(shell: Shell, skin: 'upper' | 'lower', share: number): Face {
  const faces = skin === 'lower' ? shell.faces.slice(-1) : shell.faces.slice(0, -1);
  const face = faces.find(({ fore }) => share >= fore.share) ?? faces.at(-1);
  if (!face) throw new RangeError('a folded section has faces');
  return face;
}

/** A place on the unrolled skin: share of the chord on one skin, and how far along the panel, 0 root to 1 tip. */
export function flatAt(shell: Shell, skin: 'upper' | 'lower', share: number, along: number): Vec2 {
  const { aft, fore } = faceAt(shell, skin, share);
  return lerp2(onFlat(aft, along), onFlat(fore, along), (share - aft.share) / (fore.share - aft.share));
}

/** The inner side of a skin's face: nothing inside the wing may pass it. */
export const innerPlane = ({ aft, normal }: Face, thicknessMm: number): Plane => ({
  at: sub3(aft.root, scale3(normal, thicknessMm)),
  normal,
});

/** The panel's chord at a place along it, along its underside, mm. */
export function chordAt(shell: Shell, along: number): number {
  const across = sub3(inSpace(lineNamed(shell, 'te'), along), inSpace(lineNamed(shell, 'nose'), along));
  return length3(sub3(across, scale3(shell.up, dot3(across, shell.up))));
}

/** How high the inner side of the upper skin stands over the panel's underside at a share of the chord, mm; the lower of the two where faces meet. */
export function innerHeight(shell: Shell, share: number, along: number, asideMm = 0): number {
  const te = lineNamed(shell, 'te');
  const nose = lineNamed(shell, 'nose');
  const [le, rear] = [inSpace(nose, along), lerp3(te.root, te.tip, along)];
  const rise = dot3(sub3(rear, le), shell.up);
  const chord = sub3(sub3(rear, le), scale3(shell.up, rise));
  const aft = unit3(chord);
  const p = add3(add3(le, scale3(chord, share)), scale3(aft, asideMm));
  const heights = shell.faces.slice(0, -1).map((face) => {
    const { at, normal } = innerPlane(face, shell.thicknessMm);
    return { face, height: dot3(sub3(at, p), normal) / dot3(shell.up, normal) };
  });
  // A reflexed tail lies above the line of the face before it; only the faces over the closed part count.
  const closed = heights.filter(({ face }) => face.aft.name !== 'te' || shell.lines[1]?.name !== 'reflex');
  return Math.min(...closed.map(({ height }) => height));
}
