import { describe, expect, test } from 'vitest';
import { carbonByHour, carbonByRate } from '../../../src/compare/carbon.ts';
import { clockOf, nightAndDay, prepared, ratesOf, steadyUse } from '../tariffs/sampleTariffs.ts';

const berlin = clockOf('Europe/Berlin', 60);
const onNightAndDay = prepared(nightAndDay, berlin);
/** A number within the rounding of sums over 8760 hours; fails where there is only a word. */
const near = (found: number | string, expected: number) =>
  expect(Math.abs((typeof found === 'number' ? found : Number.NaN) - expected)).toBeLessThanOrEqual(1e-8);

describe('carbon by an hourly factor', () => {
  test('is each hour’s kWh at its own factor', () => {
    near(carbonByHour(Float64Array.of(2, 1, 0), Float64Array.of(0.1, 0.4, 9)), 0.6);
  });

  test('is that of the mean factor where the use is steady', () => {
    // 0.2 and 0.4 in turn over 8760 hours of 1 kWh
    const factors = Float64Array.from({ length: 8760 }, (_, i) => (i % 2 === 0 ? 0.2 : 0.4));
    near(carbonByHour(steadyUse(berlin), factors), 8760 * 0.3);
  });
});

describe('carbon by rate', () => {
  test('is the kWh of each rate at its factor', () => {
    const factors = [
      { rate: 'day', factor: 0.4 },
      { rate: 'night', factor: 0.2 },
    ];
    // 365·8 h at 0.2 and 365·16 h at 0.4
    near(carbonByRate(steadyUse(berlin), onNightAndDay, factors), 2920 * 0.2 + 5840 * 0.4);
  });

  test('parts an hour with two rates by its minutes, as the bill does', () => {
    const tariff = ratesOf({ name: 'short', price: 0.1, from: '06:40', to: '07:00' }, { name: 'rest', price: 0.4 });
    const use = steadyUse(berlin, 0);
    use[6] = 6;
    const factors = [
      { rate: 'short', factor: 0.1 },
      { rate: 'rest', factor: 0.5 },
    ];
    near(carbonByRate(use, prepared(tariff, berlin), factors), 2 * 0.1 + 4 * 0.5);
  });

  test('is unknown where electricity falls into a rate without a factor', () => {
    expect(carbonByRate(steadyUse(berlin), onNightAndDay, [{ rate: 'day', factor: 0.4 }])).toBe('no factor');
  });

  test('needs no factor of a rate without electricity', () => {
    const use = steadyUse(berlin, 0);
    use[12] = 3;
    near(carbonByRate(use, onNightAndDay, [{ rate: 'day', factor: 0.4 }]), 1.2);
  });

  test('takes the first of two factors of one rate', () => {
    const factors = [0.1, 0.2, 0.3].map((factor) => ({ rate: factor < 0.25 ? 'night' : 'day', factor }));
    near(carbonByRate(steadyUse(berlin), onNightAndDay, factors), 2920 * 0.1 + 5840 * 0.3);
  });
});
