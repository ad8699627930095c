import { ok, type Problem, type Result, refuse } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';

// What is looked at before the shape: size, depth, and that the data is plain. Nothing here knows an airframe.

export const MAX_DOCUMENT_BYTES = 2 * 1024 * 1024;
export const MAX_DEPTH = 64;
const FORBIDDEN_KEYS: ReadonlySet<string> = new Set(['__proto__', 'constructor', 'prototype']);

const whole = (code: string, message: string): Problem => ({ code, path: '', message });

/** Deepest nesting of brackets in a JSON text, found without parsing it. */
function depthOf(text: string): number {
  let depth = 0;
  let deepest = 0;
  let quoted = false;
  for (let i = 0; i < text.length; i++) {
    const c = text[i];
    if (quoted) {
      if (c === '\\') i++;
      else if (c === '"') quoted = false;
    } else if (c === '"') quoted = true;
    else if (c === '{' || c === '[') deepest = Math.max(deepest, ++depth);
    else if (c === '}' || c === ']') depth--;
  }
  return deepest;
}

/** What an engine says about bad JSON, with line and column where it gives a position. */
function jsonProblem(text: string, error: SyntaxError): Problem {
  const position = /position (\d+)/.exec(error.message)?.[1];
  if (position === undefined) return whole('bad-json', fill(texts.problems.badJson, { detail: error.message }));
  const before = text.slice(0, Number(position)).split('\n');
  const column = (before.at(-1)?.length ?? 0) + 1;
  return whole('bad-json', fill(texts.problems.badJsonAt, { line: before.length, column }));
}

/** JSON text as plain data, refused when it is too large, too deep or not JSON. */
export function readText(input: string): Result<unknown> {
  const text = input.startsWith('\uFEFF') ? input.slice(1) : input;
  // A text is never longer in UTF-16 units than in bytes, so a long one needs no counting.
  const bytes = text.length > MAX_DOCUMENT_BYTES ? text.length : new TextEncoder().encode(text).length;
  if (bytes > MAX_DOCUMENT_BYTES) {
    const mb = (count: number) => trimmedDigits(count / 1024 / 1024, 1);
    const message = fill(texts.problems.tooLarge, { sizeMb: mb(bytes), maxMb: mb(MAX_DOCUMENT_BYTES) });
    return refuse(whole('document-too-large', message));
  }
  if (text.trim() === '') return refuse(whole('empty-document', texts.problems.emptyText));
  if (depthOf(text) > MAX_DEPTH) return refuse(whole('too-deep', fill(texts.problems.tooDeep, { max: MAX_DEPTH })));
  try {
    const data: unknown = JSON.parse(text);
    return ok(data);
  } catch (error) {
    if (error instanceof SyntaxError) return refuse(jsonProblem(text, error));
    throw error;
  }
}

/** True for an object made of keys and values only. */
export function isRecord(value: unknown): value is Readonly<Record<string, unknown>> {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return false;
  const prototype: unknown = Object.getPrototypeOf(value);
  return prototype === Object.prototype || prototype === null;
}

const kindOf = (value: unknown): string => {
  if (typeof value !== 'object' || value === null) return typeof value;
  const prototype: unknown = Object.getPrototypeOf(value);
  if (typeof prototype !== 'object' || prototype === null) return 'object';
  return typeof prototype.constructor === 'function' ? prototype.constructor.name : 'object';
};

/** First thing in the data that is not plain: a forbidden key, a class instance, or nesting past the limit (a ring of references included). */
export function guardData(value: unknown, path = '', depth = 0): Problem | null {
  if (depth > MAX_DEPTH)
    return { code: 'too-deep', path: '', message: fill(texts.problems.tooDeep, { max: MAX_DEPTH }) };
  if (typeof value !== 'object' || value === null) {
    if (typeof value !== 'function' && typeof value !== 'symbol' && typeof value !== 'bigint') return null;
    return { code: 'not-plain-data', path, message: fill(texts.problems.notPlainData, { got: typeof value }) };
  }
  if (!Array.isArray(value) && !isRecord(value)) {
    return { code: 'not-plain-data', path, message: fill(texts.problems.notPlainData, { got: kindOf(value) }) };
  }
  for (const [key, inner] of Object.entries(value)) {
    const at = path === '' ? key : `${path}.${key}`;
    if (FORBIDDEN_KEYS.has(key)) {
      return { code: 'forbidden-key', path: at, message: fill(texts.problems.forbiddenKey, { key }) };
    }
    const found = guardData(inner, at, depth + 1);
    if (found) return found;
  }
  return null;
}

/** The same data with minus zero as zero; the data itself when there was none. */
export function withoutMinusZero(value: unknown): unknown {
  if (typeof value === 'number') return Object.is(value, -0) ? 0 : value;
  if (Array.isArray(value)) {
    const next = value.map(withoutMinusZero);
    return next.some((item, index) => !Object.is(item, value[index])) ? next : value;
  }
  if (!isRecord(value)) return value;
  const entries = Object.entries(value).map(([key, inner]) => [key, withoutMinusZero(inner)] as const);
  return entries.some(([key, inner]) => !Object.is(inner, value[key])) ? Object.fromEntries(entries) : value;
}
