import type { AeroModel } from '@/lib/aero/model';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { pitchAxis, stickTrims, trimmedCgX, whyNoTrim } from '@/lib/flight/trim';
import type { Problem } from '@/lib/numerics/result';
import type { Spread } from '@/lib/numerics/spread';
import { texts as shared } from '@/lib/text/en/figures';
import { texts } from '@/lib/text/en/figures/stability';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { FIRST_FLIGHT_SHARE, TRIM_ELEVATOR_SHARE, TRIM_LIFT_SHARE } from './bands';
import { type NeutralPointBand, neutralPointBand } from './neutralBand';
import type { WingReference } from './reference';
import type { FigureValue, Verdict } from './types';
import { type FigureSet, known, missing } from './value';

/** The neutral point and the CG range that follows from it; x in mm from the construction origin. */
export interface Stability {
  readonly neutralPointX: number;
  readonly bandX: readonly [low: number, high: number];
  readonly foreLimitX: number;
  readonly aftLimitX: number;
  /** `null` when the limits leave nothing between them. */
  readonly firstFlightX: number | null;
  /** Greatest lift coefficient of the aircraft, as the forward limit used it. */
  readonly clMax: Spread;
  readonly figures: FigureSet;
  readonly problems: readonly Problem[];
}

/**
 * Neutral point, CG range and the CG of the first flight. Both limits are measured from the lowest neutral point of the band, so that
 * the wanted margins hold even there. No lattice is solved: it costs nothing while a handle is dragged.
 */
export function stabilityOf(airframe: Airframe, wing: WingReference, model: AeroModel, clMax: Spread): Stability {
  const { neutralPointX } = model;
  const band = neutralPointBand(airframe, model);
  const half = (wing.macMm * band.pct) / 100;
  const bandX = [neutralPointX - half, neutralPointX + half] as const;
  const [least, largest] = airframe.flight.staticMarginPct;
  const aftLimitX = bandX[0] - (wing.macMm * least) / 100;
  const byMargin = bandX[0] - (wing.macMm * Math.max(least, largest)) / 100;
  const byTrim = trimLimit(airframe, model, clMax);
  const foreLimitX = byTrim.x === null ? byMargin : Math.max(byMargin, byTrim.x);
  const empty = foreLimitX > aftLimitX;
  const firstFlightX = empty ? null : foreLimitX + (aftLimitX - foreLimitX) * FIRST_FLIGHT_SHARE.value;
  const noRange = emptyRange(pctOfMac(wing, foreLimitX), pctOfMac(wing, aftLimitX));
  const places = { neutralPointX, bandX, foreLimitX, aftLimitX, firstFlightX };
  return {
    ...places,
    clMax,
    problems: [...(empty ? [noRange] : []), ...byTrim.problems],
    figures: rangeFigures(wing, [least, largest], places, band, { byMargin, byTrim }, noRange),
  };
}

/** A place along x in % of the MAC, from its leading edge. */
const pctOfMac = ({ macLeXMm, macMm }: WingReference, x: number): number => ((x - macLeXMm) / macMm) * 100;

interface TrimLimit {
  readonly x: number | null;
  /** By the span of the greatest lift coefficient. */
  readonly ends: readonly number[];
  readonly problems: readonly Problem[];
}

/** The CG at which the stated share of up stick still trims the stated share of the greatest lift, power off. */
function trimLimit(airframe: Airframe, model: AeroModel, { value, low, high }: Spread): TrimLimit {
  const axis = pitchAxis(airframe, model);
  if (!axis) return { x: null, ends: [], problems: [noPitchControl] };
  if (!stickTrims(axis)) return { x: null, ends: [], problems: whyNoTrim(airframe, model) };
  const at = (clMax: number) => trimmedCgX(axis, TRIM_ELEVATOR_SHARE.value, clMax * TRIM_LIFT_SHARE.value);
  return { x: at(value), ends: [at(low), at(high)], problems: [] };
}

const noPitchControl: Problem = {
  code: 'no-pitch-control',
  path: 'surfaces',
  message: shared.problems.noPitchControl,
  fix: shared.problems.noPitchControlFix,
};

const emptyRange = (fore: number, aft: number): Problem => ({
  code: 'cg-range-empty',
  path: 'flight.staticMarginPct',
  message: fill(texts.problems.cgRangeEmpty, { fore: fixedDigits(fore, 1), aft: fixedDigits(aft, 1) }),
  fix: texts.problems.cgRangeEmptyFix,
});

type RangePlaces = Pick<Stability, 'neutralPointX' | 'bandX' | 'foreLimitX' | 'aftLimitX' | 'firstFlightX'>;

