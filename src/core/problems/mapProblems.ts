/** Problems of map files. */
export const mapProblems = {} as const;
