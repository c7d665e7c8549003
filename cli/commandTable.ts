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
  /** Its argument; one that ends in `…` may be repeated. '' for a command that takes none. */
  readonly argument: string;
  readonly argumentSays: string;
  /** A further argument that may be left out; one that ends in `…` may be repeated. */
  readonly further?: { readonly argument: string; readonly says: string };
  readonly says: string;
  readonly options: readonly OptionEntry[];
  /** Whether it runs through many years, so that code compiled for speed pays from the beginning. */
  readonly isLong?: true;
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
    name: 'explain',
    argument: 'SCENARIO',
    argumentSays: 'scenario file (YAML)',
    says: 'one hour of the year step by step: every figure with its unit, its formula in words and where it is published',
    options: [
      {
        name: 'at',
        value: 'TIME',
        says: 'beginning of the hour, civil time of the site unless an offset is written: 2025-01-14T06:00',
      },
      json,
    ],
    examples: [
      'winterledger explain data/demo/house.yaml --at 2025-01-14T06:00',
      'winterledger explain data/demo/house.yaml --at 2025-01-14T06:00+01:00 --json hour.json',
    ],
    load: () => import('./commands/explain.ts'),
  },
  {
    name: 'tariffs',
    argument: 'SCENARIO',
    argumentSays: 'scenario file (YAML); its first tariff is the present one',
    further: { argument: 'TARIFF…', says: 'tariff files (YAML) to compare beside those of the scenario' },
    says: 'tariffs side by side on the whole bill of one simulated year: what each saves, kWh by rate, dearest week',
    options: [json],
    examples: [
      'winterledger tariffs data/demo/house.yaml data/demo/tariffs/half-hourly.yaml',
      'winterledger tariffs data/demo/house.yaml --json tariffs.json',
    ],
    load: () => import('./commands/tariffs.ts'),
  },
  {
    name: 'degree-days',
    argument: 'WEATHER',
    argumentSays: 'hourly weather of one year (CSV)',
    says: 'heating or cooling degree days of a weather file by month and year, K·d',
    options: [
      { name: 'base', value: 'TEMPERATURE', says: 'base temperature, °C', usual: '15.5' },
      {
        name: 'method',
        value: 'METHOD',
        says: 'how a day is counted',
        choices: ['hours', 'mean', 'minmax', 'fourcase', 'threshold'],
        usual: 'hours',
      },
      { name: 'cooling', says: 'count what lies above the base, for cooling; heating when left out' },
      { name: 'read', value: 'FILE', says: 'how to read the weather file (YAML), where it does not say so itself' },
      json,
    ],
    examples: [
      'winterledger degree-days data/demo/weather.csv --base 15.5',
      'winterledger degree-days data/demo/weather.csv --base 18.3 --method mean --json -',
      'winterledger degree-days data/demo/weather.csv --cooling --base 22',
    ],
    load: () => import('./commands/degreeDays.ts'),
  },
  {
    name: 'fit',
    isLong: true,
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
    name: 'batch',
    isLong: true,
    argument: 'PLAN',
    argumentSays: 'plan of a batch (YAML): a base scenario, homes, axes',
    says: 'a year of every home of a plan with every option, a row each; goes on where it was stopped',
    options: [
      { name: 'out', value: 'DIR', says: 'folder for the results; it is made where it is not there' },
      { name: 'workers', value: 'N', says: 'threads that simulate; all cores when left out' },
      { name: 'shard', value: 'K/N', says: 'run only the part K of N, such as 3/16; gather joins the parts' },
      { name: 'limit', value: 'N', says: 'most years that a plan may come to', usual: '200000' },
    ],
    examples: [
      'winterledger batch data/demo/plan.yaml --out results',
      'winterledger batch data/demo/plan.yaml --out part1 --shard 1/2',
      'winterledger batch data/demo/plan.yaml --out part2 --shard 2/2',
    ],
    load: () => import('./commands/batch.ts'),
  },
  {
    name: 'gather',
    isLong: true,
    argument: 'DIR…',
    argumentSays: 'folders with the parts of one batch',
    says: 'joins the parts of a batch that were run with --shard, and says which are missing',
    options: [{ name: 'out', value: 'DIR', says: 'folder for the joined results' }],
    examples: ['winterledger gather part1 part2 --out gathered'],
    load: () => import('./commands/gather.ts'),
  },
  {
    name: 'rank',
    isLong: true,
    argument: 'DIR',
    argumentSays: 'folder with the results of a batch',
    says: 'best and worst years of a batch, how they are spread, and the values of each axis side by side',
    options: [
      {
        name: 'by',
        value: 'FIGURE',
        says: 'what counts',
        choices: ['cost', 'carbon', 'seasonalFactor', 'backupHours'],
        usual: 'cost',
      },
      { name: 'axis', value: 'NAME', says: 'set side by side the values of this axis alone' },
      { name: 'top', value: 'N', says: 'rows that are listed at either end', usual: '5' },
      json,
    ],
    examples: [
      'winterledger rank results --by cost',
      'winterledger rank results --by seasonalFactor --axis unit --top 3 --json ranking.json',
    ],
    load: () => import('./commands/rank.ts'),
  },
  {
    name: 'report',
    argument: 'SCENARIO|DIR',
    argumentSays: 'scenario file (YAML), or folder with the results of a batch',
    says: 'a report of a house or of a batch, for client, professional and auditor, as one HTML file that needs nothing beside itself',
    options: [
      { name: 'out', value: 'FILE', says: 'the HTML file; - for standard output' },
      { name: 'pdf', value: 'FILE', says: 'also print it to a PDF file, by a Chromium that is installed' },
      { name: 'language', value: 'LANGUAGE', says: 'its language', choices: ['en', 'de'], usual: 'en' },
      { name: 'date', value: 'DATE', says: 'date to print, such as 2025-03-31; a line for the hand when left out' },
      {
        name: 'by',
        value: 'FIGURE',
        says: 'of a batch: what counts; cost when left out',
        choices: ['cost', 'carbon', 'seasonalFactor', 'backupHours'],
      },
      { name: 'axes', value: 'A,B', says: 'of a batch: the two axes of the map; those with most values when left out' },
    ],
    examples: [
      'winterledger report data/demo/house.yaml --out report.html',
      'winterledger report data/demo/house.yaml --out bericht.html --language de --date 2025-03-31',
      'winterledger report results --out batch.html --by seasonalFactor --axes unit,radiators',
    ],
    load: () => import('./commands/report.ts'),
  },
  {
    name: 'verify',
    argument: 'REPORT',
    argumentSays: 'report that winterledger has written (HTML)',
    says: 'makes a report again from its scenario and the files on the disk, and says whether each figure still holds',
    options: [],
    examples: ['winterledger verify report.html'],
    load: () => import('./commands/verify.ts'),
  },
  {
    name: 'sheet',
    isLong: true,
    argument: '',
    argumentSays: 'takes no file',
    says: 'the sheet: the whole tool as a page in the browser of this machine; it also works from a file, without a network',
    options: [
      { name: 'port', value: 'N', says: 'port to serve it on; 0 for one that is free', usual: '8733' },
      { name: 'out', value: 'FILE', says: 'write the page to a file instead of serving it' },
    ],
    examples: ['winterledger sheet --out sheet.html'],
    load: () => import('./commands/sheet.ts'),
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
