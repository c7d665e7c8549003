import { describe, expect, test } from 'vitest';
import { warningNote } from '../../../../src/report/englishNotes.ts';
import { changedAnswer, houseWith } from './changedAnswer.ts';

/** The cautions of the sample house with a cylinder whose entries are given. */
function cautionsOf(entries: string, volume = 200) {
  const section = `hotWater:\n  volume: ${volume}\n  loss: { given: coefficient, value: 1.5 }\n${entries}`;
  const answer = changedAnswer([houseWith(section)]);
  return { answer, cautions: answer.warnings.map(warningNote).filter(({ code }) => code.startsWith('hot-water.')) };
}

const M = '  draw: { given: profile, profile: M }\n';
const hygiene = (temperature: number) => `  hygiene: { weekday: sun, hour: 12, temperature: ${temperature} }\n`;
const codes = (entries: string) => cautionsOf(entries).cautions.map(({ code }) => code);

describe('the cautions about hot water', () => {
  test('are none for 55 °C, for 50 °C with a run to 60 °C, and without a cylinder', () => {
    expect(codes(`${M}  setPoint: 55\n`)).toEqual([]);
    expect(codes(`${M}  setPoint: 50\n${hygiene(60)}`)).toEqual([]);
    expect(changedAnswer([]).warnings.filter(({ code }) => code.startsWith('hot-water'))).toEqual([]);
  });

  test('speak of legionella below 55 °C without a weekly run, and leave it to local codes', () => {
    expect(cautionsOf(`${M}  setPoint: 54\n`).cautions).toEqual([
      {
        code: 'hot-water.legionella',
        text: 'The cylinder is kept at 54 °C and no weekly hygiene run is entered.',
        remedy:
          'Legionella can grow in warm water: enter a hygiene run to 60 °C or show another measure. Local codes and licensed practice decide.',
      },
    ]);
  });

  test('speak of a weekly run that is not hot enough', () => {
    const [caution, ...others] = cautionsOf(`${M}  setPoint: 50\n${hygiene(55)}`).cautions;
    expect(others).toEqual([]);
    expect(caution).toMatchObject({
      code: 'hot-water.hygiene-run-cool',
      text: 'The hygiene run reaches 55 °C only.',
      remedy: expect.stringContaining('Usual is 60 °C'),
    });
  });

  test('speak of scalding above 60 °C, whether by the set point or by the weekly run', () => {
    for (const entries of [`${M}  setPoint: 62\n`, `${M}  setPoint: 50\n${hygiene(62)}`]) {
      const [caution, ...others] = cautionsOf(entries).cautions;
      expect(others).toEqual([]);
      expect(caution).toMatchObject({
        code: 'hot-water.scalding',
        text: 'The cylinder reaches 62 °C: water that hot scalds at the tap.',
        remedy: expect.stringContaining('mixing valve'),
      });
    }
  });

  test('speak of a cylinder colder than the water that is drawn', () => {
    const litres = '  draw: { given: litres, litresPerDay: 60, useTemperature: 45 }\n  setPoint: 42\n';
    const { cautions } = cautionsOf(`${litres}${hygiene(60)}`);
    expect(cautions.find(({ code }) => code === 'hot-water.colder-than-use')).toEqual({
      code: 'hot-water.colder-than-use',
      text: 'The cylinder is kept at 42 °C, colder than the 45 °C of use.',
      remedy: 'Raise the set point, or enter the litres at the temperature at which they are drawn.',
    });
  });

  test('speak of hot water that ran short, how often, how much, and how cold it got', () => {
    const { answer, cautions } = cautionsOf('  draw: { given: profile, profile: XL }\n  setPoint: 55\n', 60);
    const { hotWaterShort, cylinderTemperature } = answer.columns;
    const hours = hotWaterShort.filter((heat) => heat > 0).length;
    const heat = hotWaterShort.reduce((total, value) => total + value, 0);
    const coolest = Math.min(...cylinderTemperature);
    expect(hours).toBeGreaterThan(0);
    expect(cautions).toEqual([
      {
        code: 'hot-water.short',
        text: `In ${hours} hours hot water ran short (${heat.toFixed(0)} kWh a year; coolest ${coolest.toFixed(0)} °C).`,
        remedy: 'A larger cylinder, a higher set point, or longer reheat windows.',
      },
    ]);
  });
});
