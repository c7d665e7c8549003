import { describe, expect, it } from 'vitest';
import { problemText } from '../../../../src/core/problemText.ts';
import { answerOn, monthlyUse, monthlyWeather, withReadings } from './readingsOfHouse.ts';

const means = [-1, 1, 5, 9, 13, 17, 19, 18, 14, 9, 4, 0];
const house = (efficiency = 0.9) => withReadings(`{ efficiency: ${efficiency}, weather: [real.csv] }`);

/** The answer for months of these temperatures and of this daily use, from January or from another month on. */
function fitted(use: readonly number[], options: { means?: readonly number[]; first?: number; house?: string } = {}) {
  return answerOn({
    'real.csv': monthlyWeather(options.means ?? means),
    'house.yaml': options.house ?? house(),
    'meter.csv': monthlyUse(use, options.first),
  });
}

/** Daily use of a home: 8 kWh, and 4.8 kWh a degree day below 15 °C. At an efficiency of 0.9 that is 180 W/K. */
const home = (temperature: number) => 8 + 4.8 * Math.max(0, 15 - temperature);
/** Errors that sum to nothing, kWh a day. */
const errors = [2, -3, 1, 2, -2, 0, 1, -1, 1, -2, 3, -2];
const doubtsOf = ({ answer }: ReturnType<typeof fitted>) => (answer?.doubts ?? []).map(problemText);

describe('a home whose readings follow the weather', () => {
  const { answer, texts } = fitted(means.map((mean, i) => home(mean) + (errors[i] ?? 0)));

  it('has its heat loss found, ready for the scenario', () => {
    expect(texts).toEqual([]);
    expect(answer?.believed).toBe(true);
    expect(answer?.doubts).toEqual([]);
    expect(answer?.enteredHeatLoss).toBe(180);
    // 180 W/K within the interval that the errors of some kWh leave.
    expect(answer?.heatLoss.low).toBeLessThan(180);
    expect(answer?.heatLoss.high).toBeGreaterThan(180);
    const value = Number(answer?.heatLoss.value.toPrecision(4));
    expect(answer?.lines).toEqual(['house:', `  heatLoss: { given: coefficient, value: ${value} }`]);
  });
});

describe('a line is not believed', () => {
  it('where use and weather have little to do with each other', () => {
    const result = fitted([60, 20, 70, 10, 50, 30, 20, 40, 60, 10, 40, 60]);
    expect(result.answer?.believed).toBe(false);
    expect(result.answer?.lines).toEqual([]);
    expect(doubtsOf(result)[0]).toMatch(/^meter.csv {2}warning: R² is 0\.\d+; at least 0.75 is asked/);
    expect(doubtsOf(result)[1]).toMatch(/warning: CV\(RMSE\) is \d+ %; at most 25 % is asked/);
  });

  it('where the base temperature lies at the end of its range', () => {
    // A use that bends at 26 °C: no house is heated there.
    const hot = [2, 4, 8, 12, 15, 18, 21, 25, 28, 20, 12, 5];
    const result = fitted(
      hot.map((mean) => 8 + 4.8 * Math.max(0, 26 - mean)),
      { means: hot },
    );
    expect(doubtsOf(result)).toContainEqual(
      expect.stringContaining('the base temperature is 22 °C, an end of the range that is searched (8 to 22 °C)'),
    );
    expect(result.answer?.believed).toBe(false);
    // All days colder than 8 °C: every base fits alike, and the lowest is taken.
    const cold = [-8, -6, -4, -2, 0, 1, 2, 4, 5, 3, 1, -3];
    expect(doubtsOf(fitted(cold.map(home), { means: cold }))).toContainEqual(
      expect.stringContaining('the base temperature is 8 °C'),
    );
  });

  it('where no house loses so much or so little', () => {
    const tenfold = fitted(means.map((mean) => 10 * home(mean)));
    expect(doubtsOf(tenfold)).toEqual([
      expect.stringContaining('the heat loss comes to 15 W/(m²·K); houses lie within 0.15 to 8'),
    ]);
    expect(tenfold.answer?.believed).toBe(false);
    const little = fitted(means.map((mean) => home(mean) / 100));
    expect(doubtsOf(little)).toEqual([
      expect.stringContaining('the heat loss comes to 1.8 W/K; houses lie within 15 to 5000'),
    ]);
  });
});

describe('a line is doubted, but used', () => {
  it('with few periods', () => {
    const result = fitted(means.slice(2, 7).map(home), { first: 2 });
    expect(doubtsOf(result)).toEqual([
      expect.stringContaining('5 periods between readings are few; a year of monthly readings gives 12'),
    ]);
    expect(result.answer?.believed).toBe(true);
  });

  it('with few heated periods', () => {
    const warm = [2, 10, 16, 17, 18, 19, 20, 20, 19, 18, 17, 16];
    // Alike in all summer months; base and slope rest on two months, and half of the days of one.
    const result = fitted(warm.map(home), { means: warm });
    expect(doubtsOf(result)).toContainEqual(
      expect.stringContaining('only 2 periods with heating; three or more show the slope'),
    );
  });

  it('without a summer', () => {
    const result = fitted([0, 1, 2, 3].map((month) => home(means[month] ?? 0) + (errors[month] ?? 0)).concat(21, 14), {
      first: 0,
    });
    expect(doubtsOf(result).join()).not.toContain('no period lies outside the heating season');
    const cold = [-8, -6, -4, -2, 0, 1, 2, 4, 5, 3, 1, -3];
    const winter = fitted(cold.map(home), { means: cold });
    expect(doubtsOf(winter)).toContainEqual(expect.stringContaining('no period lies outside the heating season'));
  });
});

describe('no line is drawn', () => {
  it.each([
    ['fewer than four periods', [90, 80, 60], {}, 'meter.csv  3 periods between readings; below 4 nothing can be said'],
    ['a single one', [90], {}, 'meter.csv  1 period between readings'],
    ['no cold day', [9, 8, 9, 8, 7], { means: Array(12).fill(24) }, 'meter.csv  no period has a day below 22 °C'],
    ['periods all alike', [9, 8, 9, 8, 7], { means: Array(12).fill(4) }, 'meter.csv  the periods are too alike'],
    [
      'a use that falls as it gets colder',
      means.map((mean) => 40 + mean),
      {},
      'meter.csv  the use does not rise as it gets colder: −1 kWh a degree day',
    ],
  ])('for %s', (_, use, options, expected) => {
    const { answer, texts } = fitted(use, options);
    expect(answer).toBeUndefined();
    expect(texts).toHaveLength(1);
    expect(texts[0]).toContain(expected);
  });
});
