import { describe, expect, it } from 'vitest';
import { startFrom } from '@/lib/airframe/layouts';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { balance } from '@/lib/balance/balance';
import { balanceFigures } from './balance';
import type { BalanceContext } from './balancePack';
import { massesOf } from './masses';
import { areasOf } from './reference';
import type { Stability } from './stability';
import { balanceEntries } from './table/balance';
import type { FigureValue } from './types';
import { known } from './value';

// The range is typed in by hand, as mm from where the CG is, so that what the figures say of it can be told beforehand.

const pusher = startFrom('pusher', 'Test');

function contextOf(airframe: Airframe, rangeFromCg: readonly [fore: number, aft: number]): BalanceContext {
  const resolved = resolve(airframe);
  if (!resolved.ok) throw new RangeError('the layout resolves');
  const { wing } = areasOf(airframe, resolved.value);
  const masses = massesOf(airframe, resolved.value);
  if (!wing.ok || !masses.balance.ok) throw new RangeError('the layout has a wing and mass');
  const cgX = masses.balance.value.cg[0];
  const [fore, aft] = rangeFromCg;
  const stability: Stability = {
    neutralPointX: cgX + aft + 10,
    bandX: [cgX + aft + 5, cgX + aft + 15],
    foreLimitX: cgX + fore,
    aftLimitX: cgX + aft,
    firstFlightX: cgX + fore + (aft - fore) / 4,
    clMax: { value: 0.75, low: 0.65, high: 0.85 },
    figures: { firstFlightCgXMm: known(cgX + fore + (aft - fore) / 4) },
    problems: [],
  };
  return {
    airframe,
    resolved: resolved.value,
    wing: wing.value,
    lines: masses.weighed,
    balance: masses.balance.value,
    stability,
  };
}
function figure(context: BalanceContext, id: keyof typeof balanceEntries): FigureValue {
  const found = balanceFigures(context).figures[id];
  if (!found) throw new RangeError(`no figure ${id}`);
  return found;
}
const number = (context: BalanceContext, id: keyof typeof balanceEntries): number =>
  figure(context, id).value ?? Number.NaN;
const input = (value: FigureValue, name: string): number =>
  value.inputs?.find((one) => one.name === name)?.value ?? Number.NaN;

const packMass = 72;
const shareOf = (context: BalanceContext) => packMass / context.balance.massG;

describe('figures of balance', () => {
  it('fill the rows of their table and add the margin, which the masses make less sure, each finite', () => {
    const { figures } = balanceFigures(contextOf(pusher, [-4, 4]));
    expect(Object.keys(figures).sort()).toEqual([...Object.keys(balanceEntries), 'staticMarginPct'].sort());
    for (const [id, value] of Object.entries(figures)) expect(Number.isFinite(value?.value), id).toBe(true);
  });
  it('bands name the masses as their cause, and lie about the value', () => {
    const context = contextOf(pusher, [-4, 4]);
    for (const id of ['allUpMassG', 'cgXMm', 'pitchInertiaKgM2', 'rollInertiaKgM2', 'yawInertiaKgM2'] as const) {
      const { value, band } = figure(context, id);
      expect(band?.low, id).toBeLessThan(value ?? 0);
      expect(band?.high, id).toBeGreaterThan(value ?? 0);
      expect(band?.cause, id).toContain('masses');
    }
  });
  it('loadings are as sure as the mass, pack moves as the CG, by its share of the mass', () => {
    const context = contextOf(pusher, [-4, 4]);
    const off = (id: keyof typeof balanceEntries) => {
      const { value, band } = figure(context, id);
      return (band?.high ?? Number.NaN) - (value ?? Number.NaN);
    };
    const share = (id: keyof typeof balanceEntries) => off(id) / number(context, id);
    expect(share('wingLoadingGdm2')).toBeCloseTo(share('allUpMassG'), 12);
    expect(share('cubicLoadingKgM3')).toBeCloseTo(share('allUpMassG'), 12);
    for (const id of ['packForeMm', 'packAftMm', 'packFirstFlightMm'] as const)
      expect(off(id)).toBeCloseTo(off('cgXMm') / shareOf(context), 9);
  });
  it('radii of gyration are by half as sure as inertia and mass: the root of one over the other', () => {
    const context = contextOf(pusher, [-4, 4]);
    const share = (id: keyof typeof balanceEntries, end: 'low' | 'high') =>
      (figure(context, id).band?.[end] ?? Number.NaN) / number(context, id);
    const up = Math.hypot(
      Math.sqrt(share('pitchInertiaKgM2', 'high')) - 1,
      1 / Math.sqrt(share('allUpMassG', 'low')) - 1,
    );
    expect(share('gyrationPitchMacPct', 'high')).toBeCloseTo(1 + up, 9);
    expect(share('gyrationPitchLengthPct', 'high')).toBeCloseTo(1 + up, 9);
  });
  it('the mass adds up from its groups', () => {
    const context = contextOf(pusher, [-4, 4]);
    const { value, inputs } = figure(context, 'allUpMassG');
    expect(inputs?.reduce((sum, one) => sum + one.value, 0)).toBeCloseTo(value ?? 0, 9);
  });
  it('a mass limit is judged by what the owner typed', () => {
    const { massG } = contextOf(pusher, [-4, 4]).balance;
    const level = (massLimitG: number) =>
      figure(contextOf({ ...pusher, flight: { ...pusher.flight, massLimitG } }, [-4, 4]), 'allUpMassG').verdict?.level;
    expect([level(massG - 1), level(massG + 1), level(massG * 1.5)]).toEqual(['bad', 'watch', 'good']);
    expect(figure(contextOf(pusher, [-4, 4]), 'allUpMassG').verdict).toBeUndefined();
  });
});

