import { derivatives } from '@/lib/aero/lattice/derivatives';
import type { LatticeInput } from '@/lib/aero/lattice/types';
import { bareSolve, lay } from './bareSolve';
import type { Example } from './examples';
import { say, table } from './report';
import { median, timed } from './timing';

interface Mesh {
  readonly strips: number;
  readonly rows: number;
}

/** Of the wing; other surfaces grow with it from what the figures give them at `USUAL`. */
const MESHES: readonly Mesh[] = [
  { strips: 5, rows: 3 },
  { strips: 6, rows: 3 },
  { strips: 8, rows: 4 },
  { strips: 10, rows: 5 },
  { strips: 12, rows: 6 },
  { strips: 16, rows: 6 },
  { strips: 20, rows: 8 },
];
const USUAL: Mesh = { strips: 12, rows: 6 };
const FINE: Mesh = { strips: 40, rows: 10 };
const ROUNDS = 7;

/** Cost against size, and beside it how far the neutral point lies from that of a fine lattice: the worst of the examples. */
export async function sizeBench(examples: readonly Example[], unitMs: number): Promise<void> {
  const fine = examples.map(({ input }) => neutralPoint(meshed(input, FINE)));
  const rows = MESHES.map((mesh) => {
    const results = examples.map(({ input, macMm }, i) => {
      const at = meshed(input, mesh);
      const lattice = lay(at);
      const go = timed(() => bareSolve(lattice, at));
      const times = Array.from({ length: ROUNDS }, () => Number(go()));
      const error = (100 * (neutralPoint(at) - (fine[i] ?? 0))) / macMm;
      return { count: lattice.count, ms: median(times), error };
    });
    const ms = median(results.map((r) => r.ms));
    const counts = results.map((r) => r.count).sort((a, b) => a - b);
    const worst = results.reduce((most, r) => (Math.abs(r.error) > Math.abs(most) ? r.error : most), 0);
    return [
      `${mesh.strips} x ${mesh.rows}${mesh.strips === USUAL.strips ? ' (usual)' : ''}`,
      `${counts[0]} to ${counts.at(-1)}`,
      ms.toFixed(2),
      (ms / unitMs).toFixed(2),
      `${worst.toFixed(2)} %`,
    ];
  });
  say(`Cost against size; neutral point against ${FINE.strips} x ${FINE.rows}, worst of ${examples.length} examples`);
  table([['wing, strips x rows', 'unknowns', 'ms', 'units', 'error, MAC'], ...rows]);
}

function meshed(input: LatticeInput, { strips, rows }: Mesh): LatticeInput {
  const grown = (value: number, by: number, least: number) => Math.max(least, Math.round(value * by));
  return {
    ...input,
    surfaces: input.surfaces.map((surface) => ({
      ...surface,
      strips: grown(surface.strips, strips / USUAL.strips, 2),
      rows: grown(surface.rows, rows / USUAL.rows, 1),
    })),
  };
}

function neutralPoint(input: LatticeInput): number {
  const result = derivatives(input, 'symmetric');
  if (!result.ok) throw new RangeError(result.problems[0]?.message ?? 'refused');
  return result.value.symmetric.neutralPointX;
}
