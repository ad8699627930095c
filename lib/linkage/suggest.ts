import { radFromDeg } from '@/lib/numerics/vec';
import { type FourBar, layFourBar, servoAngleRad } from './fourBar';
import { ARM_MM, HORN_MM, SERVO_TRAVEL_DEG, SUGGESTED_ROD_MM, TRAVEL_WANTED } from './practice';

/** Every whole millimetre from one hole to the other. */
const holes = ([low, high]: readonly [number, number]): number[] =>
  Array.from({ length: high - low + 1 }, (_, i) => low + i);

/**
 * Holes of arm and horn, among the usual ones, that use the servo's travel best for a throw: arm parallel to the horn, servo a rod's
 * length ahead. Null when none of them reaches the throw.
 */
export function suggestFourBar(throwDeg: number): FourBar | null {
  const wanted = (TRAVEL_WANTED.value[0] + TRAVEL_WANTED.value[1]) / 2;
  let best: { readonly bar: FourBar; readonly miss: number } | null = null;
  for (const armMm of holes(ARM_MM.value)) {
    for (const hornMm of holes(HORN_MM.value)) {
      const bar = layFourBar([-SUGGESTED_ROD_MM.value, hornMm - armMm], armMm, hornMm);
      const servo = bar && servoAngleRad(bar, radFromDeg(throwDeg));
      if (!bar || servo === null) continue;
      const miss = Math.abs(Math.abs(servo) / radFromDeg(SERVO_TRAVEL_DEG.value) - wanted);
      if (!best || miss < best.miss - 1e-9) best = { bar, miss };
    }
  }
  return best?.bar ?? null;
}
