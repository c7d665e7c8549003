import type { Problem } from '../../core/problem.ts';
import type { SeenYear } from './answer.ts';
import { hotWaterCautions } from './hotWaterCautions.ts';
import { sizeWarnings } from './sizeWarnings.ts';
import type { LoadingWarning, SeenWarning, Warning } from './warning.ts';

/** Seasonal factors that homes have shown lie between these; outside, an entry is more likely wrong than the house. */
const LOWEST_PLAUSIBLE_FACTOR = 1.8;
const HIGHEST_PLAUSIBLE_FACTOR = 4.5;
/** Backup above this share of the heat is worth a word. */
const MUCH_BACKUP = 0.1;
/** Starts a year above which wear is worth a word (common practice, no source). */
const MANY_STARTS = 5000;
/** Share of the hours with heat above which reading outside the map weighs on the result. */
const MUCH_OUTSIDE = 0.02;
/** The coldest day of a series should come this near to the design temperature, K (common practice, no source). */
const WEATHER_MARGIN = 6;

/** Of columns that many runs share: the marked hours, and the lowest value. */
const hoursMarked = oncePerColumn((column: Uint8Array) => column.reduce((sum, mark) => sum + mark, 0));
const lowestOf = oncePerColumn((column: Float64Array) => column.reduce((least, value) => Math.min(least, value)));

/** A figure of a column, found once for each column. */
function oncePerColumn<C extends object>(of: (column: C) => number): (column: C) => number {
  const known = new WeakMap<C, number>();
  return (column) => {
    const value = known.get(column) ?? of(column);
    known.set(column, value);
    return value;
  };
}

/** What an assessor should look at before signing, as kinds and figures. */
export function warningsOf(answer: SeenYear, found: readonly Problem[]): Warning[] {
  return [
    ...found.map(fromLoading),
    ...performanceWarnings(answer),
    ...sizeWarnings(answer),
    ...mapWarnings(answer),
    ...weatherWarnings(answer),
    ...hotWaterCautions(answer),
  ];
}

/** A problem of loading as something to look at. */
export function fromLoading(problem: Problem): LoadingWarning {
  return { code: problem.code, problem };
}

function performanceWarnings({ factors, totals }: SeenYear): SeenWarning[] {
  const list: SeenWarning[] = [];
  const { annual, hours, starts } = totals;
  const { h4 } = factors;
  if (h4 !== 'no heat' && (h4 < LOWEST_PLAUSIBLE_FACTOR || h4 > HIGHEST_PLAUSIBLE_FACTOR)) {
    const values = { factor: h4, least: LOWEST_PLAUSIBLE_FACTOR, most: HIGHEST_PLAUSIBLE_FACTOR };
    list.push({ code: 'result.seasonal-factor', values });
  }
  const backup = annual.backupSpaceHeat + annual.backupWaterHeat;
  const heat = annual.heatPumpSpaceHeat + annual.heatPumpWaterHeat + backup;
  if (heat > 0 && backup > MUCH_BACKUP * heat) {
    list.push({ code: 'result.much-backup', values: { share: backup / heat, hours: hours.backup } });
  }
  if (annual.unmetHeat > 0.001 * annual.spaceHeatNeed && annual.unmetHeat > 1) {
    list.push({ code: 'result.unmet-heat', values: { heat: annual.unmetHeat, hours: hours.unmet } });
  }
  if (starts > MANY_STARTS) list.push({ code: 'result.many-starts', values: { starts } });
  return list;
}

function mapWarnings({ totals, plan }: SeenYear): SeenWarning[] {
  const list: SeenWarning[] = [];
  const { hours } = totals;
  if (hours.outsideMap > MUCH_OUTSIDE * Math.max(1, hours.heating)) {
    list.push({ code: 'map.outside', values: { hours: hours.outsideMap } });
  }
  if (hours.flowAboveLimit > 0) list.push({ code: 'map.flow-above-limit', values: { hours: hours.flowAboveLimit } });
  const tooCold = hoursMarked(plan.unitOnWeather.tooCold);
  if (tooCold > 0) list.push({ code: 'map.too-cold', values: { hours: tooCold } });
  return list;
}

function weatherWarnings({ plan, loaded }: SeenYear): SeenWarning[] {
  const coldest = lowestOf(plan.weather.trailingMeanTemperature);
  const design = loaded.scenario.house.design.outdoorTemperature;
  if (coldest > design + WEATHER_MARGIN) return [{ code: 'weather.milder-than-design', values: { coldest, design } }];
  if (coldest < design - WEATHER_MARGIN) return [{ code: 'weather.colder-than-design', values: { coldest, design } }];
  return [];
}
