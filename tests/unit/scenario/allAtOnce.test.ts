import { describe, expect, test } from 'vitest';
import { loadScenario } from '../../../src/scenario/loadScenario.ts';
import { memoryFiles } from './memoryFiles.ts';
import { lumpedText, sampleFiles, scenarioText, tariffText, unitText, weatherText } from './sampleFiles.ts';

/** Code and place of every problem of a scenario, in their order. */
function faultsOf(text: string, changes: Record<string, string> = {}): string[] {
  const { loaded, problems } = loadScenario('house.yaml', memoryFiles(sampleFiles({ ...changes, 'house.yaml': text })));
  expect(loaded).toBeUndefined();
  return problems.map(({ code, path, file }) => `${code} ${path ?? file}`);
}

const changed = (text: string, ...changes: [string, string][]) =>
  changes.reduce((all, [from, to]) => {
    expect(all).toContain(from);
    return all.replace(from, to);
  }, text);

/** A fault that the schema finds, in a section that nothing else rests on. */
const WRONG_PUMP: [string, string] = ['heatPump:', 'circulation: { pumpPower: -1 }\nheatPump:'];
const WRONG_PUMP_SAID = 'entry.out-of-range circulation.pumpPower';

describe('beside a fault against the schema, a scenario is told', () => {
  test('of its zone, and of nothing that only follows from it', () => {
    expect(faultsOf(changed(scenarioText, WRONG_PUMP, ['Europe/Berlin', 'Europe/Berln']))).toEqual([
      'clock.unknown-zone site.zone',
      WRONG_PUMP_SAID,
    ]);
    expect(faultsOf(changed(scenarioText, ['altitude: 100', 'altitude: high'], ['Europe/Berlin', 'Berln']))).toEqual([
      'clock.unknown-zone site.zone',
      'entry.wrong-kind site.altitude',
    ]);
  });

  test('of every file that is not there', () => {
    const text = changed(
      scenarioText,
      WRONG_PUMP,
      ['weather.csv', 'w.csv'],
      ['unit.yaml', 'u.yaml'],
      ['[tariff.yaml]', '[t.yaml, 5, { supplies: [{ file: a.yaml }] }]'],
    );
    const more = [
      'household: { given: meter, file: m.csv, unit: MWh }',
      'carbon: { electricity: { given: series, file: c.csv } }',
      '',
    ].join('\n');
    expect(faultsOf(text + more).sort()).toEqual(
      [
        WRONG_PUMP_SAID,
        'file.missing weather.file',
        'file.missing heatPump.unit',
        'file.missing tariffs[0]',
        'entry.wrong-kind tariffs[1]',
        'entry.wrong-length tariffs[2].supplies',
        'file.missing tariffs[2].supplies[0].file',
        'entry.not-a-choice household.unit',
        'file.missing household.file',
        'entry.missing carbon.electricity.unit',
        'file.missing carbon.electricity.file',
      ].sort(),
    );
  });

  test('of what is wrong in its files', () => {
    const { problems } = loadScenario(
      'house.yaml',
      memoryFiles(
        sampleFiles({
          'house.yaml': `${changed(scenarioText, WRONG_PUMP)}household: { given: meter, file: m.csv, unit: kWh }\n`,
          'unit.yaml': unitText.replace('4.2', '420'),
          'tariff.yaml': tariffText.replace('price: 0.3', 'price: x'),
          'weather.csv': weatherText({ hours: 100 }),
          'm.csv': 'time,kWh\n2025-01-01T00:00,1\n',
        }),
      ),
    );
    expect(new Set(problems.map(({ file }) => file))).toEqual(
      new Set(['house.yaml', 'unit.yaml', 'tariff.yaml', 'weather.csv', 'm.csv']),
    );
  });

  test('of what does not go together in its sound parts', () => {
    const text = changed(
      lumpedText,
      WRONG_PUMP,
      ['outdoorTemperature: -12', 'outdoorTemperature: 15, roomTemperature: 12'],
      ['windows: 0.3', 'windows: 0.4'],
      ['rate: night', 'rate: nigth'],
      ['[15, 28]', '[-12, 28]'],
      ['end: "06:00", capacity', 'end: "22:00", capacity'],
      ['amplitude: 4', 'amplitude: 11'],
    );
    expect(faultsOf(text)).toEqual(
      expect.arrayContaining([
        WRONG_PUMP_SAID,
        'scenario.contradiction house.design.outdoorTemperature',
        'scenario.loss-shares house.need.lossShares',
        'scenario.no-such-rate house.need.schedule[1].rate',
        'scenario.points-not-rising flowTemperature.points[1]',
        'scenario.empty-window heatPump.quietHours[0].end',
        'scenario.frozen-water hotWater.coldWater.amplitude',
      ]),
    );
  });

  test('of contradictions in a section whose other entries have faults', () => {
    const text = changed(
      scenarioText,
      ['floorArea: 120', 'floorArea: large'],
      ['outdoorTemperature: -12', 'outdoorTemperature: 15, roomTemperature: 12'],
      ['return: 38', 'return: 50'],
    );
    expect(faultsOf(text)).toEqual([
      'entry.wrong-kind house.floorArea',
      'scenario.contradiction house.design.outdoorTemperature',
      'scenario.contradiction flowTemperature.flow',
    ]);
  });
});

