import { factor, solve } from '@/lib/numerics/lu';
import { startNumpy } from './numpy';
import { plainLu, tameMatrix } from './plainLu';
import { bar, say } from './report';
import { medians, timed, timeOf } from './timing';

const N = 200;
const SIDES = 8;
/** Factor and eight right-hand sides over numpy's time for the same. */
const MOST_OVER_NUMPY = 6;
const GOAL_OVER_NUMPY = 4;
/** One go of numpy is too short for the clock and for waking the processor. */
const GOES = 8;

/** Our factorisation against the unit and against numpy. Answers the unit's time, ms. */
export async function factorBench(): Promise<number> {
  const matrix = tameMatrix(N);
  const sides = Float64Array.from({ length: N * SIDES }, (_, k) => Math.cos(k));
  const work = new Float64Array(N * N);
  const numpy = await startNumpy(matrix, sides, N, GOES);
  const ours = () => {
    const factored = factor(matrix.slice(), N);
    if (!factored.ok) throw new RangeError('the matrix of the benchmark is singular');
    solve(factored.value, sides.slice(), SIDES);
  };
  const plain = () => {
    work.set(matrix);
    plainLu(work, N);
  };
  const times = await medians(
    { plain: timed(plain), ours: timed(ours, 2), ...(numpy ? { numpy: numpy.solve } : {}) },
    { warmUp: 12, rounds: 41 },
  );
  numpy?.end();
  const [unit, own] = [timeOf(times, 'plain'), timeOf(times, 'ours')];
  say(`Factor and ${SIDES} right-hand sides, n = ${N}`);
  say(`  unit (plain LU) ${unit.toFixed(2)} ms, ours ${own.toFixed(2)} ms = ${(own / unit).toFixed(2)} units`);
  if (numpy) {
    const other = timeOf(times, 'numpy');
    say(`  numpy, one thread ${other.toFixed(2)} ms`);
    bar('factor and right-hand sides over numpy', own / other, MOST_OVER_NUMPY, { goal: GOAL_OVER_NUMPY });
  } else say('  python3 with numpy is not here: left out');
  return unit;
}
