import { flapEffectiveness, flapMoment } from '@/lib/aero/lattice/hinge';
import { wingLiftSlope } from '@/lib/aero/liftSlope';
import { controlWithin, elementWithin } from '@/lib/airframe/names';
import type { ResolvedSurface } from '@/lib/airframe/resolved';
import type { Control } from '@/lib/airframe/schema/surface';
import type { Problem } from '@/lib/numerics/result';
import type { WingStrip } from '@/lib/structure/halfWing';
import type { Stiffness } from '@/lib/structure/moduli';
import { type Lever, type Twist, twistOf } from '@/lib/structure/twist';
import { texts } from '@/lib/text/en/figures/structure';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import type { VerdictBand } from './bands';
import type { FigureContext, FigureGroupResult } from './context';
import { type FlexedOf, remembered } from './flexedWings';
import { CONTROL_LOSS_PCT, TWIST_SPEED_OVER_CRUISE } from './structureBands';
import type { FigureValue } from './types';
import { allMissing, type BandWords, doesNotApply, type FigureSet, known, verdictOf } from './value';

type Stick = keyof typeof texts.sticks;

/** What strength and stiffness start from. */
export type StructureContext = Pick<FigureContext, 'airframe' | 'resolved' | 'areas' | 'balance' | 'air'>;

/** One surface's controls answering to one stick. */
export interface TwistCase {
  readonly surface: ResolvedSurface;
  readonly stick: Stick;
  readonly control: Control;
  /** Strips at the likely stiffness. */
  readonly strips: readonly WingStrip[];
  readonly likely: Twist;
  readonly at: (stiffness: Stiffness) => Twist | null;
}

/** What twist takes from the controls, of the surface and stick that suffer most. */
export function twistFigures(context: StructureContext, flexed: FlexedOf): FigureGroupResult {
  const cases = context.resolved.surfaces
    .filter(({ surface }) => surface.mirrored)
    .flatMap((surface) => (['pitch', 'roll'] as const).flatMap((stick) => twistCase(context, surface, stick, flexed)));
  if (cases.length === 0) return { figures: withoutControls() };
  const diverges = least(cases, ({ likely }) => likely.divergenceMs);
  const speeds: FigureSet = {
    reversalSpeedMs: speedFigure(
      context,
      least(cases, ({ likely }) => likely.reversalMs),
      ({ reversalMs }) => reversalMs,
      texts.problems.noReversal,
    ),
    divergenceSpeedMs: speedFigure(context, diverges, (twist) => twist.divergenceMs, texts.problems.noDivergence),
  };
  if (diverges && !staysOn(diverges.likely, context.airframe.flight.cruiseMs)) {
    const problem = twistsOff(context, diverges);
    const lost = allMissing(['controlLossAtCruisePct', 'tipTwistPerDeg'], problem);
    return { figures: { ...speeds, ...lost }, problems: [problem] };
  }
  return { figures: { ...speeds, ...cruiseFigures(context, cases) } };
}

function withoutControls(): FigureSet {
  const none = doesNotApply(texts.problems.noControl);
  return { controlLossAtCruisePct: none, tipTwistPerDeg: none, reversalSpeedMs: none, divergenceSpeedMs: none };
}

/** Why nothing can be said of a surface that twists off below the cruising speed. */
export function twistsOff({ airframe }: StructureContext, { surface: { surface, index }, likely }: TwistCase): Problem {
  const speedMs = likely.divergenceMs ?? airframe.flight.cruiseMs;
  const values = { surface: elementWithin(airframe, surface.id), speed: fixedDigits(speedMs, 1) };
  return {
    code: 'wing-twists-off',
    path: `surfaces.${index}`,
    message: fill(texts.problems.twistsOff, values),
    fix: texts.problems.twistsOffFix,
  };
}

/** A surface's controls for a stick, if it has any: on one half, for the other does the same or the opposite. */
export function twistCase(
  context: StructureContext,
  surface: ResolvedSurface,
  stick: Stick,
  flexed: FlexedOf,
): TwistCase[] {
  const control = surface.surface.controls.find(({ mix }) => mix[stick] !== 0);
  if (!control) return [];
  const liftSlope = slopeOf(context, surface);
  const at = remembered((stiffness) => {
    const { strips, flexibility } = flexed(surface, stiffness);
    return twistOf({
      strips,
      flexibility,
      controls: strips.map((strip) => effectOn(strip, surface, stick)),
      levers: strips.map((strip) => leverOf(strip, stick, context)),
      liftSlope,
      densityKgM3: context.air.densityKgM3,
    });
  });
  const likely = at('likely');
  return likely ? [{ surface, stick, control, strips: flexed(surface, 'likely').strips, likely, at }] : [];
}

/** Lift slope of the whole surface: what neighbouring strips do to each other, evenly. */
function slopeOf({ areas }: StructureContext, { surface }: ResolvedSurface): number {
  const area = areas.surfaces.find(({ surface: { id } }) => id === surface.id);
  if (!area) throw new RangeError(`no area for ${surface.id}`);
  const [root, tip] = [area.sections[0], area.sections.at(-1)];
  const run = (root && tip && tip.le[0] + tip.chord / 2 - root.le[0] - root.chord / 2) ?? 0;
  return wingLiftSlope(area.spanMm ** 2 / area.areaMm2, Math.atan2(run, area.spanMm / 2));
}

function effectOn({ controls }: WingStrip, { surface }: ResolvedSurface, stick: Stick) {
  let [lift, moment] = [0, 0];
  for (const { id, mix } of surface.controls) {
    const piece = controls.get(id);
    if (!piece) continue;
    lift += mix[stick] * piece.covered * flapEffectiveness(piece.chordShare);
    moment += mix[stick] * piece.covered * flapMoment(piece.chordShare);
  }
  return { lift, moment };
}

