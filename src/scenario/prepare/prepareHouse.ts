import { type HeatLossParts, heatLossOfElements, heatLossOfLoad } from '../../sim/heatLoss.ts';
import type { House } from '../../sim/house.ts';
import { type MassParameters, massParameters } from '../../sim/lumpedHouse.ts';
import type { CivilClock } from '../../tariffs/civilClock.ts';
import type { PreparedTariff } from '../../tariffs/preparedTariff.ts';
import { type Kept, KeptKind } from '../kept.ts';
import type { Scenario } from '../scenarioSchema.ts';
import { stepsOfRule } from './schedules.ts';

type HouseEntry = Scenario['house'];

/** Shares of windows, opaque elements and ventilation where neither shares nor elements are given (MODEL section 4). */
const USUAL_PARTS: HeatLossParts = { windows: 0.25, opaque: 0.5, ventilation: 0.25 };

/** Heat loss of the house in W/K, and how it is parted. */
export function heatLossOf(house: HouseEntry): { readonly total: number; readonly parts: HeatLossParts } {
  const { heatLoss, need } = house;
  if (heatLoss.given === 'elements') {
    const parts = heatLossOfElements(heatLoss.elements, heatLoss.thermalBridges, heatLoss.ventilation);
    const total = parts.windows + parts.opaque + parts.ventilation;
    return { total, parts: (need.model === 'lumped' ? need.lossShares : undefined) ?? parts };
  }
  const total =
    heatLoss.given === 'coefficient'
      ? heatLoss.value
      : heatLossOfLoad(heatLoss.value, heatLoss.roomTemperature, heatLoss.outdoorTemperature);
  return { total, parts: (need.model === 'lumped' ? need.lossShares : undefined) ?? USUAL_PARTS };
}

/** Design load of the house, kW: H·(θ_room,design − θ_design). */
export function designLoadOf(house: HouseEntry): number {
  return (heatLossOf(house).total / 1000) * (house.design.roomTemperature - house.design.outdoorTemperature);
}

/** A house ready to be simulated, or how much its opaque elements lose and may lose at most, W/K. */
export type PreparedHouse =
  | { readonly house: House }
  | { readonly opaqueLoss: { readonly found: number; readonly most: number } };

/**
 * A house ready to be simulated.
 *
 * @param entry the scenario's house, checked
 * @param clock civil time of the year
 * @param present the first tariff, for set points that follow its rates
 * @param kept where the scenarios of a batch keep their set points
 */
export function prepareHouse(
  entry: HouseEntry,
  clock: CivilClock,
  present: PreparedTariff | undefined,
  kept?: Kept,
): PreparedHouse {
  const { need } = entry;
  const { total, parts } = heatLossOf(entry);
  let mass: MassParameters | null = null;
  if (need.model === 'lumped') {
    const found = massParameters(entry.floorArea ?? 0, need.massClass, total, parts);
    if ('reason' in found) return { opaqueLoss: { found: found.opaque, most: found.most } };
    mass = found.mass;
  }
  return {
    house: {
      heatLoss: total / 1000,
      designLoad: designLoadOf(entry),
      setPoint: keptSetPoints(need, clock, present, kept),
      nominalSetPoint: need.setPoint,
      baseTemperature: need.model === 'degreeHours' ? (need.baseTemperature ?? null) : null,
      internalGains: need.internalGains / 1000,
      solarAperture: need.solarAperture,
      heatingLimit: need.heatingLimit ?? Number.POSITIVE_INFINITY,
      mass,
    },
  };
}

/** Columns of set points that the scenarios of a batch have in common. */
const setPointColumns = new KeptKind<Float64Array>(64);

function keptSetPoints(
  need: HouseEntry['need'],
  clock: CivilClock,
  present: PreparedTariff | undefined,
  kept?: Kept,
): Float64Array {
  const rules = need.model === 'lumped' ? need.schedule : need.days;
  const key = kept?.key(present === undefined ? [clock] : [clock, present], need.setPoint, rules) ?? '';
  return setPointColumns.of(kept, key, () => setPoints(need, clock, present));
}

/** Set point of each step: the first rule that holds, else the nominal one. */
function setPoints(need: HouseEntry['need'], clock: CivilClock, present: PreparedTariff | undefined): Float64Array {
  const column = new Float64Array(clock.hours).fill(need.setPoint);
  const rules = need.model === 'lumped' ? need.schedule : need.days;
  for (const rule of rules.toReversed()) {
    const holds = stepsOfRule(rule, clock);
    const rate = 'rate' in rule && rule.rate !== undefined ? (present?.rateNames.indexOf(rule.rate) ?? -1) : null;
    const setPoint = rule.setPoint ?? need.setPoint + ('raise' in rule ? (rule.raise ?? 0) : 0);
    for (let i = 0; i < clock.hours; i++) {
      if (holds[i] === 1 && (rate === null || present?.rateOfStep[i] === rate)) column[i] = setPoint;
    }
  }
  return column;
}
