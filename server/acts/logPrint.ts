import { printLog } from '@/db/schema';
import type { PaperId } from '@/lib/plan/paper';
import { type ActContext, transact } from '../context';
import { sha256 } from '../ids';
import type { Member } from '../permissions';
import type { MadePlan } from '../plans';
import { audit } from './audit';

/** Writes down that these pages may now exist on paper. */
export function logPrint(context: ActContext, member: Member, paper: PaperId, plan: MadePlan): Promise<null> {
  return transact(context, async (tx) => {
    const id = context.newId();
    await tx.insert(printLog).values({
      id,
      ...plan.source,
      paper,
      pages: plan.pages,
      pdfSha256: sha256(plan.pdf),
      printedBy: context.who.userId,
      printedAt: context.now,
    });
    await audit(tx, context, {
      act: plan.source.revisionId === null ? 'draft.print' : 'revision.print',
      workshopId: member.workshopId,
      subjectId: id,
      detail: { paper, pages: plan.pages },
    });
    return null;
  });
}
