import { describe, expect, it } from 'vitest';
import { PASSWORD_MAX, passwordFault } from './password';

describe('passwordFault', () => {
  it.each([
    'password123',
    '12345678901',
    '0987654321',
    'abcdefghij',
    'aaaaaaaaaaaa',
    'qwertyuiop',
    '2020202020',
    '  Password!!',
  ])('calls "%s" one of the first guesses', (password) => {
    expect(passwordFault(password, {})).toBe('common');
  });

  it('does not look at one that is too long anyway, however it is made', () => {
    const long = `${'1'.repeat(PASSWORD_MAX)}a1`;
    expect(passwordFault(long, {})).toBeNull();
    expect(passwordFault('1'.repeat(PASSWORD_MAX), {})).toBe('common');
    expect(passwordFault('1'.repeat(PASSWORD_MAX + 1), {})).toBeNull();
  });

  it.each(['seven-geese-over-the-tarn', 'k7#mmq2Lw9', 'correct horse', 'ножницы-и-клей', '4 balsa sticks, 9 pins'])(
    'takes "%s"',
    (password) => {
      expect(passwordFault(password, { name: 'Nora New', email: 'nora@example.test' })).toBeNull();
    },
  );

  it.each(['nora.new@example.test', 'NoraNew2026', 'nora new!!'])('finds the person in "%s"', (password) => {
    expect(passwordFault(password, { name: 'Nora New', email: 'nora.new@example.test' })).toBe('holds-name');
  });
});
