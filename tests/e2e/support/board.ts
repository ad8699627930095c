import { expect, type Locator, type Page } from '@playwright/test';
import { FIGURES, type FigureId } from '@/lib/figures/table';
import { figures, header, rule, save } from '@/lib/text/en/board';
import { designs } from '@/lib/text/en/pages';

// The building board as a person finds it: by what things are called.

/** A handle on the drawing. */
export const handle = (page: Page, label: string): Locator => page.getByRole('slider', { name: label, exact: true });

/** The typed equal of a handle, in the number slip. */
export const field = (page: Page, label: string): Locator => page.getByRole('textbox', { name: label, exact: true });

/** What stands in a field of the slip, as a number. */
export async function typedNumber(page: Page, label: string): Promise<number> {
  const text = await field(page, label).inputValue();
  const value = Number(text);
  if (text === '' || Number.isNaN(value)) throw new RangeError(`"${label}" holds no number: "${text}"`);
  return value;
}

/** The cell of a figure in the strip at the foot of the board. */
export const figureCell = (page: Page, id: FigureId): Locator =>
  page
    .getByRole('region', { name: figures.title, exact: true })
    .getByRole('button', { name: new RegExp(`^${FIGURES[id].name}\\b`) });

/** The number that a figure's cell shows; NaN while it shows none. */
export async function figureShown(page: Page, id: FigureId): Promise<number> {
  const text = ((await figureCell(page, id).textContent()) ?? '').slice(FIGURES[id].name.length);
  return Number.parseFloat(/-?\d+(\.\d+)?/.exec(text)?.[0] ?? '');
}

/** The CG range as the balance rule tells it to whoever cannot see it. */
export async function rangeShown(page: Page): Promise<string> {
  const text = await page.getByText(`${rule.title}:`).textContent();
  const range = /CG range (.+?)\. CG/.exec(text ?? '')?.[1];
  if (range === undefined) throw new RangeError(`the balance rule tells no CG range: "${text}"`);
  return range;
}

/** Waits for a figure that belongs to the aircraft as it is drawn now: a number, not a dash. */
export async function expectWorkedOut(page: Page): Promise<void> {
  await expect.poll(() => figureShown(page, 'wingAreaDm2')).toBeGreaterThan(0);
  await expect.poll(() => rangeShown(page)).toMatch(/\d mm to -?\d+ mm/);
}

/** Waits until the board announces that the server has everything. */
export async function expectSaved(page: Page): Promise<void> {
  await expect(page.getByRole('status').filter({ hasText: new RegExp(`^${save.saved}$`) })).toBeVisible();
}

/** Types a value into the slip as a person does: the old one is selected and written over. */
export async function typeNumber(page: Page, label: string, text: string): Promise<void> {
  await field(page, label).fill(text);
  await field(page, label).press('Enter');
}

/** Takes a slider with the mouse and moves it; `held` runs while the button is still down. */
export async function drag(
  page: Page,
  slider: Locator,
  [dx, dy]: readonly [number, number],
  held?: () => Promise<void>,
): Promise<void> {
  await slider.hover();
  const box = await slider.boundingBox();
  if (box === null) throw new RangeError('the handle is not on the screen');
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.down();
  await page.mouse.move(x + dx, y + dy, { steps: 12 });
  await held?.();
  await page.mouse.up();
}

/** Starts a design of a layout in the workshop that is open, by mouse, and waits for its board. */
export async function startDesign(page: Page, layout: RegExp, name: string): Promise<void> {
  await page.getByRole('button', { name: designs.newDesign, exact: true }).click();
  const dialog = page.getByRole('dialog', { name: designs.newDesign });
  await dialog.getByRole('radio', { name: layout }).check();
  await dialog.getByRole('textbox', { name: designs.name }).fill(name);
  await dialog.getByRole('button', { name: designs.make, exact: true }).click();
  await expect(page.getByRole('heading', { level: 1, name, exact: true })).toBeVisible();
  await expect(page.getByRole('button', { name: header.undo, exact: true })).toBeVisible();
}

/** A name that no earlier run has used. */
export const freshName = (start: string): string => `${start} ${crypto.randomUUID().slice(0, 8)}`;

export interface Trapezoid {
  readonly spanMm: number;
  readonly rootMm: number;
  readonly tipMm: number;
}

/** Area of a straight-tapered wing that begins at the centre line, dm²: span times mean chord. */
export const areaOf = ({ spanMm, rootMm, tipMm }: Trapezoid): number => (spanMm * (rootMm + tipMm)) / 2 / 1e4;

/** Its mean aerodynamic chord, mm: Raymer, Aircraft Design, ch. 7. The span does not come into it. */
export const macOf = ({ rootMm, tipMm }: Trapezoid): number =>
  (2 / 3) * ((rootMm ** 2 + rootMm * tipMm + tipMm ** 2) / (rootMm + tipMm));
