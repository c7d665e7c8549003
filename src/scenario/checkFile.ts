import { type Problem, shown } from '../core/problem.ts';
import { checkTable, type Looked } from './checkTable.ts';
import { listed } from './entries/allowedText.ts';
import type { DefaultUsed } from './entries/defaultsUsed.ts';
import { readEntries } from './entries/readEntries.ts';
import type { FileSource, InputBytes } from './fileSource.ts';
import { inFileOrder } from './inFileOrder.ts';
import { InputFiles } from './inputFiles.ts';
import { type LoadedScenario, scenarioOf } from './loadScenario.ts';
import { tariffOf } from './loadTariff.ts';
import { unitOf } from './loadUnit.ts';
import { planSchema } from './planSchema.ts';
import { readSchema } from './readSchema.ts';
import { type FileKind, recogniseKind, type StructuredKind } from './recogniseKind.ts';
import { textOf } from './yaml/textOf.ts';

/** What an input file was taken for, what was recognised in it, and everything wrong with it and the files that it names. */
export interface CheckedFile {
  /** Absent where the file is of no kind that is known. */
  readonly kind?: FileKind;
  /** What was recognised, in sentences. */
  readonly about: readonly string[];
  readonly problems: readonly Problem[];
}

/**
 * Looks through an input file of any kind, and through the files that it names. Never throws.
 *
 * @param name of the file, as the user gives it
 * @param source where files come from
 */
export function checkFile(name: string, source: FileSource): CheckedFile {
  const files = new InputFiles(source);
  // The kind is not known before the file is read; the record of it is of no use here.
  const { input, problems } = files.read(name, 'scenario');
  if (input === undefined) return { about: [], problems };
  const { text, problems: textProblems } = textOf(input);
  if (text === undefined) return { about: [], problems: textProblems };
  if (text.trim() === '') return { about: [], problems: [{ code: 'file.empty', severity: 'error', file: input.name }] };
  const recognised = recogniseKind(text);
  if (recognised.table !== undefined) {
    const { about, problems: found } = checkTable({ input, text, table: recognised.table });
    return { kind: recognised.kind, about, problems: inFileOrder(found) };
  }
  const { kind, keys } = recognised;
  if (kind === undefined) {
    const found = `its keys are ${listed(keys.slice(0, 8).map((key) => shown(key, 30)))}`;
    return { about: [], problems: [{ code: 'scenario.unknown-kind', severity: 'error', file: input.name, found }] };
  }
  const { about, problems: found } = look[kind]({ input, files });
  return { kind, about, problems: inFileOrder(found) };
}

const look: Record<StructuredKind, (file: { input: InputBytes; files: InputFiles }) => Looked> = {
  scenario: ({ input, files }) => {
    const { loaded, problems } = scenarioOf(input, files);
    return { about: loaded === undefined ? [] : aboutScenario(loaded), problems };
  },
  unit: ({ input, files }) => {
    const { loaded, defaults, problems } = unitOf(input, files);
    if (loaded === undefined) return { about: [], problems };
    const { outdoor, flow } = loaded.fullLoad;
    const name = `unit ${shown(loaded.unit.name)}`;
    return {
      about: [
        `${name}: full load at ${outdoor.length} outdoor and ${flow.length} flow temperatures`,
        ...aboutDefaults(defaults),
      ],
      problems,
    };
  },
  tariff: ({ input, files }) => {
    // Stamps in local time cannot be placed without a house; UTC shows their other faults.
    const { read, defaults, problems } = tariffOf(input, 'UTC', files);
    const about = read === undefined ? [] : [`tariff ${shown(read.tariff.name)}`, ...aboutDefaults(defaults)];
    return { about, problems };
  },
  read: ({ input }) => {
    const { entries, problems } = readEntries(input, readSchema);
    return { about: entries === undefined ? [] : ['settings for reading a weather file'], problems };
  },
  plan: ({ input, files }) => {
    const { yaml, entries, problems } = readEntries(input, planSchema);
    if (yaml === undefined || entries === undefined) return { about: [], problems };
    const { name, scenario, axes, homes } = entries.value;
    const base = files.readNamed(scenario, 'scenario', { yaml, path: ['scenario'] });
    const table = homes && files.readNamed(homes.file, 'homes', { yaml, path: ['homes', 'file'] });
    const varied = axes.map((axis) => shown(axis.name)).join(', ');
    const about = [`plan ${shown(name)}`, ...(varied === '' ? [] : [`varied: ${varied}`])];
    return { about, problems: [...problems, ...base.problems, ...(table?.problems ?? [])] };
  },
};

function aboutScenario(loaded: LoadedScenario): string[] {
  const { scenario, unit, tariffs, weather, defaults } = loaded;
  return [
    `scenario ${shown(scenario.name)}`,
    `unit ${shown(unit.unit.name)} in ${shown(unit.file)}`,
    ...tariffs.map(({ file, name }) => `tariff ${shown(name)} in ${shown(file)}`),
    ...weather.recognised.lines.map((line) => `${shown(weather.file)}: ${line}`),
    ...aboutDefaults(defaults),
  ];
}

function aboutDefaults(defaults: readonly DefaultUsed[]): string[] {
  return defaults.map(({ file, path, value, unit }) => {
    const quantity = unit === undefined ? String(value) : `${String(value)} ${unit}`;
    return `${shown(file)}: ${path} was left out; ${quantity} is assumed`;
  });
}
