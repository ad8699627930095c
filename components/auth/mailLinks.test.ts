import { describe, expect, it } from 'vitest';
import { mailPieces } from './mailLinks';

describe('mailPieces', () => {
  it('cuts a mail at its link and loses nothing', () => {
    const text = 'Hello Ines,\n\nopen this:\n\nhttp://127.0.0.1:3000/reset?token=Ab_1\n\nOnce.\n';
    const pieces = mailPieces(text);
    expect(pieces.filter(({ link }) => link)).toEqual([{ text: 'http://127.0.0.1:3000/reset?token=Ab_1', link: true }]);
    expect(pieces.map((piece) => piece.text).join('')).toBe(text);
  });
  it('makes no link of what is not a web address', () => {
    expect(mailPieces('javascript:alert(1) data:text/html,x').every(({ link }) => !link)).toBe(true);
  });
  it('begins with a link when the mail does', () => {
    expect(mailPieces('https://a.example/b c')).toEqual([
      { text: 'https://a.example/b', link: true },
      { text: ' c', link: false },
    ]);
  });
});
