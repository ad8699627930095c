import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Control } from '@/lib/airframe/schema/surface';
import type { Result } from '@/lib/numerics/result';
import { airframe, control, panel, surface } from '@/tests/support/airframe';
import { type ControlLinkage, linkageOf, servoForDeg, surfaceAtDeg, travelOf } from './ofControl';
import { type ControlPlace, controlPlace as placeOf } from './place';
import { suggestFourBar } from './suggest';
import { edgeTravelMm } from './travel';

function controlPlace(...[surface, control]: Parameters<typeof placeOf>): ControlPlace {
  const place = placeOf(surface, control);
  if (!place) throw new RangeError('no hinge');
  return place;
}

type Linkage = NonNullable<Control['linkage']>;
const LINKAGE: Linkage = {
  servoItemId: 'servo',
  servoArmMm: 9,
  hornMm: 14,
  hornStation: 0.6,
  rodMm: 1.2,
  face: 'upper',
};

/** A straight wing of 400 mm a side and 200 mm chord, aileron of 50 mm chord: hinge at x 150; servo 90 mm ahead of it, abreast of the horn. */
const wing = (over: Partial<Control>, servoAt: readonly [number, number, number] = [60, 240, 5]): Airframe =>
  airframe({
    surfaces: [
      surface({
        panels: [panel({ lengthMm: 400, rootChordMm: 200, tipChordMm: 200 })],
        controls: [control({ from: 0.5, to: 0.9, chordShare: [0.25, 0.25], linkage: LINKAGE, ...over })],
      }),
    ],
    items: [
      {
        id: 'servo',
        kind: 'servo',
        massG: 9,
        sizeMm: [23, 12, 24],
        mount: { to: 'datum', at: [servoAt[0], servoAt[1], servoAt[2]] },
      },
    ],
  });

function linkageIn(document: Airframe, reach = { upDeg: 15, downDeg: 15 }): Result<ControlLinkage> {
  const resolved = resolve(document);
  const [first] = resolved.ok ? resolved.value.surfaces : [];
  const [only] = first?.surface.controls ?? [];
  if (!resolved.ok || !first || !only) throw new RangeError('does not resolve');
  return linkageOf(document, resolved.value, first, only, controlPlace(first, only), reach);
}
function found(document: Airframe): ControlLinkage {
  const linkage = linkageIn(document);
  if (!linkage.ok) throw new RangeError(linkage.problems[0]?.message);
  return linkage.value;
}
const codes = (document: Airframe, reach?: { upDeg: number; downDeg: number }): string[] => {
  const linkage = linkageIn(document, reach);
  return linkage.ok ? [] : linkage.problems.map(({ code, path }) => `${path} ${code}`);
};

describe('the place of a control', () => {
  it('measures chords square to the hinge', () => {
    const resolved = resolve(wing({ chordShare: [0.2, 0.3], endGapMm: 2 }));
    const [first] = resolved.ok ? resolved.value.surfaces : [];
    const [only] = first?.surface.controls ?? [];
    if (!first || !only) throw new RangeError('does not resolve');
    const place = controlPlace(first, only);
    // Hinge from x 160 to x 140 over 160 mm: its slope is 1 in 8, and chords of 40 and 60 mm stand askew to it.
    const askew = Math.hypot(1, 1 / 8);
    expect(place.widestMm).toBeCloseTo(60 / askew, 9);
    const length = 160 * askew - 4;
    expect(place.chordSquaredMm3).toBeCloseTo((length * (40 * 40 + 40 * 60 + 60 * 60)) / 3 / askew ** 2, 6);
    expect(place.chordShare).toBeCloseTo(0.25, 12);
    expect(place.halves).toBe(1);
  });

  it('there is none without a hinge line', () => {
    const resolved = resolve(wing({ from: 0.5, to: 0.5 }));
    const [first] = resolved.ok ? resolved.value.surfaces : [];
    const [only] = first?.surface.controls ?? [];
    expect(first && only && placeOf(first, only)).toBeNull();
  });

  it('joined halves that only move together share a servo', () => {
    const halves = (over: Partial<Control>) => {
      const resolved = resolve(wing({ linkage: undefined, ...over }));
      const [first] = resolved.ok ? resolved.value.surfaces : [];
      const [only] = first?.surface.controls ?? [];
      return first && only ? controlPlace(first, only).halves : 0;
    };
    const pitch = { pitch: 1, roll: 0, yaw: 0, flap: 0 };
    expect(halves({ from: 0, mix: pitch })).toBe(2);
    expect(halves({ from: 0.5, mix: pitch })).toBe(1);
    expect(halves({ from: 0 })).toBe(1);
  });
});

