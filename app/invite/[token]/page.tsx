import type { Metadata } from 'next';
import Link from 'next/link';
import { buttonClass } from '@/components/ui/Button';
import { Page } from '@/components/ui/Page';
import { AcceptInvitation } from '@/components/workshop/AcceptInvitation';
import { auth, invite as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { currentWho } from '@/server/session';

// The address holds a secret: no other site may learn it from a link followed on this page.
export const metadata: Metadata = { title: words.title, referrer: 'same-origin' };

export default async function InvitePage({ params }: { readonly params: Promise<{ token: string }> }) {
  const [{ token }, who] = [await params, await currentWho()];
  const query = { next: `/invite/${token}` };
  if (who === null) {
    return (
      <Page who={null} title={words.title} lead={words.lead} narrow>
        <p>{words.signedOut}</p>
        <div className="flex flex-wrap gap-3">
          <Link href={{ pathname: '/sign-in', query }} className={buttonClass('primary')}>
            {auth.signInTitle}
          </Link>
          <Link href={{ pathname: '/sign-up', query }} className={buttonClass('plain')}>
            {auth.signUpTitle}
          </Link>
        </div>
      </Page>
    );
  }
  return (
    <Page who={who.name} title={words.title} lead={words.lead} narrow>
      <p>{fill(words.as, { email: who.email })}</p>
      <AcceptInvitation token={token} />
      <p className="text-sm text-ink-soft">{words.other}</p>
    </Page>
  );
}
