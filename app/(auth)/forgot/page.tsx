import type { Metadata } from 'next';
import { ActionForm } from '@/components/auth/ActionForm';
import { auth as words } from '@/lib/text/en/pages';
import { AuthPage } from '../AuthPage';
import { forgot } from '../actions';
import { EMAIL } from '../fields';

export const metadata: Metadata = { title: words.forgotTitle };

export default function ForgotPage() {
  return (
    <AuthPage title={words.forgotTitle} lead={words.forgotLead} mails>
      <ActionForm action={forgot} fields={[EMAIL]} submit={words.forgot} />
    </AuthPage>
  );
}
