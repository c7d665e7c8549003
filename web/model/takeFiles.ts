import type { BlankWords } from '../../src/report/language/english/blankFiles.ts';
import { entryOf } from '../../src/scenario/entries/schemaField.ts';
import { recogniseKind } from '../../src/scenario/recogniseKind.ts';
import { type FileBox, kindOf, startOf } from './fileBox.ts';
import { baseOf, LARGEST_FILE, type SheetFile } from './memorySource.ts';
import { addTariff, appendTariff, rawOf, tariffList } from './sheetActions.ts';

/** What came of files that were taken. */
interface Taken {
  readonly refused: readonly string[];
  readonly isNew: boolean;
}

/**
 * Takes files that were dropped or chosen. With a scenario among them the sheet begins anew; else each takes the place that
 * its content asks for: the weather, the unit, a further tariff, the prices of one. A file that something names already and
 * that was not there takes that place.
 *
 * @param words of what is added
 * @returns names of files that are too large to be taken, and whether the sheet began anew
 */
export function takeFiles(box: FileBox, files: readonly SheetFile[], words: BlankWords): Taken {
  const sound = files.filter(({ bytes }) => bytes.length <= LARGEST_FILE);
  const refused = files.filter((file) => !sound.includes(file)).map(({ name }) => name);
  if (sound.some((file) => kindOf(file) === 'scenario')) {
    box.replace(withoutCommonFolder(sound));
    return { refused, isNew: true };
  }
  for (const file of sound) {
    const isAwaited = missingFiles(box).has(baseOf(file.name));
    const placed = { ...file, name: box.has(file.name) ? file.name : baseOf(file.name) };
    box.put(placed);
    if (!isAwaited) giveItsPlace(box, placed, words);
  }
  return { refused, isNew: false };
}

function giveItsPlace(box: FileBox, file: SheetFile, words: BlankWords): void {
  const kind = kindOf(file);
  const name = box.nameFromScenario(file.name);
  if (kind === 'weather') box.write(box.scenario, ['weather', 'file'], name);
  else if (kind === 'unit') box.write(box.scenario, ['heatPump', 'unit'], name);
  else if (kind === 'tariff' && !tariffList(box).includes(name)) appendTariff(box, file.name);
  else if (kind === 'priceSeries') placePrices(box, file, words);
}

/** Prices take the place of those that a tariff misses, else they make a tariff of their own, whose unit is asked for. */
function placePrices(box: FileBox, file: SheetFile, words: BlankWords): void {
  const names = tariffList(box).filter((name) => typeof name === 'string');
  const seriesOf = (tariff: string) => entryOf(entryOf(rawOf(box, tariff), 'series'), 'file');
  const tariffs = names.map((name) => box.pathOf(name));
  const lacking = tariffs.find((tariff) => {
    const series = seriesOf(tariff);
    return typeof series === 'string' && box.source.find(series, tariff).file === undefined;
  });
  if (lacking !== undefined) {
    box.write(lacking, ['series', 'file'], file.name);
    return;
  }
  if (tariffs.some((tariff) => baseOf(String(seriesOf(tariff))) === file.name)) return;
  const added = addTariff(box, words);
  const { timeColumn, valueColumn } = recogniseKind(startOf(file)).table ?? {};
  box.write(added, ['rates'], undefined);
  box.write(added, ['series'], { file: baseOf(file.name), timeColumn, priceColumn: valueColumn });
}

/** Names of files that the scenario, its unit or a tariff names and that are not there, without their folders. */
function missingFiles(box: FileBox): ReadonlySet<string> {
  const scenario = rawOf(box, box.scenario);
  const unit = entryOf(entryOf(scenario, 'heatPump'), 'unit');
  const beside = [unit, ...tariffList(box)].filter((name) => typeof name === 'string');
  const owners = [box.scenario, ...beside.map((name) => box.pathOf(name)).filter((name) => box.has(name))];
  const missing = (name: string, owner: string) => box.source.find(name, owner).file === undefined;
  return new Set([
    ...beside.filter((name) => missing(name, box.scenario)).map(baseOf),
    ...owners.flatMap((owner) =>
      filesNamedIn(rawOf(box, owner))
        .filter((name) => missing(name, owner))
        .map(baseOf),
    ),
  ]);
}

/** What stands under any key `file`. */
function filesNamedIn(raw: unknown): string[] {
  if (typeof raw !== 'object' || raw === null) return [];
  return Object.entries(raw).flatMap(([key, value]) =>
    key === 'file' && typeof value === 'string' ? [value] : filesNamedIn(value),
  );
}

/** The files of one opened folder by their paths within it. */
function withoutCommonFolder(files: readonly SheetFile[]): SheetFile[] {
  const [first = ''] = files.map(({ name }) => name);
  const folder = first.slice(0, first.indexOf('/') + 1);
  const inside = folder !== '' && files.every(({ name }) => name.startsWith(folder));
  return inside
    ? withoutCommonFolder(files.map((file) => ({ ...file, name: file.name.slice(folder.length) })))
    : [...files];
}
