import { readFile } from 'node:fs/promises';
import type { Locator, Page } from '@playwright/test';
import { header, save, sheet, slip } from '@/lib/text/en/board';
import { auth, designs, errors, members, release, revisions, ui, words, workshops } from '@/lib/text/en/pages';
import { threads, verdicts } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import {
  drag,
  expectSaved,
  expectWorkedOut,
  field,
  freshName,
  handle,
  startDesign,
  typedNumber,
  typeNumber,
} from '../support/board';
import { download } from '../support/plan';
import { openRevisions, openWorkshop } from '../support/story';
import { expect, test } from '../support/test';

// What is refused, and what a person is told then: at the field, in words, and nothing is lost.

const SPAN = 'Span, wing';
const ROOT = 'Root chord, wing';
const TIP = 'Tip chord, wing';

/** The field is marked as wrong and its description says why. */
async function expectRefused(wrong: Locator, why: string | RegExp): Promise<void> {
  const words = typeof why === 'string' ? new RegExp(why.replaceAll(/[.*+?^${}()|[\]\\]/g, '\\$&')) : why;
  await expect(wrong).toHaveAccessibleDescription(words);
  await expect(wrong).toHaveAttribute('aria-invalid', 'true');
}

const textbox = (page: Page, name: string) => page.getByRole('textbox', { name, exact: true });
const button = (page: Page, name: string) => page.getByRole('button', { name, exact: true });

test.describe('identity', () => {
  test('a sign-in says at each field what is missing, and of a wrong password only that the pair is wrong', async ({
    page,
  }) => {
    await page.goto('/sign-in');
    await button(page, auth.signIn).click();
    await expectRefused(textbox(page, auth.email), auth.notAnAddress);
    await expectRefused(textbox(page, auth.password), ui.required);
    const strangers = ['nobody.at.all@example.test', 'ines.okafor@example.test'];
    for (const email of strangers) {
      await textbox(page, auth.email).fill(email);
      await textbox(page, auth.password).fill('not the password of anybody');
      await button(page, auth.signIn).click();
      await expect(page.getByRole('alert').filter({ hasText: auth.wrong })).toBeVisible();
      await expect(textbox(page, auth.email)).toHaveValue(email);
      await expect(textbox(page, auth.password)).toHaveValue('');
    }
    await expect(page).toHaveURL(/sign-in/);
  });

  test('a new account needs a name, an address and a password that is long enough', async ({ page }) => {
    await page.goto('/sign-up');
    await textbox(page, auth.email).fill('ines.example.test');
    await textbox(page, auth.password).fill('short');
    await button(page, auth.signUp).click();
    await expectRefused(textbox(page, auth.name), ui.required);
    await expectRefused(textbox(page, auth.email), auth.notAnAddress);
    await expectRefused(textbox(page, auth.password), /at least \d+ characters/);
  });

  test('nobody gets past the door without signing in', async ({ page }) => {
    await page.goto('/w');
    await expect(page).toHaveURL(/\/sign-in$/);
    await expect(page.getByRole('heading', { level: 1, name: auth.signInTitle })).toBeVisible();
  });
});

test.describe('forms of a workshop', () => {
  test('a design without a name is not started', async ({ openAs }) => {
    const page = await openAs('Tomas Reyes');
    await openWorkshop(page);
    await button(page, designs.newDesign).click();
    await button(page, designs.make).click();
    await expectRefused(textbox(page, designs.name), ui.required);
  });

  test('an invitation needs an address and a role, and is not sent without', async ({ openAs }) => {
    const page = await openAs('Ines Okafor');
    await openWorkshop(page);
    await page.getByRole('link', { name: designs.members, exact: true }).click();
    const email = textbox(page, members.inviteEmail);
    await email.fill('builder at the field');
    await page
      .getByRole('group', { name: members.roles, exact: true })
      .getByRole('checkbox', { checked: true })
      .uncheck();
    await button(page, members.inviteSend).click();
    await expectRefused(email, auth.notAnAddress);
    await expectRefused(page.getByRole('group', { name: members.roles, exact: true }), members.pickRole);
    await expect(page.getByText(members.noInvitations)).toBeVisible();
  });

  test('a revision is not released without its reason and the effect expected', async ({ openAs }) => {
    const page = await openAs('Ines Okafor');
    const name = 'Quenlet 700';
    await openRevisions(page, name);
    await page.getByRole('link', { name: revisions.release, exact: true }).click();
    await textbox(page, release.effect).fill('   ');
    await button(page, fill(release.submit, { number: 1 })).click();
    await expectRefused(textbox(page, release.reason), ui.required);
    await expectRefused(textbox(page, release.effect), ui.required);
    await page.goBack();
    await expect(page.getByText(revisions.empty)).toBeVisible();
  });

  test('a hold has to say what must change first', async ({ openAs }) => {
    const page = await openAs('Marguerite Adeyemi');
    await openWorkshop(page);
    await page.getByRole('link', { name: `${fill(designs.review, { number: 1 })}: Ombry 1000`, exact: true }).click();
    await page.getByRole('radio', { name: new RegExp(`^${verdicts.hold.label}`) }).check();
    await button(page, verdicts.submit).click();
    await expectRefused(textbox(page, verdicts.noteHold), /what has to change first/);
    await expect(page.getByText(words.held, { exact: true })).toHaveCount(0);
  });

  test('an empty comment is not pinned', async ({ openAs }) => {
    const page = await openAs('Marguerite Adeyemi');
    await openWorkshop(page);
    await page.getByRole('link', { name: `${fill(designs.review, { number: 1 })}: Ombry 1000`, exact: true }).click();
    await page.getByRole('combobox', { name: threads.about }).selectOption({ index: 1 });
    await button(page, threads.pin).click();
    await expectRefused(textbox(page, threads.text), threads.emptyText);
    await expect(page.getByText(threads.none)).toBeVisible();
  });
});

