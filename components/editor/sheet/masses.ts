// Masses hang on the balance rule at their stations. Where they would cover each other they hang lower.

export interface HangingMass {
  readonly elementId: string;
  readonly name: string;
  readonly massG: number;
  readonly xMm: number;
}

/** Rows on the rule, 0 the highest. */
export type Row = 0 | 1 | 2;
const ROWS: readonly Row[] = [0, 1, 2];

export interface HungMass extends HangingMass {
  readonly row: Row;
  /** True where even the roomiest row is too full: it covers its neighbour and cannot be taken by itself. */
  readonly crowded: boolean;
}

/**
 * Rows by station, fore to aft: each mass takes the highest row whose last mass is `leastMm` or more ahead of it, else the
 * row with the most room. Nothing moves sideways: a mass hangs where it is.
 */
export function hang(masses: readonly HangingMass[], leastMm: number): readonly HungMass[] {
  const last: Record<Row, number> = {
    0: Number.NEGATIVE_INFINITY,
    1: Number.NEGATIVE_INFINITY,
    2: Number.NEGATIVE_INFINITY,
  };
  return [...masses]
    .sort((a, b) => a.xMm - b.xMm)
    .map((mass) => {
      const roomiest = ROWS.reduce((best, row) => (last[row] < last[best] ? row : best));
      const free = ROWS.find((each) => mass.xMm - last[each] >= leastMm);
      const row = free ?? roomiest;
      last[row] = mass.xMm;
      return { ...mass, row, crowded: free === undefined };
    });
}

/** Side of the square that stands for a mass, px: its area grows with the mass. */
export const massSquarePx = (massG: number): number => Math.min(20, Math.max(8, 2 * Math.sqrt(Math.max(massG, 0))));
