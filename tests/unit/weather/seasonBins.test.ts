import { expect, test } from 'vitest';
import { standardSeasons } from '../../../src/weather/seasonBins.ts';

test('a season’s bins begin at its design temperature and pair each temperature with its hours', () => {
  expect(standardSeasons.average.bins[0]).toEqual({ temperature: -10, hours: 1 });
  // Regulation (EU) 811/2013 annex VII table 12: the coldest and the fullest bin of each season.
  expect(standardSeasons.average.bins.find((bin) => bin.temperature === 3)?.hours).toBe(357);
  expect(standardSeasons.warmer.bins.find((bin) => bin.temperature === 12)?.hours).toBe(503);
  expect(standardSeasons.colder.bins.find((bin) => bin.temperature === 1)?.hours).toBe(533);
});
