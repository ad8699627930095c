import type { Metadata } from 'next';
import { LinkButton } from '@/components/ui/Button';
import { auth as words } from '@/lib/text/en/pages';
import { AuthPage } from '../AuthPage';

export const metadata: Metadata = { title: words.verifyTitle };

export default function VerifySentPage() {
  return (
    <AuthPage title={words.verifyTitle} lead={words.verifyLead} mails>
      <p className="text-ink-soft">{words.verifyNothing}</p>
      <div>
        <LinkButton href="/sign-in">{words.signInTitle}</LinkButton>
      </div>
    </AuthPage>
  );
}
