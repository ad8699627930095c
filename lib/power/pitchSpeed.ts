/**
 * Pitch speed in m/s: how far the propeller would screw itself forward in a second without slip. An upper mark for the level speed,
 * not a prediction of it. Identity: pitch times turns.
 */
export function pitchSpeedMs(turnsPerMinute: number, pitchMm: number): number {
  return ((turnsPerMinute / 60) * pitchMm) / 1000;
}
