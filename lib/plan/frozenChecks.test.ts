import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { parseAirframe } from '@/lib/airframe/parse';
import { resolve } from '@/lib/airframe/resolve';
import { checkBeforeCut } from '@/lib/checks/checkBeforeCut';
import { develop } from '@/lib/parts/develop';
import { checks } from './frozenChecks';

const file: unknown = JSON.parse(readFileSync(join(import.meta.dirname, '../../examples/tarrel-620.json'), 'utf8'));
const airframe = parseAirframe(file);
if (!airframe.ok) throw new RangeError(airframe.problems[0]?.message);
const resolved = resolve(airframe.value);
if (!resolved.ok) throw new RangeError(resolved.problems[0]?.message);
const found = checkBeforeCut({
  airframe: airframe.value,
  resolved: resolved.value,
  development: develop(airframe.value),
});
const text = JSON.stringify(found);

describe('frozen checks', () => {
  it('come through whole', () => {
    expect(found.length).toBeGreaterThan(5);
    expect(checks.parse(JSON.parse(text))).toEqual(found);
  });
  it.each([
    ['a rule that is none', /"ruleId":"[^"]+"/, '"ruleId":"toString"', 'ruleId'],
    ['a level that is none', /"level":"\w+"/, '"level":"fine"', 'level'],
    ['a place without a height', /"at":\[([^,]+),([^,]+),[^\]]+\]/, '"at":[$1,$2]', 'at'],
    ['a quantity that is none', /"quantity":"\w+"/, '"quantity":"cubits"', 'measured'],
    ['words that no page can hold', /"words":"/, `"words":"${'x'.repeat(5000)}`, 'words'],
  ])('%s are refused at their path', (_, from, to, key) => {
    const edited = text.replace(from, to);
    expect(edited).not.toBe(text);
    const result = checks.safeParse(JSON.parse(edited));
    expect(result.error?.issues.map(({ path }) => path[1])).toEqual([key]);
  });
});
