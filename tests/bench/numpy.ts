import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import type { Timed } from './timing';

export interface Numpy {
  /** One go of factor and right-hand sides by numpy on OpenBLAS, one thread, timed by itself. */
  readonly solve: Timed;
  readonly end: () => void;
}

const THREADS = { OPENBLAS_NUM_THREADS: '1', OMP_NUM_THREADS: '1', MKL_NUM_THREADS: '1' };

/** Starts Python with numpy on this matrix and these right-hand sides; `null` when there is no Python or no numpy. */
export async function startNumpy(
  matrix: Float64Array,
  sides: Float64Array,
  n: number,
  goes: number,
): Promise<Numpy | null> {
  const folder = mkdtempSync(join(tmpdir(), 'foldspar-numpy-'));
  const path = join(folder, 'system.f8');
  writeFileSync(
    path,
    Buffer.concat([matrix, sides].map((part) => Buffer.from(part.buffer, part.byteOffset, part.byteLength))),
  );
  const child = spawn('python3', ['tests/bench/solveTimes.py', path, String(n), String(sides.length / n)], {
    env: { ...process.env, ...THREADS },
    stdio: ['pipe', 'pipe', 'ignore'],
  });
  const end = () => {
    child.stdin.end();
    rmSync(folder, { recursive: true, force: true });
  };
  const answers = createInterface({ input: child.stdout })[Symbol.asyncIterator]();
  const started = await Promise.race([
    answers.next().then(({ value }) => value === 'ready'),
    new Promise<false>((resolve) => child.on('error', () => resolve(false))),
  ]);
  if (!started) {
    end();
    return null;
  }
  const solve = async () => {
    child.stdin.write(`${goes}\n`);
    const { value } = await answers.next();
    const time = Number(value);
    if (!(time > 0)) throw new RangeError(`numpy answered ${value}`);
    return time;
  };
  return { solve, end };
}
