import { describe, expect, it } from 'vitest';
import v1 from '@/tests/fixtures/airframe/v1.json';
import { parseAirframe } from './parse';
import { AIRFRAME_VERSION } from './schema/airframe';
import { upgrade } from './upgrade';

/** One fixture per version that was ever written. An old file opens for ever: never change these. */
const FIXTURES: ReadonlyMap<number, unknown> = new Map([[1, v1]]);

describe('upgrade', () => {
  it('has a fixture for every version', () => {
    expect([...FIXTURES.keys()]).toEqual(Array.from({ length: AIRFRAME_VERSION }, (_, index) => index + 1));
  });
  it.each([...FIXTURES])('version %i opens today', (version, document) => {
    const upgraded = upgrade(document, version, AIRFRAME_VERSION);
    expect(upgraded.ok).toBe(true);
    const parsed = parseAirframe(upgraded.ok ? upgraded.value : null);
    expect(parsed.ok ? [] : parsed.problems).toEqual([]);
  });
  it('leaves a document of the same version alone', () => {
    expect(upgrade(v1, 1, 1)).toEqual({ ok: true, value: v1 });
  });
  it.each([0, 1.5, -1, AIRFRAME_VERSION + 1, Number.NaN])('refuses version %d by name', (version) => {
    const result = upgrade(v1, version, AIRFRAME_VERSION);
    expect(result).toMatchObject({ ok: false, problems: [{ code: 'unknown-version', path: 'version' }] });
    expect(!result.ok && result.problems[0]?.message).toContain(String(version));
  });
});
