import { degFromRad } from '@/lib/numerics/vec';
import type { Levers } from './fourBar';
import { CENTRING_DEG, JOINT_PLAY_MM } from './practice';

/** Free movement of a control, trailing edge, degrees from stop to stop. */
export interface Slop {
  readonly valueDeg: number;
  readonly lowDeg: number;
  readonly highDeg: number;
}

const JOINTS = 2;

/**
 * What the play of both rod ends and the servo's centring leave free at the surface, degrees from one end to the other: rod play over the
 * horn's lever, plus centring times the gear ratio. Both together are the worst case.
 */
export function slopOf({ hornMm, ratio }: Levers): Slop {
  const at = (playMm: number, centringDeg: number): number =>
    degFromRad(2 * Math.atan((JOINTS * playMm) / (2 * hornMm))) + centringDeg * Math.abs(ratio);
  const [play, centring] = [JOINT_PLAY_MM.value, CENTRING_DEG.value];
  return {
    valueDeg: at(play.value, centring.value),
    lowDeg: at(play.low, centring.low),
    highDeg: at(play.high, centring.high),
  };
}
