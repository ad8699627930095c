import { type ControlLinkage, leversTurned, travelOf } from '@/lib/linkage/ofControl';
import { CENTRING_DEG, JOINT_PLAY_MM, LOW_REYNOLDS_SHARE } from '@/lib/linkage/practice';
import { bucklingForceN, freeLengthMm } from '@/lib/linkage/rod';
import { NMM_PER_KG_CM, servoTorque } from '@/lib/linkage/servo';
import { slopOf } from '@/lib/linkage/slop';
import { texts } from '@/lib/text/en/figures/controls';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import type { VerdictBand } from './bands';
import { CONTROL_SLOP, DIVE_OVER_TOP, HINGE_TORQUE, ROD_BUCKLING, SERVO_TRAVEL } from './controlBands';
import { type ControlContext, hingeLoad, type StudiedControl } from './controlLoads';
import type { FigureValue, Verdict } from './types';
import { type BandWords, known, verdictOf } from './value';

// What one control answers to each question, and which control is worst off.

type Inputs = NonNullable<FigureValue['inputs']>;

/** A control with a linkage that could be worked out. */
export interface Linked {
  readonly studied: StudiedControl;
  readonly linkage: ControlLinkage;
}

/** One control's answer for one figure. */
export interface Answer extends Linked {
  readonly value: number;
  readonly verdict: { readonly level: Verdict; readonly words: string };
  readonly band?: FigureValue['band'];
  readonly inputs: Inputs;
}

const SEVERITY: Readonly<Record<Verdict, number>> = { good: 0, watch: 1, bad: 2 };

/** How far a value lies outside what is usual; inside, how near it is to the end that is dear. */
const beyond = (value: number, { good: [low, high] }: VerdictBand): number =>
  Number.isFinite(high) ? Math.max(low - value, value - high) : low - value;

/** The answer to show: the gravest, and of equals the one furthest out. */
export function worst(answers: readonly Answer[], band: VerdictBand): Answer | undefined {
  return [...answers].sort(
    (a, b) => SEVERITY[b.verdict.level] - SEVERITY[a.verdict.level] || beyond(b.value, band) - beyond(a.value, band),
  )[0];
}

/** The verdict with the control's name, and with the holes where they are only suggested. */
function named({ studied: { name }, linkage: { bar, suggested }, verdict }: Answer): { level: Verdict; words: string } {
  const words = suggested
    ? fill(texts.suggested, { control: name, arm: bar.armMm, horn: bar.hornMm, verdict: verdict.words })
    : fill(texts.typed, { control: name, verdict: verdict.words });
  return { level: verdict.level, words };
}

/** An answer as a figure. */
export const figureOf = (answer: Answer): FigureValue =>
  known(answer.value, {
    verdict: named(answer),
    inputs: answer.inputs,
    ...(answer.band ? { band: answer.band } : {}),
  });

const holes = ({ bar, suggested }: ControlLinkage): Inputs => [
  { name: suggested ? texts.inputs.armSuggested : texts.inputs.arm, value: bar.armMm, unit: 'mm' },
  { name: suggested ? texts.inputs.hornSuggested : texts.inputs.horn, value: bar.hornMm, unit: 'mm' },
];

const TRAVEL_WORDS: BandWords = {
  veryLow: texts.verdicts.travelLow,
  low: texts.verdicts.travelLow,
  good: texts.verdicts.travelGood,
  high: texts.verdicts.travelHigh,
  veryHigh: texts.verdicts.travelBad,
};

/** Servo travel that full throw takes; null at a dead centre. */
export function travelAnswer({ studied, linkage }: Linked): Answer | null {
  const travel = travelOf(linkage, studied.together);
  if (!travel) return null;
  return {
    studied,
    linkage,
    value: travel.usedPct,
    verdict: verdictOf(travel.usedPct, SERVO_TRAVEL, TRAVEL_WORDS),
    inputs: [
      ...holes(linkage),
      { name: texts.inputs.servoUp, value: travel.upDeg, unit: '°' },
      { name: texts.inputs.servoDown, value: travel.downDeg, unit: '°' },
    ],
  };
}

const onlyHigh = (good: string, watch: string, bad: string): BandWords => ({
  veryLow: good,
  low: good,
  good,
  high: watch,
  veryHigh: bad,
});
const { torqueGood, torqueWatch, torqueBad, slopGood, slopWatch, slopBad } = texts.verdicts;

