import { ownersOf } from '@/db/queries/members';
import type { Tx } from '@/db/types';
import { texts } from '@/lib/text/en/server';
import { AppError } from '../problems';

/** Refuses what would leave a workshop that nobody can run. The workshop's row must be locked. */
export async function assertAnOwnerRemains(tx: Tx, workshopId: string, withoutMemberId: string): Promise<void> {
  const owners = await ownersOf(tx, workshopId);
  if (owners.every((owner) => owner.id === withoutMemberId)) throw new AppError('conflict', texts.details.lastOwner);
}
