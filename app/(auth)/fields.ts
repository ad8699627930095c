import type { FieldSpec } from '@/components/auth/ActionForm';
import { auth as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { PASSWORD_MAX, PASSWORD_MIN } from '@/server/auth/password';

export const EMAIL: FieldSpec = {
  name: 'email',
  label: words.email,
  type: 'email',
  autoComplete: 'email',
  maxLength: 254,
};
export const NAME: FieldSpec = {
  name: 'name',
  label: words.name,
  type: 'text',
  autoComplete: 'name',
  hint: words.nameHint,
  maxLength: 80,
};
export const PASSWORD: FieldSpec = {
  name: 'password',
  label: words.password,
  type: 'password',
  autoComplete: 'current-password',
  maxLength: PASSWORD_MAX,
};
export const NEW_PASSWORD: FieldSpec = {
  ...PASSWORD,
  label: words.newPassword,
  autoComplete: 'new-password',
  hint: fill(words.passwordHint, { min: PASSWORD_MIN }),
};
