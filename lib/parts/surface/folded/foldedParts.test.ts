import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { Material } from '@/lib/airframe/schema/stock';
import type { SectionShape, Surface } from '@/lib/airframe/schema/surface';
import { airframe, board, boom, panel, surface, tube } from '@/tests/support/airframe';
import { assertParts } from '../../validate';
import { foldedParts } from './foldedParts';

type Folded = Extract<SectionShape, { kind: 'folded' }>;
type Spar = Surface['spars'][number];

const SECTION: Folded = { kind: 'folded', thicknessShare: 0.12, maxAt: 0.3, lowerTo: 0.7, webAt: 0.3 };

function made(
  section: Partial<Folded> = {},
  over: { surface?: Partial<Surface>; material?: Partial<Material>; tipChordMm?: number; lengthMm?: number } = {},
) {
  const document = airframe({
    materials: [board(over.material)],
    surfaces: [
      surface({
        panels: [
          panel({
            section: { ...SECTION, ...section },
            rootChordMm: 200,
            tipChordMm: over.tipChordMm ?? 180,
            lengthMm: over.lengthMm ?? 310,
          }),
        ],
        ...over.surface,
      }),
    ],
  });
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError(JSON.stringify(resolved.problems));
  const [wing] = resolved.value.surfaces;
  if (!wing) throw new RangeError('a wing');
  const development = foldedParts(wing, wing.panels, {
    controls: resolved.value.controls,
    materials: new Map(document.materials.map((entry) => [entry.id, entry])),
    tubes: new Map(document.tubes.map((entry) => [entry.id, entry])),
    booms: resolved.value.booms.flatMap((place) => {
      const own = document.booms.find(({ id }) => id === place.boomId);
      return own ? [{ boom: own, resolved: place, tube: tube() }] : [];
    }),
  });
  assertParts(development.parts);
  return development;
}

const codes = (development: ReturnType<typeof made>) => development.problems.map(({ code, path }) => ({ code, path }));
const at = (field: string) => `surfaces.0.panels.0.section.${field}`;
const stbd = (development: ReturnType<typeof made>) =>
  development.parts.filter(({ side }) => side === 'stbd').map(({ key }) => key);
const skinOf = (development: ReturnType<typeof made>) => {
  const skin = development.parts.find(({ key }) => key === 'wing/p1/skin/stbd');
  if (!skin) throw new RangeError('no skin');
  return skin;
};

