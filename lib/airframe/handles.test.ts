import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import v1 from '@/tests/fixtures/airframe/v1.json';
import { canonicalText } from './canonical';
import { type Handle, handles, setHandle } from './handles';
import { startFrom, startingLayouts } from './layouts';
import { parseAirframe } from './parse';
import { resolve, sectionAt } from './resolve';
import type { Airframe } from './schema/airframe';

const pusher = startFrom('pusher', 'Test');

function handle(airframe: Airframe, id: string): Handle {
  const found = handles(airframe).find((one) => one.id === id);
  if (!found) throw new RangeError(`no handle ${id}`);
  return found;
}

/** A wing of two panels whose chords meet, and a flap inside the aileron. */
function twoPanels(): Airframe {
  const [wing, ...rest] = pusher.surfaces;
  const [panel] = wing?.panels ?? [];
  const [aileron] = wing?.controls ?? [];
  if (!wing || !panel || !aileron) throw new RangeError('the layout has a wing with an aileron');
  return {
    ...pusher,
    surfaces: [
      {
        ...wing,
        panels: [
          { ...panel, id: 'p1', lengthMm: 210, tipChordMm: 166 },
          { ...panel, id: 'p2', lengthMm: 140, rootChordMm: 166, dihedralDeg: 4 },
        ],
        controls: [
          { ...aileron, id: 'flap', kind: 'flap', from: 0.1, to: 0.45 },
          { ...aileron, from: 0.62, to: 0.94 },
          { ...aileron, id: 'inner', kind: 'airbrake', from: 0.01, to: 0.08 },
        ],
      },
      ...rest,
    ],
  };
}

const fixture = parseAirframe(v1);
const airframes: Airframe[] = [
  ...startingLayouts.map(({ id }) => startFrom(id, 'Test')),
  twoPanels(),
  ...(fixture.ok ? [fixture.value] : []),
];

/** Every id in a document, in order. */
const ids = (value: unknown): unknown[] => {
  if (Array.isArray(value)) return value.flatMap(ids);
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => (key === 'id' ? [inner] : ids(inner)));
};

const pick = fc.constantFrom(
  ...airframes.flatMap((airframe) => handles(airframe).map((handle) => ({ airframe, handle }))),
);

describe('every handle of every layout', () => {
  it('the fixture is one of them', () => expect(airframes).toHaveLength(startingLayouts.length + 2));
  it.each(airframes)('$name: ids are different, directions are unit vectors, values lie in their range', (airframe) => {
    const all = handles(airframe);
    expect(new Set(all.map(({ id }) => id)).size).toBe(all.length);
    for (const { direction, value, min, max, step, label, perMm, at } of all) {
      expect(Math.hypot(...direction)).toBeCloseTo(1, 12);
      expect(value).toBeGreaterThanOrEqual(min);
      expect(value).toBeLessThanOrEqual(max);
      expect(step).toBeGreaterThan(0);
      expect(perMm).toBeGreaterThan(0);
      expect(at.every(Number.isFinite)).toBe(true);
      expect(label).not.toMatch(/[{}]|undefined/);
    }
  });
  it('set to its own value it changes nothing', () => {
    for (const airframe of airframes) {
      for (const { id, value } of handles(airframe)) {
        const result = setHandle(airframe, id, value);
        expect(result).toEqual({ airframe, value, stopped: null });
      }
    }
  });
  it('set to anything, the result parses, keeps its ids, and says why it is not what was asked', () => {
    fc.assert(
      fc.property(
        pick,
        fc.double({ min: -0.3, max: 1.3, noNaN: true }),
        ({ airframe, handle: { id, min, max } }, share) => {
          const asked = min + (max - min) * share;
          const result = setHandle(airframe, id, asked);
          const parsed = parseAirframe(result.airframe);
          expect(parsed.ok ? [] : parsed.problems).toEqual([]);
          expect(ids(result.airframe)).toEqual(ids(airframe));
          expect(handle(result.airframe, id).value).toBeCloseTo(result.value, 6);
          if (result.stopped === null) expect(result.value).toBe(asked);
          else expect(result.stopped.length).toBeGreaterThan(10);
        },
      ),
      { numRuns: 150 },
    );
  });
  it('a small drag along its direction lands near the value it promised', () => {
    // The point where the handle stands moves with the pointer: perMm is measured, not asserted.
    const followers = /\/(length|span|tipChord|sweep|from|to|x)$/;
    for (const airframe of airframes) {
      for (const before of handles(airframe).filter(({ id }) => followers.test(id))) {
        if (isSteep(airframe, before)) continue;
        const mm = 0.01;
        const { airframe: next, stopped } = setHandle(airframe, before.id, before.value + before.perMm * mm);
        if (stopped) continue;
        const after = handle(next, before.id);
        const moved =
          (after.at[0] - before.at[0]) * before.direction[0] + (after.at[1] - before.at[1]) * before.direction[1];
        expect(Math.abs(moved / mm - 1), `${before.id} moved ${moved / mm}`).toBeLessThan(0.02);
      }
    }
  });
});

