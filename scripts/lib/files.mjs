import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, renameSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';
import { root } from './root.mjs';

const isTest = (name) => /\.test\.tsx?$/.test(name);

function filesOf(path) {
  const whole = join(root, path);
  if (!existsSync(whole)) return [];
  if (statSync(whole).isFile()) return [whole];
  return readdirSync(whole, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile() && !isTest(entry.name))
    .map((entry) => join(entry.parentPath, entry.name));
}

/** One hash over the names and contents of these files and folders of the checkout, tests left out. */
export function hashOf(paths, extra = '') {
  const hash = createHash('sha256').update(process.version).update('\0').update(extra).update('\0');
  for (const file of paths.flatMap(filesOf).sort())
    hash.update(relative(root, file)).update('\0').update(readFileSync(file)).update('\0');
  return hash.digest('hex');
}

/** A file's text, or null when it isn't there. */
export const textOf = (path) => (existsSync(path) ? readFileSync(path, 'utf8') : null);

/** Writes beside the place and renames: a reader sees the old file or the new one, never half of it. */
export function replaceFile(path, contents, mode = 0o644) {
  mkdirSync(dirname(path), { recursive: true });
  const draft = `${path}.${process.pid}`;
  writeFileSync(draft, contents, { mode });
  renameSync(draft, path);
}