describe('where the pack must sit', () => {
  it('both ends of the range by its share of the mass', () => {
    const context = contextOf(pusher, [-4, 4]);
    const share = shareOf(context);
    expect(number(context, 'packForeMm')).toBeCloseTo(-4 / share, 6);
    expect(number(context, 'packAftMm')).toBeCloseTo(4 / share, 6);
    expect(number(context, 'packFirstFlightMm')).toBeCloseTo(-2 / share, 6);
    expect(number(context, 'packCgPerCm')).toBeCloseTo(10 * share, 9);
  });
  it('says in words which way, and how far the slide falls short', () => {
    // The pack slides 12 mm forward and 45 aft; it is a quarter of the mass.
    expect(figure(contextOf(pusher, [-4, 4]), 'packFirstFlightMm').verdict).toEqual({
      level: 'good',
      words: 'move it 8 mm forward',
    });
    const far = figure(contextOf(pusher, [-20, -8]), 'packFirstFlightMm').verdict;
    expect(far?.level).toBe('watch');
    expect(far?.words).toMatch(/^its slide ends \d+ mm short of \d+ mm forward$/);
    expect(figure(contextOf(pusher, [-1, 3]), 'packFirstFlightMm').verdict?.words).toBe('leave it where it is');
  });
  it('a heavier pack in front of the CG moves it forward; the inputs tell margin and move', () => {
    const context = contextOf(pusher, [-4, 4]);
    const swap = figure(context, 'packSwapCgMm');
    expect(swap.value).toBeLessThan(-1);
    expect(swap.inputs).toHaveLength(9);
    expect(input(swap, 'with 54 g: CG moves')).toBeGreaterThan(0);
    expect(input(swap, 'with 90 g: CG moves')).toBeCloseTo(swap.value ?? 0, 12);
    // The margin is 14 mm with the pack as it is, and grows by what the CG goes forward.
    const margin = ((14 - (swap.value ?? 0)) / context.wing.macMm) * 100;
    expect(input(swap, 'with 90 g: static margin')).toBeCloseTo(margin, 9);
  });
  it('without a pack it says so', () => {
    const bare: Airframe = {
      ...pusher,
      items: pusher.items.filter(({ kind }) => kind !== 'pack'),
      drives: pusher.drives.map(({ packItemId: _, ...drive }) => drive),
    };
    expect(figure(contextOf(bare, [-4, 4]), 'packForeMm').problem?.code).toBe('no-pack');
    expect(figure(contextOf(bare, [-40, -30]), 'ballastG').verdict?.words).toMatch(/^add \d+ g at the nose/);
  });
  it('without a range it says why there is none', () => {
    const problem = { code: 'cg-range-empty', path: 'flight.staticMarginPct', message: 'no range' };
    const context = contextOf(pusher, [-4, 4]);
    const stability = {
      ...context.stability,
      firstFlightX: null,
      figures: { firstFlightCgXMm: { value: null, problem } },
    };
    const { figures } = balanceFigures({ ...context, stability });
    expect(figures.ballastG?.problem).toEqual(problem);
    expect(figures.packSwapCgMm?.problem).toEqual(problem);
    expect(figures.allUpMassG?.value).toBeGreaterThan(0);
  });
});

