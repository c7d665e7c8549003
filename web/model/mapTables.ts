import type { Problem } from '../../src/core/problem.ts';
import { type ProblemLanguage, saidIn } from '../../src/core/problemText.ts';
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
  /** The file in which it stands, where it is not the unit's own. */
  readonly own?: string;
}

/** A table in a file of its own: the name that problems give it, and its text. */
export interface OwnTable {
  readonly path: string;
  readonly text: string;
}

export interface MapCell {
  readonly text: string;
  /** What is odd or wrong with it. */
  readonly told: readonly string[];
}

const QUANTITIES = ['capacity', 'cop', 'inputPower'] as const;

/**
 * The tables of a unit as grids, those in files of their own too; what is neither text nor a file that is there is left out.
 *
 * @param yaml the unit file
 * @param problems whose places mark the cells
 * @param language in which they are said
 * @param ownTable a table in a file of its own, by the name in the unit file
 */
export function mapGrids(
  yaml: YamlFile,
  problems: readonly Problem[],
  language: ProblemLanguage,
  ownTable: (name: string) => OwnTable | undefined,
): MapGrid[] {
  return (['fullLoad', 'lowestLevel'] as const).flatMap((level) =>
    QUANTITIES.flatMap((quantity): MapGrid[] => {
      const path = ['map', level, quantity];
      const entry = path.reduce<unknown>((value, key) => entryOf(value, key), yaml.raw);
      const base = { file: yaml.file, path, level, quantity };
      const toldAt = (of: string, line: number, column: number): string[] =>
        problems
          .filter((p) => p.file === of && p.line === line && p.column === column)
          .map((problem) => toldShort(saidIn(language, problem)));
      if (typeof entry === 'string') {
        const placeOf = yaml.isLiteralBlock(path) ? yaml.textPlaces(path) : undefined;
        const told = ({ line, column }: TableCell) => {
          const place = placeOf?.(line, column);
          return place === undefined ? [] : toldAt(yaml.file, place.line, place.column);
        };
        return [{ ...base, cells: cellsOf(entry, told) }];
      }
      const file = entryOf(entry, 'file');
      const own = typeof file === 'string' ? ownTable(file) : undefined;
      if (own === undefined) return [];
      const told = ({ line, column }: TableCell) => toldAt(own.path, line, column);
      return [{ ...base, own: own.path, cells: cellsOf(own.text, told) }];
    }),
  );
}

function cellsOf(text: string, told: (cell: TableCell) => string[]): MapCell[][] {
  const { flows, rows } = splitTable(text);
  const cellOf = (cell: TableCell): MapCell => ({ text: cell.text, told: told(cell) });
  return [
    [{ text: 'outdoor', told: [] }, ...flows.map(cellOf)],
    ...rows.map(({ label, cells }) => [cellOf(label), ...cells.map(cellOf)]),
  ];
}

function toldShort({ says, cure }: { readonly says: string; readonly cure: string }): string {
  return `${says}: ${cure}`;
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
