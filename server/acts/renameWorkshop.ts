import { eq } from 'drizzle-orm';
import type { z } from 'zod';
import { workshop } from '@/db/schema';
import type { WorkshopSummary } from '@/lib/contract/answers';
import type { RenameWorkshop } from '@/lib/contract/bodies';
import { type ActContext, transact } from '../context';
import type { Member } from '../permissions';
import { audit } from './audit';

export function renameWorkshop(
  context: ActContext,
  member: Member,
  input: z.infer<typeof RenameWorkshop>,
): Promise<WorkshopSummary> {
  return transact(context, async (tx) => {
    const id = member.workshopId;
    await tx.update(workshop).set({ name: input.name }).where(eq(workshop.id, id));
    await audit(tx, context, { act: 'workshop.rename', workshopId: id, subjectId: id, detail: { name: input.name } });
    return { id, name: input.name, roles: member.roles };
  });
}
