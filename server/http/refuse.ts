import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { newId } from '../context';
import { AppError, problemDetails } from '../problems';
import { PRIVATE } from './answers';

/** SQLSTATE classes that say "not now" rather than "never": PostgreSQL documentation, appendix A. */
const BUSY = new Set(['40001', '40P01', '53300', '57P01', '57P03', '08000', '08003', '08006', '55P03', '57014']);
const NO_ROOM = new Set(['53100', '53200']);

function codes(error: unknown): string[] {
  const found: string[] = [];
  for (let at: unknown = error, depth = 0; at instanceof Error && depth < 5; at = at.cause, depth += 1) {
    if ('code' in at && typeof at.code === 'string') found.push(at.code);
  }
  return found;
}

/** What the log says of a fault. A failed query's message lists its parameters, which are people's data; only its text is kept. */
function told(error: unknown): Readonly<Record<string, unknown>> {
  if (!(error instanceof Error)) return { fault: String(error) };
  const query = 'query' in error && typeof error.query === 'string' ? error.query : null;
  return {
    fault: query === null ? error.message : `query failed: ${query}`,
    cause: error.cause instanceof Error ? error.cause.message : undefined,
    frames: (error.stack ?? '').split('\n').filter((line) => line.startsWith('    at ')),
  };
}

/** Any failure as a refusal that tells a stranger nothing of what is inside; the fault itself goes to the log. */
export function asAppError(error: unknown, where: string): AppError {
  if (error instanceof AppError) return error;
  const reference = newId();
  // One line of JSON: text from a request cannot forge a second entry.
  console.error(JSON.stringify({ level: 'error', reference, where, ...told(error) }));
  const found = codes(error);
  if (found.some((code) => NO_ROOM.has(code) || code === 'ENOSPC'))
    return new AppError('no-room', texts.details.noRoom);
  if (found.some((code) => BUSY.has(code) || code === 'ECONNREFUSED'))
    return new AppError('busy', texts.details.busy, { retryAfterSeconds: 2 });
  return new AppError('fault', fill(texts.details.fault, { reference }));
}

/** Refusals that somebody who watches the log wants to see (ASVS 5.0.0, 16.3.2). Nothing that was typed is in it. */
export function logRefusal(where: string, facts: Readonly<Record<string, unknown>>): void {
  console.warn(JSON.stringify({ level: 'warn', where, ...facts }));
}

/** RFC 9457 answer. */
export function problemResponse(error: AppError, path: string): Response {
  const problem = problemDetails(error, path);
  const headers = new Headers({ ...PRIVATE, 'content-type': 'application/problem+json; charset=utf-8' });
  if (error.extras.retryAfterSeconds !== undefined) headers.set('retry-after', String(error.extras.retryAfterSeconds));
  return new Response(JSON.stringify(problem), { status: problem.status, headers });
}
