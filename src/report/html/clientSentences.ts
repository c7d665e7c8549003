import { visibleText } from '../../core/problem.ts';
import type { ReportInput } from './reportInput.ts';

/** The answer in three sentences: what it uses, what it costs, whether it is warm. */
export function clientSentences(input: ReportInput): [string, string, string] {
  return [useSentence(input), costSentence(input), warmthSentence(input)];
}

function useSentence({ document, words, figures }: ReportInput): string {
  const { client: said } = words;
  const { annual } = document;
  const { h4 } = annual.seasonalFactor;
  const electricity = figures.kWh(annual.electricity.total);
  if (h4 === 'no heat') return said.noHeat(electricity);
  const facts = { electricity, heat: figures.kWh(annual.heatPumpHeat + annual.backupHeat), factor: figures.factor(h4) };
  return annual.fuel > 0 ? said.useWithFuel({ ...facts, fuel: figures.kWh(annual.fuel) }) : said.use(facts);
}

function costSentence({ document, words, figures }: ReportInput): string {
  const { client: said } = words;
  const { costs, boiler, currency } = document;
  if (costs.length === 0) {
    return boiler === undefined ? said.noTariff : said.boilerAlone(figures.money(boiler.total, currency));
  }
  const [first] = costs;
  const cost = said.cost({ cost: figures.money(first.systemTotal, first.currency), tariff: visibleText(first.tariff) });
  const best = costs.reduce((least, other) => (other.systemTotal < least.systemTotal ? other : least));
  const comparable = best !== first && best.currency === first.currency;
  const cheapest = comparable
    ? said.cheapest({ cost: figures.money(best.systemTotal, best.currency), tariff: visibleText(best.tariff) })
    : '';
  if (first.boilerTotal === undefined || first.saving === undefined) return `${cost}${cheapest}.`;
  const facts = {
    boiler: figures.money(first.boilerTotal, first.currency),
    saving: figures.money(Math.abs(first.saving), first.currency),
  };
  return `${cost}${cheapest}${first.saving < 0 ? said.dearer(facts) : said.cheaper(facts)}`;
}

function warmthSentence({ document, words, figures }: ReportInput): string {
  const { client: said } = words;
  const { backupHours, backupHeat, heatPumpHeat, unmetHours, unmetHeat } = document.annual;
  const all = backupHeat + heatPumpHeat;
  const backup =
    backupHours > 0 && all > 0
      ? said.backup({ hours: figures.number(backupHours, 0), share: figures.percent(backupHeat / all, 1) })
      : said.noBackup;
  const missing = { hours: figures.number(unmetHours, 0), heat: figures.kWh(unmetHeat) };
  return backup + (unmetHours > 0 ? said.cold(missing) : said.warm);
}
