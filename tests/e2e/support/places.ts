import { readdirSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import { type BrowserContextOptions, expect, type Page } from '@playwright/test';
import { designs } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { DEMO_NAMES, type DemoName, signIn } from './people';
import { openWorkshop } from './story';
import { test as base } from './test';

// Every page there is, and everybody who looks at it.

export type Viewer = DemoName | 'nobody';

const APP = resolve(import.meta.dirname, '../../../app');

/** Patterns of the pages as their folders have them: "/w/[workshop]/members". A folder in brackets (auth) is no part of an address. */
export function pagesOnDisk(): string[] {
  return readdirSync(APP, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile() && entry.name === 'page.tsx')
    .map((entry) => `/${relative(APP, dirname(join(entry.parentPath, entry.name)))}`.replaceAll(/\/\([^)]+\)/g, ''))
    .map((pattern) => pattern || '/')
    .sort();
}

type Cookies = Exclude<BrowserContextOptions['storageState'], string | undefined>;

interface House {
  /** Who is signed in, as the browser keeps it; nothing for nobody. */
  readonly keys: ReadonlyMap<Viewer, Cookies>;
  /** What stands for the changing parts of an address: a design with revisions, comments and verdicts. */
  readonly parts: Readonly<Record<string, string>>;
}

/** The design that has a bit of everything, and its newest revision. */
const SHOWN = { name: 'Tarrel 620', number: 3 } as const;

async function partsFrom(page: Page): Promise<House['parts']> {
  await openWorkshop(page);
  const link = page.getByRole('link', { name: `${fill(designs.review, { number: SHOWN.number })}: ${SHOWN.name}` });
  const [, workshop, design] = /^\/w\/([^/]+)\/d\/([^/]+)\/r\/3$/.exec((await link.getAttribute('href')) ?? '') ?? [];
  if (workshop === undefined || design === undefined) throw new RangeError(`no review of ${SHOWN.name} to be found`);
  return { workshop, design, number: String(SHOWN.number), token: 'no-such-invitation' };
}

interface WalkFixtures {
  /** Opens the page of a pattern as this viewer sees it and waits until its title stands. */
  readonly visit: (pattern: string, viewer: Viewer, status?: number) => Promise<Page>;
}

/** Everybody signs in once for all pages: signing in is counted, and these tests visit hundreds. */
export const test = base.extend<WalkFixtures, { readonly house: House }>({
  house: [
    async ({ browser }, use) => {
      const baseURL = process.env.FOLDSPAR_E2E_URL;
      const keys = new Map<Viewer, Cookies>();
      let parts: House['parts'] = {};
      for (const name of DEMO_NAMES) {
        const context = await browser.newContext({ baseURL });
        const page = await context.newPage();
        await signIn(page, name);
        keys.set(name, await context.storageState());
        if (name === DEMO_NAMES[0]) parts = await partsFrom(page);
        await context.close();
      }
      await use({ keys, parts });
    },
    { scope: 'worker' },
  ],
  visit: async ({ browser, complaints, house }, use) => {
    const opened: Page[] = [];
    await use(async (pattern, viewer, status = 200) => {
      const context = await browser.newContext({ storageState: house.keys.get(viewer) });
      complaints.watch(context);
      const page = await context.newPage();
      opened.push(page);
      const address = pattern.replaceAll(/\[([^\]]+)\]/g, (_, part: string) => {
        const value = house.parts[part];
        if (value === undefined) throw new RangeError(`nothing stands for [${part}] in ${pattern}`);
        return value;
      });
      const answer = await page.goto(address);
      expect(answer?.status()).toBe(status);
      expect(new URL(page.url()).pathname).toBe(address);
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
      return page;
    });
    for (const page of opened) await page.context().close();
  },
});
