import type { Problem } from '../core/problem.ts';
import type { CivilClock } from '../tariffs/civilClock.ts';
import { checkMoney } from './checks/checkMoney.ts';
import { checkPrices } from './checks/checkPrices.ts';
import type { DefaultUsed } from './entries/defaultsUsed.ts';
import type { InputFiles } from './inputFiles.ts';
import { KeptKind } from './kept.ts';
import { carbonFactorsOf, type ElectricityCarbon } from './loadCarbon.ts';
import { householdOf } from './loadHousehold.ts';
import { type LoadedTariff, layTariff, rateNamesOf, readTariffs } from './loadTariffs.ts';
import type { Scenario } from './scenarioSchema.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/** What a scenario's bills are made of, laid on its year. */
export interface LoadedMoney {
  /** In the scenario's order, then those named beside it; the first is the present one. */
  readonly tariffs: readonly LoadedTariff[];
  /** Electricity of the household without the heating, kWh a step; absent where it has errors. */
  readonly household?: Float64Array;
  /** Absent where no carbon factor of electricity is entered. */
  readonly carbon?: ElectricityCarbon;
  /** Names of the rates of the first tariff; absent where there is none, or it has errors. */
  readonly presentRates?: readonly string[];
  readonly defaults: readonly DefaultUsed[];
  readonly problems: readonly Problem[];
}

/** Households and carbon factors of a batch. */
const households = new KeptKind<ReturnType<typeof householdOf>>(64);
const carbons = new KeptKind<ReturnType<typeof carbonFactorsOf>>(64);

/**
 * Reads tariffs, household and carbon factors of a scenario, lays them on its year, and checks what must go together.
 *
 * @param clock civil time of the year; without it the files are checked all the same
 * @param further tariff files to compare beside those of the scenario, as the user gives them
 */
export function moneyOf(
  yaml: YamlFile,
  scenario: Scenario,
  files: InputFiles,
  { clock, further }: { readonly clock: CivilClock | undefined; readonly further: readonly string[] },
): LoadedMoney {
  const read = readTariffs(yaml, scenario, files, further);
  const laid = read.listed.map((listed) =>
    listed === undefined || clock === undefined ? { problems: [] } : layTariff(yaml, listed, clock, files.kept),
  );
  const tariffs = laid.map((each) => ('tariff' in each ? each.tariff : undefined));
  const soundOnly = ({ problems }: { problems: Problem[] }) => problems.length === 0;
  const keyOf = (section: 'household' | 'carbon') =>
    files.kept?.key(clock === undefined ? [] : [clock], scenario[section], scenario.site.zone, yaml.owner([section])) ??
    '';
  const household = households.of(
    files.kept,
    keyOf('household'),
    () => householdOf(yaml, scenario, files, clock),
    soundOnly,
  );
  const carbon = carbons.of(
    files.kept,
    keyOf('carbon'),
    () => carbonFactorsOf(yaml, scenario, files, clock),
    soundOnly,
  );
  const [present] = read.listed;
  return {
    tariffs: tariffs.filter((tariff) => tariff !== undefined),
    ...(household.hours === undefined ? {} : { household: household.hours }),
    ...(carbon.carbon === undefined ? {} : { carbon: carbon.carbon }),
    ...(present === undefined ? {} : { presentRates: rateNamesOf(present) }),
    defaults: read.defaults,
    problems: [
      ...checkPrices(yaml, scenario, read.listed, tariffs),
      ...checkMoney(yaml, scenario, tariffs[0]?.prepared),
      ...read.problems,
      ...laid.flatMap(({ problems }) => problems),
      ...household.problems,
      ...carbon.problems,
    ],
  };
}
