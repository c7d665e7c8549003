import { expect, test } from 'vitest';
import type { Problem } from '../../../src/core/problem.ts';
import { mapProblems } from '../../../src/core/problems/mapProblems.ts';
import { scenarioProblems } from '../../../src/core/problems/scenarioProblems.ts';
import { problemText } from '../../../src/core/problemText.ts';
import { checkFile } from '../../../src/scenario/checkFile.ts';
import { memoryFiles } from './memoryFiles.ts';
import { lumpedText, sampleFiles, scenarioText, unitText } from './sampleFiles.ts';

/** A change of a sample file that brings a problem forth, and its message without the file's name. */
type Case = readonly [changes: Record<string, string>, message: string];

const house = (from: string, to: string, text = scenarioText): Record<string, string> => ({
  'house.yaml': text.replace(from, to),
});
const lumped = (from: string, to: string) => house(from, to, lumpedText);
const days = (when: string) => house('internalGains: 300', `days: [{ name: away, setPoint: 14, ${when} }]`);
const unit = (from: string, to: string) => ({ 'unit.yaml': unitText.replace(from, to) });
const lowest = (rows: string) =>
  unit(
    '  fullLoad:',
    `  lowestLevel:\n    given: table\n    capacity: |\n      x 35\n${rows}\n    cop: |\n      x 35\n      -7 3\n      2 3.7\n  fullLoad:`,
  );
const humid = (from: string, to: string) => ({
  'unit.yaml': `${unitText.replace(from, to)}defrost: { method: humidity }\n`,
});

const shares = (value: number) => `[${Array(24).fill(value).join()}]`;
/** A section added to the scenario. */
const beside = (section: string, tariffs = 'tariffs: [tariff.yaml]') =>
  house('tariffs: [tariff.yaml]', `${section}\n${tariffs}`);
const byRate = (...rates: string[]) =>
  beside(
    `carbon: { electricity: { given: byRate, factors: [${rates.map((rate) => `{ rate: ${rate}, factor: 0.3 }`).join()}] } }`,
  );
const otherTariff = 'name: Other\npricesStated: withTax\nrates: [{ name: all, price: 0.3 }]\n';

