/** The unit of all ratios: LU with partial pivoting as it stands in a textbook, three loops, in place. `a` is row-major, n x n. */
export function plainLu(a: Float64Array, n: number): void {
  for (let k = 0; k < n; k++) {
    let p = k;
    for (let i = k + 1; i < n; i++) if (Math.abs(a[i * n + k] ?? 0) > Math.abs(a[p * n + k] ?? 0)) p = i;
    if (p !== k)
      for (let j = 0; j < n; j++) {
        const kept = a[k * n + j] ?? 0;
        a[k * n + j] = a[p * n + j] ?? 0;
        a[p * n + j] = kept;
      }
    for (let i = k + 1; i < n; i++) {
      const l = (a[i * n + k] ?? 0) / (a[k * n + k] ?? 1);
      a[i * n + k] = l;
      for (let j = k + 1; j < n; j++) a[i * n + j] = (a[i * n + j] ?? 0) - l * (a[k * n + j] ?? 0);
    }
  }
}

/** A matrix like a lattice's: largest on the diagonal, smaller away from it. The same every time. */
export function tameMatrix(n: number): Float64Array {
  const a = new Float64Array(n * n);
  for (let i = 0; i < n; i++)
    for (let j = 0; j < n; j++)
      a[i * n + j] = (i === j ? 4 : 0) + Math.sin(i * 12.9898 + j * 78.233) / (1 + Math.abs(i - j));
  return a;
}
