import { eq, lt, sql } from 'drizzle-orm';
import { throttle } from '@/db/schema';
import type { Db } from '@/db/types';
import { sha256 } from '../ids';

// Tries are counted by account as well as by the address they come from: an attacker chooses the address, not the account.

export interface Limit {
  readonly max: number;
  readonly seconds: number;
}
export interface Limits {
  readonly byAccount?: Limit;
  readonly byAddress: Limit;
}

const MINUTE = 60;
const HOUR = 60 * MINUTE;

/** Counted as a path is; here the "address" is whoever invites. Anybody can found a workshop, and its name is theirs to choose. */
export const INVITING = 'invitation';

/** Per path of the identity service. Whatever sends a mail is limited by whom it would be sent to. */
export const LIMITS: ReadonlyMap<string, Limits> = new Map([
  ['/sign-in/email', { byAccount: { max: 10, seconds: 15 * MINUTE }, byAddress: { max: 100, seconds: 5 * MINUTE } }],
  ['/sign-up/email', { byAccount: { max: 5, seconds: HOUR }, byAddress: { max: 50, seconds: HOUR } }],
  ['/request-password-reset', { byAccount: { max: 5, seconds: HOUR }, byAddress: { max: 30, seconds: HOUR } }],
  ['/send-verification-email', { byAccount: { max: 5, seconds: HOUR }, byAddress: { max: 30, seconds: HOUR } }],
  [INVITING, { byAccount: { max: 5, seconds: 24 * HOUR }, byAddress: { max: 60, seconds: HOUR } }],
  ['/change-password', { byAddress: { max: 20, seconds: 15 * MINUTE } }],
  ['/reset-password', { byAddress: { max: 20, seconds: 15 * MINUTE } }],
]);

/** Behind a proxy that hides who asks, everybody shares one count. */
const SHARED_BY = 10;
/** What ended this long ago is swept out. */
const SWEPT_AFTER_MS = 24 * HOUR * 1000;

/** Hashed, so that the table does not list who has tried to sign in, or from where. */
const keyOf = (path: string, kind: 'account' | 'address', value: string): string => sha256(`${path} ${kind} ${value}`);
const accountKey = (path: string, email: string): string => keyOf(path, 'account', email.trim().toLowerCase());

/** Counts in one statement, so that tries sent at once are all counted. Answers with the seconds to wait, or null to go on. */
async function count(db: Db, key: string, limit: Limit, now: Date): Promise<number | null> {
  const ends = new Date(now.getTime() + limit.seconds * 1000);
  const over = sql`${throttle.endsAt} <= ${now.toISOString()}::timestamptz`;
  const [row] = await db
    .insert(throttle)
    .values({ key, count: 1, endsAt: ends })
    .onConflictDoUpdate({
      target: throttle.key,
      set: {
        count: sql`case when ${over} then 1 else ${throttle.count} + 1 end`,
        endsAt: sql`case when ${over} then ${ends.toISOString()}::timestamptz else ${throttle.endsAt} end`,
      },
    })
    .returning();
  if (row === undefined) throw new RangeError('a try was not counted');
  if (row.count === 1) await db.delete(throttle).where(lt(throttle.endsAt, new Date(now.getTime() - SWEPT_AFTER_MS)));
  return row.count > limit.max ? Math.max(1, Math.ceil((row.endsAt.getTime() - now.getTime()) / 1000)) : null;
}

export interface Try {
  readonly path: string;
  /** As typed; null when the path has none. */
  readonly email: string | null;
  /** Where it comes from; null when that cannot be known. */
  readonly address: string | null;
}

/** Counts a try before it is made. Answers with the seconds to wait, or null when it may go on. */
export async function countTry(db: Db, { path, email, address }: Try, now: Date): Promise<number | null> {
  const limits = LIMITS.get(path);
  if (limits === undefined) return null;
  const { byAccount, byAddress } = limits;
  const from = address === null ? { ...byAddress, max: byAddress.max * SHARED_BY } : byAddress;
  const waits = [await count(db, keyOf(path, 'address', address ?? 'unknown'), from, now)];
  if (byAccount !== undefined && email !== null) waits.push(await count(db, accountKey(path, email), byAccount, now));
  const longest = Math.max(...waits.map((wait) => wait ?? 0));
  return longest > 0 ? longest : null;
}

/** After a good sign-in the account starts afresh. */
export async function forgetTries(db: Db, path: string, email: string): Promise<void> {
  await db.delete(throttle).where(eq(throttle.key, accountKey(path, email)));
}
