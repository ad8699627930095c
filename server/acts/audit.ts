import { auditEvent } from '@/db/schema';
import type { Tx } from '@/db/types';
import type { ActContext } from '../context';

export interface AuditEntry {
  readonly act: string;
  readonly workshopId: string | null;
  readonly subjectId: string;
  readonly detail?: Readonly<Record<string, string | number | boolean | null>>;
}

/** Writes down who did what, in the act's own transaction: what rolled back was never done and is not told. */
export async function audit(tx: Tx, context: ActContext, entry: AuditEntry): Promise<void> {
  await tx.insert(auditEvent).values({
    id: context.newId(),
    workshopId: entry.workshopId,
    actorId: context.who.userId,
    act: entry.act,
    subjectId: entry.subjectId,
    detail: entry.detail ?? {},
    at: context.now,
  });
}
