import { columnSum } from '../../core/columnSum.ts';
import { readMap } from '../../sim/heatPumpMap.ts';
import type { ReportInput } from './reportInput.ts';

/** Changes that are looked at: prices by a fifth, flow and rooms by so many kelvins. */
export const PRICE_CHANGE = 0.2;
export const FLOW_CHANGE = 5;
export const ROOM_CHANGE = 1;

/** One thing that could be otherwise, and what it would change in a year. */
export interface WhatIf {
  readonly kind: 'electricity' | 'fuel' | 'flow' | 'rooms';
  /** Electricity more, kWh; 0 where a price changes. */
  readonly electricity: number;
  /** Cost of the heating more, money; absent without a tariff. */
  readonly cost?: number;
  /** Change of the saving against the boiler, money; absent without a boiler or a tariff. */
  readonly saving?: number;
}

/**
 * What could change the year most: dearer electricity and fuel (the money alone), a hotter flow (by the full-load COP of the
 * map at the same hours) and warmer rooms (heat loss over the hours with need, at the year's H4). All but the prices are
 * estimates without a run of their own.
 *
 * @param answer of one scenario
 * @returns the greatest change first
 */
export function whatIf(answer: ReportInput['answer']): WhatIf[] {
  const { totals, costs } = answer;
  if (totals.annual.electricity <= 0) return [];
  const list = [flowChange(answer), roomChange(answer)];
  const [cost] = costs;
  if (cost !== undefined) {
    const { heating, boiler } = cost;
    const electricity = PRICE_CHANGE * heating.electricityEnergy;
    const fuel = PRICE_CHANGE * heating.fuelEnergy;
    list.push({
      kind: 'electricity',
      electricity: 0,
      cost: electricity,
      ...(boiler === undefined ? {} : { saving: PRICE_CHANGE * boiler.electricityEnergy - electricity }),
    });
    const saving = boiler === undefined ? {} : { saving: PRICE_CHANGE * boiler.fuelEnergy - fuel };
    list.push({ kind: 'fuel', electricity: 0, cost: fuel, ...saving });
  }
  const size = ({ electricity, cost = 0, saving = 0 }: WhatIf) =>
    Math.max(Math.abs(cost), Math.abs(saving)) || electricity;
  return list.filter((change) => size(change) > 0.5).sort((a, b) => size(b) - size(a));
}

/** Electricity that a hotter flow takes: in each hour by the ratio of the map's COP at both flows. */
function flowChange(answer: ReportInput['answer']): WhatIf {
  const { columns: c, plan } = answer;
  const { full } = plan.unitOnWeather.unit;
  const point = new Float64Array(4);
  let electricity = 0;
  for (let i = 0; i < c.hours; i++) {
    if (c.heatPumpSpaceElectricity[i] <= 0) continue;
    readMap(full, plan.weather.temperature[i], c.flowTemperature[i], point, 0);
    readMap(full, plan.weather.temperature[i], c.flowTemperature[i] + FLOW_CHANGE, point, 2);
    electricity += c.heatPumpSpaceElectricity[i] * (point[1] / point[3] - 1);
  }
  return priced(answer, 'flow', electricity, 0);
}

function roomChange(answer: ReportInput['answer']): WhatIf {
  const { totals, heatLoss, factors, costs, columns } = answer;
  const heat = (heatLoss / 1000) * ROOM_CHANGE * totals.hours.heating;
  const need = columnSum(columns.spaceHeatNeed, 0, columns.hours);
  const fuelEnergy = costs[0]?.boiler?.fuelEnergy ?? 0;
  const boiler = need > 0 ? (fuelEnergy * heat) / need : 0;
  return priced(answer, 'rooms', factors.h4 === 'no heat' ? 0 : heat / factors.h4, boiler);
}

/** A change of electricity in money, at the mean price of the heating's kWh; and what the boiler would cost more. */
function priced(
  { totals, costs }: ReportInput['answer'],
  kind: WhatIf['kind'],
  electricity: number,
  boilerMore: number,
): WhatIf {
  const [present] = costs;
  if (present === undefined) return { kind, electricity };
  const cost = (electricity * present.heating.electricityEnergy) / totals.annual.electricity;
  return { kind, electricity, cost, ...(present.boiler === undefined ? {} : { saving: boilerMore - cost }) };
}
