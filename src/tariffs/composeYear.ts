import { writtenDate } from '../core/civilDate.ts';
import { hasErrors, type Problem, shown } from '../core/problem.ts';
import { type CivilClock, daysOfYear } from './civilClock.ts';
import type { PreparedTariff } from './preparedTariff.ts';
import { type PricedTariff, prepareParts } from './prepareTariff.ts';

/** So many, of at most 50 rates each, keep the number of a rate within a byte. */
const MOST_SUPPLIES = 5;

/** A supplier and the civil date on which its tariff begins. */
export interface Supply extends PricedTariff {
  /** MM-DD, or YYYY-MM-DD of the calendar year; the first supply has none: it begins on 1 January. */
  readonly from?: string | undefined;
}

/**
 * A year with a change of supplier: each tariff prices the civil days from its own date to the next one's.
 *
 * Rates, series, blocks, demand and taxes of a tariff see its own days only. Standing charges per day go by days; those
 * per month and per year, the ends of blocks, the demand charge of a month that is shared, and credits are shared out
 * by days. Rates of one name count as one in the bill.
 *
 * @param supplies in the order of the year
 * @returns one prepared tariff for the whole year; problems of dates have the path `supplies[i].from` and an empty file
 */
export function composeYear(
  supplies: readonly Supply[],
  clock: CivilClock,
): { prepared?: PreparedTariff; problems: Problem[] } {
  const problems: Problem[] = [];
  const begins = supplies.map((supply, i) => firstDayOf(supply, i, clock, problems));
  if (supplies.length > MOST_SUPPLIES) {
    const place = {
      path: 'supplies',
      found: `${supplies.length} suppliers`,
      allowed: `at most ${MOST_SUPPLIES} a year`,
    };
    problems.push({ code: 'tariff.supplier-order', severity: 'error', file: '', ...place });
  }
  supplies.forEach(({ tariff, from }, i) => {
    const path = `supplies[${i}].from`;
    if (i > 0 && begins[i] <= begins[i - 1] && !hasErrors(problems)) {
      problems.push({ ...orderFault(path, from), allowed: 'a date after that of the supplier before' });
    }
    const before = supplies[i - 1]?.tariff.currency ?? tariff.currency;
    if (tariff.currency !== undefined && before !== tariff.currency) {
      const place = { file: supplies[i].file, path: 'currency', found: shown(tariff.currency), allowed: shown(before) };
      problems.push({ code: 'tariff.supplier-currency', severity: 'error', ...place });
    }
  });
  if (hasErrors(problems)) return { problems };
  const parts = supplies.map((supply, i) => ({
    ...supply,
    days: { from: begins[i], until: begins[i + 1] ?? daysOfYear(clock) },
  }));
  return prepareParts(parts, clock);
}

/** Number of the civil day on which a supply begins. */
function firstDayOf({ from }: Supply, i: number, clock: CivilClock, problems: Problem[]): number {
  const path = `supplies[${i}].from`;
  if (i === 0) {
    if (from !== undefined) problems.push({ ...orderFault(path, from), allowed: 'nothing for the first supplier' });
    return 0;
  }
  const date = writtenDate(from ?? '');
  if (!date) {
    problems.push({ code: 'tariff.no-such-date', severity: 'error', file: '', path, found: shown(from ?? 'left out') });
    return 0;
  }
  if (date.year !== undefined && date.year !== clock.calendarYear) {
    problems.push({ ...orderFault(path, from), allowed: `a date of the calendar year ${clock.calendarYear}` });
  }
  return clock.daysOfMonth.slice(0, date.month - 1).reduce((sum, days) => sum + days, date.dayOfMonth - 1);
}

function orderFault(path: string, found: string | undefined): Problem {
  return { code: 'tariff.supplier-order', severity: 'error', file: '', path, found: shown(found ?? 'left out') };
}
