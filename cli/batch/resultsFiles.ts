import { closeSync, existsSync, mkdirSync, openSync, readSync, renameSync, rmSync, writeSync } from 'node:fs';
import { join } from 'node:path';
import { distribution } from '../../src/batch/distribution.ts';
import { figureColumns } from '../../src/batch/rowColumns.ts';
import { batchHeader, summaryHeader, summaryLine, type TableShape } from '../../src/report/batchCsv.ts';
import type { BatchManifest } from '../../src/report/batchManifest.ts';
import { documentText } from '../../src/report/documentText.ts';
import { OutputFault } from '../outputFile.ts';

/** The files of finished results; the manifest comes last, so where it stands the others are whole. */
export const RESULT_FILES = {
  table: 'results.csv',
  lines: 'results.jsonl',
  summary: 'summary.csv',
  manifest: 'manifest.json',
};

/** Rows in the forms in which they are written. */
export interface JoinedRows {
  readonly csv: Uint8Array | string;
  readonly json: Uint8Array | string;
  /** As `figureValues` gives them, row by row. */
  readonly figures: Uint8Array;
}

/** Of the figures so many bytes at most are looked at in one go. */
const MOST_FIGURE_BYTES = 8_000_000;

/**
 * Writes the files of results from rows that come in their order: first under passing names, then all get theirs.
 *
 * Whatever the number of rows, memory holds a few figures of each at a time.
 *
 * @param folder of the results
 * @param work folder for passing files; it is made where it is not there
 * @throws OutputFault
 */
export class ResultsWriter {
  readonly #folder: string;
  readonly #work: string;
  readonly #shape: TableShape;
  readonly #handles: Readonly<Record<'table' | 'lines' | 'figures', number>>;
  #rows = 0;

  constructor(folder: string, work: string, shape: TableShape) {
    this.#folder = folder;
    this.#work = work;
    this.#shape = shape;
    const open = (name: string) =>
      tried(join(work, name), () => {
        mkdirSync(work, { recursive: true });
        return openSync(join(work, name), 'w+');
      });
    this.#handles = { table: open(RESULT_FILES.table), lines: open(RESULT_FILES.lines), figures: open('figures') };
    this.#add('table', Buffer.from(batchHeader(shape)));
  }

  /** Adds rows. @throws OutputFault */
  add({ csv, json, figures }: JoinedRows): void {
    this.#add('table', bytesOf(csv));
    this.#add('lines', bytesOf(json));
    this.#add('figures', figures);
    this.#rows += figures.byteLength / (8 * this.#width);
  }

  /**
   * Writes the summary and the manifest, and gives every file its name.
   *
   * @param manifest with the axes by whose values the summary is parted
   * @throws OutputFault
   */
  finish(manifest: BatchManifest): void {
    const summary = join(this.#work, RESULT_FILES.summary);
    tried(summary, () => {
      const handle = openSync(summary, 'w');
      for (const line of this.#summary(manifest)) writeSync(handle, line);
      closeSync(handle);
    });
    const listing = join(this.#work, RESULT_FILES.manifest);
    tried(listing, () => {
      const handle = openSync(listing, 'w');
      writeSync(handle, documentText(manifest));
      closeSync(handle);
    });
    for (const handle of Object.values(this.#handles)) closeSync(handle);
    for (const name of Object.values(RESULT_FILES)) {
      tried(join(this.#folder, name), () => renameSync(join(this.#work, name), join(this.#folder, name)));
    }
    rmSync(join(this.#work, 'figures'), { force: true });
  }

  get #width(): number {
    return figureColumns(this.#shape.tariffs).length + 1;
  }

  #add(name: 'table' | 'lines' | 'figures', bytes: Uint8Array): void {
    tried(join(this.#work, name), () => {
      for (let at = 0; at < bytes.length; ) at += writeSync(this.#handles[name], bytes, at);
    });
  }

  *#summary(manifest: BatchManifest): Generator<string> {
    yield summaryHeader();
    const figures = figureColumns(this.#shape.tariffs);
    const together = Math.max(1, Math.floor(MOST_FIGURE_BYTES / (8 * Math.max(1, this.#rows))));
    const jobs = this.#columns(0, 1)[0];
    for (let from = 0; from < figures.length; from += together) {
      const columns = this.#columns(from + 1, Math.min(together, figures.length - from));
      for (const [k, values] of columns.entries()) yield* summaryOf(figures[from + k], values, jobs, manifest);
    }
  }

  /** Some columns of the figures, by going once through all of them. */
  #columns(first: number, count: number): Float64Array[] {
    const width = this.#width;
    const columns = Array.from({ length: count }, () => new Float64Array(this.#rows));
    const rowsAtOnce = Math.max(1, Math.floor(262_144 / (8 * width)));
    const block = new Float64Array(rowsAtOnce * width);
    for (let row = 0; row < this.#rows; row += rowsAtOnce) {
      const rows = Math.min(rowsAtOnce, this.#rows - row);
      readSync(this.#handles.figures, new Uint8Array(block.buffer), 0, rows * width * 8, row * width * 8);
      for (let r = 0; r < rows; r++) {
        for (let k = 0; k < count; k++) columns[k][row + r] = block[r * width + first + k];
      }
    }
    return columns;
  }
}

function* summaryOf(
  figure: { name: string; unit: string },
  values: Float64Array,
  jobs: Float64Array,
  { axes, options }: BatchManifest,
): Generator<string> {
  const all = distribution(values);
  if (all === undefined) return;
  yield summaryLine(figure, { axis: 'all', value: null }, all);
  let repeat = options;
  for (const { name, values: labels } of axes) {
    repeat /= labels.length;
    const valueIndex = (i: number) => Math.floor((jobs[i] - 1) / repeat) % labels.length;
    for (const [v, value] of labels.entries()) {
      const spread = distribution(values.filter((_, i) => valueIndex(i) === v));
      if (spread !== undefined) yield summaryLine(figure, { axis: name, value }, spread);
    }
  }
}

function bytesOf(text: Uint8Array | string): Uint8Array {
  return typeof text === 'string' ? Buffer.from(text) : text;
}

function tried<T>(file: string, act: () => T): T {
  try {
    return act();
  } catch (fault) {
    throw new OutputFault(file, fault);
  }
}

/** A file of results that stands in a folder though no batch has finished there. */
export function foreignFile(folder: string): string | undefined {
  return Object.values(RESULT_FILES).find((name) => existsSync(join(folder, name)));
}
