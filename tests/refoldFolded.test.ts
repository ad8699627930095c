import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { ResolvedPanel, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Panel, SectionShape } from '@/lib/airframe/schema/surface';
import { signedArea } from '@/lib/geometry/polygons';
import { add3, cross3, dot3, length3, lerp3, mirror3, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { facetsOf } from '@/lib/parts/shape/facets';
import { foldedParts } from '@/lib/parts/surface/folded/foldedParts';
import type { Part } from '@/lib/parts/types';
import { assertParts } from '@/lib/parts/validate';
import { airframe, board, control, panel, surface } from '@/tests/support/airframe';
import { refold, TOLERANCE_MM } from '@/tests/support/refold/check';
import { inside } from '@/tests/support/refold/fold';
import { toPolygon } from '@/tests/support/refold/solid';

// Folded skins are folded up from their outlines, fold lines and bevels alone and laid on the outside of the section: its lower face
// straight from the leading edge to the end of the lower skin, its upper face straight to the thickest place and down to the trailing edge.

type Folded = Extract<SectionShape, { kind: 'folded' }>;

const SECTION: Folded = { kind: 'folded', thicknessShare: 0.12, maxAt: 0.3, lowerTo: 0.62, webAt: 0.3 };
const folded = (over: Partial<Panel> = {}): Panel => panel({ section: SECTION, ...over });

function made(document: Airframe) {
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError(JSON.stringify(resolved.problems));
  const [wing] = resolved.value.surfaces;
  if (!wing) throw new RangeError('the document has a wing');
  const byId = <T extends { readonly id: string }>(list: readonly T[]) =>
    new Map(list.map((entry) => [entry.id, entry]));
  const development = foldedParts(wing, wing.panels, {
    controls: resolved.value.controls,
    materials: byId(document.materials),
    tubes: byId(document.tubes),
    booms: [],
  });
  assertParts(development.parts);
  return { wing, ...development };
}

const unit = (a: Vec3): Vec3 => scale3(a, 1 / length3(a));
const upOf = ({ root, tip }: ResolvedPanel): Vec3 => unit(cross3(sub3(tip.le, root.le), sub3(root.le, root.te)));

/** Corners of the outside of a section, from the trailing edge over the top to the leading edge and back to the lower skin's end. */
const SHAPE: readonly Vec2[] = [
  [1, 0],
  [0.3, 0.12],
  [0, 0],
  [0.62, 0],
];

/** Lines along a panel on its outside, cut off half-way to its neighbours. */
function linesOf({ panels }: ResolvedSurface, index: number, meets = true): [Vec3, Vec3][] {
  const own = panels[index];
  if (!own) throw new RangeError(`no panel ${index}`);
  const up = upOf(own);
  const before = index === 0 ? (meets ? mirror3(up) : undefined) : panels[index - 1] && upOf(panels[index - 1] ?? own);
  const after = panels[index + 1] && upOf(panels[index + 1] ?? own);
  const cut = (section: ResolvedPanel['root'], other: Vec3 | undefined, a: Vec3, b: Vec3): Vec3 | null => {
    if (!other) return null;
    const normal = cross3(sub3(section.te, section.le), add3(up, other));
    return lerp3(a, b, dot3(sub3(section.le, a), normal) / dot3(sub3(b, a), normal));
  };
  return SHAPE.map(([share, height]) => {
    const on = ({ le, te, chordMm }: ResolvedPanel['root']): Vec3 =>
      add3(lerp3(le, te, share), scale3(up, height * chordMm));
    const [a, b] = [on(own.root), on(own.tip)];
    return [cut(own.root, before, a, b) ?? a, cut(own.tip, after, a, b) ?? b];
  });
}

const patchesOf = (lines: readonly (readonly [Vec3, Vec3])[]): Vec3[][] =>
  lines.slice(1).flatMap(([a, b], i) => {
    const [c, d] = lines[i] ?? [];
    return c && d ? [[a, b, d, c]] : [];
  });

const apart2 = (a: Vec2, b: Vec2): number => Math.hypot(a[0] - b[0], a[1] - b[1]);

/** Where a corner of the cut outline lies on the outer paper: bevels that lean outward take that face back, along a fold where one ends there. */
function onPaper(part: Part, p: Vec2, i: number): Vec2 {
  const ends = ({ path }: Part['operations'][number]): Vec2[] => [path[0], path.at(-1)].filter((q) => q !== undefined);
  const here = (operation: Part['operations'][number]): boolean => ends(operation).some((q) => apart2(q, p) < 1e-6);
  const bevels = part.operations.filter((one) => one.kind === 'bevel' && one.face === 'outer' && here(one));
  const full = bevels.filter(({ depthMm = 0 }) => depthMm >= part.thicknessMm);
  if (full.length === 0) return p;
  const fold = part.operations.find((one) => one.kind === 'cutToPaper' && here(one));
  const n = part.outline.length;
  const beside = [part.outline[(i + 1) % n], part.outline[(i + n - 1) % n]].filter((q) => q !== undefined);
  const onBevel = (q: Vec2): boolean => bevels.some((bevel) => ends(bevel).some((end) => apart2(end, q) < 1e-6));
  const to = fold ? ends(fold).find((q) => apart2(q, p) > 1) : beside.find((q) => !onBevel(q));
  const steps = full.map((bevel): Vec2 => {
    const [a, b] = ends(bevel);
    if (!a || !b) throw new RangeError('a bevel has two ends');
    const back = part.thicknessMm * Math.tan(((bevel.angleDeg ?? 0) * Math.PI) / 180);
    const n1: Vec2 = [-(b[1] - a[1]) / apart2(a, b), (b[0] - a[0]) / apart2(a, b)];
    const middle: Vec2 = [(a[0] + b[0]) / 2 + n1[0], (a[1] + b[1]) / 2 + n1[1]];
    const square: Vec2 = inside(part.outline, middle) ? n1 : [-n1[0], -n1[1]];
    if (!to) return [square[0] * back, square[1] * back];
    const u: Vec2 = [(to[0] - p[0]) / apart2(to, p), (to[1] - p[1]) / apart2(to, p)];
    const k = back / (u[0] * square[0] + u[1] * square[1]);
    return [u[0] * k, u[1] * k];
  });
  const mean = (axis: 0 | 1): number => steps.reduce((sum, step) => sum + step[axis], 0) / steps.length;
  return [p[0] + mean(0), p[1] + mean(1)];
}

/** The skin as its outer paper alone, which all its folds turn about. */
function paperOf(part: Part) {
  const folds = part.operations.filter(
    ({ kind, angleDeg }) => (kind === 'cutToPaper' || kind === 'crease') && angleDeg,
  );
  expect(folds.every(({ face }) => face === 'inner')).toBe(true);
  const place = (q: Vec2): Vec2 => {
    const i = part.outline.findIndex((p) => apart2(p, q) < 1e-6);
    return onPaper(part, q, i);
  };
  return {
    outline: part.outline.map((p, i) => onPaper(part, p, i)),
    thicknessMm: 0,
    face: part.face,
    operations: folds.map((fold) => ({ ...fold, path: fold.path.map(place) })),
  };
}

const partOf = (parts: readonly Part[], key: string): Part => {
  const part = parts.find((entry) => entry.key === key);
  if (!part) throw new RangeError(`no part ${key}, only ${parts.map((entry) => entry.key).join(', ')}`);
  return part;
};

const straight = airframe({ surfaces: [surface({ panels: [folded()] })] });
const tapered = airframe({
  surfaces: [
    surface({
      incidenceDeg: 2,
      panels: [folded({ lengthMm: 420, rootChordMm: 210, tipChordMm: 150, sweepDeg: 6 })],
    }),
  ],
});
const apartFromCentre = airframe({
  surfaces: [
    surface({
      mount: { to: 'datum', at: [0, 30, 0] },
      incidenceDeg: 2,
      panels: [folded({ lengthMm: 420, rootChordMm: 210, tipChordMm: 150, sweepDeg: 6 })],
    }),
  ],
});
const dihedral = airframe({
  surfaces: [
    surface({
      panels: [
        folded({ lengthMm: 260, rootChordMm: 200, tipChordMm: 200, dihedralDeg: 2 }),
        folded({ id: 'p2', lengthMm: 240, rootChordMm: 200, tipChordMm: 140, sweepDeg: 4, dihedralDeg: 6 }),
      ],
    }),
  ],
});

describe('folded skins laid on the outside of their section', () => {
  it.each([
    { name: 'straight', document: straight, keys: ['p1'] },
    { name: 'tapered, swept, at an incidence', document: tapered, keys: ['p1'] },
    { name: 'two panels with dihedral', document: dihedral, keys: ['p1', 'p2'] },
    { name: 'the same of 6 mm', document: { ...dihedral, materials: [board({ thicknessMm: 6 })] }, keys: ['p1', 'p2'] },
  ])('$name', ({ document, keys }) => {
    const { wing, parts } = made(document);
    for (const [index, id] of keys.entries()) {
      const lines = linesOf(wing, index);
      const own = wing.panels[index];
      if (!own) throw new RangeError('panel');
      const wanted = { patches: patchesOf(lines), corners: lines.flat(), looks: upOf(own) };
      const skin = partOf(parts, `wing/${id}/skin/stbd`);
      expect(skin.face).toBe('inner');
      const paper = paperOf(skin);
      const { faults, worstMm } = refold(paper, wanted);
      expect({ id, faults, worstMm }).toMatchObject({ faults: [] });
      const port = paperOf(partOf(parts, `wing/${id}/skin/port`));
      const mirrored = {
        patches: wanted.patches.map((patch) => patch.map(mirror3)),
        corners: wanted.corners.map(mirror3),
        looks: mirror3(wanted.looks),
      };
      expect(refold(port, mirrored).faults).toEqual([]);
    }
  });

  it('keep every line along the panel and every edge across it to 0.01 mm', () => {
    const { wing, parts } = made(apartFromCentre);
    const own = wing.panels[0];
    if (!own) throw new RangeError('panel');
    const lines = linesOf(wing, 0, false);
    const skin = partOf(parts, 'wing/p1/skin/stbd');
    const { worstMm } = refold(paperOf(skin), { patches: patchesOf(lines), corners: lines.flat(), looks: upOf(own) });
    expect(worstMm.size).toBeLessThan(0.01);
    expect(worstMm.off).toBeLessThan(0.02);
    // What a free panel's skin is cut from is the outside itself: area for area.
    const area = patchesOf(lines).reduce((sum, [a, b, c, d]) => {
      if (!a || !b || !c || !d) throw new RangeError('a patch has four corners');
      return sum + length3(cross3(sub3(c, a), sub3(d, b))) / 2;
    }, 0);
    expect(signedArea(skin.outline) / area).toBeCloseTo(1, 6);
  });

  it('are told apart from a section that is 0.5 mm higher', () => {
    const { wing, parts } = made(tapered);
    const own = wing.panels[0];
    if (!own) throw new RangeError('panel');
    const lines = linesOf(wing, 0).map(([a, b], i): [Vec3, Vec3] =>
      i === 1 ? [add3(a, scale3(upOf(own), 0.5)), add3(b, scale3(upOf(own), 0.5))] : [a, b],
    );
    const { faults } = refold(paperOf(partOf(parts, 'wing/p1/skin/stbd')), {
      patches: patchesOf(lines),
      corners: lines.flat(),
      looks: upOf(own),
    });
    expect(faults.length).toBeGreaterThan(0);
  });
});

/** Height of the inner side of the upper skin over the panel's underside, by hand: the outer line less the sheet measured upright. */
function roofMm(share: number, chord: number, sheet: number): number {
  const slope = share <= 0.3 ? 0.12 / 0.3 : 0.12 / 0.7;
  const outer = (share <= 0.3 ? share : 1 - share) * slope * chord;
  return outer - sheet * Math.hypot(1, slope);
}

describe('the web between the skins', () => {
  it('is the outer depth less both skins, and ends where that is under one sheet', () => {
    const { parts } = made(
      airframe({
        surfaces: [
          surface({
            mount: { to: 'datum', at: [0, 30, 0] },
            panels: [
              folded({
                lengthMm: 500,
                rootChordMm: 200,
                tipChordMm: 100,
                section: { ...SECTION, webAt: 0.45, lowerTo: 0.7 },
              }),
            ],
          }),
        ],
      }),
    );
    const web = partOf(parts, 'wing/p1/web/stbd');
    const heights = web.outline.map(([, y]) => y);
    // At the root 200 mm of chord: front face at 0.45, the higher one behind the crest.
    expect(Math.max(...heights) - Math.min(...heights)).toBeCloseTo(roofMm(0.45, 200, 5) - 5, 1);
    // It ends where the chord c leaves 5 mm between the skins: 0.55 x 0.12 / 0.7 c = 5 + 5 + the upper skin measured upright.
    const chord = (10 + 5 * Math.hypot(1, 0.12 / 0.7)) / ((0.55 * 0.12) / 0.7);
    const line = Math.hypot(500, 0.2 * 100);
    const length = Math.max(...web.outline.map(([x]) => x)) - Math.min(...web.outline.map(([x]) => x));
    expect(length).toBeCloseTo(((200 - chord) / 100) * line, 0);
    expect(web.operations.some(({ id, note = '' }) => id === 'web-ends' && note.includes('ends here'))).toBe(true);
  });

  it('touches both skins and stands in neither', () => {
    const { parts } = made(straight);
    const web = partOf(parts, 'wing/p1/web/stbd');
    const [facet] = facetsOf(web);
    if (!facet) throw new RangeError('a web is one piece');
    const { origin, ex, ey } = facet.frame;
    const zs = facet.outline.map(([x, y]) => origin[2] + x * ex[2] + y * ey[2]);
    expect(Math.min(...zs)).toBeCloseTo(5, 6);
    // Under the crest the inner sides of both faces meet: tan of half the fold times the sheet beside it, downward.
    const [front, rear] = [Math.atan(0.4), Math.atan(0.12 / 0.7)];
    const down = (5 / Math.cos((front + rear) / 2)) * Math.cos((front - rear) / 2);
    expect(Math.max(...zs)).toBeCloseTo(0.12 * 190 - down, 6);
  });

  it('stands between the inner sides of both skins where the panel tapers, sweeps and rises', () => {
    const { wing, parts } = made(dihedral);
    for (const [index, id] of ['p1', 'p2'].entries()) {
      const [te, crest, nose, lower] = linesOf(wing, index);
      if (!te || !crest || !nose || !lower) throw new RangeError('four lines');
      /** How far a point stands inside the outer face through two lines, mm. */
      const below = (aft: readonly [Vec3, Vec3], fore: readonly [Vec3, Vec3], p: Vec3): number =>
        -dot3(sub3(p, aft[0]), unit(cross3(sub3(aft[1], aft[0]), sub3(fore[0], aft[0]))));
      const [facet] = facetsOf(partOf(parts, `wing/${id}/web/stbd`));
      if (!facet) throw new RangeError('a web is one piece');
      const { origin, ex, ey } = facet.frame;
      const normal = cross3(ex, ey);
      const [bottom, top] = [facet.outline.slice(0, 2), facet.outline.slice(2)].map((corners) =>
        corners.map(([x, y]) => add3(origin, add3(scale3(ex, x), scale3(ey, y)))),
      );
      for (const p of bottom ?? []) expect(below(nose, lower, p)).toBeCloseTo(5, 6);
      for (const p of top ?? []) {
        // The top is as high as the roof over the web's thickness: it touches one of its two faces there, and stands in neither.
        const through = [-2.5, -1.25, 0, 1.25, 2.5].map((s) => {
          const q = add3(p, scale3(normal, s));
          return Math.min(below(te, crest, q), below(crest, nose, q)) - 5;
        });
        expect(Math.max(...through)).toBeGreaterThan(-0.3);
        expect(Math.max(...through)).toBeLessThan(0.3);
      }
    }
  });
});

describe('folded wings', () => {
  it('come in mirrored pairs', () => {
    const { parts } = made(dihedral);
    const starboard = parts.filter(({ side }) => side === 'stbd');
    expect(parts.length).toBe(2 * starboard.length);
    for (const part of starboard) {
      const port = partOf(parts, part.key.replace(/stbd$/, 'port'));
      expect(port.mirrorOf).toBe(part.key);
      expect(signedArea(port.outline)).toBeCloseTo(signedArea(part.outline), 9);
      const stands = (one: Part): Vec3[] =>
        facetsOf(one).flatMap(({ outline, frame }) =>
          outline.map(([x, y]) => add3(frame.origin, add3(scale3(frame.ex, x), scale3(frame.ey, y)))),
        );
      const [here, there] = [stands(part), stands(port).map(mirror3)];
      for (const p of here) expect(Math.min(...there.map((q) => length3(sub3(p, q))))).toBeLessThan(1e-6);
    }
  });

  it('stand where the parts say: the middle of each sheet half a thickness inside the outside', () => {
    const { wing, parts } = made(tapered);
    const patches = patchesOf(linesOf(wing, 0));
    const facets = facetsOf(partOf(parts, 'wing/p1/skin/stbd'));
    expect(facets.length).toBe(3);
    for (const { outline, frame } of facets) {
      const normal = cross3(frame.ex, frame.ey);
      const outer = outline.map(([x, y]) =>
        add3(add3(frame.origin, add3(scale3(frame.ex, x), scale3(frame.ey, y))), scale3(normal, -2.5)),
      );
      for (const p of outer)
        expect(Math.min(...patches.map((patch) => toPolygon(p, patch)))).toBeLessThan(TOLERANCE_MM);
    }
  });

  it('are two skins of plain foam, or of a board too small for one', () => {
    for (const material of [board({ kind: 'epp', facesGm2: 0 }), board({ sheets: [{ wMm: 460, hMm: 330 }] })]) {
      const { parts } = made({ ...apartFromCentre, materials: [material] });
      expect(parts.filter(({ side }) => side === 'stbd').map(({ key }) => key)).toEqual([
        'wing/p1/skin-upper/stbd',
        'wing/p1/skin-lower/stbd',
        'wing/p1/web/stbd',
      ]);
      const whole = partOf(made(apartFromCentre).parts, 'wing/p1/skin/stbd');
      const area = (key: string): number => signedArea(partOf(parts, key).outline);
      expect(area('wing/p1/skin-upper/stbd') + area('wing/p1/skin-lower/stbd')).toBeCloseTo(
        signedArea(whole.outline),
        6,
      );
    }
  });

  it('carry controls on the single sheet behind the lower skin, as flat sheet does', () => {
    const wing = (over: Parameters<typeof control>[0]) =>
      made(
        airframe({
          surfaces: [surface({ panels: [folded({ rootChordMm: 200, tipChordMm: 160 })], controls: [control(over)] })],
        }),
      );
    const hung = wing({ from: 0.5, to: 0.95, chordShare: [0.25, 0.3] });
    const skin = partOf(hung.parts, 'wing/p1/skin/stbd');
    const hinge = skin.operations.find(({ id }) => id === 'aileron-hinge');
    expect(hinge).toMatchObject({ kind: 'cutToPaper', face: 'inner' });
    const [a, b] = hinge?.path ?? [];
    if (!a || !b) throw new RangeError('the hinge has two ends');
    // Distance of the hinge from the trailing edge along the sheet: its share of the chord, lengthened by the slope.
    const chord = 200 - 40 * 0.5;
    expect(Math.max(Math.abs(a[1]), Math.abs(b[1]))).toBeGreaterThan(0.25 * chord * Math.hypot(1, 0.12 / 0.7) - 5);
    const separate = wing({ hinge: { kind: 'tape', side: 'upper', bevelDeg: [0, 40] }, neutralDeg: -3 });
    expect(separate.parts.map(({ key }) => key)).toContain('wing/aileron/control/port');
    // Taped on and set straight, its upper face goes on in the skin's own.
    const taped = wing({ hinge: { kind: 'tape', side: 'upper', bevelDeg: [0, 40] } });
    const piece = partOf(taped.parts, 'wing/aileron/control/stbd');
    const patches = patchesOf(linesOf(taped.wing, 0));
    for (const { outline, frame } of facetsOf(piece)) {
      const out = scale3(cross3(frame.ex, frame.ey), piece.face === 'upper' ? 2.5 : -2.5);
      for (const [x, y] of outline) {
        const p = add3(add3(frame.origin, add3(scale3(frame.ex, x), scale3(frame.ey, y))), out);
        expect(Math.min(...patches.map((patch) => toPolygon(p, patch)))).toBeLessThan(0.01);
      }
    }
    const closed = wing({ chordShare: [0.45, 0.3] });
    expect(closed.problems).toContainEqual(
      expect.objectContaining({ code: 'control-on-lower-skin', path: 'surfaces.0.controls.0.chordShare.0' }),
    );
    expect(closed.parts.map(({ key }) => key)).toContain('wing/p1/skin/stbd');
  });
});
