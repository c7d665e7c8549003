import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Problem } from '../../../../src/core/problem.ts';
import { saidIn } from '../../../../src/core/problemText.ts';
import { germanProblems } from '../../../../src/report/language/german/problems.ts';
import { checkFile } from '../../../../src/scenario/checkFile.ts';
import { hurtBytes, hurtTable, hurtYaml } from '../../../fuzz/hurt.ts';
import { filesWithHurt } from '../../../fuzz/hurtFiles.ts';
import { type SoundName, soundFiles } from '../../../fuzz/soundFiles.ts';
import { englishLeft } from './englishLeft.ts';

const german = (problem: Partial<Problem> & Pick<Problem, 'code'>) =>
  saidIn(germanProblems, { severity: 'error', file: 'a.yaml', ...problem });

describe('a problem in German', () => {
  it.each([
    [
      {
        code: 'entry.out-of-range',
        path: 'heatPump.capacity',
        found: '0.5',
        allowed: 'a power lies between 1.5 and 9 kW',
      },
      'heatPump.capacity ist 0,5; eine Leistung liegt zwischen 1,5 und 9 kW',
    ],
    [
      { code: 'entry.missing', path: 'fuel.price', allowed: 'a price lies between −1 and 10 per kWh' },
      'fuel.price fehlt; ein Preis liegt zwischen −1 und 10 je kWh',
    ],
    [
      { code: 'entry.not-a-choice', path: 'x', found: "'y'", allowed: 'it is one of a, b and c' },
      "x ist 'y'; es ist eines von a, b und c",
    ],
    [
      { code: 'entry.wrong-length', path: 'x', found: '1 entry', allowed: 'it is a list of 2 to 5 entries' },
      'x hat 1 Eintrag; es ist eine Liste mit 2 bis 5 Einträgen',
    ],
    [
      {
        code: 'entry.wrong-kind',
        path: 'x',
        found: 'a section',
        allowed: 'a temperature lies between 20 and 85 °C, or it is a list of 2 to 9 entries',
      },
      'x ist ein Abschnitt; eine Temperatur liegt zwischen 20 und 85 °C, oder es ist eine Liste mit 2 bis 9 Einträgen',
    ],
    [
      {
        code: 'scenario.contradiction',
        path: 'x',
        found: '20 °C',
        allowed: 'it must lie above the return temperature (35.5 °C)',
      },
      'x ist 20 °C; es muss über der Rücklauftemperatur liegen (35,5 °C)',
    ],
    [
      {
        code: 'weather.long-gap',
        path: 'temperature in column 2 “T”',
        found: '03-01 04:00 to 03-01 12:00 (9 hours)',
        allowed: '6 hours',
      },
      'Temperatur in Spalte 2 „T“ hat nach dieser Zeile keinen Wert für 03-01 04:00 bis 03-01 12:00 (9 Stunden); höchstens 6 Stunden am Stück werden interpoliert',
    ],
    [
      { code: 'yaml.syntax', found: 'Nested mappings are not allowed in compact mappings' },
      'hier ist die Datei nicht zu verstehen: ein Abschnitt steht in der Zeile eines anderen',
    ],
    [
      { code: 'yaml.syntax', found: 'Something new of the parser' },
      'hier ist die Datei nicht zu verstehen: die Schreibweise ist nicht die von YAML',
    ],
  ] as const)('says %o', (problem, says) => {
    expect(german(problem).says).toBe(says);
  });

  it('has its own cure in German too, and what it quotes as it stands', () => {
    expect(german({ code: 'entry.missing', hint: 'add it: U-value.' }).cure).toBe('ergänzen Sie es: U-Wert.');
    expect(german({ code: 'entry.unknown-key', hint: 'perhaps one of the rows is meant' }).cure).toBe(
      'vielleicht ist one of the rows gemeint',
    );
    expect(german({ code: 'entry.wrong-kind', hint: 'write 0.85 for 85 %' }).cure).toBe('schreiben Sie 0.85 für 85 %');
    expect(german({ code: 'entry.wrong-kind', hint: 'write 4, without a unit; the unit is per kWh' }).cure).toBe(
      'schreiben Sie 4 ohne Einheit; die Einheit ist je kWh',
    );
  });

  it('has no hole where a part is missing', () => {
    expect(german({ code: 'file.missing' })).toEqual({
      says: 'diese Datei gibt es nicht',
      cure: 'prüfen Sie den Namen; Namen in einem Szenario zählen von seinem Ordner aus',
    });
  });
});

describe('the problems of files that are hurt at random', () => {
  const structured: SoundName[] = [
    'house.yaml',
    'full.yaml',
    'units/quarkenfels-8.yaml',
    'tariffs/night.yaml',
    'tariffs/blocks.yaml',
  ];
  const tables: SoundName[] = ['weather.csv', 'prices.csv', 'capacity.csv'];

  /** Parts that come from the file itself, as far as they are no phrase: an English word in them is the writer's. */
  const asWritten = ({ path, found, hint }: Problem) => [
    path,
    found,
    ...(hint?.match(/(?<=^perhaps ).*(?= is meant)/) ?? []),
  ];

  function expectGerman(problems: readonly Problem[]): void {
    for (const problem of problems) {
      const { says, cure } = saidIn(germanProblems, problem);
      let text = `${says} → ${cure}`;
      for (const part of asWritten(problem)) if (part !== undefined && part !== '') text = text.replaceAll(part, '…');
      if (problem.code === 'entry.unknown-key' || problem.code === 'series.column') continue;
      expect(englishLeft(text), `${problem.code}: ${text}`).toBeUndefined();
    }
  }

  it.each([...structured, ...tables].map((name, i) => [name, i] as const))(
    'leave no English behind: %s',
    (name, i) => {
      const how = name.endsWith('.csv') ? hurtTable : hurtYaml;
      const seen = new Set<string>();
      for (const hurt of fc.sample(how, { numRuns: name.endsWith('.csv') ? 20 : 60, seed: 1000 + i })) {
        const source = filesWithHurt(name, hurtBytes(soundFiles[name], hurt));
        const { problems } = checkFile(name === 'capacity.csv' ? 'units/tables.yaml' : name, source);
        expectGerman(problems);
        for (const { code } of problems) seen.add(code);
      }
      expect(seen.size).toBeGreaterThan(2);
    },
    60_000,
  );
});
