import { ok, type Problem, type Result, refuse } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/aids';
import { fill } from '@/lib/text/fill';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import { trimmedDigits } from '@/lib/units/number';
import { LEAST_SPAN_SHARE, SQUARE_MM, STRIP_SPAN_MM, STRIP_WIDTH_MM } from './coupon';

const words = texts.problems;

/** What was read on the three pieces of a stock coupon. */
export interface CouponReadings {
  /** Of the 100 x 100 mm square. */
  readonly massG: number;
  readonly thicknessMm: number;
  /** How far the middle of the strip sank under the load. */
  readonly deflectionMm: number;
  readonly loadG: number;
  /** The narrowest slot of the comb that the board slides into and is held by. */
  readonly gripSlotMm: number;
  /** Between the supports; 200 where it was not said. */
  readonly spanMm?: number;
}

/** A workshop's own record of a board, in the units of the document. */
export interface FoamRecord {
  readonly arealMassGm2: number;
  readonly thicknessMm: number;
  /** Of the whole board in bending at this span, faces and core together. */
  readonly eMpa: number;
  /** What a slot needs over the measured thickness, kerf apart. */
  readonly slotClearanceMm: number;
}

// Outside these a reading was mistyped or misread; the document's own limits for a material are wider or the same.
const THICKNESS_MM = [0.4, 60] as const;
const DENSITY_KG_M3 = [8, 1300] as const;
const LOAD_G = [1, 5000] as const;
const E_MPA = [0.1, 50_000] as const;
/** Smaller than this, half a millimetre of a rule is too much of the reading. */
const LEAST_DEFLECTION_MM = 1;
/** Over a tenth of the span the small-deflection formula no longer holds (ASTM D790 corrects from there on; from memory). */
const MOST_DEFLECTION_SHARE = 0.1;
const MOST_CLEARANCE_MM = 1.5;
/** The comb is stepped: a slot of the measured thickness counts as one, whatever the last digit of the thickness. */
const SAME_MM = 0.05;

const show = (value: number): string => trimmedDigits(value, 2);
const outside = (value: number, [low, high]: readonly [number, number]): boolean => !(value >= low && value <= high);
const limits = ([low, high]: readonly [number, number]) => ({ low: show(low), high: show(high) });

/**
 * Modulus of a strip on two supports from what its middle sinks under a load there, MPa: E = F L^3 / (48 I d) with I = b t^3 / 12
 * (W. C. Young and R. G. Budynas, "Roark's Formulas for Stress and Strain", ch. 8, beam supported at both ends, load at the middle; ASTM D790).
 * N, mm. Shear is left in: the modulus is the board's at this span.
 */
const bendingModulusMpa = (
  forceN: number,
  spanMm: number,
  widthMm: number,
  thicknessMm: number,
  deflectionMm: number,
): number => (forceN * spanMm ** 3) / (48 * ((widthMm * thicknessMm ** 3) / 12) * deflectionMm);

const problem = (code: string, path: keyof CouponReadings, message: string, fix?: string): Problem => ({
  code: `coupon-${code}`,
  path,
  message,
  ...(fix ? { fix } : {}),
});

