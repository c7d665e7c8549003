import { visibleText } from '../core/problem.ts';
import { factor, figure, kWh, money } from './figures.ts';
import type { ResultDocument } from './resultSchema.ts';
import type { Words } from './words.ts';

/** So many tariffs are named in a sentence; of more, the cheapest and the dearest. */
const MOST_NAMED = 4;

/**
 * The answer in two to four sentences: use and seasonal factor, backup and what is missing, cost against the boiler,
 * carbon.
 */
export function answerSentences(document: ResultDocument, words: Words): string[] {
  return [
    useSentence(document.annual, words),
    backupSentence(document.annual, words),
    ...costSentence(document, words),
    ...carbonSentence(document, words),
  ];
}

function useSentence(annual: ResultDocument['annual'], words: Words): string {
  const { h4 } = annual.seasonalFactor;
  const electricity = kWh(annual.electricity.total);
  if (h4 === 'no heat') return words.noHeat(electricity);
  const said = { electricity, heat: kWh(annual.heatPumpHeat + annual.backupHeat), factor: factor(h4) };
  if (annual.fuel > 0) return words.useWithFuel({ ...said, fuel: kWh(annual.fuel) });
  return words.use({ ...said, electricity: words.electricityOf(electricity) });
}

function backupSentence(annual: ResultDocument['annual'], words: Words): string {
  const { backupHours, backupHeat, backupWaterHeat, unmetHeat, unmetHours } = annual;
  const ran = backupHours > 0;
  const runs = ran
    ? words.backup({ hours: figure(backupHours, 0), heat: atLeastOne(backupHeat, words) })
    : words.noBackup;
  const forWater = ran && backupWaterHeat > 0 ? words.backupForWater(atLeastOne(backupWaterHeat, words)) : '';
  const missing = unmetHours > 0 ? words.unmet(atLeastOne(unmetHeat, words)) : words.noUnmet;
  return runs + forWater + missing;
}

function atLeastOne(heat: number, words: Words): string {
  return heat < 0.5 ? words.lessThanOne : kWh(heat);
}

function costSentence({ costs, boiler, currency }: ResultDocument, words: Words): string[] {
  const first = costs[0];
  if (first === undefined) return boiler === undefined ? [] : [words.boilerAlone(money(boiler.total, currency))];
  const costsOfHeating = words.costs(costs.length > MOST_NAMED ? fromTo(costs, words) : eachCost(costs, words));
  if (first.boilerTotal === undefined || first.saving === undefined) return [`${costsOfHeating}.`];
  const tariff = visibleText(first.tariff);
  const said = { tariff, saving: money(Math.abs(first.saving), first.currency) };
  const compared = first.saving < 0 ? words.dearer(said) : words.cheaper(said);
  return [costsOfHeating + words.boilerCosts(money(first.boilerTotal, first.currency)) + compared];
}

function eachCost(costs: ResultDocument['costs'], words: Words): string {
  const named = costs.map((cost) =>
    words.costOn({ cost: money(cost.systemTotal, cost.currency), tariff: visibleText(cost.tariff) }),
  );
  const last = named.pop() ?? '';
  return named.length === 0 ? last : named.join(', ') + words.and + last;
}

function fromTo(costs: ResultDocument['costs'], words: Words): string {
  const ranked = [...costs].sort((a, b) => a.systemTotal - b.systemTotal);
  const [cheapest, dearest] = [ranked[0], ranked[ranked.length - 1]];
  return words.costsFromTo({
    least: money(cheapest.systemTotal, cheapest.currency),
    most: money(dearest.systemTotal, dearest.currency),
    cheapest: visibleText(cheapest.tariff),
    dearest: visibleText(dearest.tariff),
  });
}

function carbonSentence({ carbon }: ResultDocument, words: Words): string[] {
  if (carbon.heatPump === 'no factor') return [words.noCarbonFactor];
  if (typeof carbon.heatPump === 'string') return [];
  const ofBoiler = typeof carbon.boiler === 'number' ? words.carbonOfBoiler(mass(carbon.boiler)) : '';
  return [`${words.carbon(mass(carbon.heatPump))}${ofBoiler}.`];
}

function mass(kilograms: number): string {
  return `${figure(kilograms, 0)} kg`;
}
