import { describe, expect, it } from 'vitest';
import * as defaults from './defaults';
import * as practice from './practice';
import { Material, Tube } from './schema/stock';

const stock = [...Object.values(defaults.MATERIALS), ...Object.values(defaults.TUBES)];

/** Every default found in the two files, by its path. */
function found(value: unknown, path: string): [string, object][] {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return [];
  if ('basis' in value) return [[path, value]];
  return Object.entries(value).flatMap(([key, inner]) => found(inner, `${path}.${key}`));
}
const all = [...found({ ...defaults }, 'defaults'), ...found({ ...practice }, 'practice')];

describe('defaults', () => {
  it.each(Object.entries(defaults.MATERIALS))(
    'material %s fits the schema and says what it rests on',
    (_, material) => {
      expect(Material.parse(material)).toEqual(material);
      expect(material.source).toMatch(/^(CP|M): .*weigh yours$/);
      expect(material.facesGm2).toBeLessThan(material.arealMassGm2);
    },
  );
  it.each(Object.entries(defaults.TUBES))('tube %s fits the schema', (_, tube) => {
    expect(Tube.parse(tube)).toEqual(tube);
  });
  it('no two of the stock share an id', () => {
    expect(new Set(stock.map(({ id }) => id)).size).toBe(stock.length);
  });
  it('every other default has a basis and a note', () => {
    expect(all.length).toBeGreaterThan(40);
    for (const [path, value] of all) {
      expect(value, path).toMatchObject({
        basis: expect.stringMatching(/^(CP|M)$/),
        note: expect.stringMatching(/.{3}/),
        unit: expect.any(String),
      });
    }
  });
  it('a tube of pultruded carbon weighs what its wall weighs, within a quarter (1.6 g/cm³, from memory)', () => {
    for (const { outerMm, innerMm, massPerMetreG } of Object.values(defaults.TUBES)) {
      const wall = (Math.PI / 4) * (outerMm[0] ** 2 - (innerMm?.[0] ?? 0) ** 2);
      expect(Math.abs(massPerMetreG / (wall * 1.6) - 1)).toBeLessThan(0.25);
    }
  });
});
