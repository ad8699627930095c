import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { ApiProblem, Unreachable } from '@/client/api';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { DraftAnswer } from '@/lib/contract/answers';
import { createSaver, SAVE_TIMES, type SaveState } from './saver';

const base: Airframe = JSON.parse(readFileSync('examples/tarrel-620.json', 'utf8'));
const named = (name: string): Airframe => ({ ...base, name });
const refusal = (status: number) => new ApiProblem({ type: 'about:blank', title: 'no', status, instance: '/draft' });
const draftOf = (airframe: Airframe, version: number): DraftAnswer => ({
  designId: 'd1',
  designName: 'Tarrel 620',
  version,
  savedAt: '2031-05-04T09:10:11Z',
  savedBy: 'Tomas Reyes',
  airframe,
});

/** A saver with a server, a clock and a drawer that the test holds in its hand. */
function bench() {
  const timers: { ms: number; act: () => void; off: boolean }[] = [];
  const puts: { name: string; version: number; resolve: (version: number) => void; reject: (error: Error) => void }[] =
    [];
  const states: SaveState[] = [];
  let kept: { name: string; version: number } | null = null;
  let newest: () => Promise<DraftAnswer> = () => Promise.reject(new Unreachable('nobody'));
  const saver = createSaver(
    {
      put: (airframe, version) =>
        new Promise((resolve, reject) => puts.push({ name: airframe.name, version, resolve, reject })),
      newest: () => newest(),
      keep: (airframe, version) => {
        kept = airframe === null ? null : { name: airframe.name, version };
      },
      same: (one, other) => one.name === other.name,
      later: (ms, act) => {
        const timer = { ms, act, off: false };
        timers.push(timer);
        return () => {
          timer.off = true;
        };
      },
      report: (state) => states.push(state),
    },
    { airframe: base, version: 4 },
  );
  const settle = async () => {
    for (let turn = 0; turn < 8; turn += 1) await Promise.resolve();
  };
  return {
    saver,
    puts,
    states,
    kept: () => kept,
    kinds: () => states.map((state) => state.kind),
    serverHas: (draft: DraftAnswer) => {
      newest = () => Promise.resolve(draft);
    },
    /** Runs what is due next and says how long it waited. */
    async due() {
      const timer = timers.findLast((each) => !each.off);
      if (timer === undefined) throw new RangeError('nothing is due');
      timer.off = true;
      timer.act();
      await settle();
      return timer.ms;
    },
    idle: () => timers.every((timer) => timer.off),
    settle,
  };
}

