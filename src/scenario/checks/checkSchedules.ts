import { writtenDate } from '../../core/civilDate.ts';
import { nearestName } from '../../core/nearest.ts';
import { type Problem, shown } from '../../core/problem.ts';
import type { EntryPath } from '../entries/pathText.ts';
import type { Scenario } from '../scenarioSchema.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';

/** Days and times of a rule; whatever is left out does not limit it. */
interface When {
  readonly start?: string | undefined;
  readonly end?: string | undefined;
  readonly from?: string | undefined;
  readonly to?: string | undefined;
}

type Need = Scenario['house']['need'];

/** What does not go together in the times and dates of a list of rules. */
export function checkRules(yaml: YamlFile, path: EntryPath, rules: readonly When[], calendarYear: number): Problem[] {
  return rules.flatMap((rule, i) => [
    ...checkTimes(yaml, [...path, i], rule),
    ...checkDates(yaml, [...path, i], rule, calendarYear),
  ]);
}

/** What does not go together in the times and dates of the set points. */
export function checkNeedRules(yaml: YamlFile, need: Need, calendarYear: number): Problem[] {
  const path = ['house', 'need', need.model === 'lumped' ? 'schedule' : 'days'];
  return checkRules(yaml, path, need.model === 'lumped' ? need.schedule : need.days, calendarYear);
}

/** What does not go together in what each rule of the set points asks for. */
export function checkSetPoints(yaml: YamlFile, need: Need): Problem[] {
  if (need.model !== 'lumped') return [];
  return need.schedule.flatMap((rule, i) => {
    if ((rule.setPoint === undefined) !== (rule.raise === undefined)) return [];
    const found = rule.setPoint === undefined ? 'neither setPoint nor raise' : 'both setPoint and raise';
    return [yaml.problem(['house', 'need', 'schedule', i], { code: 'scenario.rule-set-point', found })];
  });
}

/**
 * Whether the rates by which set points change are rates of the first tariff.
 *
 * @param presentRates names of those rates, where the tariff could be read
 */
export function checkSetPointRates(
  yaml: YamlFile,
  need: Need,
  { tariffs, presentRates }: { tariffs: Scenario['tariffs']; presentRates: readonly string[] | undefined },
): Problem[] {
  if (need.model !== 'lumped') return [];
  return need.schedule.flatMap(({ rate }, i) => {
    if (rate === undefined) return [];
    const path = ['house', 'need', 'schedule', i, 'rate'];
    if (tariffs.length === 0) return [yaml.problem(path, { code: 'scenario.rate-needs-tariff' })];
    return presentRates === undefined ? [] : checkRate(yaml, path, rate, presentRates);
  });
}

function checkTimes(yaml: YamlFile, path: EntryPath, { start, end }: When): Problem[] {
  if (start === undefined || start !== end) return [];
  return [yaml.problem([...path, 'end'], { code: 'scenario.empty-window', found: end })];
}

function checkDates(yaml: YamlFile, path: EntryPath, { from, to }: When, calendarYear: number): Problem[] {
  if (from === undefined && to === undefined) return [];
  if (from === undefined || to === undefined) {
    const missing = from === undefined ? 'from' : 'to';
    return [yaml.problem([...path, missing], { code: 'scenario.half-a-period' })];
  }
  const unknown = [['from', from] as const, ['to', to] as const].filter(([, date]) => writtenDate(date) === undefined);
  if (unknown.length > 0) {
    return unknown.map(([key, date]) => yaml.problem([...path, key], { code: 'scenario.no-such-date', found: date }));
  }
  const years = [from, to].map((date) => writtenDate(date)?.year);
  if ((years[0] === undefined) !== (years[1] === undefined)) {
    return [yaml.problem([...path, 'to'], { code: 'scenario.mixed-dates', found: to, allowed: from })];
  }
  if (years[0] === undefined || years[1] === undefined) return [];
  if (to < from) return [yaml.problem([...path, 'to'], { code: 'scenario.ends-before', found: to, allowed: from })];
  if (years[0] <= calendarYear && years[1] >= calendarYear) return [];
  const allowed = String(calendarYear);
  return [yaml.problem([...path, 'from'], { code: 'scenario.other-year', severity: 'warning', found: from, allowed })];
}

function checkRate(yaml: YamlFile, path: EntryPath, rate: string, names: readonly string[]): Problem[] {
  if (names.includes(rate)) return [];
  const near = nearestName(rate, names);
  const allowed = names.length > 0 ? names.map((name) => `'${shown(name, 30)}'`).join(', ') : 'no rates at all';
  const hint = near === undefined ? {} : { hint: `perhaps ${shown(near, 30)} is meant` };
  return [yaml.problem(path, { code: 'scenario.no-such-rate', found: `'${shown(rate)}'`, allowed, ...hint })];
}
