import { expect } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { analyse } from '@/lib/figures/analyse';
import type { Figures } from '@/lib/figures/types';
import { airframe, control, panel, surface } from './airframe';

// A plain aircraft without a motor whose figures can be turned one at a time: wing with ailerons, tail with elevator, fin, and a pack that
// decides the CG.

export const wing = (over = {}) =>
  surface({
    panels: [panel({ lengthMm: 500, rootChordMm: 210, tipChordMm: 150, sweepDeg: 4 })],
    controls: [control()],
    ...over,
  });
export const tail = (x = 560, over = {}) =>
  surface({
    id: 'tail',
    role: 'tailplane',
    mount: { to: 'datum', at: [x, 0, 12] },
    panels: [panel({ lengthMm: 190, rootChordMm: 130, tipChordMm: 110 })],
    controls: [
      control({
        id: 'elevator',
        kind: 'elevator',
        from: 0,
        to: 1,
        chordShare: [0.35, 0.35],
        mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 },
      }),
    ],
    ...over,
  });
export const fin = (x = 555) =>
  surface({
    id: 'fin',
    role: 'fin',
    mirrored: false,
    cantDeg: 90,
    mount: { to: 'datum', at: [x, 0, 12] },
    panels: [panel({ lengthMm: 130, rootChordMm: 140, tipChordMm: 90, sweepDeg: 12 })],
  });
/** A pack heavy enough to decide the CG, centred at x. */
export const packAt = (x: number, massG = 300): Airframe['items'][number] => ({
  id: 'pack',
  kind: 'pack',
  massG,
  sizeMm: [80, 30, 20],
  mount: { to: 'datum', at: [x, 0, 0] },
});
export const plain = (over: Partial<Airframe> = {}) =>
  airframe({ surfaces: [wing(), tail(), fin()], items: [packAt(0)], ...over });

export const full = (document: Airframe): Figures => analyse(document, { depth: 'full' });
export const value = (figures: Figures, id: string): number => figures.values[id]?.value ?? Number.NaN;
export const neutralPoint = (document: Airframe): number => value(full(document), 'neutralPointXMm');

/** Every number shown is finite, and a figure without one says why. */
export function expectHonest(figures: Figures): void {
  for (const [id, figure] of Object.entries(figures.values)) {
    if (figure.value === null) expect(figure.problem?.message, id).toBeTruthy();
    else expect(Number.isFinite(figure.value), id).toBe(true);
    if (figure.band) expect(figure.band.low, id).toBeLessThanOrEqual(figure.band.high);
  }
  expect(JSON.stringify(figures)).not.toMatch(/NaN|Infinity/);
}
