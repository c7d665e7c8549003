import type { BlankWords } from '../../src/report/language/english/blankFiles.ts';
import type { SheetFile } from './memorySource.ts';

/** Where the scenario of a blank start is kept. */
export const BLANK_SCENARIO = 'house.yaml';
export const BLANK_UNIT = 'unit.yaml';

/** A scenario in which everything still has to be entered. */
function blankScenario(zone: string, words: BlankWords): string {
  return `# ${words.houseSays}
name: ${words.house}
currency: EUR

site:
  zone: ${JSON.stringify(zone)}

# ${words.weatherSays}
weather:
  file: weather.csv

house:
  heatLoss: { given: coefficient }
  design: {}
  need:
    model: degreeHours

flowTemperature:
  method: emitters

heatPump:
  unit: ${BLANK_UNIT}

# ${words.tariffsSay}
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

const blankUnit = (words: BlankWords) => `# ${words.unitSays}
name: ${words.unit}

map:
  fullLoad:
    # ${words.capacitySays}
    capacity: |
${EMPTY_TABLE}    # ${words.copSays}
    cop: |
${EMPTY_TABLE}
defrost: { method: included }
`;

/** A new tariff file. */
export function blankTariff(number: number, words: BlankWords): string {
  return `name: ${JSON.stringify(words.tariff(number))}

# ${words.ratesSay}
pricesStated: withTax
rates:
  - { name: ${words.allHours} }

standing: {}
`;
}

/** Files of a blank start. */
export function blankFiles(zone: string, words: BlankWords): SheetFile[] {
  return [fileOf(BLANK_SCENARIO, blankScenario(zone, words)), fileOf(BLANK_UNIT, blankUnit(words))];
}

/** A file of some text. */
export function fileOf(name: string, text: string): SheetFile {
  return { name, bytes: new TextEncoder().encode(text) };
}
