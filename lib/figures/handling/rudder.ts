import { yawCommand } from '@/lib/flight/commands';
import { degFromRad } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/figures/handling';
import { bandBySquares, byShare } from '../bySquares';
import type { FigureContext } from '../context';
import { LATTICE_ERROR } from '../handlingBands';
import { doesNotApply, type FigureSet, known, missing } from '../value';
import { type Cruise, throwInput } from './cruise';

/**
 * Steady sideslip that a degree of rudder holds, wings kept level by the ailerons: the rudder's yawing moment against the weathercock's
 * (Etkin & Reid, "Dynamics of Flight", ch. 3, directional control).
 */
export function rudderFigures({ airframe }: FigureContext, { lateral }: Cruise): FigureSet {
  const command = yawCommand(airframe, lateral.controls);
  if (!command) return { sideslipPerDeg: doesNotApply(texts.problems.noRudder) };
  const weathercock = lateral.beta.yaw;
  if (!(weathercock > 0))
    return {
      sideslipPerDeg: missing({ code: 'no-weathercock', path: 'surfaces', message: texts.problems.noWeathercock }),
    };
  const perDeg = degFromRad(command.yaw / weathercock) / command.throwDeg;
  return {
    sideslipPerDeg: known(perDeg, {
      ...bandBySquares(perDeg, [byShare(perDeg, LATTICE_ERROR.controls.value)], texts.causes.rudderControl),
      ...(perDeg < 0 ? { verdict: { level: 'bad' as const, words: texts.verdicts.rudderReversed } } : {}),
      inputs: [throwInput(command.throwDeg)],
    }),
  };
}
