import { expect, it } from 'vitest';
import { Turns } from './turns';

it('gives turns in the order they were asked for, one at a time', async () => {
  const turns = new Turns();
  const seen: string[] = [];
  const task = (name: string, rounds: number) =>
    turns.run(async () => {
      seen.push(`${name} in`);
      for (let round = 0; round < rounds; round += 1) await Promise.resolve();
      seen.push(`${name} out`);
    });
  await Promise.all([task('a', 9), task('b', 1), task('c', 5)]);
  expect(seen).toEqual(['a in', 'a out', 'b in', 'b out', 'c in', 'c out']);
});

it('passes the turn on when the work fails', async () => {
  const turns = new Turns();
  await expect(turns.run(() => Promise.reject(new RangeError('broken')))).rejects.toThrow('broken');
  expect(await turns.run(async () => 7)).toBe(7);
});

it('does not pass the turn on twice when it is given back twice', async () => {
  const turns = new Turns();
  const giveBack = await turns.take();
  const second = turns.take();
  giveBack();
  giveBack();
  const giveBackSecond = await second;
  let third = false;
  turns.take().then(() => {
    third = true;
  });
  await new Promise((resolve) => setImmediate(resolve));
  expect(third).toBe(false);
  giveBackSecond();
});
