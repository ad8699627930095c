import type { z } from 'zod';
import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { isRecord } from './guard';
import { knownKeys, nearest } from './knownKeys';

// Turns what the schema refuses into words that name the field, what was expected and what was found.

type Issue = z.core.$ZodIssue;
const words = texts.problems;

/** Comparing a word with every known one takes its time; a slip is short, and of thousands nobody reads the rest. */
const MAX_GUESSES = 50;
const LONGEST_WORD = 64;

const UNITS: readonly (readonly [suffix: string, unit: string])[] = [
  ['Gm2', ' g/m²'],
  ['PerMetreG', ' g/m'],
  ['Mm2', ' mm²'],
  ['Mm', ' mm'],
  ['Deg', '°'],
  ['massG', ' g'],
  ['Pct', ' %'],
];

const unitOf = (field: string): string =>
  UNITS.find(([suffix]) => field.replace(/\[\d+\]$/, '').endsWith(suffix))?.[1] ?? '';

/** A number for a message: short, and in plain digits unless it is absurd. */
const numberText = (value: number): string => {
  if (!Number.isFinite(value) || Math.abs(value) >= 1e9) return String(value);
  return trimmedDigits(value, 4);
};

const gotText = (value: unknown, unit: string): string => {
  if (typeof value === 'number') return `${numberText(value)}${Number.isFinite(value) ? unit : ''}`;
  if (typeof value === 'string')
    return value.length > 40 ? `a text of ${value.length} characters` : JSON.stringify(value);
  if (Array.isArray(value)) return `a list of ${value.length}`;
  if (value === null) return 'null';
  return typeof value === 'object' ? 'an object' : String(value);
};

const valueAt = (document: unknown, path: readonly PropertyKey[]): unknown =>
  path.reduce<unknown>((value, key) => {
    if (Array.isArray(value)) return value[Number(key)];
    return isRecord(value) ? value[String(key)] : undefined;
  }, document);

/** The last key of a path, with the indices that follow it: "throwsDeg", "chordShare[1]". */
const fieldName = (path: readonly PropertyKey[]): string => {
  const keys = path.map((key) => (typeof key === 'number' ? `[${key}]` : String(key)));
  const start = path.findLastIndex((key) => typeof key === 'string');
  return keys.slice(Math.max(start, 0)).join('') || 'document';
};

const EXPECTED: Readonly<Record<string, string>> = {
  number: 'a number',
  int: 'a whole number',
  string: 'a text',
  boolean: 'true or false',
  array: 'a list',
  tuple: 'a list',
  object: 'an object in braces',
  record: 'an object in braces',
};
const expectedText = (expected: string): string => EXPECTED[expected] ?? expected;
const listed = (options: readonly unknown[]): string => options.map((option) => JSON.stringify(option)).join(' or ');

interface Place {
  readonly path: readonly PropertyKey[];
  readonly field: string;
  readonly unit: string;
  readonly value: unknown;
  readonly got: string;
}

const make = (code: string, { path }: Place, message: string, fix?: string): Problem => ({
  code,
  path: path.map(String).join('.'),
  message,
  ...(fix === undefined ? {} : { fix }),
});

function wrongType(issue: z.core.$ZodIssueInvalidType, at: Place): Problem {
  const expected = expectedText(issue.expected);
  const { field, got, value, unit } = at;
  if (value === undefined) {
    const what =
      unit && issue.expected === 'number' ? `${expected} in${unit.startsWith(' ') ? '' : ' '}${unit}` : expected;
    return make('missing-field', at, fill(words.missing, { field, expected: what }));
  }
  if (typeof value === 'number' && !Number.isFinite(value))
    return make('not-finite', at, fill(words.notFinite, { field, got }));
  if (issue.expected === 'int') return make('not-whole', at, fill(words.notWhole, { field, got }));
  return make('wrong-type', at, fill(words.wrongType, { field, expected, got }));
}

