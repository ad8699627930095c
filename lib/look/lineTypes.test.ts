import { describe, expect, it } from 'vitest';
import { OPERATION_KINDS } from '@/lib/parts/types';
import { plan } from '@/lib/text/en/plan';
import { LINE_STYLES, LINE_TYPE_KINDS } from './lineTypes';

describe('line types', () => {
  it('every operation has one, and the legend has words for each', () => {
    expect(LINE_TYPE_KINDS).toEqual(expect.arrayContaining([...OPERATION_KINDS]));
    expect(Object.keys(plan.lines).sort()).toEqual([...LINE_TYPE_KINDS].sort());
  });

  it('operations are told apart by their dashes alone, without colour', () => {
    const dashed = OPERATION_KINDS.filter((kind) => kind !== 'register').map((kind) =>
      LINE_STYLES[kind].dash.join(' '),
    );
    expect(new Set(dashed).size).toBe(dashed.length);
  });

  it('dashes and gaps come in pairs of positive lengths', () => {
    for (const { dash } of Object.values(LINE_STYLES)) {
      expect(dash.length % 2).toBe(0);
      expect(dash.every((length) => length > 0)).toBe(true);
    }
  });
});
