import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Item } from '@/lib/airframe/schema/equipment';
import type { Weighed } from './balance';

// Where a flight pack must sit. All moves are along x from where the pack is now, mm: positive aft.

/** The packs that are moved to bring the CG where it belongs. */
export interface MainPacks {
  readonly keys: readonly string[];
  /** How far they can go together, or null when no slide is given for any of them. */
  readonly travelMm: readonly [fore: number, aft: number] | null;
}

/** The packs that the drives run on; without any named, the heaviest pack. */
function mainItems({ items, drives }: Airframe): Item[] {
  const named = new Set(drives.flatMap(({ packItemId }) => packItemId ?? []));
  const packs = items.filter(({ kind, massG }) => kind === 'pack' && massG > 0);
  const driving = packs.filter(({ id }) => named.has(id));
  if (driving.length > 0) return driving;
  return packs.length > 0 ? [packs.reduce((most, pack) => (pack.massG > most.massG ? pack : most))] : [];
}

/**
 * The packs that balance the aircraft: those that its drives name, moved together by one distance; else the heaviest. A pack for
 * the receiver alone stays where it is. Null when nothing of the kind weighs anything.
 */
export function mainPacks(airframe: Airframe): MainPacks | null {
  const items = mainItems(airframe);
  if (items.length === 0) return null;
  const slides = items.flatMap(({ slide }) => slide ?? []);
  const together = [
    Math.max(...slides.map(({ fromMm }) => fromMm)),
    Math.min(...slides.map(({ toMm }) => toMm)),
  ] as const;
  return { keys: items.map(({ id }) => id), travelMm: slides.length > 0 ? together : null };
}

const total = (lines: readonly Weighed[]): number => lines.reduce((sum, line) => sum + line.massG, 0);

const packMass = (lines: readonly Weighed[], keys: readonly string[]): number => {
  const massG = total(lines.filter(({ key }) => keys.includes(key)));
  if (!(massG > 0)) throw new RangeError(`no mass "${keys.join(', ')}" to move`);
  return massG;
};

const cgXOf = (lines: readonly Weighed[]): number =>
  lines.reduce((sum, line) => sum + line.massG * line.at[0], 0) / total(lines);

/** How far the packs must go for the CG to come to `cgXMm`. Throws RangeError when they are not in the list or weigh nothing. */
export const moveFor = (lines: readonly Weighed[], keys: readonly string[], cgXMm: number): number =>
  ((cgXMm - cgXOf(lines)) * total(lines)) / packMass(lines, keys);

export interface PackRange {
  /** Moves that bring the CG to the fore and to the aft end of its range. */
  readonly foreMm: number;
  readonly aftMm: number;
  /** The part of it that the travel reaches, or null when it reaches none. */
  readonly reached: readonly [foreMm: number, aftMm: number] | null;
  /** How far the CG moves for each millimetre that the packs do: their share of the whole. */
  readonly cgPerMm: number;
}

/**
 * Where packs must go for a CG range, and how much of that their travel reaches; without a travel they are free.
 * Throws RangeError when they are not in the list or the range is reversed.
 */
export function packRange(
  lines: readonly Weighed[],
  keys: readonly string[],
  cgRangeXMm: readonly [fore: number, aft: number],
  travelMm: MainPacks['travelMm'] = null,
): PackRange {
  const [fore, aft] = cgRangeXMm;
  if (fore > aft) throw new RangeError(`CG range runs backwards: ${fore} to ${aft}`);
  const foreMm = moveFor(lines, keys, fore);
  const aftMm = moveFor(lines, keys, aft);
  const low = Math.max(foreMm, travelMm?.[0] ?? foreMm);
  const high = Math.min(aftMm, travelMm?.[1] ?? aftMm);
  return { foreMm, aftMm, reached: low <= high ? [low, high] : null, cgPerMm: packMass(lines, keys) / total(lines) };
}

/** What becomes of the balance with other packs in the same place. */
export interface OtherPack {
  /** Of the packs together. */
  readonly massG: number;
  readonly allUpMassG: number;
  readonly cgXMm: number;
  /** How far they must then go for the CG to be where it is wanted. */
  readonly moveMm: number;
}

/**
 * Packs heavier or lighter by each of the factors, their centre where it is now. Their size is not looked at: a larger pack may not
 * fit. Throws RangeError when they are not in the list.
 */
export function otherPacks(
  lines: readonly Weighed[],
  keys: readonly string[],
  factors: readonly number[],
  wantedXMm: number,
): OtherPack[] {
  return factors.map((factor) => {
    const changed = lines.map((line) => (keys.includes(line.key) ? { ...line, massG: line.massG * factor } : line));
    return {
      massG: packMass(changed, keys),
      allUpMassG: total(changed),
      cgXMm: cgXOf(changed),
      moveMm: moveFor(changed, keys, wantedXMm),
    };
  });
}
