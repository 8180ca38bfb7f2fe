export const problems = {} as const;
