import { describe, expect, it } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Body } from '@/lib/airframe/schema/fuselage';
import { airframe, drive, surface } from '@/tests/support/airframe';
import { former, item, straightBody } from '../testing/boxBody';
import { allChecked, checked, speaks } from '../testing/checked';

const wing = surface({ mount: { to: 'datum', at: [0, 0, 35] } });
const craft = (over: Partial<Airframe>): Airframe => airframe({ surfaces: [wing], bodies: [straightBody()], ...over });
const pack = (x = 200, over = {}) => item('pack', 'pack', [x, 0, 0], [80, 34, 24], over);

describe('boxes', () => {
  it.each([
    { x: 251, level: 'ok' },
    { x: 249.8, level: 'ok' },
    { x: 249.6, level: 'bad' },
    { x: 240, level: 'bad' },
  ])('a servo of 20 mm behind a pack that ends at 240 mm, its middle at $x: $level', ({ x, level }) => {
    const servo = item('servo', 'servo', [x, 0, 0], [20, 12, 24]);
    const found = checked(craft({ items: [servo, pack()] }), 'boxes-meet');
    expect(found.level).toBe(level);
    expect(found.elementId).toBe('pack');
    expect(found.measured?.value).toBeCloseTo(x - 250, 9);
  });

  it.each([
    { x: 240, level: 'ok' },
    { x: 239.5, level: 'bad' },
  ])('a former at $x mm behind it: $level', ({ x, level }) => {
    const bodies = [straightBody({ formers: [former('f1', x)] })];
    expect(checked(craft({ bodies, items: [pack()] }), 'boxes-meet').level).toBe(level);
  });

  it.each([
    { x: -0.1, level: 'ok' },
    { x: 4, level: 'bad' },
  ])('a motor whose foot stands at $x mm before a firewall at the nose: $level', ({ x, level }) => {
    const bodies = [straightBody({ formers: [former('firewall', 0, { role: 'firewall' })] })];
    const drives = [drive({ mount: { to: 'datum', at: [x - 30, 0, 0] } })];
    expect(checked(craft({ bodies, drives }), 'boxes-meet').level).toBe(level);
  });

  it('names each that meets something once, and hardware without a shape never', () => {
    const items = [
      pack(),
      item('servo', 'servo', [200, 0, 0], [20, 12, 24]),
      item('rx', 'receiver', [200, 0, 5], [30, 20, 10]),
      item('links', 'hardware', [200, 0, 0], [60, 10, 10]),
    ];
    const found = allChecked(craft({ items })).filter(({ ruleId }) => ruleId === 'boxes-meet');
    expect(found.map(({ elementId }) => elementId)).toEqual(['pack', 'servo']);
  });
});

const opening = (over: Partial<Body['openings'][number]>): Body['openings'][number] => ({
  id: 'hatch',
  face: 'bottom',
  fromX: 150,
  toX: 250,
  widthMm: 40,
  purpose: 'hatch',
  ...over,
});
/** Both ends closed, so that only openings lead in. */
const closed = (openings: Body['openings'], over: Partial<Body> = {}): Body =>
  straightBody({ formers: [former('nose', 0), former('tail', 395)], openings, ...over });
const hatch = (over: Partial<Body['openings'][number]>) =>
  checked(craft({ bodies: [closed([opening(over)])], items: [pack()] }), 'pack-hatch');

