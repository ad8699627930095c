import type { z } from 'zod';
import { membership, workshop } from '@/db/schema';
import type { WorkshopSummary } from '@/lib/contract/answers';
import type { CreateWorkshop } from '@/lib/contract/bodies';
import type { Role } from '@/lib/contract/roles';
import { type ActContext, transact } from '../context';
import { audit } from './audit';

/** Whoever founds a workshop owns it and designs in it. */
const FOUNDER_ROLES: readonly Role[] = ['owner', 'designer'];

/** Founds a workshop with the caller as its only member. */
export function createWorkshop(context: ActContext, input: z.infer<typeof CreateWorkshop>): Promise<WorkshopSummary> {
  return transact(context, async (tx) => {
    const id = context.newId();
    await tx.insert(workshop).values({ id, name: input.name, createdAt: context.now });
    await tx.insert(membership).values({
      id: context.newId(),
      workshopId: id,
      userId: context.who.userId,
      roles: [...FOUNDER_ROLES],
      createdAt: context.now,
    });
    await audit(tx, context, { act: 'workshop.create', workshopId: id, subjectId: id });
    return { id, name: input.name, roles: FOUNDER_ROLES };
  });
}
