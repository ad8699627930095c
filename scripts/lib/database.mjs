import { createHash } from 'node:crypto';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { bundled } from './bundle.mjs';
import { Failure } from './failure.mjs';
import { manage } from './managed.mjs';
import { root } from './root.mjs';

export const EXIT_IN_USE = 3;

const PING_MS = 2_000;
/** A statement keeps the database's process busy; one that takes this long has hung. */
const HUNG_MS = 30_000;
const STOP_MS = 4_000;
const MOST_RESTARTS = 5;
const WITHIN_MS = 60_000;

/** Longest path of a unix socket on every system that has them. */
const LONGEST_SOCKET = 100;

/** Where the database of this data folder listens: the same at every start. */
export function socketOf(folder) {
  const name = createHash('sha256').update(folder).digest('hex').slice(0, 16);
  const path = join(tmpdir(), `foldspar-${name}`, '.s.PGSQL.5432');
  return path.length <= LONGEST_SOCKET ? path : join('/tmp', `foldspar-${name}`, '.s.PGSQL.5432');
}

function startProcess(folder, socket, program, timing) {
  const managed = manage(program, [folder, socket], {
    cwd: root,
    env: { PATH: process.env.PATH, TMPDIR: process.env.TMPDIR, TZ: 'UTC' },
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
  const ready = new Promise((resolve) => {
    managed.child.on('message', (message) => message === 'ready' && resolve(null));
  });
  // Making a new database keeps the process busy for seconds; until it is ready, nothing can be told from its silence.
  ready.then(() => watch(managed, timing));
  return { ...managed, ready };
}

/** Kills a process that has not answered for too long. */
function watch({ child, exited }, { pingMs, hungMs }) {
  let heard = Date.now();
  child.on('message', (message) => {
    if (message === 'pong') heard = Date.now();
  });
  const timer = setInterval(() => {
    if (Date.now() - heard > hungMs) child.kill('SIGKILL');
    else if (child.connected) child.send('ping', () => undefined);
  }, pingMs);
  exited.then(() => clearInterval(timer));
}

/**
 * Starts the embedded database in a process of its own and keeps it running: one that dies or hangs is replaced behind the
 * same socket. Throws a Failure with exit code 3 when the data folder is in use. `lost` rejects when it can't be kept up.
 * @param {string} folder
 * @param {{ program?: string, pingMs?: number, hungMs?: number, say?: (line: string) => void }} [options]
 */
export async function startDatabase(folder, options = {}) {
  const { program = bundled('database'), pingMs = PING_MS, hungMs = HUNG_MS, say = console.error } = options;
  const socket = socketOf(folder);
  const restarts = [];
  let stopping = false;
  const startOne = () => startProcess(folder, socket, program, { pingMs, hungMs });
  let current = startOne();
  const first = await Promise.race([current.ready, current.exited]);
  if (first !== null) {
    // The process has said why.
    if (first.code === EXIT_IN_USE) throw new Failure('Nothing was changed.', EXIT_IN_USE);
    throw new Failure('The database did not start.');
  }

  const keepUp = async () => {
    for (;;) {
      const { code, signal } = await current.exited;
      if (stopping) return;
      const now = Date.now();
      restarts.push(now);
      const lately = restarts.filter((at) => now - at < WITHIN_MS).length;
      if (lately > MOST_RESTARTS) throw new Failure('The database ended again and again; giving up.');
      say(`The database ended (${signal ?? `code ${code}`}); starting it again.`);
      current = startOne();
    }
  };
  const lost = keepUp();
  const stop = async () => {
    stopping = true;
    await current.stop((child) => child.connected && child.send('stop'), STOP_MS);
    await lost.catch(() => undefined);
  };
  return { socket, lost, stop, pid: () => current.child.pid };
}
