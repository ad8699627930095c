import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { ActionForm } from '@/components/auth/ActionForm';
import { nextPath } from '@/components/auth/nextPath';
import { Notice } from '@/components/ui/Notice';
import { auth as words } from '@/lib/text/en/pages';
import { currentWho } from '@/server/session';
import { AuthPage } from '../AuthPage';
import { signIn } from '../actions';
import { EMAIL, PASSWORD } from '../fields';
import { one, type Query } from '../query';

export const metadata: Metadata = { title: words.signInTitle };

export default async function SignInPage({ searchParams }: { readonly searchParams: Promise<Query> }) {
  const query = await searchParams;
  const next = one(query.next);
  if ((await currentWho()) !== null) redirect(nextPath(next));
  return (
    <AuthPage title={words.signInTitle}>
      {query.done === 'reset' ? <Notice tone="good" title={words.resetDone} /> : null}
      <ActionForm action={signIn} fields={[EMAIL, PASSWORD]} submit={words.signIn} hidden={{ next: nextPath(next) }} />
      <p className="flex flex-wrap gap-x-6 gap-y-2 text-sm">
        <Link href="/forgot">{words.forgotLink}</Link>
        <span>
          {words.noAccount}{' '}
          <Link href={{ pathname: '/sign-up', query: next === undefined ? {} : { next } }}>{words.signUpTitle}</Link>
        </span>
      </p>
    </AuthPage>
  );
}
