import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { InputRecord } from '../../src/scenario/inputFiles.ts';
import { OutputFault } from '../outputFile.ts';
import type { ChunkDone } from './chunk.ts';

/** Where a run keeps what it has finished until all is done. */
const FOLDER = 'unfinished';
const RUN = 'run.json';

/** A finished chunk as it is kept: its rows as bytes, ready to be joined. */
export interface KeptChunk {
  readonly rows: number;
  readonly failed: number;
  readonly csv: Uint8Array;
  readonly json: Uint8Array;
  readonly figures: Uint8Array;
  readonly inputs: readonly InputRecord[];
}

interface ChunkHead extends Pick<KeptChunk, 'rows' | 'failed' | 'inputs'> {
  readonly csv: number;
  readonly json: number;
  readonly figures: number;
  readonly sha256: string;
}

/**
 * The finished chunks of a run: each a file that is written beside its place and renamed when it is whole, so that a run
 * which is stopped at any moment goes on with the next chunk.
 */
export class Journal {
  readonly folder: string;

  /** @param results folder of the results */
  constructor(results: string) {
    this.folder = join(results, FOLDER);
  }

  /** What the run was begun with, as `begin` noted it; undefined where none was begun. */
  begun(): unknown {
    const path = join(this.folder, RUN);
    return existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')) : undefined;
  }

  /** Begins a run. @throws OutputFault */
  begin(run: object): void {
    this.#tried(this.folder, () => mkdirSync(this.folder, { recursive: true }));
    this.#write(RUN, [JSON.stringify(run)]);
  }

  /** Keeps a finished chunk. @throws OutputFault */
  keep({ chunk, rows, failed, csv, json, figures, inputs }: ChunkDone): void {
    const parts = [
      Buffer.from(csv),
      Buffer.from(json),
      Buffer.from(figures.buffer, figures.byteOffset, figures.byteLength),
    ];
    const [csvBytes, jsonBytes, figureBytes] = parts.map(({ length }) => length);
    const head: ChunkHead = {
      ...{ rows, failed, inputs },
      ...{ csv: csvBytes, json: jsonBytes, figures: figureBytes },
      sha256: hashOf(parts),
    };
    this.#write(nameOf(chunk), [`${JSON.stringify(head)}\n`, ...parts]);
  }

  /** A finished chunk; undefined where it is not finished, or damaged. */
  chunk(chunk: number): KeptChunk | undefined {
    const path = join(this.folder, nameOf(chunk));
    if (!existsSync(path)) return undefined;
    try {
      return chunkOf(readFileSync(path));
    } catch {
      return undefined;
    }
  }

  /** Removes all that was kept. */
  remove(): void {
    this.#tried(this.folder, () => rmSync(this.folder, { recursive: true, force: true }));
  }

  #write(name: string, parts: readonly (string | Uint8Array)[]): void {
    const path = join(this.folder, name);
    const passing = `${path}.tmp`;
    const bytes = Buffer.concat(parts.map((part) => (typeof part === 'string' ? Buffer.from(part) : part)));
    this.#tried(path, () => {
      try {
        writeFileSync(passing, bytes);
        renameSync(passing, path);
      } catch (fault) {
        removeIfThere(passing);
        throw fault;
      }
    });
  }

  #tried(file: string, act: () => void): void {
    try {
      act();
    } catch (fault) {
      throw new OutputFault(file, fault);
    }
  }
}

/** What the fault has left; where that cannot be removed either, the fault is what counts. */
function removeIfThere(path: string): void {
  try {
    rmSync(path, { force: true });
  } catch {}
}

function nameOf(chunk: number): string {
  return `chunk-${String(chunk + 1).padStart(6, '0')}`;
}

function chunkOf(bytes: Buffer): KeptChunk | undefined {
  const headEnd = bytes.indexOf('\n');
  const head = JSON.parse(bytes.toString('utf8', 0, headEnd)) as ChunkHead;
  const csvAt = headEnd + 1;
  const jsonAt = csvAt + head.csv;
  const figuresAt = jsonAt + head.json;
  const csv = bytes.subarray(csvAt, jsonAt);
  const json = bytes.subarray(jsonAt, figuresAt);
  const figures = bytes.subarray(figuresAt, figuresAt + head.figures);
  const whole = bytes.length === figuresAt + head.figures && hashOf([csv, json, figures]) === head.sha256;
  return whole ? { rows: head.rows, failed: head.failed, csv, json, figures, inputs: head.inputs } : undefined;
}

function hashOf(parts: readonly Uint8Array[]): string {
  const hash = createHash('sha256');
  for (const part of parts) hash.update(part);
  return hash.digest('hex');
}
