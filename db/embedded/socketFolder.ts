import { lstatSync, mkdirSync } from 'node:fs';
import { dirname } from 'node:path';

const OTHERS = 0o077;

/**
 * Makes the folder of the socket for this user alone. It may lie where everybody can make folders, so one that stands there
 * already must be ours: whoever owns it could put a socket of their own in place of the database's. Throws RangeError.
 */
export function ownSocketFolder(socket: string): void {
  const folder = dirname(socket);
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const found = lstatSync(folder);
  if (!found.isDirectory()) throw new RangeError(`${folder} is no folder`);
  if (process.getuid !== undefined && found.uid !== process.getuid())
    throw new RangeError(`${folder} belongs to another user`);
  if ((found.mode & OTHERS) !== 0) throw new RangeError(`${folder} is open to other users`);
}