/** Handles along an upright surface follow x and not their own point: there is nothing to measure in plan. */
function isSteep(airframe: Airframe, { elementId, id }: Handle): boolean {
  const surface = airframe.surfaces.find((one) => one.id === elementId);
  return surface !== undefined && Math.abs(surface.cantDeg) > 80 && /\/(length|from|to)$/.test(id);
}

describe('what each kind does', () => {
  it('span scales all panels in proportion', () => {
    const airframe = twoPanels();
    const { value } = handle(airframe, 'wing/span');
    const { airframe: next } = setHandle(airframe, 'wing/span', value * 1.2);
    const lengths = next.surfaces[0]?.panels.map(({ lengthMm }) => lengthMm) ?? [];
    expect(lengths[0]).toBeCloseTo(252, 9);
    expect(lengths[1]).toBeCloseTo(168, 9);
    const resolved = resolve(next);
    const wing = resolved.ok ? resolved.value.surfaces[0] : undefined;
    expect(2 * (wing ? sectionAt(wing, 1).le[1] : 0)).toBeCloseTo(value * 1.2, 9);
  });
  it('a chord that meets its neighbour stays one chord, and has one handle', () => {
    const airframe = twoPanels();
    expect(handles(airframe).map(({ id }) => id)).not.toContain('wing/p2/rootChord');
    const { airframe: next } = setHandle(airframe, 'wing/p1/tipChord', 150);
    expect(next.surfaces[0]?.panels.map(({ rootChordMm, tipChordMm }) => [rootChordMm, tipChordMm])).toEqual([
      [190, 150],
      [150, 150],
    ]);
  });
  it('a step in chord has a handle on each side', () => {
    const airframe = twoPanels();
    const stepped: Airframe = {
      ...airframe,
      surfaces: airframe.surfaces.map((surface, s) =>
        s === 0
          ? { ...surface, panels: surface.panels.map((panel, p) => (p === 1 ? { ...panel, rootChordMm: 140 } : panel)) }
          : surface,
      ),
    };
    const { airframe: next } = setHandle(stepped, 'wing/p1/tipChord', 170);
    expect(next.surfaces[0]?.panels[1]?.rootChordMm).toBe(140);
    expect(handle(stepped, 'wing/p2/rootChord').value).toBe(140);
  });
  it('a longer panel leaves what stands on the others where it is', () => {
    const before = twoPanels();
    const { airframe: next, stopped } = setHandle(before, 'wing/p2/length', 490);
    expect(stopped).toBeNull();
    const controls = new Map(next.surfaces[0]?.controls.map((control) => [control.id, control]));
    // The flap ran from 35 to 157.5 mm of p1, in 350 mm; the whole is 700 mm now.
    expect(controls.get('flap')?.from).toBeCloseTo(35 / 700, 12);
    expect(controls.get('flap')?.to).toBeCloseTo(157.5 / 700, 12);
    // The aileron began 7 mm out on p2, of 140: now 24.5 of 490.
    expect(controls.get('aileron')?.from).toBeCloseTo((210 + 24.5) / 700, 12);
  });
  it('a control that ends at a joint still ends there', () => {
    const before = setHandle(twoPanels(), 'wing/aileron/from', 0.6).airframe;
    const { airframe: next, stopped } = setHandle(before, 'wing/p1/length', 300);
    expect(stopped).toBeNull();
    expect(next.surfaces[0]?.controls.find(({ id }) => id === 'aileron')?.from).toBeCloseTo(300 / 440, 12);
  });
  it('a longer boom takes the tail with it', () => {
    const { airframe: next } = setHandle(pusher, 'boom/length', 560);
    expect(handle(next, 'tail/x').value).toBeCloseTo(handle(pusher, 'tail/x').value + 60, 9);
  });
  it('a thing on a slide keeps both ends of the slide where they are', () => {
    const before = handle(pusher, 'pack/x');
    const { airframe: next } = setHandle(pusher, 'pack/x', -150);
    const after = handle(next, 'pack/x');
    expect([after.min, after.max]).toEqual([before.min, before.max]);
    expect(next.items[0]?.slide).toEqual({ fromMm: -35, toMm: 5 });
  });
  it('a surface that stands on another moves along its chord', () => {
    const airframe = startFrom('tailless', 'Test');
    const { value } = handle(airframe, 'tipfin/x');
    const { airframe: next, stopped } = setHandle(airframe, 'tipfin/x', value + 14);
    expect(stopped).toBeNull();
    expect(next.surfaces[1]?.mount.at).toEqual({ station: 1, chordShare: expect.closeTo(0.2, 9) });
  });
  it('the wing that sets the origin does not move', () => {
    expect(handles(pusher).map(({ id }) => id)).not.toContain('wing/x');
  });
  it('shares what it does not change', () => {
    const { airframe: next } = setHandle(pusher, 'wing/p1/length', 360);
    expect(next.bodies).toBe(pusher.bodies);
    expect(next.surfaces[1]).toBe(pusher.surfaces[1]);
  });
});

