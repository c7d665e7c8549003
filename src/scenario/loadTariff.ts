import { hasErrors, type Problem } from '../core/problem.ts';
import type { CivilClock } from '../tariffs/civilClock.ts';
import type { PreparedTariff } from '../tariffs/preparedTariff.ts';
import { prepareTariff } from '../tariffs/prepareTariff.ts';
import { readPriceSeries } from '../tariffs/readPriceSeries.ts';
import type { PriceSeries, Tariff } from '../tariffs/tariff.ts';
import type { DefaultUsed } from './entries/defaultsUsed.ts';
import { pathOfText } from './entries/pathText.ts';
import { readEntries } from './entries/readEntries.ts';
import type { InputBytes } from './fileSource.ts';
import type { InputFiles } from './inputFiles.ts';
import { tariffSchema } from './tariffSchema.ts';
import { textOf } from './yaml/textOf.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/** A tariff file read, with its price series where it names one. */
export interface ReadTariff {
  readonly yaml: YamlFile;
  readonly tariff: Tariff;
  readonly series?: PriceSeries;
  /** SHA-256 of its bytes and of its series': two tariffs of one fingerprint are the same. */
  readonly fingerprint: string;
}

/** A tariff unless a problem is an error, and the defaults used in it. */
export interface TariffResult {
  readonly read?: ReadTariff;
  readonly defaults: DefaultUsed[];
  readonly problems: Problem[];
}

/**
 * Reads a tariff from its bytes, and the price series that it names.
 *
 * @param input the tariff file
 * @param zone IANA zone for price series in local time; without it such a series is looked for, not read
 * @param files for the price series
 */
export function tariffOf(input: InputBytes, zone: string | undefined, files: InputFiles): TariffResult {
  const { yaml, entries, problems } = readEntries(input, tariffSchema);
  if (yaml === undefined || entries === undefined) return { defaults: [], problems };
  const tariff: Tariff = entries.value;
  const { defaults } = entries;
  if (tariff.series === undefined) return { read: { yaml, tariff, fingerprint: input.sha256 }, defaults, problems };
  const named = files.readNamed(tariff.series.file, 'priceSeries', { yaml, path: ['series', 'file'] });
  if (named.input === undefined) return { defaults, problems: [...problems, ...named.problems] };
  if (zone === undefined && tariff.series.stamps === 'local') return { defaults, problems };
  const { text, problems: textProblems } = textOf(named.input);
  if (text === undefined) return { defaults, problems: [...problems, ...textProblems] };
  const made = readPriceSeries({ text, file: named.input.name, settings: tariff.series, zone: zone ?? 'UTC' });
  const found = [...problems, ...made.problems];
  if (made.series === undefined || hasErrors(found)) return { defaults, problems: found };
  const fingerprint = `${input.sha256} ${named.input.sha256}`;
  return { read: { yaml, tariff, series: made.series, fingerprint }, defaults, problems: found };
}

/** Lays a tariff on a year; problems get the places of its file. */
export function prepared(read: ReadTariff, clock: CivilClock): { prepared?: PreparedTariff; problems: Problem[] } {
  const { yaml, tariff, series } = read;
  const made = prepareTariff({ tariff, file: yaml.file, series }, clock);
  return { ...made, problems: made.problems.map((problem) => located(yaml, problem)) };
}

/** A problem of a structured file with the line and column of its path, where it has none. */
export function located(yaml: YamlFile, problem: Problem): Problem {
  if (problem.file !== yaml.file || problem.line !== undefined || problem.path === undefined) return problem;
  return { ...problem, ...yaml.place(pathOfText(problem.path)) };
}
