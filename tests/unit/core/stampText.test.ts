import { expect, test } from 'vitest';
import { dayNumber } from '../../../src/core/civilDate.ts';
import { dateText, offsetText, stampText, timeText } from '../../../src/core/stampText.ts';

test('dates and times of day are written with two digits', () => {
  expect(dateText(2025, 3, 1)).toBe('2025-03-01');
  expect([0, 65, 1350, 1440].map(timeText)).toEqual(['00:00', '01:05', '22:30', '24:00']);
});

test('a stamp is a date and a time of day, with its year where that counts', () => {
  const minute = dayNumber(2019, 7, 1) * 1440 + 840;
  expect(stampText(minute, true)).toBe('2019-07-01 14:00');
  expect(stampText(minute, false)).toBe('07-01 14:00');
  // before 1970 too
  expect(stampText(-1, true)).toBe('1969-12-31 23:59');
});

test('an offset has its sign, hours and minutes', () => {
  expect([60, 0, 330, -570].map(offsetText)).toEqual(['UTC+01:00', 'UTC+00:00', 'UTC+05:30', 'UTC-09:30']);
});
