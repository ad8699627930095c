import { readFileSync } from 'node:fs';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { canonicalText } from '@/lib/airframe/canonical';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { screenFromMm } from '../sheet/fold';
import { type Board, createBoard } from './board';
import { current } from './session';

const base: Airframe = JSON.parse(readFileSync('examples/tarrel-620.json', 'utf8'));
const boardOf = (readOnly = false) =>
  createBoard({ airframe: base, readOnly, save: { kind: 'off' }, system: 'metric' });
const lengthOf = (airframe: Airframe) => airframe.surfaces.find(({ id }) => id === 'wing')?.panels[0]?.lengthMm;
const handle = (board: Board, id: string) => {
  const found = board.scene().handles.find((each) => each.id === id);
  if (found === undefined) throw new RangeError(`the example has no ${id}`);
  return found;
};

beforeEach(() => {
  vi.stubGlobal('requestAnimationFrame', () => 1);
  vi.stubGlobal('cancelAnimationFrame', () => {});
});
afterEach(() => vi.unstubAllGlobals());

describe('board', () => {
  it('follows the hand, and makes one step of a whole drag', () => {
    const board = boardOf();
    const { value } = handle(board, 'wing/span');
    board.begin('wing/span', value);
    for (const more of [10, 40, 80]) {
      board.move(value + more);
      expect(handle(board, 'wing/span').value).toBeCloseTo(value + more, 6);
    }
    board.release();
    expect(lengthOf(board.store.getState().history.present)).toBeCloseTo((value + 80) / 2, 6);
    board.undo();
    expect(canonicalText(current(board.store.getState()))).toBe(canonicalText(base));
    board.redo();
    expect(handle(board, 'wing/span').value).toBeCloseTo(value + 80, 6);
  });

  it('says why a drag stopped until the next act', () => {
    const board = boardOf();
    const { value, max } = handle(board, 'wing/span');
    board.begin('wing/span', value);
    board.move(max + 500);
    board.release();
    const { stop } = board.store.getState();
    expect(stop?.handleId).toBe('wing/span');
    expect(stop?.reason).not.toBe('');
    board.select('boom');
    expect(board.store.getState().stop).toBeNull();
  });

  it('refuses a typed value that cannot stand, with a reason, and changes nothing', () => {
    const board = boardOf();
    const { max } = handle(board, 'wing/span');
    expect(board.type('wing/span', max + 1)).toMatch(/\w/);
    expect(board.store.getState().history.present).toBe(base);
    expect(board.type('wing/span', 640)).toBeNull();
    expect(lengthOf(board.store.getState().history.present)).toBeCloseTo(320, 6);
  });

  it('moves nothing for who may only look', () => {
    const board = boardOf(true);
    board.begin('wing/span', 620);
    board.move(700);
    board.release();
    board.type('wing/span', 700);
    expect(board.store.getState().history.present).toBe(base);
  });

  it('fits the sheet again when the aircraft has outgrown it, but not when the person moved the sheet', () => {
    const board = boardOf();
    board.resize({ width: 1200, height: 700, insetRight: 0 });
    const before = board.sheet();
    board.type('wing/span', 1240);
    const after = board.sheet();
    expect(after?.scale).toBeLessThan((before?.scale ?? 0) * 0.7);
    const tip = after && screenFromMm(after.plan, [50, 620]);
    expect(tip?.[1]).toBeGreaterThan(0);
    if (after === null) throw new RangeError('the sheet has a size');
    board.lay(after);
    board.type('wing/span', 2000);
    expect(board.sheet()).toBe(after);
    board.fit();
    expect(board.sheet()?.scale).toBeLessThan(after.scale);
  });
});
