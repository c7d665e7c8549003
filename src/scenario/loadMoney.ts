import type { Problem } from '../core/problem.ts';
import type { CivilClock } from '../tariffs/civilClock.ts';
import type { DefaultUsed } from './entries/defaultsUsed.ts';
import type { InputFiles } from './inputFiles.ts';
import { type Kept, KeptKind } from './kept.ts';
import { carbonFactorsOf, type ElectricityCarbon } from './loadCarbon.ts';
import { householdOf } from './loadHousehold.ts';
import { type ListedTariff, type LoadedTariff, layTariff, readTariffs, type TariffEntries } from './loadTariffs.ts';
import type { Scenario } from './scenarioSchema.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/** What of a scenario its bills are made of; a section with faults is left out. */
export interface MoneyEntries {
  readonly tariffs: TariffEntries;
  /** Absent where it is not known. */
  readonly zone: string | undefined;
  readonly household: Scenario['household'];
  readonly carbon: Scenario['carbon'];
}

/** What a scenario's bills are made of, laid on its year. */
export interface LoadedMoney {
  /** In the scenario's order, then those named beside it, the first the present one; undefined for one that could not be read. */
  readonly listed: readonly (ListedTariff | undefined)[];
  /** The same, laid on the year; undefined for one with errors. */
  readonly laid: readonly (LoadedTariff | undefined)[];
  /** Electricity of the household without the heating, kWh a step; absent where it has errors. */
  readonly household?: Float64Array;
  /** Absent where no carbon factor of electricity is entered. */
  readonly carbon?: ElectricityCarbon;
  readonly defaults: readonly DefaultUsed[];
  readonly problems: readonly Problem[];
}

/** What the scenarios of a batch have in common of their money: all of it, households, carbon factors. */
const monies = new KeptKind<LoadedMoney>(64);
const households = new KeptKind<ReturnType<typeof householdOf>>(64);
const carbons = new KeptKind<ReturnType<typeof carbonFactorsOf>>(64);

/**
 * Reads tariffs, household and carbon factors of a scenario, and lays them on its year.
 *
 * @param laidOn the year it is laid on
 */
export function moneyOf(yaml: YamlFile, entries: MoneyEntries, files: InputFiles, laidOn: LaidOn): LoadedMoney {
  const { kept } = files;
  const make = () => moneyAnew(yaml, entries, files, laidOn);
  // what is wrong stands in this scenario, which is another one next time
  return monies.of(kept, kept === undefined ? '' : moneyKey(kept, entries, laidOn), make, isSound);
}

/** Where the money of a scenario is laid. */
interface LaidOn {
  /** Civil time of the year; without it the files are checked all the same. */
  readonly clock: CivilClock | undefined;
  /** Tariff files to compare beside those of the scenario, as the user gives them. */
  readonly further: readonly string[];
}

/** A section that a batch leaves as it was is the same object as before, and so is what follows from the same sections. */
function moneyKey(kept: Kept, entries: MoneyEntries, { clock, further }: LaidOn): string {
  const { tariffs, household, carbon, zone } = entries;
  const sections = [clock, tariffs, household, carbon];
  return kept.key(
    sections.map((section) => section ?? LEFT_OUT),
    zone ?? null,
    further,
  );
}

const LEFT_OUT = {};

function isSound({ problems }: { readonly problems: readonly Problem[] }): boolean {
  return problems.length === 0;
}

function moneyAnew(yaml: YamlFile, entries: MoneyEntries, files: InputFiles, { clock, further }: LaidOn): LoadedMoney {
  const read = readTariffs(yaml, { entries: entries.tariffs, zone: entries.zone }, files, further);
  const laid = read.listed.map((listed) =>
    listed === undefined || clock === undefined ? { problems: [] } : layTariff(yaml, listed, clock, files.kept),
  );
  const keyOf = (section: 'household' | 'carbon') =>
    files.kept?.key(
      clock === undefined ? [] : [clock],
      entries[section],
      entries.zone ?? null,
      yaml.owner([section]),
    ) ?? '';
  const household = households.of(
    files.kept,
    keyOf('household'),
    () => householdOf(yaml, entries, files, clock),
    isSound,
  );
  const carbon = carbons.of(files.kept, keyOf('carbon'), () => carbonFactorsOf(yaml, entries, files, clock), isSound);
  return {
    listed: read.listed,
    laid: laid.map((each) => ('tariff' in each ? each.tariff : undefined)),
    ...(household.hours === undefined ? {} : { household: household.hours }),
    ...(carbon.carbon === undefined ? {} : { carbon: carbon.carbon }),
    defaults: read.defaults,
    problems: [
      ...read.problems,
      ...laid.flatMap(({ problems }) => problems),
      ...household.problems,
      ...carbon.problems,
    ],
  };
}
