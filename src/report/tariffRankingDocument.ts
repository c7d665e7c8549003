import type { Answer } from '../scenario/answer/answer.ts';
import type { Neighbours, RankedTariff, TariffRanking } from '../scenario/answer/rankTariffs.ts';
import { assumptionNote, warningNote } from './englishNotes.ts';
import type { TariffRankingDocument } from './tariffRankingSchema.ts';

type Entry = TariffRankingDocument['rankings'][number];

/**
 * A ranking of tariffs as plain data, as `tariffs --json` writes it.
 *
 * @param answer whose tariffs were ranked, one at least
 * @param version of the program
 * @returns full precision, keys in a fixed order
 */
export function tariffRankingDocument(
  answer: Answer,
  rankings: readonly TariffRanking[],
  version: string,
): TariffRankingDocument {
  const { loaded, costs, totals } = answer;
  const [present] = costs;
  return {
    version,
    scenario: loaded.scenario.name,
    heatPumpUnit: loaded.unit.unit.name,
    currency: present.currency,
    present: present.tariff,
    householdElectricity: present.householdBill.kWh,
    heatingElectricity: totals.annual.electricity,
    rankings: rankings.map(({ taxes, tariffs, neighbours }) => ({
      taxesStated: taxes,
      tariffs: tariffs.map((ranked) => entryOf(ranked, tariffs)),
      changesOfPlace: neighbours.map(changeOf),
    })),
    warnings: answer.warnings.map(warningNote),
    assumptions: answer.assumptions.map(assumptionNote),
    inputs: loaded.inputs.map(({ file, role, sha256 }) => ({ file, role, sha256 })),
  };
}

function entryOf(ranked: RankedTariff, all: readonly RankedTariff[]): Entry['tariffs'][number] {
  const { cost, present, total, saving } = ranked;
  const { from, to, kWh, cost: costOfWeek } = ranked.dearestWeek;
  return {
    rank: 1 + all.filter((other) => other.total < total).length,
    tariff: cost.tariff,
    file: cost.file,
    present,
    total,
    bill: cost.bill.total,
    fuel: cost.heating.fuel,
    saving,
    kWh: cost.bill.kWh,
    byRate: { ...cost.bill.byRate },
    dearestWeek: { from, to, kWh, cost: costOfWeek },
  };
}

function changeOf({ cheaper, dearer, difference, change }: Neighbours): Entry['changesOfPlace'][number] {
  const names = { cheaper: cheaper.cost.tariff, dearer: dearer.cost.tariff, difference };
  if (typeof change === 'string') return { ...names, change };
  return { ...names, change: change.change, meanPrice: change.meanPrice, priceAtEquality: change.priceAtEquality };
}
