import { controlKey } from '@/lib/aero/lattice/fromAirframe';
import type { AntisymmetricEffect } from '@/lib/aero/model';
import { pitchCommand, rollCommand } from '@/lib/flight/commands';
import { type PullDerivatives, pullOf } from '@/lib/flight/modes/manoeuvre';
import { type Result, refuse } from '@/lib/numerics/result';
import type { Stiffness } from '@/lib/structure/moduli';
import { texts } from '@/lib/text/en/figures/handling';
import { bandBySquares, byShare } from '../bySquares';
import type { FigureContext } from '../context';
import { type FlexedOf, flexedWings } from '../flexedWings';
import { LATTICE_ERROR } from '../handlingBands';
import { staysOn, type TwistCase, twistCase, twistsOff } from '../twist';
import type { FigureValue } from '../types';
import { type FigureSet, firstProblem, known, missing } from '../value';
import { atMarginEnds, type Cruise, speedInput } from './cruise';
import { ratePerDeg, rollEnds } from './rollFeel';

// The feel of a wing that twists under the load of its own controls. Not for every move of a handle: it takes longer than all else there.

type Stick = TwistCase['stick'];

/** Share of its power that each surface's controls keep at cruise, by surface; null where the surface twists off. */
type Kept = ReadonlyMap<string, number>;

/** The controls of every surface that may twist, for a stick, at any stiffness; refused when the likely one twists off at cruise. */
function keptBy(context: FigureContext, stick: Stick, flexed: FlexedOf): Result<(stiffness: Stiffness) => Kept | null> {
  const { airframe, resolved } = context;
  const { cruiseMs } = airframe.flight;
  const cases = resolved.surfaces
    .filter(({ surface }) => surface.mirrored)
    .flatMap((surface) => twistCase(context, surface, stick, flexed));
  const off = cases.find(({ likely }) => !staysOn(likely, cruiseMs));
  if (off) return refuse(twistsOff(context, off));
  const at = (stiffness: Stiffness): Kept | null => {
    const kept = new Map<string, number>();
    for (const one of cases) {
      const twist = one.at(stiffness);
      const answer = twist && staysOn(twist, cruiseMs) ? twist.at(cruiseMs) : null;
      if (!answer) return null;
      kept.set(one.surface.surface.id, answer.power);
    }
    return kept;
  };
  return { ok: true, value: at };
}

/** Roll rate and pull per degree less what twist takes; each says why not where the rigid figure does. */
export function twistedFigures(context: FigureContext, cruise: Cruise, rigid: FigureSet): FigureSet {
  const { rollRatePerDeg, pitchPowerPerDeg } = rigid;
  const flexed = flexedWings(context.airframe);
  return {
    rollRateTwistedPerDeg: rollRatePerDeg?.problem ? rollRatePerDeg : twistedRoll(context, cruise, flexed),
    pitchPowerTwistedPerDeg: pitchPowerPerDeg?.problem ? pitchPowerPerDeg : twistedPull(context, cruise, flexed),
  };
}

/** Each control by its key, with what of its power its surface's twist leaves. */
const eachKept = ({ airframe }: FigureContext, kept: Kept) =>
  airframe.surfaces.flatMap((surface) =>
    surface.controls.map((control) => ({ key: controlKey(surface, control), share: kept.get(surface.id) ?? 1 })),
  );

function twistedRoll(context: FigureContext, cruise: Cruise, flexed: FlexedOf): FigureValue {
  const { controls, rollRate } = cruise.lateral;
  const kept = keptBy(context, 'roll', flexed);
  if (!kept.ok) return missing(firstProblem(kept));
  const rateAt = (stiffness: Stiffness): number | null => {
    const shares = kept.value(stiffness);
    if (!shares) return null;
    const left = new Map<string, AntisymmetricEffect>();
    for (const { key, share } of eachKept(context, shares)) {
      const effect = controls.get(key);
      if (effect) left.set(key, { side: effect.side * share, roll: effect.roll * share, yaw: effect.yaw * share });
    }
    const command = rollCommand(context.airframe, left);
    return command && ratePerDeg(cruise, -command.roll / rollRate.roll, command.throwDeg);
  };
  const value = rateAt('likely') ?? Number.NaN;
  return known(value, {
    ...bandBySquares(value, [[rateAt('low'), rateAt('high')], ...rollEnds(value)], texts.causes.twistedRoll),
    inputs: [speedInput(cruise)],
  });
}

function twistedPull(context: FigureContext, cruise: Cruise, flexed: FlexedOf): FigureValue {
  const { model } = context;
  const command = pitchCommand(context.airframe, model.controls);
  const kept = keptBy(context, 'pitch', flexed);
  if (!kept.ok) return missing(firstProblem(kept));
  const pullAt = (stiffness: Stiffness, d: PullDerivatives = model): number | null => {
    const shares = kept.value(stiffness);
    if (!shares || !command) return null;
    let [lift, pitch] = [0, 0];
    for (const { key, share } of eachKept(context, shares)) {
      const effect = model.controls.get(key);
      const perDeg = (share * (command.deflectionsRad.get(key) ?? 0)) / command.throwDeg;
      lift += (effect?.lift ?? 0) * perDeg;
      pitch += (effect?.pitch ?? 0) * perDeg;
    }
    return pullOf(cruise.point, d, { lift, pitch });
  };
  const value = pullAt('likely') ?? Number.NaN;
  const { alpha, pitchRate } = model;
  const byMargin = atMarginEnds(context, cruise, { alpha, pitchRate }).map((d) => pullAt('likely', d));
  const ends = [[pullAt('low'), pullAt('high')], byMargin, byShare(value, LATTICE_ERROR.controls.value)];
  return known(value, {
    ...bandBySquares(value, ends, texts.causes.twistedPull),
    inputs: [speedInput(cruise)],
  });
}
