import { polylineAt } from '../../core/polyline.ts';
import { readMap } from '../../sim/heatPumpMap.ts';
import { polylineOf } from '../prepare/prepareUnit.ts';
import type { Scenario } from '../scenarioSchema.ts';
import type { BareAnswer, Warning } from './answer.ts';

/** Capacity at design conditions over design load: outside these the unit is far too small or too large (common practice, no source). */
const FAR_UNDER = 0.75;
const FAR_OVER = 1.5;

/**
 * Whether the unit fits the design load: its full capacity at the design temperature, at the flow that the emitters ask for
 * there or the highest that the unit gives, whichever is lower. Without frost, as the map has it.
 */
export function sizeWarnings({ plan, loaded, designLoad }: BareAnswer): Warning[] {
  const { flowTemperature, house } = loaded.scenario;
  const outdoor = house.design.outdoorTemperature;
  const { unit } = plan.unitOnWeather;
  if (outdoor < unit.lowestOutdoorTemperature) {
    return [
      {
        code: 'size.cannot-run',
        text: `The unit cannot run at the design temperature: ${outdoor} °C is colder than its lowest, ${unit.lowestOutdoorTemperature} °C.`,
        remedy: `The backup must then carry the whole design load of ${designLoad.toFixed(1)} kW; else take a unit that runs in such cold.`,
      },
    ];
  }
  const asked = designFlow(flowTemperature, outdoor);
  const flow = Math.min(asked, polylineAt(unit.highestFlow, outdoor));
  const point = new Float64Array(2);
  readMap(unit.full, outdoor, flow, point, 0);
  const share = point[0] / designLoad;
  const limited = flow < asked ? ', the highest it gives there' : '';
  const figures = `${point[0].toFixed(1)} kW at ${outdoor} °C and ${Number(flow.toFixed(1))} °C flow${limited}, the design load is ${designLoad.toFixed(1)} kW`;
  if (share < FAR_UNDER) {
    return [
      {
        code: 'size.far-under',
        text: `The unit is far smaller than the house needs: ${figures}.`,
        remedy: 'Take the next size, or make sure that backup power and cost are accepted.',
      },
    ];
  }
  if (share > FAR_OVER) {
    return [
      {
        code: 'size.far-over',
        text: `The unit is far larger than the house needs: ${figures}.`,
        remedy: 'A smaller unit starts and stops less and costs less.',
      },
    ];
  }
  return [];
}

/** The flow that is asked for at the design temperature, °C. */
function designFlow(setting: Scenario['flowTemperature'], outdoor: number): number {
  if (setting.method === 'curve') return polylineAt(polylineOf(setting.points), outdoor);
  return setting.method === 'fixed' ? setting.flow : Math.min(setting.flow, setting.highestFlow ?? setting.flow);
}
