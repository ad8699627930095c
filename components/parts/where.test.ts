import { describe, expect, it } from 'vitest';
import type { ViewOutline } from '@/lib/airframe/outlines';
import type { Vec2 } from '@/lib/numerics/vec';
import { makePart, rectangle } from '@/tests/support/parts';
import { planSprite, whereOf } from './where';

const outline = (key: string, side: ViewOutline['side'], dy = 0): ViewOutline => ({
  elementId: key.split('/')[0] ?? key,
  key,
  kind: key.includes('/') ? 'control' : key === 'body' ? 'body' : 'surface',
  side,
  closed: true,
  points: rectangle(100, 50).map(([x, y]): Vec2 => [x, y + dy]),
});
const made = planSprite([
  outline('body', 'centre'),
  outline('wing', 'stbd', 100),
  outline('wing', 'port', -100),
  outline('wing/aileron', 'stbd', 120),
  outline('wing/aileron', 'port', -120),
]);
if (made === null) throw new RangeError('nothing to draw');
const sprite = made;
const meant = (ids: readonly string[]) =>
  sprite.pieces.filter(({ id }) => ids.includes(id)).map(({ key, side }) => `${key} ${side}`);
const part = (key: string, elementId: string, side: 'stbd' | 'port' | 'centre') =>
  makePart(key, rectangle(40, 20), { elementId, side, frame: { origin: [10, -5, 3], ex: [0, 1, 0], ey: [0, 0, 1] } });
const pieces = (...args: Parameters<typeof whereOf>) => meant(whereOf(...args).pieces);

describe('whereOf', () => {
  it('is the side that the part is on, and both for a pair or a part across the middle', () => {
    const [own, other] = [part('wing/a', 'wing', 'stbd'), part('wing/b', 'wing', 'port')];
    expect(pieces({ part: own, mirrored: [] }, 'wing', sprite)).toEqual(['wing stbd']);
    expect(pieces({ part: own, mirrored: [other] }, 'wing', sprite)).toEqual(['wing stbd', 'wing port']);
    expect(pieces({ part: part('wing/c', 'wing', 'centre'), mirrored: [] }, 'wing', sprite)).toEqual([
      'wing stbd',
      'wing port',
    ]);
  });
  it('is the control alone for a control', () => {
    const where = whereOf({ part: part('wing/aileron/x', 'aileron', 'port'), mirrored: [] }, 'wing', sprite);
    expect(meant(where.pieces)).toEqual(['wing/aileron port']);
    expect(where.at).toBeNull();
  });
  it('is the body with a place in it for a former', () => {
    const where = whereOf({ part: part('body/f1', 'f1', 'centre'), mirrored: [] }, 'body', sprite);
    expect(meant(where.pieces)).toEqual(['body centre']);
    // The middle of its 40 mm lies 20 mm along y from the frame's origin; its height is out of the plan.
    expect(where.at).toEqual([10, 15]);
  });
  it('is nothing for what stands nowhere', () => {
    expect(pieces({ part: part('jig/x', 'jig', 'centre'), mirrored: [] }, 'jig', sprite)).toEqual([]);
  });
});

it('draws each piece once, and nothing without outlines', () => {
  expect(new Set(sprite.pieces.map(({ id }) => id)).size).toBe(5);
  expect(planSprite([])).toBeNull();
});