function outOfRange(issue: z.core.$ZodIssueTooSmall | z.core.$ZodIssueTooBig, at: Place): Problem {
  const small = issue.code === 'too_small';
  const limit = Number(small ? issue.minimum : issue.maximum);
  const { field, unit, value } = at;
  const code = small ? 'too-small' : 'too-big';
  if (Array.isArray(value))
    return make(code, at, fill(small ? words.tooFew : words.tooMany, { field, limit, got: value.length }));
  if (typeof value === 'string') {
    if (small) return make('empty-text', at, fill(words.emptyWord, { field }));
    return make(code, at, fill(words.tooLong, { field, limit, got: value.length }));
  }
  const shownLimit = `${numberText(limit)}${unit}`;
  return make(code, at, fill(small ? words.tooSmall : words.tooBig, { field, limit: shownLimit, got: at.got }));
}

function unknownKeys(
  issue: z.core.$ZodIssueUnrecognizedKeys,
  at: Place,
  schema: unknown,
  document: unknown,
): Problem[] {
  const known = knownKeys(schema, document, at.path);
  const where = at.path.length === 0 ? '' : ` in ${fieldName(at.path)}`;
  const remove = fill(words.removeKey, { keys: known.join(', ') });
  return issue.keys.map((key, index) => {
    const near = index < MAX_GUESSES && key.length <= LONGEST_WORD ? nearest(key, known) : null;
    const fix = near ? fill(words.didYouMean, { key: near }) : remove;
    return make('unknown-key', { ...at, path: [...at.path, key] }, fill(words.unknownKey, { key, where }), fix);
  });
}

/** Of a union's branches, the one that the value was plainly meant for: the one that does not fail at its root. */
function meantBranch(errors: readonly (readonly Issue[])[]): readonly Issue[] | null {
  const atRoot = (issue: Issue) => issue.path.length === 0 && ['invalid_type', 'invalid_value'].includes(issue.code);
  return errors.find((issues) => issues.length > 0 && !issues.some(atRoot)) ?? null;
}

/** One issue of the schema as problems. */
export function problemsOf(issue: Issue, schema: unknown, document: unknown): Problem[] {
  const { path } = issue;
  const value = valueAt(document, path);
  const field = fieldName(path);
  const unit = unitOf(field);
  const at: Place = { path, field, unit, value, got: gotText(value, unit) };
  switch (issue.code) {
    case 'invalid_type':
      return [wrongType(issue, at)];
    case 'too_small':
    case 'too_big':
      return [outOfRange(issue, at)];
    case 'unrecognized_keys':
      return unknownKeys(issue, at, schema, document);
    case 'invalid_value': {
      const options = listed(issue.values);
      if (value === undefined) return [make('missing-field', at, fill(words.missing, { field, expected: options }))];
      return [make('not-one-of', at, fill(words.notOneOf, { field, options, got: at.got }))];
    }
    case 'invalid_union': {
      if (issue.discriminator !== undefined && issue.errors.length === 0) {
        const options = listed('options' in issue && Array.isArray(issue.options) ? issue.options : []);
        if (value === undefined) return [make('missing-field', at, fill(words.missing, { field, expected: options }))];
        return [make('not-one-of', at, fill(words.notOneOf, { field, options, got: at.got }))];
      }
      const meant = meantBranch(issue.errors);
      if (meant)
        return meant.flatMap((inner) => problemsOf({ ...inner, path: [...path, ...inner.path] }, schema, document));
      const expected = issue.errors
        .flatMap((branch) => branch.filter((inner) => inner.path.length === 0))
        .map((inner) =>
          inner.code === 'invalid_type'
            ? expectedText(inner.expected)
            : inner.code === 'invalid_value'
              ? listed(inner.values)
              : '',
        )
        .filter((text) => text !== '')
        .join(', or ');
      if (value === undefined) return [make('missing-field', at, fill(words.missing, { field, expected }))];
      return [make('wrong-type', at, fill(words.wrongType, { field, expected, got: at.got }))];
    }
    case 'invalid_format': {
      const id = issue.message.startsWith('an id');
      const detail = { field, expected: issue.message, got: at.got };
      return [id ? make('bad-id', at, fill(words.badId, detail)) : make('bad-text', at, fill(words.badFormat, detail))];
    }
    case 'custom':
    case 'invalid_key':
    case 'invalid_element':
    case 'not_multiple_of':
      return [make('invalid', at, fill(words.invalid, { field, detail: issue.message }))];
  }
}
