import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Vec3 } from '@/lib/numerics/vec';
import { type Derivatives, derivatives } from './derivatives';
import type { LatticeInput, LatticeSection, LatticeSurface } from './types';

// What must hold for any configuration, whatever the numbers.

const section = (x: number, y: number, z: number, chord: number, incidenceRad = 0): LatticeSection => ({
  le: [x, y, z],
  chord,
  incidenceRad,
});

const WING: LatticeSurface = {
  id: 'wing',
  mirrored: true,
  strips: 8,
  rows: 4,
  sections: [section(0, 0, 0, 210, 0.03), section(15, 280, 4, 180, 0.03), section(70, 590, 38, 120, 0.01)],
};
const TAIL: LatticeSurface = {
  id: 'tail',
  mirrored: true,
  strips: 5,
  rows: 3,
  sections: [section(640, 0, 25, 140), section(650, 230, 25, 110)],
};
const FIN: LatticeSurface = {
  id: 'fin',
  mirrored: false,
  strips: 5,
  rows: 3,
  sections: [section(630, 0, 25, 150), section(690, 0, 190, 90)],
};
const CONTROLS = [
  { id: 'aileron', surfaceId: 'wing', from: 0.5, to: 1, chordShare: [0.2, 0.25] as const },
  { id: 'elevator', surfaceId: 'tail', from: 0, to: 1, chordShare: [0.35, 0.35] as const },
];
const REFERENCE = { area: 2e5, chord: 175, span: 1180, point: [70, 0, 0] as Vec3 };

function solved(surfaces: readonly LatticeSurface[], changes: Partial<LatticeInput> = {}): Derivatives {
  const controls = CONTROLS.filter((c) => surfaces.some((s) => s.id === c.surfaceId));
  const result = derivatives({ surfaces, controls, reference: REFERENCE, ...changes }, 'both');
  if (!result.ok) throw new RangeError(result.problems.map((p) => p.code).join());
  return result.value;
}

/** Every coefficient in one list. */
function coefficients({ symmetric, antisymmetric }: Derivatives): number[] {
  const pairs = [symmetric.base, symmetric.alpha, symmetric.pitchRate, ...symmetric.controls.values()];
  const triples = antisymmetric
    ? [antisymmetric.beta, antisymmetric.rollRate, antisymmetric.yawRate, ...antisymmetric.controls.values()]
    : [];
  return [...pairs.flatMap((e) => [e.lift, e.pitch]), ...triples.flatMap((e) => [e.side, e.roll, e.yaw])];
}

function expectSame(a: Derivatives, b: Derivatives, tolerance: number): void {
  const [x, y] = [coefficients(a), coefficients(b)];
  expect(y).toHaveLength(x.length);
  for (const [i, value] of x.entries()) expect(Math.abs(value - (y[i] ?? Number.NaN))).toBeLessThan(tolerance);
}

const moved = (surface: LatticeSurface, by: Vec3, k = 1): LatticeSurface => ({
  ...surface,
  sections: surface.sections.map((s) => ({
    ...s,
    le: [s.le[0] * k + by[0], s.le[1] * k + by[1], s.le[2] * k + by[2]],
    chord: s.chord * k,
  })),
});

const AIRCRAFT = [WING, TAIL, FIN];
const share = fc.double({ min: 0.05, max: 0.95, noNaN: true });

describe('what changes nothing', () => {
  it('cutting a panel in two', () => {
    fc.assert(
      fc.property(share, (t) => {
        const [root, joint] = WING.sections;
        if (!root || !joint) throw new RangeError('no sections');
        const at = (k: 0 | 1 | 2) => root.le[k] + (joint.le[k] - root.le[k]) * t;
        const cut = section(at(0), at(1), at(2), root.chord + (joint.chord - root.chord) * t, root.incidenceRad);
        const split = { ...WING, sections: [root, cut, ...WING.sections.slice(1)] };
        expectSame(solved(AIRCRAFT), solved([split, TAIL, FIN]), 1e-9);
      }),
      { numRuns: 20 },
    );
  });

  it('making everything k times as large', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.02, max: 50, noNaN: true }), (k) => {
        const reference = {
          area: REFERENCE.area * k * k,
          chord: 175 * k,
          span: 1180 * k,
          point: [70 * k, 0, 0] as Vec3,
        };
        const large = solved(
          AIRCRAFT.map((s) => moved(s, [0, 0, 0], k)),
          { reference },
        );
        expectSame(solved(AIRCRAFT), large, 1e-10);
        expect(large.symmetric.neutralPointX / k).toBeCloseTo(solved(AIRCRAFT).symmetric.neutralPointX, 7);
      }),
      { numRuns: 20 },
    );
  });

  it('moving the datum, but for the neutral point, which moves with it', () => {
    fc.assert(
      fc.property(fc.double({ min: -900, max: 900, noNaN: true }), (dx) => {
        const reference = { ...REFERENCE, point: [70 + dx, 0, 33] as Vec3 };
        const there = solved(
          AIRCRAFT.map((s) => moved(s, [dx, 0, 33])),
          { reference },
        );
        expectSame(solved(AIRCRAFT), there, 1e-9);
        expect(there.symmetric.neutralPointX - dx).toBeCloseTo(solved(AIRCRAFT).symmetric.neutralPointX, 6);
      }),
      { numRuns: 10 },
    );
  });

  it('listing the surfaces in another order', () => expectSame(solved(AIRCRAFT), solved([FIN, TAIL, WING]), 1e-10));

  it('a fin on the centre plane, for everything symmetric', () => {
    const { symmetric } = solved([WING, TAIL]);
    expect(solved(AIRCRAFT).symmetric.neutralPointX).toBeCloseTo(symmetric.neutralPointX, 9);
  });
});

