import { describe, expect, it } from 'vitest';
import { nextPath } from './nextPath';

describe('nextPath', () => {
  it.each(['/w', '/try', '/invite/Ab-3_x', '/w/0b8f-22'])('goes to %s', (path) => expect(nextPath(path)).toBe(path));
  it.each([
    undefined,
    '',
    'w',
    '//elsewhere.example',
    '/\\elsewhere.example',
    '/invite/../../api',
    '/invite/a?next=//b',
    '/invite/a\n',
    '/w//elsewhere.example',
    'https://elsewhere.example/w',
    'javascript:alert(1)',
    '/\t/elsewhere.example',
  ])('never leaves the list for %j', (path) => expect(nextPath(path)).toBe('/w'));
});
