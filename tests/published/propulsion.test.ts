import { expect, it } from 'vitest';
import { pitchSpeedMs } from '@/lib/power/pitchSpeed';

it('P10: 8000 rpm times 4.7 in over 1056 is 35.606 mph, 15.917 m/s (63 360 in a mile over 60 min is 1056, exactly)', () => {
  const speed = pitchSpeedMs(8000, 4.7 * 25.4);
  // One mile an hour is 0.44704 m/s exactly (NIST SP 811).
  expect(speed / 0.44704).toBeCloseTo(35.606, 3);
  expect(speed).toBeCloseTo(15.917, 3);
  expect(speed / (((8000 * 4.7) / 1056) * 0.44704) - 1).toBeCloseTo(0, 12);
});
