import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { begin, cancel, current, edit, preview, redoEdit, release, select, startSession, undoEdit } from './session';

const base: Airframe = JSON.parse(readFileSync('examples/tarrel-620.json', 'utf8'));
const change = (value: number, stopped: string | null = null) => ({
  airframe: { ...base, name: `span ${value}` },
  value,
  stopped,
});

describe('session', () => {
  it('begins with the main wing selected and nothing to undo', () => {
    const session = startSession(base);
    expect(session.selected).toBe('wing');
    expect(undoEdit(session).history.present).toBe(base);
  });

  it('makes one undo entry of a gesture, however many moves it had', () => {
    let session = begin(startSession(base), 'wing/span', 620);
    for (const value of [630, 655, 700]) session = preview(session, change(value));
    expect(current(session).name).toBe('span 700');
    expect(session.history.present).toBe(base);
    session = release(session);
    expect(current(session).name).toBe('span 700');
    expect(session.history.past).toEqual([base]);
    expect(undoEdit(session).history.present).toBe(base);
    expect(redoEdit(undoEdit(session)).history.present.name).toBe('span 700');
  });

  it('restores everything when the gesture is given up', () => {
    const moved = preview(begin(startSession(base), 'wing/span', 620), change(900, 'the sheet carries no more'));
    expect(moved.gesture?.stopped).toBe('the sheet carries no more');
    const session = cancel(moved);
    expect(current(session)).toBe(base);
    expect(session.history.past).toEqual([]);
    expect(session.gesture).toBeNull();
  });

  it('makes no entry of a gesture that ends where it began', () => {
    const session = release(preview(preview(begin(startSession(base), 'wing/span', 620), change(640)), change(620)));
    expect(session.history.past).toEqual([]);
    expect(current(session)).toBe(base);
  });

  it('selects the wing again when what was selected is gone', () => {
    const without: Airframe = { ...base, items: base.items.filter(({ id }) => id !== 'pack') };
    const session = edit(select(startSession(base), 'pack'), without);
    expect(session.selected).toBe('wing');
    expect(undoEdit(session).history.present).toBe(base);
    expect(edit(select(startSession(base), 'boom'), without).selected).toBe('boom');
  });

  it('ignores a move without a gesture', () => {
    const session = startSession(base);
    expect(preview(session, change(800))).toBe(session);
    expect(release(session)).toBe(session);
  });

  it('gives up a gesture when something else is undone or typed', () => {
    const gesturing = preview(begin(edit(startSession(base), change(610).airframe), 'wing/span', 610), change(777));
    expect(current(undoEdit(gesturing))).toBe(base);
    expect(current(edit(gesturing, change(650).airframe)).name).toBe('span 650');
  });

  it('comes back to the first airframe after as many undos as there were edits', () => {
    type Act = { readonly kind: 'edit' | 'drag' | 'cancelled' | 'select'; readonly value: number };
    const act: fc.Arbitrary<Act> = fc.record({
      kind: fc.constantFrom('edit', 'drag', 'cancelled', 'select'),
      value: fc.integer({ min: 1, max: 2000 }),
    });
    fc.assert(
      fc.property(fc.array(act, { maxLength: 40 }), (acts) => {
        let session = startSession(base);
        for (const { kind, value } of acts) {
          if (kind === 'edit') session = edit(session, change(value).airframe);
          if (kind === 'select') session = select(session, 'boom');
          if (kind === 'drag') session = release(preview(begin(session, 'h', 0), change(value)));
          if (kind === 'cancelled') session = cancel(preview(begin(session, 'h', 0), change(value)));
        }
        const edits = acts.filter(({ kind }) => kind === 'edit' || kind === 'drag').length;
        expect(session.history.past).toHaveLength(edits);
        for (let step = 0; step < edits; step += 1) session = undoEdit(session);
        expect(current(session)).toBe(base);
      }),
    );
  });
});