const cases: Record<keyof typeof scenarioProblems | keyof typeof mapProblems, Case> = {
  'yaml.not-text': [house('name', '\u0000'), 'this is not a text file'],
  'yaml.syntax': [house('name: Test', 'name: a: Test'), ':1:7  the file cannot be understood here: Nested mappings'],
  'yaml.too-deep': [
    house('name: Test house', `name: ${'['.repeat(70)}`),
    'sections stand within sections, more than 64 levels',
  ],
  'yaml.tag': [house('name: Test', 'name: !t Test'), ":1:7  '!t' has no meaning here"],
  'yaml.alias': [house('name: Test house', 'name: *x'), ":1:7  '*x' cannot be used: a reference follows its anchor"],
  'yaml.several-documents': [house('house:\n', '---\nhouse:\n'), ':6:1  a second document begins here'],
  'yaml.no-keys': [
    { 'unit.yaml': '- a\n- b\n' },
    'unit.yaml:1:1  the file holds a list; it must hold keys with values',
  ],
  'yaml.key-not-a-word': [house('name: Test house', 'name: Test house\n? [a]\n: 1'), ':2:3  a key must be a word'],
  'yaml.repeated-key': [
    house('floorArea: 120', 'floorArea: 120\n  floorArea: 90'),
    'house.floorArea stands twice; first in line 8',
  ],
  'entry.missing': [
    house('  return: 38\n', ''),
    'flowTemperature.return is missing; a temperature lies between 20 and 85 °C',
  ],
  'entry.empty': [
    house('floorArea: 120', 'floorArea:'),
    ':8:13  house.floorArea has no value; an area lies between 5 and',
  ],
  'entry.unknown-key': [
    house('floorArea', 'flourArea'),
    ':8:3  house.flourArea is not known here\n    → perhaps floorArea is meant',
  ],
  'entry.wrong-kind': [house('120', 'large'), "house.floorArea is 'large'; an area lies between"],
  'entry.out-of-range': [
    house('-12', '-120'),
    'house.design.outdoorTemperature is -120; a temperature lies between −50 and 15 °C',
  ],
  'entry.not-a-choice': [
    house('degreeHours', 'degreHours'),
    "house.need.model is 'degreHours'; it is one of degreeHours and lumped",
  ],
  'entry.wrong-form': [
    house('name: Test', 'currency: euro\nname: Test'),
    "currency is 'euro'; it is written as three capital letters",
  ],
  'entry.wrong-length': [
    lumped('[[-12, 45], [15, 28]]', '[]'),
    'flowTemperature.points has 0 entries; it is a list of 1 to 50 entries',
  ],
  'scenario.contradiction': [
    house('return: 38', 'return: 46'),
    'flowTemperature.flow is 45 °C; it must lie above the return temperature (46 °C)',
  ],
  'scenario.points-not-rising': [
    lumped('[15, 28]', '[-15, 28]'),
    'flowTemperature.points[1] is at −15 °C, not above the point before it at −12 °C',
  ],
  'scenario.no-heat-loss': [
    house(
      '{ given: coefficient, value: 180 }',
      '{ given: elements, elements: [{ name: w, area: 10, uValue: 0.1 }], thermalBridges: [{ name: b, length: 99, psi: -1 }], ventilation: { volume: 1, airChanges: 0 } }',
    ),
    // 10 · 0.1 − 99 W/K
    'house.heatLoss comes to -98.0 W/K; a house loses heat',
  ],
  'scenario.needs-floor-area': [
    lumped('  floorArea: 120\n', ''),
    'house.need.model is lumped, which needs the floor area',
  ],
  'scenario.loss-shares': [
    lumped('opaque: 0.5', 'opaque: 0.4'),
    'windows, opaque and ventilation add up to 0.9, not to 1',
  ],
  'house.opaque-loss': [lumped('floorArea: 120', 'floorArea: 5'), 'more than the mass of the lumped model can pass on'],
  'scenario.base-and-gains': [
    house('internalGains: 300', 'internalGains: 300\n    baseTemperature: 15'),
    'house.need.internalGains is 300, but a base temperature is entered',
  ],
  'scenario.set-back-needs-mass': [
    house('internalGains: 300', 'schedule: [{ name: night, setPoint: 17, start: "22:00", end: "06:00" }]'),
    'house.need.schedule changes the room temperature within a day',
  ],
  'scenario.empty-window': [
    lumped('end: "06:00", capacity', 'end: "22:00", capacity'),
    'heatPump.quietHours[0].end is 22:00, the same as its start',
  ],
  'scenario.half-a-period': [days('from: 02-01'), 'house.need.days[0].to is missing beside the other end'],
  'scenario.no-such-date': [
    days('from: 02-30, to: 03-05'),
    'house.need.days[0].from is 02-30, a day that does not exist',
  ],
  'scenario.mixed-dates': [
    days('from: 2025-02-01, to: 03-05'),
    'house.need.days[0].to is 03-05, but the period begins on 2025-02-01',
  ],
  'scenario.ends-before': [
    days('from: 2025-04-01, to: 2025-03-05'),
    'house.need.days[0].to is 2025-03-05, before the beginning on 2025-04-01',
  ],
  'scenario.other-year': [
    days('from: 2023-04-01, to: 2023-05-05'),
    'warning: house.need.days[0].from is 2023-04-01, but the calendar year is 2025',
  ],
  'scenario.rule-set-point': [
    lumped('setPoint: 17, start', 'start'),
    'house.need.schedule[0] has neither setPoint nor raise',
  ],
  'scenario.rate-needs-tariff': [
    lumped('tariffs: [tariff.yaml]', 'tariffs: []'),
    'house.need.schedule[1].rate follows the rate of a tariff',
  ],
  'scenario.no-such-rate': [
    lumped('rate: night', 'rate: nite'),
    "house.need.schedule[1].rate is 'nite'; the first tariff has 'night', 'day'",
  ],
  'scenario.cheapest-needs-tariff': [
    lumped('tariffs: [tariff.yaml]', 'tariffs: []'),
    'backup.mode compares electricity with fuel, but no tariff is named',
  ],
  'scenario.cheapest-needs-price': [
    {
      ...lumped('      - { name: cheap, raise: 1, rate: night }\n', ''),
      'tariff.yaml': 'name: b\nblocks: { per: month, prices: [{ price: 0.3 }] }\n',
    },
    "backup.mode compares prices by the hour, but the tariff 'b' is priced by blocks alone",
  ],
  'scenario.no-shares': [
    lumped('useTemperature: 42', `shares: [${Array(24).fill(0).join()}]`),
    'hotWater.draw.shares are all zero',
  ],
  'scenario.weekend-alone': [
    beside(`household: { given: profile, kWhPerYear: 2000, weekendShares: ${shares(1)} }`),
    ':20:48  household.weekendShares stands without the shares of the other days',
  ],
  'scenario.boiler-needs-tariff': [
    beside('boiler: { efficiency: 1, fuel: { kind: electricity } }', ''),
    'boiler.fuel is electricity without a price, which is on the household’s tariff, but no tariff is named',
  ],
  'scenario.cylinder-without-hot-water': [
    beside('boiler: { efficiency: 0.9, fuel: { kind: naturalGas, price: 0.1 }, cylinderLoss: 400 }'),
    'boiler.cylinderLoss is 400 kWh a year, but no hot water is entered',
  ],
  'scenario.carbon-needs-tariff': [
    { 'house.yaml': (byRate('night')['house.yaml'] ?? '').replace('tariffs: [tariff.yaml]', '') },
    'carbon.electricity.factors go by the rates of a tariff, but no tariff is named',
  ],
  'scenario.carbon-no-such-rate': [
    byRate('night', 'dey'),
    "carbon.electricity.factors[1].rate is 'dey'; the first tariff has 'night', 'day'\n    → perhaps day is meant",
  ],
  'scenario.carbon-rate-twice': [
    byRate('night', 'day', 'night'),
    "carbon.electricity.factors[2].rate is 'night', which has a factor already",
  ],
  'scenario.carbon-rate-missing': [
    byRate('night'),
    "carbon.electricity.factors lack the rate 'day' of the first tariff",
  ],
  'scenario.whole-life-needs-boiler': [
    beside('wholeLife: { capital: 20000 }'),
    ':20:1  wholeLife compares a heat pump with a boiler over the years, but no boiler is entered',
  ],
  'scenario.whole-life-needs-tariff': [
    beside('wholeLife: { capital: 20000 }', ''),
    'wholeLife needs the cost of a year, but no tariff is named',
  ],
  'scenario.taxes-differ': [
    { ...beside('', 'tariffs: [tariff.yaml, other.yaml]'), 'other.yaml': otherTariff },
    // the first tariff of these files lists no tax and adds none
    ':21:24  warning: the prices of this tariff hold the taxes; those of the first tariff are stated without tax, and none is listed',
  ],
  'scenario.taxes-mixed': [
    {
      ...beside('', 'tariffs: [{ supplies: [{ file: tariff.yaml }, { file: other.yaml, from: 05-01 }] }]'),
      'other.yaml': otherTariff,
    },
    'warning: the prices of this tariff state the taxes in more than one way',
  ],
  'scenario.frozen-water': [
    lumped('amplitude: 4', 'amplitude: 11'),
    'hotWater.coldWater.amplitude is 11 K, more than the mean',
  ],
  'scenario.hygiene-below-set-point': [
    lumped('hour: 12', 'hour: 12, temperature: 50 }\n  setPoint: 55 #'),
    'warning: hotWater.hygiene.temperature is 50 °C, the set point is 55 °C: the weekly run goes to the set point',
  ],
  'scenario.sun-without-radiation': [
    house('internalGains: 300', 'solarAperture: 2'),
    'house.need.solarAperture is 2 m², but the weather file weather.csv has no radiation',
  ],
  'scenario.currency': [
    house('name: Test', 'currency: GBP\nname: Test'),
    'tariff.yaml:2:11  currency is EUR, but the scenario counts in GBP',
  ],
  'scenario.unknown-kind': [{ 'house.yaml': 'colour: red\n' }, 'its keys are colour'],
  'map.no-table': [
    {
      'unit.yaml': unitText.replace(
        /capacity: \|\n[^:]*(?= {4}cop)/,
        'capacity: |\n      # to be filled in\n      # later\n',
      ),
    },
    'map.fullLoad.capacity holds no table',
  ],
  'map.not-a-block': [
    { 'unit.yaml': unitText.replace(/capacity: \|/, 'capacity: >') },
    ':4:15  map.fullLoad.capacity stands on one line; a table keeps its lines only behind “|”',
  ],
  'map.axis': [
    unit('W35  W45  W55\n      A-15     5.0', 'W35  W45  W5\n      A-15     5.0'),
    "map.fullLoad.capacity has 'W5' on an axis; a flow temperature lies between 15 and 100 °C",
  ],
  'map.repeated': [
    unit('A-7      6.0', 'A-15     6.0'),
    'map.fullLoad.capacity has the outdoor temperature −15 °C twice; first in line 6',
  ],
  'map.unsorted': [
    unit(
      'A-15     5.0  4.8  4.6\n      A-7      6.0  5.8  5.6',
      'A-7      6.0  5.8  5.6\n      A-15     5.0  4.8  4.6',
    ),
    'warning: in map.fullLoad.capacity the outdoor temperatures stand out of order here',
  ],
  'map.ragged': [
    unit('5.0  4.8  4.6', '5.0  4.8'),
    ':6:7  in map.fullLoad.capacity this row has 2 values for 3 flow temperatures',
  ],
  'map.not-a-number': [
    unit('4.2', '4.2.1'),
    ":15:16  map.fullLoad.cop[A7/W35] is '4.2.1'; a COP lies between 0.5 and 12",
  ],
  'map.out-of-range': [
    unit('4.2', '420'),
    ':15:16  map.fullLoad.cop[A7/W35] is 420; a COP lies between 0.5 and 12\n    → write 4.2 for 420 %',
  ],
  'map.more': [
    { 'unit.yaml': unitText.replace(/(\d)\.(\d) /g, '$1$200 ') },
    'more such faults in map.fullLoad.capacity',
  ],
  'map.which-second': [
    { 'unit.yaml': unitText.replace(/ {4}cop: [^:]*/, '') },
    ':3:3  map.fullLoad has neither cop nor inputPower; beside the capacity it needs either',
  ],
  'map.axes-differ': [
    unit('A7       4.2', 'A8       4.2'),
    'map.fullLoad.cop lacks the row of 7 °C, unlike map.fullLoad.capacity',
  ],
  'map.sparse-column': [
    unit(
      '2.4  2.0  1.7\n      A-7      2.9  2.4  2.0\n      A2       3.6  2.9  2.4',
      '2.4  2.0  -\n      A-7      2.9  2.4  -\n      A2       3.6  2.9  -',
    ),
    'in map.fullLoad.cop the column of 55 °C has fewer than two points',
  ],
  'map.input-above-capacity': [
    { 'unit.yaml': unitText.replace('cop:', 'inputPower:').replace('2.4  2.0', '5.0  2.0') },
    'map.fullLoad.inputPower[A-15/W35] is 5 kW, not below the capacity of 5 kW',
  ],
  'map.above-carnot': [
    unit('4.2', '8.2'),
    'map.fullLoad.cop[A7/W35]: a COP of 8.20 is more than physics allows at this point (8.19)',
  ],
  'map.lowest-above-carnot': [
    unit('  fullLoad:', '  lowestLevel: { given: share, cop: 2 }\n  fullLoad:'),
    'map.lowestLevel.cop: 2 × 4.20 at A7/W35 is more than physics allows there (8.19)',
  ],
  'map.lowest-above-full': [
    lowest('      -7 6.5\n      2 3'),
    'warning: map.lowestLevel.capacity[A-7/W35] is 6.5 kW, more than the full load of 6 kW',
  ],
  'map.looks-mistyped': [
    unit('A2       3.6', 'A2       2.6'),
    'warning: the COP at map.fullLoad.cop[A2/W35] is far off the line of its neighbours',
  ],
  'map.rising-cop': [
    unit('3.3  2.8', '3.3  3.5'),
    'warning: map.fullLoad.cop[A7/W55]: the COP rises from 3.30 to 3.50 with a hotter flow',
  ],
  'map.looks-integrated': [
    humid('A2       7.0', 'A2       6.5'),
    'warning: the capacity at map.fullLoad.capacity[A2/W35] sags',
  ],
};

function problemsOf(changes: Record<string, string>): Problem[] {
  return [...checkFile('house.yaml', memoryFiles(sampleFiles(changes))).problems];
}

test.each(Object.entries(cases).map(([code, [changes, message]]) => ({ code, changes, message })))(
  '$code is brought forth and worded',
  ({ code, changes, message }) => {
    const found = problemsOf(changes).filter((problem) => problem.code === code);
    expect(found).not.toEqual([]);
    const text = found.map(problemText).join('\n');
    expect(message).not.toBe('');
    expect(text).toContain(message);
    expect(text).toMatch(/→ \S/);
    expect(text).not.toMatch(/undefined|NaN|\{\w+\}/);
  },
);

test('every code of the two catalogues has its case', () => {
  expect(Object.keys(cases).sort()).toEqual([...Object.keys(scenarioProblems), ...Object.keys(mapProblems)].sort());
});
