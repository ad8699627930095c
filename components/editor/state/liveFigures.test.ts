import { readFileSync } from 'node:fs';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import type { FiguresJob, FiguresListener } from '@/client/figures';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Figures } from '@/lib/figures/types';
import { createBoard } from './board';
import { followFigures } from './liveFigures';

const base: Airframe = JSON.parse(readFileSync('examples/tarrel-620.json', 'utf8'));
const figuresOf = (depth: Figures['depth'], engine: string): Figures => ({
  engine,
  depth,
  values: {},
  marks: {
    mac: null,
    aerodynamicCentreXMm: null,
    neutralPointXMm: null,
    neutralPointBandXMm: null,
    cgRangeXMm: null,
    firstFlightCgXMm: null,
    cg: null,
  },
  masses: [],
  problems: [],
});

beforeEach(() => {
  vi.stubGlobal('requestAnimationFrame', () => 1);
  vi.stubGlobal('cancelAnimationFrame', () => {});
  vi.stubGlobal('window', { location: { search: '?perf=1' } });
});
afterEach(() => vi.unstubAllGlobals());

/** A board whose figures are worked out by hand. */
function bench() {
  const jobs: FiguresJob[] = [];
  const listeners: FiguresListener[] = [];
  const { store, begin, move, release, cancel } = createBoard({
    airframe: base,
    readOnly: false,
    save: { kind: 'off' },
    system: 'metric',
  });
  followFigures(
    store,
    () => 2,
    (given) => {
      listeners.push(given);
      return { ask: (job) => jobs.push(job), stop: () => {} };
    },
  );
  const answer = (index: number, engine: string) => {
    const job = jobs[index];
    if (job !== undefined) listeners[0]?.show(figuresOf(job.depth, engine), job, 5);
  };
  return {
    jobs,
    answer,
    store,
    begin,
    move,
    release,
    cancel,
    fail: (error: unknown) => jobs[0] && listeners[0]?.failed(error, jobs[0]),
  };
}

it('asks for all figures at rest, for the deciding ones in the hand, and for all again when it lets go', () => {
  const { jobs, begin, move, release } = bench();
  begin('wing/span', 620);
  expect(jobs.map(({ depth }) => depth)).toEqual(['full']);
  move(630);
  move(640);
  release();
  expect(jobs.map(({ depth }) => depth)).toEqual(['full', 'live', 'live', 'full']);
  expect(jobs[3]?.airframe).toBe(jobs[2]?.airframe);
});

it('settles on figures of what is at rest only, and counts every recomputation', () => {
  const { store, answer, begin, move, cancel } = bench();
  answer(0, 'first');
  expect(store.getState().settled?.engine).toBe('first');
  begin('wing/span', 620);
  move(700);
  answer(1, 'in the hand');
  expect(store.getState().figures?.engine).toBe('in the hand');
  expect(store.getState().settled?.engine).toBe('first');
  cancel();
  answer(2, 'back');
  expect(store.getState().settled?.engine).toBe('back');
  expect(window.__recompute).toEqual({ n: 3, ms: 21 });
});

it('says what went wrong, until figures come again', () => {
  const { store, answer, fail } = bench();
  fail(new Error('out of memory'));
  expect(store.getState().figuresFault).toBe('out of memory');
  answer(0, 'again');
  expect(store.getState().figuresFault).toBeNull();
});
