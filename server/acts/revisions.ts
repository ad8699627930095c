import { lockRevision, type RevisionRecord, revisionByNumber } from '@/db/queries/revisions';
import type { Tx } from '@/db/types';
import { texts } from '@/lib/text/en/server';
import { isId, revisionNumber } from '../ids';
import type { Member } from '../permissions';
import { AppError, notFound } from '../problems';

/** Where a revision stands: its design and its number. */
export interface RevisionPlace {
  readonly designId: string;
  readonly number: number;
}

/** The place that a URL names; a number that is none names nothing. */
export function placeOf(params: { readonly design: string; readonly number: string }): RevisionPlace {
  const number = revisionNumber(params.number);
  if (number === null) throw notFound();
  return { designId: params.design, number };
}

/** The revision that an act is about to review, held until the transaction ends. One of an archived design is read-only. */
export async function revisionToReview(tx: Tx, member: Member, place: RevisionPlace): Promise<RevisionRecord> {
  if (!isId(place.designId)) throw notFound();
  const found = await revisionByNumber(tx, member.workshopId, place.designId, place.number);
  if (found === undefined) throw notFound();
  if (found.archivedAt !== null) throw new AppError('conflict', texts.details.archivedDesign);
  await lockRevision(tx, found.revision.id);
  return found.revision;
}
