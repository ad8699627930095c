import { describe, expect, it } from 'vitest';
import type { CheckResult } from '@/lib/checks/types';
import { airframe, surface } from '@/tests/support/airframe';
import { checkRows, countOf } from './checkRows';

const design = airframe({ surfaces: [surface({ id: 'wing', role: 'wing' })], bodies: [] });
const found = (over: Partial<CheckResult>): CheckResult => ({
  ruleId: 'boxes-meet',
  elementId: 'wing',
  path: 'surfaces.0',
  at: [12, 34, 5],
  level: 'ok',
  title: 'Equipment does not meet',
  words: 'closest: pack and servo, 3 mm apart',
  measured: null,
  fix: null,
  source: 'common practice, no source',
  waivable: false,
  waived: null,
  ...over,
});
const results = [
  found({ ruleId: 'fan-exit' }),
  found({ ruleId: 'breaks-first', level: 'note' }),
  found({ ruleId: 'aerial-carbon', level: 'watch', waived: 'it works' }),
  found({ ruleId: 'cooling-inlet', level: 'watch' }),
  found({ ruleId: 'pack-hatch', level: 'bad', waived: 'the hatch is being made' }),
  found({ ruleId: 'pack-slide', level: 'bad' }),
];

describe('checkRows', () => {
  const rows = checkRows(results, design, ['wing']);

  it('has bad first, then what to watch, then what to judge; what was let pass after its kind; kept ones apart', () => {
    expect(rows.open.map(({ id }) => id.split(' ')[0])).toEqual([
      'pack-slide',
      'pack-hatch',
      'cooling-inlet',
      'aerial-carbon',
      'breaks-first',
    ]);
    expect(rows.passed.map(({ id }) => id.split(' ')[0])).toEqual(['fan-exit']);
  });
  it('does not count what was let pass', () => {
    expect([countOf(rows, 'bad'), countOf(rows, 'watch'), countOf(rows, 'note')]).toEqual([1, 1, 1]);
  });
  it('keeps the reason for letting it pass', () => {
    expect(rows.open[1]?.waived).toBe('the hatch is being made');
  });
  it('leads to the parts of its element, where there are any', () => {
    expect(rows.open[0]).toMatchObject({ element: 'Wing', ownerId: 'wing', at: [12, 34] });
    expect(checkRows(results, design, ['fin']).open[0]?.ownerId).toBeNull();
  });
  it('shows what was measured beside its limits, in the quantity’s unit', () => {
    const measured = { value: 3.64, quantity: 'cm2', least: 10, most: 20 } as const;
    const [row] = checkRows([found({ level: 'bad', measured })], design, []).open;
    expect(row?.numbers.map(({ word, shown }) => `${word} ${shown.number} ${shown.unit}`)).toEqual([
      'measured 3.6 cm²',
      'at least 10 cm²',
      'at most 20 cm²',
    ]);
  });
});
