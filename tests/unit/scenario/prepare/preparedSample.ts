import type { Scenario } from '../../../../src/scenario/scenarioSchema.ts';
import { scenarioSchema } from '../../../../src/scenario/scenarioSchema.ts';
import { type CivilClock, civilClock } from '../../../../src/tariffs/civilClock.ts';

/** A clock that must exist; Berlin in 2025 where nothing else is said. */
export function clockOf(zone = 'Europe/Berlin', offsetMinutes = 60, calendarYear = 2025, hours = 8760): CivilClock {
  const { clock, problem } = civilClock({ hours, offsetMinutes, zone, calendarYear });
  if (clock === undefined) throw new Error(`no clock: ${problem?.code}`);
  return clock;
}

/** The step that begins at an instant, written in UTC. */
export function stepAt(clock: CivilClock, utc: string): number {
  const step = clock.startMillis.indexOf(Date.parse(`${utc}Z`));
  if (step < 0) throw new Error(`no step begins at ${utc}`);
  return step;
}

/** The instants, in UTC, of marked steps. */
export function instantsOf(clock: CivilClock, marks: Uint8Array): string[] {
  return Array.from(marks).flatMap((mark, i) =>
    mark === 1 ? [new Date(clock.startMillis[i]!).toISOString().slice(0, 16)] : [],
  );
}

/** A scenario as written, its sections replaced by those given and its defaults filled in. */
export function scenarioOf(sections: Record<string, unknown> = {}): Scenario {
  return scenarioSchema.parse({
    name: 'sample',
    site: { zone: 'Europe/Berlin' },
    weather: { file: 'weather.csv' },
    house: {
      heatLoss: { given: 'coefficient', value: 200 },
      design: { outdoorTemperature: -12 },
      need: { model: 'degreeHours' },
    },
    flowTemperature: { method: 'fixed', flow: 40 },
    heatPump: { unit: 'unit.yaml' },
    ...sections,
  });
}
