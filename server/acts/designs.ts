import { type DesignRecord, lockDesign } from '@/db/queries/designs';
import type { Tx } from '@/db/types';
import { texts } from '@/lib/text/en/server';
import { isId } from '../ids';
import type { Member } from '../permissions';
import { AppError, notFound } from '../problems';

/** The design that an act is about to change, held until the transaction ends. An archived one is read-only. */
export async function designToChange(tx: Tx, member: Member, designId: string): Promise<DesignRecord> {
  if (!isId(designId)) throw notFound();
  const found = await lockDesign(tx, member.workshopId, designId);
  if (found === undefined) throw notFound();
  if (found.archivedAt !== null) throw new AppError('conflict', texts.details.archivedDesign);
  return found;
}
