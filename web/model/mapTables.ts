import type { Problem } from '../../src/core/problem.ts';
import { problemCure, problemSentence } from '../../src/core/problemText.ts';
import type { EntryPath } from '../../src/scenario/entries/pathText.ts';
import { entryOf } from '../../src/scenario/entries/schemaField.ts';
import { splitTable, type TableCell } from '../../src/scenario/map/splitTable.ts';
import type { YamlFile } from '../../src/scenario/yaml/yamlFile.ts';

/** A table of a unit as a grid: the first row holds flow temperatures, the first column outdoor temperatures. */
export interface MapGrid {
  readonly file: string;
  readonly path: EntryPath;
  readonly level: 'fullLoad' | 'lowestLevel';
  readonly quantity: 'capacity' | 'cop' | 'inputPower';
  readonly cells: readonly (readonly MapCell[])[];
}

export interface MapCell {
  readonly text: string;
  /** What is odd or wrong with it. */
  readonly told: readonly string[];
}

const QUANTITIES = ['capacity', 'cop', 'inputPower'] as const;

/**
 * The tables of a unit file as grids; tables in files of their own, and entries that are no text, are left out.
 *
 * @param yaml the unit file
 * @param problems of it, whose places mark the cells
 */
export function mapGrids(yaml: YamlFile, problems: readonly Problem[]): MapGrid[] {
  return (['fullLoad', 'lowestLevel'] as const).flatMap((level) =>
    QUANTITIES.flatMap((quantity): MapGrid[] => {
      const path = ['map', level, quantity];
      const text = path.reduce<unknown>((value, key) => entryOf(value, key), yaml.raw);
      if (typeof text !== 'string') return [];
      return [{ file: yaml.file, path, level, quantity, cells: cellsOf(text, { yaml, path, problems }) }];
    }),
  );
}

interface Placed {
  readonly yaml: YamlFile;
  readonly path: EntryPath;
  readonly problems: readonly Problem[];
}

function cellsOf(text: string, { yaml, path, problems }: Placed): MapCell[][] {
  const { flows, rows } = splitTable(text);
  const placeOf = yaml.textPlaces(path);
  const literal = yaml.isLiteralBlock(path);
  const cellOf = (cell: TableCell): MapCell => {
    const { line, column } = placeOf(cell.line, cell.column);
    const told = problems.filter((p) => literal && p.file === yaml.file && p.line === line && p.column === column);
    return { text: cell.text, told: told.map((p) => `${problemSentence(p)}: ${problemCure(p)}`) };
  };
  return [
    [{ text: 'outdoor', told: [] }, ...flows.map(cellOf)],
    ...rows.map(({ label, cells }) => [cellOf(label), ...cells.map(cellOf)]),
  ];
}

/**
 * A grid as the text of a table, its columns set below each other.
 *
 * @param cells as typed or pasted; a decimal comma becomes a point, the corner a word
 * @example tableText([['', '35'], ['-7', '6,5']]) // 'outdoor,  35\n     -7, 6.5\n'
 */
export function tableText(cells: readonly (readonly string[])[]): string {
  const columns = Math.max(0, ...cells.map((row) => row.length));
  const plain = cells.map((row, r) =>
    Array.from({ length: columns }, (_, c) => (r === 0 && c === 0 ? 'outdoor' : plainNumber(row[c] ?? ''))),
  );
  const widths = Array.from({ length: columns }, (_, c) => Math.max(0, ...plain.map((row) => row[c].length)));
  const lines = plain.map((row) => row.map((cell, c) => cell.padStart(widths[c])).join(', '));
  return `${lines.join('\n')}\n`;
}

function plainNumber(text: string): string {
  const bare = text
    .trim()
    .replace(/^−/, '-')
    .replaceAll(/[\r\n"]/g, ' ');
  const withPoint = /^-?\d*,\d+$/.test(bare) ? bare.replace(',', '.') : bare;
  return withPoint.replaceAll(',', ' ').replaceAll(';', ' ').replaceAll('\t', ' ');
}
