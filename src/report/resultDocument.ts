import type { BoilerYear } from '../compare/boiler.ts';
import type { Answer, TariffCost } from '../scenario/answer/answer.ts';
import { fieldStudies } from '../scenario/answer/fieldStudies.ts';
import { seasonalFactors } from '../sim/seasonalFactors.ts';
import type { EnergyTotals } from '../sim/totals.ts';
import type { BillSums } from '../tariffs/bill.ts';
import { comparisonDocument } from './comparisonDocument.ts';
import { assumptionNote, warningNote } from './englishNotes.ts';
import type { ResultDocument } from './resultSchema.ts';
import { weatherLines } from './weatherLines.ts';

const UNITS = {
  energy: 'kWh',
  electricity: 'kWh',
  fuel: 'kWh on the calorific value of its price and efficiency',
  degreeDays: 'K·d',
  temperature: '°C',
  seasonalFactor: 'heat out over energy in',
  hours: 'h',
  starts: 'compressor starts, an estimate',
  kelvinHoursBelow: 'K·h',
  money: 'currency of the tariff or of the scenario',
  carbon: 'kg',
  heatLoss: 'W/K',
  heatLossPerArea: 'W/(m²·K)',
  designLoad: 'kW',
};

/**
 * An answer as plain data, as `--json` writes it.
 *
 * @param answer of one scenario
 * @param version of the program
 * @returns full precision, keys in a fixed order; what is not there has a word instead of a number, or no key
 */
export function resultDocument(answer: Answer, version: string): ResultDocument {
  const { loaded, boiler, carbon } = answer;
  const { scenario } = loaded;
  return {
    version,
    scenario: scenario.name,
    heatPumpUnit: loaded.unit.unit.name,
    currency: scenario.currency,
    units: UNITS,
    annual: annualOf(answer),
    monthly: answer.totals.monthly.map((month, i) => ({
      month: i + 1,
      ...energiesOf(answer, month, answer.degreeDays.monthly[i]),
    })),
    fieldStudies: fieldStudies.map((study) => ({ ...study })),
    costs: answer.costs.map(costOf),
    ...(boiler === undefined ? {} : { boiler: boilerOf(boiler, answer.costs[0]) }),
    ...comparisonDocument(answer.comparison),
    carbon: carbon ?? { heatPump: 'not asked', boiler: 'not asked' },
    house: {
      heatLoss: answer.heatLoss,
      designLoad: answer.designLoad,
      heatLossPerArea: perArea(answer.heatLoss, scenario.house.floorArea),
      degreeDayBase: answer.degreeDays.base,
    },
    assumptions: answer.assumptions.map(assumptionNote),
    warnings: answer.warnings.map(warningNote),
    weather: { file: loaded.weather.file, ...weatherLines(loaded.weather.recognised) },
    inputs: loaded.inputs.map(({ file, role, sha256 }) => ({ file, role, sha256 })),
  };
}

function perArea(heatLoss: number, floorArea: number | undefined): number | 'no floor area' {
  return floorArea === undefined ? 'no floor area' : heatLoss / floorArea;
}

function annualOf(answer: Answer): ResultDocument['annual'] {
  const { annual, hours, starts, kelvinHoursBelow } = answer.totals;
  return {
    ...energiesOf(answer, annual, answer.degreeDays.annual),
    heatingHours: hours.heating,
    backupHours: hours.backup,
    backupHoursSpace: hours.backupForSpace,
    backupHoursWater: hours.backupForWater,
    unmetHours: hours.unmet,
    outsideMapHours: hours.outsideMap,
    belowLowestFlowHours: hours.belowLowestFlow,
    flowAboveLimitHours: hours.flowAboveLimit,
    cyclingHours: hours.cycling,
    hotWaterShortHours: hours.hotWaterShort,
    starts,
    ...(answer.plan.house.mass === null ? {} : { kelvinHoursBelow }),
  };
}

