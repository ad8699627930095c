import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/** Fails when the page can be scrolled sideways, and names what sticks out. */
export async function expectNoOverflow(page: Page): Promise<void> {
  const found = await page.evaluate(() => {
    const width = document.documentElement.clientWidth;
    const scrolls = document.documentElement.scrollWidth > width;
    const out = [...document.body.querySelectorAll('*')].filter(
      (element) => element.getBoundingClientRect().right > width + 1,
    );
    const names = out.slice(-5).map((element) => `${element.tagName.toLowerCase()}.${element.className}`);
    return { scrolls, names };
  });
  expect(found.scrolls, `sideways scrolling; what sticks out: ${found.names.join(', ')}`).toBe(false);
}

const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22a', 'wcag22aa'];

/** Fails on what axe finds against WCAG 2.2, A and AA. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).withTags(RULES).analyze();
  const told = violations.map(
    ({ id, help, nodes }) => `${id}: ${help} (${nodes.map(({ target }) => target.join(' ')).join('; ')})`,
  );
  expect(told).toEqual([]);
}

/** What every page has to hold, wherever it stands: one main heading, no sideways scrolling, no violation. */
export async function expectSoundPage(page: Page): Promise<void> {
  await expect(page.getByRole('heading', { level: 1 })).toHaveCount(1);
  await expectNoOverflow(page);
  await expectAccessible(page);
}
