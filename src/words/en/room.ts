export const room = {} as const;
