import { expect, it } from 'vitest';
import type { AeroModel } from '@/lib/aero/model';
import { airframe, control, surface } from '@/tests/support/airframe';
import { handModel } from '@/tests/support/handModel';
import { inducedPolar } from './induced';

const elevator = control({ kind: 'elevator', id: 'e', mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 } });
const tail = surface({ id: 'tail', role: 'tailplane', controls: [elevator] });
const document = airframe({ surfaces: [surface(), tail] });

it('of an elliptic wing without a tail is CL^2 / (pi A), incidence or not', () => {
  for (const incidenceDeg of [0, 3]) {
    const induced = inducedPolar(airframe(), handModel(200_000, 1200, 170, incidenceDeg));
    // Aspect ratio 7.2.
    for (const cl of [-0.2, 0.35, 0.9]) expect(induced(cl)).toBeCloseTo(cl ** 2 / (Math.PI * 7.2), 12);
  }
});

it('counts what the elevator costs to hold the nose', () => {
  const bare = handModel(200_000, 1200, 170);
  const key = 'tail/e';
  const model: AeroModel = {
    ...bare,
    controls: new Map([[key, { lift: 0.5, pitch: -1.4 }]]),
    // Far field of the wing, and one of its own for the elevator.
    inducedDrag: (state) => bare.inducedDrag(state) + 0.3 * (state.deflectionsRad.get(key) ?? 0) ** 2,
  };
  const induced = inducedPolar(document, model);
  // At no lift and no moment the elevator is at rest; at a lift it has to hold the nose up.
  expect(induced(0)).toBeCloseTo(0, 12);
  const slope = bare.alpha.lift;
  // Balance: -0.1 CLa a - 1.4 d = 0 with CLa a + 0.5 d = CL, so d = -0.1 CL / (1.4 - 0.05).
  const deflection = (-0.1 * 0.6) / 1.35;
  const alpha = (0.6 - 0.5 * deflection) / slope;
  const wing = (slope * alpha) ** 2 / (Math.PI * 7.2);
  expect(induced(0.6)).toBeCloseTo(wing + 0.3 * deflection ** 2, 9);
});
