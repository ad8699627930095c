import { createHash } from 'node:crypto';
import { readFileSync, writeFileSync } from 'node:fs';
import { Failure } from './failure.mjs';
import { textOf } from './files.mjs';
import { inRoot } from './root.mjs';
import { run, runNode } from './run.mjs';

const STAMP = inRoot('node_modules', '.foldspar-lock');

/**
 * Whether the packages that npm's own record of node_modules names are the lock's, put there by hand. Packages for other
 * systems may be missing.
 * @param {string} lock
 * @param {string | null} hidden
 */
export function standsAlready(lock, hidden = textOf(inRoot('node_modules', '.package-lock.json'))) {
  if (hidden === null) return false;
  const present = JSON.parse(hidden).packages;
  return Object.entries(JSON.parse(lock).packages).every(
    ([path, { version, optional, link }]) => path === '' || link || optional || present[path]?.version === version,
  );
}

/** npm from the run that started this script, or the one on the path. */
function npm(args, env) {
  const own = process.env.npm_execpath;
  return own?.endsWith('.js') ? runNode([own, ...args], { env, quiet: true }) : run('npm', args, { env, quiet: true });
}

/** Installs what the lock names, unless that is what stands there. */
export async function ensureDependencies(say) {
  const lock = readFileSync(inRoot('package-lock.json'), 'utf8');
  const hash = createHash('sha256').update(lock).update(process.version).digest('hex');
  if (textOf(STAMP) === hash) return;
  if (!standsAlready(lock)) {
    say('Installing the packages (about a minute) ...');
    // The build needs the development packages, which npm leaves out under NODE_ENV=production.
    const { NODE_ENV: _, ...env } = process.env;
    const { code, output } = await npm(['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'], env);
    if (code !== 0) throw new Failure(`${output}\nThe packages could not be installed: npm ci ended with ${code}.`);
  }
  writeFileSync(STAMP, hash);
}
