import { describe, expect, it } from 'vitest';
import { airAt } from '@/lib/aero/atmosphere';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Control, Panel, Surface } from '@/lib/airframe/schema/surface';
import { balance } from '@/lib/balance/balance';
import { massList } from '@/lib/balance/masses';
import { developResolved } from '@/lib/parts/develop';
import { airframe, board, control, panel, surface, tube } from '@/tests/support/airframe';
import { packAt } from '@/tests/support/plainAircraft';
import { areasOf } from './reference';
import { structureFigures } from './structure';
import { CONTROL_LOSS_PCT, TWIST_SPEED_OVER_CRUISE } from './structureBands';

function group(document: Airframe) {
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('does not resolve');
  const masses = massList(document, resolved.value, developResolved(document, resolved.value));
  return structureFigures({
    airframe: document,
    resolved: resolved.value,
    areas: areasOf(document, resolved.value),
    balance: balance(masses),
    air: airAt(0, 0),
  });
}
const figures = (document: Airframe) => group(document).figures;
type Id = 'sparStressMpa' | 'tipDeflection1gMm' | 'controlLossAtCruisePct' | 'tipTwistPerDeg' | 'reversalSpeedMs';
const value = (document: Airframe, id: Id) => figures(document)[id]?.value ?? Number.NaN;

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
const elevon = (over: Partial<Control> = {}): Control =>
  control({
    id: 'elevon',
    kind: 'elevon',
    from: 0.5,
    to: 0.95,
    chordShare: [0.22, 0.28],
    mix: { pitch: 1, roll: 1, yaw: 0, flap: 0 },
    ...over,
  });

interface Tailless {
  wing?: Partial<Surface>;
  panel?: Partial<Panel>;
  sheet?: Parameters<typeof board>[0];
  flight?: Partial<Airframe['flight']>;
  packG?: number;
}
/** A swept tailless wing of 800 mm with elevons at its tips and a spar. */
function tailless({ wing = {}, panel: shape = {}, sheet = {}, flight = {}, packG = 200 }: Tailless = {}): Airframe {
  const base = airframe();
  const swept = panel({ lengthMm: 400, rootChordMm: 240, tipChordMm: 140, sweepDeg: 22, ...shape });
  return airframe({
    materials: [board(sheet)],
    tubes: [tube({ eGpa: 110 })],
    surfaces: [surface({ panels: [swept], controls: [elevon()], spars: [spar()], ...wing })],
    items: [packAt(110, packG)],
    flight: { ...base.flight, cruiseMs: 14, ...flight },
  });
}

describe('loss of control by twist', () => {
  it('is moderate on a faced board, with a band on both sides that names its cause', () => {
    const { controlLossAtCruisePct: loss, reversalSpeedMs: reversal } = figures(tailless());
    expect(loss?.value).toBeGreaterThan(0);
    expect(loss?.value).toBeLessThan(45);
    for (const figure of [loss, reversal]) {
      expect(figure?.band?.low).toBeLessThan(figure?.value ?? 0);
      expect(figure?.band?.high).toBeGreaterThan(figure?.value ?? 0);
      expect(figure?.band?.cause).toBe('how stiff the sheet and the spar are');
      expect(figure?.inputs?.[0]?.name).toContain('elevon of the wing, for');
    }
  });

  it('elevons moved inboard on a swept wing twist its tip less for each degree', () => {
    const inboard = tailless({ wing: { controls: [elevon({ from: 0.15, to: 0.6 })] } });
    expect(value(inboard, 'tipTwistPerDeg')).toBeLessThan(value(tailless(), 'tipTwistPerDeg') * 0.8);
  });

  const stiffer: [string, Airframe][] = [
    ['a thicker board', tailless({ sheet: { thicknessMm: 6 } })],
    ['thicker paper', tailless({ sheet: { facesGm2: 220 } })],
    ['a second spar', tailless({ wing: { spars: [spar(), spar({ id: 'aft', chordShare: [0.6, 0.6] })] } })],
    ['a shorter wing', tailless({ panel: { lengthMm: 330 } })],
    ['a measured modulus above the usual', tailless({ sheet: { eMpa: 1500 } })],
  ];
  it.each(stiffer)('%s raises the reversal speed and lowers the loss', (_, document) => {
    expect(value(document, 'reversalSpeedMs')).toBeGreaterThan(value(tailless(), 'reversalSpeedMs'));
    expect(value(document, 'controlLossAtCruisePct')).toBeLessThan(value(tailless(), 'controlLossAtCruisePct'));
  });

  it('plain foam reverses far sooner than board with paper, and is said to be bad', () => {
    const foam = figures(tailless({ sheet: { kind: 'xps', facesGm2: 0, thicknessMm: 6 } }));
    expect(foam.reversalSpeedMs?.value).toBeLessThan(value(tailless(), 'reversalSpeedMs') / 2);
    expect(foam.reversalSpeedMs?.verdict?.level).toBe('bad');
    expect(foam.controlLossAtCruisePct?.verdict?.level).toBe('bad');
  });

  it('grows with speed, while the reversal speed is the aircraft’s own', () => {
    const fast = tailless({ flight: { cruiseMs: 20 } });
    expect(value(fast, 'controlLossAtCruisePct')).toBeGreaterThan(value(tailless(), 'controlLossAtCruisePct') * 1.5);
    expect(value(fast, 'reversalSpeedMs')).toBeCloseTo(value(tailless(), 'reversalSpeedMs'), 9);
  });

  it('judges both sides of its limits', () => {
    const reversal = value(tailless(), 'reversalSpeedMs');
    const at = (share: number) => figures(tailless({ flight: { cruiseMs: reversal / share } }));
    const levels = (share: number) => at(share).reversalSpeedMs?.verdict?.level;
    const { good, watch } = TWIST_SPEED_OVER_CRUISE;
    expect([levels(good[0] * 1.01), levels(good[0] * 0.99)]).toEqual(['good', 'watch']);
    expect([levels(watch[0] * 1.01), levels(watch[0] * 0.99)]).toEqual(['watch', 'bad']);
    for (const share of [1.1, 1.6, 2, 3, 5]) {
      const { value: loss = null, verdict } = at(share).controlLossAtCruisePct ?? {};
      const wanted =
        (loss ?? 0) <= CONTROL_LOSS_PCT.good[1] ? 'good' : (loss ?? 0) <= CONTROL_LOSS_PCT.watch[1] ? 'watch' : 'bad';
      expect(verdict?.level, String(loss)).toBe(wanted);
    }
    expect(at(0.95).controlLossAtCruisePct?.verdict?.words).toContain('reversed');
  });

  it('does not apply without a control', () => {
    const { figures: none, problems } = group(tailless({ wing: { controls: [] } }));
    for (const id of ['controlLossAtCruisePct', 'tipTwistPerDeg', 'reversalSpeedMs', 'divergenceSpeedMs'] as const)
      expect(none[id]?.problem?.code).toBe('does-not-apply');
    expect(problems ?? []).toEqual([]);
  });

  it('a forward-swept wing of soft foam that twists off below cruise is a problem at that surface, and no loss is shown', () => {
    const soft = tailless({
      panel: { sweepDeg: -30, rootChordMm: 160, tipChordMm: 160 },
      sheet: { kind: 'epp', facesGm2: 0, thicknessMm: 3 },
      wing: { spars: [] },
      flight: { cruiseMs: 20 },
    });
    const { figures: shown, problems } = group(soft);
    expect(problems?.[0]).toMatchObject({ code: 'wing-twists-off', path: 'surfaces.0' });
    expect(shown.controlLossAtCruisePct?.value).toBeNull();
    expect(shown.divergenceSpeedMs?.value).toBeLessThan(20);
    expect(shown.divergenceSpeedMs?.verdict?.level).toBe('bad');
  });

  it('a wing swept aft does not twist off', () => {
    const bending = tailless({ wing: { spars: [] }, panel: { sweepDeg: 35 } });
    expect(figures(bending).divergenceSpeedMs?.problem?.code).toBe('does-not-apply');
  });
});

