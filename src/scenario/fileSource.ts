import type { Problem } from '../core/problem.ts';

/** The bytes of one input file. */
export interface InputBytes {
  /** Name as shown to the user. */
  readonly name: string;
  readonly bytes: Uint8Array;
  /** SHA-256 of the bytes, hexadecimal, for the record of inputs. */
  readonly sha256: string;
}

/** Where input files come from: the disk on the command line, memory in the page and in tests. */
export interface FileSource {
  /** Reads a file; the name is relative to the folder of `from` when that is given. Never throws. */
  read(name: string, from?: string): InputBytes | Problem;
}

/** Whether a read ended in a problem instead of bytes. */
export function isProblem(result: InputBytes | Problem): result is Problem {
  return 'code' in result;
}
