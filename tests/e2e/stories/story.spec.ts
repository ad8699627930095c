import type { Page } from '@playwright/test';
import { FIGURES } from '@/lib/figures/table';
import { header } from '@/lib/text/en/board';
import { designs, print, release, revisions, words } from '@/lib/text/en/pages';
import { plan as paper } from '@/lib/text/en/plan';
import { partsText, review, sheet, threads, verdicts } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import {
  areaOf,
  drag,
  expectSaved,
  expectWorkedOut,
  field,
  figureShown,
  freshName,
  handle,
  macOf,
  rangeShown,
  startDesign,
  type Trapezoid,
  typedNumber,
  typeNumber,
} from '../support/board';
import { expectPrinted, openRevisions, openWorkshop } from '../support/story';
import { expect, test } from '../support/test';

// The whole job with three people at three browsers, by role, label and mouse alone.

const SPAN = 'Span, wing';
const ROOT = 'Root chord, wing';
const TIP = 'Tip chord, wing';
const PART = 'Fin, starboard';
const REASON = 'The wing was too short for the pack we have.';
const EFFECT = 'Slower by half a metre a second, and steadier.';

const wingTyped = async (page: Page): Promise<Trapezoid> => ({
  spanMm: await typedNumber(page, SPAN),
  rootMm: await typedNumber(page, ROOT),
  tipMm: await typedNumber(page, TIP),
});

/** The strip shows the area and the chord that the typed numbers give. */
async function expectWingFigures(page: Page, wing: Trapezoid): Promise<void> {
  const { wingAreaDm2, macMm } = FIGURES;
  await expect.poll(() => figureShown(page, 'wingAreaDm2')).toBeCloseTo(areaOf(wing), wingAreaDm2.digits - 0.01);
  await expect.poll(() => figureShown(page, 'macMm')).toBeCloseTo(macOf(wing), macMm.digits - 0.01);
}

async function shape(page: Page): Promise<{ readonly spanMm: number }> {
  await expectWorkedOut(page);
  const start = await wingTyped(page);
  await expectWingFigures(page, start);
  const before = { neutralPoint: await figureShown(page, 'neutralPointPct'), range: await rangeShown(page) };

  await test.step('area follows the span handle while the hand still holds it', async () => {
    await drag(page, handle(page, SPAN), [0, -48], async () => {
      await expect.poll(() => figureShown(page, 'wingAreaDm2')).toBeGreaterThan(areaOf(start) + 0.1);
    });
  });
  const longer = await wingTyped(page);
  expect(longer.spanMm).toBeGreaterThan(start.spanMm);
  expect(longer).toEqual({ ...start, spanMm: longer.spanMm });
  await expect(handle(page, SPAN)).toHaveAttribute('aria-valuenow', String(longer.spanMm));
  await test.step('neutral point and CG range move with the span; the mean chord does not', async () => {
    await expectWingFigures(page, longer);
    await expect.poll(() => figureShown(page, 'neutralPointPct')).not.toBe(before.neutralPoint);
    await expect.poll(() => rangeShown(page)).not.toBe(before.range);
  });

  await test.step('the mean chord follows the tip chord', async () => {
    await drag(page, handle(page, TIP), [30, 0]);
    const wider = await wingTyped(page);
    expect(wider.tipMm).toBeGreaterThan(longer.tipMm);
    await expectWingFigures(page, wider);
    expect(macOf(wider)).toBeGreaterThan(macOf(longer) + 1);
  });
  await expectSaved(page);

  await test.step('a typed value does what the hand does', async () => {
    await typeNumber(page, SPAN, '760');
    await typeNumber(page, TIP, '140');
    await expect(handle(page, SPAN)).toHaveAttribute('aria-valuenow', '760');
    await expectWingFigures(page, { ...longer, spanMm: 760, tipMm: 140 });
  });
  await test.step('undo and redo go one act at a time', async () => {
    const undo = page.getByRole('button', { name: header.undo, exact: true });
    await undo.click();
    await expect(field(page, TIP)).not.toHaveValue('140');
    await expect(field(page, SPAN)).toHaveValue('760');
    await undo.click();
    await expect(field(page, SPAN)).toHaveValue(String(longer.spanMm));
    const redo = page.getByRole('button', { name: header.redo, exact: true });
    await redo.click();
    await redo.click();
    await expect(field(page, TIP)).toHaveValue('140');
    await expect(redo).toBeDisabled();
    await expectWingFigures(page, { ...longer, spanMm: 760, tipMm: 140 });
  });
  await expectSaved(page);
  return { spanMm: 760 };
}

