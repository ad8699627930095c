import type { ProblemDetails } from '@/lib/contract/answers';
import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/server';

/** Every kind of refusal and the status it answers with. */
export const STATUS = {
  'bad-json': 400,
  'not-signed-in': 401,
  forbidden: 403,
  'cross-origin': 403,
  'not-found': 404,
  conflict: 409,
  gone: 410,
  stale: 412,
  'too-large': 413,
  'wrong-media-type': 415,
  invalid: 422,
  'precondition-required': 428,
  'too-many': 429,
  fault: 500,
  'engine-failed': 500,
  busy: 503,
  'no-room': 507,
} as const satisfies Record<keyof typeof texts.titles, number>;
export type ProblemKind = keyof typeof STATUS;

export interface ProblemExtras {
  readonly errors?: ProblemDetails['errors'];
  readonly retryAfterSeconds?: number;
  /** Members of the problem beyond RFC 9457's own, e.g. the newer draft. */
  readonly more?: Readonly<Record<string, unknown>>;
}

/** A refusal that the caller is told of. `detail` is shown to the person as it stands. */
export class AppError extends Error {
  override readonly name = 'AppError';
  constructor(
    readonly kind: ProblemKind,
    readonly detail: string,
    readonly extras: ProblemExtras = {},
  ) {
    super(detail);
  }
}

/** One answer for what does not exist and for what belongs to others, so that nobody learns which it is. */
export const notFound = (): AppError => new AppError('not-found', texts.details.notFound);

/** Refuses a document, each problem at its place under `prefix`. */
export const invalidDocument = (prefix: string, problems: readonly Problem[]): AppError =>
  new AppError('invalid', problems[0]?.message ?? texts.titles.invalid, {
    errors: problems.map(({ path, code, message, fix }) => ({
      path: path === '' ? prefix : `${prefix}.${path}`,
      code,
      message,
      ...(fix === undefined ? {} : { fix }),
    })),
  });

/** The problem as RFC 9457 has it. `instance` is the path that was asked for, without its query. */
export const problemDetails = (error: AppError, instance: string): ProblemDetails => ({
  type: `urn:foldspar:problem:${error.kind}`,
  title: texts.titles[error.kind],
  status: STATUS[error.kind],
  detail: error.detail,
  instance,
  ...(error.extras.errors === undefined ? {} : { errors: error.extras.errors }),
  ...error.extras.more,
});
