import { type FileHandle, open, readdir, stat } from 'node:fs/promises';
import { join } from 'node:path';

// PGlite runs without fsync: what it writes lies in the operating system's cache, safe from the end of the process but not
// from a power cut. Here the same promises are kept from outside, in PostgreSQL's order (documentation, "Reliability and
// the Write-Ahead Log"): the log before a commit is acknowledged, the data before a checkpoint lets go of the log.

/** How far a file's time may lag behind the clock: the kernel stamps files by its tick. */
const TICK_MS = 50;
const SEGMENT = /^[0-9A-F]{24}$/;

async function withFile(path: string, work: (file: FileHandle) => Promise<void>): Promise<void> {
  const file = await open(path, 'r');
  try {
    await work(file);
  } finally {
    await file.close();
  }
}

const syncWhole = (path: string): Promise<void> => withFile(path, (file) => file.sync());

/** Puts the write-ahead log on the disk. One object a database: it remembers what it has done. */
export class LogSync {
  readonly #folder: string;
  #since = 0;
  #known = '';

  constructor(databaseFolder: string) {
    this.#folder = join(databaseFolder, 'pg_wal');
  }

  /** Synchronises every segment that was written since the last call. */
  async run(): Promise<void> {
    const started = Date.now();
    const segments = (await readdir(this.#folder)).filter((name) => SEGMENT.test(name)).sort();
    for (const name of segments) {
      const path = join(this.#folder, name);
      const { mtimeMs } = await stat(path);
      if (mtimeMs >= this.#since - TICK_MS) await withFile(path, (file) => file.datasync());
    }
    const listed = segments.join(' ');
    if (listed !== this.#known) await syncWhole(this.#folder);
    this.#known = listed;
    this.#since = started;
  }
}

async function filesUnder(folder: string): Promise<string[]> {
  const entries = await readdir(folder, { withFileTypes: true, recursive: true });
  return entries.filter((entry) => entry.isFile()).map((entry) => join(entry.parentPath, entry.name));
}

/**
 * Puts every file of the database on the disk that changed since `sinceMs`, the control file last: it says from which place
 * in the log a recovery starts, and must never be newer than the data. Folders follow, for the names in them.
 */
export async function syncData(databaseFolder: string, sinceMs: number): Promise<void> {
  const control = join(databaseFolder, 'global', 'pg_control');
  const changed: string[] = [];
  for (const path of await filesUnder(databaseFolder)) {
    const { mtimeMs } = await stat(path);
    if (path !== control && mtimeMs >= sinceMs - TICK_MS) changed.push(path);
  }
  for (const path of changed) await syncWhole(path);
  const folders = new Set(changed.map((path) => join(path, '..')));
  for (const path of folders) await syncWhole(path);
  await syncWhole(control);
}
