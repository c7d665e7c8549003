import { describe, expect, test } from 'vitest';
import type { Problem } from '../../../../src/core/problem.ts';
import { problemText } from '../../../../src/core/problemText.ts';
import { loadScenario } from '../../../../src/scenario/loadScenario.ts';
import { memoryFiles } from '../memoryFiles.ts';
import { lumpedText, sampleFiles, scenarioText, tariffText, weatherText } from '../sampleFiles.ts';

/** Problems of a sound scenario with one text in it replaced by another. */
function changed(text: string, from: string, to: string, others: Record<string, string> = {}): Problem[] {
  expect(text).toContain(from);
  return loadScenario('house.yaml', memoryFiles(sampleFiles({ 'house.yaml': text.replace(from, to), ...others })))
    .problems;
}

const brief = (problems: readonly Problem[]) => problems.map(({ code, path }) => [code, path]);

test('both sample scenarios are sound', () => {
  for (const text of [scenarioText, lumpedText]) {
    const { loaded, problems } = loadScenario('house.yaml', memoryFiles(sampleFiles({ 'house.yaml': text })));
    expect(problems).toEqual([]);
    expect(loaded).toBeDefined();
  }
});

describe('of the house it is refused', () => {
  test.each([
    [
      'outdoorTemperature: -12',
      'outdoorTemperature: 15, roomTemperature: 15',
      'scenario.contradiction',
      'house.design.outdoorTemperature',
    ],
    [
      '{ given: coefficient, value: 180 }',
      '{ given: load, value: 6, outdoorTemperature: 15, roomTemperature: 12 }',
      'scenario.contradiction',
      'house.heatLoss.outdoorTemperature',
    ],
    [
      'internalGains: 300',
      'internalGains: 300\n    baseTemperature: 15',
      'scenario.base-and-gains',
      'house.need.internalGains',
    ],
    [
      'internalGains: 300',
      'solarAperture: 3\n    baseTemperature: 15',
      'scenario.base-and-gains',
      'house.need.solarAperture',
    ],
    [
      '{ given: coefficient, value: 180 }',
      '{ given: elements, elements: [{ name: w, area: 10, uValue: 0.1 }], thermalBridges: [{ name: b, length: 99, psi: -1 }], ventilation: { volume: 1, airChanges: 0 } }',
      'scenario.no-heat-loss',
      'house.heatLoss',
    ],
  ])('%s -> %s', (from, to, code, path) => {
    expect(brief(changed(scenarioText, from, to)).filter(([c]) => c !== 'scenario.sun-without-radiation')).toEqual([
      [code, path],
    ]);
  });

  test.each([
    ['  floorArea: 120\n', '', 'scenario.needs-floor-area', 'house.need.model'],
    ['opaque: 0.5', 'opaque: 0.51', 'scenario.loss-shares', 'house.need.lossShares'],
    ['floorArea: 120', 'floorArea: 5', 'house.opaque-loss', 'house.heatLoss'],
    ['setPoint: 17, start', 'start', 'scenario.rule-set-point', 'house.need.schedule[0]'],
    ['setPoint: 17, start', 'setPoint: 17, raise: 1, start', 'scenario.rule-set-point', 'house.need.schedule[0]'],
    ['rate: night', 'rate: nigth', 'scenario.no-such-rate', 'house.need.schedule[1].rate'],
  ])('lumped: %j -> %j', (from, to, code, path) => {
    expect(brief(changed(lumpedText, from, to))).toEqual([[code, path]]);
  });

  test('lumped, shares are let pass within a thousandth', () => {
    expect(changed(lumpedText, 'opaque: 0.5', 'opaque: 0.5005')).toEqual([]);
  });
});

describe('a set-back within the day, with degree hours', () => {
  const cure = /lumped/;

  test('is refused with the reason, not as an unknown key', () => {
    const schedule = 'internalGains: 300\n    schedule: [{ name: night, setPoint: 17, start: "22:00", end: "06:00" }]';
    const [problem, ...rest] = changed(scenarioText, 'internalGains: 300', schedule);
    expect(rest).toEqual([]);
    expect(problem).toMatchObject({ code: 'scenario.set-back-needs-mass', path: 'house.need.schedule', line: 13 });
    expect(problemText(problem!)).toMatch(/twofold/);
    expect(problemText(problem!)).toMatch(cure);
  });

  test('is refused where times stand in a rule for days', () => {
    const days = 'internalGains: 300\n    days: [{ name: night, setPoint: 17, start: "22:00", end: "06:00" }]';
    expect(brief(changed(scenarioText, 'internalGains: 300', days))).toEqual([
      ['scenario.set-back-needs-mass', 'house.need.days[0].start'],
      ['scenario.set-back-needs-mass', 'house.need.days[0].end'],
    ]);
  });

  test('leaves a plain slip in such a rule an unknown key', () => {
    const days = 'internalGains: 300\n    days: [{ name: away, setPoint: 14, wekdays: [mon] }]';
    expect(brief(changed(scenarioText, 'internalGains: 300', days))).toEqual([
      ['entry.unknown-key', 'house.need.days[0].wekdays'],
    ]);
  });
});

