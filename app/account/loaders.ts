import { cookies, headers } from 'next/headers';
import type { SessionRow } from '@/components/auth/SessionList';
import { lookFrom } from '@/lib/look/css';
import { getAuth } from '@/server/auth';
import { requireWho } from '@/server/session';

/** Who is signed in, where else, and the look of this browser. */
export async function accountPage() {
  const who = await requireWho();
  const auth = await getAuth();
  const requestHeaders = await headers();
  const here = await auth.api.getSession({ headers: requestHeaders });
  const all = await auth.api.listSessions({ headers: requestHeaders });
  const sessions: SessionRow[] = all.map(({ id, userAgent, createdAt }) => ({
    id,
    agent: userAgent ?? null,
    since: createdAt.toISOString(),
    here: id === here?.session.id,
  }));
  return { who, sessions, look: lookFrom((await cookies()).get('look')?.value) };
}