test.describe('numbers on the board', () => {
  const WRONG = [
    { label: ROOT, typed: '-50', says: 'a chord under that cannot be cut', keeps: '190' },
    { label: ROOT, typed: 'wide', says: fill(slip.notNumber, { example: '190' }), keeps: '190' },
    { label: ROOT, typed: 'NaN', says: fill(slip.notNumber, { example: '190' }), keeps: '190' },
    { label: ROOT, typed: '', says: fill(slip.notNumber, { example: '190' }), keeps: '190' },
    { label: ROOT, typed: '4000', says: 'the largest sheet of', keeps: '190' },
    { label: SPAN, typed: '10000', says: 'this sheet holds its shape up to', keeps: '700' },
    {
      label: 'Outer end of aileron, wing',
      typed: '40',
      says: 'the shortest that can be cut and hinged',
      keeps: '94',
    },
  ] as const;

  test('a number that cannot stand is refused at its field with the reason, and the aircraft stays as it was', async ({
    openAs,
  }) => {
    const page = await openAs('Tomas Reyes');
    await openWorkshop(page);
    await startDesign(page, /^Twin-boom pusher/, freshName('Dunlin'));
    await expectWorkedOut(page);
    for (const { label, typed, says, keeps } of WRONG) {
      await typeNumber(page, label, typed);
      await expectRefused(field(page, label), says);
      await expect(field(page, label)).toHaveAccessibleDescription(new RegExp(`It stays at ${keeps}`));
      await expect(field(page, label)).toHaveValue(keeps);
    }
    await expect(button(page, header.undo)).toBeDisabled();
    await expectSaved(page);
    await typeNumber(page, ROOT, '185');
    await expect(field(page, ROOT)).not.toHaveAttribute('aria-invalid', 'true');
    await expect(field(page, ROOT)).toHaveValue('185');
  });

  test('a handle that goes no further says why', async ({ openAs }) => {
    const page = await openAs('Tomas Reyes');
    await openWorkshop(page);
    await startDesign(page, /^Twin-boom pusher/, freshName('Knot'));
    await expectWorkedOut(page);
    const drawing = page.getByRole('region', { name: sheet.region, exact: true });
    await drag(page, handle(page, 'Outer end of aileron, wing'), [0, 400]);
    const why = drawing.getByRole('status').filter({ hasText: 'the shortest that can be cut and hinged' });
    await expect(why).toBeVisible();
    expect(await typedNumber(page, 'Outer end of aileron, wing')).toBeGreaterThan(50);
  });
});

