import type { Problem } from '../../core/problem.ts';
import type { ReadWeather } from '../loadWeather.ts';
import type { Scenario } from '../scenarioSchema.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';

/** Solar gains need radiation in the weather; not asked where the weather could not be read. */
export function checkSun(
  yaml: YamlFile,
  { solarAperture }: Scenario['house']['need'],
  weather: ReadWeather | undefined,
): Problem[] {
  if (weather === undefined || solarAperture === 0 || weather.series.globalRadiation !== undefined) return [];
  const fault = {
    code: 'scenario.sun-without-radiation',
    found: String(solarAperture),
    allowed: weather.file,
  } as const;
  return [yaml.problem(['house', 'need', 'solarAperture'], fault)];
}
