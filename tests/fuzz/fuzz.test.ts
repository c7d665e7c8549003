import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { loadScenario } from '../../src/scenario/loadScenario.ts';
import { effort, isLong, LONGEST } from './effort.ts';
import { type Hurt, hurtBytes, hurtTable, hurtYaml } from './hurt.ts';
import { filesWithHurt, type HurtFiles } from './hurtFiles.ts';
import { type SoundName, soundFiles } from './soundFiles.ts';
import { tryCheck, tryDegreeDays, tryReadings, trySeason, trySimulate } from './tries.ts';
import { tryBatch } from './tryBatch.ts';

// Every kind of input file, hurt in one to three places, goes the whole way of the commands that read it. What comes out is
// a result in which everything holds that MODEL section 15 says, or problems with their place: never an exception, never a
// figure that is none, and never a run that does not end. A further kind of file is a row more in the table below.

interface Kind {
  readonly name: string;
  /** Files of the kind; one of them is hurt. */
  readonly files: readonly SoundName[];
  readonly hurt: fc.Arbitrary<Hurt>;
  /** Cases of the ordinary run. */
  readonly runs: number;
  /** Whether there was a result. */
  readonly go: (source: HurtFiles, file: SoundName) => boolean;
}

/** Time of the processor that any one file may take, ms; a sound one takes a tenth of it. */
const LONGEST_CASE = 2000;

/** The house that the readings belong to. */
const house = loadScenario('full.yaml', filesWithHurt('read.yaml', new Uint8Array())).loaded;

const simulate = (scenario: SoundName) => (source: HurtFiles) => trySimulate(scenario, source);

const kinds: readonly Kind[] = [
  {
    name: 'a scenario',
    files: ['house.yaml', 'full.yaml', 'full.yaml'],
    hurt: hurtYaml,
    runs: 220,
    go: (source, file) => trySimulate(file, source),
  },
  {
    name: 'a unit',
    files: ['units/quarkenfels-8.yaml'],
    hurt: hurtYaml,
    runs: 120,
    go: simulate('house.yaml'),
  },
  {
    name: 'a table of a unit',
    files: ['capacity.csv', 'cop.csv'],
    hurt: hurtTable,
    runs: 100,
    go: simulate('tables.yaml'),
  },
  {
    name: 'a label',
    files: ['units/quarkenfels-8.yaml', 'units/hollerwisch-6.yaml'],
    hurt: hurtYaml,
    runs: 500,
    go: (source, file) => trySeason(file, source),
  },
  {
    name: 'a tariff',
    files: ['tariffs/three-band.yaml', 'tariffs/half-hourly.yaml', 'tariffs/blocks.yaml', 'tariffs/night.yaml'],
    hurt: hurtYaml,
    runs: 140,
    go: (source, file) => trySimulate(file === 'tariffs/three-band.yaml' ? 'house.yaml' : 'full.yaml', source),
  },
  { name: 'a price series', files: ['prices.csv'], hurt: hurtTable, runs: 60, go: simulate('full.yaml') },
  { name: 'a household’s meter', files: ['household.csv'], hurt: hurtTable, runs: 60, go: simulate('full.yaml') },
  { name: 'a series of carbon factors', files: ['carbon.csv'], hurt: hurtTable, runs: 60, go: simulate('full.yaml') },
  { name: 'a weather file', files: ['weather.csv'], hurt: hurtTable, runs: 60, go: simulate('house.yaml') },
  {
    name: 'weather for its degree days',
    files: ['weather.csv'],
    hurt: hurtTable,
    runs: 60,
    go: (source) => tryDegreeDays('weather.csv', undefined, source),
  },
  {
    name: 'read settings',
    files: ['read.yaml'],
    hurt: hurtYaml,
    runs: 120,
    go: (source) => tryDegreeDays('weather.csv', 'read.yaml', source),
  },
  {
    name: 'meter readings',
    files: ['meter.csv'],
    hurt: hurtTable,
    runs: 60,
    go: (source) => house !== undefined && tryReadings(house, 'meter.csv', source),
  },
  { name: 'a plan of a batch', files: ['plan.yaml'], hurt: hurtYaml, runs: 60, go: tryBatch },
  { name: 'a table of homes', files: ['homes.csv'], hurt: hurtTable, runs: 60, go: tryBatch },
  {
    name: 'any file that is only looked through',
    files: ['full.yaml', 'units/tables.yaml', 'tariffs/blocks.yaml', 'read.yaml', 'prices.csv'],
    hurt: fc.oneof(
      hurtYaml,
      hurtTable.filter(({ how }) => how !== 'table'),
    ),
    runs: 120,
    go: (source, file) => tryCheck(file, source),
  },
];

describe.each(kinds)('$name', ({ name, files, hurt, runs, go }) => {
  test('that is sound gives a result', () => {
    for (const file of files) {
      expect(go(filesWithHurt(file, hurtBytes(soundFiles[file], { how: 'encoding', encoding: 'utf8' })), file)).toBe(
        true,
      );
    }
  });

  test(
    'that was hurt gives a result in which all holds, or problems with their place',
    () => {
      let results = 0;
      let tried = 0;
      const property = fc.property(fc.constantFrom(...files), hurt, (file, how) => {
        // a change that only makes a text that is YAML no longer cannot be made to a table
        const bytes = hurtBytes(soundFiles[file], how);
        const before = process.cpuUsage();
        if (go(filesWithHurt(file, bytes), file)) results++;
        tried++;
        const { user, system } = process.cpuUsage(before);
        if ((user + system) / 1000 > LONGEST_CASE) throw new Error(`took ${(user + system) / 1000} ms`);
      });
      fc.assert(property, effort(runs));
      // were nearly all refused at once, or hardly any, the rest would not have been tried
      expect(results).toBeGreaterThan(tried / 20);
      expect(results).toBeLessThan(tried);
      if (isLong) process.stderr.write(`${name}: ${tried} files, ${results} of them with a result\n`);
    },
    LONGEST,
  );
});
