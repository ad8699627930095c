import { describe, expect, it } from 'vitest';
import { MATERIALS } from '@/lib/airframe/defaults';
import type { Part } from '@/lib/parts/types';
import { assertParts } from '@/lib/parts/validate';
import { partOf, sizeOf } from '@/tests/support/aids';
import { board } from '@/tests/support/airframe';
import { bendingSpanMm, couponParts } from './coupon';
import { slotWidthMm } from './slots';

const BUILD = { kerfMm: 0.1 };
const coupon = (thicknessMm: number): Part[] => couponParts(board({ thicknessMm }), 'Board', BUILD);
const piece = (thicknessMm: number, what: string): Part =>
  partOf(coupon(thicknessMm), `aid/coupon/board/${what}/centre`);
/** Widths of a comb's slots by their marks, and as drawn. */
const slots = (comb: Part): { said: number; drawn: number }[] =>
  comb.operations.map(({ note, path: [a, b] }) => ({ said: Number(note), drawn: (b?.[0] ?? 0) - (a?.[0] ?? 0) }));

describe('the stock coupon', () => {
  it.each(Object.values(MATERIALS))('can be cut from $id', (material) => {
    const parts = couponParts(material, material.id, BUILD);
    expect(parts).toHaveLength(3);
    assertParts(parts);
  });

  it('has a square of 100 x 100 mm', () => {
    const [w, h] = sizeOf(piece(5, 'square').outline);
    expect([w, h]).toEqual([100, 100]);
  });

  it('has a strip of 30 mm that bends over 200 mm, with the load in the middle', () => {
    const { outline, operations } = piece(5, 'strip');
    expect(sizeOf(outline)).toEqual([250, 30]);
    const at = (id: string): number => operations.find((one) => one.id === id)?.path[0]?.[0] ?? Number.NaN;
    expect(at('support-2') - at('support-1')).toBe(200);
    expect(at('load') - at('support-1')).toBe(100);
  });

  it('bends board along its grain, and shows it', () => {
    const grained = couponParts(board({ grain: 'alongWidth' }), 'Board', BUILD);
    const strip = partOf(grained, 'aid/coupon/board/strip/centre');
    expect(strip.grainDeg).toBe(0);
    expect(strip.operations.map(({ id }) => id)).toContain('grain');
    expect(partOf(grained, 'aid/coupon/board/comb/centre').grainDeg).toBeNull();
  });

  it.each([
    { thicknessMm: 5, span: 200 },
    { thicknessMm: 12.5, span: 200 },
    { thicknessMm: 13, span: 250 },
    { thicknessMm: 20, span: 350 },
  ])('bends $thicknessMm mm over $span mm: 16 times the thickness at least', ({ thicknessMm, span }) => {
    expect(bendingSpanMm(thicknessMm)).toBe(span);
  });

  it.each([5, 5.5, 6])('has slots of 4.4 to 6.6 mm by 0.2 for %s mm', (thicknessMm) => {
    const said = slots(piece(thicknessMm, 'comb')).map((one) => one.said);
    expect(said).toEqual([4.4, 4.6, 4.8, 5, 5.2, 5.4, 5.6, 5.8, 6, 6.2, 6.4, 6.6]);
  });

  it.each([3, 10, 20])('has as many slots about %s mm', (thicknessMm) => {
    const said = slots(piece(thicknessMm, 'comb')).map((one) => one.said);
    expect(said).toHaveLength(12);
    expect(Math.min(...said)).toBeLessThanOrEqual(thicknessMm - 0.8);
    expect(Math.max(...said)).toBeGreaterThanOrEqual(thicknessMm + 0.8);
  });

  it('draws a slot as any slot is drawn that is made to what the comb told', () => {
    // A board of 5.0 mm that is held by 5.2: the clearance is 0.2.
    const gripping = slots(piece(5, 'comb')).find(({ said }) => said === 5.2);
    expect(gripping?.drawn).toBeCloseTo(slotWidthMm(5, { ...BUILD, slotClearanceMm: 0.2 }), 9);
  });
});
