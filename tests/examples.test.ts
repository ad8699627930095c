import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parseAirframeText } from '@/lib/airframe/parse';
import { analyse } from '@/lib/figures/analyse';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS, stockOf } from '@/lib/layout/stock';
import { develop } from '@/lib/parts/develop';

/** What each example sets out to be, from the targets in the note beside it: stall speed and all-up mass at most. */
const TARGETS = {
  'tarrel-620': { stallMs: 7.6, massG: [250, 300], areaDm2: 10.5 },
  'ombry-1000': { stallMs: 8.2, massG: [560, 700], areaDm2: 21.5 },
  'quenlet-700': { stallMs: 7.2, massG: [220, 280], areaDm2: 12.6 },
  'quenlet-1050': { stallMs: 7.2, massG: [380, 460], areaDm2: 28.4 },
  hask: { stallMs: 8.4, massG: [430, 500], areaDm2: 16.9 },
} as const;

describe('the examples', () => {
  it('are the five that have targets', () => {
    const files = readdirSync('examples').filter((name) => name.endsWith('.json'));
    expect(files.sort()).toEqual(
      Object.keys(TARGETS)
        .map((name) => `${name}.json`)
        .sort(),
    );
  });

  describe.each(Object.entries(TARGETS))('%s', (name, target) => {
    const parsed = parseAirframeText(readFileSync(`examples/${name}.json`, 'utf8'));
    if (!parsed.ok) throw new RangeError(JSON.stringify(parsed.problems));
    const airframe = parsed.value;
    const figures = analyse(airframe, { depth: 'full' });
    const number = (id: string) => figures.values[id]?.value ?? Number.NaN;

    it('balances: its CG lies inside its own range', () => {
      expect(number('cgXMm')).toBeGreaterThan(number('cgForeLimitXMm'));
      expect(number('cgXMm')).toBeLessThan(number('cgAftLimitXMm'));
    });

    it('reaches its first-flight CG with the pack on its slide', () => {
      expect(figures.values.packFirstFlightMm?.verdict?.level).toBe('good');
      const { slide } = airframe.items.find(({ kind }) => kind === 'pack') ?? {};
      expect(number('packFirstFlightMm')).toBeGreaterThan(slide?.fromMm ?? Number.NaN);
      expect(number('packFirstFlightMm')).toBeLessThan(slide?.toMm ?? Number.NaN);
    });

    it('has a motor that can give the thrust it is said to give', () => {
      expect(number('staticThrustN')).toBe(airframe.drives[0]?.statedThrustN);
      expect(figures.values.staticThrustN?.verdict).toBeUndefined();
      expect(figures.values.thrustToWeight?.verdict?.level).toBe('good');
    });

    it('stalls below its target and has the mass and area it was drawn for', () => {
      expect(number('stallSpeedMs')).toBeLessThan(target.stallMs);
      expect(number('allUpMassG')).toBeGreaterThan(target.massG[0]);
      expect(number('allUpMassG')).toBeLessThan(target.massG[1]);
      expect(number('wingAreaDm2')).toBeCloseTo(target.areaDm2, 0);
    });

    it('has no bad verdict and no figure that could not be worked out', () => {
      const bad = Object.entries(figures.values).filter(([, figure]) => figure.verdict?.level === 'bad');
      expect(bad).toEqual([]);
      expect(figures.problems).toEqual([]);
    });

    it('cuts from its own sheets, every part once', () => {
      const development = develop(airframe);
      expect(development.problems).toEqual([]);
      const layout = layOut(development.parts, stockOf(airframe), LAYOUT_DEFAULTS);
      expect(layout.failures).toEqual([]);
      const laid = layout.sheets.flatMap((sheet) => sheet.placements.map((placement) => placement.partKey));
      expect(laid.sort()).toEqual(development.parts.map((part) => part.key).sort());
    });
  });
});