describe('spar stress', () => {
  it('S2 through the figure: moment over modulus at the load factor, and it grows in proportion to both', () => {
    const straight = (over: Tailless = {}) =>
      tailless({ panel: { sweepDeg: 0, rootChordMm: 200, tipChordMm: 200, lengthMm: 600 }, ...over });
    const six = figures(straight({ flight: { loadFactor: 6 } })).sparStressMpa;
    const massG = six?.inputs?.find(({ unit, name }) => unit === 'g' && name === 'mass')?.value ?? 0;
    // (n W / 2) (4 / 3 pi) (b / 2) over pi (4^4 - 2^4) / 64 / 2.
    const moment = ((6 * massG * 9.80665) / 2000) * (4 / (3 * Math.PI)) * 600;
    expect(six?.value).toBeCloseTo(moment / ((Math.PI / 128) * 240), 6);
    expect(value(straight({ flight: { loadFactor: 3 } }), 'sparStressMpa')).toBeCloseTo((six?.value ?? 0) / 2, 9);
    // An even load: 3 pi / 8 of it.
    expect((six?.band?.high ?? 0) / (six?.value ?? 1)).toBeCloseTo((3 * Math.PI) / 8, 9);
    expect(six?.band?.low).toBeLessThan(six?.value ?? 0);
  });

  it('without a load factor of its own is at 6 g', () => {
    expect(value(tailless(), 'sparStressMpa')).toBeCloseTo(
      value(tailless({ flight: { loadFactor: 6 } }), 'sparStressMpa'),
      9,
    );
  });

  it('two spars side by side share it', () => {
    const two = tailless({ wing: { spars: [spar(), spar({ id: 'aft', chordShare: [0.5, 0.5] })] } });
    expect(value(two, 'sparStressMpa') / value(tailless(), 'sparStressMpa')).toBeGreaterThan(0.5);
    expect(value(two, 'sparStressMpa') / value(tailless(), 'sparStressMpa')).toBeLessThan(0.55);
  });

  it.each([
    [1, 'bad'],
    [0.8, 'watch'],
    [0.6, 'good'],
  ])('at %d of its strength is %s', (share, level) => {
    const stress = value(tailless(), 'sparStressMpa');
    const document = { ...tailless(), tubes: [tube({ eGpa: 110, strengthMpa: (stress * 0.999) / share })] };
    expect(figures(document).sparStressMpa?.verdict?.level).toBe(level);
  });

  it('does not apply to a wing without a spar', () => {
    expect(figures(tailless({ wing: { spars: [] } })).sparStressMpa?.problem?.code).toBe('does-not-apply');
  });
});

describe('tip deflection', () => {
  it('a spar holds the tip down, a heavier aircraft bends it up, and softer sheet is the high end of the band', () => {
    const bare = tailless({ wing: { spars: [] } });
    expect(value(tailless(), 'tipDeflection1gMm')).toBeLessThan(value(bare, 'tipDeflection1gMm') * 0.8);
    expect(value(tailless({ packG: 400 }), 'tipDeflection1gMm')).toBeGreaterThan(
      value(tailless(), 'tipDeflection1gMm'),
    );
    const band = figures(tailless()).tipDeflection1gMm?.band;
    expect(band?.low).toBeLessThan(band?.high ?? 0);
  });
});
