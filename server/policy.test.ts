import { expect, it } from 'vitest';
import { pagePolicy } from './policy';

const rule = (policy: string, name: string): string | undefined =>
  policy.split('; ').find((part) => part.startsWith(`${name} `));

it('lets a page run scripts with its nonce and nothing else', () => {
  const policy = pagePolicy('abc', false);
  expect(rule(policy, 'script-src')).toBe("script-src 'self' 'nonce-abc' 'strict-dynamic'");
  expect(rule(policy, 'frame-ancestors')).toBe("frame-ancestors 'none'");
  expect(rule(policy, 'object-src')).toBe("object-src 'none'");
  expect(rule(policy, 'connect-src')).toBe("connect-src 'self'");
});

it('gives a development server what it needs to load again, and only that', () => {
  expect(rule(pagePolicy('abc', true), 'script-src')).toContain("'unsafe-eval'");
  expect(rule(pagePolicy('abc', true), 'connect-src')).toBe("connect-src 'self' ws:");
});
