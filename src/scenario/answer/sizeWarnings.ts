import { polylineAt } from '../../core/polyline.ts';
import { readMap } from '../../sim/heatPumpMap.ts';
import { polylineOf } from '../prepare/prepareUnit.ts';
import type { Scenario } from '../scenarioSchema.ts';
import type { SeenYear } from './answer.ts';
import type { SeenWarning } from './warning.ts';

/** Capacity at design conditions over design load: outside these the unit is far too small or too large (common practice, no source). */
const FAR_UNDER = 0.75;
const FAR_OVER = 1.5;

/**
 * Whether the unit fits the design load: its full capacity at the design temperature, at the flow that the emitters ask for
 * there or the highest that the unit gives, whichever is lower. Without frost, as the map has it.
 */
export function sizeWarnings({ plan, loaded, designLoad }: SeenYear): SeenWarning[] {
  const { flowTemperature, house } = loaded.scenario;
  const outdoor = house.design.outdoorTemperature;
  const { unit } = plan.unitOnWeather;
  const lowest = unit.lowestOutdoorTemperature;
  if (outdoor < lowest) return [{ code: 'size.cannot-run', values: { outdoor, lowest, designLoad } }];
  const asked = designFlow(flowTemperature, outdoor);
  const flow = Math.min(asked, polylineAt(unit.highestFlow, outdoor));
  const point = new Float64Array(2);
  readMap(unit.full, outdoor, flow, point, 0);
  const [capacity] = point;
  const values = { capacity, outdoor, flow, limited: flow < asked, designLoad };
  if (capacity / designLoad < FAR_UNDER) return [{ code: 'size.far-under', values }];
  return capacity / designLoad > FAR_OVER ? [{ code: 'size.far-over', values }] : [];
}

/** The flow that is asked for at the design temperature, °C. */
function designFlow(setting: Scenario['flowTemperature'], outdoor: number): number {
  if (setting.method === 'curve') return polylineAt(polylineOf(setting.points), outdoor);
  return setting.method === 'fixed' ? setting.flow : Math.min(setting.flow, setting.highestFlow ?? setting.flow);
}
