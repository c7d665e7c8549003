import { describe, expect, it } from 'vitest';
import { parseDocument, stringify } from 'yaml';
import { rowResult } from '../../../src/batch/row.ts';
import { problemText } from '../../../src/core/problemText.ts';
import { makeAnswer } from '../../../src/scenario/answer/makeAnswer.ts';
import { loadScenario } from '../../../src/scenario/loadScenario.ts';
import { memoryFiles } from '../scenario/memoryFiles.ts';
import { lumpedText, sampleFiles, scenarioText, tariffText, unitText, weatherText } from '../scenario/sampleFiles.ts';
import { baseHome, runnerOf } from './batchFiles.ts';

const head = 'name: Test\nscenario: house.yaml\naxes:\n';
const AXES = [
  '  - { given: values, name: loss, path: house.heatLoss.value, values: [150, 210] }',
  '  - { given: values, name: flow, path: flowTemperature.flow, values: [55, 48] }',
].join('\n');

/** What `simulate` finds for a scenario that is written out with its changes. */
function simulated(text: string, changes: Record<string, unknown>) {
  const document = parseDocument(text);
  for (const [place, value] of Object.entries(changes)) {
    if (value === null) document.deleteIn(place.split('.'));
    else document.setIn(place.split('.'), value);
  }
  const files = sampleFiles({ ...otherFiles, 'house.yaml': document.toString() });
  const { loaded, problems } = loadScenario('house.yaml', memoryFiles(files));
  const { answer } = makeAnswer(loaded!, problems);
  const costs = answer!.costs.map((cost) => ({ ...cost, billTotal: cost.bill.total }));
  return rowResult({ ...answer!, costs }, answer!.warnings);
}

const condensing = {
  efficiency: {
    byReturnTemperature: [
      [30, 0.98],
      [60, 0.88],
    ],
    flowTemperature: { method: 'emitters', flow: 60, return: 45 },
  },
  fuel: { kind: 'naturalGas', price: 0.1 },
};
const secondTariff = tariffText.replace('Test tariff', 'Second').replace('0.2', '0.1');

const otherFiles = {
  'second.yaml': secondTariff,
  'unit2.yaml': unitText.replace('A7       8.0', 'A7       9.0'),
  'weather2.csv': weatherText().replaceAll(/,80$/gm, ',95'),
};

