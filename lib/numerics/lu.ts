import { type Result, refuse } from './result';
import { SINGULAR_PIVOT_SHARE } from './tolerances';

// Solving dense square systems: blocked LU with partial pivoting on row-major Float64Array. The update of the trailing matrix,
// where nearly all the time goes, works on four rows and four columns of L at once, so that each loaded number is used often. Right-hand
// sides are solved four at a time for the same reason.

/** P A = L U in one array: U on and above the diagonal, L (unit diagonal) below. */
export interface Factors {
  readonly n: number;
  readonly lu: Float64Array;
  /** Row `pivots[k]` was exchanged with row k at step k. */
  readonly pivots: Int32Array;
}

/** Columns factored before the rest is brought up to date: few, for the factoring itself works on one row and column at a time. Measured. */
const BLOCK = 8;
/** Right-hand sides solved at once. */
const TOGETHER = 4;

/**
 * Factors a square matrix in place: `a` (row-major, n x n) is overwritten and belongs to the answer.
 * A matrix that is singular to working precision, or holds a number that is not finite, is a problem.
 * Method: right-looking blocked elimination; Golub & Van Loan, "Matrix Computations", section 3.4 (partial pivoting).
 */
export function factor(a: Float64Array, n: number): Result<Factors> {
  if (a.length < n * n) throw new RangeError(`a matrix of order ${n} needs ${n * n} numbers, got ${a.length}`);
  const largest = largestEntry(a, n * n);
  if (!Number.isFinite(largest)) return refuse(notFinite);
  const pivots = new Int32Array(n);
  const least = largest * SINGULAR_PIVOT_SHARE;
  for (let k0 = 0; k0 < n; k0 += BLOCK) {
    const k1 = Math.min(k0 + BLOCK, n);
    if (!factorColumns(a, n, k0, k1, pivots, least)) return refuse(singular);
    eliminateRight(a, n, k0, k1);
    let i = k1;
    for (; i + 3 < n; i += 4) updateFourRows(a, n, i, k0, k1);
    for (; i < n; i++) updateRow(a, n, i, k0, k1);
  }
  return { ok: true, value: { n, lu: a, pivots } };
}

/**
 * Solves A X = B in place for `columns` right-hand sides: `b` is row-major, n x columns, and holds X afterwards.
 */
export function solve({ n, lu, pivots }: Factors, b: Float64Array, columns: number): void {
  if (b.length < n * columns) throw new RangeError(`right-hand sides need ${n * columns} numbers, got ${b.length}`);
  for (let k = 0; k < n; k++) {
    const p = pivots[k] ?? k;
    if (p !== k) exchange(b, k * columns, p * columns, columns);
  }
  const x = new Float64Array(TOGETHER * n);
  for (let from = 0; from < columns; from += TOGETHER) {
    const count = Math.min(TOGETHER, columns - from);
    x.fill(0);
    for (let i = 0; i < n; i++) for (let c = 0; c < count; c++) x[c * n + i] = b[i * columns + from + c] ?? 0;
    for (let i = 1; i < n; i++) subtractSolved(lu, x, n, i, 0, i);
    for (let i = n - 1; i >= 0; i--) {
      subtractSolved(lu, x, n, i, i + 1, n);
      const pivot = lu[i * n + i] ?? 1;
      for (let c = 0; c < count; c++) {
        const value = (x[c * n + i] ?? 0) / pivot;
        x[c * n + i] = value;
        b[i * columns + from + c] = value;
      }
    }
  }
}

/** Takes what the unknowns k0 to k1 come to off equation i, for four right-hand sides, each in a stretch of its own. */
function subtractSolved(lu: Float64Array, x: Float64Array, n: number, i: number, k0: number, k1: number): void {
  const row = i * n;
  const [second, third, fourth] = [n, 2 * n, 3 * n];
  let s0 = x[i] ?? 0;
  let s1 = x[second + i] ?? 0;
  let s2 = x[third + i] ?? 0;
  let s3 = x[fourth + i] ?? 0;
  for (let k = k0; k < k1; k++) {
    const l = lu[row + k] ?? 0;
    s0 -= l * (x[k] ?? 0);
    s1 -= l * (x[second + k] ?? 0);
    s2 -= l * (x[third + k] ?? 0);
    s3 -= l * (x[fourth + k] ?? 0);
  }
  x[i] = s0;
  x[second + i] = s1;
  x[third + i] = s2;
  x[fourth + i] = s3;
}

const singular = { code: 'singular-matrix', path: '', message: 'singular matrix: two equations say the same' };
const notFinite = { code: 'matrix-not-finite', path: '', message: 'the matrix holds a number that is not finite' };

