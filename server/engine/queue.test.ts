import { describe, expect, it } from 'vitest';
import { queued } from './queue';

describe('queued', () => {
  it('runs two at once, in the order they came, and refuses when too many wait', async () => {
    const releases: (() => void)[] = [];
    const started: number[] = [];
    const job = (index: number) =>
      queued(async () => {
        started.push(index);
        await new Promise<void>((resolve) => releases.push(resolve));
        return index;
      });
    const jobs = Array.from({ length: 32 }, (_, index) => job(index));
    await expect(job(99)).rejects.toMatchObject({ kind: 'busy', extras: { retryAfterSeconds: 10 } });
    expect(started).toEqual([0, 1]);
    for (let i = 0; i < 32; i += 1) {
      releases.shift()?.();
      await jobs[i];
      expect(started.length).toBeLessThanOrEqual(i + 3);
    }
    expect(await Promise.all(jobs)).toEqual(Array.from({ length: 32 }, (_, index) => index));
    expect(started).toEqual(Array.from({ length: 32 }, (_, index) => index));
  });

  it('gives its place back when the work fails', async () => {
    for (let i = 0; i < 5; i += 1)
      await expect(queued(() => Promise.reject(new RangeError('no')))).rejects.toThrow('no');
    expect(await queued(async () => 'still here')).toBe('still here');
  });
});