describe('a folded panel that can be built', () => {
  it('is one skin and one web a side, with nothing to say', () => {
    const development = made();
    expect(development.problems).toEqual([]);
    expect(stbd(development)).toEqual(['wing/p1/skin/stbd', 'wing/p1/web/stbd']);
    const names = development.parts.map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
  });

  it('folds at the leading edge and at its thickest place, inner faces together, each with half the angle on both sides', () => {
    const { operations, face } = skinOf(made());
    expect(face).toBe('inner');
    // Nose: 180 degrees less atan(0.12 / 0.3). Crest: that angle and atan(0.12 / 0.7). Without taper or sweep in the way: nearly so here.
    const nose = operations.find(({ id }) => id === 'fold-nose');
    const crest = operations.find(({ id }) => id === 'fold-crest');
    const deg = (rise: number, run: number) => (Math.atan(rise / run) * 180) / Math.PI;
    expect(nose).toMatchObject({ kind: 'cutToPaper', face: 'inner' });
    expect(Math.abs((nose?.angleDeg ?? 0) - (180 - deg(0.12, 0.3)))).toBeLessThan(0.2);
    expect(Math.abs((crest?.angleDeg ?? 0) - (deg(0.12, 0.3) + deg(0.12, 0.7)))).toBeLessThan(0.2);
    for (const fold of [nose, crest]) {
      const groove = operations.find(({ id }) => id === `${fold?.id}-bevel`);
      expect(groove).toMatchObject({ kind: 'bevel', face: 'inner', path: fold?.path });
      expect(groove?.angleDeg).toBeCloseTo((fold?.angleDeg ?? 0) / 2, 9);
    }
  });

  it('turns a reflexed tail up along a fold that opens', () => {
    const { operations } = skinOf(made({ reflexDeg: 4 }));
    const fold = operations.find(({ id }) => id === 'fold-reflex');
    expect(fold?.angleDeg).toBeLessThan(-3.5);
    expect(fold?.angleDeg).toBeGreaterThan(-4.5);
    expect(operations.some(({ id }) => id === 'fold-reflex-bevel')).toBe(false);
  });

  it('marks stations, glue and an asked turbulator', () => {
    const { operations } = skinOf(made({ turbulatorMm: 0.8 }));
    const ids = operations.map(({ id }) => id);
    for (const id of ['station-100', 'station-200', 'station-300', 'web-lower', 'web-upper', 'rear-glue', 'nose-glue'])
      expect(ids).toContain(id);
    expect(operations.find(({ id }) => id === 'turbulator')).toMatchObject({ face: 'outer' });
    expect(ids.includes('tip-glue')).toBe(false);
  });

  it('closes a gap as high as a sheet with a rear web', () => {
    const development = made({ lowerTo: 0.45, maxAt: 0.2, webAt: 0.2, thicknessShare: 0.15 });
    expect(codes(development)).toEqual([]);
    expect(stbd(development)).toContain('wing/p1/rear-web/stbd');
  });

  it('marks a boom that lies on its lower skin', () => {
    const resolved = resolve(
      airframe({
        surfaces: [surface({ panels: [panel({ section: SECTION })] })],
        booms: [boom({ mount: { to: 'datum', at: [40, 90, 2] } })],
      }),
    );
    if (!resolved.ok) throw new RangeError('resolves');
    const [wing] = resolved.value.surfaces;
    const [place] = resolved.value.booms;
    if (!wing || !place) throw new RangeError('a wing and a boom');
    const { parts } = foldedParts(wing, wing.panels, {
      controls: [],
      materials: new Map([['board', board()]]),
      tubes: new Map([['tube', tube()]]),
      booms: [{ boom: boom(), resolved: place, tube: tube() }],
    });
    assertParts(parts);
    const slot = parts[0]?.operations.find(({ id }) => id === 'boom-slot');
    // Its axis stands 0.5 mm under the middle of the sheet, which is 2.5 mm up: 2.5 + 2 - 0.5 deep, from outside.
    expect(slot).toMatchObject({ kind: 'foamOut', face: 'outer', depthMm: expect.closeTo(4, 6) });
  });
});

describe('a folded panel that cannot', () => {
  it.each([
    ['whose lower skin ends ahead of the thickest place', { lowerTo: 0.25 }, 'lower-skin-ends-early', 'lowerTo'],
    ['whose lower skin runs on under a single sheet', { lowerTo: 0.95 }, 'lower-skin-too-long', 'lowerTo'],
    ['that leaves a gap too low for a web', { lowerTo: 0.62 }, 'lower-skin-gap', 'lowerTo'],
    ['thinner than its two skins', { thicknessShare: 0.05 }, 'section-thinner-than-skins', 'thicknessShare'],
    [
      'whose nose is too sharp',
      { thicknessShare: 0.09, maxAt: 0.5, webAt: 0.5, lowerTo: 0.52 },
      'fold-too-sharp',
      'thicknessShare',
    ],
    ['whose web stands in the nose', { webAt: 0.05 }, 'web-outside-section', 'webAt'],
    ['whose web stands behind the lower skin', { webAt: 0.8 }, 'web-outside-section', 'webAt'],
    ['whose web is lower than a sheet', { webAt: 0.6 }, 'web-thinner-than-sheet', 'webAt'],
  ] as const)('%s', (_, section, code, field) => {
    const development = made(section);
    const found = development.problems.find((problem) => problem.code === code);
    expect(codes(development)).toContainEqual({ code, path: at(field) });
    expect(found?.fix?.length).toBeGreaterThan(10);
  });

  it('names shares that work: what its fix says is free of that problem', () => {
    for (const section of [{ lowerTo: 0.95 }, { lowerTo: 0.62 }]) {
      const [first] = made(section, { tipChordMm: 200 }).problems;
      const share = Number(/share (0\.\d+)/.exec(first?.fix ?? '')?.[1]);
      expect(share).toBeGreaterThan(0.3);
      expect(codes(made({ lowerTo: share }, { tipChordMm: 200 }))).toEqual([]);
    }
  });

  it('of a sheet that does not fold, or not this far', () => {
    expect(codes(made({}, { material: { kind: 'ply', facesGm2: 0 } }))).toEqual([
      { code: 'sheet-does-not-fold', path: 'surfaces.0.panels.0.materialId' },
    ]);
    // A crest of atan(0.2 / 0.3) + atan(0.2 / 0.7) = 50 degrees: EPP bends so far, extruded foam does not.
    const steep = { thicknessShare: 0.2, lowerTo: 0.85 };
    expect(codes(made(steep, { material: { kind: 'xps', facesGm2: 0 } }))).toContainEqual({
      code: 'fold-too-sharp',
      path: at('thicknessShare'),
    });
    expect(codes(made(steep, { material: { kind: 'epp', facesGm2: 0 } })).map(({ code }) => code)).not.toContain(
      'fold-too-sharp',
    );
  });

  it('says what of its surface is not built yet, and still comes', () => {
    const development = made(
      {},
      {
        surface: {
          tip: { shape: 'rounded', radiusMm: 20 },
          cutouts: [
            {
              id: 'c',
              outline: [
                [0.1, 0.2],
                [0.2, 0.2],
                [0.2, 0.4],
              ],
            },
          ],
        },
      },
    );
    expect(codes(development)).toEqual([
      { code: 'not-built-yet', path: 'surfaces.0.cutouts.0' },
      { code: 'not-built-yet', path: 'surfaces.0.tip.shape' },
    ]);
    expect(stbd(development)).toContain('wing/p1/skin/stbd');
  });
});

