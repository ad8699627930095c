import type { Matrix4, Row4 } from './modes/system';

// Motions in time by exact stepping: with a control held still, a linear system moves by the same matrix in every equal step.

/** Terms of the series of the exponential: with the matrix halved until it is under a half, the rest is under 1e-17. */
const TERMS = 14;

/** Order of a system of four states with its held input beside it. */
const N = 5;

/** Product of two square matrices of that order, row-major. */
function multiply(a: Float64Array, b: Float64Array): Float64Array {
  const product = new Float64Array(N * N);
  for (let i = 0; i < N; i++)
    for (let j = 0; j < N; j++) {
      let sum = 0;
      for (let k = 0; k < N; k++) sum += (a[i * N + k] ?? 0) * (b[k * N + j] ?? 0);
      product[i * N + j] = sum;
    }
  return product;
}

function times(a: Float64Array, k: number): Float64Array {
  const out = new Float64Array(N * N);
  for (let i = 0; i < N * N; i++) out[i] = (a[i] ?? 0) * k;
  return out;
}

/** Exponential of such a matrix by scaling and squaring: Golub & Van Loan, "Matrix Computations", section 11.3. */
function exponential(matrix: Float64Array): Float64Array {
  let norm = 0;
  for (let i = 0; i < N; i++)
    norm = Math.max(
      norm,
      matrix.subarray(i * N, (i + 1) * N).reduce((sum, x) => sum + Math.abs(x), 0),
    );
  const halvings = Math.max(0, Math.ceil(Math.log2(2 * norm)));
  const small = times(matrix, 2 ** -halvings);
  let term: Float64Array = Float64Array.from({ length: N * N }, (_, k) => (k % (N + 1) === 0 ? 1 : 0));
  let sum: Float64Array = term.slice();
  for (let k = 1; k <= TERMS; k++) {
    term = times(multiply(term, small), 1 / k);
    for (let i = 0; i < N * N; i++) sum[i] = (sum[i] ?? 0) + (term[i] ?? 0);
  }
  for (let k = 0; k < halvings; k++) sum = multiply(sum, sum);
  return sum;
}

export interface Motion {
  readonly timeS: number;
  readonly state: Row4;
}

interface StepOptions {
  readonly start: Row4;
  /** Rates of change that the held control makes. */
  readonly input: Row4;
  readonly stepS: number;
  readonly steps: number;
}

/**
 * States of x' = A x + b at equal times from a start, exact but for rounding: exp of [A b; 0 0] times the step (Etkin & Reid, "Dynamics
 * of Flight", ch. 7; Van Loan, IEEE Trans. Automatic Control 23(3), 1978). Throws RangeError for a step that is not positive.
 */
export function motion(matrix: Matrix4, { start, input, stepS, steps }: StepOptions): Motion[] {
  if (!(stepS > 0 && stepS < Number.POSITIVE_INFINITY)) throw new RangeError(`stepS must be positive, got ${stepS}`);
  const whole = new Float64Array(N * N);
  for (const [i, row] of matrix.entries()) whole.set([...row, input[i] ?? 0], i * N);
  const step = exponential(times(whole, stepS));
  const states: Motion[] = [{ timeS: 0, state: start }];
  let [a, b, c, d] = start;
  const next = (row: number): number => {
    const at = row * N;
    return (
      (step[at] ?? 0) * a +
      (step[at + 1] ?? 0) * b +
      (step[at + 2] ?? 0) * c +
      (step[at + 3] ?? 0) * d +
      (step[at + 4] ?? 0)
    );
  };
  for (let k = 1; k <= steps; k++) {
    const state: Row4 = [next(0), next(1), next(2), next(3)];
    [a, b, c, d] = state;
    states.push({ timeS: k * stepS, state });
  }
  return states;
}

/** Rate of change of one state at a moment, the control held. */
export const rateOf = (row: Row4, { state }: Motion, input = 0): number =>
  row.reduce((sum, x, i) => sum + x * (state[i] ?? 0), input);
