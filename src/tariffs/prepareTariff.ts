import { MINUTES_PER_DAY } from '../core/civilDate.ts';
import { hasErrors, type Problem } from '../core/problem.ts';
import { blockProblems } from './blockPrices.ts';
import { type CivilClock, daysOfYear } from './civilClock.ts';
import { creditsOfMonths, dayShares, standingOfMonths } from './fixedCharges.ts';
import type { PreparedPart, PreparedTariff } from './preparedTariff.ts';
import { layPrices, type PriceColumns } from './priceLayout.ts';
import { holidayNumbers, type RateRule, rateRules } from './rateRules.ts';
import { type DayRange, type RateSlice, rateSlices } from './rateSlices.ts';
import { PRICES } from './readPriceSeries.ts';
import { type SeriesMeans, seriesMeans } from './seriesMeans.ts';
import { seriesReach } from './seriesReach.ts';
import type { PriceSeries, Tariff } from './tariff.ts';

/** A tariff with its price series, where it has one. */
export interface PricedTariff {
  /** One that passed the schema. */
  readonly tariff: Tariff;
  /** Name of its file as the user gave it, for the problems. */
  readonly file: string;
  /** What `tariff.series` names, read. */
  readonly series?: PriceSeries | undefined;
}

/**
 * Lays a tariff on a year: prices as means over the minutes of each step, and the charges of each civil month
 * (MODEL sections 1 and 12).
 *
 * Prices of rates, series and blocks add; a tariff may have any of them alone. Blocks are charged on all electricity of
 * the bill whatever its rate, and their cost is shared among the rates of the month by kWh.
 *
 * @returns the tariff ready for bills, unless a problem is an error; paths begin at the tariff's own root
 * @example prepareTariff({ tariff, file: 'night.yaml' }, clock).prepared?.price[0] // 0.2 where a rate of 0.20 holds at 0:00
 */
export function prepareTariff(
  priced: PricedTariff,
  clock: CivilClock,
): { prepared?: PreparedTariff; problems: Problem[] } {
  return prepareParts([{ ...priced, days: { from: 0, until: daysOfYear(clock) } }], clock);
}

/** Prepares one or several tariffs, each for its own days; together the days must be the whole year. */
export function prepareParts(
  parts: readonly (PricedTariff & { readonly days: DayRange })[],
  clock: CivilClock,
): { prepared?: PreparedTariff; problems: Problem[] } {
  const laid = parts.map((part) => slicesOf(part, part.days, clock));
  const problems = laid.flatMap((part) => part.problems);
  if (hasErrors(problems)) return { problems };
  const rateNames = [...new Set(laid.flatMap((part) => part.rules.map((rule) => rule.name)))];
  const columns: PriceColumns = {
    price: new Float64Array(clock.hours),
    marginalPrice: new Float64Array(clock.hours),
    rateOfStep: new Uint8Array(clock.hours),
    hoursOfRate: new Float64Array(rateNames.length),
  };
  const made = parts.map((part, i) => {
    const read = part.tariff.series && part.series;
    const series = read && { ...read, values: read.prices };
    const means = series && seriesMeans(clock, series);
    const prepared = partOf({ ...part, ...laid[i], seriesPrices: means, rateNames }, clock, columns);
    if (series && means) problems.push(...seriesReach(series, means, PRICES));
    return prepared;
  });
  if (hasErrors(problems)) return { problems };
  const prepared: PreparedTariff = {
    name: parts.map(({ tariff }) => tariff.name).join(', then '),
    currency: parts[0]?.tariff.currency,
    ...{ clock, rateNames, ...columns, parts: made },
    pricedByBlocksAlone: parts.some(({ tariff }) => !tariff.rates && !tariff.series),
  };
  return { prepared, problems };
}

/** The rules of a tariff, the minutes of its days by rule, and everything wrong with them. */
function slicesOf({ tariff, file, series }: PricedTariff, days: DayRange, clock: CivilClock) {
  const { rules, problems } = rateRules(tariff, file);
  const holidays = holidayNumbers(tariff, clock, file);
  problems.push(...holidays.problems, ...blockProblems(tariff.blocks, file));
  if (tariff.series && !series) {
    const place = { file, path: 'series.file', found: tariff.series.file };
    problems.push({ code: 'tariff.series-unread', severity: 'error', ...place });
  }
  if (!tariff.rates && !tariff.series && !tariff.blocks) {
    problems.push({ code: 'tariff.no-price', severity: 'error', file, path: 'rates' });
  }
  if (!tariff.rates) rules.push(soleRule(tariff.series ? 'series' : 'blocks'));
  if (hasErrors(problems)) return { rules, slices: [], problems };
  const { slices, unpriced } = rateSlices(clock, rules, holidays.days, days);
  if (unpriced) {
    const found = `${unpriced.first}; in all ${unpriced.minutes} minutes of the year have no price`;
    problems.push({ code: 'tariff.unpriced', severity: 'error', file, path: 'rates', found });
  }
  const isWholeYear = days.until - days.from === daysOfYear(clock);
  if (isWholeYear && tariff.rates) problems.push(...neverUsed(rules, slices, file));
  return { rules, slices, problems };
}

/** The one rule of a tariff without rates: it holds always and adds nothing. */
function soleRule(name: string): RateRule {
  const always = (length: number) => Array.from({ length }, () => true);
  return { name, price: 0, from: 0, to: MINUTES_PER_DAY, weekdays: always(8), months: always(13) };
}

function neverUsed(rules: readonly RateRule[], slices: readonly RateSlice[], file: string): Problem[] {
  const used = new Set(slices.map((slice) => slice.rule));
  return rules.flatMap((rule, i) => {
    const place = { file, path: `rates[${i}]`, found: rule.name };
    return used.has(i) ? [] : [{ code: 'tariff.rate-never-used', severity: 'warning', ...place } as const];
  });
}

interface PartInput extends PricedTariff {
  readonly days: DayRange;
  readonly rules: readonly RateRule[];
  readonly slices: readonly RateSlice[];
  readonly seriesPrices: SeriesMeans | undefined;
  readonly rateNames: readonly string[];
}

function partOf(input: PartInput, clock: CivilClock, columns: PriceColumns): PreparedPart {
  const { tariff, rules, rateNames, days } = input;
  const shares = dayShares(clock, days);
  const taxes = tariff.taxes.map(({ name, percent }) => ({ name, share: percent / 100 }));
  const taxShare = tariff.taxes.reduce((sum, tax) => sum + tax.percent, 0) / 100;
  const taxInside = tariff.pricesStated === 'withTax';
  const rulePrice = Float64Array.from(rules, (rule) => rule.price);
  const rateOfRule = Uint8Array.from(rules, (rule) => rateNames.indexOf(rule.name));
  const { slices, seriesPrices: series } = input;
  const taxFactor = taxInside ? 1 : 1 + taxShare;
  return {
    ...layPrices({ slices, rulePrice, rateOfRule, series, taxFactor }, columns),
    ...{ days, rulePrice, rateOfRule, taxes, taxShare, taxInside },
    shareOfMonth: shares.shareOfMonth,
    hasSeries: series !== undefined,
    blocks: tariff.blocks,
    standing: standingOfMonths(tariff.standing, shares, daysOfYear(clock)),
    credits: creditsOfMonths(tariff.credits, shares, daysOfYear(clock)),
    demandPrice: tariff.demand?.perKW ?? 0,
  };
}