describe('ballast', () => {
  it('is none in range, and none when moving the pack is enough', () => {
    expect(figure(contextOf(pusher, [-4, 4]), 'ballastG')).toMatchObject({ value: 0, verdict: { level: 'good' } });
    const near = figure(contextOf(pusher, [-6, -2]), 'ballastG');
    expect(near).toMatchObject({ value: 0, verdict: { level: 'watch' } });
    expect(near.verdict?.words).toBe('none, once the pack is moved 8 mm forward');
    // A tenth of a millimetre of CG is under half a millimetre of pack: nobody can place it better, so it is where it is.
    const nearest = figure(contextOf(pusher, [-6, -0.1]), 'ballastG');
    expect(nearest).toMatchObject({ value: 0, verdict: { level: 'good', words: 'none needed' } });
  });
  it('beyond the slide: the grams bring the CG to the edge of the range, with the pack at its end', () => {
    const context = contextOf(pusher, [-12, -8]);
    const ballast = figure(context, 'ballastG');
    expect(ballast.verdict?.words).toMatch(
      /^the pack cannot reach it: move it 20 mm forward and add \d+ g at the nose$/,
    );
    const lines = context.lines.map((line) =>
      line.key === 'pack' ? { ...line, at: [line.at[0] - 20, line.at[1], line.at[2]] as const } : line,
    );
    // The pod's nose stands at -230; ballast lies 10 mm inside.
    const added = { key: 'ballast', massG: ballast.value ?? 0, at: [-220, 0, 0] as const };
    expect(balance([...lines, added]).cg[0]).toBeCloseTo(context.stability.aftLimitX, 6);
    expect(input(ballast, 'for the first-flight CG instead')).toBeGreaterThan(ballast.value ?? 0);
    expect(input(ballast, 'place of the ballast, behind the nose')).toBeCloseTo(10, 9);
  });
  it('goes to the tail when the CG is too far forward', () => {
    expect(figure(contextOf(pusher, [15, 20]), 'ballastG').verdict?.words).toContain('at the tail');
  });
  it('a great deal of it is called dead weight', () => {
    const { verdict } = figure(contextOf(pusher, [-60, -50]), 'ballastG');
    expect(verdict?.level).toBe('bad');
    expect(verdict?.words).toContain('dead weight');
  });
});

describe('from side to side', () => {
  const heavyAt = (y: number): Airframe => ({
    ...pusher,
    items: [
      ...pusher.items,
      { id: 'camera', kind: 'other', massG: 20, sizeMm: [20, 20, 20], mount: { to: 'datum', at: [0, y, 0] } },
    ],
  });
  it('a mass beside the centre is levelled by the other tip', () => {
    const context = contextOf(heavyAt(90), [-4, 4]);
    const plain = contextOf(heavyAt(0), [-4, 4]);
    const moment = (number(context, 'cgYMm') - number(plain, 'cgYMm')) * context.balance.massG;
    expect(moment).toBeCloseTo(20 * 90, 6);
    const tip = { key: 'tip', massG: number(context, 'tipBalanceG'), at: [0, -350, 0] as const };
    expect(balance([...context.lines, tip]).cg[1]).toBeCloseTo(0, 9);
    expect(figure(context, 'cgYMm').verdict).toMatchObject({ level: 'watch' });
    expect(figure(context, 'tipBalanceG').verdict?.words).toContain('port tip');
  });
  it('is level, a little heavy and too heavy on either side of each limit', () => {
    const level = (y: number) => figure(contextOf(heavyAt(y), [-4, 4]), 'cgYMm').verdict?.level;
    // 0.5 and 2 % of 350 mm at about 312 g: 20 g at 27 and at 109 mm.
    expect([level(0), level(-60), level(200)]).toEqual(['good', 'watch', 'bad']);
  });
});

describe('radii of gyration', () => {
  it('grow with what is moved outwards, and are shares of chord, length and span', () => {
    const context = contextOf(pusher, [-4, 4]);
    const k = Math.sqrt((context.balance.inertiaKgM2.yy * 1e9) / context.balance.massG);
    expect(number(context, 'gyrationPitchMacPct')).toBeCloseTo((100 * k) / context.wing.macMm, 9);
    expect(number(context, 'gyrationPitchLengthPct')).toBeCloseTo((100 * k) / 770, 9);
    const spread = contextOf(
      { ...pusher, items: pusher.items.map((item) => (item.id === 'pack' ? { ...item, massG: 90 } : item)) },
      [-4, 4],
    );
    expect(number(spread, 'pitchInertiaKgM2')).toBeGreaterThan(number(context, 'pitchInertiaKgM2'));
  });
});
