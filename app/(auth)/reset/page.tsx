import type { Metadata } from 'next';
import Link from 'next/link';
import { ActionForm } from '@/components/auth/ActionForm';
import { Notice } from '@/components/ui/Notice';
import { auth as words } from '@/lib/text/en/pages';
import { AuthPage } from '../AuthPage';
import { reset } from '../actions';
import { NEW_PASSWORD } from '../fields';
import { one, type Query } from '../query';

// The address holds a secret: no other site may learn it from a link followed on this page.
export const metadata: Metadata = { title: words.resetTitle, referrer: 'same-origin' };

export default async function ResetPage({ searchParams }: { readonly searchParams: Promise<Query> }) {
  const token = one((await searchParams).token);
  return (
    <AuthPage title={words.resetTitle}>
      {token === undefined ? (
        <Notice tone="bad" title={words.resetBad} />
      ) : (
        <ActionForm action={reset} fields={[NEW_PASSWORD]} submit={words.reset} hidden={{ token }} />
      )}
      <p className="text-sm">
        <Link href="/forgot">{words.forgotTitle}</Link>
      </p>
    </AuthPage>
  );
}
