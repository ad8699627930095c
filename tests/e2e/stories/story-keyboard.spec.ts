import type { Page } from '@playwright/test';
import { header, keys } from '@/lib/text/en/board';
import { designs, print, release, words } from '@/lib/text/en/pages';
import { plan as paper } from '@/lib/text/en/plan';
import { review, sheet, threads, verdicts } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { areaOf, expectSaved, expectWorkedOut, field, figureShown, freshName, handle } from '../support/board';
import { choose, enter, pick, signInByKeyboard, tabTo, write } from '../support/keyboard';
import type { DemoName } from '../support/people';
import { expectPrinted, WORKSHOP } from '../support/story';
import { expect, test } from '../support/test';

// The same job without a mouse: nothing is reached but by Tab, arrows, Enter and typing.

const SPAN = 'Span, wing';
const TIP = 'Tip chord, wing';
const PART = 'Fin, starboard';

const link = (page: Page, name: string | RegExp) => page.getByRole('link', { name, exact: true });
const button = (page: Page, name: string | RegExp) => page.getByRole('button', { name, exact: true });
const text = (page: Page, name: string) => page.getByRole('textbox', { name, exact: true });
const article = (page: Page, number: number) =>
  page.getByRole('article', { name: fill(threads.number, { number }), exact: true });

async function comeIn(page: Page, name: DemoName): Promise<Page> {
  await signInByKeyboard(page, name);
  await enter(link(page, WORKSHOP));
  await expect(page.getByRole('heading', { level: 1, name: WORKSHOP })).toBeVisible();
  return page;
}

async function begin(page: Page, name: string): Promise<void> {
  await enter(button(page, designs.newDesign));
  const dialog = page.getByRole('dialog', { name: designs.newDesign });
  await choose(dialog.getByRole('group', { name: designs.layout }), /^Twin-boom pusher/);
  await write(text(page, designs.name), name);
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { level: 1, name, exact: true })).toBeVisible();
  await expectWorkedOut(page);
}

async function shape(page: Page): Promise<void> {
  const [before, chord] = [
    { spanMm: 700, rootMm: 190, tipMm: 150 },
    { spanMm: 732, rootMm: 190, tipMm: 140 },
  ];
  await expect.poll(() => figureShown(page, 'wingAreaDm2')).toBeCloseTo(areaOf(before), 1.99);
  await test.step('arrows move the span handle, ten steps at a time with Shift', async () => {
    await tabTo(handle(page, SPAN));
    for (const key of ['Shift+ArrowUp', 'Shift+ArrowUp', 'Shift+ArrowRight', 'ArrowUp', 'ArrowUp'])
      await page.keyboard.press(key);
    await expect(handle(page, SPAN)).toHaveAttribute('aria-valuetext', '732 mm');
    await expect(field(page, SPAN)).toHaveValue('732');
    await expect.poll(() => figureShown(page, 'wingAreaDm2')).toBeCloseTo(areaOf({ ...before, spanMm: 732 }), 1.99);
  });
  await test.step('a typed value, undo and redo', async () => {
    await write(field(page, TIP), '140');
    await page.keyboard.press('Enter');
    await expect.poll(() => figureShown(page, 'wingAreaDm2')).toBeCloseTo(areaOf(chord), 1.99);
    await page.keyboard.press('ControlOrMeta+z');
    await expect(field(page, TIP)).toHaveValue('150');
    await expect(field(page, SPAN)).toHaveValue('732');
    await page.keyboard.press('ControlOrMeta+Shift+z');
    await expect(field(page, TIP)).toHaveValue('140');
  });
  await test.step('the keys are told on asking', async () => {
    await enter(button(page, header.keys));
    await expect(page.getByRole('dialog', { name: keys.title })).toBeVisible();
    await page.keyboard.press('Escape');
    await expect(page.getByRole('dialog')).toHaveCount(0);
  });
  await expectSaved(page);
}

