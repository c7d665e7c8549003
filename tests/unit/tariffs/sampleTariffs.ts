import { DateTime } from 'luxon';
import type { Problem } from '../../../src/core/problem.ts';
import { type CivilClock, civilClock } from '../../../src/tariffs/civilClock.ts';
import type { PreparedTariff } from '../../../src/tariffs/preparedTariff.ts';
import { prepareTariff } from '../../../src/tariffs/prepareTariff.ts';
import type { PriceSeries, Rate, Tariff } from '../../../src/tariffs/tariff.ts';

/** A clock that must exist. */
export function clockOf(zone: string, offsetMinutes: number, calendarYear = 2025, hours = 8760): CivilClock {
  const { clock, problem } = civilClock({ hours, offsetMinutes, zone, calendarYear });
  if (!clock) throw new Error(`no clock: ${problem?.code}`);
  return clock;
}

/** A tariff with nothing in it but a name and what is given. */
export function tariffOf(parts: Partial<Tariff>): Tariff {
  return { name: 'sample', taxes: [], credits: [], holidays: [], pricesStated: 'withoutTax', ...parts };
}

/** A tariff of rates alone. */
export function ratesOf(...rates: Rate[]): Tariff {
  return tariffOf({ rates });
}

/** A prepared tariff that must exist; warnings are let pass. */
export function prepared(tariff: Tariff, clock: CivilClock, series?: PriceSeries): PreparedTariff {
  const result = prepareTariff({ tariff, file: 'sample.yaml', series }, clock);
  if (!result.prepared) throw new Error(`not prepared: ${codes(result.problems)}`);
  return result.prepared;
}

export function codes(problems: readonly Problem[]): string {
  return problems.map((problem) => problem.code).join(' ');
}

/** 1 kWh in every hour. */
export function steadyUse(clock: CivilClock, kW = 1): Float64Array {
  return new Float64Array(clock.hours).fill(kW);
}

/** Number of the step that begins at an instant. */
export function stepAt(clock: CivilClock, iso: string): number {
  const step = clock.startMillis.indexOf(DateTime.fromISO(iso, { setZone: true }).toMillis());
  if (step < 0) throw new Error(`no step begins at ${iso}`);
  return step;
}

/** Night from 22:00 to 06:00 at 0.20, day at 0.30. */
export const nightAndDay = ratesOf(
  { name: 'night', price: 0.2, from: '22:00', to: '06:00' },
  { name: 'day', price: 0.3 },
);

/** Price of a step by walking its sixty minutes with luxon's civil time: slow, and independent of the product's way. */
export function meanByMinutes(clock: CivilClock, step: number, priceAt: (minute: DateTime) => number): number {
  const start = DateTime.fromMillis(clock.startMillis[step], { zone: clock.zone });
  let sum = 0;
  for (let m = 0; m < 60; m++) sum += priceAt(start.plus({ minutes: m }));
  return sum / 60;
}
