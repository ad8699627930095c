export const structureEntries = {} as const;
