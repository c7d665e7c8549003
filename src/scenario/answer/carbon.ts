import type { BoilerYear } from '../../compare/boiler.ts';
import { type BoilerFuel, carbonFactorOf } from '../../compare/fuel.ts';
import type { YearTotals } from '../../sim/totals.ts';
import type { Scenario } from '../scenarioSchema.ts';
import type { Answer, Carbon } from './answer.ts';

/** Carbon of the year with the heat pump and with the boiler, kg; nothing where no factor of electricity is entered. */
export function carbonOf(scenario: Scenario, totals: YearTotals, boiler: BoilerYear | undefined): Answer['carbon'] {
  const { carbon } = scenario;
  if (carbon === undefined) return undefined;
  const { electricity, fuel } = totals.annual;
  return {
    heatPump: withFuel(electricity * carbon.electricity, fuel, hybridFuel(scenario)),
    boiler:
      boiler === undefined
        ? 'no boiler'
        : withFuel(
            (boiler.pumpElectricity + boiler.heatElectricity) * carbon.electricity,
            boiler.fuel,
            scenario.boiler?.fuel,
          ),
  };
}

function hybridFuel({ backup }: Scenario): BoilerFuel | undefined {
  return backup?.source === 'boiler' ? backup.fuel : undefined;
}

function withFuel(fromElectricity: number, kWh: number, fuel: BoilerFuel | undefined): Carbon {
  if (kWh === 0) return fromElectricity;
  const factor = fuel === undefined ? undefined : carbonFactorOf(fuel);
  return factor === undefined ? 'no factor' : fromElectricity + kWh * factor;
}