export interface Speed {
  readonly ms: number;
  readonly assumed: boolean;
}

const speedInput = ({ ms, assumed }: Speed): Inputs[number] => ({
  name: assumed ? texts.inputs.speedAssumed : texts.inputs.speed,
  value: ms,
  unit: 'm/s',
});

/** Share of the servo's torque that full throw of one stick takes in a dive; null at a dead centre. */
export function torqueAnswer(context: ControlContext, { studied, linkage }: Linked, speed: Speed): Answer | null {
  const load = hingeLoad(context, studied, linkage, speed.ms * DIVE_OVER_TOP.value);
  if (!load) return null;
  const torque = servoTorque(linkage.servo);
  const share = (kgCm: number): number => (100 * load.servoNmm) / (kgCm * NMM_PER_KG_CM);
  const value = share(torque.kgCm);
  const { low, high } = LOW_REYNOLDS_SHARE.value;
  return {
    studied,
    linkage,
    value,
    verdict: verdictOf(value, HINGE_TORQUE, onlyHigh(torqueGood, torqueWatch, torqueBad)),
    band: {
      low: share(torque.highKgCm) * low,
      high: share(torque.lowKgCm) * high,
      cause: torque.assumed ? texts.causes.torqueAssumed : texts.causes.torque,
    },
    inputs: [
      speedInput(speed),
      { name: texts.inputs.turn, value: Math.abs(load.turnDeg), unit: '°' },
      { name: texts.inputs.moment, value: load.momentNmm / NMM_PER_KG_CM, unit: 'kg cm' },
      {
        name: torque.assumed ? texts.inputs.servoTorqueAssumed : texts.inputs.servoTorque,
        value: torque.kgCm,
        unit: 'kg cm',
      },
      ...holes(linkage),
    ],
  };
}

/** Free movement at neutral, degrees. */
export function slopAnswer({ studied, linkage }: Linked): Answer | null {
  const levers = leversTurned(linkage, 0);
  if (!levers) return null;
  const { valueDeg, lowDeg, highDeg } = slopOf(levers);
  return {
    studied,
    linkage,
    value: valueDeg,
    verdict: verdictOf(valueDeg, CONTROL_SLOP, onlyHigh(slopGood, slopWatch, slopBad)),
    band: { low: lowDeg, high: highDeg, cause: texts.causes.slop },
    inputs: [
      ...holes(linkage),
      { name: texts.inputs.play, value: JOINT_PLAY_MM.value.value, unit: 'mm' },
      { name: texts.inputs.centring, value: CENTRING_DEG.value.value, unit: '°' },
      { name: texts.inputs.widest, value: studied.place.widestMm, unit: 'mm' },
    ],
  };
}

/** How far the rod is from buckling in a dive; null without a rod or at a dead centre. */
export function rodAnswer(context: ControlContext, { studied, linkage }: Linked, speed: Speed): Answer | null {
  const { rod } = linkage;
  const load = hingeLoad(context, studied, linkage, speed.ms * DIVE_OVER_TOP.value);
  // Without air there is no load, and nothing to be stiff enough for.
  if (!rod || !load || !(load.rodN > 0 && Number.isFinite(load.rodN))) return null;
  const value = bucklingForceN(rod.diameterMm, rod.lengthMm) / load.rodN;
  const mm = trimmedDigits(freeLengthMm(rod.diameterMm, load.rodN * ROD_BUCKLING.good[0]), 0);
  const good = texts.verdicts.rodGood;
  const watch = fill(texts.verdicts.rodWatch, { mm });
  const bad = fill(texts.verdicts.rodBad, { mm });
  const { low, high } = LOW_REYNOLDS_SHARE.value;
  return {
    studied,
    linkage,
    value,
    verdict: verdictOf(value, ROD_BUCKLING, { veryLow: bad, low: watch, good, high: good, veryHigh: good }),
    band: { low: value / high, high: value / low, cause: texts.causes.torque },
    inputs: [
      speedInput(speed),
      { name: texts.inputs.rodForce, value: load.rodN, unit: 'N' },
      { name: texts.inputs.rodLength, value: rod.lengthMm, unit: 'mm' },
      { name: texts.inputs.rodDiameter, value: rod.diameterMm, unit: 'mm' },
    ],
  };
}
