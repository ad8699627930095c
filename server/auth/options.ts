import type { BetterAuthOptions } from 'better-auth';
import { APIError } from 'better-auth/api';
import { PASSWORD_MAX, PASSWORD_MIN } from './password';

const HOUR = 60 * 60;
const DAY = 24 * HOUR;

/** A session ends this long after its last use … */
export const SESSION_IDLE_SECONDS = 7 * DAY;
/** … and this long after it began, however much it is used (ASVS 5.0.0, 7.3.2). */
export const SESSION_ABSOLUTE_SECONDS = 30 * DAY;

/** Paths of the library that no page of ours uses; closed, for what is not used is not watched. */
const UNUSED: string[] = [
  ...['/error', '/ok', '/sign-in/social', '/link-social', '/unlink-account', '/list-accounts', '/account-info'],
  ...['/get-access-token', '/refresh-token', '/update-session', '/verify-password', '/change-email'],
  ...['/delete-user', '/delete-user/callback'],
];

/** What needs no database and no secret; the tables that it asks for are checked against db/schema/auth.ts. */
export const authOptions = {
  appName: 'Foldspar',
  basePath: '/api/auth',
  telemetry: { enabled: false },
  // One line of JSON each: text from a request cannot forge a second entry.
  logger: {
    level: 'error',
    log: (level, message) => console.error(JSON.stringify({ level, where: 'identity', message })),
  },
  onAPIError: {
    // Refusals are the route's to log; what is left is a fault.
    onError: (error) => {
      if (error instanceof APIError && error.statusCode < 500) return;
      const message = error instanceof Error ? error.message : String(error);
      console.error(JSON.stringify({ level: 'error', where: 'identity', message }));
    },
  },
  disabledPaths: UNUSED,
  emailAndPassword: {
    enabled: true,
    requireEmailVerification: true,
    minPasswordLength: PASSWORD_MIN,
    maxPasswordLength: PASSWORD_MAX,
    resetPasswordTokenExpiresIn: HOUR,
    revokeSessionsOnPasswordReset: true,
  },
  session: { expiresIn: SESSION_IDLE_SECONDS, updateAge: DAY, cookieCache: { enabled: false } },
  rateLimit: {
    enabled: true,
    storage: 'database',
    window: 60,
    max: 300,
    // These are counted in throttle.ts, for forms reach them without passing through a route.
    customRules: {
      '/sign-in/email': false,
      '/sign-up/email': false,
      '/request-password-reset': false,
      '/send-verification-email': false,
      '/reset-password': false,
      '/get-session': false,
    },
  },
} as const satisfies BetterAuthOptions;
