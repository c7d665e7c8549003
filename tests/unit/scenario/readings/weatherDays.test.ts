import { describe, expect, it } from 'vitest';
import { problemText } from '../../../../src/core/problemText.ts';
import { datedTemperatures } from '../../../../src/scenario/readings/datedTemperatures.ts';
import { coveredText, meansBetween, weatherDays } from '../../../../src/scenario/readings/weatherDays.ts';
import type { ReadSettings } from '../../../../src/weather/readSettings.ts';

const HOUR = 3_600_000;
const dayOf = (text: string) => Date.parse(`${text}T00:00Z`) / 86_400_000;

/** Hours from one day to another, excluded; the temperature is the number of the hour of the day unless said otherwise. */
function hoursText(from: string, to: string, temperature = (at: Date) => at.getUTCHours()): string {
  const lines = ['time,temperature °C'];
  for (let at = Date.parse(`${from}T00:00Z`); at < Date.parse(`${to}T00:00Z`); at += HOUR) {
    const date = new Date(at);
    lines.push(`${date.toISOString().slice(0, 16)},${temperature(date)}`);
  }
  return `${lines.join('\n')}\n`;
}

function read(text: string, settings: ReadSettings = {}) {
  return datedTemperatures(text, {
    file: 'w.csv',
    settings,
    zone: 'Europe/Berlin',
    defaultOffsetMinutes: 60,
    altitude: 0,
  });
}

function datedOf(text: string, settings: ReadSettings = {}) {
  const { dated, problems } = read(text, settings);
  if (dated === undefined) throw new Error(problems.map(problemText).join('\n'));
  return dated;
}

describe('weather by date', () => {
  it('may be any stretch of time, across years', () => {
    const days = weatherDays([datedOf(hoursText('2023-11-20', '2025-02-03'))]);
    expect(coveredText(days)).toBe('2023-11-20 to 2025-02-02');
    // 0 … 23 have the mean 11.5.
    expect([...(meansBetween(days, dayOf('2024-02-28'), dayOf('2024-03-02')) ?? [])]).toEqual([11.5, 11.5, 11.5]);
    expect(meansBetween(days, dayOf('2025-02-02'), dayOf('2025-02-04'))).toBeUndefined();
    expect(meansBetween(days, dayOf('2023-11-19'), dayOf('2023-11-21'))).toBeUndefined();
  });

  it('is joined from several files, the first counting where they overlap', () => {
    const files = [
      hoursText('2024-01-01', '2024-01-04', () => 1),
      hoursText('2024-01-03', '2024-01-06', () => 2),
      hoursText('2024-02-01', '2024-02-02', () => 3),
    ].map((text) => datedOf(text));
    const days = weatherDays(files);
    expect([...(meansBetween(days, dayOf('2024-01-01'), dayOf('2024-01-06')) ?? [])]).toEqual([1, 1, 1, 2, 2]);
    expect(coveredText(days)).toBe('2024-01-01 to 2024-01-05, 2024-02-01 to 2024-02-01');
  });

  it('is laid on the standard time of the first file', () => {
    const first = datedOf(
      hoursText('2024-01-01', '2024-01-02', () => 1),
      { offset: '+01:00' },
    );
    // In UTC, 2 January begins one hour later than in UTC+1.
    const utc = datedOf(
      hoursText('2024-01-02', '2024-01-04', (at) => at.getUTCDate()),
      { offset: '+00:00' },
    );
    const days = weatherDays([first, utc]);
    expect(days.filledHours).toBe(1);
    // 3 January of UTC+1: one hour of 2 January in UTC, 23 of 3 January.
    expect(meansBetween(days, dayOf('2024-01-03'), dayOf('2024-01-04'))?.[0]).toBeCloseTo((2 + 23 * 3) / 24, 12);
    expect(coveredText(days)).toBe('2024-01-01 to 2024-01-03');
  });

  it('interpolates up to six hours, and leaves a day with a longer gap out', () => {
    const without = (first: number, last: number) =>
      hoursText('2024-01-01', '2024-01-04')
        .split('\n')
        .filter(
          (line) =>
            !(
              line.startsWith('2024-01-02') &&
              Number(line.slice(11, 13)) >= first &&
              Number(line.slice(11, 13)) <= last
            ),
        )
        .join('\n');
    const six = weatherDays([datedOf(without(6, 11))]);
    expect(six.filledHours).toBe(6);
    expect(meansBetween(six, dayOf('2024-01-02'), dayOf('2024-01-03'))?.[0]).toBeCloseTo(11.5, 12);
    const seven = weatherDays([datedOf(without(6, 12))]);
    expect(seven.filledHours).toBe(0);
    expect(coveredText(seven)).toBe('2024-01-01 to 2024-01-01, 2024-01-03 to 2024-01-03');
  });

  it('takes the hour as the mean of its rows, and stamps at the end of their step as such', () => {
    const halves = ['time,temperature °C'];
    for (let i = 1; i <= 96; i++) {
      const at = new Date(Date.parse('2024-01-01T00:00Z') + i * (HOUR / 2));
      halves.push(`${at.toISOString().slice(0, 16)},${i % 2 === 1 ? 4 : 8}`);
    }
    const days = weatherDays([datedOf(halves.join('\n'), { stamps: 'end' })]);
    expect([...(meansBetween(days, dayOf('2024-01-01'), dayOf('2024-01-03')) ?? [])]).toEqual([6, 6]);
  });

  it('passes over an hour that stands twice with the same value', () => {
    const text = hoursText('2024-01-01', '2024-01-03');
    expect(datedOf(`${text}2024-01-02T23:00,23\n`).temperature).toHaveLength(48);
  });
});

describe('weather by date is refused', () => {
  const problemsOf = (text: string) => read(text).problems.map(problemText);

  it('without years in its stamps', () => {
    const text = hoursText('2023-01-01', '2024-01-01').replace(/^2023-(\d\d)-(\d\d)T/gm, '$2.$1. ');
    expect(problemsOf(text)).toEqual([expect.stringContaining('w.csv  the stamps carry no year')]);
  });

  it('where months of different years make up a typical one', () => {
    const year = hoursText('2023-01-01', '2024-01-01').replace(/^2023-0([1-6])/gm, '2011-0$1');
    expect(problemsOf(year)).toEqual([
      expect.stringContaining('w.csv  the file puts months of 2 different years together'),
    ]);
  });

  it('where an hour stands twice with different values', () => {
    expect(problemsOf(`${hoursText('2024-01-01', '2024-01-03')}2024-01-01T05:00,7\n`)).toEqual([
      expect.stringContaining('w.csv:50  2024-01-01 05:00 stands here with another value than in line 7'),
    ]);
  });

  it('for what keeps any weather from being read', () => {
    const codesOf = (text: string) => read(text).problems.map(({ code }) => code);
    expect(codesOf('')).toEqual(['file.empty']);
    expect(codesOf(hoursText('2024-01-01', '2024-01-03', () => 400))).toEqual(['weather.column-implausible']);
    const daily = Array.from({ length: 9 }, (_, i) => `2024-01-0${i + 1},${i}`).join('\n');
    expect(codesOf(`time,temperature °C\n${daily}\n`)).toEqual(['weather.coarse-step']);
  });
});
