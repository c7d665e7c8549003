import { describe, expect, test } from 'vitest';
import { labelSchema } from '../../../../src/scenario/labelSchema.ts';
import { chooseRatings } from '../../../../src/scenario/season/chooseRatings.ts';
import { sampleLabel, sampleSeason } from './labelFiles.ts';

const open = { climate: undefined, application: undefined };
const label = labelSchema.parse({
  ...sampleLabel,
  seasons: [
    { ...sampleSeason, climate: 'colder', application: 35 },
    { ...sampleSeason, application: 55 },
    { ...sampleSeason, application: 35 },
  ],
});

describe('the seasons to rate', () => {
  test('are all declared ones, by climate and application, where nothing is chosen', () => {
    expect(chooseRatings(label, open)).toEqual([
      { climate: 'average', application: 35 },
      { climate: 'average', application: 55 },
      { climate: 'colder', application: 35 },
    ]);
  });

  test('are the declared ones of the chosen climate or application', () => {
    expect(chooseRatings(label, { ...open, climate: 'colder' })).toEqual([{ climate: 'colder', application: 35 }]);
    expect(chooseRatings(label, { ...open, application: 35 })).toEqual([
      { climate: 'average', application: 35 },
      { climate: 'colder', application: 35 },
    ]);
  });

  test('are the chosen ones where they are not declared', () => {
    expect(chooseRatings(label, { climate: 'warmer', application: 45 })).toEqual([
      { climate: 'warmer', application: 45 },
    ]);
    expect(chooseRatings(label, { ...open, climate: 'warmer' })).toEqual([
      { climate: 'warmer', application: 35 },
      { climate: 'warmer', application: 55 },
    ]);
    expect(chooseRatings(label, { ...open, application: 65 })).toEqual([{ climate: 'average', application: 65 }]);
  });

  test('are those of every label where there is none', () => {
    expect(chooseRatings(undefined, open)).toEqual([
      { climate: 'average', application: 35 },
      { climate: 'average', application: 55 },
    ]);
  });
});
