import { type Problem, visibleText } from '../../core/problem.ts';
import { problemCure, problemSentence } from '../../core/problemText.ts';
import type { BareAnswer, Warning } from './answer.ts';
import { hotWaterCautions } from './hotWaterCautions.ts';
import { sizeWarnings } from './sizeWarnings.ts';

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

/** What an assessor should look at before signing, each with its cause and a usual remedy. */
export function warningsOf(answer: BareAnswer, found: readonly Problem[]): Warning[] {
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
export function fromLoading(problem: Problem): Warning {
  const place = [problem.file, problem.line].filter((part) => part !== undefined).join(':');
  return {
    code: problem.code,
    text: `${visibleText(place)}: ${problemSentence(problem)}`,
    remedy: problemCure(problem),
  };
}

function performanceWarnings({ factors, totals }: BareAnswer): Warning[] {
  const list: Warning[] = [];
  const { annual, hours } = totals;
  const { h4 } = factors;
  if (h4 !== 'no heat' && (h4 < LOWEST_PLAUSIBLE_FACTOR || h4 > HIGHEST_PLAUSIBLE_FACTOR)) {
    list.push({
      code: 'result.seasonal-factor',
      text: `The seasonal factor H4 of ${h4.toFixed(2)} lies outside ${LOWEST_PLAUSIBLE_FACTOR}–${HIGHEST_PLAUSIBLE_FACTOR}, what homes have shown.`,
      remedy: 'Look at the flow temperatures, the COP table and the pump power for a slip of the pen.',
    });
  }
  const backup = annual.backupSpaceHeat + annual.backupWaterHeat;
  const heat = annual.heatPumpSpaceHeat + annual.heatPumpWaterHeat + backup;
  if (heat > 0 && backup > MUCH_BACKUP * heat) {
    list.push({
      code: 'result.much-backup',
      text: `The backup gives ${((100 * backup) / heat).toFixed(0)} % of the heat, in ${hours.backup} hours.`,
      remedy: 'A larger unit, larger emitters for a lower flow, or less heat loss; check the switch temperature.',
    });
  }
  if (annual.unmetHeat > 0.001 * annual.spaceHeatNeed && annual.unmetHeat > 1) {
    list.push({
      code: 'result.unmet-heat',
      text: `${annual.unmetHeat.toFixed(0)} kWh of space heat could not be given (${hours.unmet} hours): rooms would get cold.`,
      remedy: 'More backup, a larger unit, or less heat loss. Do not sign a size that leaves the house cold.',
    });
  }
  if (totals.starts > MANY_STARTS) {
    list.push({
      code: 'result.many-starts',
      text: `About ${(Math.round(totals.starts / 100) * 100).toFixed(0)} compressor starts a year (an estimate).`,
      remedy: 'A unit with a lower lowest level, or more water in the circuit that it works on.',
    });
  }
  return list;
}

function mapWarnings({ totals, plan }: BareAnswer): Warning[] {
  const list: Warning[] = [];
  const { hours } = totals;
  if (hours.outsideMap > MUCH_OUTSIDE * Math.max(1, hours.heating)) {
    list.push({
      code: 'map.outside',
      text: `In ${hours.outsideMap} hours the unit ran colder, warmer or hotter than its table reaches.`,
      remedy: 'Ask the maker for the missing rows or columns; the values there are extended by rule.',
    });
  }
  if (hours.flowAboveLimit > 0) {
    list.push({
      code: 'map.flow-above-limit',
      text: `In ${hours.flowAboveLimit} hours the rooms ask for a higher flow than the unit can give.`,
      remedy: 'Larger emitters or a lower heating curve; the backup lifts the rest.',
    });
  }
  const tooCold = hoursMarked(plan.unitOnWeather.tooCold);
  if (tooCold > 0) {
    list.push({
      code: 'map.too-cold',
      text: `In ${tooCold} hours it is colder than the unit’s lowest outdoor temperature: it stands still.`,
      remedy: 'Make sure that the backup carries the house alone in those hours.',
    });
  }
  return list;
}

function weatherWarnings({ plan, loaded }: BareAnswer): Warning[] {
  const coldest = lowestOf(plan.weather.trailingMeanTemperature);
  const design = loaded.scenario.house.design.outdoorTemperature;
  if (coldest > design + WEATHER_MARGIN) {
    return [
      {
        code: 'weather.milder-than-design',
        text: `The coldest day of the weather has ${coldest.toFixed(1)} °C, the design temperature is ${design} °C: the year is milder than the design.`,
        remedy: 'Fit for energy, not for sizing: do not conclude from it that a smaller unit is enough.',
      },
    ];
  }
  if (coldest < design - WEATHER_MARGIN) {
    return [
      {
        code: 'weather.colder-than-design',
        text: `The coldest day of the weather has ${coldest.toFixed(1)} °C, the design temperature is ${design} °C: the year is colder than the design.`,
        remedy: 'Check the place of the weather file and the design temperature.',
      },
    ];
  }
  return [];
}
