'use server';

import { APIError } from 'better-auth/api';
import { revalidatePath } from 'next/cache';
import { cookies, headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { type FormState, textOf } from '@/components/auth/formState';
import { PersonName } from '@/lib/contract/bodies';
import { lookFrom } from '@/lib/look/css';
import { auth as authWords, ui, account as words } from '@/lib/text/en/pages';
import { getAuth } from '@/server/auth';
import { requireWho } from '@/server/session';

const YEAR_SECONDS = 365 * 24 * 60 * 60;

export async function saveName(_: FormState, data: FormData): Promise<FormState> {
  await requireWho();
  const values = { name: textOf(data, 'name').trim() };
  if (values.name === '') return { values, fields: { name: ui.required } };
  if (!PersonName.safeParse(values.name).success) return { values, fields: { name: authWords.nameBad } };
  try {
    const auth = await getAuth();
    await auth.api.updateUser({ body: values, headers: await headers() });
  } catch (error) {
    if (!(error instanceof APIError)) throw error;
    return { values, fields: {}, message: { tone: 'bad', text: authWords.failed } };
  }
  revalidatePath('/', 'layout');
  return { values, fields: {}, message: { tone: 'good', text: words.saved } };
}

export async function endOtherSessions(): Promise<void> {
  await requireWho();
  const auth = await getAuth();
  await auth.api.revokeOtherSessions({ headers: await headers() });
  revalidatePath('/account');
}

export async function signOut(): Promise<void> {
  const auth = await getAuth();
  await auth.api.signOut({ headers: await headers() });
  redirect('/');
}

/** Kept in this browser alone; it says nothing about a person. */
export async function chooseLook(data: FormData): Promise<void> {
  const look = lookFrom(textOf(data, 'look'));
  const jar = await cookies();
  jar.set('look', look, { httpOnly: true, sameSite: 'lax', path: '/', maxAge: YEAR_SECONDS });
  revalidatePath('/', 'layout');
}
