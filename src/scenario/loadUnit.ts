import { hasErrors, type Problem } from '../core/problem.ts';
import type { PerformanceTable } from '../sim/performanceTable.ts';
import { checkUnit } from './checks/checkUnit.ts';
import type { DefaultUsed } from './entries/defaultsUsed.ts';
import { readEntries } from './entries/readEntries.ts';
import type { FileSource, InputBytes } from './fileSource.ts';
import { inFileOrder } from './inFileOrder.ts';
import { InputFiles } from './inputFiles.ts';
import type { Level } from './map/performance.ts';
import { integratedLooking, mistypedPoints } from './map/plausibility.ts';
import { readLevel } from './map/readLevel.ts';
import { sharePointsAboveCarnot, tablePointsAboveFull } from './map/twoLevels.ts';
import { type Unit, unitSchema } from './unitSchema.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/** A heat-pump unit as its file gives it, its tables read. */
export interface LoadedUnit {
  readonly file: string;
  readonly unit: Unit;
  readonly fullLoad: PerformanceTable;
  /** The lowest continuous level, where the file gives it by a table. */
  readonly lowestLevel?: PerformanceTable;
}

/** A unit, unless a problem is an error; the defaults used in it. */
export interface UnitResult {
  readonly loaded?: LoadedUnit;
  readonly defaults: DefaultUsed[];
  readonly problems: Problem[];
}

/**
 * Loads a heat-pump unit on its own.
 *
 * @param name of the file, as the user gives it
 * @param source where files come from
 */
export function loadUnit(name: string, source: FileSource): UnitResult {
  const files = new InputFiles(source);
  const read = files.read(name, 'unit');
  if (read.input === undefined) return { defaults: [], problems: read.problems };
  const result = unitOf(read.input, files);
  return { ...result, problems: inFileOrder(result.problems) };
}

/** Loads a unit from its bytes; tables in files of their own come through `files`. */
export function unitOf(input: InputBytes, files: InputFiles): UnitResult {
  const { yaml, entries, problems } = readEntries(input, unitSchema);
  if (yaml === undefined || entries === undefined) return { defaults: [], problems };
  const unit = entries.value;
  const { fullLoad, lowestLevel } = unit.map;
  const full = readLevel(yaml, ['map', 'fullLoad'], fullLoad, files);
  const lowest =
    lowestLevel.given === 'table' ? readLevel(yaml, ['map', 'lowestLevel'], lowestLevel, files) : undefined;
  const found = [
    ...problems,
    ...checkUnit(yaml, unit),
    ...full.problems,
    ...(lowest?.problems ?? []),
    ...levelFindings(yaml, unit, full.level, lowest?.level),
  ];
  if (hasErrors(found) || full.level === undefined) return { defaults: entries.defaults, problems: found };
  const loaded: LoadedUnit = {
    file: input.name,
    unit,
    fullLoad: full.level.table,
    ...(lowest?.level ? { lowestLevel: lowest.level.table } : {}),
  };
  return { loaded, defaults: entries.defaults, problems: found };
}

/** What is odd or impossible in levels whose tables are sound each on its own. */
function levelFindings(yaml: YamlFile, unit: Unit, full: Level | undefined, lowest: Level | undefined): Problem[] {
  const { lowestLevel } = unit.map;
  const levels = [full, lowest].filter((level) => level !== undefined);
  const problems = levels.flatMap((level) => mistypedPoints(level));
  if (unit.defrost.method === 'humidity') problems.push(...levels.flatMap((level) => integratedLooking(level)));
  if (full === undefined) return problems;
  if (lowestLevel.given === 'share') problems.push(...sharePointsAboveCarnot(yaml, full.table, lowestLevel.cop));
  if (lowest !== undefined) problems.push(...tablePointsAboveFull(full.table, lowest));
  return problems;
}