/** Each place twice: along x for drawing, and in % of the MAC for reading. */
function rangeFigures(
  wing: WingReference,
  [least, largest]: readonly [least: number, largest: number],
  { neutralPointX, bandX, foreLimitX, aftLimitX, firstFlightX }: RangePlaces,
  band: NeutralPointBand,
  { byMargin, byTrim }: { readonly byMargin: number; readonly byTrim: TrimLimit },
  noRange: Problem,
): FigureSet {
  const pct = (x: number) => pctOfMac(wing, x);
  const same = (x: number) => x;
  const mac = (name: string, value: number) => ({ name, value, unit: '% MAC' });
  const neutral = (as: (x: number) => number): FigureValue =>
    known(as(neutralPointX), {
      band: { low: as(bandX[0]), high: as(bandX[1]), cause: band.cause },
      inputs: [
        { name: shared.inputs.mac, value: wing.macMm, unit: 'mm' },
        mac(shared.inputs.neutralPointBand, band.pct),
        ...(band.bodiesPct === null ? [] : [mac(texts.inputs.shiftByBodies, band.bodiesPct)]),
        ...(band.propellersPct === null ? [] : [mac(texts.inputs.shiftByPropellers, band.propellersPct)]),
      ],
    });
  const fore = (as: (x: number) => number): FigureValue =>
    known(as(foreLimitX), {
      ...foreBand(foreLimitX, byMargin, byTrim, as),
      inputs: [
        mac(shared.inputs.largestMargin, largest),
        mac(shared.inputs.foreByMargin, pct(byMargin)),
        ...(byTrim.x === null ? [] : [mac(shared.inputs.foreByTrim, pct(byTrim.x))]),
      ],
    });
  const aft = (as: (x: number) => number) => known(as(aftLimitX), { inputs: [mac(shared.inputs.leastMargin, least)] });
  const first = (as: (x: number) => number) => (firstFlightX === null ? missing(noRange) : known(as(firstFlightX)));
  return {
    neutralPointXMm: neutral(same),
    neutralPointPct: neutral(pct),
    cgForeLimitXMm: fore(same),
    cgForeLimitPct: fore(pct),
    cgAftLimitXMm: aft(same),
    cgAftLimitPct: aft(pct),
    firstFlightCgXMm: first(same),
    firstFlightCgPct: first(pct),
  };
}

/** Where the elevator may set the forward limit, its band is what the greatest lift leaves open; a margin sets it exactly. */
function foreBand(
  foreX: number,
  byMargin: number,
  { ends }: TrimLimit,
  as: (x: number) => number,
): Pick<FigureValue, 'band'> {
  const places = [foreX, ...ends.map((x) => Math.max(x, byMargin))];
  const [low, high] = [Math.min(...places), Math.max(...places)];
  return low < high ? { band: { low: as(low), high: as(high), cause: texts.causes.clMax } } : {};
}

/**
 * Static margin and where the CG lies in its range. The margin's band holds that of the neutral point and, by squares, how far the CG
 * itself may be out because the masses are.
 */
export function marginFigures(
  airframe: Airframe,
  wing: WingReference,
  stability: Stability,
  cgX: number,
  cgErrorMm = 0,
): FigureSet {
  const pct = (mm: number) => (mm / wing.macMm) * 100;
  const { neutralPointX, bandX } = stability;
  const margin = pct(neutralPointX - cgX);
  const off = (end: number) => pct(Math.hypot(end - neutralPointX, cgErrorMm));
  const [low, high] = [margin - off(bandX[0]), margin + off(bandX[1])];
  return {
    staticMarginPct: known(margin, {
      band: { low, high, cause: cgErrorMm > 0 ? texts.causes.neutralPointAndMass : shared.causes.neutralPoint },
      verdict: marginVerdict([low, high], airframe.flight.staticMarginPct),
      inputs: [
        { name: shared.inputs.neutralPoint, value: stability.neutralPointX, unit: 'mm' },
        { name: shared.inputs.cg, value: cgX, unit: 'mm' },
        { name: shared.inputs.mac, value: wing.macMm, unit: 'mm' },
      ],
    }),
    cgXMm: known(cgX, { verdict: placeVerdict(stability, cgX) }),
  };
}

/** A margin this close to a limit meets it: far finer than anyone can balance. */
const MARGIN_TOLERANCE_PCT = 0.05;

function marginVerdict(
  [low, high]: readonly [number, number],
  [least, largest]: readonly [number, number],
): { level: Verdict; words: string } {
  const { verdicts } = shared;
  const shown = fixedDigits(low, 1);
  if (high < 0) return { level: 'bad', words: texts.verdicts.marginUnstable };
  if (low < 0) return { level: 'bad', words: verdicts.marginUnstable };
  if (low < least - MARGIN_TOLERANCE_PCT)
    return { level: 'watch', words: fill(verdicts.marginLow, { low: shown, min: least }) };
  if (low > largest + MARGIN_TOLERANCE_PCT)
    return { level: 'watch', words: fill(verdicts.marginHigh, { low: shown, max: largest }) };
  return { level: 'good', words: verdicts.marginGood };
}

function placeVerdict({ foreLimitX, aftLimitX, bandX }: Stability, cgX: number): { level: Verdict; words: string } {
  const { verdicts } = shared;
  const behind = cgX - aftLimitX;
  const ahead = foreLimitX - cgX;
  if (cgX > bandX[1]) return { level: 'bad', words: fill(texts.verdicts.cgUnstable, { mm: fixedDigits(behind, 0) }) };
  if (cgX > bandX[0]) return { level: 'bad', words: fill(verdicts.cgBehindUnstable, { mm: fixedDigits(behind, 0) }) };
  if (behind > 0) return { level: 'watch', words: fill(verdicts.cgBehind, { mm: fixedDigits(behind, 1) }) };
  if (ahead > 0) return { level: 'watch', words: fill(verdicts.cgAhead, { mm: fixedDigits(ahead, 1) }) };
  return { level: 'good', words: verdicts.cgInRange };
}
