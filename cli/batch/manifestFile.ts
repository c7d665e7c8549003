import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { type BatchManifest, batchManifestSchema } from '../../src/report/batchManifest.ts';
import { RESULT_FILES } from './resultsFiles.ts';

/** The manifest of finished results; undefined where a folder holds none that can be understood. */
export function manifestIn(folder: string): BatchManifest | undefined {
  const path = join(folder, RESULT_FILES.manifest);
  if (!existsSync(path)) return undefined;
  try {
    return batchManifestSchema.parse(JSON.parse(readFileSync(path, 'utf8')));
  } catch {
    return undefined;
  }
}
