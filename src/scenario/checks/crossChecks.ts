import type { Problem } from '../../core/problem.ts';
import { type ListedTariff, type LoadedTariff, rateNamesOf } from '../loadTariffs.ts';
import type { ReadWeather } from '../loadWeather.ts';
import type { ScenarioParts, SoundParts } from '../scenarioParts.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';
import { checkDesign, checkLoad, checkLoss, checkNeed } from './checkHouse.ts';
import { checkBoiler, checkCarbon, checkHousehold, checkWholeLife } from './checkMoney.ts';
import { checkBackup, checkBoilerFlow, checkFlow, checkHotWater } from './checkPlant.ts';
import { checkCheapest, checkCurrency, checkTaxes } from './checkPrices.ts';
import { checkNeedRules, checkRules, checkSetPointRates, checkSetPoints } from './checkSchedules.ts';
import { checkSun } from './checkSun.ts';

/** What the files of a scenario turned out to hold, as far as they could be read. */
export interface ReadBeside {
  readonly weather: ReadWeather | undefined;
  /** In the scenario's order; undefined for one that could not be read. */
  readonly listed: readonly (ListedTariff | undefined)[];
  /** The same, laid on the year; undefined for one with errors. */
  readonly laid: readonly (LoadedTariff | undefined)[];
}

interface CrossCheck {
  readonly parts: readonly (keyof ScenarioParts)[];
  readonly problemsOf: (yaml: YamlFile, parts: ScenarioParts, beside: ReadBeside) => Problem[];
}

/** A check that rests on some parts of a scenario, and sees no others. */
function on<K extends keyof ScenarioParts>(
  parts: readonly K[],
  problemsOf: (yaml: YamlFile, parts: Pick<ScenarioParts, K>, beside: ReadBeside) => Problem[],
): CrossCheck {
  return { parts, problemsOf };
}

const CHECKS: readonly CrossCheck[] = [
  on(['house.design'], (yaml, parts) => checkDesign(yaml, parts['house.design'])),
  on(['house.heatLoss'], (yaml, parts) => checkLoad(yaml, parts['house.heatLoss'])),
  on(['house.need', 'house.floorArea'], (yaml, parts) =>
    checkNeed(yaml, parts['house.need'], parts['house.floorArea']),
  ),
  on(['house'], (yaml, { house }) => checkLoss(yaml, house)),
  on(['flowTemperature', 'house.design'], (yaml, parts) =>
    checkFlow(yaml, ['flowTemperature'], parts.flowTemperature, parts['house.design'].roomTemperature),
  ),
  on(['boiler', 'house.design'], (yaml, parts) =>
    checkBoilerFlow(yaml, parts.boiler, parts['house.design'].roomTemperature),
  ),
  on(['hotWater'], (yaml, { hotWater }) => checkHotWater(yaml, hotWater)),
  on(['backup', 'tariffs'], checkBackup),
  on(['house.need', 'site.calendarYear'], (yaml, parts) =>
    checkNeedRules(yaml, parts['house.need'], parts['site.calendarYear']),
  ),
  on(['heatPump.quietHours', 'site.calendarYear'], (yaml, parts) =>
    checkRules(yaml, ['heatPump', 'quietHours'], parts['heatPump.quietHours'], parts['site.calendarYear']),
  ),
  on(['hotWater', 'site.calendarYear'], (yaml, parts) =>
    checkRules(yaml, ['hotWater', 'reheatWindows'], parts.hotWater?.reheatWindows ?? [], parts['site.calendarYear']),
  ),
  on(['house.need'], (yaml, parts) => checkSetPoints(yaml, parts['house.need'])),
  on(['house.need', 'tariffs'], (yaml, { tariffs, ...parts }, { listed: [present] }) =>
    checkSetPointRates(yaml, parts['house.need'], { tariffs, presentRates: present && rateNamesOf(present) }),
  ),
  on(['house.need'], (yaml, parts, { weather }) => checkSun(yaml, parts['house.need'], weather)),
  on(['currency'], (_, { currency }, { listed }) => checkCurrency(currency, listed)),
  on([], (yaml, _, { listed }) => checkTaxes(yaml, listed)),
  on(['backup', 'tariffs'], (yaml, parts, { laid }) => checkCheapest(yaml, parts, laid)),
  on(['household'], (yaml, { household }) => checkHousehold(yaml, household)),
  on(['boiler', 'hotWater', 'tariffs'], checkBoiler),
  on(['carbon', 'tariffs'], (yaml, parts, { laid }) => checkCarbon(yaml, parts, laid[0]?.prepared)),
  on(['wholeLife', 'boiler', 'tariffs'], checkWholeLife),
];

/** What does not go together in a scenario, as far as the parts that each check rests on are sound. */
export function crossChecks(yaml: YamlFile, parts: SoundParts, beside: ReadBeside): Problem[] {
  return CHECKS.flatMap((check) => (holds(parts, check) ? check.problemsOf(yaml, parts, beside) : []));
}

/** Whether the parts that a check sees are there; what it does not see may be missing. */
function holds(parts: SoundParts, check: CrossCheck): parts is ScenarioParts {
  return check.parts.every((part) => Object.hasOwn(parts, part));
}
