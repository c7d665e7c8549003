import type { SheetFile } from './memorySource.ts';

/** Where the scenario of a blank start is kept. */
export const BLANK_SCENARIO = 'house.yaml';
export const BLANK_UNIT = 'unit.yaml';

/** A scenario in which everything still has to be entered. */
function blankScenario(zone: string): string {
  return `# A house, entered in the sheet. Comments may be added anywhere; they stay.
name: New house
currency: EUR

site:
  zone: ${JSON.stringify(zone)}

# Hourly weather of one year.
weather:
  file: weather.csv

house:
  heatLoss: { given: coefficient }
  design:
  need:
    model: degreeHours

flowTemperature:
  method: emitters

heatPump:
  unit: ${BLANK_UNIT}

# Electricity tariffs to compare; the first is the present one.
tariffs: []
`;
}

const EMPTY_TABLE = `      outdoor, 35, 45, 55
          -15,   ,   ,
           -7,   ,   ,
            2,   ,   ,
            7,   ,   ,
           12,   ,   ,
`;

const BLANK_UNIT_TEXT = `# A heat-pump unit, as its data sheet prints it.
name: New unit

map:
  fullLoad:
    # Heat, kW
    capacity: |
${EMPTY_TABLE}    # Heat out per unit of electricity in
    cop: |
${EMPTY_TABLE}
defrost: { method: included }
`;

/** A new tariff file. */
export function blankTariff(name: string): string {
  return `name: ${JSON.stringify(name)}

# The first rate that fits a minute prices it; one without times takes what is left.
pricesStated: withTax
rates:
  - { name: all hours }

standing: {}
`;
}

/** Files of a blank start. */
export function blankFiles(zone: string): SheetFile[] {
  return [fileOf(BLANK_SCENARIO, blankScenario(zone)), fileOf(BLANK_UNIT, BLANK_UNIT_TEXT)];
}

/** A file of some text. */
export function fileOf(name: string, text: string): SheetFile {
  return { name, bytes: new TextEncoder().encode(text) };
}
