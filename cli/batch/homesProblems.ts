import type { Problem } from '../../src/core/problem.ts';
import { HomesReader, surveyHomes } from './homesFile.ts';

/** Faults listed of one table; behind so many there is one cause, and the first ones show it. */
const MOST_PROBLEMS = 100;

/** Name that the column of the homes' names has unless a plan names another. */
const NAME_COLUMN = 'home';

/**
 * What is wrong with a table of homes by itself: names of columns that no scenario has, rows of another length. A column
 * of the homes' names that is called otherwise than `home` is known only to the plan that names the table.
 *
 * @param file as the user gives it
 */
export function homesProblems(file: string): Problem[] {
  const { survey, problems } = surveyHomes(file, NAME_COLUMN);
  if (survey === undefined) return problems;
  const found: Problem[] = [];
  for (const { home } of new HomesReader(survey.headerRow).homesFrom(survey.marks[0])) {
    found.push(...home.problems);
    if (found.length >= MOST_PROBLEMS) break;
  }
  return found;
}
