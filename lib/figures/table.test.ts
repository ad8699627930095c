import { describe, expect, it } from 'vitest';
import { QUANTITIES } from '@/lib/units/quantity';
import * as bands from './bands';
import { DECIDING, FIGURES } from './table';

describe('the table of figures', () => {
  it.each(Object.entries(FIGURES))('%s stands under its own id and says everything about itself', (id, entry) => {
    expect(entry.id).toBe(id);
    for (const text of [entry.name, entry.explanation, entry.method, entry.source, entry.limits])
      expect(text.length).toBeGreaterThan(1);
    expect(QUANTITIES).toHaveProperty(entry.quantity);
    expect(entry.digits).toBeGreaterThanOrEqual(0);
  });

  it('gives no two figures the same name', () => {
    const names = Object.values(FIGURES).map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
  });

  it('lists each deciding figure once', () => expect(new Set(DECIDING).size).toBe(DECIDING.length));
});

describe('the limits that verdicts rest on', () => {
  const judged = Object.entries({
    h: bands.TAIL_VOLUME_H,
    v: bands.TAIL_VOLUME_V,
    pitch: bands.PITCH_FEEL,
    roll: bands.ROLL_HELIX,
  });
  it.each(judged)('%s: good lies inside watch, and it names its source', (_, { good, watch, source }) => {
    expect([...watch, ...good].sort((a, b) => a - b)).toEqual([watch[0], good[0], good[1], watch[1]]);
    expect(source.length).toBeGreaterThan(10);
  });
});
