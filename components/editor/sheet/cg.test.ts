import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { handles, setHandle } from '@/lib/airframe/handles';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { balance } from '@/lib/balance/balance';
import { massList } from '@/lib/balance/masses';
import { develop } from '@/lib/parts/develop';
import { cgNow, type Places } from './cg';

const example: Airframe = JSON.parse(readFileSync('examples/tarrel-620.json', 'utf8'));

function weighed(airframe: Airframe) {
  const resolved = resolve(airframe);
  if (!resolved.ok) throw new RangeError('the example resolves');
  return { masses: massList(airframe, resolved.value, develop(airframe)), places: resolved.value.places };
}

const places = (entries: Record<string, readonly [number, number, number]>): Places =>
  new Map(Object.entries(entries).map(([elementId, at]) => [elementId, { elementId, at }]));

describe('cgNow', () => {
  it('moves the CG by the moved mass times its way over the whole mass', () => {
    const masses = [
      { key: 'wing/p1/sheet/stbd', name: 'w', group: 'foam', massG: 140, at: [80, 3, 2] },
      { key: 'pack', name: 'p', group: 'item', massG: 60, at: [-110, 0, -30] },
    ] as const;
    const then = places({ wing: [0, 0, 0], pack: [-110, 0, -30] });
    const now = places({ wing: [0, 0, 0], pack: [-90, 0, -30] });
    const still = cgNow(masses, then, then);
    const moved = cgNow(masses, then, now);
    // By hand: (140 * 80 - 60 * 110) / 200 = 23, and 60 * 20 / 200 = 6 further aft.
    expect(still?.[0]).toBeCloseTo(23, 9);
    expect(moved?.[0]).toBeCloseTo(29, 9);
    expect(moved?.[1]).toBeCloseTo(2.1, 9);
  });

  it.each(['pack/x', 'motor/x', 'esc/x'])('agrees with the whole balance after %s moved', (handleId) => {
    const handle = handles(example).find(({ id }) => id === handleId);
    if (handle === undefined) throw new RangeError(`the example has no ${handleId}`);
    const before = weighed(example);
    // Towards whichever end of its range is further: it has to move far enough to be seen.
    const end = handle.max - handle.value > handle.value - handle.min ? handle.max : handle.min;
    const { airframe, value } = setHandle(example, handleId, handle.value + (end - handle.value) * 0.4);
    expect(Math.abs(value - handle.value)).toBeGreaterThan(4);
    const after = weighed(airframe);
    const quick = cgNow(before.masses, before.places, after.places);
    const whole = balance(after.masses).cg;
    expect(quick?.[0]).toBeCloseTo(whole[0], 6);
    expect(quick?.[2]).toBeCloseTo(whole[2], 6);
    expect(Math.abs(whole[0] - balance(before.masses).cg[0])).toBeGreaterThan(0.1);
  });

  it('has none when nothing weighs anything', () => {
    expect(cgNow([], new Map(), new Map())).toBeNull();
  });
});
