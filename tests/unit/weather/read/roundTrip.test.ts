import fc from 'fast-check';
import { expect, it } from 'vitest';
import { type Hour, iso, pad, parts, read, syntheticYear } from './syntheticYear.ts';

const delimiters = [',', ';', '\t', '|', '  '] as const;
const marks = ['.', ','] as const;
const steps = [60, 30, 20, 15, 10, 6, 5] as const;

const stampForms: readonly ((minute: number) => string)[] = [
  iso,
  (m) => `${iso(m).replace('T', ' ')}:00`,
  (m) => `${iso(m)}+01:00`,
  (m) => iso(m).replaceAll('-', '/').replace('T', ' '),
  (m) => `${pad(parts(m).d)}.${pad(parts(m).m)}.${parts(m).y} ${pad(parts(m).h)}:${pad(parts(m).min)}`,
  (m) => `${parts(m).m}/${parts(m).d}/${parts(m).y} ${parts(m).h}:${pad(parts(m).min)}`,
  (m) => iso(m).replace(/[-T:]/g, ''),
];

/** How a temperature is printed and what the header says; each form loses nothing of one decimal of a degree. */
const temperatures = [
  { head: 'temperature (°C)', print: (celsius: number) => celsius.toFixed(1) },
  { head: 'temp_F', print: (celsius: number) => (celsius * 1.8 + 32).toFixed(10) },
  { head: 'T [K]', print: (celsius: number) => (celsius + 273.15).toFixed(10) },
  { head: 'Temperatur in 0.1 °C', print: (celsius: number) => (celsius * 10).toFixed(0) },
] as const;

/** Energies of one step, W/m² over `step` minutes. */
const radiations = [
  { head: 'GHI (W/m²)', print: (watts: number, _step: number) => String(watts) },
  { head: 'GHI (Wh/m²)', print: (watts: number, step: number) => ((watts * step) / 60).toFixed(10) },
  { head: 'GHI (kJ/m²)', print: (watts: number, step: number) => (watts * step * 0.06).toFixed(10) },
  { head: 'GHI (J/cm²)', print: (watts: number, step: number) => (watts * step * 0.006).toFixed(11) },
] as const;

const years = new Map<string, readonly Hour[]>();

function yearOf(year: number, step: number): readonly Hour[] {
  const key = `${year} ${step}`;
  const made = years.get(key) ?? syntheticYear(year, step);
  years.set(key, made);
  return made;
}

const way = fc.record({
  delimiter: fc.constantFrom(...delimiters),
  mark: fc.constantFrom(...marks),
  step: fc.constantFrom(...steps),
  stamp: fc.constantFrom(...stampForms),
  temperature: fc.constantFrom(...temperatures),
  radiation: fc.constantFrom(...radiations),
  year: fc.constantFrom(2019, 2020),
  atEnd: fc.boolean(),
  lineEnd: fc.constantFrom('\n', '\r\n'),
});

function print(w: typeof way extends fc.Arbitrary<infer T> ? T : never): string {
  const quote = w.delimiter === ',' && w.mark === ',' ? '"' : '';
  const number = (text: string) => `${quote}${text.replace('.', w.mark)}${quote}`;
  const isBlank = w.delimiter === '  ';
  const names = [isBlank ? 'stamp' : 'time', w.temperature.head, w.radiation.head].map((name) =>
    isBlank ? name.replaceAll(' ', '_') : name,
  );
  const rows = yearOf(w.year, w.step).map((h) => {
    const stamp = w.stamp(h.minute + (w.atEnd ? w.step : 0));
    const cells = [number(w.temperature.print(h.temperature)), number(w.radiation.print(h.radiation, w.step))];
    return [isBlank ? stamp.replace(' ', 'T') : stamp, ...cells].join(w.delimiter);
  });
  return [names.join(w.delimiter), ...rows].join(w.lineEnd);
}

it('reading what was printed gives the hourly means of what was printed, in every combination of forms', () => {
  fc.assert(
    fc.property(way, (w) => {
      const { series, problems, recognised } = read(print(w), { stamps: w.atEnd ? 'end' : 'begin' });
      expect(problems).toEqual([]);
      expect(recognised.stepMinutes).toBe(w.step);
      const printed = yearOf(w.year, w.step);
      const perHour = 60 / w.step;
      expect(series?.hours).toBe(printed.length / perHour);
      for (let hour = 0; hour < printed.length / perHour; hour++) {
        const rows = printed.slice(hour * perHour, (hour + 1) * perHour);
        const temperature = rows.reduce((sum, h) => sum + h.temperature, 0) / perHour;
        const radiation = rows.reduce((sum, h) => sum + h.radiation, 0) / perHour;
        // Ten decimals are printed: 1e-9 is left after converting back.
        if (!(Math.abs(series!.temperature[hour]! - temperature) <= 1e-9))
          expect(series!.temperature[hour]).toBe(temperature);
        if (!(Math.abs(series!.globalRadiation![hour]! - radiation) <= 1e-8))
          expect(series!.globalRadiation![hour]).toBe(radiation);
      }
    }),
    { seed: 8760, numRuns: 60 },
  );
});
