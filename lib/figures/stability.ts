import type { Derivatives } from '@/lib/aero/lattice/derivatives';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { neutralControls, pitchCommand } from '@/lib/flight/commands';
import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { FIRST_FLIGHT_SHARE, NEUTRAL_POINT_BAND_PCT, TRIM_ELEVATOR_SHARE, TRIM_LIFT_SHARE } from './bands';
import type { WingReference } from './reference';
import type { ClMax } from './stall';
import type { FigureValue, Verdict } from './types';
import { doesNotApply, type FigureSet, known, missing } from './value';

/** The neutral point and the CG range that follows from it; x in mm. */
export interface Stability {
  readonly neutralPointX: number;
  readonly bandX: readonly [low: number, high: number];
  readonly foreLimitX: number;
  readonly aftLimitX: number;
  /** `null` when the limits leave nothing between them. */
  readonly firstFlightX: number | null;
  readonly figures: FigureSet;
  readonly problems: readonly Problem[];
}

/** Half width of the neutral point's band in % of the MAC, and its cause. */
export function neutralPointBand(airframe: Airframe): { readonly pct: number; readonly cause: string } {
  const behind = airframe.drives.some((drive) => drive.facing === 'pusher' || drive.kind === 'ductedFan');
  if (behind) return { pct: NEUTRAL_POINT_BAND_PCT.pusherOrFan.value, cause: texts.causes.neutralPointPusher };
  if (airframe.bodies.length > 0)
    return { pct: NEUTRAL_POINT_BAND_PCT.body.value, cause: texts.causes.neutralPointBody };
  return { pct: NEUTRAL_POINT_BAND_PCT.bare.value, cause: texts.causes.neutralPointBare };
}

/**
 * Neutral point, CG range and the CG of the first flight. Both limits are measured from the lowest neutral point of the band, so that
 * the wanted margins hold even there.
 */
export function stabilityOf(airframe: Airframe, wing: WingReference, lift: Derivatives, clMax: ClMax): Stability {
  const { neutralPointX } = lift.symmetric;
  const { pct, cause } = neutralPointBand(airframe);
  const half = (wing.macMm * pct) / 100;
  const [least, largest] = airframe.flight.staticMarginPct;
  const lowest = neutralPointX - half;
  const aftLimitX = lowest - (wing.macMm * least) / 100;
  const byMargin = lowest - (wing.macMm * Math.max(least, largest)) / 100;
  const byTrim = trimLimitX(airframe, wing, lift, clMax.value);
  const foreLimitX = byTrim === null ? byMargin : Math.max(byMargin, byTrim);
  const empty = foreLimitX > aftLimitX;
  const firstFlightX = empty ? null : foreLimitX + (aftLimitX - foreLimitX) * FIRST_FLIGHT_SHARE.value;
  const noRange = emptyRange(foreLimitX, aftLimitX);
  const mm = (name: string, value: number) => ({ name, value, unit: 'mm' });
  const pctInput = (name: string, value: number) => ({ name, value, unit: '% MAC' });
  return {
    neutralPointX,
    bandX: [lowest, neutralPointX + half],
    foreLimitX,
    aftLimitX,
    firstFlightX,
    problems: [...(empty ? [noRange] : []), ...(byTrim === null ? [noPitchControl] : [])],
    figures: {
      neutralPointXMm: known(neutralPointX, {
        band: { low: lowest, high: neutralPointX + half, cause },
        inputs: [mm(texts.inputs.mac, wing.macMm), pctInput(texts.inputs.neutralPointBand, pct)],
      }),
      cgForeLimitXMm: known(foreLimitX, {
        inputs: [
          pctInput(texts.inputs.largestMargin, largest),
          mm(texts.inputs.foreByMargin, byMargin),
          ...(byTrim === null ? [] : [mm(texts.inputs.foreByTrim, byTrim)]),
        ],
      }),
      cgAftLimitXMm: known(aftLimitX, { inputs: [pctInput(texts.inputs.leastMargin, least)] }),
      firstFlightCgXMm: firstFlightX === null ? missing(noRange) : known(firstFlightX),
    },
  };
}

const noPitchControl: Problem = {
  code: 'no-pitch-control',
  path: 'surfaces',
  message: texts.problems.noPitchControl,
  fix: texts.problems.noPitchControlFix,
};

