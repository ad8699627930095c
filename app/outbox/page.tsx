import type { Metadata } from 'next';
import { headers } from 'next/headers';
import { notFound } from 'next/navigation';
import { MailList } from '@/components/auth/MailList';
import { Page } from '@/components/ui/Page';
import { outbox as words } from '@/lib/text/en/pages';
import { outboxMessages, outboxOpen } from '@/server/mail';
import { currentWho } from '@/server/session';

export const metadata: Metadata = { title: words.title, referrer: 'same-origin' };

export default async function OutboxPage() {
  if (!outboxOpen(await headers())) notFound();
  const [who, mails] = [await currentWho(), await outboxMessages()];
  return (
    <Page who={who?.name ?? null} title={words.title} lead={words.lead}>
      <MailList mails={mails} />
    </Page>
  );
}
