import type { Page } from '@playwright/test';
import { figures, header, keys } from '@/lib/text/en/board';
import { auth, designs, errors, members } from '@/lib/text/en/pages';
import { expectWorkedOut } from './support/board';
import { expectSoundPage } from './support/page';
import { pagesOnDisk, test, type Viewer } from './support/places';
import { expect } from './support/test';

// Every page as everybody who may see it sees it, at every size and in either light: one main heading, no sideways
// scrolling, no word in the console, nothing that axe finds against WCAG A and AA.

const BOARD = '/w/[workshop]/d/[design]';
/** Owner and designer, builder, reviewer: between them they hold every role. */
const EVERY_ROLE = ['Ines Okafor', 'Piet Lindqvist', 'Marguerite Adeyemi'] as const satisfies readonly Viewer[];

/** A new page has to be entered here, with those who see something of their own on it. */
const SEEN_BY: Readonly<Record<string, readonly Viewer[]>> = {
  '/': ['nobody', 'Ines Okafor'],
  '/account': ['Piet Lindqvist'],
  '/forgot': ['nobody'],
  '/invite/[token]': ['nobody', 'Piet Lindqvist'],
  '/outbox': ['nobody', 'Ines Okafor'],
  '/reset': ['nobody'],
  '/sign-in': ['nobody'],
  '/sign-up': ['nobody'],
  '/try': ['nobody'],
  '/verify-sent': ['nobody'],
  '/w': EVERY_ROLE,
  '/w/[workshop]': EVERY_ROLE,
  [BOARD]: EVERY_ROLE,
  [`${BOARD}/print`]: EVERY_ROLE,
  [`${BOARD}/r/[number]`]: EVERY_ROLE,
  [`${BOARD}/r/[number]/figures`]: EVERY_ROLE,
  [`${BOARD}/r/[number]/parts`]: EVERY_ROLE,
  [`${BOARD}/r/[number]/print`]: EVERY_ROLE,
  [`${BOARD}/r/[number]/set-up`]: EVERY_ROLE,
  [`${BOARD}/release`]: EVERY_ROLE,
  [`${BOARD}/revisions`]: EVERY_ROLE,
  '/w/[workshop]/members': [...EVERY_ROLE, 'Tomas Reyes'],
};

/** What has to stand on a page before it is whole, where that comes later than the title. */
const WHOLE: Readonly<Record<string, (page: Page, viewer: Viewer) => Promise<void>>> = {
  [BOARD]: expectWorkedOut,
  [`${BOARD}/r/[number]/print`]: (page) => counted(page),
  [`${BOARD}/print`]: async (page, viewer) => {
    if (viewer !== 'Marguerite Adeyemi') await counted(page);
  },
};

const counted = (page: Page) => expect(page.getByText(/^\d+ pages on A4$/)).toBeVisible({ timeout: 60_000 });

test('every page is among those that are looked at', () => {
  expect(Object.keys(SEEN_BY).sort()).toEqual(pagesOnDisk());
});

/** What differs between viewers differs alike at every size and in either light: each is met once with them. */
const FURTHER_VIEWER = '@further-viewer';

for (const [pattern, viewers] of Object.entries(SEEN_BY))
  for (const [index, viewer] of viewers.entries())
    test(`${pattern} is sound for ${viewer}`, { tag: index === 0 ? [] : [FURTHER_VIEWER] }, async ({ visit }) => {
      const page = await visit(pattern, viewer);
      await WHOLE[pattern]?.(page, viewer);
      await expectSoundPage(page);
    });

test('a page that is not there says so and is sound', async ({ visit, complaints }) => {
  complaints.expectOne(/404/);
  const page = await visit('/nothing-here', 'nobody', 404);
  await expect(page.getByRole('heading', { level: 1, name: errors.notFoundTitle })).toBeVisible();
  await expectSoundPage(page);
});

test('a form that was refused is sound', async ({ visit }) => {
  const page = await visit('/sign-in', 'nobody');
  await page.getByRole('textbox', { name: auth.email, exact: true }).fill('nobody');
  await page.getByRole('button', { name: auth.signIn, exact: true }).click();
  await expect(page.getByText(auth.notAnAddress)).toBeVisible();
  await expectSoundPage(page);
});

const DIALOGS: readonly {
  readonly pattern: string;
  readonly opens: string | RegExp;
  readonly title: string | RegExp;
}[] = [
  { pattern: '/w/[workshop]', opens: designs.newDesign, title: designs.newDesign },
  { pattern: '/w/[workshop]/members', opens: members.remove, title: /^Remove .+\?$/ },
  { pattern: '/w/[workshop]/members', opens: /^Set roles of /, title: /^Set roles of / },
  { pattern: BOARD, opens: header.keys, title: keys.title },
  { pattern: BOARD, opens: figures.more, title: figures.more },
];

for (const { pattern, opens, title } of DIALOGS)
  test(`the dialog behind "${opens}" on ${pattern} is sound`, async ({ visit }) => {
    const page = await visit(pattern, 'Ines Okafor');
    await WHOLE[pattern]?.(page, 'Ines Okafor');
    await page.getByRole('button', { name: opens, exact: true }).first().click();
    await expect(page.getByRole('dialog', { name: title })).toBeVisible();
    await expectSoundPage(page);
  });
