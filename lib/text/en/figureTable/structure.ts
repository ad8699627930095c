export const structureFigures = {} as const;
