import { determinant, shapesOf, valueAt } from './fewShapes';
import { axisSweepRad, type WingStrip } from './halfWing';

// How a wing gives way under the load of its own controls: static aeroelasticity by strips. R. L. Bisplinghoff, H. Ashley & R. L. Halfman,
// "Aeroelasticity" (1955), ch. 8; Y. C. Fung, "An Introduction to the Theory of Aeroelasticity" (1955), chs. 3 and 4. The root is held.
// Each strip lifts at its quarter chord by its own angle alone. A swept wing bends and twists about its swept axis, and both turn the
// section against the stream: bending up turns a swept-back tip nose down.

/** What a radian of the control does to each strip: lift as a share of what a radian of incidence lifts, and moment about the quarter chord. */
export interface ControlOnStrip {
  readonly lift: number;
  readonly moment: number;
}

/** What is asked of the control: how much each strip's lift (N) and couple (N mm, nose up) counts. */
export interface Lever {
  readonly lift: number;
  readonly couple: number;
}

export interface TwistInput {
  readonly strips: readonly WingStrip[];
  /** Of the same strips; it holds for all of their controls. */
  readonly flexibility: Flexibility;
  readonly controls: readonly ControlOnStrip[];
  readonly levers: readonly Lever[];
  /** Of each strip, per radian. */
  readonly liftSlope: number;
  readonly densityKgM3: number;
}

/** How the wing answers at one speed, per radian of the control. */
export interface TwistAnswer {
  /** Control power over that of a rigid wing; negative past reversal. */
  readonly power: number;
  /** Turn of the outermost strip against the stream, nose up, radians per radian. */
  readonly tipTurn: number;
}

export interface Twist {
  /** `null` at the very speed at which the wing twists off. */
  readonly at: (speedMs: number) => TwistAnswer | null;
  /** The control does nothing at this speed, and the opposite above it; null where there is none. */
  readonly reversalMs: number | null;
  /** Here the wing's own lift turns it further without end; null where there is none. */
  readonly divergenceMs: number | null;
}

/** Speeds between which reversal and divergence are looked for, m/s, and the step. No model flies beyond; low-speed theory ends long before. */
const SPEEDS = { from: 1, to: 400, ratio: 1.2 } as const;
const BISECTIONS = 40;
/** MPa in a Pa. */
const MPA_PER_PA = 1e-6;

/**
 * Loss of control by twist of one side of a surface: control power and tip twist at any speed, reversal and divergence speeds.
 * `null` when the control has no power to lose.
 */
export function twistOf(input: TwistInput): Twist | null {
  const model = modelOf(input);
  if (model.rigidPower === 0) return null;
  const { hessenberg, size, onto } = shapesOf(model.feedback, model.drive);
  // The turn is (I - q H)^-1 q d; by the determinant lemma a weighted sum of it is one determinant over another, less one.
  const against = (weights: Float64Array, over: number) => {
    const shares = onto(weights);
    return determinant(
      hessenberg.map((row, i) => (i === 0 ? row.map((h, k) => h - (size * (shares[k] ?? 0)) / over) : row)),
    );
  };
  const stays = determinant(hessenberg);
  const works = against(model.turnPower, model.rigidPower);
  const tip = against(model.tip, 1);
  const pressure = (speedMs: number) => 0.5 * input.densityKgM3 * speedMs ** 2 * MPA_PER_PA;
  return {
    at: (speedMs) => {
      const q = pressure(speedMs);
      const whole = valueAt(stays, q);
      return whole === 0 ? null : { power: valueAt(works, q) / whole, tipTurn: valueAt(tip, q) / whole - 1 };
    },
    reversalMs: firstRoot((speedMs) => valueAt(works, pressure(speedMs))),
    divergenceMs: firstRoot((speedMs) => valueAt(stays, pressure(speedMs))),
  };
}

