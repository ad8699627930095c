// Curves that go with the figures: plain points, so that screen and paper draw the same.

export interface ChartAxis {
  readonly label: string;
  readonly unit: string;
}

export interface ChartSeries {
  readonly name: string;
  /** In order of x; a gap is a new series. */
  readonly points: readonly (readonly [x: number, y: number])[];
  /** `main` is what the chart is about, `limit` a bound, `other` a comparison. */
  readonly kind: 'main' | 'limit' | 'other';
}

export interface ChartMark {
  readonly x: number;
  readonly label: string;
}

export type ChartId = 'powerRequired' | 'trimSpeed' | 'pitchStep' | 'rollStep' | 'yawRelease' | 'throwTravel';

export interface Chart {
  readonly id: ChartId;
  readonly title: string;
  readonly x: ChartAxis;
  readonly y: ChartAxis;
  readonly series: readonly ChartSeries[];
  /** Places along x worth naming: stall, cruise, best glide. */
  readonly marks: readonly ChartMark[];
  /** What to read from it, and when not to trust it. */
  readonly note: string;
}
