import { eq } from 'drizzle-orm';
import type { z } from 'zod';
import { designSummary, latestRevision } from '@/db/queries/designs';
import { design } from '@/db/schema';
import type { DesignSummary } from '@/lib/contract/answers';
import type { RenameDesign } from '@/lib/contract/bodies';
import { type ActContext, transact } from '../context';
import type { Member } from '../permissions';
import { audit } from './audit';
import { designToChange } from './designs';

/** Renames the design. The airframe's own name, and with it every released revision, stays as it is. */
export function renameDesign(
  context: ActContext,
  member: Member,
  designId: string,
  input: z.infer<typeof RenameDesign>,
): Promise<DesignSummary> {
  return transact(context, async (tx) => {
    const found = await designToChange(tx, member, designId);
    const change = { name: input.name, updatedAt: context.now };
    await tx.update(design).set(change).where(eq(design.id, found.id));
    await audit(tx, context, {
      act: 'design.rename',
      workshopId: member.workshopId,
      subjectId: found.id,
      detail: { from: found.name, to: input.name },
    });
    return designSummary({ ...found, ...change }, (await latestRevision(tx, found.id)) ?? null);
  });
}
