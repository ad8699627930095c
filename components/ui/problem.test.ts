import { describe, expect, it } from 'vitest';
import { ApiProblem, Unreachable } from '@/client/api';
import { ui } from '@/lib/text/en/pages';
import { problemOf } from './problem';

const problem = (errors: { path: string; code: string; message: string; fix?: string }[]) =>
  new ApiProblem({
    type: 'about:blank',
    title: 'Refused',
    status: 422,
    detail: 'Two fields are wrong',
    instance: '/x',
    errors,
  });

describe('problemOf', () => {
  it('puts each message at its field, the first one winning, with what to do', () => {
    const found = problemOf(
      problem([
        { path: 'roles.0', code: 'a', message: 'unknown role', fix: 'Pick one of the four.' },
        { path: 'roles.1', code: 'b', message: 'second' },
        { path: 'email', code: 'c', message: 'not an address' },
      ]),
    );
    expect(found).toEqual({
      message: 'Two fields are wrong',
      fields: { roles: 'unknown role. Pick one of the four.', email: 'not an address' },
    });
  });
  it('says that nobody answered', () => {
    expect(problemOf(new Unreachable('no answer'))).toEqual({ message: ui.unreachable, fields: {} });
  });
  it('does not swallow a fault of the program', () => {
    expect(() => problemOf(new TypeError('broken'))).toThrow('broken');
  });
});
