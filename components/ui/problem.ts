import { ApiProblem, Unreachable } from '@/client/api';
import { ui } from '@/lib/text/en/pages';

export interface FormProblem {
  readonly message: string;
  /** By the first name of the field's path. */
  readonly fields: Readonly<Record<string, string>>;
}

/** What a failed call means to the person at the form: one sentence, and the fields it is about. Faults are thrown on. */
export function problemOf(error: unknown): FormProblem {
  if (error instanceof Unreachable) return { message: ui.unreachable, fields: {} };
  if (!(error instanceof ApiProblem)) throw error;
  const { detail, title, errors = [] } = error.problem;
  const fields: Record<string, string> = {};
  for (const { path, message, fix } of errors) {
    const name = path.split('.')[0] ?? '';
    fields[name] ??= fix === undefined ? message : `${message}. ${fix}`;
  }
  return { message: detail ?? title, fields };
}