describe('of the flow temperature it is refused', () => {
  test.each([
    ['return: 38', 'return: 45', 'flowTemperature.flow'],
    ['flow: 45\n  return: 38', 'flow: 26\n  return: 20\n  roomTemperature: 26', 'flowTemperature.flow'],
    ['flow: 45\n  return: 38', 'flow: 30\n  return: 20\n  roomTemperature: 26', 'flowTemperature.return'],
    ['return: 38', 'return: 38\n  lowestFlow: 50', 'flowTemperature.flow'],
    ['return: 38', 'return: 38\n  lowestFlow: 40\n  highestFlow: 35', 'flowTemperature.highestFlow'],
  ])('%j -> %j', (from, to, path) => {
    expect(brief(changed(scenarioText, from, to))).toEqual([['scenario.contradiction', path]]);
  });

  test('a curve that does not rise, at its point', () => {
    expect(changed(lumpedText, '[15, 28]', '[-12, 40], [-20, 28]')).toMatchObject([
      { code: 'scenario.points-not-rising', path: 'flowTemperature.points[1]', found: '−12 °C', allowed: '−12 °C' },
      { code: 'scenario.points-not-rising', path: 'flowTemperature.points[2]', found: '−20 °C', allowed: '−12 °C' },
    ]);
  });
});

describe('of the boiler it is refused', () => {
  const boiler = (points: string, flow: string) =>
    `name: Test\nboiler: { efficiency: { byReturnTemperature: ${points}, flowTemperature: ${flow} }, fuel: { kind: naturalGas, price: 0.1 } }`;

  test.each([
    ['[[30, 0.97], [20, 0.9]]', '{ method: fixed, flow: 60 }', 'scenario.points-not-rising', 'byReturnTemperature[1]'],
    ['[[30, 0.97]]', '{ method: emitters, flow: 60, return: 70 }', 'scenario.contradiction', 'flowTemperature.flow'],
    ['[[30, 97]]', '{ method: fixed, flow: 60 }', 'entry.out-of-range', 'byReturnTemperature[0][1]'],
    ['[[30, 0.97]]', '{ method: fixd, flow: 60 }', 'entry.not-a-choice', 'flowTemperature.method'],
    ['[[30, 0.97]]', '{ method: fixed, flo: 60 }', 'entry.unknown-key', 'flowTemperature.flo'],
  ])('%s with %s', (points, flow, code, path) => {
    expect(brief(changed(scenarioText, 'name: Test house', boiler(points, flow)))).toEqual([
      [code, `boiler.efficiency.${path}`],
    ]);
  });

  test('nothing where all is sound', () => {
    const sound = boiler('[[30, 0.97], [60, 0.88]]', '{ method: curve, points: [[-10, 70], [15, 40]] }');
    expect(changed(scenarioText, 'name: Test house', sound)).toEqual([]);
  });
});

describe('of rules it is refused', () => {
  const days = (when: string) => `internalGains: 300\n    days: [{ name: away, setPoint: 14, ${when} }]`;

  test.each([
    ['from: 02-30, to: 03-05', 'scenario.no-such-date', 'house.need.days[0].from'],
    ['from: 2025-02-29, to: 2025-03-05', 'scenario.no-such-date', 'house.need.days[0].from'],
    ['from: 02-20', 'scenario.half-a-period', 'house.need.days[0].to'],
    ['to: 02-20', 'scenario.half-a-period', 'house.need.days[0].from'],
    ['from: 2025-02-20, to: 03-05', 'scenario.mixed-dates', 'house.need.days[0].to'],
    ['from: 2025-03-20, to: 2025-03-05', 'scenario.ends-before', 'house.need.days[0].to'],
  ])('%s', (when, code, path) => {
    expect(brief(changed(scenarioText, 'internalGains: 300', days(when)))).toEqual([[code, path]]);
  });

  test.each([
    'from: 02-20, to: 03-05',
    'from: 12-20, to: 01-06',
    'from: 2024-12-20, to: 2025-01-06',
    'from: 02-29, to: 03-01',
  ])('%s is let pass', (when) => {
    expect(changed(scenarioText, 'internalGains: 300', days(when))).toEqual([]);
  });

  test('of another year than the calendar there is a warning', () => {
    const problems = changed(scenarioText, 'internalGains: 300', days('from: 2023-02-20, to: 2023-03-05'));
    expect(problems).toMatchObject([{ code: 'scenario.other-year', severity: 'warning', allowed: '2025' }]);
  });

  test('quiet hours and reheat windows of no length', () => {
    expect(brief(changed(lumpedText, 'end: "06:00", capacity', 'end: "22:00", capacity'))).toEqual([
      ['scenario.empty-window', 'heatPump.quietHours[0].end'],
    ]);
    const windows = 'volume: 200\n  reheatWindows: [{ start: "12:00", end: "12:00" }]';
    expect(brief(changed(lumpedText, 'volume: 200', windows))).toEqual([
      ['scenario.empty-window', 'hotWater.reheatWindows[0].end'],
    ]);
  });

  test('a rate without any tariff', () => {
    const problems = changed(lumpedText, 'tariffs: [tariff.yaml]\n', '');
    expect(brief(problems)).toEqual([
      ['scenario.rate-needs-tariff', 'house.need.schedule[1].rate'],
      ['scenario.cheapest-needs-tariff', 'backup.mode'],
    ]);
  });
});

