import { type ChangeOfPlaces, changeOfPlaces } from '../../compare/changeOfPlaces.ts';
import { type BillWeek, dearestWeek } from '../../tariffs/billWeeks.ts';
import type { Answer, TariffCost } from './answer.ts';

/** A tariff in its place. */
export interface RankedTariff {
  readonly cost: TariffCost;
  /** Whether it is the first of the scenario. */
  readonly present: boolean;
  /** The whole bill, and the fuel of a hybrid; money. */
  readonly total: number;
  /** What it saves against the present tariff; 'not alike' where that states its taxes otherwise. */
  readonly saving: number | 'not alike';
  /** On the whole bill. */
  readonly dearestWeek: BillWeek;
}

/** Two neighbours of a ranking. */
export interface Neighbours {
  readonly cheaper: RankedTariff;
  readonly dearer: RankedTariff;
  /** What the year costs less on the cheaper one; money. */
  readonly difference: number;
  /** How far the prices of the cheaper one may rise before they change places. */
  readonly change: ChangeOfPlaces;
}

/** Tariffs that state their taxes in one way, the cheapest first; of those that cost the same the one listed first. */
export interface TariffRanking {
  readonly taxes: TariffCost['taxes'];
  readonly tariffs: readonly RankedTariff[];
  /** Each tariff and the next dearer one. */
  readonly neighbours: readonly Neighbours[];
}

/**
 * Ranks the tariffs of an answer on what the year costs: the whole bill of heating and household, and the fuel of a hybrid.
 *
 * Tariffs are ranked only among those that state their taxes in one way; one that states them in several ways in a year
 * stands alone.
 *
 * @returns the ranking that holds the present tariff first
 *
 * Reference: MODEL section 12.
 */
export function rankTariffs({ costs, loaded }: Pick<Answer, 'costs' | 'loaded'>): TariffRanking[] {
  const [first] = costs;
  const groups = new Map<string, RankedTariff[]>();
  costs.forEach((cost, i) => {
    const group = cost.taxes === 'mixed' ? `mixed ${i}` : cost.taxes;
    const alike = i === 0 || (cost.taxes === first.taxes && cost.taxes !== 'mixed');
    const total = totalOf(cost);
    const ranked = {
      cost,
      present: i === 0,
      total,
      saving: alike ? totalOf(first) - total : ('not alike' as const),
      dearestWeek: dearestWeek(loaded.tariffs[i].prepared, cost.electricity, cost.bill),
    };
    groups.set(group, [...(groups.get(group) ?? []), ranked]);
  });
  return [...groups.values()].map((group) => {
    const tariffs = group.toSorted((a, b) => a.total - b.total);
    return {
      taxes: tariffs[0].cost.taxes,
      tariffs,
      neighbours: tariffs.slice(1).map((dearer, i) => between(tariffs[i], dearer)),
    };
  });
}

function totalOf({ bill, heating }: TariffCost): number {
  return bill.total + heating.fuel;
}

function between(cheaper: RankedTariff, dearer: RankedTariff): Neighbours {
  const difference = dearer.total - cheaper.total;
  return { cheaper, dearer, difference, change: changeOfPlaces(cheaper.cost.bill, difference) };
}
