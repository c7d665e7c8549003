import { hasErrors, type Problem } from '../core/problem.ts';
import type { CivilClock } from '../tariffs/civilClock.ts';
import { composeYear } from '../tariffs/composeYear.ts';
import type { PreparedTariff } from '../tariffs/preparedTariff.ts';
import type { Tariff } from '../tariffs/tariff.ts';
import type { DefaultUsed } from './entries/defaultsUsed.ts';
import { type EntryPath, pathOfText, pathText } from './entries/pathText.ts';
import type { InputFiles } from './inputFiles.ts';
import { type Kept, KeptKind } from './kept.ts';
import { located, prepared, type ReadTariff, type TariffResult, tariffOf } from './loadTariff.ts';
import type { Scenario } from './scenarioSchema.ts';
import { type TaxStatement, taxStatementOf } from './taxStatement.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/** A tariff file and the date on which it begins. */
interface ReadSupply {
  readonly read: ReadTariff;
  readonly from?: string | undefined;
}

/** One tariff to compare, its files read: a single supply, or several with a change of supplier. */
export interface ListedTariff {
  /** Place of its entry in the scenario; absent for one that was named beside it. */
  readonly path?: EntryPath;
  readonly name?: string | undefined;
  readonly supplies: readonly ReadSupply[];
}

/** A tariff laid on the year. */
export interface LoadedTariff {
  readonly name: string;
  /** Its file; of a change of supplier all of them. */
  readonly file: string;
  readonly currency: string | undefined;
  readonly pricesStated: Tariff['pricesStated'] | 'mixed';
  readonly taxes: TaxStatement;
  readonly prepared: PreparedTariff;
}

/** Entries of a scenario's list of tariffs, undefined for one with faults. */
export type TariffEntries = readonly (Scenario['tariffs'][number] | undefined)[];

/** Tariffs whose files could be read, in their order, and what was found on the way. */
export interface ListedTariffs {
  /** Undefined for one with errors, so that places in the scenario's list stay what they are. */
  readonly listed: readonly (ListedTariff | undefined)[];
  readonly defaults: DefaultUsed[];
  readonly problems: Problem[];
}

/**
 * Reads the tariffs of a scenario, and those named beside it.
 *
 * @param entries of the scenario's list, undefined for one with faults; and the zone of the house, where it is known
 * @param further names of tariff files that the user gave; one with the content of an earlier tariff is left out
 */
export function readTariffs(
  yaml: YamlFile,
  { entries, zone }: { readonly entries: TariffEntries; readonly zone: string | undefined },
  files: InputFiles,
  further: readonly string[],
): ListedTariffs {
  const results: (TariffResult & { listed: ListedTariff | undefined })[] = entries.map((entry, i) => {
    if (entry === undefined) return { listed: undefined, defaults: [], problems: [] };
    const path = ['tariffs', i];
    if (typeof entry === 'string') return alone(namedTariff(yaml, path, entry, { zone, files }), path);
    const reads = entry.supplies.map(({ file }, s) =>
      namedTariff(yaml, [...path, 'supplies', s, 'file'], file, { zone, files }),
    );
    const supplies = reads.flatMap(({ read }, s) => (read ? [{ read, from: entry.supplies[s].from }] : []));
    return {
      listed: supplies.length < reads.length ? undefined : { path, name: entry.name, supplies },
      defaults: reads.flatMap(({ defaults }) => defaults),
      problems: reads.flatMap(({ problems }) => problems),
    };
  });
  const known = new Set(results.flatMap(({ listed }) => (listed?.supplies.length === 1 ? fingerprintsOf(listed) : [])));
  for (const name of further) {
    const { input, problems } = files.read(name, 'tariff');
    const result = input === undefined ? { defaults: [], problems } : tariffOf(input, zone, files);
    if (result.read !== undefined && known.has(result.read.fingerprint)) continue;
    if (result.read !== undefined) known.add(result.read.fingerprint);
    results.push(alone(result));
  }
  return {
    listed: results.map(({ listed }) => listed),
    defaults: results.flatMap(({ defaults }) => defaults),
    problems: results.flatMap(({ problems }) => problems),
  };
}