async function releaseFirst(page: Page): Promise<void> {
  await enter(link(page, header.release));
  await write(text(page, release.reason), 'More span for the same mass.');
  await write(text(page, release.effect), 'Slower landing.');
  await enter(button(page, fill(release.submit, { number: 1 })));
  await expect(page.getByRole('heading', { level: 1, name: 'Revision 1', exact: true })).toBeVisible();
}

/** Enter on the drawing has no place to mean; it leads to the list of what a comment can be about. */
async function comment(page: Page): Promise<void> {
  const list = page.getByRole('combobox', { name: threads.about, exact: true });
  await enter(button(page, sheet.place));
  await expect(list).toBeFocused();
  await pick(list, 'Tailplane');
  await write(text(page, threads.text), 'Is this far enough back?');
  await enter(button(page, threads.pin));
  await expect(article(page, 1)).toContainText('Is this far enough back?');
  await expect(page.getByRole('button', { name: 'Comment 1, open: Tailplane', exact: true })).toBeVisible();
  await pick(list, PART);
  await write(text(page, threads.text), 'Mind the grain.');
  await enter(button(page, threads.pin));
  await expect(article(page, 2)).toContainText(fill(threads.onPart, { part: PART }));
}

async function judge(page: Page, verdict: RegExp, note: string, words: string): Promise<void> {
  await choose(page.getByRole('group', { name: verdicts.legend, exact: true }), verdict);
  await write(text(page, note), words);
  await enter(button(page, verdicts.submit));
  const panel = page.getByRole('region', { name: verdicts.title, exact: true });
  await expect(panel.getByRole('list').getByText(words, { exact: true })).toBeVisible();
}

test('the whole job is done with the keyboard alone', async ({ openBrowser }) => {
  test.setTimeout(360_000);
  const name = freshName('Plover');
  const designer = await comeIn(await openBrowser(), 'Ines Okafor');
  await begin(designer, name);
  await test.step('the designer shapes the wing', () => shape(designer));
  await test.step('the designer releases it', () => releaseFirst(designer));

  const reviewer = await comeIn(await openBrowser(), 'Marguerite Adeyemi');
  await enter(link(reviewer, `${fill(designs.review, { number: 1 })}: ${name}`));
  await expect(reviewer.getByText(review.frozen)).toBeVisible();
  await test.step('the reviewer comments and holds it', async () => {
    await comment(reviewer);
    await judge(reviewer, /^Hold/, verdicts.noteHold, 'Answer the tail first.');
  });
  await test.step('the designer answers', async () => {
    await expect(designer.getByText('Answer the tail first.')).toBeVisible();
    await enter(article(designer, 1).getByRole('button', { name: threads.answer, exact: true }));
    await write(text(designer, threads.answer), 'Tail volume says so.');
    await enter(button(designer, threads.send));
  });
  await test.step('the reviewer closes the comment and says good to cut', async () => {
    await expect(article(reviewer, 1)).toContainText('Tail volume says so.');
    await enter(button(reviewer, fill(threads.closeOf, { number: 1 })));
    await expect(article(reviewer, 1)).toContainText(fill(threads.closedBy, { name: 'Marguerite Adeyemi' }));
    await judge(reviewer, /^Good to cut/, verdicts.note, 'Cut it then.');
    await expect(designer.getByText('Cut it then.')).toBeVisible();
  });

  await test.step('the builder takes the pages', async () => {
    const builder = await comeIn(await openBrowser(), 'Piet Lindqvist');
    await enter(link(builder, `${fill(designs.print, { number: 1 })}: ${name}`));
    await expect(
      builder.getByRole('heading', { level: 1, name: fill(print.titleRevision, { number: 1 }) }),
    ).toBeVisible();
    const { pages, longestMm } = await expectPrinted(builder, 'A4', enter);
    expect(longestMm).toBeCloseTo(732, 1);
    for (const page of pages) {
      expect(page.text).toContain(words.goodToCut);
      expect(page.text).not.toContain(paper.page.draft);
    }
  });
});
