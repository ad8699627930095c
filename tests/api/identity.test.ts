import { desc, eq, sql } from 'drizzle-orm';
import { describe, expect, it, vi } from 'vitest';
import { account as accounts, mailOutbox, session, throttle, user } from '@/db/schema';
import { getAuth } from '@/server/auth';
import { newId } from '@/server/context';
import { handleAuth } from '@/server/http/authRoute';
import { whoOf } from '@/server/session';
import { account, ORIGIN, PASSWORD, requestTo, signIn } from '../support/api';
import { testDb } from '../support/db';

vi.mock('@/db/client', () => ({ getDb: () => testDb() }));
const logged = vi.spyOn(console, 'warn').mockImplementation(() => undefined);

const post = (path: string, body: unknown, headers: Record<string, string> = {}) =>
  handleAuth(requestTo(`/api/auth${path}`, { method: 'POST', body, headers }));

const address = (): string => `new.${newId().slice(0, 8)}@example.test`;

async function newestMail(recipient: string) {
  const db = await testDb();
  const [mail] = await db
    .select()
    .from(mailOutbox)
    .where(eq(mailOutbox.recipient, recipient))
    .orderBy(desc(mailOutbox.createdAt))
    .limit(1);
  return mail;
}

const linkIn = (text: string | undefined): URL => new URL(/https?:\/\/\S+/.exec(text ?? '')?.[0] ?? 'about:blank');

const cookieOf = (response: Response): string =>
  response.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0])
    .join('; ');

const signUp = (email: string, changes: Record<string, string> = {}) =>
  post('/sign-up/email', { name: 'Nora New', email, password: PASSWORD, ...changes });

describe('signing up', () => {
  it('gives no session until the link in the mail has been opened, and then one', async () => {
    const email = address();
    const signed = await signUp(email);
    expect([signed.status, signed.headers.getSetCookie()]).toEqual([200, []]);
    const early = await post('/sign-in/email', { email, password: PASSWORD });
    expect([early.status, early.headers.get('content-type')]).toEqual([403, 'application/problem+json; charset=utf-8']);
    const mail = await newestMail(email);
    expect(mail).toMatchObject({ kind: 'verify', sentAt: null });
    const link = linkIn(mail?.text);
    expect([link.origin, link.searchParams.get('callbackURL')]).toEqual([ORIGIN, '/w']);
    const opened = await handleAuth(requestTo(`${link.pathname}${link.search}`));
    expect([opened.status, opened.headers.get('location')]).toEqual([302, '/w']);
    const who = await whoOf(new Headers({ host: '127.0.0.1:3000', cookie: cookieOf(opened) }));
    expect(who).toMatchObject({ name: 'Nora New', email });
  });

  it('with an address that is taken answers the same and tells only its holder', async () => {
    const taken = await account('Tara Taken');
    const fresh = address();
    const [first, second] = [await signUp(taken.who.email), await signUp(fresh)];
    expect(first.status).toBe(second.status);
    const shape = async (response: Response) => Object.keys((await response.json()).user).toSorted();
    expect(await shape(first)).toEqual(await shape(second));
    expect((await newestMail(taken.who.email))?.kind).toBe('alreadyRegistered');
    const db = await testDb();
    expect(await db.select().from(user).where(eq(user.email, taken.who.email))).toHaveLength(1);
  });

  it.each([
    ['under ten characters', 'nine-char'],
    ['a run', '1234567890'],
    ['one piece again and again', 'abcabcabcabc'],
    ['a word with digits', 'Password2024!'],
    ['nothing but digits', '48261973550'],
    ['their own name', 'noranew123'],
  ])('refuses a password of %s', async (_, password) => {
    const email = address();
    const answer = await signUp(email, { password });
    expect(answer.status).toBeGreaterThanOrEqual(400);
    expect(answer.status).toBeLessThan(500);
    const db = await testDb();
    expect(await db.select().from(user).where(eq(user.email, email))).toEqual([]);
  });

  it('takes a long password of any characters, as typed', async () => {
    const email = address();
    const password = ` ${'ö🪁 '.repeat(20)}`;
    expect((await signUp(email, { password })).status).toBe(200);
    const db = await testDb();
    await db.update(user).set({ emailVerified: true }).where(eq(user.email, email));
    expect((await post('/sign-in/email', { email, password: password.trim() })).status).toBe(401);
    expect((await post('/sign-in/email', { email, password })).status).toBe(200);
  });

  it('keeps no password, only a slow hash', async () => {
    const db = await testDb();
    const rows = await db.select({ password: accounts.password }).from(accounts);
    expect(rows.length).toBeGreaterThan(0);
    for (const { password } of rows) {
      expect(password).not.toContain(PASSWORD);
      // Salt and scrypt key, 16 and 64 bytes in hexadecimal.
      expect(password).toMatch(/^[0-9a-f]{32}:[0-9a-f]{128}$/);
    }
  });
});

