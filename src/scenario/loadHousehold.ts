import type { Problem } from '../core/problem.ts';
import type { CivilClock } from '../tariffs/civilClock.ts';
import type { SeriesKind } from '../tariffs/timeSeries.ts';
import type { HouseholdEntry } from './householdSchema.ts';
import type { InputFiles } from './inputFiles.ts';
import { hourlyMeans, namedSeries } from './loadSeries.ts';
import { profileOfHousehold } from './prepare/prepareHousehold.ts';
import type { Scenario } from './scenarioSchema.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/** Largest energy of a step that is read, kWh. */
const HIGHEST_ENERGY = 10_000;

/** What the meter of a household holds. */
export const READINGS: Omit<SeriesKind, 'divisor'> = {
  one: 'reading',
  many: 'readings',
  section: 'household',
  valueKey: 'energyColumn',
  least: 0,
  most: HIGHEST_ENERGY,
  range: `from 0 to ${HIGHEST_ENERGY} kWh a step`,
};

/**
 * Electricity of the household by hour.
 *
 * Readings of a step are mean powers over its minutes, so that finer steps add up to hours, and hours that the steps of the
 * weather cut in two are shared by minutes; the year is taken as periodic.
 *
 * @param clock civil time of the year; without it the meter's file is checked all the same
 * @returns kWh a step, zero where no household is entered
 *
 * Reference: MODEL section 12.
 */
export function householdOf(
  yaml: YamlFile,
  { household, zone }: { readonly household: Scenario['household']; readonly zone: string | undefined },
  files: InputFiles,
  clock: CivilClock | undefined,
): { hours?: Float64Array; problems: Problem[] } {
  if (household === undefined) return clock === undefined ? { problems: [] } : { hours: none(clock), problems: [] };
  if (household.given === 'meter') return fromMeter(yaml, household, { zone, files, clock });
  if (clock === undefined) return { problems: [] };
  const hours = profileOfHousehold(household, clock);
  return hours === undefined ? { problems: [] } : { hours, problems: [] };
}

function none(clock: CivilClock): Float64Array {
  return new Float64Array(clock.hours);
}

function fromMeter(
  yaml: YamlFile,
  meter: Extract<HouseholdEntry, { given: 'meter' }>,
  { zone, files, clock }: { zone: string | undefined; files: InputFiles; clock: CivilClock | undefined },
): { hours?: Float64Array; problems: Problem[] } {
  const { file, unit, stamps, timeColumn, energyColumn, decimal } = meter;
  const kind = { ...READINGS, divisor: unit === 'Wh' ? 1000 : 1 };
  const settings = { stamps, timeColumn, valueColumn: energyColumn, decimal };
  const path = ['household', 'file'];
  const read = namedSeries(yaml, { file, role: 'meter', path, settings, kind, zone }, files);
  if (read.series === undefined || clock === undefined) return { problems: read.problems };
  const { stepMinutes, values } = read.series;
  const power = { ...read.series, values: values.map((kWh) => (kWh * 60) / stepMinutes) };
  const made = hourlyMeans(power, kind, clock);
  return { ...made, problems: [...read.problems, ...made.problems] };
}
