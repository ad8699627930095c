import { readdirSync, readFileSync } from 'node:fs';
import { join, relative, resolve } from 'node:path';
import { expect, it } from 'vitest';

const root = resolve(import.meta.dirname, '..');
// Made by the tools, or kept out of the repository.
const MADE = new Set([
  'node_modules',
  '.git',
  '.next',
  'dist',
  'data',
  'test-results',
  'playwright-report',
  'coverage',
  'contact-sheet',
]);
const TEXT = /\.(tsx?|mjs|json|md|css|sql|svg|sh|py)$|^(run|\.gitignore)$/;

function walk(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) return MADE.has(entry.name) ? [] : walk(path);
    return TEXT.test(entry.name) ? [path] : [];
  });
}

// Put together here, so that this file does not name them itself.
const OUTSIDE = [
  ['a folder beside the checkout', new RegExp(`${['\\.\\.', 'shared'].join('/')}\\b`)],
  ["somebody's home", new RegExp(['', '(root|home/\\w+|Users/\\w+)', ''].join('/'))],
  ["one machine's working folder", new RegExp(['', 'work', '(main|shared)\\b'].join('/'))],
  ['a package registry', new RegExp(['registry', 'npmjs', 'org'].join('\\.'))],
] as const;

const files = walk(root);

it.each(OUTSIDE)('no file names %s', (_, pattern) => {
  expect(files.length).toBeGreaterThan(200);
  const found = files.filter((file) => pattern.test(readFileSync(file, 'utf8'))).map((file) => relative(root, file));
  expect(found).toEqual([]);
});

it('no import climbs out of the checkout', () => {
  const climbing = files
    .filter((file) => /\.(tsx?|mjs)$/.test(file))
    .flatMap((file) => {
      const text = readFileSync(file, 'utf8');
      return [...text.matchAll(/(?:from|import)\s*\(?\s*'(\.[^']+)'/g)]
        .map(([, specifier = '']) => resolve(file, '..', specifier))
        .filter((target) => relative(root, target).startsWith('..'));
    });
  expect(climbing).toEqual([]);
});
