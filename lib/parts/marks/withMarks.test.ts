import { describe, expect, it } from 'vitest';
import { startFrom, startingLayouts } from '@/lib/airframe/layouts';
import { resolve } from '@/lib/airframe/resolve';
import { develop, developResolved } from '../develop';
import type { Part } from '../types';

/** Everything of a part that is cut, folded or weighed. */
const worked = ({ labels: _, operations, ...rest }: Part) => ({
  ...rest,
  operations: operations.filter(({ id, kind }) => kind !== 'register' && id !== 'grain'),
});

describe('parts with and without marks', () => {
  it.each(startingLayouts)('$id: are cut alike', ({ id }) => {
    const airframe = startFrom(id, 'Test');
    const resolved = resolve(airframe);
    if (!resolved.ok) throw new RangeError('the layout resolves');
    const plain = developResolved(airframe, resolved.value);
    const full = develop(airframe);
    expect(full.parts.map(worked)).toEqual(plain.parts.map(worked));
    expect(full.stockPieces).toEqual(plain.stockPieces);
    expect(full.problems).toEqual(plain.problems);
    expect(plain.parts.flatMap(({ operations }) => operations.filter(({ id }) => id === 'grain'))).toEqual([]);
    expect(plain.parts.flatMap(({ labels }) => labels)).toEqual([]);
  });

  it('names every part, tells a pair apart and shows the grain and where to pin', () => {
    const { parts } = develop(startFrom('trainer', 'Test'));
    for (const { key, labels, operations } of parts) {
      expect(labels.length, key).toBeGreaterThan(0);
      expect(operations.filter(({ id }) => id === 'grain').length, key).toBeLessThanOrEqual(1);
    }
    const texts = (key: string) => parts.find((part) => part.key === key)?.labels.map(({ text }) => text) ?? [];
    expect(texts('body/side/stbd').join(' ')).toContain('1 of 2');
    expect(texts('body/side/port').join(' ')).toContain('2 of 2');
    expect(texts('body/top/centre').join(' ')).not.toContain('of 2');
  });
});