describe('a linkage of the document', () => {
  it('has the rod that servo and horn leave: right-angled triangle of arm, rod and line between shaft and hole', () => {
    const linkage = found(wing({}));
    // Hole 14 mm over the hinge at x 150, shaft 5 mm up at x 60: 90 mm and 9 mm apart.
    expect(linkage.rod?.lengthMm).toBeCloseTo(Math.sqrt(90 ** 2 + 9 ** 2 - 9 ** 2), 9);
    expect(linkage.suggested).toBe(false);
    expect(linkage.servo?.id).toBe('servo');
  });

  it('pushed aft it turns the trailing edge down with the horn above, up with it below', () => {
    const above = found(wing({}));
    const below = found(wing({ linkage: { ...LINKAGE, face: 'lower' } }, [60, 240, -5]));
    expect(surfaceAtDeg(above, 20)).toBeGreaterThan(5);
    expect(surfaceAtDeg(below, 20)).toBeCloseTo(-(surfaceAtDeg(above, 20) ?? Number.NaN), 9);
    expect(servoForDeg(below, surfaceAtDeg(below, 20) ?? Number.NaN)).toBeCloseTo(20, 6);
  });

  it('takes the port servo of a pair as its mirror image', () => {
    expect(found(wing({}, [60, -240, 5])).bar).toEqual(found(wing({}, [60, 240, 5])).bar);
  });

  it('a rod that also runs sideways is longer by Pythagoras, and turns as its picture does', () => {
    const [straight, askew] = [found(wing({})), found(wing({}, [60, 210, 5]))];
    expect(askew.bar).toEqual(straight.bar);
    expect(askew.rod?.lengthMm).toBeCloseTo(Math.hypot(90, 30), 9);
  });

  it('counts the larger throw against 45 degrees', () => {
    const linkage = found(wing({}));
    const travel = travelOf(linkage, { upDeg: 18, downDeg: 6 });
    expect(travel?.usedPct).toBeCloseTo(((travel?.upDeg ?? 0) / 45) * 100, 9);
    expect(travel?.upDeg).toBeGreaterThan(travel?.downDeg ?? Number.POSITIVE_INFINITY);
    expect(travelOf(linkage, { upDeg: 60, downDeg: 6 })).toBeNull();
  });
});

describe('problems', () => {
  const linkage = 'surfaces.0.controls.0.linkage';
  it('stand at the field that causes them', () => {
    expect(codes(wing({ linkage: { ...LINKAGE, hornStation: 0.2 } }))).toEqual([
      `${linkage}.hornStation linkage-horn-off`,
    ]);
    expect(codes(wing({}, [148, 240, 12]))).toEqual([`${linkage}.servoArmMm linkage-too-close`]);
    expect(codes(wing({ linkage: { ...LINKAGE, servoItemId: 'gone' } }))).toEqual([
      `${linkage}.servoItemId linkage-no-servo`,
    ]);
    expect(codes(wing({ linkage: undefined }), { upDeg: 75, downDeg: 20 })).toEqual([
      'surfaces.0.controls.0.throwsDeg linkage-too-far',
    ]);
  });
});

describe('a suggested linkage', () => {
  it('keeps to usual holes, and uses the travel where the throw allows', () => {
    for (const throwDeg of [15, 20, 25, 28]) {
      const bar = suggestFourBar(throwDeg);
      expect(bar?.armMm).toBeGreaterThanOrEqual(7);
      expect(bar?.armMm).toBeLessThanOrEqual(10);
      expect(bar?.hornMm).toBeGreaterThanOrEqual(12);
      expect(bar?.hornMm).toBeLessThanOrEqual(16);
      const linkage = bar && { bar, sign: 1 as const, servo: null, rod: null, suggested: true };
      const used = linkage ? (travelOf(linkage, { upDeg: throwDeg, downDeg: throwDeg })?.usedPct ?? 0) : 0;
      expect(used).toBeGreaterThan(70);
      expect(used).toBeLessThan(100);
    }
  });

  it('a small throw gets the shortest arm and the longest horn', () => {
    expect(suggestFourBar(5)).toMatchObject({ armMm: 7, hornMm: 16 });
  });

  it('stands for a control without a linkage, with no rod and the weakest servo', () => {
    const document = wing({ linkage: undefined });
    const heavier = {
      ...document,
      items: [...document.items.map((one) => ({ ...one, id: 'big', massG: 40 })), ...document.items],
    };
    expect(found(heavier)).toMatchObject({ suggested: true, rod: null, servo: { id: 'servo' } });
  });
});

describe('edgeTravelMm', () => {
  it('is the straight line from where the edge was: a sixth of a turn moves it by its own radius', () => {
    expect(edgeTravelMm(47, 60)).toBeCloseTo(47, 12);
    expect(edgeTravelMm(47, -60)).toBeCloseTo(47, 12);
    expect(edgeTravelMm(47, 180)).toBeCloseTo(94, 12);
  });
});
