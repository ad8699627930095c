import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('..', import.meta.url));
const dist = join(root, 'dist');
const bundle = join(dist, 'cli.mjs');
const stamp = join(dist, 'cli.hash');

const SOURCES = ['lib', 'scripts/cli'];
const SETTINGS = ['package-lock.json', 'tsconfig.json', 'scripts/bundle-cli.mjs'];

const filesUnder = (folder) =>
  readdirSync(join(root, folder), { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile() && entry.name.endsWith('.ts') && !entry.name.endsWith('.test.ts'))
    .map((entry) => join(entry.parentPath, entry.name))
    .sort();

const hashOfSources = () => {
  const hash = createHash('sha256');
  for (const file of [...SETTINGS.map((name) => join(root, name)), ...SOURCES.flatMap(filesUnder)]) {
    hash.update(file.slice(root.length)).update('\0').update(readFileSync(file)).update('\0');
  }
  return hash.digest('hex');
};

/** Writes beside the place and renames: a reader sees the old file or the new one, never half of it. */
const replace = (path, contents) => {
  const draft = `${path}.${process.pid}`;
  writeFileSync(draft, contents);
  renameSync(draft, path);
};

/**
 * Bundles the command line into dist/cli.mjs with its chunks unless the sources are the ones of the last bundle.
 * Returns the path of the bundle. esbuild's own API, because its install script replaces the program that `node` could run.
 */
export async function bundleCli() {
  const hash = hashOfSources();
  if (existsSync(bundle) && existsSync(stamp) && readFileSync(stamp, 'utf8') === hash) return bundle;
  const { build } = await import('esbuild');
  mkdirSync(dist, { recursive: true });
  const { outputFiles } = await build({
    write: false,
    absWorkingDir: root,
    entryPoints: { cli: 'scripts/cli/main.ts' },
    outdir: 'dist',
    outExtension: { '.js': '.mjs' },
    chunkNames: 'cli-[hash]',
    bundle: true,
    splitting: true,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    logLevel: 'warning',
    // Packages of the older module kind ask for node's own modules by `require`.
    banner: {
      js: "import { createRequire as __createRequire } from 'node:module';const require = __createRequire(import.meta.url);",
    },
  });
  // Chunks carry the hash of their content and the entry is put in place last, so two bundlers at once do each other no harm.
  const entryLast = outputFiles.sort((a, b) => Number(a.path === bundle) - Number(b.path === bundle));
  for (const { path, contents } of entryLast) replace(path, contents);
  const current = new Set(outputFiles.map(({ path }) => path));
  for (const name of readdirSync(dist)) {
    const path = join(dist, name);
    if (/^cli-.*\.mjs$/.test(name) && !current.has(path)) rmSync(path, { force: true });
  }
  replace(stamp, hash);
  return bundle;
}
