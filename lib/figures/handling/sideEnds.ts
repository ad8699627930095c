import type { AntisymmetricEffect } from '@/lib/aero/model';
import type { SideDerivatives } from '@/lib/flight/modes/lateral';
import type { FigureContext } from '../context';
import { BODY_ERROR, LATTICE_ERROR } from '../handlingBands';

const plus = (a: AntisymmetricEffect, b: AntisymmetricEffect, k: number): AntisymmetricEffect => ({
  side: a.side + k * b.side,
  roll: a.roll + k * b.roll,
  yaw: a.yaw + k * b.yaw,
});

/**
 * The derivatives with fins weaker and the body stronger (`way` -1), and the other way round (+1): by what the lattice may be off for a
 * fin and for roll damping, and slender-body theory for a body.
 */
function shifted({ model }: FigureContext, d: SideDerivatives, way: -1 | 1): SideDerivatives {
  const beta = model.contributions.reduce((sum, { name, beta: part }) => {
    if (name === 'surfaces') return plus(sum, part, way * LATTICE_ERROR.fins.value);
    return name === 'bodies' ? plus(sum, part, -way * BODY_ERROR.value) : sum;
  }, d.beta);
  return {
    beta,
    rollRate: { ...d.rollRate, roll: d.rollRate.roll * (1 + way * LATTICE_ERROR.rollDamping.value) },
    yawRate: { ...d.yawRate, yaw: d.yawRate.yaw * (1 + way * LATTICE_ERROR.fins.value) },
  };
}

/** The derivatives with fins weaker, and with fins stronger. */
export const sideEnds = (context: FigureContext, d: SideDerivatives): readonly [SideDerivatives, SideDerivatives] => [
  shifted(context, d, -1),
  shifted(context, d, 1),
];
