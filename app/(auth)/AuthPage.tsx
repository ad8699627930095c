import { headers } from 'next/headers';
import Link from 'next/link';
import type { ReactNode } from 'react';
import { Page } from '@/components/ui/Page';
import { auth as words } from '@/lib/text/en/pages';
import { outboxOpen } from '@/server/mail';

interface AuthPageProps {
  readonly title: string;
  readonly lead?: string;
  /** This page sends a mail; where mails stay on this machine, say so. */
  readonly mails?: boolean;
  readonly children: ReactNode;
}

/** A narrow page with one form. */
export async function AuthPage({ title, lead, mails = false, children }: AuthPageProps) {
  const outbox = mails && outboxOpen(await headers());
  return (
    <Page who={null} title={title} lead={lead} narrow>
      {children}
      {outbox ? (
        <p className="text-sm text-ink-soft">
          {words.outbox} <Link href="/outbox">{words.openOutbox}</Link>
        </p>
      ) : null}
    </Page>
  );
}
