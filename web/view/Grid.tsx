import { useState } from 'preact/hooks';
import type { MapCell, MapGrid } from '../model/mapTables.ts';
import { isPastedTable, laidOn, listedPoints, pastedCells } from '../model/pastedTable.ts';
import { act, language, words } from '../sheet.ts';
import { fieldId } from './fieldId.ts';

/** A table of a unit: cells to type into, to paste into, marked where a point is odd. */
export function Grid({ grid, all }: { readonly grid: MapGrid; readonly all: readonly MapGrid[] }) {
  const siblings = all.filter(({ level }) => level === grid.level);
  const said = words.value.grid;
  const { file, path, quantity } = grid;
  const cells = grid.cells.map((row) => row.map((cell) => ({ ...cell, text: local(cell.text) })));
  const texts = cells.map((row) => row.map(({ text }) => text));
  const write = (next: readonly (readonly string[])[]) => act({ do: 'table', file, path, cells: next });
  const told = cells.flatMap((row, r) => row.flatMap((cell, c) => cell.told.map((text) => ({ text, r, c }))));
  const name = `${said[grid.level]}: ${said[quantity]}`;
  const id = fieldId(file, path);
  return (
    <div class="grid" id={id} tabIndex={-1}>
      {quantity === 'capacity' ? <h4>{name}</h4> : <Second grid={grid} />}
      {grid.own !== undefined && <p class="small">{grid.own}</p>}
      <div class="wide">
        <table>
          <caption class="hidden">{name}</caption>
          <tbody>
            {cells.map((row, r) => (
              <tr key={r}>
                {row.map((cell, c) => (
                  <td key={c} class={r === 0 || c === 0 ? 'rim' : undefined}>
                    <Cell
                      cell={cell}
                      corner={r === 0 && c === 0}
                      name={cellName(texts, r, c)}
                      onText={(text) => write(laidOn(texts, [[text]], [r, c]))}
                      onPaste={(text) => {
                        const points = listedPoints(text);
                        if (points === undefined) write(laidOn(texts, pastedCells(text), [r, c]));
                        else writePoints(grid, siblings, points);
                      }}
                    />
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {told.map(({ text, r, c }) => (
        <p class="warning" key={`${r} ${c} ${text}`}>
          {text}
        </p>
      ))}
      <button type="button" class="quiet" onClick={() => write([...texts, texts[0].map(() => '')])}>
        {said.row}
      </button>
      <button type="button" class="quiet" onClick={() => write(texts.map((row) => [...row, '']))}>
        {said.column}
      </button>
    </div>
  );
}

/** A number of the file with the decimal sign of the language; it goes back with a point. */
function local(text: string): string {
  return language.value === 'de' && /^-?\d+\.\d+$/.test(text) ? text.replace('.', ',') : text;
}

/** A list of points fills both tables of its level: the heat, and what stands behind it. */
function writePoints(grid: MapGrid, siblings: readonly MapGrid[], [heat, second]: [string[][], string[][]]): void {
  const isFull = second.some((row, r) => r > 0 && row.some((cell, c) => c > 0 && cell !== ''));
  if (!isFull) {
    act({ do: 'table', file: grid.file, path: grid.path, cells: heat });
    return;
  }
  for (const { file, path, quantity } of siblings) {
    act({ do: 'table', file, path, cells: quantity === 'capacity' ? heat : second });
  }
}

function cellName(texts: readonly (readonly string[])[], r: number, c: number): string {
  const said = words.value.grid;
  if (r === 0 && c === 0) return said.corner;
  if (r === 0) return said.flow(String(c));
  return c === 0 ? said.outdoor(String(r)) : said.cell(texts[r][0], texts[0][c] ?? '');
}

/** What the second table holds may be said differently. */
function Second({ grid: { file, path, level, quantity } }: { readonly grid: MapGrid }) {
  const said = words.value.grid;
  const id = `${fieldId(file, path)}-second`;
  return (
    <p class="second">
      <label for={id}>{`${said[level]}: ${said.second}`}</label>{' '}
      <select
        id={id}
        value={quantity}
        onChange={(event) => {
          const chosen = event.currentTarget.value === 'cop' ? 'cop' : 'inputPower';
          act({ do: 'second', file, path, quantity: chosen });
        }}
      >
        <option value="cop">{said.cop}</option>
        <option value="inputPower">{said.inputPower}</option>
      </select>
    </p>
  );
}

interface CellOf {
  readonly cell: MapCell;
  readonly corner: boolean;
  readonly name: string;
  readonly onText: (text: string) => void;
  readonly onPaste: (text: string) => void;
}

function Cell({ cell, corner, name, onText, onPaste }: CellOf) {
  const [typed, setTyped] = useState<string | undefined>(undefined);
  const paste = (event: ClipboardEvent) => {
    const text = event.clipboardData?.getData('text/plain') ?? '';
    if (!isPastedTable(text)) return;
    event.preventDefault();
    setTyped(undefined);
    onPaste(text);
  };
  return (
    <input
      type="text"
      inputMode="decimal"
      autocomplete="off"
      aria-label={name}
      aria-invalid={cell.told.length > 0}
      title={cell.told.join(' ') || undefined}
      value={corner ? '' : (typed ?? cell.text)}
      placeholder={corner ? '⌄' : undefined}
      onInput={(event) => {
        const { value } = event.currentTarget;
        if (corner) return;
        setTyped(value);
        onText(value);
      }}
      onBlur={() => setTyped(undefined)}
      onPaste={paste}
    />
  );
}
