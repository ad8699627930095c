export const trimFigures = {} as const;
