import { eq } from 'drizzle-orm';
import { design } from '@/db/schema';
import { type ActContext, transact } from '../context';
import type { Member } from '../permissions';
import { audit } from './audit';
import { designToChange } from './designs';

/** Takes a design off the list. Nothing of it is deleted: its revisions can still be read and printed. */
export function archiveDesign(context: ActContext, member: Member, designId: string): Promise<null> {
  return transact(context, async (tx) => {
    const found = await designToChange(tx, member, designId);
    await tx.update(design).set({ archivedAt: context.now }).where(eq(design.id, found.id));
    await audit(tx, context, { act: 'design.archive', workshopId: member.workshopId, subjectId: found.id });
    return null;
  });
}