const emptyRange = (fore: number, aft: number): Problem => ({
  code: 'cg-range-empty',
  path: 'flight.staticMarginPct',
  message: fill(texts.problems.cgRangeEmpty, { fore: fixedDigits(fore, 0), aft: fixedDigits(aft, 0) }),
  fix: texts.problems.cgRangeEmptyFix,
});

/**
 * The CG, x in mm, at which the stated share of up-elevator still balances the stated share of the greatest lift, power off; null
 * without a pitch control. In steady flight the moment about the CG is none: with lift L = L0 + La a + Lc c and moment M likewise about
 * the reference point, x = x_ref - c M / L (Etkin & Reid, "Dynamics of Flight", ch. 2, longitudinal trim).
 */
function trimLimitX(airframe: Airframe, wing: WingReference, lift: Derivatives, clMax: number): number | null {
  const command = pitchCommand(airframe, lift.symmetric.controls);
  if (!command) return null;
  const { base, alpha } = lift.symmetric;
  const rest = neutralControls(airframe, lift.symmetric.controls);
  const wanted = clMax * TRIM_LIFT_SHARE.value;
  const used = TRIM_ELEVATOR_SHARE.value;
  const angle = (wanted - base.lift - rest.lift - used * command.lift) / alpha.lift;
  const moment = base.pitch + rest.pitch + used * command.pitch + alpha.pitch * angle;
  return lift.lattice.reference.point[0] - (wing.macMm * moment) / wanted;
}

/** Static margin and where the CG lies in its range. */
export function marginFigures(airframe: Airframe, wing: WingReference, stability: Stability, cgX: number): FigureSet {
  const pct = (x: number) => ((x - cgX) / wing.macMm) * 100;
  const margin = pct(stability.neutralPointX);
  const [low, high] = [pct(stability.bandX[0]), pct(stability.bandX[1])];
  return {
    staticMarginPct: known(margin, {
      band: { low, high, cause: texts.causes.neutralPoint },
      verdict: marginVerdict(low, airframe.flight.staticMarginPct),
      inputs: [
        { name: texts.inputs.neutralPoint, value: stability.neutralPointX, unit: 'mm' },
        { name: texts.inputs.cg, value: cgX, unit: 'mm' },
        { name: texts.inputs.mac, value: wing.macMm, unit: 'mm' },
      ],
    }),
    cgXMm: known(cgX, { verdict: placeVerdict(stability, cgX) }),
  };
}

/** A margin this close to a limit meets it: far finer than anyone can balance. */
const MARGIN_TOLERANCE_PCT = 0.05;

function marginVerdict(low: number, [least, largest]: readonly [number, number]): { level: Verdict; words: string } {
  const { verdicts } = texts;
  const shown = fixedDigits(low, 1);
  if (low < 0) return { level: 'bad', words: verdicts.marginUnstable };
  if (low < least - MARGIN_TOLERANCE_PCT)
    return { level: 'watch', words: fill(verdicts.marginLow, { low: shown, min: least }) };
  if (low > largest + MARGIN_TOLERANCE_PCT)
    return { level: 'watch', words: fill(verdicts.marginHigh, { low: shown, max: largest }) };
  return { level: 'good', words: verdicts.marginGood };
}

function placeVerdict({ foreLimitX, aftLimitX, bandX }: Stability, cgX: number): { level: Verdict; words: string } {
  const { verdicts } = texts;
  const behind = cgX - aftLimitX;
  const ahead = foreLimitX - cgX;
  if (cgX > bandX[0]) return { level: 'bad', words: fill(verdicts.cgBehindUnstable, { mm: fixedDigits(behind, 0) }) };
  if (behind > 0) return { level: 'watch', words: fill(verdicts.cgBehind, { mm: fixedDigits(behind, 1) }) };
  if (ahead > 0) return { level: 'watch', words: fill(verdicts.cgAhead, { mm: fixedDigits(ahead, 1) }) };
  return { level: 'good', words: verdicts.cgInRange };
}

/** The first-flight CG from the leading edge that a finger can touch: beside the body, or at the root of a wing without one. */
export function touchFigure(
  firstFlightX: number | null,
  edge: { x: number; y: number } | null,
  range: FigureValue | undefined,
): FigureValue {
  if (firstFlightX === null) return range ?? doesNotApply(texts.problems.needsLattice);
  if (!edge) return doesNotApply(texts.problems.noWing);
  return known(firstFlightX - edge.x, { inputs: [{ name: texts.inputs.bodySide, value: edge.y, unit: 'mm' }] });
}
