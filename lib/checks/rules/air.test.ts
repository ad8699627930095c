import { describe, expect, it } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Drive } from '@/lib/airframe/schema/equipment';
import type { Body } from '@/lib/airframe/schema/fuselage';
import { airframe, drive, surface } from '@/tests/support/airframe';
import { former, item, straightBody } from '../testing/boxBody';
import { checked, speaks } from '../testing/checked';

const hole = (purpose: 'inlet' | 'outlet', areaMm2: number): Body['openings'][number] => ({
  id: purpose,
  face: purpose === 'inlet' ? 'bottom' : 'top',
  fromX: 100,
  toX: 120,
  widthMm: areaMm2 / 20,
  purpose,
});
const closed = (...openings: Body['openings']): Body =>
  straightBody({ formers: [former('nose', 0), former('tail', 395)], openings });
const craft = (body: Body, drives: Drive[], over: Partial<Airframe> = {}): Airframe =>
  airframe({ surfaces: [surface({ mount: { to: 'datum', at: [0, 0, 60] } })], bodies: [body], drives, ...over });

describe('cooling a controller inside a body', () => {
  const esc = item('esc', 'controller', [200, 0, 0], [40, 20, 8]);
  const motor = (maxW?: number) =>
    drive({
      mount: { to: 'datum', at: [-60, 0, 0] },
      motor: { massG: 40, diameterMm: 28, lengthMm: 30, kvRpmPerV: 1000, maxW },
      controllerItemId: 'esc',
    });
  const cooled = (body: Body, maxW?: number) => craft(body, [motor(maxW)], { items: [esc] });

  it.each([
    { area: 300, level: 'ok' },
    { area: 299, level: 'watch' },
  ])('100 W with $area mm² of inlet: $level', ({ area, level }) => {
    expect(checked(cooled(closed(hole('inlet', area)), 100), 'cooling-inlet').level).toBe(level);
  });

  it.each([
    { area: 449, level: 'watch' },
    { area: 450, level: 'ok' },
    { area: 600, level: 'ok' },
    { area: 601, level: 'note' },
  ])('300 mm² of inlet with $area mm² of outlet: $level', ({ area, level }) => {
    const body = closed(hole('inlet', 300), hole('outlet', area));
    expect(checked(cooled(body, 100), 'cooling-outlet').level).toBe(level);
  });

  it('an inlet larger than need be asks for no larger outlet', () => {
    const body = closed(hole('inlet', 900), hole('outlet', 450));
    expect(checked(cooled(body, 100), 'cooling-outlet').level).toBe('ok');
  });

  it('open ends count, 50 mm square inside', () => {
    expect(checked(cooled(straightBody(), 800), 'cooling-inlet').measured).toMatchObject({ value: 25, least: 24 });
    expect(checked(cooled(straightBody(), 900), 'cooling-inlet').level).toBe('watch');
  });

  it('is not asked without a power, or of what hangs outside', () => {
    expect(speaks(cooled(closed()), 'cooling-inlet')).toBe(false);
    const outside = craft(closed(), [motor(100)], { items: [item('esc', 'controller', [200, 90, 0], [40, 20, 8])] });
    expect(speaks(outside, 'cooling-inlet')).toBe(false);
  });
});

describe('ducted fan', () => {
  // 64 mm with a hub of 26 mm sweeps pi / 4 (4096 - 676) = 2686 mm2: 80 % are 2148.9, 95 % are 2551.8.
  const fan = (duct?: { inletMm2: number; outletMm2: number }): Drive => ({
    id: 'fan',
    kind: 'ductedFan',
    mount: { to: 'datum', at: [250, 0, 0] },
    mirrored: false,
    facing: 'pusher',
    turns: 'cw',
    thrustDeg: [0, 0],
    motor: { massG: 48, diameterMm: 24, lengthMm: 34, kvRpmPerV: 3900 },
    fan: { diameterMm: 64, hubMm: 26, blades: 5, massG: 28 },
    duct,
  });

  it.each([
    { inletMm2: 2687, level: 'ok' },
    { inletMm2: 2685, level: 'watch' },
    { inletMm2: 2150, level: 'watch' },
    { inletMm2: 2148, level: 'bad' },
  ])('an inlet of $inletMm2 mm²: $level', ({ inletMm2, level }) => {
    const found = checked(craft(closed(), [fan({ inletMm2, outletMm2: 2500 })]), 'fan-inlet');
    expect(found.level).toBe(level);
  });

  it.each([
    { outletMm2: 2148, level: 'watch' },
    { outletMm2: 2150, level: 'ok' },
    { outletMm2: 2551, level: 'ok' },
    { outletMm2: 2553, level: 'watch' },
  ])('an exit of $outletMm2 mm²: $level', ({ outletMm2, level }) => {
    expect(checked(craft(closed(), [fan({ inletMm2: 3000, outletMm2 })]), 'fan-exit').level).toBe(level);
  });

  it('the hole in the body counts where it is smaller than the duct says', () => {
    const level = (area: number) =>
      checked(craft(closed(hole('inlet', area)), [fan({ inletMm2: 3000, outletMm2: 2500 })]), 'fan-inlet').level;
    expect(level(2800)).toBe('ok');
    expect(level(2500)).toBe('watch');
  });

  it('without a duct the open ends count, and without those it says so', () => {
    expect(checked(craft(straightBody(), [fan()]), 'fan-exit').measured?.value).toBeCloseTo((100 * 2500) / 2686.06, 2);
    expect(checked(craft(closed(), [fan()]), 'fan-exit').measured).toBeNull();
    expect(checked(craft(closed(), [fan()]), 'fan-inlet').level).toBe('watch');
  });
});
