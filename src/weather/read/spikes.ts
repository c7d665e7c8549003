import type { Findings } from './findings.ts';

/** So far from both neighbours, on the same side, an hour's temperature is no weather, K. Common practice, no source. */
const SPIKE = 15;

/**
 * Warns of single hours whose temperature leaps away from both neighbours and back.
 *
 * @param temperature °C, one an hour, all finite; the year is periodic
 * @param lines line of the last row of each hour, 0 where the file leaves it out
 * @param label what the column is called
 */
export function reportSpikes(
  temperature: Float64Array,
  lines: Int32Array,
  { label, findings }: { readonly label: string; readonly findings: Findings },
): void {
  const hours = temperature.length;
  for (let hour = 0; hour < hours; hour++) {
    const value = temperature[hour] as number;
    const before = value - (temperature[(hour - 1 + hours) % hours] as number);
    const after = value - (temperature[(hour + 1) % hours] as number);
    const least = Math.min(Math.abs(before), Math.abs(after));
    if (least < SPIKE || before > 0 !== after > 0) continue;
    findings.add({
      code: 'weather.spike',
      severity: 'warning',
      line: lines[hour] as number,
      path: label,
      found: value.toFixed(1),
      unit: '°C',
      allowed: `${least.toFixed(1)} K`,
    });
  }
}
