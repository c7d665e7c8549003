// Small sound files, all values invented; tests change one thing in them at a time.

/** A scenario that names weather.csv, unit.yaml and tariff.yaml. */
export const scenarioText = `name: Test house
site: { zone: Europe/Berlin, altitude: 100 }
weather:
  file: weather.csv
  read: { offset: "+01:00", stamps: begin }
house:
  heatLoss: { given: coefficient, value: 180 }
  floorArea: 120
  design: { outdoorTemperature: -12 }
  need:
    model: degreeHours
    internalGains: 300
flowTemperature:
  method: emitters
  flow: 45
  return: 38
heatPump:
  unit: unit.yaml
backup: { source: electric, power: 6 }
tariffs: [tariff.yaml]
`;

/** The same with a lumped house, hot water, curve and a hybrid boiler. */
export const lumpedText = `name: Lumped house
site: { zone: Europe/Berlin }
weather:
  file: weather.csv
  read: { offset: "+01:00", stamps: begin }
house:
  heatLoss: { given: coefficient, value: 180 }
  floorArea: 120
  design: { outdoorTemperature: -12 }
  need:
    model: lumped
    lossShares: { windows: 0.3, opaque: 0.5, ventilation: 0.2 }
    schedule:
      - { name: night, setPoint: 17, start: "22:00", end: "06:00" }
      - { name: cheap, raise: 1, rate: night }
flowTemperature:
  method: curve
  points: [[-12, 45], [15, 28]]
heatPump:
  unit: unit.yaml
  quietHours: [{ start: "22:00", end: "06:00", capacity: 0.5 }]
hotWater:
  volume: 200
  loss: { given: coefficient, value: 1.8 }
  draw: { given: litres, litresPerDay: 120, useTemperature: 42 }
  coldWater: { mean: 10, amplitude: 4 }
  hygiene: { weekday: sun, hour: 12 }
backup:
  source: boiler
  power: 15
  efficiency: 0.9
  fuel: { kind: naturalGas, price: 0.1 }
  mode: { kind: cheapest }
tariffs: [tariff.yaml]
`;

/** A unit whose COP is a smooth share of the Carnot COP. */
export const unitText = `name: Test unit
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
`;

export const tariffText = `name: Test tariff
currency: EUR
rates:
  - { name: night, price: 0.2, from: "22:00", to: "06:00" }
  - { name: day, price: 0.3 }
`;

/** A year of hours at a cosine of the year and of the day, °C; humidity, and radiation where asked for. */
export function weatherText(options: { hours?: number; year?: number; radiation?: boolean } = {}): string {
  const { hours = 8760, year = 2025, radiation = false } = options;
  const start = Date.UTC(year, 0, 1);
  const lines = [`time,temperature °C,relative humidity %${radiation ? ',global radiation W/m²' : ''}`];
  for (let i = 0; i < hours; i++) {
    const stamp = new Date(start + i * 3_600_000).toISOString().slice(0, 16);
    const seasonal = 9 - 10 * Math.cos((2 * Math.PI * (i - 400)) / 8760);
    const daily = -3 * Math.cos((2 * Math.PI * ((i % 24) - 3)) / 24);
    const sun = Math.max(0, Math.round(400 * Math.sin((2 * Math.PI * ((i % 24) - 6)) / 24)));
    lines.push(`${stamp},${(seasonal + daily).toFixed(1)},80${radiation ? `,${sun}` : ''}`);
  }
  return `${lines.join('\n')}\n`;
}

/** All files of a scenario under their names. */
export function sampleFiles(changes: Record<string, string> = {}): Record<string, string> {
  return {
    'house.yaml': scenarioText,
    'unit.yaml': unitText,
    'tariff.yaml': tariffText,
    'weather.csv': sampleWeather,
    ...changes,
  };
}

const sampleWeather = weatherText();