interface Model {
  readonly count: number;
  /** Turn of each strip, rad, per MPa of dynamic pressure and radian of turn of each other: row-major. */
  readonly feedback: Float64Array;
  /** Turn of each strip per MPa and radian of the control. */
  readonly drive: Float64Array;
  /** Control power of a radian of turn of each strip, and of a radian of the control on a rigid wing, per MPa. */
  readonly turnPower: Float64Array;
  /** How far each turns the tip. */
  readonly tip: Float64Array;
  readonly rigidPower: number;
}

function modelOf({ strips, flexibility: { byLift, byCouple }, controls, levers, liftSlope }: TwistInput): Model {
  const count = strips.length;
  const feedback = new Float64Array(count * count);
  const drive = new Float64Array(count);
  const turnPower = new Float64Array(count);
  let rigidPower = 0;
  for (const [j, { chordMm, widthMm }] of strips.entries()) {
    const control = controls[j] ?? { lift: 0, moment: 0 };
    const lever = levers[j] ?? { lift: 0, couple: 0 };
    const perTurn = liftSlope * chordMm * widthMm;
    const couple = control.moment * chordMm ** 2 * widthMm;
    for (let i = 0; i < count; i++) {
      const at = i * count + j;
      feedback[at] = (byLift[at] ?? 0) * perTurn;
      drive[i] = (drive[i] ?? 0) + (byLift[at] ?? 0) * perTurn * control.lift + (byCouple[at] ?? 0) * couple;
    }
    turnPower[j] = perTurn * lever.lift;
    rigidPower += perTurn * control.lift * lever.lift + couple * lever.couple;
  }
  const tip = new Float64Array(count);
  tip[count - 1] = 1;
  return { count, feedback, drive, turnPower, tip, rigidPower };
}

/** Turn against the stream, nose up, of each strip (rows) by a unit lift and a unit nose-up couple on each (columns); row-major. */
export interface Flexibility {
  readonly byLift: Float64Array;
  readonly byCouple: Float64Array;
}

/**
 * How strips give way. The moment vector of what lies outboard is parted along and across the swept axis: the part along it twists, the
 * part across bends. A strip bears half of what lies on it.
 */
export function flexibilityOf(strips: readonly WingStrip[]): Flexibility {
  const count = strips.length;
  const byLift = new Float64Array(count * count);
  const byCouple = new Float64Array(count * count);
  for (const [k, piece] of strips.entries()) {
    const sweep = axisSweepRad(strips, k);
    const [cos, sin] = [Math.cos(sweep), Math.sin(sweep)];
    const run = piece.widthMm / cos;
    const [twist, bend] = [(run / piece.torsionNmm2) * cos, (run / piece.bendingNmm2) * sin];
    const perNose = twist * cos + bend * sin;
    const perBending = twist * sin - bend * cos;
    for (let j = k; j < count; j++) {
      const load = strips[j] ?? piece;
      const ofLift = (load.sMm - piece.sMm) * perBending + (piece.axisXMm - load.quarterXMm) * perNose;
      addTurns(byLift, count, k, j, ofLift);
      addTurns(byCouple, count, k, j, perNose);
    }
  }
  return { byLift, byCouple };
}

/** A piece that turns under a load turns all that lies outboard of it, and up to its own middle by half of it: more where the load lies on it. */
function addTurns(turns: Float64Array, count: number, piece: number, load: number, turn: number): void {
  const own = piece * count + load;
  const borne = piece === load ? turn / 2 : turn;
  turns[own] = (turns[own] ?? 0) + borne * (piece === load ? 0.75 : 0.5);
  for (let i = piece + 1; i < count; i++) turns[i * count + load] = (turns[i * count + load] ?? 0) + borne;
}

/** The first speed at which a value is no longer positive, by steps and bisection; null where it always is. */
function firstRoot(sample: (speedMs: number) => number): number | null {
  let low = 0;
  for (let speed: number = SPEEDS.from; speed <= SPEEDS.to; speed *= SPEEDS.ratio) {
    if (!(sample(speed) > 0)) {
      let high = speed;
      for (let i = 0; i < BISECTIONS; i++) {
        const middle = (low + high) / 2;
        if (sample(middle) > 0) low = middle;
        else high = middle;
      }
      return high;
    }
    low = speed;
  }
  return null;
}
