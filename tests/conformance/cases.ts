import { problemText } from '../../src/core/problemText.ts';
import { documentText } from '../../src/report/documentText.ts';
import { hourlyCsv } from '../../src/report/hourlyCsv.ts';
import { resultDocument } from '../../src/report/resultDocument.ts';
import { makeAnswer } from '../../src/scenario/answer/makeAnswer.ts';
import type { FileSource } from '../../src/scenario/fileSource.ts';
import { loadScenario } from '../../src/scenario/loadScenario.ts';

// Small scenarios, all values invented, that run wherever the core runs: nothing here knows a file, a process or a page.
// The texts that come out are held against one another between places, never against texts that were kept.

/** A scenario with all its files, by name. */
type CaseFiles = Readonly<Record<string, string>>;

/** A year of hours, °C, % and W/m², from whole numbers alone: no function whose last bit could differ goes into it. */
function weather(): string {
  const lines = ['time,temperature °C,relative humidity %,global radiation W/m²'];
  for (let hour = 0; hour < 8760; hour++) {
    const stamp = new Date(Date.UTC(2025, 0, 1) + hour * 3_600_000).toISOString().slice(0, 16);
    const ofYear = Math.abs(((hour + 500) % 8760) - 4380) / 219;
    const ofDay = Math.abs(((hour + 10) % 24) - 12);
    const noise = ((hour * 7919) % 101) / 20;
    const sun = Math.max(0, 6 - ofDay) * (30 + Math.round(3 * (20 - ofYear)));
    lines.push(`${stamp},${(22 - 1.3 * ofYear - 0.4 * ofDay - noise).toFixed(1)},${70 + (hour % 29)},${sun}`);
  }
  return `${lines.join('\n')}\n`;
}

const unit = `name: Invented unit
map:
  fullLoad:
    capacity: |
      outdoor  W35  W45  W55
      A-15     5.0  4.8  4.6
      A-7      6.0  5.8  5.6
      A2       7.0  6.8  6.6
      A7       8.0  7.8  7.6
    cop: |
      outdoor  W35  W45  W55
      A-15     2.4  2.0  1.7
      A-7      2.9  2.4  2.0
      A2       3.6  2.9  2.4
      A7       4.2  3.3  2.8
defrost: { method: humidity }
standbyPower: 9
`;

const tariff = `name: Invented tariff
currency: EUR
rates:
  - { name: night, price: 0.21, from: "22:15", to: "06:00" }
  - { name: Sunday, price: 0.25, weekdays: [sun] }
  - { name: day, price: 0.33 }
standing: { perMonth: 9.9 }
taxes: [{ name: VAT, percent: 19 }]
`;

const rooms = `name: ROOMS
site: { zone: ZONE, altitude: 220 }
weather: { file: weather.csv, read: { stamps: begin, offset: "+01:00" } }
house:
  heatLoss: { given: coefficient, value: 190 }
  floorArea: 130
  design: { outdoorTemperature: -12 }
  need: NEED
flowTemperature: { method: emitters, flow: 48, return: 40 }
circulation: { pumpPower: 35 }
heatPump: { unit: unit.yaml, inUseAllowance: 0.05 }
household: { given: profile, kWhPerYear: 2800 }
tariffs: [tariff.yaml]
boiler: { efficiency: 0.88, fuel: { kind: naturalGas, price: 0.1 } }
wholeLife: { capital: 19000 }
carbon: { electricity: 0.3 }
`;

const water = `hotWater:
  volume: 220
  loss: { given: standingLoss, value: 1.8 }
  draw: { given: profile, profile: M }
  coldWater: { mean: 10, amplitude: 4 }
  hygiene: { weekday: sun, hour: 12 }
`;

const hybrid = `backup:
  source: boiler
  power: 12
  efficiency: 0.9
  fuel: { kind: naturalGas, price: 0.1 }
  mode: { kind: cheapest }
`;

const lumped = `
    model: lumped
    solarAperture: 3
    internalGains: 350
    schedule: [{ name: night, setPoint: 17, start: "22:30", end: "05:30" }]`;
const degreeHours = '{ model: degreeHours, internalGains: 400, solarAperture: 2 }';

function filesOf(name: string, zone: string, need: string, more: string): CaseFiles {
  const scenario = rooms.replace('ROOMS', name).replace('ZONE', zone).replace('NEED', need) + more;
  return { 'house.yaml': scenario, 'unit.yaml': unit, 'tariff.yaml': tariff, 'weather.csv': weather() };
}

/** The cases by name: both models of need, hot water, both backups, zones with clock changes of their own. */
export const conformanceCases: Readonly<Record<string, CaseFiles>> = {
  'degree hours in Berlin': filesOf(
    'Degree hours',
    'Europe/Berlin',
    degreeHours,
    'backup: { source: electric, power: 6 }\n',
  ),
  'mass and hot water on Lord Howe Island': filesOf('Mass', 'Australia/Lord_Howe', lumped, water),
  'a hybrid in St. John’s': filesOf('Hybrid', 'America/St_Johns', degreeHours, water + hybrid),
};

/**
 * What a case comes to: the JSON document and the hourly table, as one text.
 *
 * Checksums of files are made outside the core; here each is the length of the file.
 */
export function conformanceText(files: CaseFiles): string {
  const source: FileSource = {
    read: (name) => {
      const text = files[name];
      if (text === undefined) return { code: 'file.missing', severity: 'error', file: name };
      return { name, bytes: new TextEncoder().encode(text), sha256: String(text.length) };
    },
  };
  const { loaded, problems } = loadScenario('house.yaml', source);
  const { answer } = loaded === undefined ? {} : makeAnswer(loaded, problems);
  if (answer === undefined) throw new Error(problems.map(problemText).join('\n'));
  return documentText(resultDocument(answer, '0')) + [...hourlyCsv(answer)].join('');
}
