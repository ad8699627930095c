export type Query = Readonly<Record<string, string | string[] | undefined>>;

/** A query value that stands once; of several, none is meant. */
export const one = (value: string | string[] | undefined): string | undefined =>
  typeof value === 'string' ? value : undefined;
