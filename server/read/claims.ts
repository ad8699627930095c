import { type DesignRecord, designById } from '@/db/queries/designs';
import { type RevisionRecord, revisionByNumber } from '@/db/queries/revisions';
import type { Db } from '@/db/types';
import { isId } from '../ids';
import type { Member } from '../permissions';
import { notFound } from '../problems';

/** A design of the member's workshop; anything else is "not found". */
export async function designIn(db: Db, member: Member, designId: string): Promise<DesignRecord> {
  const found = isId(designId) ? await designById(db, member.workshopId, designId) : undefined;
  if (found === undefined) throw notFound();
  return found;
}

/** A revision of a design of the member's workshop, by its number. */
export async function revisionIn(
  db: Db,
  member: Member,
  designId: string,
  number: number | null,
): Promise<{ revision: RevisionRecord; designName: string }> {
  const found =
    isId(designId) && number !== null ? await revisionByNumber(db, member.workshopId, designId, number) : undefined;
  if (found === undefined) throw notFound();
  return found;
}
