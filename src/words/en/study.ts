export const study = {} as const;
