import type { Item } from '@/lib/airframe/schema/equipment';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import { TORQUE_BY_MASS, USUAL_SERVO_G } from './practice';

/** N mm in one kg cm, the unit in which servos are sold. */
export const NMM_PER_KG_CM = STANDARD_GRAVITY * 10;

export interface ServoTorque {
  readonly kgCm: number;
  /** The span it may lie in; no span when it was typed. */
  readonly lowKgCm: number;
  readonly highKgCm: number;
  /** Nobody typed a torque: it is what servos of this mass usually have. */
  readonly assumed: boolean;
}

const TYPED = /(\d+(?:[.,]\d+)?)\s*(kg|n)\s*[·.*-]?\s*cm/i;

/** Stall torque that stands in an item's description, "1.4 kg cm" or "14 N cm"; null when none does. */
function typedTorqueKgCm(spec: string | undefined): number | null {
  const [, number, unit] = TYPED.exec(spec ?? '') ?? [];
  if (number === undefined || unit === undefined) return null;
  const value = Number(number.replace(',', '.'));
  if (!(value > 0)) return null;
  return unit.toLowerCase() === 'kg' ? value : value / STANDARD_GRAVITY;
}

/** Stall torque of a servo: as typed, else by its mass; without a servo, that of the usual size. */
export function servoTorque(servo: Pick<Item, 'massG' | 'spec'> | null): ServoTorque {
  const typed = typedTorqueKgCm(servo?.spec);
  if (typed !== null) return { kgCm: typed, lowKgCm: typed, highKgCm: typed, assumed: false };
  const massG = servo?.massG ?? USUAL_SERVO_G.value;
  const [low, high] = TORQUE_BY_MASS.value.find(({ upToG }) => massG <= upToG)?.kgCm ?? [1, 1.5];
  return { kgCm: (low + high) / 2, lowKgCm: low, highKgCm: high, assumed: true };
}
