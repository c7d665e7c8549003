import { hotWaterSchema } from '../src/scenario/hotWaterSchema.ts';
import { houseSchema } from '../src/scenario/houseSchema.ts';
import type { LoadedScenario } from '../src/scenario/loadScenario.ts';

/**
 * The demo with everything on that a plain loop is measured with: hot water with a hygiene run, frost by humidity, a lowest
 * level of its own; with degree hours, or with the house's mass.
 */
export function everythingOn(demo: LoadedScenario, model: 'degreeHours' | 'lumped'): LoadedScenario {
  const { scenario, unit } = demo;
  const hotWater = hotWaterSchema.parse({
    volume: 250,
    setPoint: 50,
    loss: { given: 'coefficient', value: 1.6 },
    draw: { given: 'profile', profile: 'M' },
    hygiene: { weekday: 'sun', hour: 13, temperature: 60 },
  });
  const house = houseSchema.parse({
    heatLoss: { given: 'coefficient', value: 195 },
    floorArea: 138,
    design: { outdoorTemperature: -12, roomTemperature: 20 },
    need: { model, setPoint: 20, internalGains: 420, solarAperture: 2.5 },
  });
  const limits = { ...unit.unit.limits, highestFlow: 60 };
  const defrost = { method: 'humidity' as const, capacityLoss: 0.1, copLoss: 0.12 };
  return {
    ...demo,
    scenario: { ...scenario, hotWater, house },
    unit: { ...unit, unit: { ...unit.unit, limits, defrost } },
  };
}
