import type { Body } from '@/lib/airframe/schema/fuselage';
import type { Material } from '@/lib/airframe/schema/stock';
import { lineMeet } from '@/lib/geometry/lines';
import type { Problem } from '@/lib/numerics/result';
import { add3, cross3, degFromRad, dot3, radFromDeg, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import type { Draft } from '../draft';
import { toPart, unit3 } from '../shape/frame';
import { heightAt, type Polyline } from '../shape/polyline';
import { cleanRing } from '../shape/ring';
import { LEAST_BEVEL_DEG } from '../surface/joint';
import type { Operation, PartFrame } from '../types';

// Formers and firewalls: the inside of the body cut by the former's own plane. A former stands with its front face at its x;
// one nearer to the tail end than its thickness stands with its aft face there.

/** How far the walls are thought to go on past the end stations, mm: the tilt of a large firewall at 30 degrees. */
const PAST_END_MM = 200;

/** The four inner walls a former touches, doublers taken off. */
export interface Inside {
  readonly stbd: Polyline;
  readonly port: Polyline;
  readonly top: Polyline;
  readonly bottom: Polyline;
}

/** Where a corner line of the inside, piecewise straight, meets a plane. */
function meetPlane(y: Polyline, z: Polyline, at: Vec3, normal: Vec3): Vec3 | null {
  const inner = [...new Set([...y, ...z].map(([x]) => x))].sort((a, b) => a - b);
  // A tilted firewall at the nose reaches a little past the last station: the walls go on straight for it.
  const xs = [(inner[0] ?? 0) - PAST_END_MM, ...inner, (inner.at(-1) ?? 0) + PAST_END_MM];
  const off = (x: number): number => dot3(sub3([x, heightAt(y, x), heightAt(z, x)], at), normal);
  for (const [index, to] of xs.entries()) {
    const from = xs[index - 1];
    if (from === undefined) continue;
    const [a, b] = [off(from), off(to)];
    if (a * b > 0 || a === b) continue;
    const x = from + ((to - from) * a) / (a - b);
    return [x, heightAt(y, x), heightAt(z, x)];
  }
  return null;
}

/** The inside cut by a plane: corners bottom port, top port, top starboard, bottom starboard, or null when it leaves the body. */
function cutInside(inside: Inside, at: Vec3, normal: Vec3): Vec3[] | null {
  const corners = [
    meetPlane(inside.port, inside.bottom, at, normal),
    meetPlane(inside.port, inside.top, at, normal),
    meetPlane(inside.stbd, inside.top, at, normal),
    meetPlane(inside.stbd, inside.bottom, at, normal),
  ];
  return corners.every((corner) => corner !== null) ? corners.flatMap((corner) => (corner ? [corner] : [])) : null;
}

/** Edges of the larger face all round, and the bevels that take the smaller one back. `front` and `aft` are counter-clockwise. */
function bevelled(
  front: readonly Vec2[],
  aft: readonly Vec2[],
  thicknessMm: number,
): { outline: Vec2[]; operations: Operation[] } {
  const edgesAt = front.map((a, index) => {
    const b = front[(index + 1) % front.length] ?? a;
    const c = aft[index] ?? a;
    const along: Vec2 = [b[0] - a[0], b[1] - a[1]];
    // Positive when the aft face reaches farther out than the front.
    const out = ((c[0] - a[0]) * along[1] - (c[1] - a[1]) * along[0]) / Math.hypot(...along);
    return { at: out > 0 ? c : a, along, out };
  });
  const outline = edgesAt.map((edge, index) => {
    const before = edgesAt[(index + edgesAt.length - 1) % edgesAt.length] ?? edge;
    return lineMeet(before.at, before.along, edge.at, edge.along) ?? edge.at;
  });
  const operations = edgesAt.flatMap(({ out }, index): Operation[] => {
    const angleDeg = degFromRad(Math.atan2(Math.abs(out), thicknessMm));
    const from = outline[index];
    const to = outline[(index + 1) % outline.length];
    if (angleDeg < LEAST_BEVEL_DEG || !from || !to) return [];
    const face = out > 0 ? 'outer' : 'inner';
    return [
      {
        id: `edge-${index + 1}-bevel`,
        kind: 'bevel',
        path: [from, to],
        closed: false,
        face,
        angleDeg,
        depthMm: thicknessMm,
      },
    ];
  });
  return { outline: cleanRing(outline), operations };
}

interface FormerPlace {
  readonly body: Body;
  readonly bodyName: string;
  readonly path: string;
  readonly origin: Vec3;
  readonly inside: Inside;
}

/** Formers go by their id, as frames do on a plan; firewalls by number where there are several. */
function formerName({ body, bodyName }: FormerPlace, former: Body['formers'][number]): string {
  if (former.role !== 'firewall') return fill(texts.names.former, { body: bodyName, id: former.id });
  const firewalls = body.formers.filter(({ role }) => role === 'firewall');
  const values = { body: bodyName, number: firewalls.indexOf(former) + 1 };
  return fill(firewalls.length > 1 ? texts.names.firewallOf : texts.names.firewall, values);
}

/** One former or firewall of a box body. Its outer face looks forward. */
export function formerDraft(
  former: Body['formers'][number],
  material: Material,
  place: FormerPlace,
): { draft: Draft } | { problem: Problem } {
  const { body, inside, origin } = place;
  const from = body.stations[0]?.xMm ?? 0;
  const to = body.stations.at(-1)?.xMm ?? 0;
  const half = material.thicknessMm / 2;
  const middleX = Math.min(former.xMm + half, to - half);
  const [down, right] = former.tiltDeg.map(radFromDeg);
  const normal = unit3([-1, Math.tan(right ?? 0), -Math.tan(down ?? 0)]);
  const middle: Vec3 = [middleX, 0, (heightAt(inside.top, middleX) + heightAt(inside.bottom, middleX)) / 2];
  const faceAt = (off: number): Vec3[] | null => cutInside(inside, add3(middle, scale3(normal, off)), normal);
  const ey = unit3(sub3([0, 0, 1], scale3(normal, normal[2])));
  const frame: PartFrame = { origin: add3(origin, middle), ex: cross3(ey, normal), ey };
  const local: PartFrame = { ...frame, origin: middle };
  const outside = former.xMm < from - 1e-9 || former.xMm > to + 1e-9;
  const [front, aft] = [faceAt(half), faceAt(-half)];
  if (outside || !front || !aft) {
    const values = { from: trimmedDigits(from, 1), to: trimmedDigits(to, 1) };
    return {
      problem: {
        code: 'former-outside-body',
        path: `${place.path}.xMm`,
        message: fill(texts.problems.formerOutsideBody, values),
      },
    };
  }
  const flat = (points: readonly Vec3[]): Vec2[] => points.map((p) => toPart(local, p));
  const { outline, operations } = bevelled(flat(front), flat(aft), material.thicknessMm);
  return {
    draft: {
      key: `${body.id}/${former.id}/${former.role}`,
      name: () => formerName(place, former),
      elementId: former.id,
      material,
      outline,
      holes: [],
      operations,
      frame,
      faces: ['outer', 'inner'],
      grainDeg: 90,
    },
  };
}
