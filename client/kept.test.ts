import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { dropDraft, dropTry, keepDraft, keepTry, keptDraft, keptTry } from './kept';

/** A browser's store with as much room as the test allows. */
class Drawer {
  readonly items = new Map<string, string>();
  room = Number.POSITIVE_INFINITY;
  getItem(key: string): string | null {
    return this.items.get(key) ?? null;
  }
  setItem(key: string, value: string): void {
    if (value.length > this.room) throw new DOMException('full', 'QuotaExceededError');
    this.items.set(key, value);
  }
  removeItem(key: string): void {
    this.items.delete(key);
  }
}

let drawer = new Drawer();
beforeEach(() => {
  drawer = new Drawer();
  vi.stubGlobal('window', { localStorage: drawer });
});
afterEach(() => vi.unstubAllGlobals());

describe('kept drafts', () => {
  const kept = { version: 12, holder: 'this page', airframe: { name: 'Tarrel 620' } };

  it('gives back what was kept, per design', () => {
    expect(keepDraft('d1', kept)).toBe(true);
    expect(keptDraft('d1')).toEqual(kept);
    expect(keptDraft('d2')).toBeNull();
  });

  it('drops only what the same page kept', () => {
    keepDraft('d1', kept);
    dropDraft('d1', 'another page');
    expect(keptDraft('d1')).toEqual(kept);
    dropDraft('d1', 'this page');
    expect(keptDraft('d1')).toBeNull();
  });

  it('says when there is no room, and keeps what was there', () => {
    keepDraft('d1', kept);
    drawer.room = 10;
    expect(keepDraft('d1', { ...kept, version: 13 })).toBe(false);
    expect(keptDraft('d1')?.version).toBe(12);
  });

  it.each(['{"version":3', '[]', '{"version":"3","holder":"a","airframe":{}}', '{"version":3,"holder":"a"}'])(
    'takes %s for nothing',
    (text) => {
      drawer.items.set('foldspar.draft.d1', text);
      expect(keptDraft('d1')).toBeNull();
    },
  );
});

it('keeps a visitor’s aircraft until it is dropped', () => {
  expect(keptTry()).toBeNull();
  keepTry({ name: 'First try' });
  expect(keptTry()).toEqual({ name: 'First try' });
  dropTry();
  expect(keptTry()).toBeNull();
});
