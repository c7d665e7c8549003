/** Problems of weather files. */
export const weatherProblems = {} as const;
