/** A number that something rests on, with where it comes from. */
export interface Limit {
  readonly value: number;
  readonly source: string;
}
