import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { parseAirframe } from '@/lib/airframe/parse';
import { compute } from './chain';

const file: unknown = JSON.parse(readFileSync(join(import.meta.dirname, '../../examples/ombry-1000.json'), 'utf8'));
const airframe = parseAirframe(file);
if (!airframe.ok) throw new RangeError(airframe.problems[0]?.message);

describe('compute', () => {
  const { figures, checks = [] } = compute(airframe.value);

  it('checks the airframe before it is cut, with the figures it worked out', () => {
    const hinge = checks.find(({ ruleId }) => ruleId === 'hinge-moment');
    expect(hinge?.measured?.value).toBe(figures.values.hingeTorquePct?.value);
    expect(checks.map(({ ruleId }) => ruleId)).toContain('pack-slide');
  });
});
