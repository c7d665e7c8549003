import { describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { JobFile } from '../../../src/batch/jobFile.ts';
import { SectionEntries } from '../../../src/batch/sectionEntries.ts';
import { scenarioSchema } from '../../../src/scenario/scenarioSchema.ts';
import { lumpedText, scenarioText } from '../scenario/sampleFiles.ts';
import { loadedPlan } from './batchFiles.ts';

const origin = { file: 'plan.yaml' };
const plan = (text: string) =>
  loadedPlan('name: T\nscenario: house.yaml\naxes: [{ given: values, name: a, path: name, values: [x] }]\n', {
    'house.yaml': text,
  }).plan!;

describe('a scenario held against its schema section by section', () => {
  it.each([scenarioText, lumpedText])(
    'is what the whole schema makes of it, also with sections seen before',
    (text) => {
      const entries = new SectionEntries();
      const { base } = plan(text);
      const file = new JobFile(base, []);
      for (let time = 0; time < 2; time++) {
        expect(entries.of(file).entries?.value).toStrictEqual(scenarioSchema.parse(parse(text)));
      }
      const changed = new JobFile(base, [{ path: ['house', 'heatLoss', 'value'], value: 99, origin }]);
      expect(entries.of(changed).entries?.value).toStrictEqual(scenarioSchema.parse(changed.raw));
      expect(entries.of(file).entries?.value.house.heatLoss).toMatchObject({ value: 180 });
    },
  );

  it('has the problems that the whole schema finds, unknown and missing sections too', () => {
    const entries = new SectionEntries();
    const { base } = plan(scenarioText);
    const codes = (changes: [string, unknown][]) =>
      entries
        .of(
          new JobFile(
            base,
            changes.map(([key, value]) => ({ path: [key], value, origin })),
          ),
        )
        .problems.map(({ code, path }) => [code, path]);
    expect(codes([])).toEqual([]);
    expect(codes([['colour', 'red']])).toEqual([['entry.unknown-key', 'colour']]);
    expect(codes([['heatPump', null]])).toEqual([['entry.missing', 'heatPump']]);
    expect(codes([['site', 5]])).toEqual([['entry.wrong-kind', 'site']]);
  });
});
