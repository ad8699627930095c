import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { PlanFile } from '@/lib/plan/manifest';

const SCRIPT = join(import.meta.dirname, 'tilecheck', 'tilecheck.py');

/** A Python that has numpy: the one in FOLDSPAR_PYTHON, else the usual places. */
function findPython(): string {
  const named = process.env.FOLDSPAR_PYTHON;
  const tried = named ? [named] : ['python3', '/usr/bin/python3'];
  const found = tried.find((python) => spawnSync(python, ['-c', 'import numpy']).status === 0);
  if (found) return found;
  throw new Error(
    `no Python with numpy found (tried ${tried.join(', ')}): install it (Debian: apt-get install python3-numpy) or set FOLDSPAR_PYTHON`,
  );
}

export interface TileCheck {
  readonly ok: boolean;
  /** What the checker printed: one report a sheet. */
  readonly report: string;
}

/** Renders a plan at 300 dpi and measures every cut line against the manifest; `toleranceMm` is the largest deviation allowed. */
export function tilecheck(file: PlanFile, paperMm: readonly [number, number], toleranceMm: number): TileCheck {
  if (spawnSync('pdftocairo', ['-v']).status !== 0) {
    throw new Error('pdftocairo is missing: install poppler-utils (Debian: apt-get install poppler-utils)');
  }
  const folder = mkdtempSync(join(tmpdir(), 'tilecheck-'));
  try {
    const [pdf, manifest] = [join(folder, 'plan.pdf'), join(folder, 'manifest.json')];
    writeFileSync(pdf, file.pdf);
    writeFileSync(manifest, JSON.stringify(file.manifest));
    const args = [SCRIPT, pdf, manifest, '--tol', String(toleranceMm), '--paper', paperMm.join('x')];
    const run = spawnSync(findPython(), args, { encoding: 'utf8' });
    return { ok: run.status === 0, report: `${run.stdout}${run.stderr}` };
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
