import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { startFrom } from '@/lib/airframe/layouts';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { balance, type Weighed } from './balance';
import { ballastG, ballastPlace, extentX } from './ballast';

const lines: Weighed[] = [
  { key: 'wing', massG: 120, at: [80, 0, 0] },
  { key: 'motor', massG: 90, at: [240, 3, 0] },
];
const resolved = (airframe: Airframe) => {
  const result = resolve(airframe);
  if (!result.ok) throw new RangeError('the layout resolves');
  return result.value;
};

describe('ballast', () => {
  it('by hand: 400 g at 70 mm want 20 g at -130 mm to come to 60.48 mm', () => {
    expect(ballastG(400, 70, 70 - 200 / 21, -130)).toBeCloseTo(20, 9);
  });
  it('added, the CG is where it was wanted', () => {
    const { massG, cg } = balance(lines);
    fc.assert(
      fc.property(fc.integer({ min: -300, max: 140 }), fc.integer({ min: 1, max: 400 }), (wanted, ahead) => {
        const added = ballastG(massG, cg[0], wanted, wanted - ahead) ?? Number.NaN;
        const all = [...lines, { key: 'ballast', massG: added, at: [wanted - ahead, 0, 0] as const }];
        expect(balance(all).cg[0]).toBeCloseTo(wanted, 6);
      }),
    );
  });
  it('is nothing where nothing is wanted, and refused on the wrong side and at the place itself', () => {
    expect(ballastG(400, 70, 70, 70)).toBe(0);
    expect(ballastG(400, 70, 60, 65)).toBeNull();
    expect(ballastG(400, 70, 60, 60)).toBeNull();
    expect(ballastG(400, 70, 80, 20)).toBeNull();
  });
});

describe('where ballast goes', () => {
  const base = startFrom('pusher', 'Test');
  const ballastAt = (id: string, x: number): Airframe['items'][number] => ({
    id,
    kind: 'ballast',
    massG: 5,
    sizeMm: [10, 10, 10],
    mount: { to: 'datum', at: [x, 0, 0] },
  });
  it('the aircraft reaches from the pod’s nose to the booms’ and tail’s end', () => {
    // Pod at -230; booms from 40 on 500 mm; the tail hangs 105 mm ahead of their ends and is 105 mm deep.
    expect(extentX(base, resolved(base))).toEqual([-230, 540]);
  });
  it('is inside an end, unless the document has ballast on that side', () => {
    const place = (document: Airframe, side: 'nose' | 'tail') =>
      ballastPlace(document, resolved(document), 30, side, 10);
    expect(place(base, 'nose')).toEqual({ xMm: -220, at: 'nose' });
    expect(place(base, 'tail')).toEqual({ xMm: 530, at: 'tail' });
    const held = { ...base, items: [...base.items, ballastAt('lead', -90), ballastAt('lead-2', -120)] };
    expect(place(held, 'nose')).toEqual({ xMm: -120, at: { itemId: 'lead-2' } });
    expect(place(held, 'tail')).toEqual({ xMm: 530, at: 'tail' });
  });
});
