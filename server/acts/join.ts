import { eq } from 'drizzle-orm';
import { membershipOf } from '@/db/queries/members';
import { membership } from '@/db/schema';
import type { Tx } from '@/db/types';
import { ROLES, type Role } from '@/lib/contract/roles';
import type { ActContext } from '../context';

/** Makes the person a member with these roles; somebody who is one already gains them. Answers with all their roles. */
export async function join(
  tx: Tx,
  { who, now, newId }: ActContext,
  workshopId: string,
  gained: readonly Role[],
): Promise<Role[]> {
  const held = await membershipOf(tx, workshopId, who.userId);
  const roles = ROLES.filter((role) => gained.includes(role) || held?.roles.includes(role));
  if (held === undefined) {
    await tx.insert(membership).values({ id: newId(), workshopId, userId: who.userId, roles, createdAt: now });
  } else {
    await tx.update(membership).set({ roles }).where(eq(membership.id, held.id));
  }
  return roles;
}