test('of two people at one draft the later save is refused, and nothing of either is lost', async ({
  openAs,
  complaints,
}) => {
  const first = await openAs('Tomas Reyes');
  await openWorkshop(first);
  await startDesign(first, /^Twin-boom pusher/, freshName('Godwit'));
  await expectWorkedOut(first);
  const second = await openAs('Ines Okafor');
  await second.goto(first.url());
  await expectWorkedOut(second);

  complaints.expectOne(/412/);
  await drag(first, handle(first, SPAN), [0, -40], async () => {
    await typeNumber(second, TIP, '140');
    await expectSaved(second);
  });
  const mine = await field(first, SPAN).inputValue();
  expect(mine).not.toBe('700');
  await expect(first.getByRole('alert').filter({ hasText: fill(save.stale, { by: 'Ines Okafor' }) })).toBeVisible();
  await expect(first.getByText(save.staleShort, { exact: true })).toBeVisible();
  await expect(field(first, SPAN)).toHaveValue(mine);
  await expect(field(first, TIP)).toHaveValue('150');

  await test.step('the refused draft can be taken away as a file', async () => {
    const { path } = await download(first, () => button(first, save.downloadMine).click());
    const kept: { surfaces: { id: string; panels: { lengthMm: number }[] }[] } = JSON.parse(
      await readFile(path, 'utf8'),
    );
    const wing = kept.surfaces.find(({ id }) => id === 'wing');
    expect(2 * (wing?.panels[0]?.lengthMm ?? 0)).toBeCloseTo(Number(mine), 6);
  });
  await test.step('the newer draft is taken, and undo brings the refused one back', async () => {
    await button(first, save.takeTheirs).click();
    await expect(field(first, TIP)).toHaveValue('140');
    await expect(field(first, SPAN)).toHaveValue('700');
    await button(first, header.undo).click();
    await expect(field(first, SPAN)).toHaveValue(mine);
    await expect(field(first, TIP)).toHaveValue('150');
    await expectSaved(first);
  });
  await test.step('the other board shows what was saved last, and says whose it is', async () => {
    await expect(field(second, SPAN)).toHaveValue(mine);
    await expect(second.getByText(fill(save.newer, { by: 'Tomas Reyes' }))).toBeVisible();
    await button(second, header.undo).click();
    await expect(field(second, TIP)).toHaveValue('140');
  });
});

for (const { who, mayPrint } of [
  { who: 'Marguerite Adeyemi', mayPrint: false },
  { who: 'Piet Lindqvist', mayPrint: true },
] as const)
  test(`${who}, who designs nothing, sees the board and cannot change it`, async ({ openAs }) => {
    const page = await openAs(who);
    await openWorkshop(page);
    await expect(button(page, designs.newDesign)).toHaveCount(0);
    await page.getByRole('link', { name: `${designs.look}: Tarrel 620`, exact: true }).click();
    await expectWorkedOut(page);
    await expect(page.getByRole('status').filter({ hasText: header.readOnly })).toBeVisible();
    await expect(page.getByText(slip.readOnly)).toBeVisible();
    await expect(page.getByRole('slider')).toHaveCount(0);
    await expect(button(page, header.undo)).toHaveCount(0);
    await expect(page.getByRole('link', { name: header.release, exact: true })).toHaveCount(0);
    await expect(page.getByRole('link', { name: header.print, exact: true })).toHaveCount(mayPrint ? 1 : 0);
    const span = page.getByRole('textbox', { name: /^Span, / });
    const before = await span.inputValue();
    expect(Number(before)).toBe(620);
    await expect(span).not.toBeEditable();
    await span.press('ArrowUp');
    await span.press('Enter');
    await expect(span).toHaveValue(before);
    await page.goto(`${page.url()}/release`);
    await expect(page.getByText(release.notYours)).toBeVisible();
    await expect(textbox(page, release.reason)).toHaveCount(0);
  });

test('another workshop is as if it were not there, whatever the address', async ({ openAs, complaints }) => {
  const owner = await openAs('Tomas Reyes');
  const name = freshName('Shed');
  await textbox(owner, workshops.name).fill(name);
  await button(owner, workshops.made).click();
  await expect(owner.getByRole('heading', { level: 1, name, exact: true })).toBeVisible();
  const address = new URL(owner.url()).pathname;

  const stranger = await openAs('Marguerite Adeyemi');
  await expect(stranger.getByRole('link', { name: new RegExp(name) })).toHaveCount(0);
  const nowhere = '/w/00000000-0000-4000-8000-000000000000';
  for (const path of [address, `${address}/members`, nowhere, '/w/not-an-id', `${address}/d/x`, `${address}/d/x/r/1`]) {
    complaints.expectOne(/404/);
    const answer = await stranger.goto(path);
    expect(answer?.status(), path).toBe(404);
    await expect(stranger.getByRole('heading', { level: 1, name: errors.notFoundTitle })).toBeVisible();
    await expect(stranger.getByText(name)).toHaveCount(0);
  }
  await stranger.getByRole('link', { name: errors.toWorkshops, exact: true }).click();
  await expect(stranger.getByRole('heading', { level: 1, name: workshops.title })).toBeVisible();
});
