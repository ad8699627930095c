import { elementName } from '@/lib/airframe/names';
import { type BallastPlace, ballastG, ballastPlace, extentX } from '@/lib/balance/ballast';
import type { BalanceError } from '@/lib/balance/errors';
import { type MainPacks, mainPacks, moveFor, otherPacks, type PackRange, packRange } from '@/lib/balance/packPlace';
import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures/balance';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { BALLAST_INSET_MM, BALLAST_SHARE, OTHER_PACK_FACTORS } from './balanceBands';
import type { FigureContext } from './context';
import type { FigureValue, Verdict } from './types';
import { allMissing, type FigureSet, known, missing } from './value';

// Where the packs must sit, what another pack does, and ballast where moving the packs is not enough.

/** What the figures of balance start from; they need no model of the air. */
export type BalanceContext = Pick<FigureContext, 'airframe' | 'resolved' | 'wing' | 'lines' | 'balance' | 'stability'>;

/** The range there is to reach, and the packs that can be moved for it. */
interface Aim extends BalanceContext {
  readonly firstFlightX: number;
  /** How far the CG may be out because the masses are. */
  readonly cgErrorMm: number;
  readonly packs: (MainPacks & { readonly range: PackRange; readonly massG: number }) | null;
}

const PACK_FIGURES = ['packForeMm', 'packAftMm', 'packFirstFlightMm', 'packCgPerCm', 'packSwapCgMm'] as const;

const noPack: Problem = {
  code: 'no-pack',
  path: 'items',
  message: texts.problems.noPack,
  fix: texts.problems.noPackFix,
};

/** A move nearer than this is no move, mm: less than anyone can place a pack. */
const STAY_MM = 0.5;

const moveWords = (mm: number): string => {
  if (Math.abs(mm) < STAY_MM) return texts.moves.stay;
  return fill(mm < 0 ? texts.moves.forward : texts.moves.aft, { mm: fixedDigits(Math.abs(mm), 0) });
};

const within = (value: number, [low, high]: readonly [number, number]): number => Math.min(Math.max(value, low), high);

/** Figures of the packs' place, which are as sure as the CG is, of other packs and of ballast. */
export function packFigures(context: BalanceContext, { cgMm }: Pick<BalanceError, 'cgMm'>): FigureSet {
  const { airframe, lines, stability } = context;
  const { firstFlightX, foreLimitX, aftLimitX } = stability;
  const lost = stability.figures.firstFlightCgXMm?.problem;
  if (firstFlightX === null) {
    if (!lost) throw new RangeError('no first-flight CG, and no problem that says why');
    return allMissing([...PACK_FIGURES, 'ballastG'], lost);
  }
  const found = mainPacks(airframe);
  const packs = found && {
    ...found,
    range: packRange(lines, found.keys, [foreLimitX, aftLimitX], found.travelMm),
    massG: lines.filter(({ key }) => found.keys.includes(key)).reduce((sum, { massG }) => sum + massG, 0),
  };
  const aim: Aim = { ...context, firstFlightX, cgErrorMm: cgMm[0], packs };
  return { ...(packs ? placeFigures(aim, packs) : allMissing(PACK_FIGURES, noPack)), ballastG: ballastFigure(aim) };
}

function placeFigures(aim: Aim, packs: NonNullable<Aim['packs']>): FigureSet {
  const { range, travelMm, massG } = packs;
  const mm = (name: string, value: number) => ({ name, value, unit: 'mm' });
  const slide = travelMm ? [mm(texts.inputs.slideFore, travelMm[0]), mm(texts.inputs.slideAft, travelMm[1])] : [];
  const reached =
    travelMm && range.reached
      ? [mm(texts.inputs.reachFore, range.reached[0]), mm(texts.inputs.reachAft, range.reached[1])]
      : [];
  const masses = [
    { name: texts.inputs.packMass, value: massG, unit: 'g' },
    { name: texts.inputs.allUp, value: aim.balance.massG, unit: 'g' },
  ];
  const band = (move: number) => {
    const off = aim.cgErrorMm / range.cgPerMm;
    return { band: { low: move - off, high: move + off, cause: texts.causes.mass } };
  };
  const end = (move: number): FigureValue =>
    known(move, { ...band(move), verdict: endVerdict(range, move), inputs: [...slide, ...reached] });
  const move = moveFor(aim.lines, packs.keys, aim.firstFlightX);
  return {
    packForeMm: end(range.foreMm),
    packAftMm: end(range.aftMm),
    packFirstFlightMm: known(move, { ...band(move), verdict: moveVerdict(move, travelMm), inputs: slide }),
    packCgPerCm: known(range.cgPerMm * 10, { inputs: masses }),
    packSwapCgMm: swapFigure(aim, packs),
  };
}

function endVerdict({ reached }: PackRange, move: number): { level: Verdict; words: string } {
  if (!reached) return { level: 'watch', words: texts.verdicts.packNoReach };
  const here = Math.abs(move) < STAY_MM;
  const words = here ? texts.verdicts.packEndHere : fill(texts.verdicts.packEnd, { move: moveWords(move) });
  return { level: 'good', words };
}

