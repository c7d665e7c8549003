import { existsSync, readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { generatedFiles } from '../../scripts/generate/generatedFiles.ts';

test.each([...generatedFiles()])('%s follows from the schemas (npm run generate)', (path, content) => {
  expect(existsSync(path)).toBe(true);
  expect(readFileSync(path, 'utf8')).toBe(content);
});

test('the docs and one schema for each structured kind of input are generated', () => {
  expect([...generatedFiles().keys()]).toEqual(
    expect.arrayContaining([
      'schemas/scenario.schema.json',
      'schemas/unit.schema.json',
      'schemas/tariff.schema.json',
      'schemas/read.schema.json',
      'docs/formats.md',
    ]),
  );
});
