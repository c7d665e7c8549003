import type { AirAsRead } from '../sim/explain/explainAir.ts';
import { explainHour } from '../sim/explain/explainHour.ts';
import { type Figure, figureUnits } from '../sim/explain/figures.ts';
import type { ExplainedStage } from '../sim/explain/stage.ts';
import type { AskedHour } from './explainAsked.ts';
import { moneyStage, type SimulatedYear } from './explainMoney.ts';
import type { ExplainDocument, ExplainEntry } from './explainSchema.ts';
import { type ExplainWords, englishExplained } from './explainWords.ts';
import { civilStamps, standardStamp } from './hourStamps.ts';

/** What is asked of a year. */
export interface AskedExplanation extends AskedHour {
  /** The time as it was asked. */
  readonly text: string;
}

/**
 * One hour of a year as plain data, as `explain --json` writes it.
 *
 * @param year of one scenario
 * @param asked the hour
 * @param version of the program
 * @param words of the language it is written in
 * @returns full precision, keys in a fixed order
 */
export function explainDocument(
  year: SimulatedYear,
  asked: AskedExplanation,
  version: string,
  words: ExplainWords = englishExplained,
): ExplainDocument {
  const { loaded, plan, columns } = year;
  const stages = [...explainHour(plan, columns, asked.hour, airAsRead(year, asked.hour)), moneyStage(year, asked.hour)];
  const currency = loaded.tariffs[0]?.currency ?? loaded.scenario.currency;
  return {
    version,
    scenario: loaded.scenario.name,
    heatPumpUnit: loaded.unit.unit.name,
    hour: hourOf(year, asked, currency),
    stages: stages.map((stage) => entryOf(stage, currency, words)),
    inputs: loaded.inputs.map(({ file, role, sha256 }) => ({ file, role, sha256 })),
  };
}

function hourOf({ loaded }: SimulatedYear, asked: AskedExplanation, currency: string): ExplainDocument['hour'] {
  const { clock } = loaded;
  const { hour } = asked;
  const first = loaded.tariffs[0];
  return {
    asked: asked.text,
    isBeginning: asked.isBeginning,
    civilTime: civilStamps(clock)[hour],
    stamp: standardStamp(clock, hour),
    weekday: clock.weekday[hour],
    ...(first === undefined
      ? {}
      : {
          tariff: {
            name: first.name,
            rate: first.prepared.rateNames[first.prepared.rateOfStep[hour]],
            ...(first.prepared.pricedByBlocksAlone ? {} : { price: first.prepared.price[hour] }),
            unit: `${currency}/kWh`,
          },
        }),
  };
}

function airAsRead({ loaded }: SimulatedYear, hour: number): AirAsRead {
  const { humidity, pressure } = loaded.weather.series;
  return {
    kind: humidity?.kind ?? 'relative',
    humidity: humidity?.values[hour] ?? loaded.scenario.weather.relativeHumidity,
    humidityMeasured: humidity !== undefined,
    pressureMeasured: pressure !== undefined,
  };
}

function entryOf(
  { stage, formulas, findings, figures }: ExplainedStage,
  currency: string,
  words: ExplainWords,
): ExplainEntry {
  return {
    stage,
    title: words.stages[stage],
    formulas: formulas.map((name) => ({ ...words.formulas[name] })),
    findings: findings.map((finding) => ({ finding, says: words.findings[finding] })),
    figures: figures.map((figure) => figureOf(figure, currency, words)),
  };
}

function figureOf({ name, value }: Figure, currency: string, words: ExplainWords): ExplainEntry['figures'][number] {
  return { name, label: words.labels[name], value, unit: figureUnits[name].replace('money', currency) };
}
