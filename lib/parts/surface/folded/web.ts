import { add3, cross3, dot3, lerp3, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/foldedParts';
import { fromPart, toPart, unit3 } from '../../shape/frame';
import type { Operation, PartFrame } from '../../types';
import { meetOf, type Plane } from './plane';
import { type PlateEdge, plateOf } from './plate';
import { innerHeight, innerPlane, lineNamed, type Shell } from './shell';

// Webs stand on the lower skin and hold the upper one up: as high as the section is outside, less both skins, at each place.

export interface Web {
  readonly outline: readonly Vec2[];
  readonly operations: readonly Operation[];
  /** Mid-plane; the face it looks out of is the aft one. */
  readonly frame: PartFrame;
  /** Where along the panel it stands, 0 root to 1 tip. */
  readonly from: number;
  readonly to: number;
  readonly endsEarly: boolean;
}

/** Where a web stands. */
export interface Stand {
  /** Line on the underside of the panel that one face of the web stands on. */
  readonly share: number;
  /** Which face of the web that is. */
  readonly face: 'fore' | 'aft';
}

/** Highest inner room over the web's own thickness, which reaches to one side of its line; mm over the inside of the lower skin. */
function roomFor(shell: Shell, { share, face }: Stand, along: number): number {
  const back = face === 'fore' ? shell.thicknessMm : -shell.thicknessMm;
  const heights = [0, back].map((aside) => innerHeight(shell, share, along, aside));
  return Math.max(...heights) - shell.thicknessMm;
}

/** Where along the panel a web is at least one sheet high, 0 root to 1 tip; null for nowhere. */
function reachOf(shell: Shell, stand: Stand): { from: number; to: number } | null {
  const line = lineNamed(shell, 'lower');
  const [a, b] = [roomFor(shell, stand, 0), roomFor(shell, stand, 1)];
  const least = shell.thicknessMm;
  if (a < least && b < least) return null;
  const meets = a === b ? 0 : (least - a) / (b - a);
  return { from: a < least ? meets : line.from, to: b < least ? meets : line.to };
}

/** The two faces of the upper skin over the web's front and rear: one, unless the crest stands over it. */
function roofOf(shell: Shell, at: Vec3, aft: Vec3): readonly [fore: Plane, rear: Plane] | null {
  const planes = shell.faces
    .slice(0, -1)
    .filter(({ aft: line }) => line.name !== 'te' || shell.lines[1]?.name !== 'reflex')
    .map((face) => innerPlane(face, shell.thicknessMm));
  const over = (p: Vec3): Plane | null => {
    const height = ({ at: q, normal }: Plane): number => dot3(sub3(q, p), normal) / dot3(shell.up, normal);
    return planes.reduce<Plane | null>((low, plane) => (low && height(low) <= height(plane) ? low : plane), null);
  };
  const [fore, rear] = [over(at), over(add3(at, scale3(aft, shell.thicknessMm)))];
  return fore && rear ? [fore, rear] : null;
}

/** Both bevels of a web's top under the crest: each from its own face as deep as its side of the ridge is thick. */
function ridgeBevels(
  path: readonly Vec2[],
  shell: Shell,
  roof: readonly [Plane, Plane],
  aft: Vec3,
  ridgeMm: number,
): Operation[] {
  const [fore, rear] = roof.map(({ normal }) => (Math.asin(Math.abs(dot3(normal, aft))) * 180) / Math.PI);
  const bevel = { kind: 'bevel', path, closed: false } as const;
  return [
    { ...bevel, id: 'top-bevel-fore', face: 'inner', angleDeg: fore ?? 0, depthMm: ridgeMm },
    { ...bevel, id: 'top-bevel', face: 'outer', angleDeg: rear ?? 0, depthMm: shell.thicknessMm - ridgeMm },
  ];
}

/** A web along a share of the chord, or null where the skins lie closer than one sheet all along. */
export function webOf(shell: Shell, stand: Stand): Web | null {
  const reach = reachOf(shell, stand);
  if (!reach) return null;
  const { up, thicknessMm } = shell;
  const [rear, nose] = [lineNamed(shell, 'lower'), lineNamed(shell, 'nose')];
  // The lower skin's outer face from nose to rear edge is straight in shares of the chord.
  const share = stand.share / rear.share;
  const [root, tip] = [lerp3(nose.root, rear.root, share), lerp3(nose.tip, rear.tip, share)];
  const ex = unit3(sub3(tip, root));
  const aft = cross3(ex, up);
  const fore = stand.face === 'fore' ? root : sub3(root, scale3(aft, thicknessMm));
  const face: PartFrame = { origin: add3(fore, scale3(aft, thicknessMm)), ex, ey: up };
  const roof = roofOf(shell, lerp3(fore, add3(fore, sub3(tip, root)), (reach.from + reach.to) / 2), aft);
  if (!roof) return null;
  const whole = { from: rear.from, to: rear.to };
  const cut = (along: number, out: 1 | -1): Plane => ({ at: lerp3(root, tip, along), normal: scale3(ex, out) });
  const top = topOf(roof, face, aft, thicknessMm);
  const edges: PlateEdge[] = [
    { id: 'bottom', plane: { at: add3(root, scale3(up, thicknessMm)), normal: scale3(up, -1) } },
    { id: 'tip', plane: reach.to === whole.to ? shell.ends.tip : cut(reach.to, 1) },
    { id: 'top', plane: top.plane },
    { id: 'root', plane: reach.from === whole.from ? shell.ends.root : cut(reach.from, -1) },
  ];
  const plate = plateOf(face, edges, thicknessMm, ['outer', 'inner']);
  if (!plate) return null;
  const [, , c, d] = plate.outline;
  const ridge = top.ridgeMm !== null && c && d ? ridgeBevels([c, d], shell, roof, aft, top.ridgeMm) : [];
  const endsEarly = reach.from !== whole.from || reach.to !== whole.to;
  return {
    outline: plate.outline,
    operations: [
      ...plate.bevels,
      ...ridge,
      ...looksAft(plate.outline),
      ...(endsEarly ? earlyEnd(plate.outline, reach.to !== whole.to) : []),
    ],
    frame: { ...face, origin: sub3(face.origin, scale3(aft, thicknessMm / 2)) },
    ...reach,
    endsEarly,
  };
}

/** What bounds a web above: the skin over it, or square under the ridge that stands over its thickness. */
function topOf(
  [fore, rear]: readonly [Plane, Plane],
  face: PartFrame,
  aft: Vec3,
  thicknessMm: number,
): { plane: Plane; ridgeMm: number | null } {
  if (fore === rear) return { plane: fore, ridgeMm: null };
  const ridge = meetOf(fore, rear);
  const behind = dot3(sub3(face.origin, ridge.at), aft);
  // The ridge seen square on the web: its highest line.
  const a = fromPart(face, toPart(face, ridge.at));
  const b = fromPart(face, toPart(face, add3(ridge.at, ridge.along)));
  const normal = unit3(cross3(aft, sub3(b, a)));
  const upward = dot3(normal, face.ey) > 0 ? normal : scale3(normal, -1);
  const ridgeMm = Math.min(thicknessMm, Math.max(0, thicknessMm - behind));
  return { plane: { at: a, normal: upward }, ridgeMm };
}

/** A mark along the end of a web that stops short of the panel's. Outline: bottom root, bottom tip, top tip, top root. */
function earlyEnd([bottomRoot, bottomTip, topTip, topRoot]: readonly Vec2[], atTip: boolean): Operation[] {
  const [a, b] = atTip ? [bottomTip, topTip] : [topRoot, bottomRoot];
  if (!a || !b) return [];
  return [{ id: 'web-ends', kind: 'reference', path: [a, b], closed: false, face: 'outer', note: texts.notes.webEnds }];
}

/** Which way round it stands, along its foot. */
function looksAft([bottomRoot, bottomTip]: readonly Vec2[]): Operation[] {
  if (!bottomRoot || !bottomTip) return [];
  const path = [bottomRoot, bottomTip];
  return [{ id: 'web-aft', kind: 'reference', path, closed: false, face: 'outer', note: texts.notes.webAft }];
}
