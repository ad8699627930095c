import type { Vec2, Vec3 } from '@/lib/numerics/vec';
import { add3, cross3, dot3, radFromDeg, scale3, sub3 } from '@/lib/numerics/vec';

// Folds a flat part up in a space of its own: its worked face looks along +z, its middle lies at z = 0 where nothing folds.

/** All that a builder has in hand: the outline, the lines worked on it, how thick the sheet is. */
export interface FlatPart {
  readonly outline: readonly Vec2[];
  readonly thicknessMm: number;
  readonly face: string;
  readonly operations: readonly {
    readonly kind: string;
    readonly path: readonly Vec2[];
    readonly face: string;
    readonly angleDeg?: number;
    readonly depthMm?: number;
  }[];
}

/** A flat piece of a folded part, its middle surface, in the part's own space. The first holds the outline's first corner. */
export type Facet = readonly Vec3[];

const gap = (a: Vec2, b: Vec2): number => Math.hypot(a[0] - b[0], a[1] - b[1]);

function alongEdge(p: Vec2, a: Vec2, b: Vec2): { away: number; t: number } {
  const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
  const size = dx * dx + dy * dy;
  const t = size === 0 ? 0 : Math.min(1, Math.max(0, ((p[0] - a[0]) * dx + (p[1] - a[1]) * dy) / size));
  return { away: Math.hypot(p[0] - a[0] - t * dx, p[1] - a[1] - t * dy), t };
}

const CLOSE = 0.02;

/** Where two lines meet. */
function meet(p: Vec2, u: Vec2, q: Vec2, v: Vec2): Vec2 {
  const across = u[0] * v[1] - u[1] * v[0];
  const t = ((q[0] - p[0]) * v[1] - (q[1] - p[1]) * v[0]) / across;
  return [p[0] + t * u[0], p[1] + t * u[1]];
}

/** The outline at mid-thickness: every edge that is bevelled right through lies back from what was cut by half of the bevel. */
export function middleOutline(part: FlatPart): Vec2[] {
  let ring = [...part.outline];
  for (const { kind, path, angleDeg = 0, depthMm = part.thicknessMm } of part.operations) {
    const [a, b] = [path[0], path.at(-1)];
    if (kind !== 'bevel' || !a || !b || depthMm < part.thicknessMm) continue;
    const back = (part.thicknessMm / 2) * Math.tan(radFromDeg(angleDeg));
    const old = ring;
    const onLine = (p: Vec2): boolean => alongEdge(p, a, b).away < CLOSE;
    const onEdge = old.some((p, i) => onLine(p) && onLine(old[(i + 1) % old.length] ?? p));
    if (!onEdge) continue;
    const u: Vec2 = [(b[0] - a[0]) / gap(a, b), (b[1] - a[1]) / gap(a, b)];
    const middle: Vec2 = [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2];
    const inward: Vec2 = inside(old, [middle[0] - u[1] * 0.01, middle[1] + u[0] * 0.01])
      ? [-u[1], u[0]]
      : [u[1], -u[0]];
    const q: Vec2 = [middle[0] + inward[0] * back, middle[1] + inward[1] * back];
    ring = old.map((p, i): Vec2 => {
      if (!onLine(p)) return p;
      const before = old[(i + old.length - 1) % old.length] ?? p;
      const after = old[(i + 1) % old.length] ?? p;
      const other = onLine(before) ? (onLine(after) ? null : after) : before;
      return other
        ? meet(p, [other[0] - p[0], other[1] - p[1]], q, u)
        : [p[0] + inward[0] * back, p[1] + inward[1] * back];
    });
  }
  return ring;
}

export function inside(ring: readonly Vec2[], [x, y]: Vec2): boolean {
  return ring.reduce((odd, a, i) => {
    const b = ring[(i + 1) % ring.length] ?? a;
    return a[1] > y !== b[1] > y && x < a[0] + ((b[0] - a[0]) * (y - a[1])) / (b[1] - a[1]) ? !odd : odd;
  }, false);
}

/** Splits a ring along a straight line whose ends lie on it; null when they do not. */
function split(ring: readonly Vec2[], from: Vec2, to: Vec2): [Vec2[], Vec2[]] | null {
  const spot = (p: Vec2): { edge: number; t: number; away: number } =>
    ring.reduce(
      (best, a, edge) => {
        const at = alongEdge(p, a, ring[(edge + 1) % ring.length] ?? a);
        return at.away < best.away - 1e-9 ? { edge, ...at } : best;
      },
      { edge: -1, t: 0, away: Number.POSITIVE_INFINITY },
    );
  const [a, b] = [spot(from), spot(to)];
  if (a.away > CLOSE || b.away > CLOSE) return null;
  const walk = (s: typeof a, e: typeof a): Vec2[] => {
    const points: Vec2[] = [];
    let edge = s.edge;
    if (edge === e.edge && e.t >= s.t) return points;
    do {
      edge = (edge + 1) % ring.length;
      points.push(ring[edge] ?? from);
    } while (edge !== e.edge);
    return points;
  };
  return [
    [from, ...walk(a, b), to],
    [to, ...walk(b, a), from],
  ];
}

