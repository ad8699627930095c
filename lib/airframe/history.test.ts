import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { begin, canRedo, canUndo, type History, record, redo, undo } from './history';

const steps = (...values: string[]): History<string> =>
  values.slice(1).reduce((h, v) => record(h, v), begin(values[0] ?? ''));

describe('history', () => {
  it('goes back and forward through what was done', () => {
    const h = steps('a', 'b', 'c');
    expect(undo(h).present).toBe('b');
    expect(undo(undo(h)).present).toBe('a');
    expect(redo(undo(h)).present).toBe('c');
    expect(canUndo(h)).toBe(true);
    expect(canRedo(undo(h))).toBe(true);
  });
  it('stays where there is nothing to go to', () => {
    const h = begin('a');
    expect(undo(h)).toBe(h);
    expect(redo(h)).toBe(h);
    expect(canUndo(h)).toBe(false);
  });
  it('the same value is no step; a new one forgets what was undone', () => {
    const h = steps('a', 'b');
    expect(record(h, 'b')).toBe(h);
    const branched = record(undo(h), 'd');
    expect(canRedo(branched)).toBe(false);
    expect(undo(branched).present).toBe('a');
  });
  it('keeps only so many steps', () => {
    const h = [1, 2, 3, 4, 5].reduce((history, value) => record(history, value, 3), begin(0));
    expect(h.past).toEqual([2, 3, 4]);
  });
  it('undoing all and redoing all is where it was, and no step changes an old history', () => {
    fc.assert(
      fc.property(fc.array(fc.integer(), { minLength: 1, maxLength: 20 }), (values) => {
        const end = values.reduce((h, v) => record(h, v), begin<number>(-1.5));
        const frozen = structuredClone(end);
        const back = values.reduce((h) => undo(h), end);
        expect(back.present).toBe(-1.5);
        expect(values.reduce((h) => redo(h), back)).toEqual(end);
        expect(end).toEqual(frozen);
      }),
    );
  });
});
