import { defineConfig } from 'vitest/config';

const unit = [
  'lib/**/*.test.ts',
  'components/**/*.test.{ts,tsx}',
  'client/**/*.test.ts',
  'server/**/*.test.ts',
  'scripts/**/*.test.ts',
  'db/**/*.test.ts',
];

export default defineConfig({
  resolve: { tsconfigPaths: true },
  test: {
    projects: [
      { extends: true, test: { name: 'unit', include: [...unit, 'tests/*.test.ts', 'tests/regression/**/*.test.ts'] } },
      { extends: true, test: { name: 'published', include: ['tests/published/**/*.test.ts'] } },
      { extends: true, test: { name: 'plan', include: ['tests/plan/**/*.test.ts'], testTimeout: 300_000 } },
      {
        extends: true,
        test: {
          name: 'db',
          include: ['tests/db/**/*.test.ts', 'tests/scripts/**/*.test.ts'],
          testTimeout: 60_000,
          hookTimeout: 120_000,
          fileParallelism: false,
        },
      },
      {
        extends: true,
        test: {
          name: 'api',
          include: ['tests/api/**/*.test.ts'],
          testTimeout: 60_000,
          hookTimeout: 180_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
