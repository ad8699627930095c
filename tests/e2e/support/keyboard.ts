import { expect, type Locator, type Page } from '@playwright/test';
import { auth } from '@/lib/text/en/pages';
import { type DemoName, signInOf } from './people';

// A person without a mouse: Tab, arrows, Enter and letters. Nothing here moves the focus by any other way.

/** More stops than any page has. */
const MOST_PRESSES = 150;

const holdsFocus = (wanted: Locator): Promise<boolean> =>
  wanted.evaluateAll((elements) => elements.some((element) => element === document.activeElement));

/** Presses Tab until what is wanted (the first of several that comes) holds the focus. */
export async function tabTo(wanted: Locator): Promise<void> {
  const page = wanted.page();
  await expect(wanted.first()).toBeVisible();
  for (let presses = 0; presses < MOST_PRESSES; presses += 1) {
    if (await holdsFocus(wanted)) return;
    await page.keyboard.press('Tab');
  }
  throw new RangeError(`${wanted} was not reached with ${MOST_PRESSES} presses of Tab`);
}

/** Tabs to a button or a link and presses Enter. */
export async function enter(wanted: Locator): Promise<void> {
  await tabTo(wanted);
  await wanted.page().keyboard.press('Enter');
}

/** Tabs to a text field and writes over what stands in it. */
export async function write(field: Locator, text: string): Promise<void> {
  await tabTo(field);
  await field.page().keyboard.press('ControlOrMeta+a');
  await field.page().keyboard.type(text);
  await expect(field).toHaveValue(text);
}

/** Tabs into a group of radio buttons and goes through it with the arrows until this one is chosen. */
export async function choose(group: Locator, name: RegExp): Promise<void> {
  const radios = group.getByRole('radio');
  const wanted = group.getByRole('radio', { name });
  await tabTo(radios);
  for (let left = await radios.count(); left > 0 && !(await wanted.isChecked()); left -= 1)
    await group.page().keyboard.press('ArrowDown');
  await expect(wanted).toBeChecked();
}

/** Tabs to a list box and types the start of a line until it is the chosen one. */
export async function pick(list: Locator, line: string): Promise<void> {
  await tabTo(list);
  await list.page().keyboard.type(line);
  await expect(list.getByRole('option', { name: line, exact: true, selected: true })).toHaveCount(1);
}

/** Signs a demo person in without a mouse. */
export async function signInByKeyboard(page: Page, name: DemoName): Promise<void> {
  const { email, password } = signInOf(name);
  await page.goto('/sign-in');
  await write(page.getByRole('textbox', { name: auth.email, exact: true }), email);
  await page.keyboard.press('Tab');
  await page.keyboard.type(password);
  await page.keyboard.press('Enter');
  await expect(page).not.toHaveURL(/sign-in/);
}
