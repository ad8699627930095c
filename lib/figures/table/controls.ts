export const controlsEntries = {} as const;
