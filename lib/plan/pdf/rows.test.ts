import { describe, expect, it } from 'vitest';
import { endMm, flow, linesIn, type Section, wrapByCount } from './rows';

const rows = (count: number): string[] => Array.from({ length: count }, (_, i) => `row ${i}`);
const room = (roomMm: number, whole = false) => ({ widthMm: 180, roomMm: () => roomMm, whole });
const titlesAlone = (pages: ReturnType<typeof flow>) => pages.filter((page) => page.at(-1)?.kind === 'heading');

describe('wrapByCount', () => {
  it('breaks between words, and a longer word by letters', () => {
    expect(wrapByCount('one two three', 7)).toEqual(['one two', 'three']);
    expect(wrapByCount('a verylongword', 6)).toEqual(['a', 'verylo', 'ngword']);
  });
});

describe('flow', () => {
  it.each([20, 31, 47, 90])('loses no row, keeps inside %d mm, and leaves no heading alone', (roomMm) => {
    const sections: Section[] = [4, 1, 9, 0, 6].map((count, i) => ({ title: `title ${i}`, rows: rows(count) }));
    const pages = flow(sections, room(roomMm));
    expect(pages.length).toBeGreaterThan(1);
    expect(pages.flat().filter(({ kind }) => kind === 'first')).toHaveLength(20);
    // A section without rows has no heading either.
    expect(pages.flat().filter(({ kind }) => kind === 'heading')).toHaveLength(4);
    expect(titlesAlone(pages)).toEqual([]);
    for (const page of pages) {
      expect(endMm(page)).toBeLessThanOrEqual(roomMm);
      expect(page.length).toBeGreaterThan(0);
      for (const [i, { downMm }] of page.slice(1).entries()) expect(downMm).toBeGreaterThan(page[i]?.downMm ?? 0);
    }
  });

  it('breaks a row that is higher than a page', () => {
    const text = 'word '.repeat(900).trim();
    const pages = flow([{ title: 'much', rows: [text] }], room(40));
    expect(pages.length).toBeGreaterThan(2);
    for (const page of pages) expect(endMm(page)).toBeLessThanOrEqual(40);
    const said = pages.flat().filter(({ kind }) => kind !== 'heading');
    expect(said.map((line) => line.text).join(' ')).toBe(text);
  });

  it('begins a section on a new page rather than breaking it, when asked and when it fits there', () => {
    const sections = [
      { title: 'first', rows: rows(4) },
      { title: 'second', rows: rows(5) },
      { title: 'third', rows: rows(30) },
    ];
    const [first, second] = flow(sections, room(45, true));
    expect(first?.map(({ text }) => text)).not.toContain('second');
    expect(second?.[0]).toMatchObject({ kind: 'heading', text: 'second', downMm: 0 });
    expect(flow(sections, room(45))[0]?.map(({ text }) => text)).toContain('second');
  });

  it('is one empty page without anything', () => {
    expect(flow([], room(40))).toEqual([[]]);
    expect(endMm([])).toBe(0);
  });

  it('takes fewer letters to a line where they are larger', () => {
    const text = 'Measured with a rule at the trailing edge, straight from neutral, at the widest chord of the control';
    expect(linesIn(text, 90, { capMm: 4 }).length).toBeGreaterThan(linesIn(text, 90, { capMm: 2 }).length);
  });
});
