import { describe, expect, it } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Surface } from '@/lib/airframe/schema/surface';
import { airframe, board, boom, control, drive, panel, surface, tube } from '@/tests/support/airframe';
import { item, straightBody } from '../testing/boxBody';
import { checked, speaks } from '../testing/checked';

const spar = (over: Partial<Surface['spars'][number]> = {}): Surface['spars'][number] => ({
  id: 'spar',
  tubeId: 'tube',
  chordShare: [0.3, 0.3],
  from: 0,
  to: 0.9,
  let: 'face',
  face: 'lower',
  ...over,
});

describe('receiver and carbon', () => {
  // A boom of 4 mm at y = 90 along x: its wall is at 88 mm; the receiver is 22 mm wide.
  const craft = (y: number, eGpa?: number): Airframe =>
    airframe({
      tubes: [tube({ eGpa })],
      booms: [boom({ mount: { to: 'datum', at: [0, 90, 0] } })],
      items: [item('rx', 'receiver', [200, y, 0], [40, 22, 12])],
    });
  it.each([
    { y: 47, level: 'ok' },
    { y: 48, level: 'watch' },
    { y: 85, level: 'watch' },
  ])('at y = $y: $level', ({ y, level }) => {
    const found = checked(craft(y), 'aerial-carbon');
    expect(found.level).toBe(level);
    expect(found.measured?.value).toBeCloseTo(Math.max(0, 88 - 11 - y), 4);
  });

  it('glass tubes are none', () => {
    expect(speaks(craft(48, 40), 'aerial-carbon')).toBe(false);
    expect(speaks(craft(48, 110), 'aerial-carbon')).toBe(true);
  });

  it('the port boom counts as well', () => {
    expect(checked(craft(-48), 'aerial-carbon').level).toBe('watch');
  });
});

describe('servo torque', () => {
  const craft = airframe({ surfaces: [surface({ controls: [control()] })] });
  it.each([
    { pct: 50, level: 'ok' },
    { pct: 50.1, level: 'watch' },
    { pct: 200, level: 'watch' },
    { pct: 201, level: 'bad' },
  ])('$pct % of it: $level', ({ pct, level }) => {
    const found = checked(craft, 'hinge-moment', { hingeTorquePct: pct });
    expect(found.level).toBe(level);
    expect(found.path).toBe('surfaces.0.controls.0');
  });

  it('says nothing without the figure', () => {
    expect(speaks(craft, 'hinge-moment')).toBe(false);
  });
});

describe('spar ends', () => {
  const wing = (spars: Surface['spars'], over: Partial<Surface> = {}) =>
    airframe({ surfaces: [surface({ spars, controls: [control({ from: 0.5 })], ...over })] });

  it.each([
    { to: 0.51, level: 'ok' },
    { to: 0.5, level: 'watch' },
    { to: 0.3, level: 'watch' },
  ])('a control begins at half: a spar to $to is $level', ({ to, level }) => {
    expect(checked(wing([spar({ to })]), 'spar-reach').level).toBe(level);
  });

  it.each([
    { to: 0.44, level: 'ok' },
    { to: 0.46, level: 'watch' },
    { to: 0.54, level: 'watch' },
    { to: 0.56, level: 'ok' },
  ])('a joint at half of 400 mm, 20 mm kept: a spar to $to is $level', ({ to, level }) => {
    const panels = [panel({ lengthMm: 200 }), panel({ id: 'p2', lengthMm: 200 })];
    const found = checked(wing([spar({ to })], { panels, controls: [] }), 'spar-joint');
    expect(found.level).toBe(level);
    expect(found.measured?.value).toBeCloseTo(Math.abs(to - 0.5) * 400, 6);
  });

  it('a straight spar goes across the middle; a swept one meets its fellow there', () => {
    expect(checked(wing([spar()]), 'spar-joint').level).toBe('ok');
    const swept = checked(wing([spar()], { panels: [panel({ sweepDeg: 10 })] }), 'spar-joint');
    expect(swept.level).toBe('watch');
    expect(swept.at[1]).toBeCloseTo(0, 9);
  });

  it('is not asked of a wing without one', () => {
    expect(speaks(wing([]), 'spar-reach')).toBe(false);
  });
});