/** Arms about the CG: of lift for roll, of lift and couple for pitch. */
function leverOf({ yMm, zMm, rollRad, quarterXMm }: WingStrip, stick: Stick, { balance }: StructureContext): Lever {
  const [cos, sin] = [Math.cos(rollRad), Math.sin(rollRad)];
  const [x, , z] = balance.cg;
  if (stick === 'roll') return { lift: yMm * cos + (zMm - z) * sin, couple: 0 };
  return { lift: (x - quarterXMm) * cos, couple: cos };
}

function least(cases: readonly TwistCase[], speed: (one: TwistCase) => number | null): TwistCase | null {
  return cases.reduce<TwistCase | null>((best, next) => {
    const mine = speed(next);
    if (mine === null) return best;
    const so = best && speed(best);
    return so === null || mine < so ? next : best;
  }, null);
}

const SPEED_WORDS: BandWords = {
  veryLow: texts.verdicts.speedBad,
  low: texts.verdicts.speedLow,
  good: texts.verdicts.speedGood,
  high: texts.verdicts.speedGood,
  veryHigh: texts.verdicts.speedGood,
};

function speedFigure(
  context: StructureContext,
  found: TwistCase | null,
  of: (twist: Twist) => number | null,
  none: string,
): FigureValue {
  const speed = found && of(found.likely);
  if (!found || speed === null) return doesNotApply(none);
  const cruise = context.airframe.flight.cruiseMs;
  const end = (stiffness: Stiffness) => {
    const twist = found.at(stiffness);
    return twist && of(twist);
  };
  return known(speed, {
    ...bandOf(end('low'), speed, end('high')),
    verdict: verdictOf(speed / cruise, TWIST_SPEED_OVER_CRUISE, SPEED_WORDS),
    inputs: inputsOf(context, found),
  });
}

/** Only when both ends could be worked out: a softer wing may twist off before, a stiffer one not at all. */
function bandOf(a: number | null, value: number, b: number | null): Pick<FigureValue, 'band'> {
  if (a === null || b === null) return {};
  return { band: { low: Math.min(a, value, b), high: Math.max(a, value, b), cause: texts.causes.stiffness } };
}

const lossWords = (lossPct: number): BandWords => {
  const pct = fixedDigits(lossPct, 0);
  return {
    veryLow: texts.verdicts.lossLargeGain,
    low: texts.verdicts.lossGain,
    good: texts.verdicts.lossGood,
    high: fill(texts.verdicts.lossHigh, { pct }),
    veryHigh: fill(texts.verdicts.lossVeryHigh, { pct }),
  };
};

/** Loss and tip twist at cruise, of the case that loses most. */
function cruiseFigures(context: StructureContext, cases: readonly TwistCase[]): FigureSet {
  const cruise = context.airframe.flight.cruiseMs;
  const worst = cases.reduce((most, next) =>
    (lossAt(next.likely, cruise) ?? 0) > (lossAt(most.likely, cruise) ?? 0) ? next : most,
  );
  const ends = (of: (twist: Twist, speedMs: number) => number | null) => {
    const [low, likely, high] = [worst.at('low'), worst.likely, worst.at('high')].map((twist) =>
      twist && staysOn(twist, cruise) ? of(twist, cruise) : null,
    );
    return { value: likely ?? Number.NaN, band: bandOf(low ?? null, likely ?? Number.NaN, high ?? null) };
  };
  const loss = ends(lossAt);
  const turn = ends(tipTurnAt);
  const inputs = inputsOf(context, worst);
  return {
    controlLossAtCruisePct: known(loss.value, {
      ...loss.band,
      verdict: lossVerdict(loss.value, CONTROL_LOSS_PCT),
      inputs,
    }),
    tipTwistPerDeg: known(turn.value, { ...turn.band, inputs }),
  };
}

/** Whether the wing's own lift does not twist it off at this speed already. */
export const staysOn = ({ divergenceMs }: Twist, speedMs: number): boolean =>
  divergenceMs === null || divergenceMs > speedMs;

function lossVerdict(lossPct: number, band: VerdictBand): NonNullable<FigureValue['verdict']> {
  if (lossPct >= 100) return { level: 'bad', words: texts.verdicts.lossReversed };
  return verdictOf(lossPct, band, lossWords(lossPct));
}

function lossAt(twist: Twist, speedMs: number): number | null {
  const answer = twist.at(speedMs);
  return answer && (1 - answer.power) * 100;
}

/** Against the control: nose down for a trailing edge that goes down. */
function tipTurnAt(twist: Twist, speedMs: number): number | null {
  const answer = twist.at(speedMs);
  return answer && -answer.tipTurn;
}

function inputsOf(
  { airframe }: StructureContext,
  { surface, stick, control, strips }: TwistCase,
): FigureValue['inputs'] {
  const values = {
    control: controlWithin(surface.surface, control),
    surface: elementWithin(airframe, surface.surface.id),
    stick: texts.sticks[stick],
  };
  const middle = (control.from + control.to) / 2;
  const beside = strips.reduce((best, next) =>
    Math.abs(next.station - middle) < Math.abs(best.station - middle) ? next : best,
  );
  return [
    { name: fill(texts.inputs.control, values), value: control.throwsDeg.up, unit: '°' },
    { name: texts.inputs.torsion, value: beside.torsionNmm2 / 1e6, unit: 'N m²' },
    { name: texts.inputs.speed, value: airframe.flight.cruiseMs, unit: 'm/s' },
  ];
}
