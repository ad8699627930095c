import { readFile } from 'node:fs/promises';
import { expect, type Locator, type Page } from '@playwright/test';
import { designs, print } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { download, type PlanOnDisk, readPlan } from './plan';

// Ways through the house and what comes out of its printer, whoever goes them and by whatever hand.

export const WORKSHOP = /^Tarn Lane Workshop/;

/** How a person sets off a link or a button: with the mouse or with the keyboard. */
export type Press = (what: Locator) => Promise<void>;

const click: Press = (what) => what.click();

/** From the list of workshops, where a sign-in leads, into the demo workshop. */
export async function openWorkshop(page: Page, press: Press = click): Promise<void> {
  await press(page.getByRole('link', { name: WORKSHOP }));
  await expect(page.getByRole('heading', { level: 1, name: WORKSHOP })).toBeVisible();
}

/** On to a design's list of revisions. */
export async function openRevisions(page: Page, design: string): Promise<void> {
  await openWorkshop(page);
  await page.getByRole('link', { name: `${designs.revisions}: ${design}`, exact: true }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'Revisions' })).toBeVisible();
}

/** Sides of a sheet, mm: ISO 216 for A4, ANSI/ASME Y14.1 for Letter (8.5 x 11 in). */
const SIDES_MM = { A4: [210, 297], Letter: [215.9, 279.4] } as const;
export type PaperName = keyof typeof SIDES_MM;

interface ManifestPages {
  readonly pdfSha256: string;
  readonly otherPages: readonly { readonly page: number; readonly media_mm: readonly [number, number] }[];
  readonly sheets: readonly {
    readonly pages: readonly { readonly page: number; readonly media_mm: readonly [number, number] }[];
    readonly expected: readonly { readonly points: readonly (readonly [number, number])[] }[];
  }[];
}

const extent = (values: readonly number[]): number => Math.max(...values) - Math.min(...values);

export interface Printed extends PlanOnDisk {
  /** The longest side of any part's outline as laid on its sheet, mm. */
  readonly longestMm: number;
}

/**
 * On a print page: chooses the paper, takes the plan and its manifest as files, and checks that they belong together,
 * that no page is missing and that every page has exactly the size of the paper.
 */
export async function expectPrinted(page: Page, paper: PaperName, press: Press): Promise<Printed> {
  const choice = page.getByRole('radio', { name: new RegExp(`^${paper}\\b`) });
  if (!(await choice.isChecked())) await press(choice);
  await expect(choice).toBeChecked();
  const line = page.getByText(new RegExp(`^\\d+ ${fill(print.pages, { count: '', paper }).trim()}$`));
  await expect(line).toBeVisible({ timeout: 60_000 });
  const stated = Number.parseInt((await line.textContent()) ?? '', 10);
  const take = async (name: string) => download(page, () => press(page.getByRole('link', { name, exact: true })));
  const plan = await take(print.download);
  expect(plan.name).toMatch(/\.pdf$/);
  const manifestFile = await take(print.manifest);
  const manifest: ManifestPages = JSON.parse(await readFile(manifestFile.path, 'utf8'));
  const printed = await readPlan(plan.path);

  expect(printed.sha256).toBe(manifest.pdfSha256);
  const listed = [...manifest.otherPages, ...manifest.sheets.flatMap(({ pages }) => pages)];
  expect(listed.map(({ page: number }) => number).sort((a, b) => a - b)).toEqual(
    printed.pages.map((_, index) => index + 1),
  );
  expect(printed.pages).toHaveLength(stated);
  for (const { page: number, media_mm } of listed) {
    const { widthMm, heightMm } = printed.pages[number - 1] ?? { widthMm: Number.NaN, heightMm: Number.NaN };
    const sides = [widthMm, heightMm].sort((a, b) => a - b);
    for (const index of [0, 1] as const) {
      expect(Math.abs((sides[index] ?? Number.NaN) - SIDES_MM[paper][index]), `page ${number}`).toBeLessThan(0.01);
    }
    expect(Math.abs(widthMm - media_mm[0])).toBeLessThan(0.01);
    expect(Math.abs(heightMm - media_mm[1])).toBeLessThan(0.01);
  }
  const sizes = manifest.sheets.flatMap(({ expected }) =>
    expected.flatMap(({ points }) => [extent(points.map(([x]) => x)), extent(points.map(([, y]) => y))]),
  );
  return { ...printed, longestMm: Math.max(...sizes) };
}
