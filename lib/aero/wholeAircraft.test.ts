import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { airframe, body, drive } from '@/tests/support/airframe';
import { fin, packAt, tail, wing } from '@/tests/support/plainAircraft';
import type { AeroModel } from './model';
import { type AeroMemory, newAeroMemory, wholeAircraft } from './wholeAircraft';

const REFERENCE = { area: 180_000, chord: 181, span: 1000, point: [60, 0, 0] as const };

function model(document: Airframe, corrections = { bodies: true, propellers: true }, memory?: AeroMemory): AeroModel {
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('refused');
  const result = wholeAircraft(document, resolved.value, REFERENCE, corrections, memory);
  if (!result.ok) throw new RangeError(result.problems.map((p) => p.message).join());
  return result.value;
}

const pod = body({
  mount: { to: 'datum', at: [-200, 0, 0] },
  stations: [
    { id: 'a', xMm: 0, widthMm: 60, topMm: 30, bottomMm: -30, cornerMm: 0 },
    { id: 'b', xMm: 400, widthMm: 60, topMm: 30, bottomMm: -30, cornerMm: 0 },
  ],
});
const at = (x: number) => drive({ mount: { to: 'datum', at: [x, 0, 0] } });
const bare = airframe({ surfaces: [wing(), tail(), fin()], items: [packAt(0)], bodies: [], drives: [] });

describe('the whole aircraft', () => {
  it('is its surfaces when it has neither body nor propeller', () => {
    const { alpha, contributions, neutralPointX } = model(bare);
    expect(contributions[0]?.alpha).toEqual(alpha);
    expect(neutralPointX).toBeCloseTo(60 - (alpha.pitch / alpha.lift) * 181, 9);
  });

  it('a body ahead of the wing brings the neutral point forward and makes it weathercock less', () => {
    const with_ = model({ ...bare, bodies: [pod] });
    expect(with_.neutralPointX).toBeLessThan(model(bare).neutralPointX - 1);
    const still = { alphaRad: 0, deflectionsRad: new Map() };
    expect(with_.lateral(still).beta.yaw).toBeLessThan(model(bare).lateral(still).beta.yaw);
  });

  it('a propeller in front takes steadiness, one behind gives it, in pitch and in yaw', () => {
    const still = { alphaRad: 0, deflectionsRad: new Map() };
    const none = model(bare);
    const [ahead, behind] = [at(-220), at(300)].map((one) => model({ ...bare, drives: [one] }));
    expect(ahead?.neutralPointX).toBeLessThan(none.neutralPointX);
    expect(behind?.neutralPointX).toBeGreaterThan(none.neutralPointX);
    expect(ahead?.lateral(still).beta.yaw).toBeLessThan(none.lateral(still).beta.yaw);
    expect(behind?.lateral(still).beta.yaw).toBeGreaterThan(none.lateral(still).beta.yaw);
    // Both damp.
    expect(ahead?.pitchRate.pitch).toBeLessThan(none.pitchRate.pitch);
    expect(behind?.pitchRate.pitch).toBeLessThan(none.pitchRate.pitch);
  });

  it('counts only what it is asked to, and the sum is what it says it is made of', () => {
    const document = { ...bare, bodies: [pod], drives: [at(-220)] };
    const off = model(document, { bodies: false, propellers: false });
    expect(off.alpha).toEqual(model(bare).alpha);
    expect(off.contributions.map(({ name }) => name)).toEqual(['surfaces']);
    const { alpha, contributions } = model(document);
    expect(contributions.reduce((sum, c) => sum + c.alpha.pitch, 0)).toBeCloseTo(alpha.pitch, 12);
    expect(contributions.reduce((sum, c) => sum + c.alpha.lift, 0)).toBeCloseTo(alpha.lift, 12);
  });

  it('keeps factors when only a control or a CG changes, and answers the same as without', () => {
    const memory = newAeroMemory();
    model(bare, undefined, memory);
    const kept = memory.lattice.factors;
    const hinged: Airframe = {
      ...bare,
      surfaces: bare.surfaces.map((s) => ({
        ...s,
        controls: s.controls.map((c) => ({ ...c, chordShare: [0.2, 0.2] as [number, number], neutralDeg: 3 })),
      })),
    };
    const again = model(hinged, undefined, memory);
    expect(memory.lattice.factors).toBe(kept);
    const fresh = model(hinged);
    expect(again.alpha).toEqual(fresh.alpha);
    expect([...again.controls]).toEqual([...fresh.controls]);
    const longer: Airframe = { ...bare, surfaces: [wing(), tail(600), fin()] };
    expect(model(longer, undefined, memory).alpha).toEqual(model(longer).alpha);
    expect(memory.lattice.factors).not.toBe(kept);
  });

  it('drag by the far field of a plain wing is what its span efficiency says', () => {
    const alone = model({ ...bare, surfaces: [wing()] });
    const lift = alone.alpha.lift * 0.1;
    const drag = alone.inducedDrag({ alphaRad: 0.1, deflectionsRad: new Map() });
    expect(drag).toBeCloseTo(lift ** 2 / (Math.PI * (1000 ** 2 / 180_000) * alone.spanEfficiency), 9);
  });

  it('fins that begin a sheet inside the tail they stand on give the same aircraft as fins on it', () => {
    const text = readFileSync(new URL('../../examples/tarrel-620.json', import.meta.url), 'utf8');
    const document: Airframe = JSON.parse(text);
    const lowered = (z: number): Airframe => ({
      ...document,
      surfaces: document.surfaces.map((s) =>
        s.id === 'fin' ? { ...s, mount: { to: 'boom', end: 'aft' as const, at: [-90, 0, z] } } : s,
      ),
    });
    const neutral = (z: number) => model(lowered(z)).neutralPointX;
    for (const z of [3, 4.5, 7]) expect(Math.abs(neutral(z) - neutral(6))).toBeLessThan(0.002 * 171);
  });
});