describe('a forgotten password', () => {
  it('is replaced through a link that works once, and ends every session', async () => {
    const { who, cookie } = await account('Fred Forgot');
    const asked = await post('/request-password-reset', { email: who.email, redirectTo: '/reset' });
    expect(asked.status).toBe(200);
    const link = linkIn((await newestMail(who.email))?.text);
    expect([link.origin, link.pathname]).toEqual([ORIGIN, '/reset']);
    const token = link.searchParams.get('token');
    const fresh = 'a-quite-different-one';
    expect((await post('/reset-password', { token, newPassword: fresh })).status).toBe(200);
    expect((await post('/reset-password', { token, newPassword: 'yet-another-one' })).status).toBe(400);
    expect(await whoOf(new Headers({ host: '127.0.0.1:3000', cookie }))).toBeNull();
    expect((await post('/sign-in/email', { email: who.email, password: PASSWORD })).status).toBe(401);
    expect((await post('/sign-in/email', { email: who.email, password: fresh })).status).toBe(200);
  });

  it('of an address that nobody has answers the same and mails nothing', async () => {
    const email = address();
    const answer = await post('/request-password-reset', { email, redirectTo: '/reset' });
    expect(answer.status).toBe(200);
    expect(await newestMail(email)).toBeUndefined();
  });
});

describe('a session', () => {
  it('has a token of its own at each sign-in and ends for good at sign-out', async () => {
    const { who, cookie } = await account('Sue Session');
    const second = await signIn(who.email);
    expect(second).not.toBe(cookie);
    const out = await handleAuth(requestTo('/api/auth/sign-out', { method: 'POST', body: {}, cookie }));
    expect(out.status).toBe(200);
    const headers = (value: string) => new Headers({ host: '127.0.0.1:3000', cookie: value });
    expect(await whoOf(headers(cookie))).toBeNull();
    expect(await whoOf(headers(second))).toMatchObject({ userId: who.userId });
    const db = await testDb();
    expect(await db.select().from(session).where(eq(session.userId, who.userId))).toHaveLength(1);
  });

  it('cookie is kept from scripts and from other sites, and is not believed when changed', async () => {
    const { who } = await account('Carl Cookie');
    const answer = await post('/sign-in/email', { email: who.email, password: PASSWORD });
    const [set = ''] = answer.headers.getSetCookie();
    expect(set).toMatch(/HttpOnly/i);
    expect(set).toMatch(/SameSite=Lax/i);
    const forged = cookieOf(answer).replace(/=(.)/, (_, first: string) => `=${first === 'a' ? 'b' : 'a'}`);
    expect(await whoOf(new Headers({ host: '127.0.0.1:3000', cookie: forged }))).toBeNull();
  });

  it('works by either name of this machine, and by no other', async () => {
    const { who } = await account('Lena Local');
    const body = { email: who.email, password: PASSWORD };
    const from = (host: string) => post('/sign-in/email', body, { host, origin: `http://${host}` });
    expect((await from('localhost:3000')).status).toBe(200);
    expect((await from('127.0.0.1:4123')).status).toBe(200);
    expect((await from('foldspar.elsewhere.example')).status).toBe(403);
    const crossed = await post('/sign-in/email', body, { origin: 'https://elsewhere.example' });
    expect(crossed.status).toBe(403);
  });
});

