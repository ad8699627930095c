import { type ChildProcess, spawn } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { hostname, tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { FolderInUse, lockFolder } from './lock';

let folder: string;
let other: ChildProcess | undefined;
const file = () => join(folder, 'database.lock');
const holder = (value: object) => writeFileSync(file(), JSON.stringify(value));

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'foldspar-lock-'));
});
afterEach(() => {
  other?.kill('SIGKILL');
  other = undefined;
  rmSync(folder, { recursive: true, force: true });
});

/** Some living process that holds nothing. */
function stranger(): number {
  other = spawn(process.execPath, ['-e', 'setInterval(() => {}, 1000)'], { stdio: 'ignore' });
  if (other.pid === undefined) throw new RangeError('no process');
  return other.pid;
}
const startOf = (pid: number) => readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ').at(-1)?.split(' ')[19] ?? '';

it('is held by one and free again after', async () => {
  const first = await lockFolder(folder);
  await expect(lockFolder(folder)).rejects.toBeInstanceOf(FolderInUse);
  expect(existsSync(file())).toBe(true);
  first.release();
  expect(existsSync(file())).toBe(false);
  (await lockFolder(folder)).release();
});

it('lets one of twenty that come at once have it', async () => {
  const tries = await Promise.allSettled(Array.from({ length: 20 }, () => lockFolder(folder)));
  const won = tries.flatMap((result) => (result.status === 'fulfilled' ? [result.value] : []));
  expect(won).toHaveLength(1);
  expect(existsSync(file())).toBe(true);
  for (const lock of won) lock.release();
});

it('refuses, and touches nothing, while the process named in the file lives', async () => {
  const pid = stranger();
  holder({ pid, started: startOf(pid), host: hostname() });
  const before = readFileSync(file(), 'utf8');
  await expect(lockFolder(folder)).rejects.toThrow(`in use by another Foldspar (process ${pid})`);
  expect(readFileSync(file(), 'utf8')).toBe(before);
});

it('takes over when the process is gone, or its number went to another one', async () => {
  const pid = stranger();
  holder({ pid, started: '1', host: hostname() });
  (await lockFolder(folder)).release();
  holder({ pid: 2 ** 22 + 1, started: '1', host: hostname() });
  (await lockFolder(folder)).release();
});

it('takes over a file that was cut off', async () => {
  writeFileSync(file(), '{"pid": 12');
  (await lockFolder(folder)).release();
});

it('believes a holder on another machine as long as it shows signs of life', async () => {
  holder({ pid: 1, started: '1', host: 'elsewhere' });
  await expect(lockFolder(folder)).rejects.toBeInstanceOf(FolderInUse);
  const minuteAgo = new Date(Date.now() - 60_000);
  utimesSync(file(), minuteAgo, minuteAgo);
  (await lockFolder(folder)).release();
});
