import { visibleText } from '../core/problem.ts';
import { offsetText } from '../core/stampText.ts';
import { figure } from './figures.ts';
import { wrapped } from './layout.ts';
import type { ResultDocument } from './resultSchema.ts';
import type { Words } from './words.ts';

/** How the weather file was understood, short: the whole of it stands in the JSON document. */
export function weatherSummary(weather: ResultDocument['weather'], { weather: words }: Words): string {
  const { columns, rows, stepMinutes, stamps, offsetMinutes, repairs } = weather;
  const parts = [words.columns(columns.join(', '))];
  if (rows !== undefined && stepMinutes !== undefined) {
    parts.push(words.rows({ rows: figure(rows, 0), step: words.minutes(figure(stepMinutes, 0)) }));
  }
  if (stamps !== undefined) parts.push(words.stamps[stamps]);
  if (offsetMinutes !== undefined) parts.push(words.offset(offsetText(offsetMinutes)));
  for (const { quantity, hours } of repairs) {
    if (hours > 0) parts.push(words.repaired({ hours: figure(hours, 0), column: quantity }));
  }
  return wrapped(visibleText(`${weather.file}: ${parts.join('; ')}.`));
}
