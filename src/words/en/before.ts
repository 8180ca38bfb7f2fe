export const before = {} as const;
