import { auth, front } from '@/lib/text/en/pages';
import { expectSoundPage } from './support/page';
import { signIn } from './support/people';
import { expect, test } from './support/test';

test('the front page answers, says what it is for and is sound', async ({ page }) => {
  await page.goto('/');
  await expect(page.getByRole('heading', { level: 1, name: front.title })).toBeVisible();
  await expectSoundPage(page);
});

for (const path of ['/sign-in', '/sign-up', '/forgot'])
  test(`${path} is sound`, async ({ page }) => {
    await page.goto(path);
    await expectSoundPage(page);
  });

test('a page is sent with a policy whose nonce is never the same', async ({ page }) => {
  const policies: string[] = [];
  for (let visit = 0; visit < 2; visit += 1) {
    const response = await page.goto('/');
    const headers = response?.headers() ?? {};
    policies.push(headers['content-security-policy'] ?? '');
    expect(headers).toMatchObject({ 'x-content-type-options': 'nosniff', 'referrer-policy': 'same-origin' });
    // Sent over plain http it would promise what this server cannot keep.
    expect(headers['strict-transport-security']).toBeUndefined();
  }
  for (const policy of policies) {
    expect(policy).toMatch(/script-src 'self' 'nonce-[A-Za-z0-9+/=]{20,}' 'strict-dynamic';/);
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toContain('unsafe-eval');
  }
  expect(new Set(policies).size).toBe(2);
});

test('a script that the page did not bring does not run', async ({ page, complaints }) => {
  await page.goto('/');
  const ran = await page.evaluate(() => {
    document.body.insertAdjacentHTML(
      'beforeend',
      '<img alt="" src="data:," onerror="document.documentElement.dataset.ran = \'yes\'">',
    );
    return new Promise<string | undefined>((done) => {
      requestAnimationFrame(() => requestAnimationFrame(() => done(document.documentElement.dataset.ran)));
    });
  });
  expect(ran).toBeUndefined();
  await expect.poll(() => complaints.seen.length).toBeGreaterThan(0);
  complaints.expectOne(/content security policy/i);
});

test('a demo person signs in and a wrong password does not', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByLabel(auth.email, { exact: true }).fill('ines.okafor@example.test');
  await page.getByLabel(auth.password, { exact: true }).fill('not the password of anybody');
  await page.getByRole('button', { name: auth.signIn, exact: true }).click();
  await expect(page.getByText(auth.wrong)).toBeVisible();
  await signIn(page, 'Ines Okafor');
  await expectSoundPage(page);
});
