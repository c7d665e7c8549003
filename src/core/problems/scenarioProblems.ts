/** Problems of scenario files. */
export const scenarioProblems = {} as const;
