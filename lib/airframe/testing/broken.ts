import type { Problem } from '@/lib/numerics/result';
import { startFrom } from '../layouts';
import { parseAirframe } from '../parse';

// For tests: a document that opens, with one thing wrong in it.

export type Path = readonly (string | number)[];

/** A document with one value replaced (or removed, for undefined) at a path. */
export function put(document: unknown, [head, ...rest]: Path, value: unknown): unknown {
  if (head === undefined) return value;
  if (Array.isArray(document)) return document.map((item, index) => (index === head ? put(item, rest, value) : item));
  const entries = Object.entries(document ?? {}).filter(([key]) => key !== head);
  const inner = new Map(Object.entries(document ?? {})).get(String(head));
  const next = put(inner, rest, value);
  return Object.fromEntries(next === undefined ? entries : [...entries, [head, next]]);
}

export const pusher: unknown = startFrom('pusher', 'Test');
export const at = (path: string): Path => path.split('.').map((key) => (/^\d+$/.test(key) ? Number(key) : key));
export const broken = (path: string, value: unknown, document = pusher): readonly Problem[] => {
  const result = parseAirframe(put(document, at(path), value));
  return result.ok ? [] : result.problems;
};
export const first = (path: string, value: unknown, document = pusher) => broken(path, value, document)[0];

export const wing = (key: string) => `surfaces.0.${key}`;
export const panel = (key: string) => `surfaces.0.panels.0.${key}`;
export const control = (key: string) => `surfaces.0.controls.0.${key}`;
