import type { Problem } from '../core/problem.ts';
import { crossChecks } from './checks/crossChecks.ts';
import type { EntryPath } from './entries/pathText.ts';
import { entryOf } from './entries/schemaField.ts';
import { fileName } from './fields.ts';
import type { InputFiles, InputRole } from './inputFiles.ts';
import type { TariffEntries } from './loadTariffs.ts';
import { readFiles } from './readFiles.ts';
import { type SoundParts, soundPartsOf } from './scenarioParts.ts';
import { MOST_TARIFFS, tariffEntrySchema } from './tariffListSchema.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/**
 * What else is wrong with a scenario that has faults against its schema: in its sound parts, and in the files that they
 * name. What rests on a part with a fault is not looked at, so that nothing is said that only follows from the fault.
 *
 * @param further tariff files to compare beside those of the scenario, as the user gives them
 * @returns the problems that the schema does not find
 */
export function furtherProblems(yaml: YamlFile, files: InputFiles, further: readonly string[]): Problem[] {
  const parts = soundPartsOf(yaml.raw);
  const file = parts['weather.file'];
  const isWeatherSound = file !== undefined && Object.hasOwn(parts, 'weather.read');
  const read = readFiles(
    yaml,
    {
      weather: isWeatherSound ? { file, read: parts['weather.read'] } : undefined,
      unit: parts['heatPump.unit'],
      site: { zone: parts['site.zone'], altitude: parts['site.altitude'], calendarYear: parts['site.calendarYear'] },
      tariffs: parts.tariffs ?? tariffEntries(yaml.raw),
      household: parts.household,
      carbon: parts.carbon,
    },
    files,
    further,
  );
  const beside = { weather: read.weather.read, listed: read.money.listed, laid: read.money.laid };
  return [...crossChecks(yaml, parts, beside), ...read.problems, ...filesNotFound(yaml, parts, files)];
}

/** The entries of a list of tariffs, undefined for one with faults. */
function tariffEntries(raw: unknown): TariffEntries {
  const written = entryOf(raw, 'tariffs');
  if (!Array.isArray(written)) return [];
  return written.slice(0, MOST_TARIFFS).map((entry) => tariffEntrySchema.safeParse(entry).data);
}

/** Files that sections with faults name, and that are not there: how to read them is not known. */
function filesNotFound(yaml: YamlFile, parts: SoundParts, files: InputFiles): Problem[] {
  return namesInFaulty(yaml.raw, parts).flatMap(({ path, role }) => {
    const name = fileName('').safeParse(valueAt(yaml.raw, path));
    return name.success ? files.readNamed(name.data, role, { yaml, path }).problems : [];
  });
}

function namesInFaulty(raw: unknown, parts: SoundParts): { path: EntryPath; role: InputRole }[] {
  const names: { path: EntryPath; role: InputRole }[] = [];
  if (!Object.hasOwn(parts, 'weather.read')) names.push({ path: ['weather', 'file'], role: 'weather' });
  if (!Object.hasOwn(parts, 'household') && valueAt(raw, ['household', 'given']) === 'meter') {
    names.push({ path: ['household', 'file'], role: 'meter' });
  }
  if (!Object.hasOwn(parts, 'carbon') && valueAt(raw, ['carbon', 'electricity', 'given']) === 'series') {
    names.push({ path: ['carbon', 'electricity', 'file'], role: 'carbonFactors' });
  }
  tariffEntries(raw).forEach((sound, i) => {
    const supplies = valueAt(raw, ['tariffs', i, 'supplies']);
    if (sound !== undefined || !Array.isArray(supplies)) return;
    supplies.slice(0, MOST_TARIFFS).forEach((_, s) => {
      names.push({ path: ['tariffs', i, 'supplies', s, 'file'], role: 'tariff' });
    });
  });
  return names;
}

function valueAt(raw: unknown, path: EntryPath): unknown {
  return path.reduce<unknown>(entryOf, raw);
}
