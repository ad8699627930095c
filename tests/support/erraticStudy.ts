import type { AeroModel, LateralDerivatives } from '@/lib/aero/model';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { analyse } from '@/lib/figures/analyse';
import { liftOf } from '@/lib/figures/lift';
import { areasOf } from '@/lib/figures/reference';
import type { FigureId } from '@/lib/figures/table/entry';
import type { Figures, FigureValue, Verdict } from '@/lib/figures/types';
import {
  type Change,
  elevonsInboard,
  erraticPusher,
  finsOnBooms,
  motorForward,
  motorForwardPackAft,
  tailOnBooms,
} from './erraticPusher';

// The aircraft that is hard to fly with any of its changes made, in any order, and what is asked of it.

export const NAMES = ['motor', 'fins', 'tail', 'inboard'] as const;
export type ChangeName = (typeof NAMES)[number];
type Changes = Readonly<Record<ChangeName, Change>>;

const LEFT: Changes = { motor: motorForward, fins: finsOnBooms, tail: tailOnBooms, inboard: elevonsInboard };
/** The same, but the pack moves aft when the motor moves forward. */
export const HELD: Changes = { ...LEFT, motor: motorForwardPackAft };

/** The aircraft with these changes made one after the other. */
export const made = (names: readonly ChangeName[], changes: Changes = LEFT): Airframe =>
  names.reduce((document, name) => changes[name](document), erraticPusher());

export const full = (document: Airframe): Figures => analyse(document, { depth: 'full' });

export const subsetsOf = (names: readonly ChangeName[]): ChangeName[][] =>
  names.reduce<ChangeName[][]>((all, name) => all.flatMap((some) => [some, [...some, name]]), [[]]);

export const ordersOf = (names: readonly ChangeName[]): ChangeName[][] =>
  names.length === 0
    ? [[]]
    : names.flatMap((first) => ordersOf(names.filter((name) => name !== first)).map((rest) => [first, ...rest]));

export const labelled = (sets: readonly ChangeName[][]) =>
  sets.map((names) => ({ names, label: names.length > 0 ? names.join(', ') : 'nothing' }));

/** Every state that a change may be made from. */
export const startsFor = (change: ChangeName) => labelled(subsetsOf(NAMES.filter((name) => name !== change)));

export function figureIn(figures: Figures, id: FigureId): FigureValue {
  const found = figures.values[id];
  if (!found) throw new RangeError(`no figure ${id}`);
  return found;
}

export const valueIn = (figures: Figures, id: FigureId): number => figureIn(figures, id).value ?? Number.NaN;

const RANK: Readonly<Record<Verdict, number>> = { good: 0, watch: 1, bad: 2 };

/** Figures of every state, each worked out once. */
export function study() {
  const known = new Map<string, Figures>();
  const figuresOf = (names: readonly ChangeName[]): Figures => {
    const ordered = NAMES.filter((name) => names.includes(name));
    const figures = known.get(ordered.join()) ?? full(made(ordered));
    known.set(ordered.join(), figures);
    return figures;
  };
  const verdictAt = (names: readonly ChangeName[], id: FigureId) => {
    const { verdict } = figureIn(figuresOf(names), id);
    if (!verdict) throw new RangeError(`${id} is not judged`);
    return verdict;
  };
  return {
    figuresOf,
    at: (names: readonly ChangeName[], id: FigureId): number => valueIn(figuresOf(names), id),
    verdictAt,
    /** 0 good, 2 bad. */
    rankAt: (names: readonly ChangeName[], id: FigureId): number => RANK[verdictAt(names, id).level],
  };
}

/** Aerodynamics about the CG, or about another place along x. */
function modelOf(document: Airframe, aboutX?: number): AeroModel {
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('does not resolve');
  const { wing } = areasOf(document, resolved.value);
  if (!wing.ok) throw new RangeError('no wing');
  const [x = Number.NaN, , z = Number.NaN] = analyse(document, { depth: 'live' }).marks.cg ?? [];
  const model = liftOf(document, resolved.value, wing.value, [aboutX ?? x, 0, z], { bodies: true, propellers: true });
  if (!model.ok) throw new RangeError('no lift');
  return model.value;
}

/** Cm_q, about the CG or about another place along x. */
export const pitchDamping = (names: readonly ChangeName[], aboutX?: number): number =>
  modelOf(made(names), aboutX).pitchRate.pitch;

/** Roll and yaw at a lift coefficient of about a quarter. */
export const sideOf = (names: readonly ChangeName[]): LateralDerivatives =>
  modelOf(made(names)).lateral({ alphaRad: 0.06, deflectionsRad: new Map() });
