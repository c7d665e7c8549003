import { describe, expect, it } from 'vitest';
import { priceCsv } from '../../../scripts/demo/priceCsv.ts';
import { fixed, weatherCsv } from '../../../scripts/demo/weatherCsv.ts';

describe('the text of the demo', () => {
  it('shows a rounded zero without a sign', () => {
    expect(fixed(-0.04, 1)).toBe('0.0');
    expect(fixed(-0.06, 1)).toBe('-0.1');
    expect(fixed(-0.4, 0)).toBe('0');
  });

  it('says first that the weather is invented, then one rounded line an hour', () => {
    const text = weatherCsv({
      temperature: Float64Array.of(-0.04, 12.345),
      relativeHumidity: Float64Array.of(89.6, 100),
      globalRadiation: Float64Array.of(0, 412.4),
      pressure: Float64Array.of(963.94, 970),
    });
    const lines = text.split('\n');
    expect(lines[0]).toMatch(/^# invented weather .*scripts\/demo\/townWeather\.ts.* seed '/);
    expect(lines.slice(2)).toEqual(['2025-01-01T00:00,0.0,90,0,963.9', '2025-01-01T01:00,12.3,100,412,970.0', '']);
  });

  it('says in its header that the prices are invented, then one line a half-hour in UTC', () => {
    const lines = priceCsv({ start: Date.UTC(2024, 11, 31, 23, 30), price: Float64Array.of(0.1, -0.012344) }).split(
      '\n',
    );
    expect(lines[0]).toBe('time,invented price EUR/kWh');
    expect(lines.slice(1)).toEqual(['2024-12-31T23:30Z,0.10000', '2025-01-01T00:00Z,-0.01234', '']);
  });
});
