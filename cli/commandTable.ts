import type { Run } from './io.ts';

/** One option of a command. */
export interface OptionEntry {
  /** Long name, without its dashes. */
  readonly name: string;
  /** What its value is, as the help writes it; a switch has none. */
  readonly value?: string;
  readonly says: string;
  readonly choices?: readonly string[];
  readonly usual?: string;
}

/** One command: what the help says of it, and where its code is. */
export interface CommandEntry {
  readonly name: string;
  /** Its argument; one that ends in `…` may be repeated. */
  readonly argument: string;
  readonly argumentSays: string;
  readonly says: string;
  readonly options: readonly OptionEntry[];
  /** Lines that run as they stand, from the folder that holds `data/demo`. */
  readonly examples: readonly string[];
  /** Loads the code only when the command is asked for, so that the help starts at once. */
  readonly load: () => Promise<{ readonly run: Run }>;
}

const json: OptionEntry = {
  name: 'json',
  value: 'FILE',
  says: 'write the result as JSON to a file; - for standard output',
};

/** Every command and option of the program. */
export const commandTable: readonly CommandEntry[] = [
  {
    name: 'simulate',
    argument: 'SCENARIO',
    argumentSays: 'scenario file (YAML)',
    says: 'a year of a heat pump in a house: electricity, backup, cost on each tariff, against the boiler',
    options: [
      json,
      { name: 'hourly', value: 'FILE', says: 'write every hour of the year as CSV to a file; - for standard output' },
    ],
    examples: [
      'winterledger simulate data/demo/house.yaml',
      'winterledger simulate data/demo/house.yaml --json result.json --hourly hours.csv',
    ],
    load: () => import('./commands/simulate.ts'),
  },
  {
    name: 'degree-days',
    argument: 'WEATHER',
    argumentSays: 'hourly weather of one year (CSV)',
    says: 'heating degree days of a weather file by month and year, K·d',
    options: [
      { name: 'base', value: 'TEMPERATURE', says: 'base temperature, °C', usual: '15.5' },
      {
        name: 'method',
        value: 'METHOD',
        says: 'how a day is counted',
        choices: ['hours', 'mean', 'minmax', 'fourcase', 'threshold'],
        usual: 'hours',
      },
      { name: 'read', value: 'FILE', says: 'how to read the weather file (YAML), where it does not say so itself' },
      json,
    ],
    examples: [
      'winterledger degree-days data/demo/weather.csv --base 15.5',
      'winterledger degree-days data/demo/weather.csv --base 18.3 --method mean --json -',
    ],
    load: () => import('./commands/degreeDays.ts'),
  },
  {
    name: 'fit',
    argument: 'SCENARIO',
    argumentSays: 'scenario file (YAML); its section readings says how readings become heat',
    says: 'the heat loss that meter readings of the house show, with its uncertainty, ready to put into the scenario',
    options: [
      { name: 'readings', value: 'FILE', says: 'meter readings, use by period or fills of a tank (CSV)' },
      json,
    ],
    examples: ['winterledger fit data/demo/house.yaml --readings data/demo/meter.csv'],
    load: () => import('./commands/fit.ts'),
  },
  {
    name: 'season',
    argument: 'UNIT',
    argumentSays: 'heat-pump unit (YAML)',
    says: 'a unit in the seasons of the energy label: SCOP and efficiency by its map and by its declared points, beside its label',
    options: [
      {
        name: 'climate',
        value: 'CLIMATE',
        says: 'one climate; every declared one when left out',
        choices: ['average', 'warmer', 'colder'],
      },
      {
        name: 'application',
        value: 'TEMPERATURE',
        says: 'one application, °C; every declared one when left out',
        choices: ['35', '45', '55', '65'],
      },
      { name: 'bins', says: 'show every season bin by bin' },
      json,
    ],
    examples: [
      'winterledger season data/demo/units/quarkenfels-8.yaml',
      'winterledger season data/demo/units/hollerwisch-6.yaml --climate average --application 55 --bins',
    ],
    load: () => import('./commands/season.ts'),
  },
  {
    name: 'check',
    argument: 'FILE…',
    argumentSays: 'scenario, unit, tariff, weather or other input files',
    says: 'looks through input files and lists all that is wrong with them',
    options: [],
    examples: ['winterledger check data/demo/house.yaml data/demo/weather.csv data/demo/tariffs/night.yaml'],
    load: () => import('./commands/check.ts'),
  },
];
