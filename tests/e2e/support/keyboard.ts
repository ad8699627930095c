import { expect, type Locator, type Page } from '@playwright/test';

// A person without a mouse: Tab, arrows, Enter and letters. Nothing here moves the focus by any other way.

type Role = Parameters<Page['getByRole']>[0];

/** More stops than any page has. */
const MOST_PRESSES = 150;

const named = (page: Page, role: Role, name: string | RegExp): Locator =>
  page.getByRole(role, typeof name === 'string' ? { name, exact: true } : { name });

const holdsFocus = (wanted: Locator): Promise<boolean> =>
  wanted.evaluateAll((elements) => elements.some((element) => element === document.activeElement));

async function tabUntil(page: Page, wanted: Locator, what: string): Promise<void> {
  await expect(wanted.first(), `${what} is on the page`).toBeVisible();
  for (let presses = 0; presses < MOST_PRESSES; presses += 1) {
    if (await holdsFocus(wanted)) return;
    await page.keyboard.press('Tab');
  }
  throw new RangeError(`${what} was not reached with ${MOST_PRESSES} presses of Tab`);
}

/** Presses Tab until what has this role and name holds the focus. */
export const tabTo = (page: Page, role: Role, name: string | RegExp): Promise<void> =>
  tabUntil(page, named(page, role, name), `${role} "${name}"`);

/** Tabs to it and presses Enter. */
export async function enter(page: Page, role: Role, name: string | RegExp): Promise<void> {
  await tabTo(page, role, name);
  await page.keyboard.press('Enter');
}

/** Tabs to a text field and writes over what stands in it. */
export async function write(page: Page, name: string, text: string): Promise<void> {
  await tabTo(page, 'textbox', name);
  await page.keyboard.press('ControlOrMeta+a');
  await page.keyboard.type(text);
}

/** Tabs into a group of radio buttons and goes through it with the arrows until this one is chosen. */
export async function choose(page: Page, group: string, name: RegExp): Promise<void> {
  const radios = page.getByRole('group', { name: group, exact: true }).getByRole('radio');
  const wanted = page.getByRole('group', { name: group, exact: true }).getByRole('radio', { name });
  await tabUntil(page, radios, `radio buttons of "${group}"`);
  for (let left = await radios.count(); left > 0 && !(await wanted.isChecked()); left -= 1)
    await page.keyboard.press('ArrowDown');
  await expect(wanted).toBeChecked();
}
