type Point = readonly [x: number, y: number];

/**
 * A smooth curve through points that never turns between them: piecewise cubics with slopes by Fritsch & Butland, SIAM J. Sci. Stat.
 * Comput. 5 (1984), flat at both ends of the table. Points in order of x; outside them the end values hold.
 */
export function monotoneCurve(points: readonly Point[]): (x: number) => number {
  const [first, last] = [points[0], points.at(-1)];
  if (!first || !last || points.length < 2) throw new RangeError(`a curve needs two points, got ${points.length}`);
  const rise = (i: number): number => {
    const [a, b] = [points[i], points[i + 1]];
    return a && b ? (b[1] - a[1]) / (b[0] - a[0]) : 0;
  };
  const slopes = points.map((_, i) => (rise(i - 1) * rise(i) > 0 ? 2 / (1 / rise(i - 1) + 1 / rise(i)) : 0));
  return (x) => {
    if (x <= first[0]) return first[1];
    if (x >= last[0]) return last[1];
    const i = points.findIndex((point) => point[0] > x);
    const [a, b] = [points[i - 1] ?? first, points[i] ?? last];
    const width = b[0] - a[0];
    const t = (x - a[0]) / width;
    const [s, u] = [t * t * (3 - 2 * t), 1 - t];
    return a[1] + (b[1] - a[1]) * s + width * t * u * ((slopes[i - 1] ?? 0) * u - (slopes[i] ?? 0) * t);
  };
}
