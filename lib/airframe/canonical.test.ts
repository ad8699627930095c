import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import v1 from '@/tests/fixtures/airframe/v1.json';
import { canonicalText } from './canonical';
import { startFrom } from './layouts';
import { parseAirframe, parseAirframeText } from './parse';
import type { Airframe } from './schema/airframe';

const airframe = startFrom('trainer', 'Canon');

/** The same data with the keys of every object in another order. */
function shuffled(value: unknown, turn: number): unknown {
  if (Array.isArray(value)) return value.map((item) => shuffled(item, turn));
  if (typeof value !== 'object' || value === null) return value;
  const entries = Object.entries(value).map(([key, inner]) => [key, shuffled(inner, turn)] as const);
  const by = turn % Math.max(1, entries.length);
  return Object.fromEntries([...entries.slice(by), ...entries.slice(0, by)].reverse());
}

describe('canonical text', () => {
  it('begins with its first key and holds no space that is not in a text', () => {
    const text = canonicalText({ ...airframe, name: 'AB' });
    expect(text.startsWith('{"bodies":[{"doublers":[],"formers":[{"id":"firewall"')).toBe(true);
    expect(text.replaceAll(/"[^"]*"/g, '')).not.toMatch(/\s/);
  });
  it('is the same whatever order the keys came in', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 40 }), (turn) => {
        const parsed = parseAirframe(shuffled(v1, turn));
        expect(parsed.ok && canonicalText(parsed.value)).toBe(parsed.ok && canonicalText(parsed.value));
        const straight = parseAirframe(v1);
        if (!parsed.ok || !straight.ok) throw new RangeError('the fixture parses');
        expect(canonicalText(parsed.value)).toBe(canonicalText(straight.value));
      }),
    );
  });
  it('reads back as the same airframe', () => {
    expect(parseAirframeText(canonicalText(airframe))).toEqual({ ok: true, value: airframe });
  });
  it('writes minus zero as zero and leaves absent keys out', () => {
    const [item, ...rest] = airframe.items;
    if (!item) throw new RangeError('the layout has items');
    const odd: Airframe = {
      ...airframe,
      items: [{ ...item, mount: { to: 'datum', at: [-0, -0, -0] }, spec: undefined, slide: undefined }, ...rest],
    };
    expect(canonicalText(odd)).toContain('"mount":{"at":[0,0,0],"to":"datum"}');
    expect(canonicalText(odd)).not.toContain('undefined');
  });
  it('refuses a number that no document holds, with its path', () => {
    const odd: Airframe = { ...airframe, flight: { ...airframe.flight, cruiseMs: Number.NaN } };
    expect(() => canonicalText(odd)).toThrow(/flight\.cruiseMs/);
  });
});
