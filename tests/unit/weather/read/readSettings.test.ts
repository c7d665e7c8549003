import { describe, expect, it } from 'vitest';
import * as z from 'zod';
import { readSchema } from '../../../../src/scenario/readSchema.ts';
import { offsetMinutes } from '../../../../src/weather/read/standardTime.ts';
import type { ReadSettings } from '../../../../src/weather/readSettings.ts';
import { plainFile, read, syntheticYear } from './syntheticYear.ts';

describe('the settings of the reader', () => {
  it('are all optional in a file; only the refusal of absent hours is a default', () => {
    expect(readSchema.parse({})).toEqual({ absentHours: 'refuse' });
  });

  it('as parsed are what the reader takes', () => {
    const settings: ReadSettings = readSchema.parse({
      delimiter: 'comma',
      decimal: 'point',
      skipLines: 0,
      header: true,
      columns: { temperature: 'temperature', pressure: false, globalRadiation: 4 },
      units: { temperature: 'C', globalRadiation: 'Wh/m2' },
      stamps: 'begin',
      offset: '-03:30',
      clock: 'standard',
      year: 2019,
      missing: [-77, 'gone'],
      absentHours: 'fill',
    });
    const { series, problems } = read(plainFile(syntheticYear()), settings);
    expect(problems).toEqual([]);
    expect(series?.offsetMinutes).toBe(-210);
    expect(series?.pressure).toBeUndefined();
  });

  it.each([
    { delimiter: ',' },
    { offset: '1:00' },
    { offset: 900 },
    { columns: { temperature: 0 } },
    { columns: { temperature: false } },
    { stamp: 'end' },
    { skipLines: -1 },
    { year: 2019.5 },
  ])('refuse %j', (settings) => {
    expect(readSchema.safeParse(settings).success).toBe(false);
  });

  it('become a JSON schema', () => {
    const schema = z.toJSONSchema(readSchema, { io: 'input' });
    expect(schema.additionalProperties).toBe(false);
    expect(schema.required).toBeUndefined();
  });

  it('give offsets as signs, hours and minutes, or as minutes', () => {
    expect([offsetMinutes('+05:30'), offsetMinutes('-09:00'), offsetMinutes(60)]).toEqual([330, -540, 60]);
  });
});
