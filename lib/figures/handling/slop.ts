import { controlKey } from '@/lib/aero/lattice/fromAirframe';
import { pullOf } from '@/lib/flight/modes/manoeuvre';
import { leversTurned } from '@/lib/linkage/ofControl';
import { type Slop, slopOf } from '@/lib/linkage/slop';
import { radFromDeg } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/figures/handling';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { bandBySquares, byShare } from '../bySquares';
import type { FigureContext } from '../context';
import { type StudiedControl, studiedControls } from '../controlLoads';
import { LATTICE_ERROR, SLOP_PULL_G } from '../handlingBands';
import type { FigureValue } from '../types';
import { doesNotApply, firstProblem, known, missing } from '../value';
import { atMarginEnds, type Cruise, speedInput } from './cruise';
import { behindManoeuvrePoint } from './pull';

// What a loose linkage does to the path: the surface rests anywhere between its stops, so the trim does too.

const { verdicts, inputs, causes, problems } = texts;

/** A control that answers to pitch, with what it leaves free. */
interface Loose {
  readonly studied: StudiedControl;
  readonly slop: Slop;
}

/** From the middle of the free movement to a stop. */
const EACH_WAY = 0.5;

/**
 * Load factor that play and servo centring are worth in a steady pull-up at cruise, either way from where the aircraft is trimmed: half of
 * the free movement of every control that answers to pitch, all to the same side, times what each pulls (Etkin & Reid, "Dynamics of
 * Flight", ch. 3). Missing where a linkage cannot be worked out and at the manoeuvre point.
 */
export function slopFigure(context: FigureContext, cruise: Cruise): FigureValue {
  const controls = studiedControls(context).filter(({ control }) => control.mix.pitch !== 0);
  const loose: Loose[] = [];
  for (const studied of controls) {
    if (!studied.linkage.ok) return missing(firstProblem(studied.linkage));
    const levers = leversTurned(studied.linkage.value, 0);
    if (levers) loose.push({ studied, slop: slopOf(levers) });
  }
  if (loose.length === 0) return doesNotApply(problems.noPitchControl);
  const pull = (d: Pick<FigureContext['model'], 'alpha' | 'pitchRate'>, deg: (slop: Slop) => number) =>
    pullTogether(context, cruise, loose, d, deg);
  const value = pull(context.model, ({ valueDeg }) => valueDeg);
  if (value === null || !Number.isFinite(value)) return missing(behindManoeuvrePoint);
  const { alpha, pitchRate } = context.model;
  // The margin multiplies what the linkage leaves, so their ends go together; how strong the control is comes on top.
  const ends = atMarginEnds(context, cruise, { alpha, pitchRate }).flatMap((d) => [
    pull(d, ({ lowDeg }) => lowDeg),
    pull(d, ({ highDeg }) => highDeg),
  ]);
  const freeDeg = Math.max(...loose.map(({ slop }) => slop.valueDeg));
  return known(value, {
    ...bandBySquares(value, [ends, byShare(value, LATTICE_ERROR.controls.value)], causes.slop),
    verdict: slopVerdict(value),
    inputs: [
      speedInput(cruise),
      { name: inputs.freeMovement, value: freeDeg, unit: '°' },
      { name: inputs.elevatorPerG, value: (EACH_WAY * freeDeg) / value, unit: '°/g' },
    ],
  });
}

/** Sum over the controls; null at and behind the manoeuvre point. */
function pullTogether(
  { model }: FigureContext,
  { point }: Cruise,
  loose: readonly Loose[],
  d: Pick<FigureContext['model'], 'alpha' | 'pitchRate'>,
  deg: (slop: Slop) => number,
): number | null {
  let sum = 0;
  for (const { studied, slop } of loose) {
    const effect = model.controls.get(controlKey(studied.surface, studied.control));
    const perRad = effect ? pullOf(point, d, effect) : 0;
    if (perRad === null) return null;
    sum += Math.abs(perRad) * radFromDeg(EACH_WAY * deg(slop));
  }
  return sum;
}

function slopVerdict(pullG: number): FigureValue['verdict'] {
  const words = (text: string) => fill(text, { g: fixedDigits(pullG, 2) });
  if (pullG <= SLOP_PULL_G.steady.value) return { level: 'good', words: words(verdicts.slopSteady) };
  if (pullG <= SLOP_PULL_G.loose.value) return { level: 'watch', words: words(verdicts.slopLoose) };
  return { level: 'bad', words: words(verdicts.slopVeryLoose) };
}
