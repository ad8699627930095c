import { describe, expect, it } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Body } from '@/lib/airframe/schema/fuselage';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import { airframe, board, drive, surface } from '@/tests/support/airframe';
import { former, item, straightBody } from '../testing/boxBody';
import { checked, speaks } from '../testing/checked';

const ply = board({ id: 'ply', kind: 'ply', thicknessMm: 2 });
const firewall = (xMm: number): Body['formers'][number] =>
  former('firewall', xMm, { role: 'firewall', materialId: 'ply' });
const craft = (body: Body, over: Partial<Airframe> = {}): Airframe =>
  airframe({
    materials: [board(), ply],
    surfaces: [surface({ mount: { to: 'datum', at: [150, 0, 60] } })],
    bodies: [body],
    ...over,
  });
/** Its foot 30 mm aft of the disc. */
const motorAt = (footX: number, massG = 40) =>
  drive({
    mount: { to: 'datum', at: [footX - 30, 0, 0] },
    motor: { massG, diameterMm: 28, lengthMm: 30, kvRpmPerV: 1000 },
    propeller: { diameterMm: 203, pitchMm: 127, blades: 2, massG: 8 },
  });

describe('motor screws', () => {
  it('are reached from outside where the motor stands outside', () => {
    const found = checked(craft(straightBody({ formers: [firewall(0)] }), { drives: [motorAt(0)] }), 'motor-screws');
    expect(found.level).toBe('ok');
    expect(found.words).toContain('outside');
  });

  it.each([
    { foot: 59, level: 'ok' },
    { foot: 61, level: 'watch' },
  ])('inside, $foot mm from the open nose: $level', ({ foot, level }) => {
    const body = straightBody({ formers: [firewall(foot)] });
    const found = checked(craft(body, { drives: [motorAt(foot)] }), 'motor-screws');
    expect(found.level).toBe(level);
    expect(found.measured?.value).toBeCloseTo(foot, 9);
  });

  it.each([
    { wide: 12, level: 'ok' },
    { wide: 11, level: 'watch' },
  ])('an opening $wide mm wide over them: $level', ({ wide, level }) => {
    const body = straightBody({
      formers: [former('nose', 0), firewall(200)],
      openings: [{ id: 'o', face: 'top', fromX: 190, toX: 210, widthMm: wide, purpose: 'inlet' }],
    });
    expect(checked(craft(body, { drives: [motorAt(200)] }), 'motor-screws').level).toBe(level);
  });

  it('behind two plates nothing reaches them', () => {
    const body = straightBody({ formers: [former('nose', 0), firewall(200)] });
    expect(checked(craft(body, { drives: [motorAt(200)] }), 'motor-screws').measured).toBeNull();
  });
});

describe('firewall', () => {
  // 2 mm of ply, 50 mm square inside 5 mm board: 400 mm2 of edge, which hold 40 N at 0.1 MPa; 50 g of deceleration.
  const most = (1000 * 40) / (50 * STANDARD_GRAVITY);
  it.each([
    { massG: most - 8.2, level: 'ok' },
    { massG: most - 7.8, level: 'watch' },
  ])('holds 81.6 g with the propeller by its glue alone: a motor of $massG g is $level', ({ massG, level }) => {
    const body = straightBody({ formers: [firewall(0)] });
    const found = checked(craft(body, { drives: [motorAt(-2, massG)] }), 'firewall-load-path');
    expect(found.level).toBe(level);
    expect(found.measured?.value).toBeCloseTo(4, 6);
  });

  it.each([
    { to: 190, level: 'ok' },
    { to: 189, level: 'watch' },
  ])('carries a heavy motor with doublers on both sides that end at $to mm, 10 mm ahead or less: $level', (given) => {
    const doubler = (id: string, face: 'port' | 'stbd') => ({ id, face, fromX: 0, toX: given.to, materialId: 'board' });
    const body = (...doublers: Body['doublers']) => straightBody({ formers: [firewall(200)], doublers });
    const level = (made: Body) => checked(craft(made, { drives: [motorAt(200, 400)] }), 'firewall-load-path').level;
    expect(level(body(doubler('d1', 'port'), doubler('d2', 'stbd')))).toBe(given.level);
    expect(level(body(doubler('d1', 'port')))).toBe('watch');
  });

  it('is missed where the motor has none within 40 mm', () => {
    const level = (x: number) =>
      checked(craft(straightBody({ formers: [firewall(x)] }), { drives: [motorAt(0)] }), 'firewall-load-path').words;
    expect(level(39)).toContain('glue');
    expect(level(41)).toContain('no firewall');
  });

  it('is not asked of a motor without a body', () => {
    const drives = [motorAt(-600)];
    const away = craft(straightBody(), { drives, items: [item('rx', 'receiver', [100, 0, 0], [20, 20, 10])] });
    expect(speaks(away, 'firewall-load-path')).toBe(false);
  });
});
