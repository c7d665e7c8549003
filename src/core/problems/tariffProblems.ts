/** Problems of tariff files. */
export const tariffProblems = {} as const;
