import { accessSync, constants } from 'node:fs';
import { join } from 'node:path';
import { Failure } from './failure.mjs';
import { run } from './run.mjs';

/** Where a program stands on the path, or null. */
export function findProgram(name, path = process.env.PATH ?? '') {
  for (const folder of path.split(':').filter(Boolean)) {
    const candidate = join(folder, name);
    try {
      accessSync(candidate, constants.X_OK);
      return candidate;
    } catch {
      // not in this folder; the next one
    }
  }
  return null;
}

const hasNumpy = async (python) => (await run(python, ['-c', 'import numpy'], { quiet: true })).code === 0;

/** A Python with numpy: the one named in FOLDSPAR_PYTHON, the one on the path, or the system's own. Null when there is none. */
async function findPython() {
  const named = process.env.FOLDSPAR_PYTHON;
  for (const python of named ? [named] : ['python3', '/usr/bin/python3']) if (await hasNumpy(python)) return python;
  return null;
}

// What the tests need of the system: how to see whether it is there, the Debian package that brings it, and what it is for.
const NEEDS = [
  {
    name: 'Chromium',
    package: 'chromium',
    why: 'the browser tests drive it',
    variable: 'FOLDSPAR_CHROMIUM',
    find: async () => process.env.FOLDSPAR_CHROMIUM || findProgram('chromium'),
  },
  {
    name: 'poppler (pdftocairo, pdftoppm, pdfinfo)',
    package: 'poppler-utils',
    why: 'the plan tests render pages with it',
    find: async () => ['pdftocairo', 'pdftoppm', 'pdfinfo'].every((name) => findProgram(name) !== null) || null,
  },
  {
    name: 'Python 3 with numpy',
    package: 'python3-numpy',
    why: 'the plan tests measure rendered pages with it',
    variable: 'FOLDSPAR_PYTHON',
    find: findPython,
  },
];

async function install(names) {
  if (process.getuid?.() !== 0 || findProgram('apt-get') === null) return;
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  await run('apt-get', ['update', '-q'], { env, quiet: true });
  await run('apt-get', ['install', '-y', '-q', '--no-install-recommends', ...names], { env, quiet: true });
}

/** The variables that tell the tests where the system's programs stand. */
async function look() {
  const found = new Map();
  for (const need of NEEDS) found.set(need, await need.find());
  return found;
}

/**
 * Sees to it that the system has what the tests need; as root on Debian installs what is missing. Throws a Failure that
 * names what can't be had. Answers with the environment variables that say where it stands.
 */
export async function ensureSystem(say) {
  let found = await look();
  const missing = () => NEEDS.filter((need) => found.get(need) === null);
  if (missing().length > 0) {
    say(
      `Installing ${missing()
        .map((need) => need.package)
        .join(', ')} ...`,
    );
    await install(missing().map((need) => need.package));
    found = await look();
  }
  if (missing().length > 0) {
    const lines = missing().map(
      ({ name, why, package: debian }) => `${name} is missing (${why}). On Debian: apt-get install ${debian}`,
    );
    throw new Failure(lines.join('\n'));
  }
  return Object.fromEntries([...found].flatMap(([{ variable }, value]) => (variable ? [[variable, value]] : [])));
}
