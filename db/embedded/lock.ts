import { createHash } from 'node:crypto';
import { readFileSync, realpathSync, rmSync, statSync, utimesSync, writeFileSync } from 'node:fs';
import { createServer, type Server } from 'node:net';
import { hostname } from 'node:os';
import { join } from 'node:path';

// PGlite has no lock of its own: two processes on one folder lose data without an error. Two locks stand here.
// The first is an abstract socket, which the kernel gives to one process and takes back when that ends, however it ends;
// Linux has it. The second is a file with the holder's pid and start time, which holds elsewhere too, and between containers
// that share the folder, where its time is kept fresh as a sign of life.

const FILE = 'database.lock';
export const FRESHEN_MS = 5_000;
const STALE_MS = 30_000;

interface Holder {
  readonly pid: number;
  readonly started: string;
  readonly host: string;
}

export class FolderInUse extends Error {
  override readonly name = 'FolderInUse';
  constructor(folder: string, holder: string) {
    super(
      `The data folder ${folder} is in use by ${holder}. Stop that one first, or set FOLDSPAR_DATA to another folder.`,
    );
  }
}

export interface FolderLock {
  release(): void;
}

/** When the process began, in ticks since the machine started (proc(5), /proc/pid/stat, field 22); empty where that isn't told. */
function startOf(pid: number): string {
  try {
    const afterName = readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ').at(-1) ?? '';
    return afterName.split(' ')[19] ?? '';
  } catch {
    return ''; // no such process, or a system without /proc
  }
}

function lives(pid: number): boolean {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    // Not allowed to signal it means that it is there.
    return error instanceof Error && 'code' in error && error.code === 'EPERM';
  }
}

function readHolder(path: string): Holder | null {
  try {
    const value: unknown = JSON.parse(readFileSync(path, 'utf8'));
    if (typeof value !== 'object' || value === null) return null;
    const { pid, started, host } = { pid: 0, started: '', host: '', ...value };
    return typeof pid === 'number' && typeof started === 'string' && typeof host === 'string'
      ? { pid, started, host }
      : null;
  } catch {
    return null; // not there, or cut off while it was written: its writer is gone or is about to lose to the socket
  }
}

function stillHeld(path: string, holder: Holder): boolean {
  if (holder.host !== hostname()) return Date.now() - statSync(path).mtimeMs < STALE_MS;
  return holder.pid !== process.pid && lives(holder.pid) && startOf(holder.pid) === holder.started;
}

async function holdSocket(folder: string): Promise<Server | null> {
  if (process.platform !== 'linux') return null;
  const name = createHash('sha256').update(realpathSync(folder)).digest('hex').slice(0, 32);
  const server = createServer((socket) => socket.destroy());
  await new Promise<void>((resolve, reject) => {
    server.once('error', (error) =>
      reject('code' in error && error.code === 'EADDRINUSE' ? new FolderInUse(folder, 'another Foldspar') : error),
    );
    server.listen(`\0foldspar-${name}`, resolve);
  });
  server.unref();
  return server;
}

/** Writes the lock file only if there is none; true when it was written. */
function createFile(path: string, holder: Holder): boolean {
  try {
    writeFileSync(path, JSON.stringify(holder), { flag: 'wx', mode: 0o600 });
    return true;
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'EEXIST') return false;
    throw error;
  }
}

/** Holds the data folder for this process, or throws FolderInUse and touches nothing. */
export async function lockFolder(folder: string): Promise<FolderLock> {
  const server = await holdSocket(folder);
  const path = join(folder, FILE);
  const own: Holder = { pid: process.pid, started: startOf(process.pid), host: hostname() };
  try {
    const holder = readHolder(path);
    if (holder !== null && stillHeld(path, holder))
      throw new FolderInUse(folder, `another Foldspar (process ${holder.pid})`);
    rmSync(path, { force: true });
    if (!createFile(path, own)) throw new FolderInUse(folder, 'another Foldspar that has just started');
  } catch (error) {
    server?.close();
    throw error;
  }
  const freshen = setInterval(() => utimesSync(path, new Date(), new Date()), FRESHEN_MS).unref();
  return {
    release: () => {
      clearInterval(freshen);
      rmSync(path, { force: true });
      server?.close();
    },
  };
}
