import { mkdirSync, mkdtempSync, readlinkSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { type FileHandle, open } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { basename, join } from 'node:path';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { LogSync, syncData } from './synchronise';

// What reaches the disk can't be seen from here; that the system is asked for it, for which file and in which order, can.

let folder: string;
const asked: string[] = [];

async function spyOnHandles(): Promise<void> {
  const handle = await open(folder, 'r');
  const prototype: FileHandle = Object.getPrototypeOf(handle);
  await handle.close();
  for (const call of ['sync', 'datasync'] as const)
    vi.spyOn(prototype, call).mockImplementation(async function (this: FileHandle) {
      asked.push(basename(readlinkSync(`/proc/self/fd/${this.fd}`)));
    });
}

const write = (name: string, ageSeconds = 0) => {
  const path = join(folder, name);
  writeFileSync(path, 'x');
  const at = new Date(Date.now() - ageSeconds * 1000);
  utimesSync(path, at, at);
};
const taken = () => asked.splice(0);

beforeEach(async () => {
  folder = mkdtempSync(join(tmpdir(), 'foldspar-sync-'));
  for (const name of ['pg_wal', 'global', 'base/5']) mkdirSync(join(folder, name), { recursive: true });
  await spyOnHandles();
});
afterEach(() => {
  vi.restoreAllMocks();
  asked.length = 0;
  rmSync(folder, { recursive: true, force: true });
});

const FIRST = '000000010000000000000001';
const SECOND = '000000010000000000000002';

it('synchronises the segments of the log that were written since the last time, and the folder when a segment is new', async () => {
  write(`pg_wal/${FIRST}`, 60);
  write('pg_wal/archive_status', 60);
  const log = new LogSync(folder);
  await log.run();
  expect(taken()).toEqual([FIRST, 'pg_wal']);
  await log.run();
  expect(taken()).toEqual([]);
  write(`pg_wal/${FIRST}`);
  await log.run();
  expect(taken()).toEqual([FIRST]);
  write(`pg_wal/${FIRST}`, 60);
  write(`pg_wal/${SECOND}`);
  await log.run();
  expect(taken()).toEqual([SECOND, 'pg_wal']);
});

it('synchronises changed data with its folders, and the control file last', async () => {
  write('global/pg_control');
  write('global/1262');
  write('base/5/changed');
  write('base/5/old', 60);
  await syncData(folder, Date.now() - 10_000);
  const order = taken();
  expect(order.at(-1)).toBe('pg_control');
  expect(order.slice(0, -1).sort()).toEqual(['1262', '5', 'changed', 'global']);
});
