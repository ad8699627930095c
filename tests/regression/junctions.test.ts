import { describe, expect, it } from 'vitest';
import type { LatticeOptions, LatticeSurface } from '@/lib/aero/lattice/types';
import { coefficients, DEFAULT_MESH, everySurface, inputOf, named, solved } from './support/configurations';

// Where surfaces meet, and where their trailing legs pass close to another's control points. Bounds are own tests of refinement and those
// of another program written for such checks; no outside evidence.

/** A core of 0.3 strips between every two surfaces, whatever their angle; none at all. */
const CORE_EVERYWHERE: Partial<LatticeOptions> = { parallel: -1, coreShare: 0.3 };
const NO_CORE: Partial<LatticeOptions> = { coreShare: 0 };

describe('a fin on a tail: a leg core between them destroys the junction', () => {
  const trainer = (options: Partial<LatticeOptions>) => coefficients('trainer', DEFAULT_MESH, options);
  const [usual, everywhere, none] = [trainer({}), trainer(CORE_EVERYWHERE), trainer(NO_CORE)];
  const change = (id: string) => (everywhere[id] ?? Number.NaN) / (usual[id] ?? Number.NaN) - 1;

  it('would take 10 to 20 % of the weathercock stability and of the damping in yaw', () => {
    for (const id of ['Cn_beta', 'Cn_r']) {
      expect(change(id)).toBeLessThan(-0.1);
      expect(change(id)).toBeGreaterThan(-0.2);
    }
  });

  it('so the product’s core leaves the fin alone', () => {
    for (const id of ['Cn_beta', 'Cn_r', 'Cn_d_rud'])
      expect(Math.abs((usual[id] ?? Number.NaN) / (none[id] ?? Number.NaN) - 1)).toBeLessThan(0.002);
  });
});

describe('a tail between two fins', () => {
  const base = inputOf('trainer');
  const fins: LatticeSurface = {
    id: 'fins',
    mirrored: true,
    strips: 5,
    rows: 4,
    sections: [
      { le: [0.6, 0.22, 0.02], chord: 0.16, incidenceRad: 0 },
      { le: [0.63, 0.22, 0.16], chord: 0.12, incidenceRad: 0 },
    ],
  };
  const twinFin = (options: Partial<LatticeOptions>) =>
    named(
      solved({
        ...base,
        surfaces: [...base.surfaces.filter(({ id }) => id !== 'fin'), fins],
        controls: base.controls.filter(({ surfaceId }) => surfaceId !== 'fin'),
        options,
      }),
    );
  const [usual, everywhere, none] = [twinFin({}), twinFin(CORE_EVERYWHERE), twinFin(NO_CORE)];

  it('a core everywhere would lose the end plates: neutral point over 1 % of the chord forward, over 5 % of the damping in pitch', () => {
    expect((everywhere.xnp ?? 0) - (usual.xnp ?? 0)).toBeLessThan(-0.01 * base.reference.chord);
    expect((everywhere.Cm_q ?? 0) / (usual.Cm_q ?? 1)).toBeLessThan(0.95);
  });

  it('so the product’s core leaves both alone', () => {
    expect(Math.abs((usual.xnp ?? 0) - (none.xnp ?? 0))).toBeLessThan(0.002 * base.reference.chord);
    expect(Math.abs((usual.Cm_q ?? 0) / (none.Cm_q ?? 1) - 1)).toBeLessThan(0.002);
  });
});

describe('A13: the trainer with its tail in the plane of the wing', () => {
  const base = inputOf('trainer');
  const strips = [5, 6, 7, 8, 9, 10, 11, 12, 13];
  const neutralPoints = (options: Partial<LatticeOptions>) =>
    strips.map((count) => {
      const surfaces = base.surfaces.map((s) =>
        s.id === 'htail'
          ? {
              ...s,
              strips: count,
              sections: s.sections.map((cut) => ({ ...cut, le: [cut.le[0], cut.le[1], 0] as const })),
            }
          : s,
      );
      return solved({ ...base, surfaces, options }).symmetric.neutralPointX / base.reference.chord;
    });

  it('neutral point at 54.0 % of the chord, within 0.3 %, whatever the strips of the tail, spread under 0.3 %', () => {
    const got = neutralPoints({});
    for (const share of got) expect(Math.abs(share - 0.54)).toBeLessThan(0.003);
    expect(Math.max(...got) - Math.min(...got)).toBeLessThan(0.003);
  });

  it('without the leg core it jumps by several per cent', () => {
    const got = neutralPoints(NO_CORE);
    expect(Math.max(...got) - Math.min(...got)).toBeGreaterThan(0.03);
  });
});