describe('D5: moving the moment centre aft by h chords (Etkin & Reid, Dynamics of Flight)', () => {
  it('shifts the rate derivatives by algebra alone', () => {
    const h = 0.31;
    const a = solved(AIRCRAFT).symmetric;
    const b = solved(AIRCRAFT, { reference: { ...REFERENCE, point: [70 + h * 175, 0, 0] } }).symmetric;
    expect(b.neutralPointX).toBeCloseTo(a.neutralPointX, 8);
    expect(b.alpha.pitch).toBeCloseTo(a.alpha.pitch + h * a.alpha.lift, 9);
    expect(b.pitchRate.lift).toBeCloseTo(a.pitchRate.lift - 2 * h * a.alpha.lift, 9);
    expect(b.pitchRate.pitch).toBeCloseTo(
      a.pitchRate.pitch + h * a.pitchRate.lift - 2 * h * (a.alpha.pitch + h * a.alpha.lift),
      9,
    );
  });
});

describe('directions', () => {
  const np = (surfaces: readonly LatticeSurface[]) => solved(surfaces).symmetric.neutralPointX;

  it('a tail moves the neutral point aft, and further from further back', () => {
    expect(np([WING, TAIL])).toBeGreaterThan(np([WING]) + 20);
    expect(np([WING, moved(TAIL, [120, 0, 0])])).toBeGreaterThan(np([WING, TAIL]) + 5);
  });

  it('a foreplane moves it forward', () => {
    expect(np([WING, moved(TAIL, [-1000, 0, 0])])).toBeLessThan(np([WING]) - 20);
  });

  it('a fin aft weathercocks and damps yaw, and not without it', () => {
    const [withFin, without] = [solved(AIRCRAFT).antisymmetric, solved([WING, TAIL]).antisymmetric];
    expect(withFin?.beta.yaw).toBeGreaterThan((without?.beta.yaw ?? 0) + 0.05);
    expect(withFin?.yawRate.yaw).toBeLessThan((without?.yawRate.yaw ?? 0) - 0.05);
  });

  it('trailing edge down lifts, a tail pitches the nose down by it, and up-aileron rolls to its side', () => {
    const { symmetric, antisymmetric } = solved(AIRCRAFT);
    expect(symmetric.controls.get('elevator')?.lift).toBeGreaterThan(0.1);
    expect(symmetric.controls.get('elevator')?.pitch).toBeLessThan(-0.5);
    // Starboard down in this case: the right wing rises.
    expect(antisymmetric?.controls.get('aileron')?.roll).toBeLessThan(-0.1);
    expect(antisymmetric?.rollRate.roll).toBeLessThan(-0.3);
  });

  it('leading edge up lifts without angle of attack', () => {
    expect(solved([WING]).symmetric.base.lift).toBeGreaterThan(0.05);
  });

  it('dihedral rolls away from the wind', () => {
    const flat = { ...WING, sections: WING.sections.map((s) => ({ ...s, le: [s.le[0], s.le[1], 0] as Vec3 })) };
    expect(solved([WING]).antisymmetric?.beta.roll).toBeLessThan((solved([flat]).antisymmetric?.beta.roll ?? 0) - 0.02);
  });
});

describe('refinement', () => {
  const at = (n: number) =>
    solved(AIRCRAFT.map((s) => ({ ...s, strips: n * (s.id === 'wing' ? 2 : 1), rows: n - 1 }))).symmetric;

  it('settles: each step changes the neutral point and the slope less, and the last very little', () => {
    const steps = [4, 6, 9, 13].map(at);
    const np = steps.map((s) => s.neutralPointX / 175);
    const change = np.slice(1).map((x, i) => Math.abs(x - (np[i] ?? 0)));
    expect(change[2]).toBeLessThan(0.002);
    expect(Math.max(...np) - Math.min(...np)).toBeLessThan(0.006);
    const slopes = steps.map((s) => s.alpha.lift);
    expect(Math.max(...slopes) / Math.min(...slopes)).toBeLessThan(1.005);
  });
});

