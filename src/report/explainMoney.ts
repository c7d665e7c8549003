import { carbonFactorOf, fuelTaxShare } from '../compare/fuel.ts';
import type { Answer } from '../scenario/answer/answer.ts';
import type { Figures } from '../sim/explain/figures.ts';
import { type ExplainedStage, explainedStage, type Finding } from '../sim/explain/stage.ts';

/** A simulated year of a scenario. */
export type SimulatedYear = Pick<Answer, 'loaded' | 'plan' | 'columns'>;

/**
 * Cost of an hour on the first tariff, and its carbon where the factor of electricity is one (MODEL section 12).
 *
 * @param hour 0 … hours − 1
 */
export function moneyStage(year: SimulatedYear, hour: number): ExplainedStage {
  const cost = costOf(year, hour);
  const carbon = carbonOf(year, hour);
  return explainedStage('money', {
    figures: { ...cost.figures, ...carbon.figures },
    findings: [...cost.findings, ...carbon.findings],
    formulas: [Object.keys(cost.figures).length > 0 && 'cost', carbon.figures.carbon !== undefined && 'carbon'],
  });
}

interface Part {
  readonly figures: Figures;
  readonly findings: readonly Finding[];
}

function costOf(year: SimulatedYear, hour: number): Part {
  const electricity = year.columns.electricity[hour];
  const fuel = fuelCostOf(year, hour);
  const present = year.loaded.tariffs[0]?.prepared;
  if (present === undefined) return { figures: fuel, findings: ['noTariff'] };
  if (present.pricedByBlocksAlone) return { figures: fuel, findings: ['pricedByBlocks'] };
  const price = present.price[hour];
  const marginalPrice = present.marginalPrice[hour];
  return {
    figures: {
      electricity,
      price,
      energyCost: electricity * price,
      marginalPrice,
      taxedCost: electricity * marginalPrice,
      ...fuel,
    },
    findings: present.parts.some(({ blocks }) => blocks !== undefined) ? ['blocksNotSeen'] : [],
  };
}

/** Fuel of a hybrid, taxes in. */
function fuelCostOf({ loaded, columns }: SimulatedYear, hour: number): Figures {
  const { backup } = loaded.scenario;
  if (backup?.source !== 'boiler') return {};
  const fuelPrice = backup.fuel.price * (1 + fuelTaxShare(backup.fuel));
  return { fuel: columns.fuel[hour], fuelPrice, fuelCost: columns.fuel[hour] * fuelPrice };
}

function carbonOf({ loaded, columns }: SimulatedYear, hour: number): Part {
  const { carbon } = loaded;
  if (carbon === undefined) return { figures: {}, findings: [] };
  if (carbon.given !== 'constant') return { figures: {}, findings: ['carbonByHour'] };
  const { backup } = loaded.scenario;
  const ofElectricity = columns.electricity[hour] * carbon.factor;
  if (backup?.source !== 'boiler' || columns.fuel[hour] === 0) {
    return { figures: { carbonFactor: carbon.factor, carbon: ofElectricity }, findings: [] };
  }
  const common = backup.fuel.kind === 'electricity' ? carbon.factor : undefined;
  const fuelCarbonFactor = carbonFactorOf(backup.fuel) ?? common;
  if (fuelCarbonFactor === undefined) return { figures: {}, findings: ['noCarbonFactor'] };
  return {
    figures: {
      carbonFactor: carbon.factor,
      fuelCarbonFactor,
      carbon: ofElectricity + columns.fuel[hour] * fuelCarbonFactor,
    },
    findings: [],
  };
}
