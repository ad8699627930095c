import { describe, expect, it } from 'vitest';
import { airframe, surface } from '@/tests/support/airframe';
import { makePart, rectangle } from '@/tests/support/parts';
import { partsByOwner, withFellows } from './elements';

const part = (key: string, elementId: string, more = {}) => makePart(key, rectangle(40, 20), { elementId, ...more });

describe('partsByOwner', () => {
  const design = airframe({
    surfaces: [surface({ id: 'fin', role: 'fin' }), surface({ id: 'wing', role: 'wing' })],
    bodies: [],
  });

  it('follows the building order of the aircraft, not that of the parts', () => {
    const groups = partsByOwner([part('fin/p1', 'fin'), part('wing/p1', 'wing')], design);
    expect(groups.map(({ id }) => id)).toEqual(['wing', 'fin']);
  });
  it('puts a control to its surface and keeps the order inside', () => {
    const parts = [part('wing/p2', 'wing'), part('wing/aileron/control', 'aileron'), part('wing/p1', 'wing')];
    const groups = partsByOwner(parts, design);
    expect(groups.map(({ id, name, parts: own }) => [id, name, own.map(({ key }) => key)])).toEqual([
      ['wing', 'Wing', ['wing/p2', 'wing/aileron/control', 'wing/p1']],
    ]);
  });
  it('loses nothing: what belongs to nothing known comes last', () => {
    const groups = partsByOwner([part('jig/a', 'jig'), part('fin/p1', 'fin')], design);
    expect(groups.map(({ name }) => name)).toEqual(['Fin', 'Other parts']);
  });
});

describe('withFellows', () => {
  const own = part('fin/stbd', 'fin');
  const other = part('fin/port', 'fin', { mirrorOf: 'fin/stbd' });

  it('draws a pair once', () => {
    const [pair, ...rest] = withFellows([own, other]);
    expect(rest).toEqual([]);
    expect([pair?.part.key, pair?.mirrored.map(({ key }) => key)]).toEqual(['fin/stbd', ['fin/port']]);
  });
  it('draws a mirror image whose fellow is not there by itself', () => {
    expect(withFellows([other]).map(({ part: { key }, mirrored }) => [key, mirrored])).toEqual([['fin/port', []]]);
  });
});
