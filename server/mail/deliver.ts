import { and, asc, eq, isNull, lt, or, sql } from 'drizzle-orm';
import { createTransport } from 'nodemailer';
import { mailOutbox } from '@/db/schema';
import type { Db } from '@/db/types';
import { env } from '../env';

/** After this many failures a mail is left for a person to look at. */
const MAX_ATTEMPTS = 8;
/** A mail that is being sent, or that failed, is left alone this long. */
const RETRY_AFTER_MS = 60_000;
/** Sent in one go; the rest follows with the next mail. */
const BATCH = 20;

export interface Transport {
  readonly send: (mail: { from: string; to: string; subject: string; text: string }) => Promise<void>;
}

/** The SMTP server of the configuration, or null when there is none and mails stay in the outbox. */
export function smtpTransport(): Transport | null {
  const { smtpUrl } = env();
  if (smtpUrl === null) return null;
  const transport = createTransport(smtpUrl);
  return {
    send: async (mail) => {
      await transport.sendMail(mail);
    },
  };
}

/** Sends what waits in the outbox, oldest first, and writes down what failed and why. Two senders never take the same mail. */
export async function deliverMail(db: Db, now: Date, transport: Transport | null = smtpTransport()): Promise<number> {
  if (transport === null) return 0;
  let sent = 0;
  for (let i = 0; i < BATCH; i += 1) {
    const done = await deliverOne(db, now, transport);
    if (done === 'none') break;
    if (done === 'sent') sent += 1;
  }
  return sent;
}

/** As `deliverMail`, and lets the caller go on: how long a mail takes would tell a stranger that one was sent. */
export function deliverSoon(db: Db, now: Date): void {
  deliverMail(db, now).catch((error: unknown) => {
    const message = error instanceof Error ? error.message : String(error);
    console.error(JSON.stringify({ level: 'error', where: 'mail', message }));
  });
}

async function deliverOne(db: Db, now: Date, transport: Transport): Promise<'none' | 'sent' | 'failed'> {
  // Claimed by noting the attempt first: if this process dies while it sends, the mail is tried again and never forgotten.
  const rested = or(isNull(mailOutbox.triedAt), lt(mailOutbox.triedAt, new Date(now.getTime() - RETRY_AFTER_MS)));
  const [mail] = await db
    .update(mailOutbox)
    .set({ attempts: sql`${mailOutbox.attempts} + 1`, triedAt: now })
    .where(
      eq(
        mailOutbox.id,
        db
          .select({ id: mailOutbox.id })
          .from(mailOutbox)
          .where(and(isNull(mailOutbox.sentAt), lt(mailOutbox.attempts, MAX_ATTEMPTS), rested))
          .orderBy(asc(mailOutbox.createdAt), asc(mailOutbox.id))
          .limit(1)
          .for('update', { skipLocked: true }),
      ),
    )
    .returning();
  if (mail === undefined) return 'none';
  try {
    await transport.send({ from: env().mailFrom, to: mail.recipient, subject: mail.subject, text: mail.text });
  } catch (error) {
    const failure = error instanceof Error ? error.message : String(error);
    await db.update(mailOutbox).set({ failure }).where(eq(mailOutbox.id, mail.id));
    return 'failed';
  }
  await db.update(mailOutbox).set({ sentAt: now, failure: null }).where(eq(mailOutbox.id, mail.id));
  return 'sent';
}
