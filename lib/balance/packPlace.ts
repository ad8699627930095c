import type { Weighed } from './balance';

/** x at which the centre of one mass must lie for the CG to come to `cgXMm`. Throws RangeError when the mass is not in the list or weighs nothing. */
export function placeFor(lines: readonly Weighed[], key: string, cgXMm: number): number {
  const moved = lines.find((line) => line.key === key);
  if (!moved || !(moved.massG > 0)) throw new RangeError(`no mass "${key}" to move`);
  const total = lines.reduce((sum, line) => sum + line.massG, 0);
  const others = lines.filter((line) => line !== moved).reduce((sum, line) => sum + line.massG * line.at[0], 0);
  return (total * cgXMm - others) / moved.massG;
}

export interface PackRange {
  /** Where the mass must sit, x of its centre, for the fore and the aft end of the CG range. */
  readonly foreXMm: number;
  readonly aftXMm: number;
  /** The part of it that the slide reaches, or null when it reaches none. */
  readonly reached: readonly [foreXMm: number, aftXMm: number] | null;
  /** How far the CG moves for each millimetre the mass moves: its share of the whole. */
  readonly cgPerMm: number;
}

/**
 * Where a pack must sit for a CG range, and how much of that its slide reaches.
 * `travelXMm` are the ends of the slide as places of its centre; without it the pack is free.
 * Throws RangeError when the mass is not in the list or the range is reversed.
 */
export function packRange(
  lines: readonly Weighed[],
  key: string,
  cgRangeXMm: readonly [fore: number, aft: number],
  travelXMm?: readonly [fore: number, aft: number],
): PackRange {
  const [fore, aft] = cgRangeXMm;
  if (fore > aft) throw new RangeError(`CG range runs backwards: ${fore} to ${aft}`);
  const foreXMm = placeFor(lines, key, fore);
  const aftXMm = placeFor(lines, key, aft);
  const total = lines.reduce((sum, line) => sum + line.massG, 0);
  const mass = lines.find((line) => line.key === key)?.massG ?? 0;
  const low = Math.max(foreXMm, travelXMm?.[0] ?? foreXMm);
  const high = Math.min(aftXMm, travelXMm?.[1] ?? aftXMm);
  return { foreXMm, aftXMm, reached: low <= high ? [low, high] : null, cgPerMm: mass / total };
}
