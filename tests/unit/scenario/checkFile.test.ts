import { describe, expect, test } from 'vitest';
import { checkFile } from '../../../src/scenario/checkFile.ts';
import { memoryFiles } from './memoryFiles.ts';
import { sampleFiles, scenarioText, tariffText, unitText } from './sampleFiles.ts';

const check = (name: string, changes: Record<string, string> = {}) =>
  checkFile(name, memoryFiles(sampleFiles(changes)));

describe('an input file', () => {
  test.each([
    ['house.yaml', {}, 'scenario'],
    ['unit.yaml', {}, 'unit'],
    ['tariff.yaml', {}, 'tariff'],
    ['weather.csv', {}, 'weather'],
    ['read.txt', { 'read.txt': '# settings\nstamps: end\nclock: standard\n' }, 'read'],
    ['p.csv', { 'p.csv': 'time;price EUR/MWh\n2025-01-01T00:00Z;5\n2025-01-01T01:00Z;6\n' }, 'priceSeries'],
    ['m.csv', { 'm.csv': `Station: 12\n${sampleFiles()['weather.csv']}` }, 'weather'],
    ['c.csv', { 'c.csv': 'time,carbon g/kWh\n2025-01-01T00:00Z,412\n2025-01-01T01:00Z,388\n' }, 'carbonFactors'],
    ['c2.csv', { 'c2.csv': 'time\tCO2 kg/kWh\n2025-01-01T00:00Z\t0.4\n2025-01-01T01:00Z\t0.3\n' }, 'carbonFactors'],
    ['h.csv', { 'h.csv': 'time,kWh\n2025-01-01T00:00Z,0.3\n2025-01-01T00:15Z,0.2\n' }, 'meter'],
    ['h2.csv', { 'h2.csv': 'Zeit;Verbrauch Wh\n2025-01-01 00:00;300\n2025-01-01 01:00;250\n' }, 'meter'],
    [
      'm1.csv',
      { 'm1.csv': '# of the gas meter\ndate,reading m³,estimated\n2025-01-01,812,\n2025-02-01,990,x\n' },
      'readings',
    ],
    ['m2.csv', { 'm2.csv': 'Datum;Verbrauch kWh\n01.01.2025;0\n01.02.2025;1500,5\n' }, 'readings'],
    ['m3.csv', { 'm3.csv': 'date,fill litres\n2024-01-01,1000\n2024-07-01,1500\n' }, 'readings'],
    ['t.csv', { 't.csv': 'home,house.heatLoss.value,site.altitude\nA,120,\n' }, 'homes'],
    [
      'three.csv',
      { 'three.csv': 'time,price EUR/kWh,note\n2025-01-01T00:00Z,0.3,a\n2025-01-01T01:00Z,0.2,\n' },
      'priceSeries',
    ],
    ['x.csv', { 'x.csv': unitText }, 'unit'],
    ['quoted.yaml', { 'quoted.yaml': scenarioText.replace('house:', '"house":') }, 'scenario'],
  ])('%s is recognised by what stands in it', (name, changes, kind) => {
    const checked = check(name, changes);
    expect(checked.kind).toBe(kind);
    expect(checked.problems).toEqual([]);
    expect(checked.about.length).toBeGreaterThan(0);
  });

  test('says what was recognised and assumed', () => {
    const { about } = check('house.yaml');
    expect(about).toContain('scenario Test house');
    expect(about).toContain('unit Test unit in unit.yaml');
    expect(about).toContain('house.yaml: site.calendarYear was left out; 2025 is assumed');
    expect(about).toContain('unit.yaml: crankcase.power was left out; 0 W is assumed');
    expect(about.some((line) => line.startsWith('weather.csv: '))).toBe(true);
  });

  test.each([
    ['house.yaml', scenarioText.replace('return: 38', 'return: 380'), 'entry.out-of-range'],
    ['unit.yaml', unitText.replace('4.2', '420'), 'map.out-of-range'],
    ['tariff.yaml', tariffText.replace('name: day', 'nme: day'), 'entry.unknown-key'],
    ['tariff.yaml', `${tariffText}  bad\n`, 'yaml.syntax'],
    ['weather.csv', 'time,temperature °C\n2025-01-01T00:00,x\n', undefined],
  ])('%s has all its faults listed', (name, text, code) => {
    const { kind, problems } = check(name, { [name]: text });
    expect(kind).toBe(name === 'house.yaml' ? 'scenario' : name.replace(/\..*/, ''));
    expect(problems.length).toBeGreaterThan(0);
    if (code !== undefined) expect(problems.map((p) => p.code)).toEqual([code]);
  });

  test('of no known kind is refused with what it holds', () => {
    const { kind, problems } = check('x', { x: 'colour: red\nwheels: 4\n' });
    expect(kind).toBeUndefined();
    expect(problems).toMatchObject([{ code: 'scenario.unknown-kind', found: 'its keys are colour and wheels' }]);
  });

  test('that is missing, empty or no text is told so', () => {
    expect(check('none').problems).toMatchObject([{ code: 'file.missing' }]);
    expect(check('e', { e: ' \n' }).problems).toMatchObject([{ code: 'file.empty' }]);
    expect(check('b', { b: 'PK\u0003\u0004' }).problems).toMatchObject([{ code: 'yaml.not-text' }]);
  });

  test.each([
    ['a meter of a household', 'time,kWh\n2025-01-01T00:00Z,0.3\n2025-01-01T01:00Z,x\n', 'meter', 'series.value'],
    ['meter readings', 'date,reading kWh\n2025-01-01,812\n2025-02-01,790\n', 'readings', 'readings.falls'],
    [
      'carbon factors',
      'time,carbon kg/kWh\n2025-01-01T00:00Z,412\n2025-01-01T01:00Z,0\n',
      'carbonFactors',
      'series.value',
    ],
  ])('that holds %s is held against what such a table may hold', (_, text, kind, code) => {
    const checked = check('x.csv', { 'x.csv': text });
    expect(checked.kind).toBe(kind);
    expect(checked.problems.map((p) => p.code)).toEqual([code]);
  });

  test('that may be two things is checked as one, and says so', () => {
    const text = 'time,price EUR/kWh,carbon g/kWh\n2025-01-01T00:00Z,0.3,400\n2025-01-01T01:00Z,0.2,300\n';
    const { kind, about, problems } = check('x.csv', { 'x.csv': text });
    expect({ kind, problems }).toEqual({ kind: 'priceSeries', problems: [] });
    expect(about).toContain(
      'its columns may be carbon factors too: check the file that names it, where the column is named',
    );
  });

  test('whose header says nothing is told how to say it', () => {
    const { kind, problems } = check('x.csv', { 'x.csv': 'time,value\n2025-01-01T00:00Z,1\n2025-01-01T01:00Z,2\n' });
    expect(kind).toBe('weather');
    expect(problems).toMatchObject([
      {
        code: 'weather.no-temperature',
        hint: expect.stringContaining('write the unit into its name: EUR/kWh a price'),
      },
    ]);
  });

  test('of stamps without an offset is not blamed for what the file that names it says', () => {
    const text = 'time,price EUR/kWh\n2025-01-01T00:00,0.3\n2025-01-01T01:00,0.2\n';
    const { about, problems } = check('x.csv', { 'x.csv': text });
    expect(problems).toEqual([]);
    expect(about).toEqual([
      '2 prices, one every 60 minutes',
      'its stamps have no offset: the file that names it has to say whether they are utc or local',
    ]);
  });

  test.each([
    ['a unit row and lines above', 'Met office\nEnergy report\ntime;TT;GG\n;°C;kWh/m²\n'],
    ['radiation as an energy', 'time;TT_TU;Globalstrahlung kWh/m²\n'],
  ])('of weather is weather with %s', (_, head) => {
    const rows = Array.from(
      { length: 30 },
      (_, i) =>
        `2025-01-${String(1 + Math.floor(i / 24)).padStart(2, '0')}T${String(i % 24).padStart(2, '0')}:00;1.5;0.1`,
    );
    expect(check('x.csv', { 'x.csv': head + rows.join('\n') }).kind).toBe('weather');
  });
});
