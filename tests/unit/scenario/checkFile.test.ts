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
});