function fingerprintsOf({ supplies }: ListedTariff): string[] {
  return supplies.map(({ read }) => read.fingerprint);
}

function alone(result: TariffResult, path?: EntryPath) {
  const { read, defaults, problems } = result;
  const place = path === undefined ? {} : { path };
  return { listed: read === undefined ? undefined : { ...place, supplies: [{ read }] }, defaults, problems };
}

function namedTariff(
  yaml: YamlFile,
  path: EntryPath,
  name: string,
  { zone, files }: { zone: string | undefined; files: InputFiles },
): TariffResult {
  const named = files.readNamed(name, 'tariff', { yaml, path });
  if (named.input === undefined) return { defaults: [], problems: named.problems };
  const { input } = named;
  return tariffFiles.of(files.kept, JSON.stringify([input.name, zone]), () => tariffOf(input, zone, files));
}

/** Tariffs of a batch: read, and laid on a year. */
const tariffFiles = new KeptKind<TariffResult>(128);
const laidTariffs = new KeptKind<LaidTariff>(128);

type LaidTariff = { tariff?: LoadedTariff; problems: Problem[] };

/**
 * Lays a listed tariff on a year.
 *
 * @returns the tariff unless a problem is an error; problems with their place in the scenario or in a tariff file
 */
export function layTariff(yaml: YamlFile, listed: ListedTariff, clock: CivilClock, kept?: Kept): LaidTariff {
  const { name, path, supplies } = listed;
  const from = supplies.map((supply) => supply.from ?? null);
  const key = kept?.key([clock, ...supplies.map(({ read }) => read)], name, path, from) ?? '';
  // what is wrong with a change of supplier stands in the scenario, which is another one next time
  const lasts = ({ problems }: LaidTariff) => supplies.length === 1 || problems.length === 0;
  return laidTariffs.of(kept, key, () => layAnew(yaml, listed, clock), lasts);
}

function layAnew(yaml: YamlFile, listed: ListedTariff, clock: CivilClock): LaidTariff {
  const { supplies } = listed;
  const made = supplies.length === 1 ? prepared(supplies[0].read, clock) : composed(yaml, listed, clock);
  if (made.prepared === undefined || hasErrors(made.problems)) return { problems: made.problems };
  const tariffs = supplies.map(({ read }) => read.tariff);
  const stated = new Set(tariffs.map(({ pricesStated }) => pricesStated));
  const name = listed.name ?? made.prepared.name;
  const tariff: LoadedTariff = {
    name,
    file: supplies.map(({ read }) => read.yaml.file).join(', then '),
    currency: made.prepared.currency,
    pricesStated: stated.size > 1 ? 'mixed' : tariffs[0].pricesStated,
    taxes: taxStatementOf(tariffs),
    prepared: { ...made.prepared, name },
  };
  return { tariff, problems: made.problems };
}

function composed(yaml: YamlFile, { path = [], supplies }: ListedTariff, clock: CivilClock) {
  const made = composeYear(
    supplies.map(({ read, from }) => ({ tariff: read.tariff, file: read.yaml.file, series: read.series, from })),
    clock,
  );
  const problems = made.problems.map((problem) => {
    if (problem.file === '') {
      const at = [...path, ...pathOfText(problem.path ?? '')];
      return { ...problem, file: yaml.owner(at), ...yaml.place(at), path: pathText(at) };
    }
    const owner = supplies.find(({ read }) => read.yaml.file === problem.file);
    return owner === undefined ? problem : located(owner.read.yaml, problem);
  });
  return { ...made, problems };
}

/** Names of the rates of a tariff, each once; of a change of supplier those of all. */
export function rateNamesOf({ supplies }: ListedTariff): string[] {
  return [...new Set(supplies.flatMap(({ read }) => (read.tariff.rates ?? []).map(({ name }) => name)))];
}