interface Link {
  readonly line: readonly [Vec2, Vec2];
  readonly angleDeg: number;
  /** +1: the worked face of the fold is the part's own; -1: its back. */
  readonly worked: 1 | -1;
}

interface Node {
  readonly ring: Vec2[];
  /** Points on the part that this piece must keep when it is split: the outline's first corner, or the fold it hangs on. */
  readonly held: readonly Vec2[];
  readonly links: { readonly link: Link; readonly to: number }[];
}

function pieces(part: FlatPart): Node[] {
  const ring = middleOutline(part);
  const nodes: Node[] = [{ ring, held: ring.slice(0, 1), links: [] }];
  for (const { kind, path, face, angleDeg } of part.operations) {
    const [a, b] = [path[0], path.at(-1)];
    if ((kind !== 'cutToPaper' && kind !== 'crease') || angleDeg === undefined || !a || !b) continue;
    for (const [index, node] of nodes.entries()) {
      const halves = split(node.ring, a, b);
      if (!halves || halves.some((half) => half.length < 3)) continue;
      const link: Link = { line: [a, b], angleDeg, worked: face === part.face ? 1 : -1 };
      const keeps = (half: readonly Vec2[]): boolean =>
        node.held.every((p) => half.some((q, i) => alongEdge(p, q, half[(i + 1) % half.length] ?? q).away < CLOSE));
      const [own, other] = keeps(halves[0]) ? halves : [halves[1], halves[0]];
      const moved = node.links.filter(
        ({ link: old }) =>
          !old.line.every((p) => own.some((q, i) => alongEdge(p, q, own[(i + 1) % own.length] ?? q).away < CLOSE)),
      );
      const kept = node.links.filter((entry) => !moved.includes(entry));
      nodes[index] = { ring: own, held: node.held, links: [...kept, { link, to: nodes.length }] };
      nodes.push({ ring: other, held: [a, b], links: moved });
      break;
    }
  }
  return nodes;
}

function foldOver(points: readonly Vec3[], { line, angleDeg, worked }: Link, child: Vec2, thicknessMm: number): Vec3[] {
  const [a, b] = line;
  const u: Vec3 = [(b[0] - a[0]) / gap(a, b), (b[1] - a[1]) / gap(a, b), 0];
  const side = (child[0] - a[0]) * -u[1] + (child[1] - a[1]) * u[0];
  const into: Vec3 = side > 0 ? [-u[1], u[0], 0] : [u[1], -u[0], 0];
  // The face that is not worked from stays whole: it is the hinge.
  const pivot: Vec3 = [a[0], a[1], (-worked * thicknessMm) / 2];
  const axis = cross3(into, [0, 0, worked]);
  const [c, s] = [Math.cos(radFromDeg(angleDeg)), Math.sin(radFromDeg(angleDeg))];
  return points.map((p) => {
    const r = sub3(p, pivot);
    const along = scale3(axis, dot3(axis, r) * (1 - c));
    return add3(pivot, add3(add3(scale3(r, c), scale3(cross3(axis, r), s)), along));
  });
}

/** A point well inside a ring's side of its first edges: the mean of its corners is enough for what is folded here. */
const middleOf = (ring: readonly Vec2[]): Vec2 => [
  ring.reduce((sum, [x]) => sum + x, 0) / ring.length,
  ring.reduce((sum, [, y]) => sum + y, 0) / ring.length,
];

/** The part folded along all its lines. */
export function foldUp(part: FlatPart): Facet[] {
  const nodes = pieces(part);
  const facets: Facet[] = [];
  const visit = (index: number, lift: (points: readonly Vec3[]) => readonly Vec3[]): void => {
    const node = nodes[index];
    if (!node) return;
    facets.push(lift(node.ring.map(([x, y]): Vec3 => [x, y, 0])));
    for (const { link, to } of node.links) {
      const child = nodes[to];
      if (child) visit(to, (points) => lift(foldOver(points, link, middleOf(child.ring), part.thicknessMm)));
    }
  };
  visit(0, (points) => points);
  return facets;
}