describe('fins standing on a wing: a strip begins at each foot', () => {
  const canard = (strips: number, alignJunctions: boolean) =>
    coefficients('canard', (name) => ({ strips: name === 'wing' ? strips : 8, rows: 4 }), { alignJunctions });
  const spread = (id: string, align: boolean) => {
    const values = [10, 11, 12, 13].map((strips) => canard(strips, align)[id] ?? Number.NaN);
    return Math.max(...values) - Math.min(...values);
  };

  it('so weathercock stability does not swing with the number of strips', () => {
    expect(spread('Cn_beta', true)).toBeLessThan(0.004);
    expect(spread('Cn_beta', false)).toBeGreaterThan(0.01);
  });

  it('nor roll by sideslip, to which wing and fins give opposite shares', () => {
    expect(spread('Cl_beta', true)).toBeLessThan(0.004);
    expect(spread('Cl_beta', false)).toBeGreaterThan(0.03);
  });

  it('strips that pass beside the feet by the same share of their width settle elsewhere', () => {
    const [met, missed] = [true, false].map((alignJunctions) =>
      [everySurface(12, 6), everySurface(24, 8)].map(
        (mesh) => coefficients('canard', mesh, { alignJunctions }).Cl_beta ?? 0,
      ),
    );
    if (!met || !missed) throw new RangeError('two ways');
    // Either way refining changes little; between the two it is far.
    for (const [coarse = 0, fine = 0] of [met, missed]) expect(Math.abs(fine - coarse)).toBeLessThan(0.002);
    expect(Math.abs((met[1] ?? 0) - (missed[1] ?? 0))).toBeGreaterThan(0.02);
  });
});

describe('a fin that stands a slot’s depth above its tail and rises through the height of the wing ahead', () => {
  // Metres. The wing's centre-line leg runs into the plane of the fin, 30 mm above its foot; fin and tail are 2 mm apart as drawn.
  const cut = (x: number, y: number, z: number, chord: number) => ({ le: [x, y, z] as const, chord, incidenceRad: 0 });
  const yawOf = (finStrips: number, gap: number) => {
    const { antisymmetric } = solved({
      surfaces: [
        {
          id: 'wing',
          mirrored: true,
          strips: 10,
          rows: 5,
          sections: [cut(0, 0, 0, 0.215), cut(0, 0.5, 0.0175, 0.215)],
        },
        {
          id: 'tail',
          mirrored: true,
          strips: 6,
          rows: 4,
          sections: [cut(0.5, 0, -0.032, 0.13), cut(0.5, 0.2, -0.032, 0.13)],
        },
        {
          id: 'fin',
          mirrored: false,
          strips: finStrips,
          rows: 4,
          sections: [cut(0.49, 0, -0.032 + gap, 0.15), cut(0.529, 0, 0.12, 0.1)],
        },
      ],
      controls: [],
      reference: { area: 0.215, chord: 0.215, span: 1, point: [0.07, 0, 0] },
    });
    return { weathercock: antisymmetric?.beta.yaw ?? Number.NaN, byRoll: antisymmetric?.rollRate.yaw ?? Number.NaN };
  };
  const found = [4, 6, 7, 8, 12, 16].map((strips) => yawOf(strips, 0.002));

  it('has one weathercock stability, whatever its strips, within 3 %', () => {
    const values = found.map(({ weathercock }) => weathercock);
    expect(Math.max(...values) / Math.min(...values)).toBeLessThan(1.03);
  });

  it('which is that of a fin on the tail itself, within 2 %', () => {
    expect(Math.abs(yawOf(8, 0.002).weathercock / yawOf(8, 0).weathercock - 1)).toBeLessThan(0.02);
  });

  it('and one yawing moment by roll rate, within 0.005', () => {
    const values = found.map(({ byRoll }) => byRoll);
    expect(Math.max(...values) - Math.min(...values)).toBeLessThan(0.005);
  });
});