describe('saver', () => {
  it('saves once the hand rests, on top of the version it knows, and then has nothing kept', async () => {
    const { saver, puts, kept, kinds, due, settle } = bench();
    saver.changed(named('a'));
    saver.changed(named('b'));
    expect(kept()).toEqual({ name: 'b', version: 4 });
    expect(await due()).toBe(SAVE_TIMES.restMs);
    expect(puts.map(({ name, version }) => [name, version])).toEqual([['b', 4]]);
    puts[0]?.resolve(5);
    await settle();
    expect(kinds().at(-1)).toBe('saved');
    expect(kept()).toBeNull();
    expect(saver.version()).toBe(5);
    expect(saver.clean()).toBe(true);
  });

  it('never has two saves under way: what changed meanwhile goes next, on the new version', async () => {
    const { saver, puts, kept, due, settle, idle } = bench();
    saver.changed(named('a'));
    await due();
    saver.changed(named('b'));
    saver.changed(named('c'));
    expect(puts).toHaveLength(1);
    puts[0]?.resolve(5);
    await settle();
    expect(kept()).toEqual({ name: 'c', version: 5 });
    await due();
    expect(puts.map(({ name, version }) => [name, version])).toEqual([
      ['a', 4],
      ['c', 5],
    ]);
    puts[1]?.resolve(6);
    await settle();
    expect(idle()).toBe(true);
    expect(saver.clean()).toBe(true);
  });

  it('waits longer each time while nobody answers, loses nothing, and tries at once when asked', async () => {
    const { saver, puts, kept, kinds, due, settle } = bench();
    saver.changed(named('a'));
    await due();
    puts[0]?.reject(new Unreachable('no line'));
    await settle();
    expect(kinds().at(-1)).toBe('offline');
    expect(kept()?.name).toBe('a');
    expect(await due()).toBe(2_000);
    puts[1]?.reject(refusal(503));
    await settle();
    expect(await due()).toBe(4_000);
    puts[2]?.reject(new Unreachable('no line'));
    await settle();
    saver.retry();
    expect(puts.map(({ name, version }) => [name, version])).toEqual(Array(4).fill(['a', 4]));
    puts[3]?.resolve(5);
    await settle();
    expect(kinds().at(-1)).toBe('saved');
  });

  it('stops at a newer draft of somebody else and goes on from theirs only when it is taken', async () => {
    const { saver, puts, states, kept, due, settle, serverHas, idle } = bench();
    const theirs = draftOf(named('theirs'), 9);
    serverHas(theirs);
    saver.changed(named('mine'));
    await due();
    puts[0]?.reject(refusal(412));
    await settle();
    expect(states.at(-1)).toEqual({ kind: 'stale', theirs });
    saver.changed(named('mine, further'));
    expect(kept()).toEqual({ name: 'mine, further', version: 4 });
    expect(idle()).toBe(true);
    saver.took(theirs);
    expect(saver.clean()).toBe(true);
    expect(kept()).toBeNull();
    // Taking one's own back is an edit like any other, on top of theirs.
    saver.changed(named('mine'));
    await due();
    expect(puts.map(({ name, version }) => [name, version])).toEqual([
      ['mine', 4],
      ['mine', 9],
    ]);
  });

  it('knows its own save again when only the answer got lost', async () => {
    const { saver, puts, kinds, due, settle, serverHas } = bench();
    saver.changed(named('a'));
    await due();
    puts[0]?.reject(new Unreachable('cut off'));
    await settle();
    serverHas(draftOf(named('a'), 5));
    await due();
    puts[1]?.reject(refusal(412));
    await settle();
    expect(kinds().at(-1)).toBe('saved');
    expect(saver.version()).toBe(5);
  });

  it('does not repeat what the server refused, and tries again with the next change', async () => {
    const { saver, puts, kinds, kept, due, settle, idle } = bench();
    saver.changed(named('broken'));
    await due();
    puts[0]?.reject(refusal(422));
    await settle();
    expect(kinds().at(-1)).toBe('refused');
    expect(idle()).toBe(true);
    expect(kept()?.name).toBe('broken');
    saver.changed(named('mended'));
    await due();
    expect(puts.at(-1)?.name).toBe('mended');
  });

  it('flushes at once and answers when the server has everything, also what changed meanwhile', async () => {
    const { saver, puts, due, settle } = bench();
    expect(await saver.flush()).toBe(true);
    saver.changed(named('a'));
    let answer: boolean | null = null;
    saver.flush().then((saved) => {
      answer = saved;
    });
    expect(puts.map(({ name }) => name)).toEqual(['a']);
    saver.changed(named('b'));
    puts[0]?.resolve(5);
    await settle();
    expect(answer).toBeNull();
    expect(await due()).toBe(0);
    puts[1]?.resolve(6);
    await settle();
    expect(answer).toBe(true);
  });

  it('answers a flush with no when the server cannot be reached', async () => {
    const { saver, puts } = bench();
    saver.changed(named('a'));
    const flushed = saver.flush();
    puts[0]?.reject(new Unreachable('no line'));
    expect(await flushed).toBe(false);
  });

  it('tries once more on the way out, and keeps the changes when that fails', async () => {
    const { saver, puts, kept, states, settle } = bench();
    saver.changed(named('a'));
    const said = states.length;
    saver.stop();
    expect(puts.map(({ name, version }) => [name, version])).toEqual([['a', 4]]);
    puts[0]?.reject(new Unreachable('no line'));
    await settle();
    expect(kept()).toEqual({ name: 'a', version: 4 });
    expect(states).toHaveLength(said);
  });

  it('says saved when undo comes back to what the server has', () => {
    const { saver, kinds, kept, idle } = bench();
    saver.changed(named('a'));
    saver.changed(base);
    expect(kinds().at(-1)).toBe('saved');
    expect(kept()).toBeNull();
    expect(idle()).toBe(true);
  });
});
