/** Tapping profiles of the regulation, by name. */
export type TappingProfileName = 'S' | 'M' | 'L' | 'XL';

/** Draws as printed: time of day 'HH:MM' and kWh. */
type Draws = readonly (readonly [time: string, kWh: number])[];

/** Small draws that several profiles share: times with 0.105 kWh each. */
const small = (...times: string[]): Draws => times.map((time) => [time, 0.105] as const);

/**
 * Draws of a day, kWh of useful energy at the printed times.
 *
 * Reference: Commission Regulation (EU) No 813/2013, annex III, table 7 (the same profiles in 814/2013).
 */
export const tappingProfiles: Record<TappingProfileName, Draws> = {
  S: [
    ...small('07:00', '07:30', '08:30', '09:30', '11:30', '11:45'),
    ['12:45', 0.315],
    ...small('18:00', '18:15'),
    ['20:30', 0.42],
    ['21:30', 0.525],
  ],
  M: [
    ...small('07:00'),
    ['07:05', 1.4],
    ...small('07:30', '08:01', '08:15', '08:30', '08:45', '09:00', '09:30', '10:30', '11:30', '11:45'),
    ['12:45', 0.315],
    ...small('14:30', '15:30', '16:30', '18:00', '18:15', '18:30', '19:00'),
    ['20:30', 0.735],
    ...small('21:15'),
    ['21:30', 1.4],
  ],
  L: [
    ...small('07:00'),
    ['07:05', 1.4],
    ...small('07:30', '07:45'),
    ['08:05', 3.605],
    ...small('08:25', '08:30', '08:45', '09:00', '09:30', '10:30', '11:30', '11:45'),
    ['12:45', 0.315],
    ...small('14:30', '15:30', '16:30', '18:00', '18:15', '18:30', '19:00'),
    ['20:30', 0.735],
    ['21:00', 3.605],
    ...small('21:30'),
  ],
  XL: [
    ...small('07:00'),
    ['07:15', 1.82],
    ...small('07:26'),
    ['07:45', 4.42],
    ...small('08:01', '08:15', '08:30', '08:45', '09:00', '09:30', '10:00', '10:30', '11:00', '11:30', '11:45'),
    ['12:45', 0.735],
    ...small('14:30', '15:00', '15:30', '16:00', '16:30', '17:00', '18:00', '18:15', '18:30', '19:00'),
    ['20:30', 0.735],
    ['20:46', 4.42],
    ...small('21:15'),
    ['21:30', 4.42],
  ],
};

/**
 * A profile summed into the hours of a day.
 *
 * @param name S, M, L or XL
 * @returns 24 values, kWh drawn in the hour that begins at the index
 * @example hourlyProfile('M')[7] // 0.105 + 1.4 + 0.105 = 1.61
 */
export function hourlyProfile(name: TappingProfileName): Float64Array {
  const hours = new Float64Array(24);
  for (const [time, kWh] of tappingProfiles[name]) hours[Number(time.slice(0, 2))] += kWh;
  return hours;
}
