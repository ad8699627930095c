export const trimEntries = {} as const;
