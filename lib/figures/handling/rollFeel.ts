import { type RollCommand, rollCommand } from '@/lib/flight/commands';
import { degFromRad } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/figures/handling';
import { ROLL_HELIX } from '../bands';
import { bandBySquares, byShare } from '../bySquares';
import type { FigureContext } from '../context';
import { LATTICE_ERROR } from '../handlingBands';
import type { FigureValue } from '../types';
import { doesNotApply, type FigureSet, known, missing, verdictOf } from '../value';
import { type Cruise, speedInput, throwInput } from './cruise';

const { verdicts, causes } = texts;

const ROLL_WORDS = {
  veryLow: verdicts.rollVerySluggish,
  low: verdicts.rollSluggish,
  good: verdicts.rollGood,
  high: verdicts.rollQuick,
  veryHigh: verdicts.rollVeryQuick,
};

/**
 * Steady roll: the moment of the ailerons against the damping of the roll, pb / 2V = -Cl_command / Cl_p (Etkin & Reid, "Dynamics of
 * Flight", ch. 7; the helix angle: Gilruth & Turner, NACA TR 715).
 */
export function rollFigures({ airframe }: FigureContext, cruise: Cruise): FigureSet {
  const command = rollCommand(airframe, cruise.lateral.controls);
  if (!command) {
    const figure = doesNotApply(texts.problems.noRollControl);
    return { rollRatePerDeg: figure, rollHelix: figure };
  }
  const damping = cruise.lateral.rollRate.roll;
  if (!(damping < 0)) {
    const figure = missing({ code: 'roll-undamped', path: 'surfaces', message: texts.problems.rollGrows });
    return { rollRatePerDeg: figure, rollHelix: figure };
  }
  return steadyRoll(command, -command.roll / damping, cruise);
}

function steadyRoll({ throwDeg }: RollCommand, helix: number, cruise: Cruise): FigureSet {
  const rate = ratePerDeg(cruise, helix, throwDeg);
  const inputs = [speedInput(cruise), throwInput(throwDeg)];
  const band = (value: number) => bandBySquares(value, rollEnds(value), causes.rollControl);
  const verdict: FigureValue['verdict'] =
    helix < 0 ? { level: 'bad', words: verdicts.rollReversed } : verdictOf(helix, ROLL_HELIX, ROLL_WORDS);
  return {
    rollRatePerDeg: known(rate, { ...band(rate), inputs }),
    rollHelix: known(helix, { ...band(helix), inputs, verdict }),
  };
}

/** Roll rate in degrees a second for each degree, of a helix angle pb / 2V at full stick. */
export const ratePerDeg = ({ point }: Pick<Cruise, 'point'>, helix: number, throwDeg: number): number =>
  degFromRad((helix * 2 * point.speedMs) / (point.spanMm / 1000)) / throwDeg;

/** What the lattice may be off by in aileron power and in roll damping, for what is one over the other. */
export const rollEnds = (value: number) => {
  const damping = LATTICE_ERROR.rollDamping.value;
  return [byShare(value, LATTICE_ERROR.controls.value), [value / (1 + damping), value / (1 - damping)]];
};
