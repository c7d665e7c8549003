import type { Problem } from '../../core/problem.ts';
import type { ReadingsEntry } from '../fitSchema.ts';
import type { Scenario } from '../scenarioSchema.ts';
import type { MeterFile } from './readMeter.ts';

/** How what was metered becomes heat. */
export interface MeterEnergy {
  readonly kWhPerUnit: number;
  /** For space heat, on the calorific value of those kWh. */
  readonly efficiency: number;
  /** Whether the scenario states it for the readings, or it is that of its boiler. */
  readonly efficiencyFrom: 'readings' | 'boiler';
}

const KWH_PER_MWH = 1000;

/** Where the facts come from: the scenario's sections, and the names of the files for problems. */
interface EnergySource {
  readonly entry: ReadingsEntry;
  readonly boiler: Scenario['boiler'];
  readonly scenarioFile: string;
  /** Name of the file of readings. */
  readonly name: string;
}

/**
 * Energy of one unit and efficiency: from the name of the column and the scenario.
 *
 * @param meter the readings, as far as they could be read
 */
export function meterEnergy(
  meter: MeterFile | undefined,
  { entry, boiler, scenarioFile, name }: EnergySource,
): { energy?: MeterEnergy; problems: Problem[] } {
  const problems: Problem[] = [];
  const kWhPerUnit = meter === undefined ? undefined : factorOf(meter, { entry, name, problems });
  // An efficiency that follows the return temperature of another boiler says nothing of what was metered.
  const ofBoiler = typeof boiler?.efficiency === 'number' ? boiler.efficiency : undefined;
  const efficiency = entry.efficiency ?? ofBoiler;
  if (efficiency === undefined) {
    const path = 'readings.efficiency';
    problems.push({ code: 'readings.no-efficiency', severity: 'error', file: scenarioFile, path });
  }
  if (kWhPerUnit === undefined || efficiency === undefined) return { problems };
  const efficiencyFrom = entry.efficiency === undefined ? 'boiler' : 'readings';
  return { energy: { kWhPerUnit, efficiency, efficiencyFrom }, problems };
}

function factorOf(
  { unit, label, headerLine }: MeterFile,
  { entry, name, problems }: { entry: ReadingsEntry; name: string; problems: Problem[] },
): number | undefined {
  const place = { severity: 'error', file: name, line: headerLine, path: label } as const;
  const { kWhPerUnit } = entry;
  const own = unit === 'kWh' ? 1 : unit === 'MWh' ? KWH_PER_MWH : undefined;
  if (own === undefined) {
    if (kWhPerUnit === undefined) {
      const code = unit === undefined ? 'readings.no-unit' : 'readings.needs-factor';
      problems.push({ ...place, code, ...(unit === undefined ? {} : { found: unit }) });
    }
    return kWhPerUnit;
  }
  if (unit === undefined || kWhPerUnit === undefined || kWhPerUnit === own) return own;
  problems.push({ ...place, code: 'readings.two-units', found: unit, allowed: String(kWhPerUnit) });
  return undefined;
}
