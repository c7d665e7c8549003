import { describe, expect, it } from 'vitest';
import {
  cellValue,
  namesFile,
  notSingle,
  type ScenarioPlace,
  scenarioPlace,
} from '../../../src/batch/scenarioPlaces.ts';

function placeOf(text: string): ScenarioPlace {
  const place = scenarioPlace(text);
  if (!('path' in place)) throw new Error(`${text}: ${place.known}`);
  return place;
}

describe('a place in a scenario', () => {
  it.each(
    ['house.heatLoss.value', 'house.heatLoss.outdoorTemperature', 'tariffs[0]', 'backup.mode.switchTemperature'].concat(
      'boiler.efficiency.flowTemperature.flow',
      'house.heatLoss.elements[3].uValue',
      'hotWater.draw.shares[23]',
    ),
  )('is %s, whatever form the base scenario has', (text) => {
    expect(scenarioPlace(text)).toHaveProperty('path');
  });

  it('is told from what is none, with the keys that are known there and the nearest', () => {
    expect(scenarioPlace('house.heatLos.value')).toMatchObject({ near: 'house.heatLoss' });
    expect(scenarioPlace('house.nothing')).toMatchObject({ known: expect.stringContaining('heatLoss') });
    for (const text of ['', 'house..heatLoss', 'tariffs.0', 'house.heatLoss.value.more', 'tariffs[x]', 'constructor']) {
      expect(scenarioPlace(text), text).not.toHaveProperty('path');
    }
  });

  it('holds a single value or does not', () => {
    expect(notSingle(placeOf('house.heatLoss'))).toBe('a section');
    expect(notSingle(placeOf('tariffs'))).toBe('a list');
    expect(notSingle(placeOf('boiler.efficiency'))).toBeUndefined();
  });

  it('names a file or does not', () => {
    expect(namesFile(placeOf('heatPump.unit'))).toBe(true);
    expect(namesFile(placeOf('tariffs[0]'))).toBe(true);
    expect(namesFile(placeOf('name'))).toBe(false);
  });
});

describe('a cell of a table', () => {
  const loss = placeOf('house.heatLoss.value');

  it.each([
    ['6.5', 6.5],
    ['-12', -12],
    ['−12', -12],
    ['1e3', 1000],
    ['.5', 0.5],
  ])('with %s is a number where a number belongs', (text, number) => {
    expect(cellValue(loss, text, false)).toBe(number);
  });

  it('keeps a text that is no number, for the message', () => {
    for (const text of ['6,5', '12 W/K', '0x10', 'NaN', '1_000', '=1+1'])
      expect(cellValue(loss, text, false)).toBe(text);
  });

  it('may have a decimal comma where commas do not part the cells', () => {
    expect(cellValue(loss, '6,5', true)).toBe(6.5);
    expect(cellValue(loss, '6.5', true)).toBe(6.5);
    expect(cellValue(loss, '1.234,5', true)).toBe('1.234,5');
  });

  it('stays a text where a text belongs, digits or not', () => {
    expect(cellValue(placeOf('name'), '12', false)).toBe('12');
    expect(cellValue(placeOf('heatPump.unit'), 'a.yaml', false)).toBe('a.yaml');
  });

  it('is yes or no where that belongs', () => {
    expect(cellValue(placeOf('weather.read.header'), 'TRUE', false)).toBe(true);
  });
});
