/** A number that something rests on, with where it comes from. */
export interface Limit {
  readonly value: number;
  readonly source: string;
}

/** Most that a control shared by pitch and roll can turn for both together, degrees one way. */
export const SHARED_THROW_DEG: Limit = { value: 28, source: 'common practice, no source' };
