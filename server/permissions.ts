import { membershipOf } from '@/db/queries/members';
import type { Db } from '@/db/types';
import { type Act, MAY, may, type Role } from '@/lib/contract/roles';
import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import type { Who } from './context';
import { isId } from './ids';
import { AppError, notFound } from './problems';

/** A membership that was looked up for this request and may do what was asked. Only `claim` makes one. */
export interface Member {
  readonly workshopId: string;
  readonly userId: string;
  readonly roles: readonly Role[];
}

/**
 * Proves that this person may do this act in this workshop.
 * A workshop they do not belong to is "not found", whether it exists or not; an act outside their roles is "forbidden".
 */
export async function claim(db: Db, who: Who, workshopId: string, act: Act): Promise<Member> {
  if (!isId(workshopId)) throw notFound();
  const found = await membershipOf(db, workshopId, who.userId);
  if (found === undefined) throw notFound();
  if (!may(found.roles, act)) {
    const needed = MAY[act].join(', ');
    throw new AppError('forbidden', fill(texts.details.forbidden, { needed, held: found.roles.join(', ') }));
  }
  return { workshopId, userId: who.userId, roles: found.roles };
}