describe('tubes in a folded panel', () => {
  const spar = (over: Partial<Spar> = {}): Spar => ({
    id: 'spar',
    tubeId: 'tube',
    chordShare: [0.4, 0.4],
    from: 0,
    to: 0.9,
    let: 'inside',
    face: 'lower',
    ...over,
  });
  const withSpar = (over: Partial<Spar>, section: Partial<Folded> = {}) =>
    made(section, { surface: { spars: [spar(over)] } });

  it('lie on the lower skin inside, a length for each side', () => {
    const development = withSpar({});
    expect(development.problems).toEqual([]);
    expect(development.stockPieces).toMatchObject([{ key: 'wing/spar/tube', count: 2 }]);
    // 310 mm of panel, nine tenths of it; the middle of the tube 5 + 2 mm up.
    expect(development.stockPieces[0]?.lengthMm).toBeCloseTo(0.9 * Math.hypot(310, 0.15 * 20), 6);
    expect(development.stockPieces[0]?.from[2]).toBeCloseTo(7, 9);
    expect(skinOf(development).operations.find(({ id }) => id === 'spar-seat')).toMatchObject({
      kind: 'reference',
      face: 'inner',
      widthMm: 4,
    });
  });

  it('are let into the outer face of a skin', () => {
    const development = withSpar({ let: 'face', face: 'upper' });
    expect(development.problems).toEqual([]);
    expect(skinOf(development).operations.find(({ id }) => id === 'spar-channel')).toMatchObject({
      kind: 'foamOut',
      face: 'outer',
      depthMm: 4,
    });
  });

  const refused: [string, Partial<Spar>, string, string][] = [
    ['outside the section', { chordShare: [0.62, 0.62] }, 'spar-outside-section', 'chordShare'],
    ['in the nose', { chordShare: [0.08, 0.08] }, 'spar-outside-section', 'chordShare'],
    ['through the web', { chordShare: [0.31, 0.31] }, 'spar-in-web', 'chordShare'],
    ['across the web', { chordShare: [0.24, 0.4] }, 'spar-in-web', 'chordShare'],
    ['through both skins', { let: 'through' }, 'not-built-yet', 'let'],
    ['without a tube', { tubeId: undefined, materialId: 'board' }, 'not-built-yet', 'materialId'],
    ['across a fold', { let: 'face', face: 'upper', chordShare: [0.2, 0.4] }, 'not-built-yet', 'chordShare'],
    ['off the lower skin', { let: 'face', chordShare: [0.8, 0.8] }, 'spar-off-sheet', 'chordShare'],
  ];
  it.each(refused)('are refused %s', (_, over, code, field) => {
    const development = withSpar(over);
    expect(codes(development)).toContainEqual({ code, path: `surfaces.0.spars.0.${field}` });
    expect(development.stockPieces).toEqual([]);
  });
});
