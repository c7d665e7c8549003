import { closeSync, openSync, readSync } from 'node:fs';

const BLOCK = 1_048_576;
const LINE_FEED = 10;

/**
 * The lines of a file in groups, each group as the bytes of whole lines with their ends.
 *
 * @param file of lines that all end with a line feed; a last one without is left out
 */
export function* fileLines(file: string): Generator<Buffer> {
  const handle = openSync(file, 'r');
  try {
    let rest = Buffer.alloc(0);
    for (;;) {
      const block = Buffer.alloc(BLOCK);
      const count = readSync(handle, block, 0, BLOCK, null);
      if (count === 0) return;
      const bytes = Buffer.concat([rest, block.subarray(0, count)]);
      const end = bytes.lastIndexOf(LINE_FEED) + 1;
      if (end > 0) yield bytes.subarray(0, end);
      rest = bytes.subarray(end);
    }
  } finally {
    closeSync(handle);
  }
}
