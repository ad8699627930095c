import { eq } from 'drizzle-orm';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { mailOutbox } from '@/db/schema';
import { newId } from '@/server/context';
import { deliverMail, outboxOpen, queueMail, type Transport } from '@/server/mail';
import { rolledBack } from '../support/db';
import { NOW } from '../support/people';

vi.stubEnv('FOLDSPAR_SECRET', 'a secret for tests that protects nothing at all');

const mail = (recipient: string) => ({ kind: 'verify' as const, recipient, subject: 'S', text: 'T' });
const later = (seconds: number): Date => new Date(NOW.getTime() + seconds * 1000);

describe('the outbox', () => {
  it('is sent once, oldest first, and what fails is tried again later and not at once', () =>
    rolledBack(async (tx) => {
      await queueMail(tx, { now: NOW, newId }, mail('first@example.test'));
      await queueMail(tx, { now: later(1), newId }, mail('second@example.test'));
      const sent: string[] = [];
      let broken = true;
      const transport: Transport = {
        send: async ({ to }) => {
          if (to === 'first@example.test' && broken) throw new Error('450 mailbox busy');
          sent.push(to);
        },
      };
      expect(await deliverMail(tx, later(2), transport)).toBe(1);
      expect(sent).toEqual(['second@example.test']);
      const [failed] = await tx.select().from(mailOutbox).where(eq(mailOutbox.recipient, 'first@example.test'));
      expect(failed).toMatchObject({ sentAt: null, attempts: 1, failure: '450 mailbox busy' });
      broken = false;
      expect(await deliverMail(tx, later(30), transport)).toBe(0);
      expect(await deliverMail(tx, later(63), transport)).toBe(1);
      expect(await deliverMail(tx, later(300), transport)).toBe(0);
      expect(sent).toEqual(['second@example.test', 'first@example.test']);
    }));

  it('is left as it is while no mail server is configured', () =>
    rolledBack(async (tx) => {
      await queueMail(tx, { now: NOW, newId }, mail('waits@example.test'));
      expect(await deliverMail(tx, NOW)).toBe(0);
      expect(await tx.select().from(mailOutbox)).toMatchObject([{ sentAt: null, attempts: 0 }]);
    }));
});

describe('reading the outbox on a page', () => {
  afterEach(() => {
    vi.unstubAllEnvs();
    vi.stubEnv('FOLDSPAR_SECRET', 'a secret for tests that protects nothing at all');
  });
  const from = (headers: Record<string, string>) => outboxOpen(new Headers(headers));

  it('is for this machine only', () => {
    vi.stubEnv('HOST', '127.0.0.1');
    expect(from({ host: 'localhost:3000', 'x-forwarded-for': '127.0.0.1' })).toBe(true);
    expect(from({ host: '127.0.0.1:3000', 'x-forwarded-for': '::ffff:127.0.0.1' })).toBe(true);
    expect(from({ host: 'foldspar.example', 'x-forwarded-for': '127.0.0.1' })).toBe(false);
    expect(from({ host: 'localhost:3000', 'x-forwarded-for': '203.0.113.5, 127.0.0.1' })).toBe(false);
    expect(from({ host: 'localhost.example:3000' })).toBe(false);
    expect(from({})).toBe(false);
  });

  it('is closed behind a proxy, even one that makes every visitor look local', () => {
    vi.stubEnv('HOST', '127.0.0.1');
    const local = { host: '127.0.0.1:3000', 'x-forwarded-for': '127.0.0.1' };
    expect(from({ ...local, via: '1.1 front' })).toBe(false);
    expect(from({ ...local, forwarded: 'for=203.0.113.5' })).toBe(false);
    expect(from({ ...local, 'x-real-ip': '203.0.113.5' })).toBe(false);
    vi.stubEnv('FOLDSPAR_URL', 'https://plans.example');
    expect(from(local)).toBe(false);
    vi.stubEnv('FOLDSPAR_URL', 'http://localhost:3000');
    expect(from(local)).toBe(true);
  });

  it('is closed when others can reach the server, whatever they send, and once mail goes out', () => {
    vi.stubEnv('HOST', '0.0.0.0');
    expect(from({ host: 'localhost:3000', 'x-forwarded-for': '127.0.0.1' })).toBe(false);
    vi.stubEnv('HOST', '127.0.0.1');
    vi.stubEnv('SMTP_URL', 'smtp://127.0.0.1:2525');
    expect(from({ host: 'localhost:3000', 'x-forwarded-for': '127.0.0.1' })).toBe(false);
  });
});
