import type { Problem } from '../../core/problem.ts';
import type { EntryPath } from '../entries/pathText.ts';
import { pathText } from '../entries/pathText.ts';
import type { InputFiles } from '../inputFiles.ts';
import { textOf } from '../yaml/textOf.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';
import { joinLevel, type Level } from './performance.ts';
import { type Grid, readGrid, type TableText } from './readGrid.ts';
import { capacityQuantity, copQuantity, inputPowerQuantity, type Quantity } from './tableQuantities.ts';

/** Largest table that is read, bytes; makers' tables have some hundred. */
const LARGEST_TABLE = 100_000;

/** A table as a unit file gives it: a text block, or a CSV file. */
type TableEntry = string | { readonly file: string };

/** The tables of one level as a unit file gives them. */
export interface LevelEntry {
  readonly capacity: TableEntry;
  readonly cop?: TableEntry | undefined;
  readonly inputPower?: TableEntry | undefined;
}

/**
 * Reads the tables of one level of a unit.
 *
 * @param yaml the unit file
 * @param path where the level stands in it
 * @param level what stands there, sound by the schema
 * @param files for tables in files of their own
 * @returns the level where its tables are sound and belong together, and what is wrong or odd
 */
export function readLevel(
  yaml: YamlFile,
  path: EntryPath,
  level: LevelEntry,
  files: InputFiles,
): { level?: Level; problems: Problem[] } {
  const problems: Problem[] = [];
  const table = (quantity: Quantity): Grid | undefined => {
    const entry = level[quantity.name];
    if (entry === undefined) return undefined;
    const read = readTable({ yaml, path: [...path, quantity.name], entry, files }, quantity);
    problems.push(...read.problems);
    return read.grid;
  };
  const capacity = table(capacityQuantity);
  const cop = table(copQuantity);
  const inputPower = table(inputPowerQuantity);
  if ((level.cop === undefined) === (level.inputPower === undefined)) {
    const found = level.cop === undefined ? 'neither cop nor inputPower' : 'both cop and inputPower';
    problems.push(yaml.keyProblem(path, { code: 'map.which-second', found }));
    return { problems };
  }
  const second = cop ?? inputPower;
  if (capacity === undefined || second === undefined) return { problems };
  const joined = joinLevel({ capacity, second, given: cop === undefined ? 'inputPower' : 'cop' });
  return { ...joined, problems: [...problems, ...joined.problems] };
}

interface TablePlace {
  readonly yaml: YamlFile;
  readonly path: EntryPath;
  readonly entry: TableEntry;
  readonly files: InputFiles;
}

function readTable(at: TablePlace, quantity: Quantity): { grid?: Grid; problems: Problem[] } {
  const { yaml, path, entry, files } = at;
  if (typeof entry === 'string') {
    if (!entry.trim().includes('\n')) return { problems: [yaml.problem(path, { code: 'map.not-a-block' })] };
    return readGrid({ file: yaml.file, path: pathText(path), text: entry, place: yaml.textPlaces(path) }, quantity);
  }
  const read = files.readNamed(entry.file, 'table', { yaml, path: [...path, 'file'] });
  if (read.input === undefined) return { problems: read.problems };
  const { name, bytes } = read.input;
  if (bytes.length > LARGEST_TABLE) {
    const found = `${(bytes.length / 1000).toFixed(0)} kB`;
    const hint = 'name a file that holds the one table alone';
    return { problems: [{ code: 'file.too-large', severity: 'error', file: name, found, allowed: '100 kB', hint }] };
  }
  const { text, problems } = textOf(read.input);
  if (text === undefined) return { problems };
  const source: TableText = {
    file: name,
    path: pathText(path),
    text,
    place: (line, column) => ({ line, column }),
  };
  return readGrid(source, quantity);
}