/** The keys that the year and a month have alike. */
function energiesOf(
  answer: Answer,
  sums: EnergyTotals,
  degreeDays: number,
): Omit<ResultDocument['monthly'][0], 'month'> {
  const { h2, h3, h4 } = seasonalFactors(sums);
  return {
    degreeDays,
    spaceHeatNeed: sums.spaceHeatNeed,
    heatPumpHeat: sums.heatPumpSpaceHeat + sums.heatPumpWaterHeat,
    heatPumpSpaceHeat: sums.heatPumpSpaceHeat,
    heatPumpWaterHeat: sums.heatPumpWaterHeat,
    backupHeat: sums.backupSpaceHeat + sums.backupWaterHeat,
    backupSpaceHeat: sums.backupSpaceHeat,
    backupWaterHeat: sums.backupWaterHeat,
    unmetHeat: sums.unmetHeat,
    electricity: {
      heatPump: sums.heatPumpSpaceElectricity + sums.heatPumpWaterElectricity,
      backup: sums.backupElectricity,
      circulation: sums.circulationElectricity,
      standby: sums.standbyElectricity + sums.crankcaseElectricity,
      total: sums.electricity,
    },
    electricityDetail: {
      heatPumpSpaceElectricity: sums.heatPumpSpaceElectricity,
      heatPumpWaterElectricity: sums.heatPumpWaterElectricity,
      backupElectricity: sums.backupElectricity,
      circulationElectricity: sums.circulationElectricity,
      standbyElectricity: sums.standbyElectricity,
      crankcaseElectricity: sums.crankcaseElectricity,
    },
    fuel: sums.fuel,
    seasonalFactor: { h2, h3, h4 },
    ...(answer.plan.hotWater === null ? {} : { hotWater: hotWaterOf(sums) }),
  };
}

function hotWaterOf(sums: EnergyTotals): NonNullable<ResultDocument['annual']['hotWater']> {
  return {
    hotWaterAsked: sums.hotWaterAsked,
    hotWaterServed: sums.hotWaterAsked - sums.hotWaterShort,
    hotWaterShort: sums.hotWaterShort,
    cylinderLoss: sums.cylinderLoss,
  };
}

function costOf(cost: TariffCost): ResultDocument['costs'][0] {
  const { bill, householdBill, heating, boilerCost, saving } = cost;
  return {
    tariff: cost.tariff,
    file: cost.file,
    currency: cost.currency,
    pricesStated: cost.pricesStated,
    taxesStated: cost.taxes,
    ...sumsOf(bill),
    byRate: { ...bill.byRate },
    byTax: { ...bill.byTax },
    monthly: bill.monthly.map(sumsOf),
    household: { ...sumsOf(householdBill), byRate: { ...householdBill.byRate } },
    systemElectricity: heating.electricity,
    systemFuel: heating.fuel,
    systemService: heating.service,
    systemTotal: cost.heatingCost,
    ...(boilerCost === undefined ? {} : { boilerTotal: boilerCost }),
    ...(saving === undefined ? {} : { saving }),
  };
}

function sumsOf(sums: BillSums): Omit<BillSums, 'energyTaxes'> {
  const { kWh, energy, standing, demand, taxes, taxesInside, credits, total } = sums;
  return { kWh, energy, standing, demand, taxes, taxesInside, credits, total };
}

function boilerOf(boiler: BoilerYear, first: TariffCost | undefined): NonNullable<ResultDocument['boiler']> {
  const { cost, service } = boiler;
  return {
    fuel: boiler.fuel,
    fuelCost: cost.energy,
    standing: cost.standing,
    taxes: cost.taxes,
    service,
    pumpElectricity: boiler.pumpElectricity,
    heatElectricity: boiler.heatElectricity,
    electricityCost: first?.boiler?.electricity ?? 'no tariff',
    meanSpaceHeatEfficiency: boiler.meanSpaceHeatEfficiency,
    total: first?.boilerCost ?? cost.total + service,
  };
}
