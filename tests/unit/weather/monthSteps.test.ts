import { expect, test } from 'vitest';
import { monthStarts } from '../../../src/weather/monthSteps.ts';

/** First hour of each month by the calendar of the language, and the hours of the year. */
function byCalendar(year: number): number[] {
  return Array.from({ length: 13 }, (_, month) => (Date.UTC(year, month) - Date.UTC(year, 0)) / 3_600_000);
}

test('the months of 8760 hours begin where the calendar of a common year says', () => {
  expect([...monthStarts(8760)]).toEqual(byCalendar(2025));
  expect(monthStarts(8760)[2]).toBe(1416);
});

test('the months of 8784 hours begin where the calendar of a leap year says', () => {
  expect([...monthStarts(8784)]).toEqual(byCalendar(2024));
});

test('months that a short year does not reach are empty', () => {
  expect([...monthStarts(800)]).toEqual([0, 744, 800, 800, 800, 800, 800, 800, 800, 800, 800, 800, 800]);
});
