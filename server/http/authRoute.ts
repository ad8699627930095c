import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { getAuth } from '../auth';
import { isSameOrigin, originOf } from '../origin';
import { AppError, type ProblemKind } from '../problems';
import { whoOf } from '../session';
import { PRIVATE } from './answers';
import { BODY_MAX_KB, readOptionalJson } from './readJson';
import { asAppError, logRefusal, problemResponse } from './refuse';

const kindOf = (status: number): ProblemKind => {
  switch (status) {
    case 401:
      return 'not-signed-in';
    case 403:
      return 'forbidden';
    case 404:
      return 'not-found';
    case 429:
      return 'too-many';
    default:
      return status >= 500 ? 'fault' : 'invalid';
  }
};

/** The identity service's routes. Its refusals become problems like all others, and keep its own `code` and `message`. */
export async function handleAuth(request: Request): Promise<Response> {
  const { pathname } = new URL(request.url);
  try {
    if (originOf(request.headers) === null) {
      const host = request.headers.get('host') ?? 'none';
      throw new AppError('forbidden', fill(texts.details.unknownHost, { host }));
    }
    if (request.method !== 'GET' && !isSameOrigin(request.headers))
      throw new AppError('cross-origin', texts.details.crossOrigin);
    // Ends a session that is past its age before the identity service sees it.
    if (request.headers.has('cookie')) await whoOf(request.headers);
    const auth = await getAuth();
    const response = await auth.handler(await bounded(request));
    return response.status < 400 ? kept(response) : await refusal(response, pathname);
  } catch (error) {
    return problemResponse(asAppError(error, `${request.method} ${pathname}`), pathname);
  }
}

/** A NUL as JSON spells it: an odd number of backslashes before the "u". The database takes none. */
const NUL = /(?<!\\)(?:\\\\)*\\u0000/;

/** The same request with its body read: the library would take any length and any bytes. */
async function bounded(request: Request): Promise<Request> {
  if (request.method === 'GET') return request;
  const body = await readOptionalJson(request, BODY_MAX_KB);
  if (body !== null && NUL.test(body.text)) throw new AppError('invalid', texts.details.noNul);
  const { url, method, headers } = request;
  return new Request(url, { method, headers, body: body === null ? null : body.text });
}

function kept(response: Response): Response {
  for (const [name, value] of Object.entries(PRIVATE)) response.headers.set(name, value);
  return response;
}

async function refusal(response: Response, instance: string): Promise<Response> {
  const text = await response.text();
  const body: unknown = text.startsWith('{') ? JSON.parse(text) : {};
  const given = typeof body === 'object' && body !== null ? Object.fromEntries(Object.entries(body)) : {};
  const kind = kindOf(response.status);
  // Who tried is not written down: an address typed into the wrong field may be a password.
  logRefusal(instance, { status: response.status, code: given.code });
  const message = typeof given.message === 'string' && response.status < 500 ? given.message : texts.titles[kind];
  const headers = new Headers({ ...PRIVATE, 'content-type': 'application/problem+json; charset=utf-8' });
  for (const cookie of response.headers.getSetCookie()) headers.append('set-cookie', cookie);
  const retryAfter = response.headers.get('retry-after') ?? response.headers.get('x-retry-after');
  if (retryAfter !== null) headers.set('retry-after', retryAfter);
  const problem = {
    type: `urn:foldspar:problem:${kind}`,
    title: texts.titles[kind],
    status: response.status,
    detail: message,
    instance,
    code: typeof given.code === 'string' ? given.code : kind.toUpperCase().replaceAll('-', '_'),
    message,
  };
  return new Response(JSON.stringify(problem), { status: response.status, headers });
}
