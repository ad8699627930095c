import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { getAuth } from './auth';
import { SESSION_ABSOLUTE_SECONDS } from './auth/options';
import type { Who } from './context';

export type { Who } from './context';

/** The person whose session these headers carry, or null. A session past its absolute end counts as none. */
export async function whoOf(requestHeaders: Headers, now: Date = new Date()): Promise<Who | null> {
  const auth = await getAuth();
  const found = await auth.api.getSession({ headers: requestHeaders });
  if (found === null || !found.user.emailVerified) return null;
  const ageSeconds = (now.getTime() - found.session.createdAt.getTime()) / 1000;
  if (ageSeconds > SESSION_ABSOLUTE_SECONDS) {
    // Ended for good: the identity service looks at the last use alone and would go on taking it.
    await (await auth.$context).internalAdapter.deleteSession(found.session.token);
    return null;
  }
  return { userId: found.user.id, name: found.user.name, email: found.user.email };
}

/** For pages: who is signed in, or null. */
export async function currentWho(): Promise<Who | null> {
  return whoOf(await headers());
}

/** For pages: who is signed in; sends everybody else to the sign-in page. */
export async function requireWho(): Promise<Who> {
  const who = await currentWho();
  if (who === null) redirect('/sign-in');
  return who;
}