describe('pack through its hatch', () => {
  it.each([
    { long: 81, wide: 35, level: 'ok' },
    { long: 80.9, wide: 35, level: 'watch' },
    // Tilted at 45 degrees a pack 24 mm high needs 24 times the root of two and the millimetre: 34.9 mm.
    { long: 35, wide: 35, level: 'watch' },
    { long: 34.5, wide: 35, level: 'bad' },
    { long: 90, wide: 34.9, level: 'bad' },
  ])('80 x 34 mm through $long x $wide mm: $level', ({ long, wide, level }) => {
    const found = hatch({ fromX: 200 - long / 2, toX: 200 + long / 2, widthMm: wide });
    expect(found.level).toBe(level);
    expect(found.measured?.value).toBeCloseTo(Math.min(long - 80, wide - 34), 9);
  });

  it('in a side the height counts', () => {
    expect(hatch({ face: 'stbd', widthMm: 25 }).level).toBe('ok');
    expect(hatch({ face: 'stbd', widthMm: 24.5 }).level).toBe('bad');
  });

  it('behind a former it leads nowhere', () => {
    const bodies = [closed([opening({ fromX: 260, toX: 380 })])];
    expect(checked(craft({ bodies, items: [pack()] }), 'pack-hatch').level).toBe('ok');
    const divided = straightBody({
      formers: [former('nose', 0), former('f1', 245), former('tail', 395)],
      openings: [opening({ fromX: 260, toX: 380 })],
    });
    const found = checked(craft({ bodies: [divided], items: [pack()] }), 'pack-hatch');
    expect(found.level).toBe('bad');
    expect(found.measured).toBeNull();
  });

  it('an open end lets it in until something stands before it', () => {
    const open = straightBody({ formers: [former('tail', 395)] });
    expect(checked(craft({ bodies: [open], items: [pack()] }), 'pack-hatch').level).toBe('ok');
    const items = [pack(), item('rx', 'receiver', [60, 0, 0], [30, 20, 10])];
    expect(checked(craft({ bodies: [open], items }), 'pack-hatch').level).toBe('bad');
  });

  it('a saddle is a way in under a wing that comes off', () => {
    const bodies = [closed([opening({ face: 'top', purpose: 'saddle' })])];
    const level = (kind: 'glued' | 'bands') =>
      checked(
        craft({ bodies, items: [pack()], joints: [{ id: 'seat', between: ['wing', 'body'], kind }] }),
        'pack-hatch',
      ).level;
    expect(level('bands')).toBe('ok');
    expect(level('glued')).toBe('bad');
  });

  it('is not asked of a pack outside every body', () => {
    expect(speaks(craft({ bodies: [], items: [pack()] }), 'pack-hatch')).toBe(false);
  });
});

describe('pack on its slide', () => {
  // Between the nose plate, which ends at 5 mm, and a former at 300 mm; the pack reaches from 160 to 240 mm.
  const bodies = [straightBody({ formers: [former('nose', 0), former('f1', 300), former('tail', 395)] })];
  const slid = (fromMm: number, toMm: number, figures = {}, more: Airframe['items'] = []) =>
    checked(craft({ bodies, items: [pack(200, { slide: { fromMm, toMm } }), ...more] }), 'pack-slide', figures);

  it.each([
    { from: -155, to: 60, level: 'ok' },
    { from: -155, to: 60.5, level: 'watch' },
    { from: -155.5, to: 60, level: 'watch' },
  ])('155 mm forward and 60 mm aft are free; $from to $to asked: $level', ({ from, to, level }) => {
    expect(slid(from, to).level).toBe(level);
  });

  it('a receiver in its way is where it ends; beside it, it is none', () => {
    const at = (z: number) => [item('rx', 'receiver', [260, 0, z], [20, 20, 6])];
    expect(slid(-10, 10, {}, at(0)).level).toBe('ok');
    expect(slid(-10, 11, {}, at(0)).level).toBe('watch');
    expect(slid(-10, 11, {}, at(16)).level).toBe('ok');
  });

  it('must reach its place for the first flight', () => {
    expect(slid(-20, 20, { packFirstFlightMm: 60 }).level).toBe('ok');
    expect(slid(-20, 20, { packFirstFlightMm: 61 }).level).toBe('bad');
  });

  it('narrows with the body', () => {
    // Inside, the body is 50 mm wide at 0 and 10 mm at 400 mm: the pack's 34 mm fit as far as 160 mm, with 0.3 mm of give a side to 166.
    const tapered = straightBody({
      stations: [
        { id: 's1', xMm: 0, widthMm: 60, topMm: 30, bottomMm: -30, cornerMm: 0 },
        { id: 's2', xMm: 400, widthMm: 20, topMm: 30, bottomMm: -30, cornerMm: 0 },
      ],
    });
    const level = (toMm: number) =>
      checked(craft({ bodies: [tapered], items: [pack(100, { slide: { fromMm: 0, toMm } })] }), 'pack-slide').level;
    expect(level(26)).toBe('ok');
    expect(level(27)).toBe('watch');
  });

  it('doublers take room inside', () => {
    // 50 mm inside, less 5 mm a side: a pack of 41 mm has no place between doublers, and one before they begin has.
    const doubled = straightBody({
      doublers: [
        { id: 'd1', face: 'port', fromX: 150, toX: 300, materialId: 'board' },
        { id: 'd2', face: 'stbd', fromX: 150, toX: 300, materialId: 'board' },
      ],
    });
    const level = (x: number) =>
      checked(craft({ bodies: [doubled], items: [item('pack', 'pack', [x, 0, 0], [80, 41, 24])] }), 'pack-slide').level;
    expect(level(200)).toBe('bad');
    expect(level(100)).toBe('ok');
  });

  it('that stands in a wall is bad where it is', () => {
    const at = (z: number) =>
      checked(craft({ items: [item('pack', 'pack', [200, 0, z], [80, 34, 24])] }), 'pack-slide').level;
    expect(at(13)).toBe('ok');
    expect(at(13.5)).toBe('bad');
  });
});
