import { expect, type Page } from '@playwright/test';
import { auth } from '@/lib/text/en/pages';

/** Owner and designer, builder, reviewer, designer. */
export const DEMO_NAMES = ['Ines Okafor', 'Piet Lindqvist', 'Marguerite Adeyemi', 'Tomas Reyes'] as const;
export type DemoName = (typeof DEMO_NAMES)[number];

export interface DemoSignIn {
  readonly email: string;
  readonly password: string;
}

/** Reads the demo's sign-ins as a person would: from the file that the first start wrote. */
export function signInOf(name: DemoName, file = process.env.FOLDSPAR_E2E_SIGN_INS ?? ''): DemoSignIn {
  const line = file.split('\n').find((row) => row.startsWith(`${name}\t`));
  const [, email, password] = line?.split('\t') ?? [];
  if (email === undefined || password === undefined) throw new RangeError(`no demo sign-in for ${name}`);
  return { email, password };
}

/** Signs a demo person in through the page and waits until it leads on. */
export async function signIn(page: Page, name: DemoName): Promise<void> {
  const { email, password } = signInOf(name);
  await page.goto('/sign-in');
  await page.getByLabel(auth.email, { exact: true }).fill(email);
  await page.getByLabel(auth.password, { exact: true }).fill(password);
  await page.getByRole('button', { name: auth.signIn, exact: true }).click();
  await expect(page).not.toHaveURL(/sign-in/);
}
