import { describe, expect, it } from 'vitest';
import { bounds, signedArea } from '@/lib/geometry/polygons';
import v1 from '@/tests/fixtures/airframe/v1.json';
import { startFrom, startingLayouts } from './layouts';
import { frontOutlines, planOutlines, sideOutlines, type ViewOutline } from './outlines';
import { parseAirframe } from './parse';
import type { Airframe } from './schema/airframe';

const pusher = startFrom('pusher', 'Test');
const of = (list: readonly ViewOutline[], key: string, side?: string) =>
  list.filter((outline) => outline.key === key && (side === undefined || outline.side === side));
const box = (list: readonly ViewOutline[]) => bounds(list.flatMap(({ points }) => points));

describe('plan', () => {
  const plan = planOutlines(pusher);
  it('draws the wing on both sides at its true area', () => {
    const [stbd, port] = [of(plan, 'wing', 'stbd')[0], of(plan, 'wing', 'port')[0]];
    expect(Math.abs(signedArea(stbd?.points ?? []))).toBeCloseTo((350 * (190 + 150)) / 2, 6);
    expect(port?.points).toEqual(stbd?.points.map(([x, y]) => [x, -y]));
    expect(box(of(plan, 'wing'))).toEqual({ minX: 0, maxX: 190, minY: -350, maxY: 350 });
  });
  it('draws the aileron inside the wing, its trailing edge on the wing’s', () => {
    const aileron = of(plan, 'wing/aileron', 'stbd')[0];
    expect(aileron).toMatchObject({ elementId: 'wing', kind: 'control', closed: true });
    const { minY, maxY, maxX } = box(aileron ? [aileron] : []);
    expect([minY, maxY]).toEqual([175, 329]);
    // At mid-span the chord is 170 about a quarter chord at 47.5.
    expect(maxX).toBeCloseTo(47.5 + 127.5, 6);
  });
  it('draws a boom as wide as its tube', () => {
    const { minX, maxX, minY, maxY } = box(of(plan, 'boom', 'stbd'));
    expect(minX).toBeCloseTo(40, 9);
    expect(maxX).toBeCloseTo(540, 9);
    expect(minY).toBeCloseTo(107.5, 9);
    expect(maxY).toBeCloseTo(112.5, 9);
  });
  it('draws an upright fin as thick as its sheet', () => {
    const { minX, maxX, minY, maxY } = box(of(plan, 'fin', 'port'));
    expect(maxY - minY).toBeCloseTo(5, 9);
    expect(minY).toBeCloseTo(-112.5, 9);
    expect(maxX - minX).toBeGreaterThanOrEqual(105);
  });
  it('draws the disc as a line as long as the propeller, and the motor ahead of a pusher’s', () => {
    const [line, motor] = of(plan, 'motor');
    expect(line).toMatchObject({ closed: false, side: 'centre' });
    expect(box(line ? [line] : [])).toEqual({ minX: 205, maxX: 205, minY: -76, maxY: 76 });
    const drawn = box(motor ? [motor] : []);
    expect(drawn.minX).toBeCloseTo(179, 9);
    expect(drawn.maxX).toBeCloseTo(205, 9);
  });
  it('draws an item as its box', () => {
    expect(box(of(plan, 'pack'))).toEqual({ minX: -200, maxX: -130, minY: -16, maxY: 16 });
  });
});

describe('side and front', () => {
  it('shows a fin’s face from the side and its edge from the front', () => {
    const area = Math.abs(signedArea(of(sideOutlines(pusher), 'fin', 'stbd')[0]?.points ?? []));
    expect(area).toBeCloseTo((95 * (105 + 75)) / 2, 6);
    const { minX, maxX, minY, maxY } = box(of(frontOutlines(pusher), 'fin', 'stbd'));
    expect(maxX - minX).toBeCloseTo(5, 9);
    expect(maxY - minY).toBeCloseTo(95, 9);
  });
  it('shows a flat wing from the side as thick as its sheet', () => {
    const { minY, maxY } = box(of(sideOutlines(pusher), 'wing'));
    expect(maxY - minY).toBeCloseTo(5, 9);
  });
  it('shows dihedral from the front', () => {
    const trainer = startFrom('trainer', 'Test');
    const { maxX, maxY } = box(of(frontOutlines(trainer), 'wing', 'stbd'));
    expect(maxX).toBeGreaterThan(449);
    expect(maxY).toBeGreaterThan(450 * Math.sin((2 * Math.PI) / 180));
  });
  it('shows the body’s tops and bottoms from the side and its widest frame from the front', () => {
    expect(box(of(sideOutlines(pusher), 'pod'))).toEqual({ minX: -230, maxX: 175, minY: -56, maxY: -4 });
    expect(box(of(frontOutlines(pusher), 'pod'))).toEqual({ minX: -28, maxX: 28, minY: -56, maxY: -4 });
  });
  it('shows a disc round from behind', () => {
    const circle = of(frontOutlines(pusher), 'motor')[0];
    expect(circle?.closed).toBe(true);
    expect(Math.abs(signedArea(circle?.points ?? [])) / (Math.PI * 76 ** 2)).toBeCloseTo(1, 2);
  });
});

