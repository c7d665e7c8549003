import { expect, test } from 'vitest';
import { prepareMap, readMap } from '../../../src/sim/heatPumpMap.ts';
import { layMapOnWeather, readHour } from '../../../src/sim/mapOnWeather.ts';
import type { PerformanceTable } from '../../../src/sim/performanceTable.ts';
import { column, expectNear, roundTable, weatherOf } from './planBuilder.ts';

const wide: PerformanceTable = {
  outdoor: [-15, -7, 2, 12],
  flow: [30, 40, 55, 60],
  capacity: [4, 4, 3, 3, 5, 5, 4, 4, 7, 6, 6, 5, 9, 9, 8, 8],
  cop: [2.5, 2.2, 1.8, 1.7, 3, 2.6, 2.1, 2, 4, 3.3, 2.6, 2.4, 5.5, 4.4, 3.4, 3.1],
};
const single: PerformanceTable = { outdoor: [-10, 10], flow: [45], capacity: [5, 9], cop: [2.4, 4] };

/** Colder than every row, on rows, between rows, warmer than all, and warmer than κ sees. */
const outdoors = [-40, -16, -15, -10, -7, -1.5, 2, 7.25, 10, 12, 14, 15, 17, 35];
/** Below the lowest column by more than 10 K, on columns, between, hotter. */
const flows = [15, 24.5, 29, 30, 33, 40, 45, 52, 55, 58, 60, 71];

test.each([
  ['several columns', wide, 'carnotShare'],
  ['two columns', roundTable, 'carnotShare'],
  ['one column', single, 'carnotShare'],
  ['linear COP', wide, 'linear'],
] as const)('an hour reads as the map itself does: %s', (_, table, interpolation) => {
  const map = prepareMap(table, interpolation);
  const special = Object.fromEntries(outdoors.map((outdoor, hour) => [hour, outdoor]));
  const laid = layMapOnWeather(map, weatherOf({ hours: 24, temperature: column(0, special, 24) }));
  const byHour = new Float64Array(4);
  const byMap = new Float64Array(2);
  let compared = 0;
  outdoors.forEach((outdoor, hour) => {
    for (const flow of flows) {
      readHour(laid, hour, outdoor, flow, byHour, 1);
      readMap(map, outdoor, flow, byMap, 0);
      // the same formula with the axes read in another order: rounding only
      expectNear(byHour[1], byMap[0]!, 1e-13);
      expectNear(byHour[2], byMap[1]!, 1e-13);
      compared++;
    }
  });
  expect(compared).toBe(outdoors.length * flows.length);
  expect([byHour[0], byHour[3]]).toEqual([0, 0]);
});
