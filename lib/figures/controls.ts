import { travelOf, USUAL_ROD } from '@/lib/linkage/ofControl';
import { edgeTravelMm } from '@/lib/linkage/travel';
import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures/controls';
import { fill } from '@/lib/text/fill';
import type { FigureGroupResult } from './context';
import {
  type Answer,
  figureOf,
  type Linked,
  rodAnswer,
  type Speed,
  slopAnswer,
  torqueAnswer,
  travelAnswer,
  worst,
} from './controlAnswers';
import { CONTROL_SLOP, HINGE_TORQUE, ROD_BUCKLING, SERVO_TRAVEL, TOP_OVER_CRUISE } from './controlBands';
import { throwTravelChart } from './controlChart';
import { type ControlContext, type StudiedControl, studiedControls } from './controlLoads';
import type { FigureValue } from './types';
import { doesNotApply, type FigureSet, known, missing } from './value';

const deadCentre = ({ path }: StudiedControl): Problem => ({
  code: 'linkage-dead-centre',
  path: `${path}.linkage`,
  message: texts.problems.deadCentre,
  fix: texts.problems.deadCentreFix,
});

/** The slop figures share their control; the millimetres follow from the degrees. */
function slopFigures(answer: Answer): FigureSet {
  const { widestMm } = answer.studied.place;
  const mm = (deg: number): number => edgeTravelMm(widestMm, deg);
  const { band, value } = answer;
  return {
    controlSlopDeg: figureOf(answer),
    controlSlopMm: known(mm(value), {
      inputs: answer.inputs,
      ...(band ? { band: { low: mm(band.low), high: mm(band.high), cause: band.cause } } : {}),
    }),
  };
}

const noRod = (): FigureValue =>
  doesNotApply(fill(texts.problems.noRod, { diameter: USUAL_ROD.diameterMm, free: USUAL_ROD.freeMm }));

const noControls = (): FigureSet => {
  const none = doesNotApply(texts.problems.noControls);
  return {
    hingeTorquePct: none,
    servoTravelPct: none,
    controlSlopDeg: none,
    controlSlopMm: none,
    rodBucklingFactor: none,
  };
};

/** Controls with a linkage that can be worked out, and what is wrong with the others. */
function linkedControls(controls: readonly StudiedControl[]): { linked: Linked[]; problems: Problem[] } {
  const linked = controls.flatMap((studied) =>
    studied.linkage.ok ? [{ studied, linkage: studied.linkage.value }] : [],
  );
  const refused = controls.flatMap(({ linkage }) => (linkage.ok ? [] : linkage.problems));
  const stuck = linked.filter(({ studied, linkage }) => !travelOf(linkage, studied.together));
  return { linked, problems: [...refused, ...stuck.map(({ studied }) => deadCentre(studied))] };
}

/**
 * Figures of controls and linkages, each for the control that is worst off and naming it: servo torque and rod at twice the highest level
 * speed, servo travel, slop. Controls without a linkage in the document are judged with the usual holes that suit their throw.
 * @param topSpeedMs highest level speed; null until it is known, then cruise times 1.5
 */
export function controlFigures(context: ControlContext, topSpeedMs: number | null): FigureGroupResult {
  const controls = studiedControls(context);
  if (controls.length === 0) return { figures: noControls() };
  const assumedMs = context.airframe.flight.cruiseMs * TOP_OVER_CRUISE.value;
  const speed: Speed = { ms: topSpeedMs ?? assumedMs, assumed: topSpeedMs === null };
  const { linked, problems } = linkedControls(controls);
  const answers = (answer: (one: Linked) => Answer | null): Answer[] => linked.flatMap((one) => answer(one) ?? []);
  const travel = worst(answers(travelAnswer), SERVO_TRAVEL);
  const torque = worst(
    answers((one) => torqueAnswer(context, one, speed)),
    HINGE_TORQUE,
  );
  const slop = worst(answers(slopAnswer), CONTROL_SLOP);
  const rod = worst(
    answers((one) => rodAnswer(context, one, speed)),
    ROD_BUCKLING,
  );
  const [problem] = problems;
  const lost = (): FigureValue => (problem ? missing(problem) : doesNotApply(texts.problems.noControls));
  const drawn = travel ?? slop;
  return {
    figures: {
      hingeTorquePct: torque ? figureOf(torque) : lost(),
      // A control that never gets its throw is worse off than all that do.
      servoTravelPct: travel && !problem ? figureOf(travel) : lost(),
      ...(slop ? slopFigures(slop) : { controlSlopDeg: lost(), controlSlopMm: lost() }),
      rodBucklingFactor: rod ? figureOf(rod) : noRod(),
    },
    charts: drawn ? [throwTravelChart(drawn.studied, drawn.linkage)] : [],
    problems,
  };
}
