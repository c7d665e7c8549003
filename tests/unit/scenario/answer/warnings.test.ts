import { describe, expect, test } from 'vitest';
import { warningNote } from '../../../../src/report/englishNotes.ts';
import type { Answer } from '../../../../src/scenario/answer/answer.ts';
import { sampleFiles } from '../sampleFiles.ts';
import { type Change, changedAnswer, heatLossOf, houseWith, unitWith } from './changedAnswer.ts';

const backup = 'backup: { source: electric, power: 6 }';

/** The one warning of a code, and the answer it is of. */
function warned(code: string, ...changes: Change[]) {
  const answer = changedAnswer(changes);
  const found = answer.warnings.map(warningNote).filter((warning) => warning.code === code);
  expect(found, code).toHaveLength(1);
  return { answer, text: found[0]!.text, remedy: found[0]!.remedy };
}

const codesOf = ({ warnings }: Answer) => warnings.map(({ code }) => code);

/** Temperatures of the sample weather, °C. */
const temperatures = sampleFiles()
  ['weather.csv']!.trim()
  .split('\n')
  .slice(1)
  .map((row) => Number(row.split(',')[1]));
const sum = (values: Float64Array) => values.reduce((total, value) => total + value, 0);

describe('a warning about the result', () => {
  test('is given of a seasonal factor below what homes have shown', () => {
    const { answer, text, remedy } = warned('result.seasonal-factor', [
      'house.yaml',
      'unit: unit.yaml',
      'unit: unit.yaml\n  inUseAllowance: 0.6',
    ]);
    const { heatPumpSpaceHeat, electricity } = answer.columns;
    // no pump, no standby and no backup heat here, so that H4 is heat over electricity
    const factor = sum(heatPumpSpaceHeat) / sum(electricity);
    expect(factor).toBeLessThan(1.8);
    expect(text).toBe(`The seasonal factor H4 of ${factor.toFixed(2)} lies outside 1.8–4.5, what homes have shown.`);
    expect(remedy).toContain('flow temperatures, the COP table and the pump power');
  });

  test('is given of a seasonal factor above what homes have shown', () => {
    const { text } = warned(
      'result.seasonal-factor',
      ['unit.yaml', '3.6  2.9  2.4', '5.4  4.4  3.6'],
      ['unit.yaml', '4.2  3.3  2.8', '6.4  5.2  4.4'],
    );
    expect(text).toMatch(/H4 of (?:4\.[5-9]|[5-9]\.)\d+ lies outside 1\.8–4\.5/);
  });

  test('is given of a backup that gives more than a tenth of the heat', () => {
    const { answer, text, remedy } = warned('result.much-backup', [
      'house.yaml',
      backup,
      'backup: { source: electric, power: 12, mode: { kind: alternative, switchTemperature: 2 } }',
    ]);
    const { backupSpaceHeat, spaceHeatNeed } = answer.columns;
    const share = (100 * sum(backupSpaceHeat)) / sum(spaceHeatNeed);
    const hours = backupSpaceHeat.filter((heat) => heat > 0).length;
    expect(share).toBeGreaterThan(10);
    expect(text).toBe(`The backup gives ${share.toFixed(0)} % of the heat, in ${hours} hours.`);
    expect(remedy).toContain('switch temperature');
  });

  test('is given of heat that the rooms do not get', () => {
    const { answer, text, remedy } = warned('result.unmet-heat', heatLossOf(600), ['house.yaml', `${backup}\n`, '']);
    const { spaceHeatNeed, heatPumpSpaceHeat } = answer.columns;
    const unmet = sum(spaceHeatNeed) - sum(heatPumpSpaceHeat);
    const hours = answer.columns.unmetHeat.filter((heat) => heat > 0).length;
    expect(text).toBe(
      `${unmet.toFixed(0)} kWh of space heat could not be given (${hours} hours): rooms would get cold.`,
    );
    expect(remedy).toContain('Do not sign');
  });

  test('is given of more than 5000 starts, as an estimate', () => {
    const { answer, text, remedy } = warned(
      'result.many-starts',
      heatLossOf(60),
      houseWith('circulation: { waterContent: 20 }'),
    );
    const starts = sum(answer.columns.starts);
    expect(Math.abs(Number(/About (\d+) /.exec(text)?.[1]) - starts)).toBeLessThanOrEqual(50);
    expect(text).toMatch(/00 compressor starts a year \(an estimate\)\.$/);
    expect(remedy).toContain('more water in the circuit');
  });
});

