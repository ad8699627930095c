import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { ActionForm } from '@/components/auth/ActionForm';
import { nextPath } from '@/components/auth/nextPath';
import { auth as words } from '@/lib/text/en/pages';
import { currentWho } from '@/server/session';
import { AuthPage } from '../AuthPage';
import { signUp } from '../actions';
import { EMAIL, NAME, NEW_PASSWORD } from '../fields';
import { one, type Query } from '../query';

export const metadata: Metadata = { title: words.signUpTitle };

export default async function SignUpPage({ searchParams }: { readonly searchParams: Promise<Query> }) {
  const next = one((await searchParams).next);
  if ((await currentWho()) !== null) redirect(nextPath(next));
  const fields = [NAME, EMAIL, { ...NEW_PASSWORD, label: words.password }];
  return (
    <AuthPage title={words.signUpTitle} mails>
      <ActionForm action={signUp} fields={fields} submit={words.signUp} hidden={{ next: nextPath(next) }} />
      <p className="text-sm">
        {words.haveAccount}{' '}
        <Link href={{ pathname: '/sign-in', query: next === undefined ? {} : { next } }}>{words.signInTitle}</Link>
      </p>
    </AuthPage>
  );
}