describe('nothing is said that only follows from a fault', () => {
  test.each<[string, string, [string, string][], string[]]>([
    [
      'a mistyped list of tariffs is not missed by what needs tariffs',
      `${lumpedText}boiler: { efficiency: 0.9, fuel: { kind: electricity } }\n`,
      [['tariffs:', 'tarifs:']],
      ['entry.unknown-key tarifs'],
    ],
    [
      'a list of tariffs with a fault is not missed either',
      lumpedText,
      [['[tariff.yaml]', 'tariff.yaml']],
      ['entry.wrong-kind tariffs'],
    ],
    [
      'a mistyped floor area is not missed by the lumped house',
      lumpedText,
      [['floorArea', 'floorAera']],
      ['entry.unknown-key house.floorAera'],
    ],
    [
      'a design that could not be read bounds no flow temperature',
      scenarioText,
      [
        ['outdoorTemperature: -12', 'outdoorTemperature: -12, roomTemperature: warm'],
        ['flow: 45', 'flow: 39'],
      ],
      ['entry.wrong-kind house.design.roomTemperature'],
    ],
    [
      'a weather file is not read without the settings that go with it',
      scenarioText,
      [['stamps: begin', 'stamps: beginning']],
      ['entry.not-a-choice weather.read.stamps'],
    ],
    [
      'stamps in local time are not read without a zone',
      `${scenarioText}household: { given: meter, file: m.csv, unit: kWh, stamps: local }\n`,
      [['zone: Europe/Berlin', 'zone: 5']],
      ['entry.wrong-kind site.zone'],
    ],
    [
      'nor by a zone that no one knows',
      `${scenarioText}household: { given: meter, file: m.csv, unit: kWh, stamps: local }\n`,
      [['zone: Europe/Berlin', 'zone: Mars/Base']],
      ['clock.unknown-zone site.zone'],
    ],
    [
      'a calendar year that is none dates no rule',
      scenarioText,
      [
        ['altitude: 100', 'calendarYear: 20250'],
        [
          'internalGains: 300',
          'internalGains: 300\n    days: [{ name: away, setPoint: 15, from: 2024-01-01, to: 2024-02-01 }]',
        ],
      ],
      ['entry.out-of-range site.calendarYear'],
    ],
  ])('%s', (_, text, changes, expected) => {
    // the doubled hour of an autumn: only local time places its stamps
    const meter = 'time,kWh\n2025-10-26T01:30,1\n2025-10-26T02:00,1\n2025-10-26T02:30,1\n2025-10-26T02:00,1\n';
    expect(faultsOf(changed(text, ...changes), { 'm.csv': meter })).toEqual(expected);
  });

  test('whatever is written where a section should stand', () => {
    for (const raw of ['5', '[]', 'text', 'null', '{ a: { b: 1 } }', '[[1]]']) {
      for (const section of ['site', 'weather', 'house', 'heatPump', 'tariffs', 'carbon', 'household']) {
        const text = `name: T\n${section}: ${raw}\n`;
        const codes = loadScenario('house.yaml', memoryFiles({ 'house.yaml': text })).problems.map(({ code }) => code);
        expect(codes.filter((code) => !code.startsWith('entry.'))).toEqual([]);
      }
    }
  });
});
