import { readFileSync } from 'node:fs';

/** A file of the demo, as it stands. */
function demo(name: string): string {
  return readFileSync(new URL(`../../data/demo/${name}`, import.meta.url), 'utf8');
}

/** Values by the hour of 2025 in UTC, invented. */
function hourlySeries(column: string, value: (hour: number) => number): string {
  const start = Date.UTC(2025, 0, 1);
  const rows = Array.from({ length: 8760 }, (_, hour) => {
    const stamp = new Date(start + hour * 3_600_000).toISOString().slice(0, 16);
    return `${stamp}Z,${value(hour).toFixed(4)}`;
  });
  return `time,${column}\n${rows.join('\n')}\n`;
}

const wave = (hour: number) => Math.sin((2 * Math.PI * (hour % 24)) / 24);

/** A house in which everything is on that the demo leaves out: mass, hot water, a hybrid, schedules, series. */
const fullHouse = `name: Everything at once
note: Invented for trying.
currency: EUR
site: { zone: America/St_Johns, altitude: 140, calendarYear: 2025 }
weather:
  file: weather.csv
  read: { stamps: begin, offset: "+01:00", clock: standard }
house:
  heatLoss:
    given: elements
    elements:
      - { name: walls, area: 140, uValue: 0.4 }
      - { name: roof, area: 90, uValue: 0.2, factor: 0.9 }
      - { name: windows, kind: window, area: 24, uValue: 1.3 }
    thermalBridges: [{ name: sills, length: 40, psi: 0.05 }]
    ventilation: { volume: 340, airChanges: 0.5 }
  floorArea: 138
  design: { outdoorTemperature: -12 }
  need:
    model: lumped
    massClass: medium
    internalGains: 400
    solarAperture: 3
    heatingLimit: 16
    schedule:
      - { name: night, setPoint: 17, start: "22:30", end: "05:45" }
      - { name: cheap, raise: 1, rate: night, weekdays: [sat, sun] }
      - { name: away, setPoint: 12, from: "02-10", to: "02-17" }
flowTemperature: { method: curve, points: [[-12, 52], [0, 44], [18, 28]] }
circulation: { pumpPower: 40, waterContent: 160 }
heatPump:
  unit: units/quarkenfels-8.yaml
  inUseAllowance: 0.05
  quietHours: [{ start: "22:00", end: "06:00", capacity: 0.6, weekdays: [mon, tue] }]
hotWater:
  volume: 250
  setPoint: 50
  loss: { given: standingLoss, value: 1.9 }
  draw: { given: litres, litresPerDay: 140, useTemperature: 42 }
  coldWater: { mean: 10, amplitude: 4, warmestDay: 230 }
  reheatWindows: [{ start: "12:00", end: "16:00" }, { start: "00:00", end: "06:00" }]
  hygiene: { weekday: sun, hour: 12, temperature: 62 }
backup:
  source: boiler
  power: 14
  efficiency: 0.9
  hotWaterEfficiency: 0.82
  fuel: { kind: naturalGas, price: 0.09, standingPerYear: 100, taxes: [{ name: VAT, percent: 5 }] }
  mode: { kind: cheapest }
household: { given: meter, file: household.csv, unit: kWh }
tariffs:
  - tariffs/night.yaml
  - tariffs/half-hourly.yaml
  - name: change
    supplies: [{ file: tariffs/flat.yaml }, { file: tariffs/blocks.yaml, from: "07-01" }]
boiler:
  efficiency: 0.88
  fuel: { kind: naturalGas, price: 0.09, standingPerYear: 100 }
  pumpPower: 60
  servicePerYear: 120
carbon: { electricity: { given: series, file: carbon.csv, unit: kgPerKWh } }
wholeLife: { capital: 20000, grant: 5000, replacedBoiler: 4000, years: 20 }
readings: { efficiency: 0.85, weather: [weather.csv], read: { stamps: begin, offset: "+01:00" } }
`;

const blocksTariff = `name: Blocks
currency: EUR
blocks: { per: month, prices: [{ upTo: 300, price: 0.2 }, { upTo: 900, price: 0.28 }, { price: 0.35 }] }
demand: { perKW: 3.5 }
standing: { perDay: 0.4, perMonth: 2, perYear: 10 }
taxes: [{ name: VAT, percent: 5 }, { name: levy, percent: 2.5 }]
credits: [{ name: bonus, amount: 60 }]
pricesStated: withTax
`;

const tablesUnit = `name: Unit with tables of its own
map:
  fullLoad: { capacity: { file: capacity.csv }, cop: { file: cop.csv } }
defrost: { method: humidity }
`;

const capacityTable = 'outdoor,35,45,55\n-15,5.0,4.8,4.6\n-7,6.0,5.8,5.6\n2,7.0,6.8,6.6\n7,8.0,7.8,7.6\n';
const copTable = 'outdoor,35,45,55\n-15,2.4,2.0,1.7\n-7,2.9,2.4,2.0\n2,3.6,2.9,2.4\n7,4.2,3.3,2.8\n';

const readSettings = `delimiter: comma
decimal: point
skipLines: 1
header: true
columns: { stamp: time, temperature: "temperature °C", relativeHumidity: 3, pressure: false }
units: { temperature: C, relativeHumidity: percent }
stamps: begin
offset: "+01:00"
clock: standard
missing: [-999, n/a]
`;

/** Sound files of every kind, each small as its kind allows; hurt one at a time. */
export const soundFiles = {
  'house.yaml': demo('house.yaml'),
  'full.yaml': fullHouse,
  'tables.yaml': demo('house.yaml').replace('units/quarkenfels-8.yaml', 'units/tables.yaml'),
  'units/quarkenfels-8.yaml': demo('units/quarkenfels-8.yaml'),
  'units/hollerwisch-6.yaml': demo('units/hollerwisch-6.yaml'),
  'units/tables.yaml': tablesUnit,
  'capacity.csv': capacityTable,
  'cop.csv': copTable,
  'tariffs/flat.yaml': demo('tariffs/flat.yaml'),
  'tariffs/night.yaml': demo('tariffs/night.yaml'),
  'tariffs/three-band.yaml': demo('tariffs/three-band.yaml'),
  'tariffs/half-hourly.yaml': demo('tariffs/half-hourly.yaml').replace('invented price EUR/kWh', 'price EUR/kWh'),
  'tariffs/blocks.yaml': blocksTariff,
  'prices.csv': hourlySeries('price EUR/kWh', (hour) => 0.1 + 0.12 * wave(hour)),
  'household.csv': hourlySeries('energy kWh', (hour) => 0.35 + 0.2 * wave(hour)),
  'carbon.csv': hourlySeries('factor kg/kWh', (hour) => 0.3 + 0.1 * wave(hour)),
  'weather.csv': demo('weather.csv'),
  'meter.csv': demo('meter.csv'),
  'read.yaml': readSettings,
  'plan.yaml': demo('plan.yaml'),
  'homes.csv': demo('homes.csv').split('\n').slice(0, 8).join('\n'),
} as const;

export type SoundName = keyof typeof soundFiles;
