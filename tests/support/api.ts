import { vi } from 'vitest';
import type { Role } from '@/lib/contract/roles';
import { getAuth } from '@/server/auth';
import { newId, type Who } from '@/server/context';
import { testDb } from './db';

// The route handlers are called as functions with plain requests: no server, but all of who, may, shape and act.
// A test file mocks '@/db/client' and '@/server/engine' before it imports any of them.

// For tests only: it protects nothing.
vi.stubEnv('FOLDSPAR_SECRET', 'a secret for tests that protects nothing at all');

export const ORIGIN = 'http://127.0.0.1:3000';
export const PASSWORD = 'seven-geese-over-the-tarn';

export interface Account {
  readonly who: Who;
  readonly cookie: string;
}

export interface Sent {
  readonly method?: string;
  readonly cookie?: string;
  readonly body?: unknown;
  readonly headers?: Readonly<Record<string, string>>;
}

/** A request as a page of this site sends it. A text body goes out as it is. */
export function requestTo(path: string, { method = 'GET', cookie, body, headers = {} }: Sent = {}): Request {
  const all = new Headers({ host: '127.0.0.1:3000', ...headers });
  if (cookie !== undefined) all.set('cookie', cookie);
  if (method !== 'GET' && !all.has('origin')) all.set('origin', ORIGIN);
  if (body !== undefined && !all.has('content-type')) all.set('content-type', 'application/json');
  const text = body === undefined || typeof body === 'string' ? body : JSON.stringify(body);
  return new Request(`${ORIGIN}${path}`, { method, headers: all, body: text });
}

/** Signs in with the password and answers with the cookie. */
export async function signIn(email: string, password: string = PASSWORD): Promise<string> {
  const auth = await getAuth(await testDb());
  const response = await auth.handler(
    requestTo('/api/auth/sign-in/email', { method: 'POST', body: { email, password } }),
  );
  if (response.status !== 200) throw new RangeError(`sign-in answered ${response.status}: ${await response.text()}`);
  return response.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0])
    .join('; ');
}

/** A person with a confirmed address, a password and a session. */
export async function account(name: string): Promise<Account> {
  const { internalAdapter, password: passwords } = await (await getAuth(await testDb())).$context;
  const email = `${name.toLowerCase().replaceAll(/[^a-z]+/g, '.')}.${newId().slice(0, 8)}@example.test`;
  const user = await internalAdapter.createUser({ name, email, emailVerified: true }, { method: 'email-password' });
  const hash = await passwords.hash(PASSWORD);
  await internalAdapter.linkAccount({ userId: user.id, providerId: 'credential', accountId: user.id, password: hash });
  return { who: { userId: user.id, name, email }, cookie: await signIn(email) };
}

/** The members that the tests of rights are about, by what they are. */
export const ROLE_NAMES = ['owner', 'designer', 'builder', 'reviewer'] as const satisfies readonly Role[];
