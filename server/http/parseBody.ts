import type { z } from 'zod';
import type { ProblemDetails } from '@/lib/contract/answers';
import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { AppError } from '../problems';

/** More than this at once is a wall, not a list. */
const MAX_ERRORS = 50;

type FieldErrors = NonNullable<ProblemDetails['errors']>;
type Issue = z.core.$ZodIssue;

const dotted = (path: readonly PropertyKey[]): string => path.map(String).join('.');

/** Of several shapes that a body may have, the one it comes nearest to is the one worth explaining. */
function nearest(branches: readonly (readonly Issue[])[]): readonly Issue[] {
  return branches.reduce((best, next) => (next.length < best.length ? next : best), branches[0] ?? []);
}

function fieldErrors(issues: readonly Issue[], at: readonly PropertyKey[] = []): FieldErrors {
  return issues.flatMap((issue): FieldErrors => {
    const path = [...at, ...issue.path];
    if (issue.code === 'invalid_union' && issue.errors.length > 0) return fieldErrors(nearest(issue.errors), path);
    if (issue.code === 'unrecognized_keys')
      return issue.keys.map((key) => ({
        path: dotted([...path, key]),
        code: 'unknown-key',
        message: fill(texts.details.unknownKey, { key }),
      }));
    return [{ path: dotted(path), code: issue.code.replaceAll('_', '-'), message: issue.message }];
  });
}

/** The body in the shape the act takes, or a refusal with one row a field. */
export function parseBody<T>(schema: z.ZodType<T>, value: unknown): T {
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  const errors = fieldErrors(parsed.error.issues).slice(0, MAX_ERRORS);
  const [first] = errors;
  const detail = first === undefined ? texts.titles.invalid : [first.path, first.message].filter(Boolean).join(': ');
  throw new AppError('invalid', detail, { errors });
}