describe('tips and cutouts', () => {
  const wing = (rest: Partial<Airframe['surfaces'][number]>): Airframe => ({
    ...pusher,
    surfaces: pusher.surfaces.map((one) => (one.id === 'wing' ? { ...one, ...rest } : one)),
  });
  const whole = (350 * (190 + 150)) / 2;
  const area = (airframe: Airframe) =>
    Math.abs(signedArea(of(planOutlines(airframe), 'wing', 'stbd')[0]?.points ?? []));
  // The wing's leading edge runs aft by 10 mm in 350, its trailing edge forward by 30 mm.
  const lean = { le: Math.atan2(10, 350), te: Math.atan2(30, 350) };

  it('rounds a tip: each corner loses what lies between two tangents and their arc', () => {
    const r = 40;
    const lost = [Math.PI / 2 + lean.le, Math.PI / 2 + lean.te].map((corner) => {
      const sweep = Math.PI - corner;
      return r * r * (Math.tan(sweep / 2) - sweep / 2);
    });
    const rounded = wing({ tip: { shape: 'rounded', radiusMm: r } });
    expect(area(rounded) / (whole - (lost[0] ?? 0) - (lost[1] ?? 0))).toBeCloseTo(1, 3);
    const { maxY } = box(of(planOutlines(rounded), 'wing'));
    expect(maxY).toBeCloseTo(350, 9);
  });
  it('rakes a tip about its trailing edge: the leading edge ends inboard', () => {
    const raked = wing({ tip: { shape: 'raked', angleDeg: 20 } });
    const ring = of(planOutlines(raked), 'wing', 'stbd')[0]?.points ?? [];
    // From the tip's trailing edge (160, 350), in by tan 20 for each mm forward, until the leading edge.
    const t = Math.tan((20 * Math.PI) / 180);
    const x = (10 - (10 / 350) * t * 160) / (1 - (10 / 350) * t);
    expect(ring.some((p) => Math.hypot(p[0] - x, p[1] - (350 - t * (160 - x))) < 1e-6)).toBe(true);
    expect(ring.some((p) => Math.hypot(p[0] - 160, p[1] - 350) < 1e-6)).toBe(true);
    expect(ring.some((p) => Math.hypot(p[0] - 10, p[1] - 350) < 1e-6)).toBe(false);
  });
  it('draws a tip that does not fit square, as it is cut', () => {
    expect(area(wing({ tip: { shape: 'rounded', radiusMm: 300 } }))).toBeCloseTo(whole, 6);
  });
  it('takes a notch out of the edge it reaches', () => {
    const notched = wing({
      controls: [],
      cutouts: [
        {
          id: 'slot',
          outline: [
            [0.2, 0.8],
            [0.4, 0.8],
            [0.4, 1],
            [0.2, 1],
          ],
        },
      ],
    });
    // Between stations 0.2 and 0.4 the mean chord is 178 mm, of it a fifth, along 70 mm.
    expect(area(notched)).toBeCloseTo(whole - 70 * 178 * 0.2, 0);
    expect(of(planOutlines(notched), 'wing', 'port')).toHaveLength(1);
  });
  it('draws a hole as a line inside the wing, on both sides', () => {
    const holed = wing({
      controls: [],
      cutouts: [
        {
          id: 'hatch',
          outline: [
            [0.2, 0.3],
            [0.4, 0.3],
            [0.4, 0.5],
            [0.2, 0.5],
          ],
        },
      ],
    });
    for (const side of ['stbd', 'port']) {
      const [ring, hole] = of(planOutlines(holed), 'wing', side);
      expect(Math.abs(signedArea(ring?.points ?? []))).toBeCloseTo(whole, 3);
      expect(hole?.closed).toBe(false);
      expect(Math.abs(signedArea(hole?.points.slice(1) ?? []))).toBeCloseTo(70 * 178 * 0.2, 0);
    }
  });
});

describe('every layout in every view', () => {
  const fixture = parseAirframe(v1);
  const all: Airframe[] = [
    ...startingLayouts.map(({ id }) => startFrom(id, 'Test')),
    ...(fixture.ok ? [fixture.value] : []),
  ];
  it.each(all)('$name: each element is drawn, with finite points, the same on both sides', (airframe) => {
    for (const view of [planOutlines, sideOutlines, frontOutlines]) {
      const lines = view(airframe);
      const drawn = new Set(lines.map(({ elementId }) => elementId));
      const { surfaces, bodies, booms, drives, items, gear } = airframe;
      for (const { id } of [surfaces, bodies, booms, drives, items, gear].flat()) expect(drawn).toContain(id);
      expect(lines.flatMap(({ points }) => points.flat()).every(Number.isFinite)).toBe(true);
      const count = (side: string) => lines.filter((line) => line.side === side).length;
      expect(count('stbd')).toBe(count('port'));
    }
  });
});