function sizeProblems({ massG, thicknessMm, gripSlotMm }: CouponReadings, spanMm: number): Problem[] {
  const problems: Problem[] = [];
  if (outside(thicknessMm, THICKNESS_MM)) {
    const values = { thickness: show(thicknessMm), ...limits(THICKNESS_MM) };
    return [problem('thickness', 'thicknessMm', fill(words.thickness, values), words.thicknessFix)];
  }
  const density = arealMass(massG) / thicknessMm;
  if (outside(density, DENSITY_KG_M3)) {
    const values = { density: trimmedDigits(density, 1), ...limits(DENSITY_KG_M3) };
    problems.push(problem('mass', 'massG', fill(words.massDensity, values), words.massDensityFix));
  }
  if (thicknessMm * LEAST_SPAN_SHARE > spanMm) {
    const message = fill(words.tooThick, { thickness: show(thicknessMm), span: show(spanMm) });
    const fix = fill(words.tooThickFix, { need: show(thicknessMm * LEAST_SPAN_SHARE) });
    problems.push(problem('strip-too-thick', 'spanMm', message, fix));
  }
  const clearance = gripSlotMm - thicknessMm;
  if (clearance < -SAME_MM) {
    const message = fill(words.slotNarrow, { thickness: show(thicknessMm) });
    problems.push(problem('slot-too-narrow', 'gripSlotMm', message, words.slotNarrowFix));
  }
  if (clearance > MOST_CLEARANCE_MM) {
    const message = fill(words.slotWide, { more: show(clearance) });
    problems.push(problem('slot-too-wide', 'gripSlotMm', message, words.slotWideFix));
  }
  return problems;
}

function bendingProblems({ deflectionMm, loadG }: CouponReadings, spanMm: number): Problem[] {
  const problems: Problem[] = [];
  if (deflectionMm < LEAST_DEFLECTION_MM) {
    const values = { deflection: show(deflectionMm), least: show(LEAST_DEFLECTION_MM) };
    problems.push(
      problem('deflection-small', 'deflectionMm', fill(words.deflectionSmall, values), words.deflectionSmallFix),
    );
  }
  if (deflectionMm > MOST_DEFLECTION_SHARE * spanMm) {
    const values = { deflection: show(deflectionMm), span: show(spanMm) };
    problems.push(
      problem('deflection-large', 'deflectionMm', fill(words.deflectionLarge, values), words.deflectionLargeFix),
    );
  }
  if (outside(loadG, LOAD_G)) {
    const values = { load: show(loadG), ...limits(LOAD_G) };
    problems.push(problem('load', 'loadG', fill(words.load, values), words.loadFix));
  }
  return problems;
}

const MM2_PER_M2 = 1e6;
const arealMass = (massG: number): number => (massG * MM2_PER_M2) / SQUARE_MM ** 2;

const FIELDS = ['massG', 'thicknessMm', 'deflectionMm', 'loadG', 'gripSlotMm'] as const;

/**
 * The workshop's own record of a board from what was read on its coupon. Refused, each at its field, when a reading is no number above 0, when
 * mass and thickness make no foam or wood, when the strip bent too little or too much for the formula, or when the slot cannot be the one
 * that grips.
 */
export function readCoupon(readings: CouponReadings): Result<FoamRecord> {
  const spanMm = readings.spanMm ?? STRIP_SPAN_MM;
  const bare = [...FIELDS.map((path) => [path, readings[path]] as const), ['spanMm', spanMm] as const]
    .filter(([, value]) => !(Number.isFinite(value) && value > 0))
    .map(([path]) => problem('not-a-number', path, words.notNumber));
  if (bare.length > 0) return refuse(...bare);
  const problems = [...sizeProblems(readings, spanMm), ...bendingProblems(readings, spanMm)];
  if (problems.length > 0) return refuse(...problems);
  const { massG, thicknessMm, deflectionMm, loadG, gripSlotMm } = readings;
  const forceN = (loadG / 1000) * STANDARD_GRAVITY;
  const eMpa = bendingModulusMpa(forceN, spanMm, STRIP_WIDTH_MM, thicknessMm, deflectionMm);
  if (outside(eMpa, E_MPA)) {
    const message = fill(words.stiffness, { mpa: show(eMpa), ...limits(E_MPA) });
    const fix = fill(words.stiffnessFix, { width: show(STRIP_WIDTH_MM), span: show(spanMm) });
    return refuse(problem('stiffness', 'deflectionMm', message, fix));
  }
  return ok({
    arealMassGm2: arealMass(massG),
    thicknessMm,
    eMpa,
    slotClearanceMm: Math.abs(gripSlotMm - thicknessMm) <= SAME_MM ? 0 : gripSlotMm - thicknessMm,
  });
}
