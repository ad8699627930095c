import { z } from 'zod';
import { isRecord } from './guard';

// What the schema would have taken at a place, for "did you mean".

/** Schemas that may stand behind wrappers and unions. */
function branches(schema: unknown): unknown[] {
  if (schema instanceof z.ZodOptional || schema instanceof z.ZodNullable) return branches(schema.unwrap());
  if (schema instanceof z.ZodDiscriminatedUnion || schema instanceof z.ZodUnion)
    return schema.options.flatMap(branches);
  return [schema];
}

/** The object schemas that fit a value best: of a discriminated union, the branch whose literals the value carries. */
function fitting(schema: unknown, value: unknown): z.ZodObject[] {
  const objects = branches(schema).filter((branch) => branch instanceof z.ZodObject);
  if (!isRecord(value)) return objects;
  const literal = objects.filter((object) =>
    Object.entries(object.shape).every(
      ([key, inner]) => !(inner instanceof z.ZodLiteral) || [...inner.values].some((literal) => literal === value[key]),
    ),
  );
  return literal.length > 0 ? literal : objects;
}

/** Keys that the schema knows at a path, in its own order. */
export function knownKeys(schema: unknown, value: unknown, path: readonly PropertyKey[]): string[] {
  const [head, ...rest] = path;
  if (head === undefined) return [...new Set(fitting(schema, value).flatMap((object) => Object.keys(object.shape)))];
  if (typeof head === 'number') {
    const array = branches(schema).find((branch) => branch instanceof z.ZodArray);
    const item: unknown = Array.isArray(value) ? value[head] : undefined;
    return array ? knownKeys(array.element, item, rest) : [];
  }
  const key = String(head);
  const inner = isRecord(value) ? value[key] : undefined;
  const object = fitting(schema, value).find(({ shape }) => key in shape);
  return object ? knownKeys(object.shape[key], inner, rest) : [];
}

/** Number of single-letter changes between two words (Levenshtein), letters compared without case. */
export function distance(a: string, b: string): number {
  const from = a.toLowerCase();
  const to = b.toLowerCase();
  let row = Array.from({ length: to.length + 1 }, (_, index) => index);
  for (let i = 1; i <= from.length; i++) {
    const next = [i];
    for (let j = 1; j <= to.length; j++) {
      const swap = (row[j - 1] ?? 0) + (from[i - 1] === to[j - 1] ? 0 : 1);
      next.push(Math.min(swap, (row[j] ?? 0) + 1, (next[j - 1] ?? 0) + 1));
    }
    row = next;
  }
  return row[to.length] ?? 0;
}

/** The known word nearest to one that is not known, when it is near enough to be a slip: a third of its letters, or the same word with or without its unit. */
export function nearest(word: string, known: readonly string[]): string | null {
  const lower = word.toLowerCase();
  const extended = known.find((key) => word.length >= 3 && key.toLowerCase().startsWith(lower));
  const best = known
    .map((key) => ({ key, away: distance(word, key) }))
    .reduce<{ key: string; away: number } | null>((a, b) => (a === null || b.away < a.away ? b : a), null);
  if (best && best.away <= Math.max(1, Math.floor(word.length / 3))) return best.key;
  return extended ?? null;
}
