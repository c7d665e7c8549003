import { describe, expect, test } from 'vitest';
import { showsPictures } from '../../../../cli/showsPictures.ts';
import { answerText } from '../../../../src/report/answerText.ts';
import { resultDocument } from '../../../../src/report/resultDocument.ts';
import { dayStrips } from '../../../../src/report/terminal/dayStrips.ts';
import { type HoursOfDay, hoursOfDay } from '../../../../src/report/terminal/hoursOfDay.ts';
import { english } from '../../../../src/report/words.ts';
import { wholeDemoAnswer } from '../demoAnswer.ts';

const answer = wholeDemoAnswer();
const document = resultDocument(answer, '1');
const hours24 = (of: (hour: number) => number) => Array.from({ length: 24 }, (_, hour) => of(hour));

/** Night 0.20 from 22:00 to 6:00, else 0.40; the heating takes all of its electricity at noon. */
const invented: HoursOfDay = {
  tariffs: [
    { tariff: 'Night', currency: 'EUR', price: hours24((hour) => (hour < 6 || hour >= 22 ? 0.2 : 0.4)) },
    { tariff: 'Flat', currency: 'EUR', price: hours24(() => 0.32) },
  ],
  electricity: hours24((hour) => (hour === 12 ? 500 : 0)),
};

describe('strips of the day', () => {
  test('stand on one scale, an hour two letters wide, with lowest and highest in figures', () => {
    const [, , night, flat, heating] = dayStrips(invented, english);
    expect(night).toBe(`Night              ${'▁'.repeat(12)}${'█'.repeat(32)}${'▁'.repeat(4)} 0.20–0.40`);
    expect(flat).toBe(`Flat               ${'▅'.repeat(48)} 0.32`);
    expect(heating).toBe(`Heating takes      ${'▁'.repeat(24)}██${'▁'.repeat(22)} 0–100 %`);
  });

  test('number the hours over their cells', () => {
    const [, scale, night] = dayStrips(invented, english);
    expect(scale!.indexOf('12') - scale!.indexOf('0')).toBe(24);
    expect(night!.indexOf('█') - scale!.indexOf('6')).toBe(0);
  });

  test('of two currencies have a scale each and say which', () => {
    const [night, flat] = invented.tariffs;
    const mixed = dayStrips({ ...invented, tariffs: [night!, { ...flat!, currency: 'GBP' }] }, english);
    expect(mixed[2]).toContain('0.20–0.40 EUR');
    expect(mixed[3]).toContain(`${'▁'.repeat(48)} 0.32 GBP`);
  });

  test('show control characters of a name as letters and cut it', () => {
    const named = { ...invented.tariffs[1]!, tariff: '\u001b[31mred and far too long' };
    const line = dayStrips({ ...invented, tariffs: [named] }, english)[2]!;
    expect(line).not.toContain('\u001b');
    expect([...line].indexOf('…')).toBe(17);
  });

  test('are not there without a price by the hour', () => {
    expect(dayStrips({ ...invented, tariffs: [] }, english)).toEqual([]);
  });
});

describe('the hours of the day of a year', () => {
  const day = hoursOfDay(answer);

  test('hold all electricity of the heating', () => {
    const sum = day.electricity.reduce((total, kWh) => total + kWh, 0);
    // a sum of 24 sums against one of months: rounding alone
    expect(sum).toBeCloseTo(answer.totals.annual.electricity, 8);
  });

  test('have a flat tariff at one price, its tax on top', () => {
    const flat = day.tariffs[0]!;
    expect(Math.max(...flat.price) - Math.min(...flat.price)).toBeLessThan(1e-12);
    const { bill } = answer.costs[0]!;
    // nothing but energy and its tax changes with a kWh more
    expect(flat.price[0]).toBeCloseTo((bill.energy / bill.kWh) * (1 + bill.taxes / (bill.energy + bill.standing)), 12);
  });

  test('are taken at civil time: the night rate begins and ends at its hours in summer as in winter', () => {
    const night = day.tariffs.find(({ tariff }) => tariff.startsWith('Night'))!;
    expect(new Set(night.price.map((price) => price.toFixed(9))).size).toBe(2);
  });
});

describe('the printed answer with pictures', () => {
  const lines = answerText(document, english, hoursOfDay(answer)).split('\n');

  test('keeps to 80 columns', () => {
    expect(Math.max(...lines.map((line) => [...line].length))).toBeLessThanOrEqual(80);
  });

  test('has a bar for each month, the longest where the most electricity is', () => {
    const bars = lines.filter((line) => /^│ [JFMASOND]/.test(line) && /[▏▎▍▌▋▊▉█]/.test(line));
    expect(bars).toHaveLength(12);
    const lengths = bars.map((line) => [...line].filter((letter) => letter === '█').length);
    const kWh = document.monthly.map(({ electricity }) => electricity.total);
    expect(lengths.indexOf(Math.max(...lengths))).toBe(kWh.indexOf(Math.max(...kWh)));
  });

  test('says the same without them, less the pictures', () => {
    const plain = answerText(document);
    expect(plain).not.toMatch(/[▁▂▃▄▅▆▇█▏▎▍▌▋▊▉]/);
    expect(plain).not.toContain(english.headings.hoursOfDay(''));
  });
});

describe('whether results hold pictures', () => {
  test.each([
    [{ isTTY: true }, { TERM: 'xterm-256color' }, true],
    [{ isTTY: true }, {}, true],
    [{ isTTY: true }, { TERM: 'dumb' }, false],
    [{ isTTY: false }, { TERM: 'xterm' }, false],
    [{}, {}, false],
  ])('on %o with %o: %s', (stream, env, shown) => {
    expect(showsPictures(stream, env)).toBe(shown);
  });
});
