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

/**
 * What does not go together in the rules of a scenario: set points, quiet hours, reheat windows.
 *
 * @param presentRates names of the rates of the first tariff, where it could be read
 */
export function checkSchedules(
  yaml: YamlFile,
  scenario: Scenario,
  presentRates: readonly string[] | undefined,
): Problem[] {
  const { need } = scenario.house;
  const lists: { path: EntryPath; rules: readonly When[] }[] = [
    { path: ['house', 'need', need.model === 'lumped' ? 'schedule' : 'days'], rules: rulesOf(need) },
    { path: ['heatPump', 'quietHours'], rules: scenario.heatPump.quietHours },
    { path: ['hotWater', 'reheatWindows'], rules: scenario.hotWater?.reheatWindows ?? [] },
  ];
  const problems = lists.flatMap(({ path, rules }) =>
    rules.flatMap((rule, i) => [
      ...checkTimes(yaml, [...path, i], rule),
      ...checkDates(yaml, [...path, i], rule, scenario.site.calendarYear),
    ]),
  );
  if (need.model !== 'lumped') return problems;
  const setPoints = need.schedule.flatMap((rule, i) =>
    checkSetPoint(yaml, ['house', 'need', 'schedule', i], rule, { listed: scenario.tariffs.length > 0, presentRates }),
  );
  return [...problems, ...setPoints];
}

function rulesOf(need: Scenario['house']['need']): readonly When[] {
  return need.model === 'lumped' ? need.schedule : need.days;
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

function checkSetPoint(
  yaml: YamlFile,
  path: EntryPath,
  rule: { setPoint?: number | undefined; raise?: number | undefined; rate?: string | undefined },
  tariffs: { listed: boolean; presentRates: readonly string[] | undefined },
): Problem[] {
  const problems: Problem[] = [];
  if ((rule.setPoint === undefined) === (rule.raise === undefined)) {
    const found = rule.setPoint === undefined ? 'neither setPoint nor raise' : 'both setPoint and raise';
    problems.push(yaml.problem(path, { code: 'scenario.rule-set-point', found }));
  }
  if (rule.rate === undefined) return problems;
  if (!tariffs.listed) problems.push(yaml.problem([...path, 'rate'], { code: 'scenario.rate-needs-tariff' }));
  const { presentRates } = tariffs;
  if (presentRates !== undefined) problems.push(...checkRate(yaml, [...path, 'rate'], rule.rate, presentRates));
  return problems;
}

function checkRate(yaml: YamlFile, path: EntryPath, rate: string, names: readonly string[]): Problem[] {
  if (names.includes(rate)) return [];
  const near = nearestName(rate, names);
  const allowed = names.length > 0 ? names.map((name) => `'${shown(name, 30)}'`).join(', ') : 'no rates at all';
  const hint = near === undefined ? {} : { hint: `perhaps ${shown(near, 30)} is meant` };
  return [yaml.problem(path, { code: 'scenario.no-such-rate', found: `'${shown(rate)}'`, allowed, ...hint })];
}
