import { describe, expect, it } from 'vitest';
import { equationOfTime, sineOfSunHeight } from '../../../scripts/demo/sunHeight.ts';

const northPole = { latitude: 90, longitude: 0 };

/** Hours since 1 January 2025 00:00 UTC. */
function hoursOf2025(month: number, day: number, hour: number): number {
  return (Date.UTC(2025, month - 1, day, hour) - Date.UTC(2025, 0, 1)) / 3_600_000;
}

function degrees(sine: number): number {
  return (Math.asin(sine) * 180) / Math.PI;
}

// Instants of 2025 from the almanacs (from memory): equinoxes 20 March 09 UTC and 22 September 18 UTC, solstices
// 21 June 03 UTC and 21 December 15 UTC; obliquity 23.44°. A series of the mean year is off by up to 0.6° near the
// equinoxes, one and a half days: they move by 18 hours within the leap cycle and have crept forward in the century.
describe('the sun', () => {
  it('stands on the horizon of the pole at the equinoxes', () => {
    expect(Math.abs(degrees(sineOfSunHeight(northPole, hoursOf2025(3, 20, 9))))).toBeLessThan(0.6);
    expect(Math.abs(degrees(sineOfSunHeight(northPole, hoursOf2025(9, 22, 18))))).toBeLessThan(0.6);
  });

  it('stands as high over the pole as the axis leans at the solstices', () => {
    expect(Math.abs(degrees(sineOfSunHeight(northPole, hoursOf2025(6, 21, 3))) - 23.44)).toBeLessThan(0.05);
    expect(Math.abs(degrees(sineOfSunHeight(northPole, hoursOf2025(12, 21, 15))) + 23.44)).toBeLessThan(0.05);
  });

  it('stands highest at noon of its own longitude', () => {
    const place = { latitude: 50, longitude: 15 };
    const noon = hoursOf2025(6, 21, 11); // 15° east: noon is at 11 UTC, within the two minutes of the equation of time
    expect(Math.abs(degrees(sineOfSunHeight(place, noon)) - (90 - 50 + 23.44))).toBeLessThan(0.1);
    expect(sineOfSunHeight(place, noon - 12)).toBeLessThan(0);
  });

  it('is as high before as after noon of the sundial', () => {
    // At 15° east on 3 November noon is 16.4 minutes before 11 UTC. Three hours off, a minute is 0.12° of height; the
    // declination moves by 0.08° in six hours.
    const noon = hoursOf2025(11, 3, 11) - 16.4 / 60;
    const height = (hours: number) => degrees(sineOfSunHeight({ latitude: 50, longitude: 15 }, hours));
    expect(Math.abs(height(noon - 3) - height(noon + 3))).toBeLessThan(0.15);
  });

  it('is late in February and early in November', () => {
    const year = (month: number, day: number) => (2 * Math.PI * (hoursOf2025(month, day, 12) - 12)) / 8760;
    // Extremes of the equation of time, from memory: −14.2 min about 11 February, +16.4 min about 3 November.
    expect(Math.abs(equationOfTime(year(2, 11)) + 14.2)).toBeLessThan(0.3);
    expect(Math.abs(equationOfTime(year(11, 3)) - 16.4)).toBeLessThan(0.3);
    expect(equationOfTime(0)).toBeCloseTo(-2.9, 1); // the example of its doc block
  });
});
