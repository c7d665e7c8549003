import { visibleText } from '../core/problem.ts';
import type { DegreeDaysDocument } from './degreeDaysDocument.ts';
import { figure } from './figures.ts';
import { heading, table, wrapped } from './layout.ts';
import { english, type Words } from './words.ts';

/**
 * Degree days as a person reads them: whether for heating or cooling, how they were counted, by month and year, and how the file was understood.
 *
 * @returns lines of at most 80 columns where the name of the file allows it, with a final newline
 */
export function degreeDaysText(document: DegreeDaysDocument, words: Words = english): string {
  const { kind, base, method, annual, monthly, weather } = document;
  const title = words.degreeDays.title({ kind: words.degreeDays.kinds[kind], base: `${figure(base, 1)} °C`, method });
  const months = table([
    { heading: words.columns.month, figures: false, cells: [...words.months, words.year] },
    { heading: words.degreeDays.column, figures: true, cells: [...monthly, annual].map((sum) => figure(sum, 1)) },
  ]);
  return `${[
    heading(title),
    wrapped(words.degreeDays.methods[kind][method]),
    months,
    '',
    wrapped(`${visibleText(weather.file)}: ${weather.recognised.map(visibleText).join('; ')}.`),
  ].join('\n')}\n`;
}
