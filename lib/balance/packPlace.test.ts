import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { startFrom } from '@/lib/airframe/layouts';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Item } from '@/lib/airframe/schema/equipment';
import { balance, type Weighed } from './balance';
import { mainPacks, moveFor, otherPacks, packRange } from './packPlace';

const lines: Weighed[] = [
  { key: 'pack', massG: 100, at: [-50, 0, 0] },
  { key: 'rest', massG: 300, at: [90, 4, 2] },
];
const moved = (by: number, keys = ['pack']): Weighed[] =>
  lines.map((line) => (keys.includes(line.key) ? { ...line, at: [line.at[0] + by, line.at[1], line.at[2]] } : line));

describe('where the pack must sit', () => {
  it('by hand: 400 g balance at 55 mm, so 100 g go 20 mm aft for 60 mm', () => {
    expect(moveFor(lines, ['pack'], 60)).toBeCloseTo(20, 9);
  });
  it('put there, the CG is where it was wanted', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -100, max: 200, noNaN: true }),
        fc.subarray(['pack', 'rest'], { minLength: 1 }),
        (wanted, keys) => {
          expect(balance(moved(moveFor(lines, keys, wanted), keys)).cg[0]).toBeCloseTo(wanted, 6);
        },
      ),
    );
  });
  it('says what the slide reaches of it', () => {
    const range = packRange(lines, ['pack'], [60, 65], [-10, 30]);
    expect(range.foreMm).toBeCloseTo(20, 9);
    expect(range.aftMm).toBeCloseTo(40, 9);
    expect(range.reached?.[0]).toBeCloseTo(20, 9);
    expect(range.reached?.[1]).toBe(30);
    expect(range.cgPerMm).toBe(0.25);
  });
  it('says when it reaches none, and when it is free', () => {
    expect(packRange(lines, ['pack'], [60, 65], [-50, 10]).reached).toBeNull();
    const free = packRange(lines, ['pack'], [60, 65]);
    expect(free.reached).toEqual([free.foreMm, free.aftMm]);
  });
  it('refuses a mass that is not there and a range that runs backwards', () => {
    expect(() => moveFor(lines, ['ballast'], 60)).toThrow(/ballast/);
    expect(() => packRange(lines, ['pack'], [65, 60])).toThrow(RangeError);
  });
});

describe('other packs', () => {
  it('by hand: 150 g in the same place', () => {
    const [heavier] = otherPacks(lines, ['pack'], [1.5], 60);
    expect(heavier?.massG).toBe(150);
    expect(heavier?.allUpMassG).toBe(450);
    expect(heavier?.cgXMm).toBeCloseTo((300 * 90 - 150 * 50) / 450, 9);
    // 450 g at 60 mm are 27 000 g mm; the rest gives them all, so the pack must come to the datum.
    expect(heavier?.moveMm).toBeCloseTo(50, 9);
  });
  it('moved as it says, each brings the CG where it is wanted', () => {
    for (const { massG, moveMm } of otherPacks(lines, ['pack'], [0.5, 0.75, 2], 70)) {
      const changed = moved(moveMm).map((line) => (line.key === 'pack' ? { ...line, massG } : line));
      expect(balance(changed).cg[0]).toBeCloseTo(70, 9);
    }
  });
  it('the same pack changes nothing', () => {
    expect(otherPacks(lines, ['pack'], [1], 55)[0]).toMatchObject({
      massG: 100,
      allUpMassG: 400,
      cgXMm: 55,
      moveMm: 0,
    });
  });
});

describe('the packs that balance an aircraft', () => {
  const base = startFrom('pusher', 'Test');
  const pack = (id: string, massG: number, slide?: Item['slide']): Item => ({
    id,
    kind: 'pack',
    massG,
    sizeMm: [60, 30, 20],
    mount: { to: 'datum', at: [0, 0, 0] },
    ...(slide ? { slide } : {}),
  });
  const withPacks = (items: Item[], packItemIds: string[]): Airframe => ({
    ...base,
    items,
    drives: base.drives.flatMap(({ packItemId: _, ...drive }) =>
      packItemIds.length === 0 ? [drive] : packItemIds.map((packItemId) => ({ ...drive, id: packItemId, packItemId })),
    ),
  });
  it('is the drive’s own, not the heavier one beside it', () => {
    const document = withPacks([pack('flight', 70, { fromMm: -12, toMm: 45 }), pack('receiver', 90)], ['flight']);
    expect(mainPacks(document)).toEqual({ keys: ['flight'], travelMm: [-12, 45] });
  });
  it('are two that move together as far as both can', () => {
    const slides = [
      { fromMm: -12, toMm: 45 },
      { fromMm: -30, toMm: 20 },
    ] as const;
    const document = withPacks([pack('a', 70, slides[0]), pack('b', 70, slides[1])], ['a', 'b']);
    expect(mainPacks(document)).toEqual({ keys: ['a', 'b'], travelMm: [-12, 20] });
  });
  it('is the heaviest when no drive names one; free without a slide; none without packs', () => {
    expect(mainPacks(withPacks([pack('a', 40), pack('b', 70)], []))).toEqual({ keys: ['b'], travelMm: null });
    expect(mainPacks(withPacks([pack('a', 0)], []))).toBeNull();
  });
});
