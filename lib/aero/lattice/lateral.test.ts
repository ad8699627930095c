import { describe, expect, it } from 'vitest';
import { derivatives } from './derivatives';
import { farField, inducedDragOf, stripCirculation } from './farField';
import { lateralAt, lateralLoads } from './lateral';
import type { LatticeInput, LatticeSection, LatticeSurface } from './types';

const cut = (x: number, y: number, z: number, chord: number): LatticeSection => ({
  le: [x, y, z],
  chord,
  incidenceRad: 0,
});
const wing = (sections: readonly LatticeSection[], over: Partial<LatticeSurface> = {}): LatticeSurface => ({
  id: 'wing',
  mirrored: true,
  strips: 12,
  rows: 4,
  sections,
  ...over,
});
const input = (surfaces: readonly LatticeSurface[], over: Partial<LatticeInput> = {}): LatticeInput => ({
  surfaces,
  controls: [],
  reference: { area: 6, chord: 1, span: 6, point: [0.25, 0, 0] },
  ...over,
});

/** Roll and yaw of an aircraft at a lift coefficient. */
function at(problem: LatticeInput, cl: number) {
  const result = derivatives(problem, 'both');
  if (!result.ok) throw new RangeError('refused');
  const { solution, symmetric, antisymmetric } = result.value;
  const field = farField(solution.lattice);
  const alphaRad = (cl - symmetric.base.lift) / symmetric.alpha.lift;
  return {
    lateral: lateralAt(lateralLoads(solution, field), problem.reference, alphaRad, new Map()),
    antisymmetric,
    solution,
    field,
  };
}

const straight = input([wing([cut(0, 0, 0, 1), cut(0, 3, 0, 1)])]);
const swept = input([wing([cut(0, 0, 0, 1), cut(3, 3, 0, 1)])], {
  reference: { area: 6, chord: 1, span: 6, point: [1.75, 0, 0] },
});
const withFin = input([
  wing([cut(0, 0, 0, 1), cut(0, 3, 0.3, 1)]),
  wing([cut(4, 0, 0, 1), cut(4.3, 0, 1, 0.6)], { id: 'fin', mirrored: false, strips: 5 }),
]);

describe('roll and yaw at an angle of attack', () => {
  it('without lift is what the plain derivatives are', () => {
    const { lateral, antisymmetric } = at(withFin, 0);
    for (const rate of ['beta', 'rollRate', 'yawRate'] as const)
      for (const k of ['side', 'roll', 'yaw'] as const)
        expect(lateral[rate][k]).toBeCloseTo(antisymmetric?.[rate][k] ?? Number.NaN, 9);
  });

  it('a straight wing rolls into a yaw by about a quarter of its lift, and yaws away from a roll', () => {
    const { lateral } = at(straight, 0.5);
    expect(lateral.yawRate.roll / 0.5).toBeGreaterThan(0.22);
    expect(lateral.yawRate.roll / 0.5).toBeLessThan(0.3);
    expect(lateral.rollRate.yaw).toBeLessThan(0);
  });

  it('sweep works like dihedral, the more so with lift, and forward sweep against it', () => {
    const [low, high] = [at(swept, 0.2), at(swept, 0.6)].map(({ lateral }) => lateral.beta.roll);
    expect(low).toBeLessThan(-0.02);
    expect((high ?? 0) / (low ?? 1)).toBeCloseTo(3, 1);
    const forward = input([wing([cut(0, 0, 0, 1), cut(-3, 3, 0, 1)])]);
    expect(at(forward, 0.5).lateral.beta.roll).toBeGreaterThan(0);
  });

  it('is the same about another point once moved there: sideslip does not ask where it is measured', () => {
    const moved = { ...swept, reference: { ...swept.reference, point: [2.5, 0, 0.4] as const } };
    const [a, b] = [at(swept, 0.4).lateral.beta, at(moved, 0.4).lateral.beta];
    expect(b.side).toBeCloseTo(a.side, 9);
    // Cn' = Cn + (x' - x) CY / b, in stability axes nearly; the roll arm of a side force is its height.
    expect(b.yaw - a.yaw).toBeCloseTo((0.75 * a.side) / 6, 2);
  });

  it('a swept-back wing is steadied in yaw by its drag in sideslip', () => {
    expect(at(swept, 0.6).lateral.beta.yaw).toBeGreaterThan(at(straight, 0.6).lateral.beta.yaw);
  });
});

describe('the wake far behind', () => {
  const cdi = ({ solution, field }: ReturnType<typeof at>, area: number) =>
    inducedDragOf(field, stripCirculation(solution.lattice, solution.symmetric, 3, 1), area);

  it('costs no less than an elliptic load does, for any flat wing', () => {
    for (const taper of [0.2, 0.45, 1])
      for (const sweep of [-0.4, 0, 0.8]) {
        const flat = input([wing([cut(0, 0, 0, 1), cut(3 * sweep, 3, 0, taper)])]);
        const area = 3 * (1 + taper);
        const solved = at(flat, 0);
        const result = derivatives({ ...flat, reference: { ...flat.reference, area } }, 'symmetric');
        if (!result.ok) throw new RangeError('refused');
        const lift = result.value.symmetric.alpha.lift;
        const efficiency = lift ** 2 / (Math.PI * (36 / area) * cdi(solved, area));
        expect(efficiency).toBeLessThan(1.005);
        expect(efficiency).toBeGreaterThan(0.85);
      }
  });

  it('the same load on surfaces shifted along the stream costs the same (Munk, stagger)', () => {
    const tail = (x: number) => wing([cut(x, 0, 0.5, 0.6), cut(x, 1.2, 0.5, 0.6)], { id: 'tail', strips: 6 });
    const load = stripCirculation(
      at(input([...straight.surfaces, tail(3)]), 0).solution.lattice,
      new Float64Array(0),
      1,
      0,
    ).map((_, i) => 1 + 0.3 * Math.sin(i));
    const drag = (x: number) => inducedDragOf(at(input([...straight.surfaces, tail(x)]), 0).field, load, 6);
    expect(drag(7) / drag(3)).toBeCloseTo(1, 9);
    expect(drag(-2) / drag(3)).toBeCloseTo(1, 9);
  });

  it('fins at the tips save some of it', () => {
    const bare = at(straight, 0);
    const ended = at(
      input([...straight.surfaces, wing([cut(0, 3, 0, 0.9), cut(0.2, 3, 0.8, 0.6)], { id: 'fin', strips: 5 })]),
      0,
    );
    const ratio = (solved: typeof bare) => {
      const sums = derivatives(
        { ...straight, surfaces: solved.solution.lattice.surfaces.map(({ input: i }) => i) },
        'symmetric',
      );
      if (!sums.ok) throw new RangeError('refused');
      return cdi(solved, 6) / sums.value.symmetric.alpha.lift ** 2;
    };
    expect(ratio(ended)).toBeLessThan(0.92 * ratio(bare));
  });
});
