import { chmodSync, existsSync, mkdirSync } from 'node:fs';
import { statfs } from 'node:fs/promises';
import { join } from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { openGateway } from './gateway';
import { lockFolder } from './lock';
import { queryMessage } from './messages';
import type { Shared } from './session';
import { ownSocketFolder } from './socketFolder';
import { LogSync, syncData } from './synchronise';
import { Turns } from './turns';

export interface EmbeddedOptions {
  /** The data folder; the database lies in a folder of its own inside. */
  readonly folder: string;
  /** Where to listen. The file's name must end in ".s.PGSQL.<port>", as every PostgreSQL client expects. */
  readonly socket: string;
  readonly idleLimitMs?: number;
  readonly checkpointMs?: number;
  readonly leastFreeBytes?: number;
  /** The database itself failed. Nothing can be done but to end the process. */
  readonly onFault: (error: unknown) => void;
}

export const EMBEDDED_DEFAULTS = {
  idleLimitMs: 60_000,
  checkpointMs: 5 * 60_000,
  leastFreeBytes: 64 * 1024 * 1024,
} as const;

// The place in the log where a recovery starts is told by the control file. Until that is on the disk, the segments before
// the new place must stay, so a checkpoint keeps some.
const SETTINGS = ['wal_keep_size = 64MB'];

export interface Embedded {
  close(): Promise<void>;
}

async function openDatabase(folder: string): Promise<PGlite> {
  const fresh = !existsSync(join(folder, 'PG_VERSION'));
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  // A folder around it that was made by hand may be open to others; what is in here are sessions and hashes.
  chmodSync(folder, 0o700);
  const database = await PGlite.create({ dataDir: folder, postgresqlconf: SETTINGS });
  if (fresh) await syncData(folder, 0);
  return database;
}

/** A checkpoint on a timer, each followed by the synchronisation that PGlite leaves out. */
function keepCheckpoints(database: PGlite, turns: Turns, folder: string, everyMs: number, fault: (e: unknown) => void) {
  let done = Date.now();
  const run = async (): Promise<void> => {
    const started = Date.now();
    await database.execProtocolRaw(queryMessage('checkpoint'));
    await syncData(folder, done);
    done = started;
  };
  const timer = setInterval(() => turns.run(run).catch(fault), everyMs).unref();
  return { stop: () => clearInterval(timer), since: () => done };
}

/** Opens the embedded database under the folder's lock and serves it on the socket. Throws FolderInUse. */
export async function serveEmbedded(options: EmbeddedOptions): Promise<Embedded> {
  const { folder, socket, onFault, idleLimitMs, checkpointMs, leastFreeBytes } = { ...EMBEDDED_DEFAULTS, ...options };
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const lock = await lockFolder(folder);
  try {
    ownSocketFolder(socket);
    const inside = join(folder, 'database');
    const database = await openDatabase(inside);
    const turns = new Turns();
    const log = new LogSync(inside);
    const shared: Shared = {
      backend: database,
      turns,
      idleLimitMs,
      synchronise: () => log.run(),
      hasRoom: async () => {
        const { bavail, bsize } = await statfs(folder);
        return bavail * bsize >= leastFreeBytes;
      },
    };
    const gateway = await openGateway(socket, shared, onFault);
    const checkpoints = keepCheckpoints(database, turns, inside, checkpointMs, onFault);
    return {
      close: async () => {
        checkpoints.stop();
        await gateway.close();
        await turns.run(() => database.close());
        await syncData(inside, checkpoints.since());
        lock.release();
      },
    };
  } catch (error) {
    lock.release();
    throw error;
  }
}
