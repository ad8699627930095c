import { isRecord } from './guard';
import type { Airframe } from './schema/airframe';

/** Numbers as JSON prints them, minus zero as zero. */
function numberText(value: number, path: string): string {
  if (!Number.isFinite(value)) throw new RangeError(`${path} is ${value}, which no document can hold`);
  return JSON.stringify(value === 0 ? 0 : value);
}

function write(value: unknown, path: string): string {
  if (typeof value === 'number') return numberText(value, path);
  if (typeof value === 'string' || typeof value === 'boolean' || value === null) return JSON.stringify(value);
  if (Array.isArray(value))
    return `[${value.map((item: unknown, index) => write(item, `${path}.${index}`)).join(',')}]`;
  if (!isRecord(value)) throw new RangeError(`${path} is ${typeof value}, which no document can hold`);
  const pairs = Object.keys(value)
    .filter((key) => value[key] !== undefined)
    .sort()
    .map((key) => `${JSON.stringify(key)}:${write(value[key], path === '' ? key : `${path}.${key}`)}`);
  return `{${pairs.join(',')}}`;
}

/**
 * The document's one text: keys in code-unit order, no spaces, minus zero as zero, absent keys left out.
 * Equal documents give equal bytes, so its hash names a revision. Throws RangeError for a number that is not finite.
 */
export function canonicalText(airframe: Airframe): string {
  return write(airframe, '');
}