async function releaseFirst(page: Page): Promise<void> {
  await page.getByRole('link', { name: header.release, exact: true }).click();
  await page.getByRole('textbox', { name: release.reason, exact: true }).fill(REASON);
  await page.getByRole('textbox', { name: release.effect, exact: true }).fill(EFFECT);
  await page.getByRole('button', { name: fill(release.submit, { number: 1 }), exact: true }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'Revision 1', exact: true })).toBeVisible();
}

const thread = (page: Page, number: number) =>
  page.getByRole('article', { name: fill(threads.number, { number }), exact: true });

/** Clicks the plan there and finds the pin of what was written standing on that spot. */
async function pinToPlace(page: Page, text: string): Promise<void> {
  const plan = page.getByRole('button', { name: sheet.place, exact: true });
  await plan.scrollIntoViewIfNeeded();
  const box = await plan.boundingBox();
  if (box === null) throw new RangeError('the plan is not on the page');
  const spot = { x: Math.round(box.width * 0.42), y: Math.round(box.height * 0.3) };
  await plan.click({ position: spot });
  await page.getByRole('textbox', { name: threads.text, exact: true }).fill(text);
  await page.getByRole('button', { name: threads.pin, exact: true }).click();
  await expect(thread(page, 1)).toContainText(text);
  const pin = page.getByRole('button', { name: /^Comment 1, open: / });
  await expect(pin).toHaveAccessibleName(/ mm aft, \d+ mm to (starboard|port)$/);
  const [foot, ground] = [await pin.boundingBox(), await plan.boundingBox()];
  if (foot === null || ground === null) throw new RangeError('the pin is not on the page');
  expect(Math.abs(foot.x + foot.width / 2 - (ground.x + spot.x))).toBeLessThan(2);
  expect(Math.abs(foot.y + foot.height - (ground.y + spot.y))).toBeLessThan(2);
}

async function pinToPart(page: Page, text: string): Promise<void> {
  await page.getByRole('button', { name: fill(partsText.comment, { name: PART }), exact: true }).click();
  await page.getByRole('textbox', { name: threads.text, exact: true }).fill(text);
  await page.getByRole('button', { name: threads.pin, exact: true }).click();
  await expect(thread(page, 2)).toContainText(text);
  await expect(thread(page, 2)).toContainText(fill(threads.onPart, { part: PART }));
}

async function judge(page: Page, verdict: string, note: { readonly label: string; readonly text: string }) {
  const panel = page.getByRole('region', { name: verdicts.title, exact: true });
  await panel.getByRole('radio', { name: new RegExp(`^${verdict}`) }).check();
  await panel.getByRole('textbox', { name: note.label, exact: true }).fill(note.text);
  await panel.getByRole('button', { name: verdicts.submit, exact: true }).click();
  await expect(panel.getByRole('list').getByText(note.text)).toBeVisible();
}

/** The state of the revision, which stands beside its title. */
const state = (page: Page, word: string) => page.getByRole('banner').or(page.getByRole('main')).getByText(word).first();