describe('a warning about the map', () => {
  test('is given of hours outside the unit’s table', () => {
    const { answer, text, remedy } = warned('map.outside');
    // the table ends at 7 °C; the sample has no hour below −15 °C and no flow above 55 °C
    const outside = answer.columns.heatPumpSpaceHeat.filter((heat, i) => heat > 0 && temperatures[i]! > 7).length;
    expect(text).toBe(`In ${outside} hours the unit ran colder, warmer or hotter than its table reaches.`);
    expect(remedy).toContain('Ask the maker');
  });

  test('is not given where the table reaches', () => {
    const reaching: Change[] = [
      ['unit.yaml', '      A7       8.0  7.8  7.6\n', '      A7       8.0  7.8  7.6\n      A25      9.0  8.8  8.6\n'],
      ['unit.yaml', '      A7       4.2  3.3  2.8\n', '      A7       4.2  3.3  2.8\n      A25      6.0  4.6  3.8\n'],
    ];
    expect(codesOf(changedAnswer(reaching))).not.toContain('map.outside');
  });

  test('is given of a flow that the unit does not reach', () => {
    const { answer, text, remedy } = warned('map.flow-above-limit', unitWith('limits: { highestFlow: 36 }'));
    const { flowTemperature, spaceHeatNeed } = answer.columns;
    const above = flowTemperature.filter((flow, i) => flow > 36 && spaceHeatNeed[i]! > 0).length;
    expect(above).toBeGreaterThan(0);
    expect(text).toBe(`In ${above} hours the rooms ask for a higher flow than the unit can give.`);
    expect(remedy).toContain('Larger emitters');
  });

  test('is given of hours too cold for the unit', () => {
    const { text, remedy } = warned('map.too-cold', unitWith('limits: { lowestOutdoorTemperature: 0 }'));
    const colder = temperatures.filter((temperature) => temperature < 0).length;
    expect(text).toBe(`In ${colder} hours it is colder than the unit’s lowest outdoor temperature: it stands still.`);
    expect(remedy).toContain('backup carries the house alone');
  });
});

describe('a warning about the weather', () => {
  /** The coldest mean of 24 hours on end, the year taken as a ring, °C. */
  const coldest = Math.min(
    ...temperatures.map((_, i) => {
      let total = 0;
      for (let back = 0; back < 24; back++) total += temperatures[(i - back + 8760) % 8760]!;
      return total / 24;
    }),
  );
  const designAt = (outdoor: number): Change => [
    'house.yaml',
    'outdoorTemperature: -12',
    `outdoorTemperature: ${outdoor}`,
  ];

  test('is given of a year milder than the design', () => {
    const { text, remedy } = warned('weather.milder-than-design');
    expect(text).toBe(
      `The coldest day of the weather has ${coldest.toFixed(1)} °C, the design temperature is -12 °C: the year is milder than the design.`,
    );
    expect(remedy).toContain('Fit for energy, not for sizing');
  });

  test('is given of a year colder than the design', () => {
    const { text, remedy } = warned('weather.colder-than-design', designAt(8));
    expect(text).toContain(`${coldest.toFixed(1)} °C, the design temperature is 8 °C: the year is colder`);
    expect(remedy).toContain('Check the place of the weather file');
  });

  test('is not given within 6 K of the design', () => {
    for (const away of [-5.9, 5.9]) {
      const codes = codesOf(changedAnswer([designAt(Number((coldest + away).toFixed(2)))]));
      expect(codes.filter((code) => code.startsWith('weather.'))).toEqual([]);
    }
  });
});

test('what loading found stands first, with its place and its cure', () => {
  const [first] = changedAnswer([['unit.yaml', '3.6  2.9  2.4', '4.9  2.9  2.4']]).warnings.map(warningNote);
  expect(first).toMatchObject({ code: 'map.looks-mistyped' });
  expect(first?.text).toMatch(/^unit\.yaml:14: the COP at map\.fullLoad\.cop\[A2\/W35\] is far off/);
  expect(first?.remedy).not.toBe('');
});