describe('hold for the throw', () => {
  const cg: [number, number, number] = [200, 0, 0];
  const craft = (body = straightBody(), over: Partial<Airframe> = {}): Airframe =>
    airframe({ surfaces: [surface({ mount: { to: 'datum', at: [150, 0, 35] } })], bodies: [body], ...over });
  const hatch = (id: string, fromX: number, toX: number) =>
    ({ id, face: 'bottom', fromX, toX, widthMm: 40, purpose: 'hatch' }) as const;

  it.each([
    { aft: 230.5, level: 'ok' },
    { aft: 229.5, level: 'watch' },
    { aft: 200.5, level: 'watch' },
    { aft: 199, level: 'bad' },
  ])('a hatch to 170 mm and one from $aft mm: $level', ({ aft, level }) => {
    const body = straightBody({ openings: [hatch('h1', 100, 170), hatch('h2', aft, 300)] });
    expect(checked(craft(body), 'hand-hold', { cg }).level).toBe(level);
  });

  it.each([
    { x: 280, level: 'ok' },
    { x: 279, level: 'bad' },
  ])('a hand of 60 mm at the CG and a pusher disc at $x: $level', ({ x, level }) => {
    const drives = [drive({ facing: 'pusher', mount: { to: 'datum', at: [x, 0, 0] } })];
    expect(checked(craft(straightBody(), { drives }), 'hand-hold', { cg }).level).toBe(level);
  });

  it.each([
    { wide: 90, level: 'ok' },
    { wide: 91, level: 'watch' },
    { wide: 15, level: 'ok' },
    { wide: 14, level: 'watch' },
  ])('a body $wide mm wide: $level', ({ wide, level }) => {
    const stations = straightBody().stations.map((station) => ({ ...station, widthMm: wide }));
    expect(checked(craft(straightBody({ stations })), 'hand-hold', { cg }).level).toBe(level);
  });

  it('a body that does not reach under the wing is none to hold', () => {
    const above = airframe({
      surfaces: [surface({ mount: { to: 'datum', at: [150, 0, -20] } })],
      bodies: [straightBody()],
    });
    expect(checked(above, 'hand-hold', { cg }).level).toBe('note');
  });

  it('is not asked of what is not thrown, or whose CG is not known', () => {
    const ground = craft(straightBody(), { flight: { ...airframe().flight, launch: 'ground' } });
    expect(speaks(ground, 'hand-hold', { cg })).toBe(false);
    expect(speaks(craft(), 'hand-hold')).toBe(false);
  });
});

describe('notes', () => {
  it('two coverings tell its attitude, one does not', () => {
    const covered = (...ids: string[]) =>
      airframe({
        materials: [board()],
        coverings: ids.map((id) => ({ id, name: id, arealMassGm2: 50 })),
        surfaces: ids.map((coveringId, index) => surface({ id: `s${index}`, panels: [panel({ coveringId })] })),
      });
    expect(checked(covered('red', 'white'), 'right-way-up').level).toBe('ok');
    expect(checked(covered('red'), 'right-way-up').level).toBe('note');
  });

  it.each([
    { half: 500, kind: 'glued', level: 'ok' },
    { half: 501, kind: 'glued', level: 'note' },
    { half: 501, kind: 'bands', level: 'ok' },
  ] as const)('a half wing of $half mm joined by "$kind": $level', ({ half, kind, level }) => {
    const craft = airframe({
      surfaces: [surface({ panels: [panel({ lengthMm: half })] })],
      bodies: [straightBody()],
      joints: [{ id: 'seat', between: ['wing', 'body'], kind }],
    });
    expect(checked(craft, 'wing-off').level).toBe(level);
  });

  it('what breaks first is the propeller in front, else the nose before the pack, else the wing', () => {
    const pack = item('pack', 'pack', [100, 0, 0], [80, 34, 24]);
    const words = (over: Partial<Airframe>) => checked(airframe(over), 'breaks-first').words;
    expect(words({ drives: [drive()], bodies: [straightBody()], items: [pack] })).toContain('propeller');
    expect(words({ drives: [drive({ facing: 'pusher' })], bodies: [straightBody()], items: [pack] })).toContain('pack');
    expect(words({ items: [pack] })).toContain('wing');
  });
});