describe('a common password', () => {
  it('is only wrong at sign-in, as any other', async () => {
    const { who } = await account('Cora Common');
    expect((await post('/sign-in/email', { email: who.email, password: '1234567890' })).status).toBe(401);
  });
});

describe('a refusal', () => {
  it('is logged as one line that holds neither the address nor the password', async () => {
    const email = address();
    logged.mockClear();
    const answer = await post('/sign-in/email', { email, password: 'a guess\n{"level":"info"}' });
    expect(answer.status).toBe(401);
    expect(logged).toHaveBeenCalledTimes(1);
    const [line] = logged.mock.calls[0] ?? [];
    expect(JSON.parse(String(line))).toMatchObject({ where: '/api/auth/sign-in/email', status: 401 });
    expect(String(line)).not.toMatch(/\n|a guess|@/);
  });
});

describe('guessing a password', () => {
  it('is stopped by account, from however many addresses, and says when to come back', async () => {
    const { who } = await account('Gina Guessed');
    const tries: number[] = [];
    for (let i = 0; i < 11; i += 1) {
      const answer = await post(
        '/sign-in/email',
        { email: who.email.toUpperCase(), password: `wrong-guess-${i}` },
        { 'x-forwarded-for': `203.0.113.${i}` },
      );
      tries.push(answer.status);
    }
    expect(tries).toEqual([...Array(10).fill(401), 429]);
    const right = await post(
      '/sign-in/email',
      { email: who.email, password: PASSWORD },
      { 'x-forwarded-for': '203.0.113.99' },
    );
    expect(right.status).toBe(429);
    const wait = Number(right.headers.get('retry-after'));
    expect(wait > 600 && wait <= 900).toBe(true);
    // The window ends: its start is moved back as if the time had passed.
    const db = await testDb();
    await db.update(throttle).set({ endsAt: new Date() });
    expect((await post('/sign-in/email', { email: who.email, password: PASSWORD })).status).toBe(200);
  });

  it('is stopped by address too, and by whichever door it comes in', async () => {
    const auth = await getAuth();
    const headers = new Headers({ host: '127.0.0.1:3000', 'x-forwarded-for': '198.51.100.7' });
    const attempt = () =>
      auth.api.signInEmail({ body: { email: address(), password: 'x' }, headers }).then(
        () => 200,
        (error: { statusCode: number }) => error.statusCode,
      );
    const db = await testDb();
    // Ninety-eight tries made before these.
    await attempt();
    await db
      .update(throttle)
      .set({ count: sql`${throttle.count} + 98` })
      .where(eq(throttle.count, 1));
    expect([await attempt(), await attempt()]).toEqual([401, 429]);
    const body = { email: address(), password: PASSWORD };
    const routed = await post('/sign-in/email', body, { 'x-forwarded-for': '198.51.100.7' });
    expect(routed.status).toBe(429);
    expect(await routed.json()).toMatchObject({ type: 'urn:foldspar:problem:too-many', status: 429 });
    expect((await post('/sign-in/email', body, { 'x-forwarded-for': '198.51.100.8' })).status).toBe(401);
  });

  it('is no way to fill a mailbox', async () => {
    const { who } = await account('Mia Mailed');
    const ask = () => post('/request-password-reset', { email: who.email, redirectTo: '/reset' });
    const answers = [];
    for (let i = 0; i < 7; i += 1) answers.push((await ask()).status);
    expect(answers).toEqual([200, 200, 200, 200, 200, 429, 429]);
    const db = await testDb();
    expect(await db.select().from(mailOutbox).where(eq(mailOutbox.recipient, who.email))).toHaveLength(5);
  });
});
