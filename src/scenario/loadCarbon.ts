import type { RateFactor } from '../compare/carbon.ts';
import type { Problem } from '../core/problem.ts';
import type { CivilClock } from '../tariffs/civilClock.ts';
import type { SeriesKind } from '../tariffs/timeSeries.ts';
import type { InputFiles } from './inputFiles.ts';
import { hourlyMeans, namedSeries } from './loadSeries.ts';
import type { Scenario } from './scenarioSchema.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/** Carbon of one kWh of electricity, kg: one factor, one for each rate of the first tariff, or one for each hour. */
export type ElectricityCarbon =
  | { readonly given: 'constant'; readonly factor: number }
  | { readonly given: 'byRate'; readonly factors: readonly RateFactor[] }
  | { readonly given: 'byHour'; readonly factors: Float64Array };

/** Largest carbon factor that is read, kg/kWh. */
const HIGHEST_FACTOR = 5;

/** What a file of carbon factors holds. */
export const FACTORS: Omit<SeriesKind, 'divisor'> = {
  one: 'factor',
  many: 'factors',
  section: 'carbon.electricity',
  valueKey: 'factorColumn',
  least: 0,
  most: HIGHEST_FACTOR,
  range: `from 0 to ${HIGHEST_FACTOR} kg/kWh`,
};

/**
 * Carbon factors of electricity as a scenario gives them; a series as means over the minutes of each hour, the year taken
 * as periodic.
 *
 * @param clock civil time of the year; without it the file is checked all the same
 * @returns nothing where none are entered
 */
export function carbonFactorsOf(
  yaml: YamlFile,
  { carbon, zone }: { readonly carbon: Scenario['carbon']; readonly zone: string | undefined },
  files: InputFiles,
  clock: CivilClock | undefined,
): { carbon?: ElectricityCarbon; problems: Problem[] } {
  if (carbon === undefined) return { problems: [] };
  const { electricity } = carbon;
  if (typeof electricity === 'number') return { carbon: { given: 'constant', factor: electricity }, problems: [] };
  if (electricity.given === 'byRate') return { carbon: electricity, problems: [] };
  const { file, unit, stamps, timeColumn, factorColumn, decimal } = electricity;
  const kind = { ...FACTORS, divisor: unit === 'gPerKWh' ? 1000 : 1 };
  const settings = { stamps, timeColumn, valueColumn: factorColumn, decimal };
  const path = ['carbon', 'electricity', 'file'];
  const read = namedSeries(yaml, { file, role: 'carbonFactors', path, settings, kind, zone }, files);
  if (read.series === undefined || clock === undefined) return { problems: read.problems };
  const { hours, problems } = hourlyMeans(read.series, kind, clock);
  const found = [...read.problems, ...problems];
  return hours === undefined ? { problems: found } : { carbon: { given: 'byHour', factors: hours }, problems: found };
}
