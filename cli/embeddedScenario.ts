import { createHash } from 'node:crypto';
import type { Problem } from '../src/core/problem.ts';
import type { DataBlock } from '../src/report/html/dataBlock.ts';
import type { FileSource, InputBytes } from '../src/scenario/fileSource.ts';

/** The scenario that a report holds, and all other files from where they are. */
export class EmbeddedScenario implements FileSource {
  readonly #scenario: InputBytes;
  readonly #others: FileSource;

  constructor({ file, content, written }: DataBlock['scenario'], others: FileSource) {
    const bytes = new Uint8Array(Buffer.from(content, written === 'text' ? 'utf8' : 'base64'));
    this.#scenario = { name: file, bytes, sha256: createHash('sha256').update(bytes).digest('hex') };
    this.#others = others;
  }

  read(name: string, from?: string): InputBytes | Problem {
    return from === undefined && name === this.#scenario.name ? this.#scenario : this.#others.read(name, from);
  }
}
