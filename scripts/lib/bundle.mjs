import { bundleCli } from '../bundle-cli.mjs';
import { hashOf, replaceFile, textOf } from './files.mjs';
import { inRoot, root } from './root.mjs';

// Programs that run beside the pages: the database's process, what the start script asks of the database, the seed.
const ENTRIES = { database: 'db/embedded/main.ts', operate: 'db/operate.ts', seed: 'db/seed/main.ts' };
const SOURCES = ['db', 'server', 'lib', 'package-lock.json', 'tsconfig.json', 'scripts/lib/bundle.mjs'];
const STAMP = inRoot('dist', 'programs.hash');

export const bundled = (name) => inRoot('dist', `${name}.mjs`);

/** Bundles the command line and the programs into dist/, unless their sources are the ones of the last time. */
export async function ensureBundles() {
  await bundleCli();
  const hash = hashOf(SOURCES);
  if (textOf(STAMP) === hash && Object.keys(ENTRIES).every((name) => textOf(bundled(name)) !== null)) return;
  // esbuild's own API: its install script replaces the program that `node` could run.
  const { build } = await import('esbuild');
  const { outputFiles } = await build({
    write: false,
    absWorkingDir: root,
    entryPoints: ENTRIES,
    outdir: 'dist',
    outExtension: { '.js': '.mjs' },
    bundle: true,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    packages: 'external',
    logLevel: 'warning',
  });
  for (const { path, contents } of outputFiles) replaceFile(path, contents);
  replaceFile(STAMP, hash);
}
