import { describe, expect, it } from 'vitest';
import type { Body } from '@/lib/airframe/schema/fuselage';
import { add3, scale3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { develop } from '@/lib/parts/develop';
import type { Part } from '@/lib/parts/types';
import { assertParts } from '@/lib/parts/validate';
import { airframe, body } from '@/tests/support/airframe';
import { type Refolded, refold, TOLERANCE_MM, type Wanted } from '@/tests/support/refold/check';
import { apart, place, toPolygon } from '@/tests/support/refold/solid';

// Body sheets are bent up from their outlines, folds and thickness and must lie just inside the document's outer measures.

const T = 5;
type Station = Body['stations'][number];
const station = (id: string, xMm: number, widthMm: number, topMm: number, bottomMm: number): Station => ({
  id,
  xMm,
  widthMm,
  topMm,
  bottomMm,
  cornerMm: 0,
});

/** Bulges outward, then waists inward, in plan and in side view. */
const waisted = body({
  stations: [
    station('s1', 0, 44, 16, -26),
    station('s2', 80, 66, 26, -34),
    station('s3', 200, 62, 30, -31),
    station('s4', 300, 34, 14, -8),
    station('s5', 520, 22, 12, -2),
  ],
  formers: [
    { id: 'fw', xMm: 0, role: 'firewall', materialId: 'board', tiltDeg: [3, 2] },
    { id: 'f1', xMm: 120, role: 'former', materialId: 'board', tiltDeg: [0, 0] },
  ],
});
const boxOf = (over: Partial<Body> = {}) => airframe({ bodies: [body({ ...waisted, ...over })] });
const parts = develop(boxOf()).parts.filter(({ key }) => key.startsWith('body/'));
const byKey = (key: string, from: readonly Part[] = parts): Part => {
  const part = from.find((candidate) => candidate.key === key);
  if (!part) throw new RangeError(`no part ${key}`);
  return part;
};

/** The line halfway through a sheet whose outer face follows `outer` (x aft, height outward): a piece for each straight, as long as the sheet is. */
function middleLine(outer: readonly Vec2[]): { from: Vec2; to: Vec2 }[] {
  const heading = (k: number): number => {
    const [a, b] = [outer[k], outer[k + 1]];
    return a && b ? Math.atan2(b[1] - a[1], b[0] - a[0]) : Number.NaN;
  };
  return outer.slice(0, -1).map((a, k) => {
    const b = outer[k + 1] ?? a;
    const h = heading(k);
    const [c, s] = [Math.cos(h), Math.sin(h)];
    // Where the sheet bends outward its inner face is whole, and the outer line gains thickness times tan of half the bend.
    const gain = (bend: number): number => (bend > 0 ? T * Math.tan(bend / 2) : 0);
    const before = k === 0 ? 0 : gain(h - heading(k - 1));
    const after = k === outer.length - 2 ? 0 : gain(heading(k + 1) - h);
    const inward: Vec2 = [(s * T) / 2, (-c * T) / 2];
    return {
      from: [a[0] + inward[0] - c * before, a[1] + inward[1] - s * before],
      to: [b[0] + inward[0] + c * after, b[1] + inward[1] + s * after],
    };
  });
}

const origin: Vec3 = [-120, 0, -10];
const S = waisted.stations;

const sideWanted = (sign: 1 | -1): Wanted => {
  const lines = middleLine(S.map(({ xMm, widthMm }): Vec2 => [xMm, widthMm / 2]));
  const patches = lines.map(({ from, to }, k): Vec3[] => {
    const at = ([x, y]: Vec2, z = 0): Vec3 => add3(origin, [x, sign * y, z]);
    return [at(from, S[k]?.bottomMm), at(to, S[k + 1]?.bottomMm), at(to, S[k + 1]?.topMm), at(from, S[k]?.topMm)];
  });
  return { patches, corners: patches.flat(), looks: [0, sign, 0] };
};

/** Inner face of a side at an x, by hand: the outer line less the thickness measured square to it. */
const innerHalf = (x: number): number => {
  const k = Math.max(
    0,
    S.findIndex(({ xMm }, i) => x >= xMm && x <= (S[i + 1]?.xMm ?? Number.NaN)),
  );
  const [a, b] = [S[k], S[k + 1]];
  if (!a || !b) throw new RangeError(`no station at ${x}`);
  const slope = (b.widthMm - a.widthMm) / 2 / (b.xMm - a.xMm);
  return a.widthMm / 2 + slope * (x - a.xMm) - T * Math.hypot(1, slope);
};

const topWanted = (which: 'top' | 'bottom'): Wanted => {
  const up = which === 'top' ? 1 : -1;
  const lines = middleLine(S.map(({ xMm, topMm, bottomMm }): Vec2 => [xMm, which === 'top' ? topMm : -bottomMm]));
  // Generous across: how wide the sheet is, is checked against the sides below.
  const patches = lines.map(({ from, to }): Vec3[] => {
    const at = ([x, h]: Vec2, y: number): Vec3 => add3(origin, [x, y, up * h]);
    return [at(from, -40), at(to, -40), at(to, 40), at(from, 40)];
  });
  const last = S.at(-1);
  const end = lines.at(-1)?.to;
  const first = lines[0]?.from;
  if (!last || !end || !first) throw new RangeError('no stations');
  const half = (x: number, [px, h]: Vec2): Vec3[] =>
    [1, -1].map((sign) => add3(origin, [px, sign * innerHalf(x), up * h]));
  return { patches, corners: [...half(0, first), ...half(last.xMm, end)], looks: [0, 0, up] };
};

const looking = (part: Part, wanted: Wanted): Wanted =>
  part.face === 'inner' ? { ...wanted, looks: scale3(wanted.looks, -1) } : wanted;
const folded = (key: string, wanted: Wanted): { part: Part; result: Refolded } => {
  const part = byKey(key);
  return { part, result: refold(part, looking(part, wanted)) };
};

describe('a box body', () => {
  it('develops into parts that can be cut', () => {
    expect(develop(boxOf()).problems).toEqual([]);
    expect(() => assertParts(parts)).not.toThrow();
  });

  it.each([
    { key: 'body/side/stbd', wanted: sideWanted(1) },
    { key: 'body/side/port', wanted: sideWanted(-1) },
    { key: 'body/top/centre', wanted: topWanted('top') },
    { key: 'body/bottom/centre', wanted: topWanted('bottom') },
  ])('$key bends up to its outer measures and says where it stands', ({ key, wanted }) => {
    const { part, result } = folded(key, wanted);
    expect(result.faults).toEqual([]);
    const { placement, facets } = result;
    if (!placement) throw new RangeError('not placed');
    const { origin: at, ex, ey } = part.frame;
    for (const p of facets[0] ?? []) {
      const said = add3(at, add3(scale3(ex, p[0]), scale3(ey, p[1])));
      expect(apart(said, place(placement, p))).toBeLessThanOrEqual(TOLERANCE_MM);
    }
  });

  it('reports a side that is half a millimetre too long before a fold, and a fold a degree out', () => {
    const { part } = folded('body/side/stbd', sideWanted(1));
    const wanted = looking(part, sideWanted(1));
    const fold = part.operations.find(({ id }) => id === 'fold-1');
    if (!fold) throw new RangeError('no fold');
    const atX = fold.path[0]?.[0] ?? 0;
    const noseRight = part.face === 'outer' ? 1 : -1;
    const longer = (p: Vec2): Vec2 => ((p[0] - atX) * noseRight < -1e-6 ? [p[0] - 0.5 * noseRight, p[1]] : p);
    const shift = (ring: readonly Vec2[]): Vec2[] => ring.map(longer);
    // Everything behind the first fold moves aft by half a millimetre, the fold itself does not.
    const stretched = {
      ...part,
      outline: shift(part.outline),
      operations: part.operations.map((op) => ({ ...op, path: shift(op.path) })),
    };
    expect(refold(stretched, wanted).faults).not.toEqual([]);
    const bent = {
      ...part,
      operations: part.operations.map((op) => (op.id === 'fold-1' ? { ...op, angleDeg: (op.angleDeg ?? 0) + 1 } : op)),
    };
    expect(refold(bent, wanted).faults).not.toEqual([]);
  });

  it('has a top that fills the room between the sides, within 0.3 mm all along', () => {
    const { result } = folded('body/top/centre', topWanted('top'));
    const { placement, facets } = result;
    if (!placement) throw new RangeError('not placed');
    for (const p of facets.flat()) {
      const [x, y] = place(placement, p);
      const at = Math.min(520, Math.max(0, x - origin[0]));
      expect(Math.abs(Math.abs(y) - innerHalf(at))).toBeLessThanOrEqual(TOLERANCE_MM);
    }
  });

  it('has formers that fill the inside at their own place, and a firewall tilted as asked', () => {
    const former = byKey('body/f1/former/centre');
    const placed = former.outline.map((p) =>
      add3(former.frame.origin, add3(scale3(former.frame.ex, p[0]), scale3(former.frame.ey, p[1]))),
    );
    // Middle plane half a sheet behind 120 mm; larger than there by what the bevels take, at most half a sheet times the slope.
    for (const [x, y] of placed) {
      expect(x - origin[0]).toBeCloseTo(122.5, 9);
      expect(Math.abs(y)).toBeCloseTo(innerHalf(120), 6);
    }
    const { ex, ey } = byKey('body/fw/firewall/centre').frame;
    const normal: Vec3 = [ex[1] * ey[2] - ex[2] * ey[1], ex[2] * ey[0] - ex[0] * ey[2], ex[0] * ey[1] - ex[1] * ey[0]];
    expect(Math.atan2(-normal[2], -normal[0]) * (180 / Math.PI)).toBeCloseTo(3, 9);
    expect(Math.atan2(normal[1], -normal[0]) * (180 / Math.PI)).toBeCloseTo(2, 9);
  });
});

describe('a straight box of 60 x 50 mm, in 5 mm board', () => {
  const plain = (over: Partial<Body> = {}) =>
    develop(
      airframe({
        bodies: [
          body({
            stations: [station('a', 0, 60, 30, -20), station('b', 300, 60, 30, -20)],
            formers: [{ id: 'f', xMm: 100, role: 'former', materialId: 'board', tiltDeg: [0, 0] }],
            ...over,
          }),
        ],
      }),
    );
  const size = (part: Part | undefined): Vec2 => {
    const xs = part?.outline.map(([x]) => x) ?? [];
    const ys = part?.outline.map(([, y]) => y) ?? [];
    return [Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys)];
  };

  it('has sides of the full height, top and bottom between them, formers inside', () => {
    const made = plain().parts;
    const sizes = Object.fromEntries(
      made.filter(({ key }) => key.startsWith('body/')).map((part) => [part.key, size(part)]),
    );
    expect(sizes).toEqual({
      'body/side/stbd': [300, 50],
      'body/side/port': [300, 50],
      'body/top/centre': [50, 300],
      'body/bottom/centre': [50, 300],
      'body/f/former/centre': [50, 40],
    });
  });

  it('makes room in a former for a doubler', () => {
    const made = plain({ doublers: [{ id: 'd', face: 'stbd', fromX: 20, toX: 180, materialId: 'board' }] }).parts;
    expect(size(byKey('body/d/doubler/stbd', made))).toEqual([160, 40]);
    expect(size(byKey('body/f/former/centre', made))).toEqual([45, 40]);
  });

  it('cuts openings in the face that they name only, and refuses one that leaves it', () => {
    const hatch = { id: 'h', face: 'stbd', fromX: 40, toX: 100, widthMm: 30, purpose: 'hatch' } as const;
    const made = plain({ openings: [hatch] });
    expect(byKey('body/side/stbd', made.parts).holes).toHaveLength(1);
    expect(byKey('body/side/port', made.parts).holes).toHaveLength(0);
    expect(byKey('body/side/port', made.parts).mirrorOf).toBeUndefined();
    assertParts(made.parts);
    const codes = (over: object) =>
      plain({ openings: [{ ...hatch, ...over }] }).problems.map(({ code, path }) => `${code} ${path}`);
    // 50 mm high, 2 mm of foam kept on each side.
    expect(codes({ widthMm: 46 })).toEqual([]);
    expect(codes({ widthMm: 46.2 })).toEqual(['opening-off-face bodies.0.openings.0']);
    expect(codes({ toX: 310 })).toEqual(['opening-off-face bodies.0.openings.0']);
  });

  it('refuses a body narrower than its own two sides', () => {
    const narrow = (widthMm: number) =>
      plain({
        stations: [station('a', 0, 60, 30, -20), station('b', 300, 60, 30, -20), station('c', 400, widthMm, 30, -20)],
      }).problems.map(({ code, path }) => `${code} ${path}`);
    expect(narrow(11)).toEqual([]);
    expect(narrow(9)).toEqual(['body-too-narrow bodies.0.stations.2.widthMm']);
  });

  it('is one plate when it is a profile', () => {
    const made = plain({ kind: 'profile', formers: [] });
    const part = byKey('body/plate/centre', made.parts);
    expect(size(part)).toEqual([300, 50]);
    expect(
      toPolygon(
        [origin[0] + 150, 0, origin[2]],
        part.outline.map((p) =>
          add3(part.frame.origin, add3(scale3(part.frame.ex, p[0]), scale3(part.frame.ey, p[1]))),
        ),
      ),
    ).toBeLessThan(1e-9);
  });
});
