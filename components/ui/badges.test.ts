import { describe, expect, it } from 'vitest';
import { VERDICTS } from '@/lib/contract/bodies';
import { FIGURE_BADGES, STATE_BADGES, THREAD_BADGES, VERDICT_BADGES } from './badges';

const TABLES = [FIGURE_BADGES, STATE_BADGES, VERDICT_BADGES, THREAD_BADGES];

describe('badges', () => {
  it.each(TABLES)('never let two states of a kind share word and icon', (table) => {
    const looks = Object.values(table).map((look) => `${look.word}/${look.icon}`);
    expect(new Set(looks).size).toBe(looks.length);
    expect(looks.length).toBeGreaterThan(1);
  });
  it.each(TABLES)('always say a word', (table) => {
    for (const { word } of Object.values(table)) expect(word.trim()).not.toBe('');
  });
  it('holds a revision with the bad mark and clears it with the good one', () => {
    expect(STATE_BADGES.held.tone).toBe('bad');
    expect(STATE_BADGES.goodToCut.tone).toBe('good');
    expect(VERDICT_BADGES.hold.tone).toBe('bad');
  });
  it('has a look for each verdict of the contract and no other', () => {
    expect(Object.keys(VERDICT_BADGES).sort()).toEqual([...VERDICTS].sort());
  });
});
