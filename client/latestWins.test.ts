import { describe, expect, it } from 'vitest';
import { latestWins } from './latestWins';

/** A worker whose answers are given by hand. */
function handWorker() {
  const started: number[] = [];
  const pending: { resolve: (value: string) => void; reject: (error: Error) => void }[] = [];
  const run = (input: number) => {
    started.push(input);
    return new Promise<string>((resolve, reject) => pending.push({ resolve, reject }));
  };
  const settle = async () => {
    for (let turn = 0; turn < 4; turn += 1) await Promise.resolve();
  };
  return {
    started,
    run,
    async answer(value: string) {
      pending.shift()?.resolve(value);
      await settle();
    },
    async fail(message: string) {
      pending.shift()?.reject(new Error(message));
      await settle();
    },
  };
}

describe('latestWins', () => {
  it('runs one, keeps the newest, drops those in the middle', async () => {
    const worker = handWorker();
    const shown: string[] = [];
    const queue = latestWins({ run: worker.run, show: (output) => shown.push(output), failed: () => {} });
    for (const input of [11, 12, 13, 14]) queue.ask(input);
    expect(worker.started).toEqual([11]);
    await worker.answer('eleven');
    expect(worker.started).toEqual([11, 14]);
    await worker.answer('fourteen');
    expect(shown).toEqual(['eleven', 'fourteen']);
  });

  it('goes on after a failure and says which input failed', async () => {
    const worker = handWorker();
    const shown: string[] = [];
    const failures: [string, number][] = [];
    const queue = latestWins<number, string>({
      run: worker.run,
      show: (output) => shown.push(output),
      failed: (error, input) => failures.push([error instanceof Error ? error.message : '?', input]),
    });
    queue.ask(21);
    queue.ask(22);
    await worker.fail('no lift');
    await worker.answer('twenty-two');
    expect(failures).toEqual([['no lift', 21]]);
    expect(shown).toEqual(['twenty-two']);
  });

  it('shows nothing once stopped', async () => {
    const worker = handWorker();
    const shown: string[] = [];
    const queue = latestWins({ run: worker.run, show: (output) => shown.push(output), failed: () => {} });
    queue.ask(31);
    queue.ask(32);
    queue.stop();
    await worker.answer('thirty-one');
    expect(shown).toEqual([]);
    expect(worker.started).toEqual([31]);
  });
});