describe('A13: a tail in the plane of the wing', () => {
  it('gives one neutral point whatever the strips of the tail, because legs have a core between surfaces', () => {
    const flat = [section(0, 0, 0, 200), section(0, 600, 0, 200)];
    const tail = [section(620, 0, 0, 130), section(620, 220, 0, 130)];
    const reference = { area: 240_000, chord: 200, span: 1200, point: [70, 0, 0] as Vec3 };
    const spread = (coreShare: number) => {
      const nps = [5, 6, 7, 8, 9, 10, 11, 12, 13].map(
        (strips) =>
          solved(
            [
              { ...WING, strips: 10, sections: flat },
              { ...TAIL, strips, sections: tail },
            ],
            {
              reference,
              options: { coreShare },
              controls: [],
            },
          ).symmetric.neutralPointX / 200,
      );
      return Math.max(...nps) - Math.min(...nps);
    };
    expect(spread(0.3)).toBeLessThan(0.003);
    expect(spread(0)).toBeGreaterThan(0.01);
  });
});

describe('a step in chord', () => {
  it('is two runs side by side: a step that shrinks to nothing is no step', () => {
    const outer = section(12, 300, 0, 180);
    const stepped = (step: number) =>
      solved([
        {
          ...WING,
          sections: [
            section(0, 0, 0, 200),
            section(12, 300, 0, 180),
            { ...outer, chord: 180 + step },
            section(40, 600, 0, 120),
          ],
        },
      ]).symmetric;
    const smooth = stepped(0);
    expect(stepped(1e-7).alpha.lift).toBeCloseTo(smooth.alpha.lift, 6);
    expect(stepped(30).alpha.lift).toBeGreaterThan(smooth.alpha.lift);
  });
});

describe('what cannot be worked out', () => {
  const code = (surfaces: readonly LatticeSurface[]) => {
    const result = derivatives({ surfaces, controls: [], reference: REFERENCE }, 'both');
    return result.ok ? 'solved' : result.problems.map((p) => `${p.code} ${p.path}`).join();
  };

  it.each([
    ['no surface', [], 'no-lifting-surface surfaces'],
    ['only a fin', [FIN], 'no-lifting-surface surfaces'],
    [
      'a zero chord',
      [{ ...WING, sections: WING.sections.map((s) => ({ ...s, chord: 0 })) }],
      'surface-without-chord wing',
    ],
    [
      'no length',
      [{ ...WING, sections: WING.sections.map((s) => ({ ...s, le: [0, 5, 0] as Vec3 })) }],
      'surface-without-length wing',
    ],
    ['one wing alone', [{ ...WING, mirrored: false }], 'surface-one-sided wing'],
    ['a fin with an image', [WING, { ...FIN, mirrored: true }], 'surface-doubled fin'],
    [
      'not a number',
      [{ ...WING, sections: WING.sections.map((s) => ({ ...s, chord: Number.NaN })) }],
      'surface-not-finite wing',
    ],
  ] as const)('%s', (_, surfaces, expected) => expect(code(surfaces)).toBe(expected));

  it('two surfaces in the same place', () => {
    expect(code([WING, { ...WING, id: 'again' }])).toBe('coincident-surfaces again');
    const part = { ...WING, id: 'part', sections: [section(20, 100, 4 / 2.8, 90), section(30, 250, 10 / 2.8, 80)] };
    expect(code([WING, part])).toBe('coincident-surfaces part');
  });

  it('panels of one surface that come back over each other, or turn back on the spot', () => {
    const folded = (points: readonly (readonly [number, number])[]) => ({
      ...WING,
      sections: points.map(([y, z]) => section(0, y, z, 200)),
    });
    expect(
      code([
        folded([
          [0, 0],
          [300, 0],
          [300, 150],
          [300, 10],
        ]),
      ]),
    ).toBe('surface-folds-on-itself wing');
    expect(
      code([
        folded([
          [0, 0],
          [300, 0],
          [350, 200],
          [150, 200],
          [200, -50],
        ]),
      ]),
    ).toBe('surface-folds-on-itself wing');
    expect(
      code([
        folded([
          [0, 0],
          [260, -150],
          [265, 150],
        ]),
      ]),
    ).toBe('solved');
    expect(
      code([
        folded([
          [0, 0],
          [300, 0],
          [300, 120],
        ]),
      ]),
    ).toBe('solved');
  });

  it('more surfaces than anyone flies', () => {
    const many = Array.from({ length: 80 }, (_, k) => ({
      ...WING,
      id: `w${k}`,
      sections: WING.sections.map((s) => ({ ...s, le: [s.le[0], s.le[1], s.le[2] + 200 * k] as Vec3 })),
    }));
    expect(code(many)).toBe('lattice-too-large surfaces');
  });

  it('a surface that slices lengthwise through another, but not a fin slotted through it', () => {
    const cutting = { ...WING, id: 'cutting', sections: [section(0, 0, -20, 200), section(10, 500, 60, 150)] };
    expect(code([WING, cutting])).toBe('surfaces-cross cutting');
    const slotted = { ...FIN, mirrored: true, sections: [section(640, 150, 5, 120), section(660, 150, 120, 80)] };
    expect(derivatives({ surfaces: [WING, TAIL, slotted], controls: [], reference: REFERENCE }, 'both').ok).toBe(true);
  });
});
