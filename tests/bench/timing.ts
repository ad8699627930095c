// Times of several things in one run, turn and turn about, so that whatever else the machine does meets all of them alike.

/** Something to be timed: answers how long one go of it took, ms. */
export type Timed = () => number | Promise<number>;

const now = () => performance.now();

/** Times a plain function; `goes` of it at a time where one go is too short for the clock. */
export const timed =
  (work: () => void, goes = 1): Timed =>
  () => {
    const start = now();
    for (let i = 0; i < goes; i++) work();
    return (now() - start) / goes;
  };

/** Median time of each, ms, over rounds in which each has its turn; the first rounds only warm up. */
export async function medians(
  things: Readonly<Record<string, Timed>>,
  { warmUp, rounds }: { readonly warmUp: number; readonly rounds: number },
): Promise<ReadonlyMap<string, number>> {
  const times = new Map<string, number[]>(Object.keys(things).map((name) => [name, []]));
  for (let round = -warmUp; round < rounds; round++)
    for (const [name, go] of Object.entries(things)) {
      const time = await go();
      if (round >= 0) times.get(name)?.push(time);
    }
  return new Map([...times].map(([name, list]) => [name, median(list)]));
}

export function median(list: readonly number[]): number {
  const sorted = [...list].sort((a, b) => a - b);
  const middle = Math.floor(sorted.length / 2);
  const upper = sorted[middle];
  if (upper === undefined) throw new RangeError('a median of nothing');
  return sorted.length % 2 === 1 ? upper : (upper + (sorted[middle - 1] ?? upper)) / 2;
}

/** A time that must have been taken. */
export function timeOf(times: ReadonlyMap<string, number>, name: string): number {
  const time = times.get(name);
  if (time === undefined) throw new RangeError(`${name} was not timed`);
  return time;
}
