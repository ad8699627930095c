import { desc } from 'drizzle-orm';
import { getDb } from '@/db/client';
import { mailOutbox } from '@/db/schema';
import { env } from '../env';
import { isLoopbackHost } from '../origin';

/** The newest mails shown; older ones stay in the table. */
const SHOWN = 100;
const LOOPBACK_ADDRESS = /^(127(\.\d{1,3}){3}|::1|::ffff:127(\.\d{1,3}){3})$/;

export interface OutboxMessage {
  readonly id: string;
  readonly recipient: string;
  readonly kind: string;
  readonly subject: string;
  readonly text: string;
  /** ISO 8601, UTC. */
  readonly createdAt: string;
}

/** What a reverse proxy adds of itself. X-Forwarded-Host and -Proto are no sign: the framework writes those too. */
const PROXY_SIGNS = ['forwarded', 'via', 'x-real-ip'];

/**
 * Whether mails may be read on the page: only while no SMTP server is configured, the server has no public address and listens on
 * this machine alone, and the request was made on it. They hold links that sign people in. A proxy on this machine that passes on
 * neither the visitor's Host nor their address looks like a visitor on it; with FOLDSPAR_URL set the page is closed to all.
 */
export function outboxOpen(headers: Headers): boolean {
  const { smtpUrl, host, url } = env();
  if (smtpUrl !== null || !(isLoopbackHost(host) || LOOPBACK_ADDRESS.test(host))) return false;
  if (url !== null && !isLoopbackHost(new URL(url).host)) return false;
  if (PROXY_SIGNS.some((name) => headers.has(name))) return false;
  if (!isLoopbackHost(headers.get('host') ?? '')) return false;
  const forwarded = headers.get('x-forwarded-for');
  return forwarded === null || forwarded.split(',').every((address) => LOOPBACK_ADDRESS.test(address.trim()));
}

/** The newest first. Ask `outboxOpen` before. */
export async function outboxMessages(): Promise<OutboxMessage[]> {
  const db = await getDb();
  const rows = await db.select().from(mailOutbox).orderBy(desc(mailOutbox.createdAt), desc(mailOutbox.id)).limit(SHOWN);
  return rows.map((row) => ({
    id: row.id,
    recipient: row.recipient,
    kind: row.kind,
    subject: row.subject,
    text: row.text,
    createdAt: row.createdAt.toISOString(),
  }));
}
