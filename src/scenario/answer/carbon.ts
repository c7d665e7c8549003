import type { BoilerYear } from '../../compare/boiler.ts';
import { carbonByHour, carbonByRate } from '../../compare/carbon.ts';
import { type BoilerFuel, carbonFactorOf } from '../../compare/fuel.ts';
import { columnSum } from '../../core/columnSum.ts';
import type { YearColumns } from '../../sim/columns.ts';
import type { YearTotals } from '../../sim/totals.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import type { Answer, Carbon } from './answer.ts';

/**
 * Carbon of the year with the heat pump and with the boiler, kg; nothing where no factor of electricity is entered.
 *
 * A factor entered with a boiler's electricity on the household's tariff holds for its heat; its pump takes that of all
 * electricity.
 *
 * Reference: MODEL section 12.
 */
export function carbonOf(
  loaded: LoadedScenario,
  c: YearColumns,
  totals: YearTotals,
  boiler: BoilerYear | undefined,
): Answer['carbon'] {
  if (loaded.carbon === undefined) return undefined;
  const { backup } = loaded.scenario;
  const hybridFuel = backup?.source === 'boiler' ? backup.fuel : undefined;
  return {
    heatPump: sumOf(carbonOfElectricity(loaded, c.electricity), carbonOfFuel(loaded, totals.annual.fuel, hybridFuel)),
    boiler: boiler === undefined ? 'no boiler' : boilerCarbon(loaded, boiler),
  };
}

function boilerCarbon(loaded: LoadedScenario, boiler: BoilerYear): Carbon {
  const fuel = loaded.scenario.boiler?.fuel;
  const ofFuel = carbonOfFuel(loaded, boiler.fuel, fuel);
  if (boiler.heatElectricity > 0 && fuel?.carbonFactor !== undefined) {
    const ofHeat = boiler.heatElectricity * fuel.carbonFactor;
    return sumOf(sumOf(carbonOfElectricity(loaded, boiler.pump), ofHeat), ofFuel);
  }
  return sumOf(carbonOfElectricity(loaded, boiler.electricity), ofFuel);
}

function carbonOfElectricity({ carbon, tariffs }: LoadedScenario, electricity: Float64Array): Carbon {
  if (carbon === undefined) return 'no factor';
  if (carbon.given === 'constant') return columnSum(electricity, 0, electricity.length) * carbon.factor;
  if (carbon.given === 'byHour') return carbonByHour(electricity, carbon.factors);
  const [first] = tariffs;
  return first === undefined ? 'no factor' : carbonByRate(electricity, first.prepared, carbon.factors);
}

/** Electricity bought at a price of its own has the one factor of electricity where it has none of its own. */
function carbonOfFuel({ carbon }: LoadedScenario, kWh: number, fuel: BoilerFuel | undefined): Carbon {
  if (kWh === 0) return 0;
  const common = fuel?.kind === 'electricity' && carbon?.given === 'constant' ? carbon.factor : undefined;
  const factor = fuel === undefined ? undefined : (carbonFactorOf(fuel) ?? common);
  return factor === undefined ? 'no factor' : kWh * factor;
}

function sumOf(a: Carbon, b: Carbon): Carbon {
  if (typeof a !== 'number') return a;
  return typeof b === 'number' ? a + b : b;
}