describe('why it stops', () => {
  const doubled = twoPanels();
  it.each([
    { id: 'boom/length', asked: 1400, value: 1000, says: "the boom's stock length is 1000 mm" },
    { id: 'wing/flap/to', asked: 0.61, value: 0.6, says: 'hinge line would bend' },
    { id: 'wing/aileron/from', asked: 0.3, value: 0.6, says: 'hinge line would bend' },
    { id: 'wing/aileron/from', asked: 0.2, value: 0.6, says: 'hinge line would bend' },
    { id: 'wing/inner/to', asked: 0.7, value: 0.1, says: 'the flap begins here' },
    { id: 'wing/aileron/to', asked: 1.4, value: 1, says: "the surface's tip is here" },
    { id: 'wing/flap/from', asked: -1, value: 0.08, says: 'the airbrake ends here' },
    { id: 'wing/inner/from', asked: -1, value: 0, says: "the surface's root is here" },
    { id: 'wing/flap/from', asked: 0.8, value: 0.45 - 15 / 350, says: "the control's outer end is here" },
    { id: 'wing/p1/tipChord', asked: 2, value: null, says: '5 mm' },
    { id: 'wing/p2/length', asked: 3000, value: 1040, says: 'up to 1250 mm' },
    { id: 'wing/p1/sweep', asked: 88, value: 70, says: '70°' },
    { id: 'pack/x', asked: 200, value: -145, says: 'aft end of its slide' },
    { id: 'wing/span', asked: Number.NaN, value: null, says: 'a number is needed' },
  ])('$id at $asked', ({ id, asked, value, says }) => {
    const result = setHandle(doubled, id, asked);
    expect(result.stopped).toContain(says);
    if (value !== null) expect(result.value).toBeCloseTo(value, 2);
    expect(parseAirframe(result.airframe).ok).toBe(true);
  });
  it('a value in range that breaks a rule goes as far as the rule allows', () => {
    const result = setHandle(pusher, 'wing/p1/length', 12);
    expect(result.stopped).toContain('shortest that can be cut and hinged is 12 mm');
    // 0.44 of the length less two gaps of 1.5 mm has to leave 12 mm.
    expect(result.value).toBeCloseTo(15 / 0.44, 1);
  });
  it('refuses a handle that is not there', () => {
    expect(() => setHandle(pusher, 'wing/p9/length', 100)).toThrow(/wing\/p9\/length/);
  });
  it('the document before is untouched', () => {
    const text = canonicalText(pusher);
    for (const { id, max } of handles(pusher)) setHandle(pusher, id, max);
    expect(canonicalText(pusher)).toBe(text);
  });
});
