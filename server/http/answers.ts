import { sha256 } from '../ids';

/** What a handler hands back; the endpoint makes the response of it. */
export interface Reply {
  readonly status: 200 | 201 | 204;
  readonly data: unknown;
  readonly etag?: string;
  readonly location?: string;
}

export const ok = (data: unknown, etag?: string): Reply => ({ status: 200, data, etag });
export const created = (data: unknown, location?: string): Reply => ({ status: 201, data, location });
export const done = (): Reply => ({ status: 204, data: null });

/** Nothing that belongs to a workshop may lie in a shared cache, or in a browser's after sign-out. */
export const PRIVATE = { 'cache-control': 'private, no-store', vary: 'cookie' } as const;

/** Quotes a strong validator. */
export const etagOf = (value: string): string => `"${value}"`;

/** RFC 9110, 13.1.2: a list of validators or a star; weak comparison. */
function matches(ifNoneMatch: string | null, etag: string): boolean {
  if (ifNoneMatch === null) return false;
  const listed = ifNoneMatch.split(',').map((entry) => entry.trim().replace(/^W\//, ''));
  return listed.includes('*') || listed.includes(etag);
}

/** JSON with an ETag; 304 without a body when a reader has it already. */
export function jsonResponse(request: Request, reply: Reply): Response {
  if (reply.status === 204) return new Response(null, { status: 204, headers: PRIVATE });
  const text = JSON.stringify(reply.data);
  const headers = new Headers({ ...PRIVATE, 'content-type': 'application/json; charset=utf-8' });
  if (reply.location !== undefined) headers.set('location', reply.location);
  const reading = request.method === 'GET';
  const etag = reply.etag ?? (reading ? etagOf(sha256(text).slice(0, 32)) : undefined);
  if (etag !== undefined) headers.set('etag', etag);
  if (reading && etag !== undefined && matches(request.headers.get('if-none-match'), etag)) {
    headers.delete('content-type');
    return new Response(null, { status: 304, headers });
  }
  return new Response(text, { status: reply.status, headers });
}

export interface FileAnswer {
  readonly bytes: Uint8Array | string;
  readonly type: string;
  readonly name: string;
}

/** Letters, digits and hyphens of a name, for a file name that every system takes. */
const plain = (name: string): string =>
  name
    .normalize('NFKD')
    .replaceAll(/[^A-Za-z0-9.]+/g, '-')
    .replaceAll(/^[-.]+|[-.]+$/g, '')
    .slice(0, 80) || 'foldspar';

/** A download: never shown as a page of this site (ASVS 5.0.0, 3.2.1 and 5.4.2). */
export function fileResponse({ bytes, type, name }: FileAnswer): Response {
  const body = typeof bytes === 'string' ? bytes : Uint8Array.from(bytes);
  return new Response(body, {
    headers: {
      ...PRIVATE,
      'content-type': type,
      'content-disposition': `attachment; filename="${plain(name)}"; filename*=UTF-8''${encodeURIComponent(name)}`,
      'x-content-type-options': 'nosniff',
    },
  });
}
