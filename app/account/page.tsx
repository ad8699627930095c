import type { Metadata } from 'next';
import { ActionForm } from '@/components/auth/ActionForm';
import { LookForm } from '@/components/auth/LookForm';
import { SessionList } from '@/components/auth/SessionList';
import { Button } from '@/components/ui/Button';
import { Page, Section } from '@/components/ui/Page';
import { account as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { chooseLook, endOtherSessions, saveName, signOut } from './actions';
import { accountPage } from './loaders';

export const metadata: Metadata = { title: words.title };

export default async function AccountPage() {
  const { who, sessions, look } = await accountPage();
  const name = {
    name: 'name',
    label: words.name,
    type: 'text',
    autoComplete: 'name',
    maxLength: 80,
    value: who.name,
  } as const;
  const signOutForm = (
    <form action={signOut}>
      <Button type="submit">{words.signOut}</Button>
    </form>
  );
  return (
    <Page
      who={who.name}
      title={words.title}
      lead={fill(words.signedInAs, { email: who.email })}
      aside={signOutForm}
      narrow
    >
      <Section title={words.name}>
        <ActionForm action={saveName} fields={[name]} submit={words.save} weight="plain" />
      </Section>
      <Section title={words.look}>
        <LookForm look={look} action={chooseLook} />
      </Section>
      <Section title={words.sessions}>
        <p className="text-ink-soft">{words.sessionsLead}</p>
        <SessionList sessions={sessions} />
        {sessions.length > 1 ? (
          <form action={endOtherSessions}>
            <Button type="submit" weight="danger">
              {words.endOthers}
            </Button>
          </form>
        ) : null}
      </Section>
    </Page>
  );
}
