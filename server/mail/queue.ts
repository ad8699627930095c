import { mailOutbox } from '@/db/schema';
import type { Db } from '@/db/types';

export interface Mail {
  readonly kind: (typeof mailOutbox.$inferInsert)['kind'];
  readonly recipient: string;
  readonly subject: string;
  readonly text: string;
}

/** Puts a mail into the outbox. Inside an act it goes with the act's transaction; `deliverMail` sends what has been committed. */
export async function queueMail(
  db: Db,
  { now, newId }: { readonly now: Date; readonly newId: () => string },
  mail: Mail,
): Promise<void> {
  await db.insert(mailOutbox).values({ id: newId(), ...mail, createdAt: now });
}