function largestEntry(a: Float64Array, count: number): number {
  let largest = 0;
  for (let i = 0; i < count; i++) {
    const size = Math.abs(a[i] ?? 0);
    if (!(size <= largest)) largest = size;
    if (Number.isNaN(size)) return Number.NaN;
  }
  return largest;
}

/** Columns k0 to k1 over all rows below; rows are exchanged over their whole length. False when no pivot is large enough. */
function factorColumns(a: Float64Array, n: number, k0: number, k1: number, pivots: Int32Array, least: number): boolean {
  for (let k = k0; k < k1; k++) {
    let p = k;
    let size = Math.abs(a[k * n + k] ?? 0);
    for (let i = k + 1; i < n; i++) {
      const other = Math.abs(a[i * n + k] ?? 0);
      if (other > size) {
        size = other;
        p = i;
      }
    }
    if (!(size > least)) return false;
    pivots[k] = p;
    if (p !== k) exchange(a, k * n, p * n, n);
    const inverse = 1 / (a[k * n + k] ?? 1);
    for (let i = k + 1; i < n; i++) {
      const row = i * n;
      const l = (a[row + k] ?? 0) * inverse;
      a[row + k] = l;
      if (l !== 0) for (let j = k + 1; j < k1; j++) a[row + j] = (a[row + j] ?? 0) - l * (a[k * n + j] ?? 0);
    }
  }
  return true;
}

/** Rows of U to the right of the factored block. */
function eliminateRight(a: Float64Array, n: number, k0: number, k1: number): void {
  for (let k = k0; k < k1; k++) {
    for (let i = k + 1; i < k1; i++) {
      const l = a[i * n + k] ?? 0;
      if (l === 0) continue;
      const row = i * n;
      const source = k * n;
      for (let j = k1; j < n; j++) a[row + j] = (a[row + j] ?? 0) - l * (a[source + j] ?? 0);
    }
  }
}

/** Four rows of the trailing matrix, less L times U, four columns of L a pass. Written out: a loop over the four would cost a third more. */
function updateFourRows(a: Float64Array, n: number, i: number, k0: number, k1: number): void {
  const p = i * n;
  const q = p + n;
  const r = q + n;
  const s = r + n;
  let k = k0;
  for (; k + 3 < k1; k += 4) {
    const u0 = k * n;
    const u1 = u0 + n;
    const u2 = u1 + n;
    const u3 = u2 + n;
    const p0 = a[p + k] ?? 0;
    const p1 = a[p + k + 1] ?? 0;
    const p2 = a[p + k + 2] ?? 0;
    const p3 = a[p + k + 3] ?? 0;
    const q0 = a[q + k] ?? 0;
    const q1 = a[q + k + 1] ?? 0;
    const q2 = a[q + k + 2] ?? 0;
    const q3 = a[q + k + 3] ?? 0;
    const r0 = a[r + k] ?? 0;
    const r1 = a[r + k + 1] ?? 0;
    const r2 = a[r + k + 2] ?? 0;
    const r3 = a[r + k + 3] ?? 0;
    const s0 = a[s + k] ?? 0;
    const s1 = a[s + k + 1] ?? 0;
    const s2 = a[s + k + 2] ?? 0;
    const s3 = a[s + k + 3] ?? 0;
    for (let j = k1; j < n; j++) {
      const x0 = a[u0 + j] ?? 0;
      const x1 = a[u1 + j] ?? 0;
      const x2 = a[u2 + j] ?? 0;
      const x3 = a[u3 + j] ?? 0;
      a[p + j] = (a[p + j] ?? 0) - (p0 * x0 + p1 * x1 + p2 * x2 + p3 * x3);
      a[q + j] = (a[q + j] ?? 0) - (q0 * x0 + q1 * x1 + q2 * x2 + q3 * x3);
      a[r + j] = (a[r + j] ?? 0) - (r0 * x0 + r1 * x1 + r2 * x2 + r3 * x3);
      a[s + j] = (a[s + j] ?? 0) - (s0 * x0 + s1 * x1 + s2 * x2 + s3 * x3);
    }
  }
  if (k < k1) for (let row = i; row < i + 4; row++) updateRow(a, n, row, k, k1);
}

/** The part of L's columns k0 to k1 in one row. */
function updateRow(a: Float64Array, n: number, i: number, k0: number, k1: number): void {
  const p = i * n;
  for (let k = k0; k < k1; k++) {
    const u = k * n;
    const l = a[p + k] ?? 0;
    for (let j = k1; j < n; j++) a[p + j] = (a[p + j] ?? 0) - l * (a[u + j] ?? 0);
  }
}

function exchange(a: Float64Array, p: number, q: number, count: number): void {
  for (let j = 0; j < count; j++) {
    const kept = a[p + j] ?? 0;
    a[p + j] = a[q + j] ?? 0;
    a[q + j] = kept;
  }
}
