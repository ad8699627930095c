import { describe, expect, it } from 'vitest';
import { derivatives } from '@/lib/aero/lattice/derivatives';
import { farField, inducedDragOf, stripCirculation } from '@/lib/aero/lattice/farField';
import { lateralAt, lateralLoads } from '@/lib/aero/lattice/lateral';
import type { LatticeInput } from '@/lib/aero/lattice/types';
import { ellipse, rectangle, trapezoid, within } from './support/wings';

// Roll and yaw that grow with lift, and the drag of lift, of wings whose answers are known in closed form.

function wing(sections: LatticeInput['surfaces'][number]['sections'], aspectRatio: number, area: number, strips = 30) {
  const span = Math.sqrt(aspectRatio * area);
  const reference = { area, chord: 1, span, point: [0, 0, 0] as const };
  const surfaces = [{ id: 'wing', mirrored: true, strips, rows: 4, sections }];
  const result = derivatives({ surfaces, controls: [], reference }, 'both');
  if (!result.ok) throw new RangeError('refused');
  const { solution, symmetric } = result.value;
  const field = farField(solution.lattice);
  const at = (cl: number) => lateralAt(lateralLoads(solution, field), reference, cl / symmetric.alpha.lift, new Map());
  const drag = inducedDragOf(field, stripCirculation(solution.lattice, solution.symmetric, 3, 1), area);
  return { at, efficiency: symmetric.alpha.lift ** 2 / (Math.PI * aspectRatio * drag) };
}

describe("an elliptic wing by Glauert's lifting line, section slope 2 pi (series of Elements of Aerofoil and Airscrew Theory, ch. 11, worked out for steady roll and yaw)", () => {
  // With G0 = 2 b V A1 sin t carrying and G = 2 b V A2 sin 2t by the rate: roll A2 = p / (A + 4), yaw A2 = -r A1 (A + 2) / (2 (A + 4)), forces by
  // circulation times local velocity with downwash. So Cl_r = (CL / 4)(A + 3)/(A + 4), Cn_p = -(CL / 8)(A - 2)/(A + 4),
  // Cn_r = -3 CL^2 (A + 2) / (8 pi A (A + 4)). A lattice is a lifting surface: it tends to these as the wing grows slender.
  it.each([
    [10, 0.2321, 0.0714, 0.01023],
    [20, 0.2396, 0.0938, 0.00547],
  ])('A %d: Cl_r %d CL, Cn_p -%d CL, Cn_r -%d CL^2, within 4 %%', (aspectRatio, rollByYaw, yawByRoll, yawDamping) => {
    // Area pi b c0 / 4 with root chord 4 / pi on a span of A: A.
    const { at } = wing(ellipse(aspectRatio, 4 / Math.PI, 0.25), aspectRatio, aspectRatio);
    const { rollRate, yawRate } = at(0.1);
    within(yawRate.roll / 0.1, rollByYaw, 0.04);
    within(-rollRate.yaw / 0.1, yawByRoll, 0.04);
    within(-yawRate.yaw / 0.01, yawDamping, 0.04);
  });
});

describe('induced drag in the far field', () => {
  it('V15: an elliptic load, CL 0.6 at A 8, costs 0.014324 (Prandtl), within 2 % for strips of finite width', () => {
    const { efficiency } = wing(ellipse(8, 4 / Math.PI, 0.25), 8, 8);
    within(0.6 ** 2 / (Math.PI * 8 * efficiency), 0.014324, 0.02);
  });

  it.each([
    [6, 0.984],
    [10, 0.96],
    [20, 0.905],
  ])(
    'V23: a rectangle of A %d has efficiency %d (an independent solver) and never over 1.005 (Munk)',
    (a, expected) => {
      const { efficiency } = wing(rectangle(a), a, a, 20);
      expect(efficiency).toBeLessThan(1.005);
      within(efficiency, expected, 0.005);
    },
  );

  it('V13: taper 0.4 at A 2 pi costs 0.94 % more than the ellipse by the lifting line (Glauert; Anderson, fig. 5.20), to 0.01', () => {
    const span = 2 * Math.PI * 0.7;
    const { efficiency } = wing(
      trapezoid({ span, root: 1, tip: 0.4, leSweepRad: Math.atan((0.6 / 4 / (span / 2)) * 1) }),
      2 * Math.PI,
      0.7 * span,
      20,
    );
    expect(Math.abs(1 / efficiency - 1.0094)).toBeLessThan(0.01);
  });
});

describe('published derivatives of the Navion that grow with lift (Nelson, Flight Stability and Automatic Control, app. B, from memory)', () => {
  it('Cl_r 0.107 at CL 0.41, as a quarter of the lift: a wing of its aspect ratio alone within 15 %', () => {
    // A 6.04, taper 0.54, nearly straight. Tail and fin add a little.
    const { at } = wing(trapezoid({ span: 10.166, root: 2.1944, tip: 1.185, leSweepRad: 0.05 }), 6.04, 17.112, 16);
    within(at(0.41).yawRate.roll, 0.107, 0.15);
  });
});
