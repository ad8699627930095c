import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { build } from 'esbuild';
import { root } from './lib/root.mjs';
import { runNode } from './lib/run.mjs';

// Bundles the benchmarks beside everything that they measure, runs them in a fresh process and answers with its code.
const folder = mkdtempSync(join(tmpdir(), 'foldspar-bench-'));
const outfile = join(folder, 'bench.mjs');
try {
  await build({
    absWorkingDir: root,
    entryPoints: ['tests/bench/main.ts'],
    outfile,
    bundle: true,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    logLevel: 'warning',
    // Packages of the older module kind ask for node's own modules by `require`.
    banner: {
      js: "import { createRequire as __createRequire } from 'node:module';const require = __createRequire(import.meta.url);",
    },
  });
  process.exitCode = (await runNode([outfile])).code;
} catch (error) {
  // The bundler has said already what it could not bundle.
  console.error(error.message);
  process.exitCode = 1;
} finally {
  rmSync(folder, { recursive: true, force: true });
}
