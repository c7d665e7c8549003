import { stringify } from 'yaml';
import { entryOf } from '../../src/scenario/entries/schemaField.ts';
import { splitTable } from '../../src/scenario/map/splitTable.ts';
import { cellValue } from '../../src/scenario/map/tableNumbers.ts';

/** Tables that grow with the unit; COP stays. */
const OF_SIZE = ['capacity', 'inputPower'] as const;
const ALL = [...OF_SIZE, 'cop'] as const;

/**
 * A unit file of the same make in another size: capacity and input power of every point are multiplied, COP, limits and the
 * small powers stay. What its label states is left out, as it was said of another unit.
 *
 * @param raw values of the unit file
 * @param factor on the size, above 0
 * @param tableText text of a table in a file of its own
 * @returns the text of the unit file, all tables in it; nothing where there is no map in it
 */
export function unitOfSize(
  raw: unknown,
  factor: number,
  tableText: (file: string) => string | undefined,
): string | undefined {
  const map = entryOf(raw, 'map');
  if (typeof raw !== 'object' || raw === null || typeof map !== 'object' || map === null) return undefined;
  const levels = (['fullLoad', 'lowestLevel'] as const).flatMap((level): [string, unknown][] => {
    const entry = entryOf(map, level);
    if (typeof entry !== 'object' || entry === null || entryOf(entry, 'given') === 'share') return [];
    const tables = ALL.flatMap((quantity): [string, string][] => {
      const text = textOf(entryOf(entry, quantity), tableText);
      if (text === undefined) return [];
      return [[quantity, quantity === 'cop' ? text : timesFactor(text, factor)]];
    });
    return [[level, { ...entry, ...Object.fromEntries(tables) }]];
  });
  return stringify({ ...raw, label: undefined, map: { ...map, ...Object.fromEntries(levels) } });
}

function textOf(entry: unknown, tableText: (file: string) => string | undefined): string | undefined {
  const file = entryOf(entry, 'file');
  return typeof file === 'string' ? tableText(file) : typeof entry === 'string' ? entry : undefined;
}

/** A table whose values are multiplied; what is no number stays as it is. */
function timesFactor(text: string, factor: number): string {
  const { flows, rows } = splitTable(text);
  const times = (cell: string) => {
    const value = cellValue(cell);
    return typeof value === 'number' ? String(value * factor) : cell;
  };
  return [
    ['outdoor', ...flows.map((cell) => cell.text)],
    ...rows.map(({ label, cells }) => [label.text, ...cells.map((cell) => times(cell.text))]),
  ]
    .map((cells) => `${cells.join('\t')}\n`)
    .join('');
}
