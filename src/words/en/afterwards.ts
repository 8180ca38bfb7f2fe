export const afterwards = {} as const;
