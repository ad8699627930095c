'use server';

import { APIError } from 'better-auth/api';
import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { type FormState, textOf } from '@/components/auth/formState';
import { nextPath } from '@/components/auth/nextPath';
import { PersonName } from '@/lib/contract/bodies';
import { ui, auth as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { getAuth } from '@/server/auth';
import { PASSWORD_MAX, PASSWORD_MIN } from '@/server/auth/password';
import { logRefusal } from '@/server/http/refuse';
import { originOf } from '@/server/origin';

// Forms of identity. No answer tells whether an address has an account; only who knows the password learns more.

const Email = z.email().max(254);

const refused = (values: FormState['values'], fields: FormState['fields']): FormState => ({ values, fields });
const failed = (values: FormState['values'], text: string): FormState => ({
  values,
  fields: {},
  message: { tone: 'bad', text },
});

const emailFault = (email: string): string | undefined =>
  Email.safeParse(email).success ? undefined : words.notAnAddress;

const nameFault = (name: string): string | undefined => {
  if (name === '') return ui.required;
  return PersonName.safeParse(name).success ? undefined : words.nameBad;
};

const passwordLengthFault = (password: string): string | undefined => {
  if (password.length < PASSWORD_MIN) return fill(words.short, { min: PASSWORD_MIN });
  return password.length > PASSWORD_MAX ? fill(words.long, { max: PASSWORD_MAX }) : undefined;
};

/** Only those that say something. */
const faults = (all: Readonly<Record<string, string | undefined>>): Record<string, string> =>
  Object.fromEntries(Object.entries(all).flatMap(([name, text]) => (text === undefined ? [] : [[name, text]])));

/** What identity needs to know of the request: who asks, and where this server is reached. */
async function asked(path: string) {
  const requestHeaders = await headers();
  const origin = originOf(requestHeaders) ?? 'http://127.0.0.1';
  const request = new Request(`${origin}/api/auth${path}`, { method: 'POST', headers: requestHeaders });
  // With a request at hand, refusals would come back as responses instead of being thrown.
  return { headers: requestHeaders, request, asResponse: false as const };
}

const codeOf = (error: APIError): string => error.body?.code ?? '';

export async function signIn(_: FormState, data: FormData): Promise<FormState> {
  const values = { email: textOf(data, 'email').trim() };
  const password = textOf(data, 'password');
  const wrong = faults({ email: emailFault(values.email), password: password === '' ? ui.required : undefined });
  if (Object.keys(wrong).length > 0) return refused(values, wrong);
  const auth = await getAuth();
  try {
    await auth.api.signInEmail({ body: { email: values.email, password }, ...(await asked('/sign-in/email')) });
  } catch (error) {
    if (!(error instanceof APIError)) throw error;
    logRefusal('/sign-in', { status: error.statusCode, code: codeOf(error) });
    if (error.statusCode === 429) return failed(values, error.body?.message ?? words.tooMany);
    if (codeOf(error) === 'EMAIL_NOT_VERIFIED') return failed(values, words.notConfirmed);
    return failed(values, error.statusCode === 401 ? words.wrong : words.failed);
  }
  redirect(nextPath(textOf(data, 'next')));
}

export async function signUp(_: FormState, data: FormData): Promise<FormState> {
  const values = { name: textOf(data, 'name').trim(), email: textOf(data, 'email').trim() };
  const password = textOf(data, 'password');
  const wrong = faults({
    name: nameFault(values.name),
    email: emailFault(values.email),
    password: passwordLengthFault(password),
  });
  if (Object.keys(wrong).length > 0) return refused(values, wrong);
  const auth = await getAuth();
  try {
    const body = { ...values, password, callbackURL: nextPath(textOf(data, 'next')) };
    await auth.api.signUpEmail({ body, ...(await asked('/sign-up/email')) });
  } catch (error) {
    if (!(error instanceof APIError)) throw error;
    logRefusal('/sign-up', { status: error.statusCode, code: codeOf(error) });
    if (error.statusCode === 429) return failed(values, words.tooMany);
    if (codeOf(error).startsWith('PASSWORD_'))
      return refused(values, { password: error.body?.message ?? words.failed });
    return failed(values, words.failed);
  }
  redirect('/verify-sent');
}

export async function forgot(_: FormState, data: FormData): Promise<FormState> {
  const values = { email: textOf(data, 'email').trim() };
  const email = emailFault(values.email);
  if (email !== undefined) return refused(values, { email });
  const auth = await getAuth();
  try {
    await auth.api.requestPasswordReset({ body: values, ...(await asked('/request-password-reset')) });
  } catch (error) {
    if (!(error instanceof APIError)) throw error;
    logRefusal('/forgot', { status: error.statusCode, code: codeOf(error) });
    return failed(values, error.statusCode === 429 ? words.tooMany : words.failed);
  }
  return { values, fields: {}, message: { tone: 'good', text: words.forgotSent } };
}

export async function reset(_: FormState, data: FormData): Promise<FormState> {
  const newPassword = textOf(data, 'password');
  const password = passwordLengthFault(newPassword);
  if (password !== undefined) return refused({}, { password });
  const auth = await getAuth();
  try {
    const body = { newPassword, token: textOf(data, 'token') };
    await auth.api.resetPassword({ body, ...(await asked('/reset-password')) });
  } catch (error) {
    if (!(error instanceof APIError)) throw error;
    logRefusal('/reset', { status: error.statusCode, code: codeOf(error) });
    if (error.statusCode === 429) return failed({}, words.tooMany);
    if (codeOf(error).startsWith('PASSWORD_')) return refused({}, { password: error.body?.message ?? words.failed });
    return failed({}, words.resetBad);
  }
  redirect('/sign-in?done=reset');
}