describe('a job of a batch', () => {
  it('finds to the last digit what the same scenario alone finds, whatever ran before it', () => {
    const { runner } = runnerOf(head + AXES);
    for (const option of [0, 3, 1, 2, 0]) {
      const row = runner.run(option + 1, baseHome, option);
      expect(row.problems).toEqual([]);
      const changes = { 'house.heatLoss.value': [150, 210][option >> 1], 'flowTemperature.flow': [55, 48][option % 2] };
      expect(row.result).toEqual(simulated(scenarioText, changes));
    }
  });

  // A house with mass, set-back by rate, quiet hours, hot water, a hybrid in the mode cheapest on two tariffs; then each of
  // them taken out, so that every column and every prepared thing is used by jobs that need it and by jobs that do not.
  it('does so with every part of the model, and without it', () => {
    const options: Record<string, Record<string, unknown>> = {
      whole: {},
      dry: { hotWater: null },
      heater: { backup: { source: 'electric', power: 2 }, 'hotWater.setPoint': 55 },
      light: { 'house.need': { model: 'degreeHours', setPoint: 21, internalGains: 200 } },
      quiet: { 'heatPump.quietHours': [{ start: '01:00', end: '04:00', capacity: 0.2 }] },
      dear: { tariffs: ['second.yaml', 'tariff.yaml'] },
      boiler: { boiler: { efficiency: 0.8, fuel: { kind: 'heatingOil', price: 0.12 } }, 'hotWater.volume': 120 },
      household: { household: { given: 'profile', kWhPerYear: 3000 } },
      'less boiler': { boiler: { efficiency: 0.7, fuel: { kind: 'heatingOil', price: 0.12 } }, 'hotWater.volume': 120 },
      'own flow': { boiler: condensing, 'house.design.roomTemperature': 21 },
      'more household': { household: { given: 'profile', kWhPerYear: 5000 } },
      carbon: { carbon: { electricity: 0.4 } },
      'less carbon': { carbon: { electricity: 0.2 } },
      'less water': { 'hotWater.draw.litresPerDay': 60 },
      'even water': { 'hotWater.coldWater.amplitude': 0 },
      windows: { 'hotWater.reheatWindows': [{ start: '02:00', end: '05:00' }] },
      'other run': { 'hotWater.hygiene.weekday': 'wed' },
      'other zone': { 'site.zone': 'Atlantic/Azores' },
      'other year': { 'site.calendarYear': 2023 },
      'other curve': {
        'flowTemperature.points': [
          [-12, 50],
          [15, 30],
        ],
      },
      'other unit': { 'heatPump.unit': 'unit2.yaml' },
      'other weather': { 'weather.file': 'weather2.csv' },
      'other stamps': { 'weather.read.stamps': 'end' },
      'other night': { 'house.need.schedule': [{ name: 'night', setPoint: 15, start: '22:00', end: '06:00' }] },
      'warmer rooms': { 'house.need.setPoint': 22 },
    };
    const names = Object.keys(options);
    const axis = { given: 'options', name: 'o', options: names.map((name) => ({ name, set: options[name] })) };
    const plan = stringify({ name: 'Test', scenario: 'house.yaml', axes: [axis] });
    const { runner } = runnerOf(plan, { ...otherFiles, 'house.yaml': lumpedText });
    const order = [...names.keys(), ...[...names.keys()].reverse()];
    for (const option of order) {
      const row = runner.run(option + 1, baseHome, option);
      expect(row.problems, names[option]).toEqual([]);
      expect(row.result, names[option]).toEqual(simulated(lumpedText, options[names[option]!]!));
    }
  });

  it('takes a section whole, and changes in it after that', () => {
    const { runner } = runnerOf(
      `${head}  - { given: options, name: b, options: [{ name: o, set: { backup: { source: electric, power: 1 }, backup.power: 9 } }] }`,
    );
    const backup = { source: 'electric', power: 9 };
    expect(runner.run(1, baseHome, 0).result).toEqual(simulated(scenarioText, { backup }));
  });
});

describe('a job that is wrong', () => {
  const textsOf = (axis: string) => {
    const { runner } = runnerOf(head + axis);
    const { result, problems } = runner.run(1, baseHome, 0);
    expect(result).toBeUndefined();
    return problems.map(problemText);
  };

  it('has its problem where the value stands in the plan', () => {
    expect(textsOf('  - { given: values, name: loss, path: house.heatLoss.value, values: [much] }')).toEqual([
      expect.stringMatching(
        /^plan.yaml:4:71 {2}house.heatLoss.value is 'much'; a heat loss lies between 1 and 100000 W\/K\n/,
      ),
    ]);
  });

  it('is held against the checks between entries too', () => {
    expect(textsOf('  - { given: values, name: return, path: flowTemperature.return, values: [60] }')[0]).toMatch(
      /flowTemperature\.flow is \d+ °C; it must lie above the return temperature \(60 °C\)/,
    );
  });

  it('names a file that is not there, and where it is named', () => {
    expect(textsOf('  - { given: values, name: unit, path: heatPump.unit, values: [none.yaml] }')).toEqual([
      'none.yaml:4:64  there is no such file\n    → named in plan.yaml under heatPump.unit',
    ]);
  });

  it('does not spoil the jobs after it', () => {
    const { runner } = runnerOf(
      `${head}  - { given: values, name: loss, path: house.heatLoss.value, values: [-1, 150] }`,
    );
    expect(runner.run(1, baseHome, 0).problems).toHaveLength(1);
    expect(runner.run(2, baseHome, 1).result).toEqual(simulated(scenarioText, { 'house.heatLoss.value': 150 }));
  });
});
