// Writes the generated files of data/demo anew; the YAML files beside them are written by hand.
import { writeFileSync } from 'node:fs';
import { demoFiles } from './demoFiles.ts';

for (const { name, text } of demoFiles()) {
  writeFileSync(name, text);
  console.log(`${name}: ${text.length} characters`);
}
