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
    expect(box(of(plan, 'pack'))).toEqual({ minX: -178, maxX: -108, minY: -16, maxY: 16 });
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
    expect(box(of(sideOutlines(pusher), 'pod'))).toEqual({ minX: -195, maxX: 175, minY: -56, maxY: -4 });
    expect(box(of(frontOutlines(pusher), 'pod'))).toEqual({ minX: -28, maxX: 28, minY: -56, maxY: -4 });
  });
  it('shows a disc round from behind', () => {
    const circle = of(frontOutlines(pusher), 'motor')[0];
    expect(circle?.closed).toBe(true);
    expect(Math.abs(signedArea(circle?.points ?? [])) / (Math.PI * 76 ** 2)).toBeCloseTo(1, 2);
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
