// A large linear feedback in a few shapes, and its determinants as polynomials of what multiplies it.

/** Shapes that the twist is put together from: reversal and divergence speeds then lie within 1e-4 of those of all strips. */
const SHAPES = 6;
/** A shape that the others hold to within this share adds nothing. */
const SAME_SHAPE = 1e-9;

export interface Shapes {
  /** Feedback of the shapes on each other: rows, with one diagonal below the main one. */
  readonly hessenberg: readonly (readonly number[])[];
  /** Of the first shape in what the control does. */
  readonly size: number;
  /** Weights of strips as weights of shapes. */
  readonly onto: (weights: Float64Array) => number[];
}

/**
 * The twist in a few shapes instead of all strips: what the control does first, what that does in turn, and so on, each square to those
 * before (W. E. Arnoldi, Quarterly of Applied Mathematics 9, 1951). The search over speeds then costs next to nothing.
 * @param feedback row-major, as many rows as `drive` has numbers
 */
export function shapesOf(feedback: Float64Array, drive: Float64Array): Shapes {
  const size = Math.sqrt(dot(drive, drive));
  const shapes: Float64Array[] = size > 0 ? [scaled(drive, 1 / size)] : [];
  const columns: number[][] = [];
  for (let k = 0; k < shapes.length; k++) {
    const next = product(feedback, shapes[k] ?? drive);
    const whole = Math.sqrt(dot(next, next));
    const column = shapes.map((other) => takeOut(next, other));
    const rest = Math.sqrt(dot(next, next));
    columns.push(column);
    if (shapes.length === SHAPES || rest <= SAME_SHAPE * whole) break;
    column.push(rest);
    shapes.push(scaled(next, 1 / rest));
  }
  return {
    hessenberg: shapes.map((_, i) => columns.map((column) => column[i] ?? 0)),
    size,
    onto: (weights) => shapes.map((shape) => dot(weights, shape)),
  };
}

function product(matrix: Float64Array, x: Float64Array): Float64Array {
  const count = x.length;
  const y = new Float64Array(count);
  for (let i = 0; i < count; i++) {
    let sum = 0;
    for (let j = 0; j < count; j++) sum += (matrix[i * count + j] ?? 0) * (x[j] ?? 0);
    y[i] = sum;
  }
  return y;
}

function scaled(x: Float64Array, by: number): Float64Array {
  const y = new Float64Array(x.length);
  for (let i = 0; i < x.length; i++) y[i] = (x[i] ?? 0) * by;
  return y;
}

/** Takes a shape of unit size out of x, in place; answers how much of it there was. */
function takeOut(x: Float64Array, shape: Float64Array): number {
  const share = dot(shape, x);
  for (let i = 0; i < x.length; i++) x[i] = (x[i] ?? 0) - share * (shape[i] ?? 0);
  return share;
}

function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += (a[i] ?? 0) * (b[i] ?? 0);
  return sum;
}

/** det(I - q H) as a polynomial in q, constant first, by the leading minors of a matrix with one diagonal below the main one. */
export function determinant(h: readonly (readonly number[])[]): number[] {
  const minors: number[][] = [[1]];
  for (let k = 0; k < h.length; k++) {
    const minor = [...(minors[k] ?? []), 0];
    let below = 1;
    for (let i = k; i >= 0; i--) {
      const smaller = minors[i] ?? [];
      const by = (h[i]?.[k] ?? 0) * below;
      const shift = k - i + 1;
      for (let power = 0; power < smaller.length; power++)
        minor[power + shift] = (minor[power + shift] ?? 0) - by * (smaller[power] ?? 0);
      below *= i > 0 ? (h[i]?.[i - 1] ?? 0) : 1;
    }
    minors.push(minor);
  }
  return minors.at(-1) ?? [1];
}

/** A polynomial, constant first, at x. */
export function valueAt(polynomial: readonly number[], x: number): number {
  let sum = 0;
  for (let i = polynomial.length - 1; i >= 0; i--) sum = sum * x + (polynomial[i] ?? 0);
  return sum;
}
