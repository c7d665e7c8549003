import { densityField } from '../../src/report/charts/densityField.ts';
import { markup } from '../../src/report/charts/markup.ts';
import { COP_LEVELS, copField, wholeFives } from '../../src/report/html/copContours.ts';
import type { InLanguage } from '../../src/report/language/inLanguage.ts';
import type { LoadedUnit } from '../../src/scenario/loadUnit.ts';
import { prepareMap } from '../../src/sim/heatPumpMap.ts';

/**
 * The map of a unit with its lines of equal COP, drawn from its file alone.
 *
 * @param unit as it was loaded
 * @param language of the words and figures
 * @returns markup, nothing of the file in it but numbers
 */
export function mapPicture({ unit, fullLoad }: LoadedUnit, { words, figures }: InLanguage): string {
  const { outdoor, flow, cop } = fullLoad;
  const title = words.map.cop(words.map.fullLoad);
  const [xRange, yRange] = [wholeFives(outdoor), wholeFives(flow)];
  const points = cop.flatMap((value, i): [number, number][] =>
    value === null ? [] : [[outdoor[Math.floor(i / flow.length)], flow[i % flow.length]]],
  );
  const chart = densityField({
    ...{ id: 'map-entered', title, description: title, cells: [], cellWidth: 1, cellHeight: 1 },
    contours: copField(prepareMap(fullLoad, unit.map.interpolation), xRange, yRange),
    ...{ levels: COP_LEVELS, points, xRange, yRange, written: figures.number },
    ...{ xTitle: words.spent.outdoor, yTitle: words.spent.flow },
  });
  return markup`<figure><h4>${title}</h4>${chart}</figure>`.text;
}
