import { type ChildProcess, fork } from 'node:child_process';
import { chmodSync, cpSync, existsSync, mkdtempSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { Client } from 'pg';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { socketConfig } from '@/db/address';
import { bundled, ensureBundles } from '@/scripts/lib/bundle.mjs';
import { socketOf, startDatabase } from '@/scripts/lib/database.mjs';

// The embedded database as it runs: a process of its own on a folder on the disk.

// Making a database takes seconds; it is made once, and each test starts with a copy.
let made: string;
let folder: string;
const children: ChildProcess[] = [];

const newFolder = () => mkdtempSync(join(tmpdir(), 'foldspar-data-'));

beforeAll(async () => {
  await ensureBundles();
  made = newFolder();
  await (await startDatabase(made)).stop();
  rmSync(dirname(socketOf(made)), { recursive: true, force: true });
}, 120_000);
afterAll(() => rmSync(made, { recursive: true, force: true }));
beforeEach(() => {
  folder = newFolder();
  cpSync(made, folder, { recursive: true });
});
afterEach(async () => {
  for (const child of children.splice(0)) {
    child.kill('SIGKILL');
    await ended(child);
  }
  rmSync(folder, { recursive: true, force: true });
  rmSync(dirname(socketOf(folder)), { recursive: true, force: true });
});

function ended(child: ChildProcess): Promise<number | null> {
  if (child.exitCode !== null || child.signalCode !== null) return Promise.resolve(child.exitCode);
  return new Promise((resolve) => child.once('exit', (code) => resolve(code)));
}

interface Opened {
  readonly child: ChildProcess;
  readonly said: () => string;
}

async function open(): Promise<Opened & { readonly ready: boolean }> {
  const child = fork(bundled('database'), [folder, socketOf(folder)], { stdio: ['ignore', 'pipe', 'pipe', 'ipc'] });
  children.push(child);
  let text = '';
  child.stderr?.on('data', (bytes: Buffer) => {
    text += bytes.toString('utf8');
  });
  const closed = new Promise<false>((resolve) => child.once('close', () => resolve(false)));
  const ready = new Promise<true>((resolve) => child.on('message', (message) => message === 'ready' && resolve(true)));
  return { child, said: () => text, ready: await Promise.race([ready, closed]) };
}

async function ask(sql: string): Promise<readonly Record<string, unknown>[]> {
  const client = new Client(socketConfig(socketOf(folder)));
  await client.connect();
  try {
    return (await client.query(sql)).rows;
  } finally {
    await client.end();
  }
}

describe('one process a folder', () => {
  it('refuses a second one with a plain sentence and exit code 3; the first goes on unharmed', async () => {
    const first = await open();
    expect(first.ready).toBe(true);
    await ask('create table kept (n int)');
    const others = await Promise.all([open(), open(), open()]);
    for (const other of others) {
      expect(other.ready).toBe(false);
      expect(other.child.exitCode).toBe(3);
      expect(other.said()).toBe(
        `The data folder ${folder} is in use by another Foldspar. Stop that one first, or set FOLDSPAR_DATA to another folder.\n`,
      );
    }
    await ask('insert into kept values (1)');
    expect(await ask('select n from kept')).toEqual([{ n: 1 }]);
  });

  it('lets exactly one of four that start at once have the folder', async () => {
    const all = await Promise.all([open(), open(), open(), open()]);
    expect(all.filter(({ ready }) => ready)).toHaveLength(1);
    expect(all.filter(({ child }) => child.exitCode === 3)).toHaveLength(3);
  });
});

describe('the files', () => {
  it('are closed to other users even in a folder that is open to them', async () => {
    chmodSync(folder, 0o755);
    chmodSync(join(folder, 'database'), 0o755);
    expect((await open()).ready).toBe(true);
    expect(statSync(join(folder, 'database')).mode & 0o777).toBe(0o700);
  });
});

describe('how it ends', () => {
  it('keeps what was committed when it is killed, and opens again', async () => {
    const first = await open();
    await ask('create table kept (n int)');
    await ask('insert into kept select generate_series(1, 500)');
    first.child.kill('SIGKILL');
    await ended(first.child);
    expect((await open()).ready).toBe(true);
    expect(await ask('select count(*)::int as n from kept')).toEqual([{ n: 500 }]);
  });

  it('ends with code 0 when told to, and leaves neither lock nor socket', async () => {
    const { child } = await open();
    child.send('stop');
    expect(await ended(child)).toBe(0);
    expect(existsSync(join(folder, 'database.lock'))).toBe(false);
    expect(existsSync(socketOf(folder))).toBe(false);
  });

  it('ends by itself when its parent is gone', async () => {
    const { child } = await open();
    child.disconnect();
    expect(await ended(child)).toBe(0);
  });

  it('leaves the signals of a terminal to its parent', async () => {
    const { child } = await open();
    child.kill('SIGINT');
    child.kill('SIGTERM');
    expect(await ask('select 1 as n')).toEqual([{ n: 1 }]);
  });
});

describe('the supervisor', () => {
  const until = async (holds: () => boolean | Promise<boolean>) => {
    await expect.poll(holds, { timeout: 30_000, interval: 50 }).toBe(true);
  };
  const answers = () =>
    ask('select 1').then(
      () => true,
      () => false,
    );

  it('replaces a process that died, behind the same socket, with all rows', async () => {
    const said: string[] = [];
    const database = await startDatabase(folder, { say: (line: string) => said.push(line) });
    try {
      await ask('create table kept (n int)');
      await ask('insert into kept values (41)');
      const pid = database.pid();
      process.kill(Number(pid), 'SIGKILL');
      await until(() => database.pid() !== pid);
      await until(answers);
      expect(await ask('select n from kept')).toEqual([{ n: 41 }]);
      expect(said).toEqual(['The database ended (SIGKILL); starting it again.']);
    } finally {
      await database.stop();
    }
  });

  it('replaces a process that hangs', async () => {
    const database = await startDatabase(folder, { pingMs: 50, hungMs: 1_000, say: () => undefined });
    try {
      const pid = database.pid();
      process.kill(Number(pid), 'SIGSTOP');
      await until(() => database.pid() !== pid);
      await until(answers);
    } finally {
      await database.stop();
    }
  });

  it('says why, with exit code 3, when the folder is in use', async () => {
    await open();
    await expect(startDatabase(folder)).rejects.toMatchObject({ name: 'Failure', exitCode: 3 });
  });
});
