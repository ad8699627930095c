import { type Result, refuse } from './result';
import { SINGULAR_PIVOT_SHARE } from './tolerances';

// Solving dense square systems: blocked LU with partial pivoting on row-major Float64Array. The update of the trailing matrix,
// where nearly all the time goes, works on two rows and four columns of L at once, so that each loaded number is used often.

/** P A = L U in one array: U on and above the diagonal, L (unit diagonal) below. */
export interface Factors {
  readonly n: number;
  readonly lu: Float64Array;
  /** Row `pivots[k]` was exchanged with row k at step k. */
  readonly pivots: Int32Array;
}

/** Columns factored before the rest is brought up to date; 32 columns of 400 rows stay in the first-level cache. */
const BLOCK = 32;

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
    for (let i = k1; i < n; i += 2) updateRows(a, n, i, Math.min(i + 2, n), k0, k1);
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
  for (let i = 1; i < n; i++) for (let k = 0; k < i; k++) subtractRow(b, i, k, lu[i * n + k] ?? 0, columns);
  for (let i = n - 1; i >= 0; i--) {
    for (let k = i + 1; k < n; k++) subtractRow(b, i, k, lu[i * n + k] ?? 0, columns);
    const pivot = lu[i * n + i] ?? 1;
    for (let c = i * columns; c < (i + 1) * columns; c++) b[c] = (b[c] ?? 0) / pivot;
  }
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

/** One or two rows of the trailing matrix, less L times U, four columns of L a pass. */
function updateRows(a: Float64Array, n: number, i0: number, i1: number, k0: number, k1: number): void {
  const p = i0 * n;
  const two = i1 - i0 === 2;
  const q = two ? p + n : p;
  let k = k0;
  for (; k + 3 < k1; k += 4) {
    const u0 = k * n;
    const p0 = a[p + k] ?? 0;
    const p1 = a[p + k + 1] ?? 0;
    const p2 = a[p + k + 2] ?? 0;
    const p3 = a[p + k + 3] ?? 0;
    const q0 = a[q + k] ?? 0;
    const q1 = a[q + k + 1] ?? 0;
    const q2 = a[q + k + 2] ?? 0;
    const q3 = a[q + k + 3] ?? 0;
    for (let j = k1; j < n; j++) {
      const s0 = a[u0 + j] ?? 0;
      const s1 = a[u0 + n + j] ?? 0;
      const s2 = a[u0 + 2 * n + j] ?? 0;
      const s3 = a[u0 + 3 * n + j] ?? 0;
      if (two) a[q + j] = (a[q + j] ?? 0) - (q0 * s0 + q1 * s1 + q2 * s2 + q3 * s3);
      a[p + j] = (a[p + j] ?? 0) - (p0 * s0 + p1 * s1 + p2 * s2 + p3 * s3);
    }
  }
  for (; k < k1; k++) {
    for (let i = i0; i < i1; i++) {
      const l = a[i * n + k] ?? 0;
      for (let j = k1; j < n; j++) a[i * n + j] = (a[i * n + j] ?? 0) - l * (a[k * n + j] ?? 0);
    }
  }
}

function exchange(a: Float64Array, p: number, q: number, count: number): void {
  for (let j = 0; j < count; j++) {
    const kept = a[p + j] ?? 0;
    a[p + j] = a[q + j] ?? 0;
    a[q + j] = kept;
  }
}

function subtractRow(b: Float64Array, to: number, from: number, factorBy: number, columns: number): void {
  if (factorBy === 0) return;
  const p = to * columns;
  const q = from * columns;
  for (let c = 0; c < columns; c++) b[p + c] = (b[p + c] ?? 0) - factorBy * (b[q + c] ?? 0);
}
