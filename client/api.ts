import type { ProblemDetails } from '@/lib/contract/answers';

// Typed fetch for the API. A refusal is thrown as ApiProblem and a dead line as Unreachable, so that a caller can tell
// "the server said no" from "nobody answered" without reading texts.

/** The server answered with a refusal. */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem';
  constructor(readonly problem: ProblemDetails) {
    super(problem.detail ?? problem.title);
  }
  get status(): number {
    return this.problem.status;
  }
}

/** No answer at all: offline, server down, request cut off. */
export class Unreachable extends Error {
  override readonly name = 'Unreachable';
}

export interface Answer<T> {
  readonly data: T;
  readonly etag: string | null;
}

export interface SendOptions {
  /** Sent as If-Match, quotes included. */
  readonly ifMatch?: string;
  /** Reuse the key of an earlier attempt so that a repeated post is done once. */
  readonly idempotencyKey?: string;
  readonly signal?: AbortSignal;
}

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const isProblem = (value: unknown): value is ProblemDetails =>
  isRecord(value) && typeof value.title === 'string' && typeof value.status === 'number';

async function problemOf(response: Response, path: string): Promise<ProblemDetails> {
  const text = await response.text();
  const type = response.headers.get('content-type') ?? '';
  if (type.includes('json')) {
    try {
      const body: unknown = JSON.parse(text);
      if (isProblem(body)) return body;
    } catch (error) {
      if (!(error instanceof SyntaxError)) throw error;
    }
  }
  // A proxy or a crash answers without our body; the status is then all there is to say.
  return {
    type: 'about:blank',
    title: response.statusText || `HTTP ${response.status}`,
    status: response.status,
    instance: path,
  };
}

function headersFor(method: Method, body: unknown, options: SendOptions): Headers {
  const headers = new Headers({ accept: 'application/json' });
  if (body !== undefined) headers.set('content-type', 'application/json');
  if (method === 'POST') headers.set('idempotency-key', options.idempotencyKey ?? crypto.randomUUID());
  if (options.ifMatch !== undefined) headers.set('if-match', options.ifMatch);
  return headers;
}

async function send<T>(method: Method, path: string, body: unknown, options: SendOptions): Promise<Answer<T>> {
  let response: Response;
  try {
    response = await fetch(path, {
      method,
      headers: headersFor(method, body, options),
      body: body === undefined ? undefined : JSON.stringify(body),
      credentials: 'same-origin',
      cache: 'no-store',
      signal: options.signal,
    });
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw new Unreachable(`no answer from ${path}`, { cause: error });
  }
  if (!response.ok) throw new ApiProblem(await problemOf(response, path));
  // Both ends are typed by lib/contract/answers.ts; JSON.parse hands over what the server promised, null for no body.
  const data: T = JSON.parse((await response.text()) || 'null');
  return { data, etag: response.headers.get('etag') };
}

export const api = {
  get: <T>(path: string, options: SendOptions = {}) => send<T>('GET', path, undefined, options),
  post: <T>(path: string, body?: unknown, options: SendOptions = {}) => send<T>('POST', path, body, options),
  put: <T>(path: string, body: unknown, options: SendOptions = {}) => send<T>('PUT', path, body, options),
  patch: <T>(path: string, body: unknown, options: SendOptions = {}) => send<T>('PATCH', path, body, options),
  delete: <T = null>(path: string, options: SendOptions = {}) => send<T>('DELETE', path, undefined, options),
};