test('a design goes from a dragged wing to printed pages through three pairs of hands', async ({ openAs }) => {
  test.setTimeout(360_000);
  const name = freshName('Heron');
  const designer = await openAs('Tomas Reyes');
  await openWorkshop(designer);
  await startDesign(designer, /^Twin-boom pusher/, name);
  const reviewer = await openAs('Marguerite Adeyemi');
  await openRevisions(reviewer, name);
  await expect(reviewer.getByText(revisions.empty)).toBeVisible();

  const { spanMm } = await test.step('the designer shapes the wing', () => shape(designer));
  await test.step('the designer prints the draft, which says so on every page', async () => {
    await designer.getByRole('link', { name: header.print, exact: true }).click();
    const { pages } = await expectPrinted(designer, 'A4', (link) => link.click());
    for (const { text } of pages) expect(text).toContain(paper.page.draft);
    await designer.getByRole('link', { name, exact: true }).click();
    await expect(field(designer, SPAN)).toHaveValue(String(spanMm));
  });
  await test.step('the designer releases it with a reason', () => releaseFirst(designer));

  await test.step('the reviewer, who waits at the list, sees it come and opens it', async () => {
    const link = reviewer.getByRole('link', { name: fill(revisions.review, { number: 1 }), exact: true });
    await expect(link).toBeVisible();
    await expect(reviewer.getByText(REASON)).toBeVisible();
    await link.click();
    await expect(reviewer.getByRole('heading', { level: 1, name: 'Revision 1', exact: true })).toBeVisible();
    await expect(reviewer.getByText(EFFECT)).toBeVisible();
    await expect(reviewer.getByText(review.frozen)).toBeVisible();
    await expect(reviewer.getByRole('slider')).toHaveCount(0);
  });
  await test.step('the reviewer pins comments to a place and to a part, and holds it', async () => {
    await pinToPlace(reviewer, 'Is the spar long enough here?');
    await pinToPart(reviewer, 'Grain along the fin, please.');
    await judge(reviewer, verdicts.hold.label, { label: verdicts.noteHold, text: 'Answer the spar first.' });
    await expect(state(reviewer, words.held)).toBeVisible();
  });

  await test.step('the designer sees comments and verdict without asking, and answers', async () => {
    await expect(thread(designer, 1)).toContainText('Is the spar long enough here?');
    await expect(thread(designer, 2)).toContainText('Grain along the fin, please.');
    await expect(designer.getByText('Answer the spar first.')).toBeVisible();
    await expect(state(designer, words.held)).toBeVisible();
    await thread(designer, 1).getByRole('button', { name: threads.answer, exact: true }).click();
    await thread(designer, 1)
      .getByRole('textbox', { name: threads.answer, exact: true })
      .fill('It ends 9 mm outboard.');
    await thread(designer, 1).getByRole('button', { name: threads.send, exact: true }).click();
  });
  await test.step('the reviewer reads the answer, closes the comment and says good to cut', async () => {
    await expect(thread(reviewer, 1)).toContainText('It ends 9 mm outboard.');
    await expect(thread(reviewer, 1)).toContainText('Tomas Reyes');
    await reviewer.getByRole('button', { name: fill(threads.closeOf, { number: 1 }), exact: true }).click();
    await expect(thread(reviewer, 1)).toContainText(fill(threads.closedBy, { name: 'Marguerite Adeyemi' }));
    await expect(reviewer.getByText(fill(threads.openCount, { open: 1, closed: 1 }))).toBeVisible();
    await judge(reviewer, verdicts.goodToCut.label, { label: verdicts.note, text: 'Cut it.' });
    await expect(designer.getByText(fill(threads.openCount, { open: 1, closed: 1 }))).toBeVisible();
    await expect(designer.getByText('Cut it.')).toBeVisible();
  });

  await test.step('the builder takes the pages, true to size and without the word draft', async () => {
    const builder = await openAs('Piet Lindqvist');
    await openWorkshop(builder);
    await builder.getByRole('link', { name: `${fill(designs.print, { number: 1 })}: ${name}`, exact: true }).click();
    await expect(
      builder.getByRole('heading', { level: 1, name: fill(print.titleRevision, { number: 1 }) }),
    ).toBeVisible();
    const a4 = await expectPrinted(builder, 'A4', (link) => link.click());
    for (const { text } of a4.pages) {
      expect(text.toLowerCase()).not.toContain('draft');
      expect(text).toContain(words.goodToCut);
    }
    expect(a4.pages[0]?.text).toContain(name);
    expect(a4.longestMm).toBeCloseTo(spanMm, 1);
    await expectPrinted(builder, 'Letter', (link) => link.click());
  });
});