describe('of hot water it is refused', () => {
  test.each([
    [
      'useTemperature: 42',
      'useTemperature: 42, shares: [0,0,0,0,0,0,0,0,0,0,0,0,0,0,0,0,0,0,0,0,0,0,0,0]',
      'scenario.no-shares',
      'hotWater.draw.shares',
    ],
    ['mean: 10, amplitude: 4', 'mean: 28, amplitude: 15', 'scenario.contradiction', 'hotWater.draw.useTemperature'],
    ['mean: 10, amplitude: 4', 'mean: 10, amplitude: 11', 'scenario.frozen-water', 'hotWater.coldWater.amplitude'],
    [
      'hour: 12',
      'hour: 12, temperature: 50 }\n  setPoint: 55 #',
      'scenario.hygiene-below-set-point',
      'hotWater.hygiene.temperature',
    ],
    ['volume: 200', 'volume: 200\n  setPoint: 30', 'scenario.contradiction', 'hotWater.setPoint'],
  ])('%j -> %j', (from, to, code, path) => {
    const text = to.startsWith('volume')
      ? lumpedText.replace('mean: 10, amplitude: 4', 'mean: 25, amplitude: 6')
      : lumpedText;
    const found = brief(changed(text, from, to));
    expect(found).toContainEqual([code, path]);
    expect(found.filter(([c]) => c !== code)).toEqual([]);
  });
});

describe('of prices it is refused', () => {
  test('another currency than the scenario counts in, at the tariff', () => {
    const problems = changed(scenarioText, 'name: Test', 'currency: CHF\nname: Test');
    expect(problems).toMatchObject([
      { code: 'scenario.currency', file: 'tariff.yaml', line: 2, found: 'EUR', allowed: 'CHF' },
    ]);
    expect(
      changed(scenarioText, 'name: Test', 'name: Test', { 'tariff.yaml': tariffText.replace('EUR', 'eur') }),
    ).toEqual([]);
  });

  test('the cheapest source with a tariff of blocks alone', () => {
    const blocks = 'name: b\nblocks: { per: month, prices: [{ price: 0.3 }] }\n';
    const text = lumpedText.replace('      - { name: cheap, raise: 1, rate: night }\n', '');
    expect(brief(changed(text, 'name: Lumped', 'name: Lumped', { 'tariff.yaml': blocks }))).toEqual([
      ['scenario.cheapest-needs-price', 'backup.mode'],
    ]);
  });
});

describe('of the weather it is refused', () => {
  test('a solar aperture without radiation', () => {
    const [problem] = changed(scenarioText, 'internalGains: 300', 'solarAperture: 3');
    expect(problem).toMatchObject({ code: 'scenario.sun-without-radiation', found: '3', allowed: 'weather.csv' });
    const sunny = { 'weather.csv': weatherText({ radiation: true }) };
    expect(changed(scenarioText, 'internalGains: 300', 'solarAperture: 3', sunny)).toEqual([]);
  });

  test('a leap year of weather on a common year, and an unknown zone', () => {
    const leap = { 'weather.csv': weatherText({ hours: 8784, year: 2024 }) };
    expect(changed(scenarioText, 'name: Test', 'name: Test', leap)).toMatchObject([
      { code: 'clock.common-year', file: 'house.yaml', line: 2, path: 'site.calendarYear' },
    ]);
    expect(brief(changed(scenarioText, 'Europe/Berlin', 'Europe/Berlim'))).toContainEqual([
      'clock.unknown-zone',
      'site.zone',
    ]);
  });
});
