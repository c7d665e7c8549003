import { visibleText } from '../../src/core/problem.ts';
import { barStrip } from '../../src/report/charts/barStrip.ts';
import { clientSentences } from '../../src/report/html/clientSentences.ts';
import { monthlyEnergy } from '../../src/report/html/monthlyEnergy.ts';
import type { ReportInput } from '../../src/report/html/reportInput.ts';
import { assumptionText } from '../../src/report/language/assumptionWords.ts';
import { warningText } from '../../src/report/language/warningWords.ts';
import type { ShownAnswer } from './sheetState.ts';

/** An answer in the report's words and figures. */
export function shownAnswer(input: ReportInput): ShownAnswer {
  const { answer, messages } = input;
  return {
    sentences: clientSentences(input).map(visibleText),
    tiles: tilesOf(input),
    bars: barsOf(input),
    cautions: answer.warnings.map((warning) => {
      const { text, remedy } = warningText(warning, messages.warnings, messages.problems);
      return { text: visibleText(text), remedy: visibleText(remedy) };
    }),
    assumptions: answer.assumptions.map((assumption) => ({
      path: visibleText(assumption.path),
      text: visibleText(assumptionText(assumption, messages.assumptions)),
    })),
    days: answer.columns.hours / 24,
    months: monthlyEnergy(input).text,
  };
}

function tilesOf({ document, words, figures }: ReportInput): ShownAnswer['tiles'] {
  const { annual, costs, carbon } = document;
  const { tiles: said } = words.client;
  const [first] = costs;
  return [
    { name: said.electricity, value: figures.number(annual.electricity.total, 0), unit: 'kWh' },
    { name: said.factor, value: figures.factor(annual.seasonalFactor.h4), unit: 'H4' },
    { name: said.backupHours, value: figures.number(annual.backupHours, 0), unit: 'h' },
    ...(first === undefined
      ? []
      : [{ name: said.cost, value: figures.number(first.systemTotal, 0), unit: visibleText(first.currency) }]),
    ...(first?.saving === undefined
      ? []
      : [
          {
            name: first.saving < 0 ? said.dearer : said.saved,
            value: figures.number(Math.abs(first.saving), 0),
            unit: visibleText(first.currency),
          },
        ]),
    ...(typeof carbon.heatPump === 'number'
      ? [{ name: said.carbon, value: figures.number(carbon.heatPump, 0), unit: 'kg CO₂' }]
      : []),
  ];
}

/** Cost of a year on each tariff, and the boiler's. */
function barsOf({ document, words, figures }: ReportInput): ShownAnswer['bars'] {
  const { costs, boiler, currency } = document;
  const bars = costs.map((cost) => ({
    ...{ name: visibleText(cost.tariff), value: cost.systemTotal, currency: cost.currency, boiler: false },
  }));
  if (boiler !== undefined) bars.push({ name: words.client.boiler, value: boiler.total, currency, boiler: true });
  const values = bars.map(({ value }) => value);
  const range = [Math.min(0, ...values), Math.max(0, ...values)] as const;
  return bars.map((bar) => ({
    name: bar.name,
    value: figures.money(bar.value, bar.currency),
    strip: barStrip(bar.value, range, bar.boiler ? { tone: 3, texture: 'outline' } : { tone: 1, texture: 'plain' })
      .text,
    boiler: bar.boiler,
  }));
}
