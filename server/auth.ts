import { drizzleAdapter } from '@better-auth/drizzle-adapter';
import { betterAuth } from 'better-auth';
import { APIError, createAuthMiddleware, getIP } from 'better-auth/api';
import { nextCookies } from 'better-auth/next-js';
import { getDb } from '@/db/client';
import { account, rateLimit, session, user, verification } from '@/db/schema';
import type { Db } from '@/db/types';
import { PersonName } from '@/lib/contract/bodies';
import { texts as mails } from '@/lib/text/en/mail';
import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { authOptions } from './auth/options';
import { passwordFault } from './auth/password';
import { countTry, forgetTries } from './auth/throttle';
import { newId } from './context';
import { env } from './env';
import { deliverSoon, type Mail, queueMail } from './mail';

const fieldOf = (body: unknown, key: string): unknown =>
  typeof body === 'object' && body !== null ? Object.entries(body).find(([name]) => name === key)?.[1] : undefined;

const textOf = (body: unknown, key: string): string | undefined => {
  const value = fieldOf(body, key);
  return typeof value === 'string' ? value : undefined;
};

/** Where a password is chosen; anywhere else it is only compared. */
const CHOOSING = new Set(['/sign-up/email', '/reset-password', '/change-password', '/set-password']);

/** Where people say who they are. The library takes any name of any length, and a picture from anywhere. */
const NAMING = new Set(['/sign-up/email', '/update-user']);

function assertNamed(body: unknown): void {
  if (fieldOf(body, 'image') !== undefined)
    throw new APIError('UNPROCESSABLE_ENTITY', {
      code: 'UNKNOWN_FIELD',
      message: fill(texts.details.unknownKey, { key: 'image' }),
    });
  const name = fieldOf(body, 'name');
  if (name !== undefined && !PersonName.safeParse(name).success)
    throw new APIError('UNPROCESSABLE_ENTITY', { code: 'NAME_NOT_ACCEPTED', message: texts.details.personName });
}

/** Refuses what the length rules of the library let through: first guesses, and tries without end. Forms and routes both pass here. */
const before = (db: Db) =>
  createAuthMiddleware(async (ctx) => {
    const body: unknown = ctx.body;
    const source = ctx.request ?? ctx.headers;
    const address = source === undefined ? null : getIP(source, ctx.context.options);
    const tried = { path: ctx.path, email: textOf(body, 'email') ?? null, address };
    const wait = await countTry(db, tried, new Date());
    if (wait !== null) {
      const message = fill(texts.details.tooManyTries, { minutes: Math.ceil(wait / 60) });
      throw new APIError('TOO_MANY_REQUESTS', { code: 'TOO_MANY_TRIES', message }, { 'retry-after': String(wait) });
    }
    if (NAMING.has(ctx.path)) assertNamed(body);
    if (!CHOOSING.has(ctx.path)) return;
    const password = textOf(body, 'newPassword') ?? textOf(body, 'password');
    if (password === undefined) return;
    const fault = passwordFault(password, { name: textOf(body, 'name'), email: textOf(body, 'email') });
    if (fault === 'common')
      throw new APIError('UNPROCESSABLE_ENTITY', {
        code: 'PASSWORD_TOO_COMMON',
        message: texts.details.passwordTooCommon,
      });
    if (fault === 'holds-name')
      throw new APIError('UNPROCESSABLE_ENTITY', {
        code: 'PASSWORD_HOLDS_NAME',
        message: texts.details.passwordHoldsName,
      });
  });

const after = (db: Db) =>
  createAuthMiddleware(async (ctx) => {
    if (ctx.path === '/sign-in/email' && ctx.context.newSession)
      await forgetTries(db, ctx.path, ctx.context.newSession.user.email);
  });

/** A link in a mail that leads back to the page where a new account begins, unless the sign-up named another. */
function afterVerifying(url: string): string {
  const link = new URL(url);
  if (link.searchParams.get('callbackURL') === '/') link.searchParams.set('callbackURL', '/w');
  return link.href;
}

/** Where this server may be reached while no public address is configured: this machine's own names. */
const OWN_HOSTS = ['localhost', 'localhost:*', '127.0.0.1', '127.0.0.1:*', '[::1]', '[::1]:*'];

/** Identity and sessions on this database. Workshops and rights are not its business. */
export function createAuth(db: Db) {
  const settings = env();
  const post = async (mail: Mail): Promise<void> => {
    const now = new Date();
    await queueMail(db, { now, newId }, mail);
    deliverSoon(db, now);
  };
  return betterAuth({
    ...authOptions,
    secret: settings.secret,
    baseURL: settings.url ?? { allowedHosts: OWN_HOSTS, protocol: 'http', fallback: 'http://127.0.0.1:3000' },
    database: drizzleAdapter(db, {
      provider: 'pg',
      schema: { user, session, account, verification, rateLimit },
      transaction: true,
    }),
    advanced: {
      cookiePrefix: 'foldspar',
      // Said although it is the default, because the library's own default in a test is to check nothing.
      disableOriginCheck: false,
      database: { generateId: newId },
      ipAddress: { trustedProxies: [...settings.trustedProxies] },
    },
    emailAndPassword: {
      ...authOptions.emailAndPassword,
      sendResetPassword: async ({ user: { name, email }, url, token }) => {
        const link = `${new URL(url).origin}/reset?token=${encodeURIComponent(token)}`;
        const text = fill(mails.reset.text, { name, url: link });
        await post({ kind: 'reset', recipient: email, subject: mails.reset.subject, text });
      },
      onExistingUserSignUp: async ({ user: { name, email } }, request) => {
        const origin = settings.url ?? (request === undefined ? '' : new URL(request.url).origin);
        const text = fill(mails.alreadyRegistered.text, { name, url: `${origin}/sign-in` });
        await post({ kind: 'alreadyRegistered', recipient: email, subject: mails.alreadyRegistered.subject, text });
      },
    },
    emailVerification: {
      sendOnSignUp: true,
      autoSignInAfterVerification: true,
      expiresIn: 60 * 60,
      sendVerificationEmail: async ({ user: { email }, url }) => {
        const text = fill(mails.verify.text, { url: afterVerifying(url) });
        await post({ kind: 'verify', recipient: email, subject: mails.verify.subject, text });
      },
    },
    hooks: { before: before(db), after: after(db) },
    plugins: [nextCookies()],
  });
}
export type Auth = ReturnType<typeof createAuth>;

// A cache and nothing more: building it again gives the same.
const built = new WeakMap<Db, Auth>();

/** The identity service on the application's database. */
export async function getAuth(db?: Db): Promise<Auth> {
  const target = db ?? (await getDb());
  const known = built.get(target);
  if (known !== undefined) return known;
  const fresh = createAuth(target);
  built.set(target, fresh);
  return fresh;
}
