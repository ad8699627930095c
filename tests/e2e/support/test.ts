import { type BrowserContext, test as base, type ConsoleMessage, type Page } from '@playwright/test';
import { type DemoName, signIn } from './people';

export { expect } from '@playwright/test';

export interface Complaints {
  /** What the consoles complained about so far: errors, and anything that names the policy. */
  readonly seen: readonly string[];
  /** Lets one complaint pass that the test brings about itself, such as a refused request. */
  expectOne(pattern: RegExp): void;
}

function listen(page: Page, into: string[]): void {
  page.on('console', (message: ConsoleMessage) => {
    const text = message.text();
    if (message.type() === 'error' || /content security policy/i.test(text))
      into.push(`${page.url()}: ${text} (${message.location().url})`);
  });
  page.on('pageerror', (error) => into.push(`${page.url()}: ${error.message}`));
}

/** What is left of the complaints when each expected one has taken one away; an expected one that never came is left too. */
function unexpected(seen: readonly string[], expected: readonly RegExp[]): string[] {
  const left = [...seen];
  for (const pattern of expected) {
    const at = left.findIndex((text) => pattern.test(text));
    if (at >= 0) left.splice(at, 1);
    else left.push(`expected and not seen: ${pattern}`);
  }
  return left;
}

interface Fixtures {
  readonly complaints: Complaints & { readonly watch: (context: BrowserContext) => void };
  /** Opens a browser of its own, in which nobody is signed in. */
  readonly openBrowser: () => Promise<Page>;
  /** Opens a browser of its own for a demo person and signs them in there. */
  readonly openAs: (name: DemoName) => Promise<Page>;
}

/**
 * The test of every spec: knows where the server is, and fails when a page complained in its console, which is where a
 * violated security policy, a failed hydration and a missing file show.
 */
export const test = base.extend<Fixtures>({
  baseURL: process.env.FOLDSPAR_E2E_URL,
  complaints: [
    async ({ context }, use) => {
      const seen: string[] = [];
      const expected: RegExp[] = [];
      const watch = (watched: BrowserContext) => {
        watched.on('page', (page) => listen(page, seen));
      };
      watch(context);
      await use({ seen, watch, expectOne: (pattern) => expected.push(pattern) });
      const left = unexpected(seen, expected);
      if (left.length > 0) throw new Error(`the console complained:\n${left.join('\n')}`);
    },
    { auto: true },
  ],
  openBrowser: async ({ browser, complaints }, use) => {
    const contexts: BrowserContext[] = [];
    await use(async () => {
      const context = await browser.newContext();
      contexts.push(context);
      complaints.watch(context);
      return context.newPage();
    });
    for (const context of contexts) await context.close();
  },
  openAs: async ({ openBrowser }, use) => {
    await use(async (name) => {
      const page = await openBrowser();
      await signIn(page, name);
      return page;
    });
  },
});
