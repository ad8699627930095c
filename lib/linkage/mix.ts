import {
  face,
  lean,
  type MixedControl,
  type Side,
  type Sticks,
  sidesOf,
  sticksOf,
  turnDeg,
} from '@/lib/airframe/sticks';
import { radFromDeg } from '@/lib/numerics/vec';

// What a control's turns look like from behind, and how far all its sticks take it.

/** Surfaces steeper than this turn to port and starboard rather than up and down. */
const UPRIGHT_COS = 0.5;
export const isUpright = ({ rollDeg }: MixedControl): boolean => Math.abs(Math.cos(radFromDeg(rollDeg))) < UPRIGHT_COS;

export type Way = 'up' | 'down' | 'stbd' | 'port' | 'none';

/** Which way a turn moves the trailing edge, as a person standing behind sees it. */
export function wayOf(mixed: MixedControl, side: Side, turn: number): Way {
  if (Math.abs(turn) < 1e-9) return 'none';
  if (!isUpright(mixed)) return turn * face(mixed) > 0 ? 'down' : 'up';
  return turn * lean(mixed) * (side === 'port' ? -1 : 1) > 0 ? 'stbd' : 'port';
}

export interface Reach {
  /** Largest turns from neutral, degrees, both as magnitudes; up is towards the upper face of its panel. */
  readonly upDeg: number;
  readonly downDeg: number;
}

/** How far each way a control turns at most: any one stick alone, or (with `together`) all its sticks at once. */
export function reachOf(mixed: MixedControl, together: boolean): Reach {
  let [upDeg, downDeg] = [0, 0];
  const see = (sticks: Sticks): void => {
    for (const side of sidesOf(mixed)) {
      const turn = turnDeg(mixed, side, sticks);
      upDeg = Math.max(upDeg, -turn);
      downDeg = Math.max(downDeg, turn);
    }
  };
  const used = sticksOf(mixed);
  let all: Sticks[] = [{}];
  for (const stick of used) {
    const positions = stick === 'flap' ? [0, 1] : [-1, 0, 1];
    all = all.flatMap((sticks) => positions.map((position) => ({ ...sticks, [stick]: position })));
  }
  for (const sticks of all) {
    if (together || used.filter((stick) => sticks[stick]).length === 1) see(sticks);
  }
  return { upDeg, downDeg };
}
