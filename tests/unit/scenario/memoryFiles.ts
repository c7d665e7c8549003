import { createHash } from 'node:crypto';
import type { FileSource, InputBytes } from '../../../src/scenario/fileSource.ts';

const encoder = new TextEncoder();

/** An input file made of a text or of bytes. */
export function inputOf(name: string, content: string | Uint8Array): InputBytes {
  const bytes = typeof content === 'string' ? encoder.encode(content) : content;
  return { name, bytes, sha256: createHash('sha256').update(bytes).digest('hex') };
}

/** Files in memory; names are taken as they are, folders do not matter. */
export function memoryFiles(files: Record<string, string | Uint8Array>): FileSource {
  return {
    read(name) {
      const content = files[name];
      if (!Object.hasOwn(files, name) || content === undefined) {
        return { code: 'file.missing', severity: 'error', file: name };
      }
      return inputOf(name, content);
    },
  };
}
