import { tryOut } from '@/lib/text/en/board';
import { auth, front, workshops } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { areaOf, drag, expectSaved, expectWorkedOut, field, figureShown, handle, typeNumber } from './support/board';
import { signIn } from './support/people';
import { openWorkshop } from './support/story';
import { expect, test } from './support/test';

const SPAN = 'Span, wing';
const LAYOUT = 'Twin-boom pusher';

test('a visitor shapes an aircraft without an account, and it is still there on the next visit', async ({ page }) => {
  await page.goto('/');
  await page.getByRole('link', { name: front.tryBoard, exact: true }).click();
  await page.getByRole('button', { name: new RegExp(`^${LAYOUT}`) }).click();
  await expect(page.getByRole('heading', { level: 1, name: LAYOUT, exact: true })).toBeVisible();
  await expect(page.getByText(tryOut.lead)).toBeVisible();
  await expect(page.getByRole('status').filter({ hasText: tryOut.kept })).toBeVisible();
  await expectWorkedOut(page);

  await drag(page, handle(page, SPAN), [0, -24]);
  await expect(field(page, SPAN)).not.toHaveValue('700');
  await typeNumber(page, SPAN, '744');
  const wing = { spanMm: 744, rootMm: 190, tipMm: 150 };
  await expect.poll(() => figureShown(page, 'wingAreaDm2')).toBeCloseTo(areaOf(wing), 1.99);

  await page.reload();
  await page.getByRole('button', { name: fill(tryOut.goOn, { name: LAYOUT }), exact: true }).click();
  await expect(field(page, SPAN)).toHaveValue('744');
  await page.getByRole('link', { name: tryOut.signUp, exact: true }).click();
  await expect(page.getByRole('heading', { level: 1, name: auth.signUpTitle })).toBeVisible();
});

test('what was drawn without an account comes along into the workshop', async ({ page }) => {
  await page.goto('/try');
  await page.getByRole('button', { name: new RegExp(`^${LAYOUT}`) }).click();
  await expectWorkedOut(page);
  await typeNumber(page, SPAN, '756');
  await expect(field(page, SPAN)).toHaveValue('756');

  await signIn(page, 'Tomas Reyes');
  await expect(page.getByRole('heading', { level: 1, name: workshops.title })).toBeVisible();
  await openWorkshop(page);
  await page.getByRole('button', { name: tryOut.bringYes, exact: true }).click();
  await expect(page).toHaveURL(/\/d\/[^/]+$/);
  await expect(field(page, SPAN)).toHaveValue('756');
  await expectSaved(page);
  await page.goBack();
  await expect(page.getByRole('link', { name: LAYOUT, exact: true }).first()).toBeVisible();
  await expect(page.getByRole('button', { name: tryOut.bringYes, exact: true })).toHaveCount(0);
});
