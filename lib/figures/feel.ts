import type { Derivatives } from '@/lib/aero/lattice/derivatives';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { type PitchCommand, pitchCommand, rollCommand } from '@/lib/flight/commands';
import { degFromRad } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/figures';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import { PITCH_FEEL, ROLL_HELIX } from './bands';
import type { WingReference } from './reference';
import type { Stability } from './stability';
import { airOf } from './stall';
import type { FigureValue } from './types';
import { doesNotApply, type FigureSet, known, missing, verdictOf } from './value';

// What the thumb feels at cruise speed. The lattice's reference point must be the CG.

/**
 * Load factor gained per degree of up-elevator in a steady pull-up, g per degree; null behind the manoeuvre point. Lift and moment in
 * balance with angle of attack, pitch rate and elevator (Etkin & Reid, "Dynamics of Flight", ch. 3, elevator angle per g).
 * @param shiftX moves the neutral point by this many mm, for the band
 */
function pullPerDeg(
  airframe: Airframe,
  wing: WingReference,
  lift: Derivatives,
  command: PitchCommand,
  massG: number,
  shiftX: number,
): number | null {
  const { alpha, pitchRate } = lift.symmetric;
  const speed = airframe.flight.cruiseMs;
  const pressure = 0.5 * airOf(airframe).densityKgM3 * speed ** 2;
  const weight = ((massG / 1000) * STANDARD_GRAVITY) / (pressure * (wing.areaMm2 / 1e6));
  // Pitch rate for one g more, as q c / 2V: q = g / V.
  const rate = (STANDARD_GRAVITY * (wing.macMm / 1000)) / (2 * speed ** 2);
  const stiffness = alpha.pitch - (shiftX / wing.macMm) * alpha.lift;
  const manoeuvre = stiffness * (weight - pitchRate.lift * rate) + alpha.lift * pitchRate.pitch * rate;
  if (!(manoeuvre < 0)) return null;
  return (stiffness * command.lift - alpha.lift * command.pitch) / (manoeuvre * command.throwDeg);
}

const PITCH_WORDS = {
  veryLow: texts.verdicts.pitchVerySluggish,
  low: texts.verdicts.pitchSluggish,
  good: texts.verdicts.pitchGood,
  high: texts.verdicts.pitchQuick,
  veryHigh: texts.verdicts.pitchVeryQuick,
};

/** Pull per degree of elevator, with the band that the neutral point's gives it. */
export function pitchFeel(
  airframe: Airframe,
  wing: WingReference,
  lift: Derivatives,
  stability: Stability,
  massG: number,
): FigureValue {
  const command = pitchCommand(airframe, lift.symmetric.controls);
  if (!command) return doesNotApply(texts.problems.noPitchControl);
  const at = (x: number) => pullPerDeg(airframe, wing, lift, command, massG, x - stability.neutralPointX);
  const pull = at(stability.neutralPointX);
  if (pull === null)
    return missing({ code: 'behind-manoeuvre-point', path: 'items', message: texts.problems.behindManoeuvrePoint });
  const [quick, dull] = [at(stability.bandX[0]), at(stability.bandX[1])];
  return known(pull, {
    // Without an upper end the band is left out: the low end of the neutral point is past the manoeuvre point.
    ...(quick === null || dull === null
      ? {}
      : { band: { low: Math.min(quick, dull), high: Math.max(quick, dull), cause: texts.causes.neutralPoint } }),
    verdict: verdictOf(pull, PITCH_FEEL, PITCH_WORDS),
    inputs: [
      { name: texts.inputs.speed, value: airframe.flight.cruiseMs, unit: 'm/s' },
      { name: texts.inputs.throwDeg, value: command.throwDeg, unit: '°' },
    ],
  });
}

const ROLL_WORDS = {
  veryLow: texts.verdicts.rollVerySluggish,
  low: texts.verdicts.rollSluggish,
  good: texts.verdicts.rollGood,
  high: texts.verdicts.rollQuick,
  veryHigh: texts.verdicts.rollVeryQuick,
};

/** Steady roll: the moment of the ailerons against the damping of the roll, pb / 2V = -Cl_command / Cl_p. */
export function rollFeel(airframe: Airframe, wing: WingReference, lift: Derivatives): FigureSet {
  const damping = lift.antisymmetric?.rollRate.roll;
  const command = lift.antisymmetric && rollCommand(airframe, lift.antisymmetric.controls);
  if (damping === undefined || !command) {
    const figure = doesNotApply(texts.problems.noRollControl);
    return { rollRatePerDeg: figure, rollHelix: figure };
  }
  const helix = -command.roll / damping;
  const rate = degFromRad((helix * 2 * airframe.flight.cruiseMs) / (wing.spanMm / 1000));
  const inputs = [
    { name: texts.inputs.speed, value: airframe.flight.cruiseMs, unit: 'm/s' },
    { name: texts.inputs.throwDeg, value: command.throwDeg, unit: '°' },
  ];
  return {
    rollRatePerDeg: known(rate / command.throwDeg, { inputs }),
    rollHelix: known(helix, { inputs, verdict: verdictOf(helix, ROLL_HELIX, ROLL_WORDS) }),
  };
}
