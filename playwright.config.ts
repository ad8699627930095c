import { defineConfig, devices } from '@playwright/test';

// Specs in tests/e2e run at both widths, light and dark. What stands in tests/e2e/stories is about what people do and does
// not depend on the look; it runs once. A test tagged as of a further viewer meets each width and each light once: half the
// time, and nothing that a second person sees differently is missed.

const sizes = { narrow: { width: 390, height: 844 }, wide: { width: 1440, height: 900 } } as const;
const looks = ['light', 'dark'] as const;
const STORIES = 'stories/**/*.spec.ts';

const pages = Object.entries(sizes).flatMap(([size, viewport]) =>
  looks.map((colorScheme) => ({
    name: `${size} ${colorScheme}`,
    testIgnore: STORIES,
    grepInvert: (size === 'wide') === (colorScheme === 'dark') ? /@further-viewer/ : undefined,
    use: { viewport, colorScheme },
  })),
);

export default defineConfig({
  testDir: 'tests/e2e',
  outputDir: 'test-results/browser',
  globalSetup: './tests/e2e/support/server.ts',
  // One database behind one server on a small machine.
  workers: 1,
  fullyParallel: false,
  forbidOnly: true,
  retries: 0,
  timeout: 90_000,
  expect: { timeout: 15_000 },
  reporter: 'list',
  use: {
    ...devices['Desktop Chrome'],
    launchOptions: {
      executablePath: process.env.FOLDSPAR_CHROMIUM ?? '/usr/bin/chromium',
      // Chromium's sandbox refuses to work for root.
      args: process.getuid?.() === 0 ? ['--no-sandbox'] : [],
    },
    screenshot: 'only-on-failure',
    trace: 'retain-on-failure',
  },
  projects: [
    ...pages,
    { name: 'stories', testMatch: STORIES, use: { viewport: sizes.wide, colorScheme: 'light', acceptDownloads: true } },
  ],
});
