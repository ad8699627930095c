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

/** A job that runs until it is told to end. */
function held(by?: string, signal?: AbortSignal) {
  let end = (): void => undefined;
  let started = false;
  const done = queued(
    () => {
      started = true;
      return new Promise<string>((resolve) => {
        end = () => resolve('done');
      });
    },
    { by, signal },
  );
  return { done, end: () => end(), started: () => started };
}

describe('a place in the queue', () => {
  it('is one of six that a person may have, and others still come in', async () => {
    const six = Array.from({ length: 6 }, () => held('ada'));
    await expect(queued(async () => 'seventh', { by: 'ada' })).rejects.toMatchObject({ kind: 'busy' });
    const other = held('bea');
    for (const job of six) {
      job.end();
      await job.done;
    }
    expect(other.started()).toBe(true);
    other.end();
    expect(await other.done).toBe('done');
    expect(await queued(async () => 'again', { by: 'ada' })).toBe('again');
  });

  it('is given up at once by whoever goes away while waiting', async () => {
    const [first, second] = [held(), held()];
    const people = Array.from({ length: 30 }, () => new AbortController());
    const waiting = people.map(({ signal }) => held(undefined, signal));
    await expect(queued(async () => 'late')).rejects.toMatchObject({ kind: 'busy' });
    for (const person of people) person.abort();
    const ends = await Promise.allSettled(waiting.map((job) => job.done));
    expect(ends.map(({ status }) => status)).toEqual(Array(30).fill('rejected'));
    expect(waiting.some((job) => job.started())).toBe(false);
    const late = held();
    first.end();
    await first.done;
    expect(late.started()).toBe(true);
    second.end();
    late.end();
    expect(await Promise.all([second.done, late.done])).toEqual(['done', 'done']);
  });
});
