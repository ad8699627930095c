import { trimmedDigits } from '@/lib/units/number';

// What differs between two airframes, value by value, named by element ids so that a moved list entry is no change.

export interface Change {
  /** "wing / p1 / length" */
  readonly what: string;
  readonly unit: string;
  readonly before: string | null;
  readonly after: string | null;
}

const UNITS: readonly (readonly [suffix: string, unit: string])[] = [
  ['Gm2', 'g/m²'],
  ['PerMetreG', 'g/m'],
  ['Mm2', 'mm²'],
  ['Mpa', 'MPa'],
  ['Gpa', 'GPa'],
  ['Mm', 'mm'],
  ['Deg', '°'],
  ['Pct', '%'],
  ['Ms', 'm/s'],
  ['G', 'g'],
];

/** A document key as words, and the unit that it carries: "rootChordMm" is "root chord" in mm. */
export function keyInWords(key: string): { readonly words: string; readonly unit: string } {
  const found = UNITS.find(([suffix]) => key.endsWith(suffix) && key.length > suffix.length);
  const bare = found === undefined ? key : key.slice(0, -found[0].length);
  return { words: bare.replace(/([a-z0-9])([A-Z])/g, '$1 $2').toLowerCase(), unit: found?.[1] ?? '' };
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const idOf = (value: unknown): string | undefined =>
  isRecord(value) && typeof value.id === 'string' ? value.id : undefined;

/** Children of a value by stable name: list entries by their id where they have one. */
function children(value: unknown): Map<string, unknown> | null {
  if (Array.isArray(value)) return new Map(value.map((entry, index) => [idOf(entry) ?? String(index + 1), entry]));
  return isRecord(value) ? new Map(Object.entries(value).filter(([key]) => key !== 'id')) : null;
}

const leafText = (value: unknown): string | null => {
  if (value === undefined) return null;
  return typeof value === 'number' ? trimmedDigits(value, 3) : String(value);
};

const INSIGNIFICANT = ['surfaces', 'bodies', 'booms', 'drives', 'items', 'panels', 'controls', 'format', 'version'];

function walk(path: readonly string[], unit: string, before: unknown, after: unknown, found: Change[]): void {
  const [was, is] = [children(before), children(after)];
  if (was === null && is === null) {
    if (Object.is(before, after)) return;
    found.push({ what: path.join(' / '), unit, before: leafText(before), after: leafText(after) });
    return;
  }
  for (const key of new Set([...(was?.keys() ?? []), ...(is?.keys() ?? [])])) {
    const named = keyInWords(key);
    // Names of lists say nothing that the entry's own id doesn't.
    const step = INSIGNIFICANT.includes(key) ? path : [...path, named.words];
    walk(step, named.unit === '' ? unit : named.unit, was?.get(key), is?.get(key), found);
  }
}

/** Every value that differs, in the order of the document. Added and removed elements count by each of their values. */
export function changesBetween(before: unknown, after: unknown): readonly Change[] {
  const found: Change[] = [];
  walk([], '', before, after, found);
  return found;
}
