export const controlsFigures = {} as const;
