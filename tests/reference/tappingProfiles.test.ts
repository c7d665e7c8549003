import { describe, expect, test } from 'vitest';
import { hourlyProfile, type TappingProfileName, tappingProfiles } from '../../src/sim/tappingProfiles.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'Hot-water tapping profiles');
const sums = accuracy.comparison({
  what: 'kWh of the tapping profiles S, M, L and XL, by draws and by hours',
  source: 'Regulation (EU) 813/2013 annex III table 7',
  unit: 'kWh',
  allowed: 1e-9,
  why: 'sums of printed thousandths',
});
const hours = accuracy.comparison({
  what: 'kWh of each hour of the day',
  source: 'the same table',
  unit: 'kWh',
  allowed: 1e-12,
  why: 'sums of a few printed thousandths',
});

/**
 * Draws of a day: time and kWh, as printed, and the day's sum. Source: Commission Regulation (EU) No 813/2013, annex III,
 * table 7.
 */
const printed: Record<TappingProfileName, { readonly sum: number; readonly draws: string }> = {
  S: {
    sum: 2.1,
    draws:
      '07:00 .105; 07:30 .105; 08:30 .105; 09:30 .105; 11:30 .105; 11:45 .105; 12:45 .315; 18:00 .105; 18:15 .105; 20:30 .420; 21:30 .525',
  },
  M: {
    sum: 5.845,
    draws:
      '07:00 .105; 07:05 1.400; 07:30 .105; 08:01 .105; 08:15 .105; 08:30 .105; 08:45 .105; 09:00 .105; 09:30 .105; 10:30 .105; 11:30 .105; 11:45 .105; 12:45 .315; 14:30 .105; 15:30 .105; 16:30 .105; 18:00 .105; 18:15 .105; 18:30 .105; 19:00 .105; 20:30 .735; 21:15 .105; 21:30 1.400',
  },
  L: {
    sum: 11.655,
    draws:
      '07:00 .105; 07:05 1.400; 07:30 .105; 07:45 .105; 08:05 3.605; 08:25 .105; 08:30 .105; 08:45 .105; 09:00 .105; 09:30 .105; 10:30 .105; 11:30 .105; 11:45 .105; 12:45 .315; 14:30 .105; 15:30 .105; 16:30 .105; 18:00 .105; 18:15 .105; 18:30 .105; 19:00 .105; 20:30 .735; 21:00 3.605; 21:30 .105',
  },
  XL: {
    sum: 19.07,
    draws:
      '07:00 .105; 07:15 1.820; 07:26 .105; 07:45 4.420; 08:01 .105; 08:15 .105; 08:30 .105; 08:45 .105; 09:00 .105; 09:30 .105; 10:00 .105; 10:30 .105; 11:00 .105; 11:30 .105; 11:45 .105; 12:45 .735; 14:30 .105; 15:00 .105; 15:30 .105; 16:00 .105; 16:30 .105; 17:00 .105; 18:00 .105; 18:15 .105; 18:30 .105; 19:00 .105; 20:30 .735; 20:46 4.420; 21:15 .105; 21:30 4.420',
  },
};

const names: readonly TappingProfileName[] = ['S', 'M', 'L', 'XL'];

function drawsOf(name: TappingProfileName): [string, number][] {
  return printed[name].draws.split('; ').map((draw) => {
    const [time = '', kWh] = draw.split(' ');
    return [time, Number(kWh)];
  });
}

describe.each(names)('tapping profile %s', (name) => {
  test('has the printed draws at the printed times', () => {
    expect(tappingProfiles[name]).toEqual(drawsOf(name));
  });

  test('sums to its printed kWh, draw by draw and by the hour', () => {
    const byDraw = tappingProfiles[name].reduce((sum, [, kWh]) => sum + kWh, 0);
    const byHour = hourlyProfile(name).reduce((sum, kWh) => sum + kWh, 0);
    expect(Math.abs(byDraw - printed[name].sum)).toBeLessThanOrEqual(1e-9);
    expect(Math.abs(byHour - printed[name].sum)).toBeLessThanOrEqual(1e-9);
    sums.add(byDraw - printed[name].sum);
    sums.add(byHour - printed[name].sum);
  });

  test('draws each hour what is printed within it', () => {
    const kWh = hourlyProfile(name);
    for (let hour = 0; hour < 24; hour++) {
      const within = drawsOf(name).filter(([time]) => Number(time.split(':')[0]) === hour);
      const sum = within.reduce((total, [, draw]) => total + draw, 0);
      expect(Math.abs(kWh[hour]! - sum)).toBeLessThanOrEqual(1e-12);
      hours.add(kWh[hour]! - sum);
    }
  });
});