function moveVerdict(move: number, travel: MainPacks['travelMm']): { level: Verdict; words: string } {
  const { verdicts } = texts;
  if (Math.abs(move) < STAY_MM) return { level: 'good', words: verdicts.packStay };
  if (!travel) return { level: 'good', words: fill(verdicts.packFree, { move: moveWords(move) }) };
  const short = Math.abs(move - within(move, travel));
  if (short < STAY_MM) return { level: 'good', words: fill(verdicts.packMove, { move: moveWords(move) }) };
  return {
    level: 'watch',
    words: fill(verdicts.packShort, { mm: fixedDigits(short, 0), move: moveWords(move) }),
  };
}

/** What a pack a quarter heavier does in the same place; the other packs of the list stand in the inputs. */
function swapFigure({ lines, balance, wing, stability, firstFlightX }: Aim, { keys }: MainPacks): FigureValue {
  const others = otherPacks(lines, keys, OTHER_PACK_FACTORS, firstFlightX);
  const [, heavier] = others;
  if (!heavier) throw new RangeError('the list of other packs must hold a heavier one');
  return known(heavier.cgXMm - balance.cg[0], {
    inputs: others.flatMap(({ massG, cgXMm, moveMm }) => {
      const mass = fixedDigits(massG, 0);
      const margin = ((stability.neutralPointX - cgXMm) / wing.macMm) * 100;
      return [
        { name: fill(texts.inputs.swapCg, { mass }), value: cgXMm - balance.cg[0], unit: 'mm' },
        { name: fill(texts.inputs.swapMargin, { mass }), value: margin, unit: '% MAC' },
        { name: fill(texts.inputs.swapMove, { mass }), value: moveMm, unit: 'mm' },
      ];
    }),
  });
}

/** Least ballast that brings the CG into its range, once the packs have gone as far towards it as they can. */
function ballastFigure(aim: Aim): FigureValue {
  const { airframe, resolved, balance, stability, packs, firstFlightX } = aim;
  const { foreLimitX, aftLimitX } = stability;
  const moved = packs ? bestMove(packs) : 0;
  const cgX = balance.cg[0] + moved * (packs?.range.cgPerMm ?? 0);
  const limit = within(cgX, [foreLimitX, aftLimitX]);
  const packMoved = packs ? [{ name: texts.inputs.packMoved, value: moved, unit: 'mm' }] : [];
  if (Math.abs(cgX - limit) < REACHED_MM) return known(0, { verdict: noneVerdict(moved), inputs: packMoved });
  const side = cgX > limit ? 'nose' : 'tail';
  const place = ballastPlace(airframe, resolved, limit, side, BALLAST_INSET_MM.value);
  const needed = ballastG(balance.massG, cgX, limit, place.xMm);
  if (needed === null) return missing(noPlace(aim, place));
  const first = ballastG(balance.massG, cgX, firstFlightX, place.xMm);
  return known(needed, {
    verdict: addVerdict(aim, needed, place, moved),
    inputs: [
      ...packMoved,
      { name: texts.inputs.ballastFromNose, value: place.xMm - extentX(airframe, resolved)[0], unit: 'mm' },
      ...(first === null ? [] : [{ name: texts.inputs.ballastFirstFlight, value: first, unit: 'g' }]),
    ],
  });
}

/** A CG this near to its limit has reached it, mm: rounding, far finer than anyone can balance. */
const REACHED_MM = 1e-6;

/** The least move of the packs that brings the CG into range, or as near to it as their travel lets them. */
const bestMove = ({ range, travelMm }: NonNullable<Aim['packs']>): number => {
  const wanted = within(0, [range.foreMm, range.aftMm]);
  return travelMm ? within(wanted, travelMm) : wanted;
};

function noneVerdict(moved: number): { level: Verdict; words: string } {
  if (Math.abs(moved) < STAY_MM) return { level: 'good', words: texts.verdicts.ballastNone };
  return { level: 'watch', words: fill(texts.verdicts.ballastMove, { move: moveWords(moved) }) };
}

const placeWords = ({ airframe }: Aim, { at }: BallastPlace): string =>
  typeof at === 'string' ? texts.places[at] : fill(texts.places.item, { name: elementName(airframe, at.itemId) });

function addVerdict(aim: Aim, massG: number, at: BallastPlace, moved: number): { level: Verdict; words: string } {
  const values = { mass: fixedDigits(massG, 0), place: placeWords(aim, at), move: moveWords(moved) };
  const { verdicts } = texts;
  const wording = !aim.packs
    ? verdicts.ballastAdd
    : Math.abs(moved) < STAY_MM
      ? verdicts.ballastPack
      : verdicts.ballastPackMoved;
  const words = fill(wording, values);
  if (massG <= BALLAST_SHARE.value * aim.balance.massG) return { level: 'watch', words };
  return { level: 'bad', words: fill(verdicts.ballastHeavy, { words }) };
}

const noPlace = (aim: Aim, place: BallastPlace): Problem => ({
  code: 'no-ballast-place',
  path: 'items',
  message: fill(texts.problems.noBallastPlace, { place: placeWords(aim, place) }),
  fix: texts.problems.noBallastPlaceFix,
});
