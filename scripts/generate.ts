import { mkdirSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { generatedFiles } from './generate/generatedFiles.ts';

for (const [path, content] of generatedFiles()) {
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(path, content);
  console.log(path);
}
