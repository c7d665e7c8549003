import { readFileSync } from 'node:fs';
import { englishBlank } from '../src/report/language/english/blankFiles.ts';
import { type Action, act } from '../web/model/sheetActions.ts';
import { SheetModel } from '../web/model/sheetModel.ts';
import { runVariant } from '../web/model/whatIfRun.ts';
import { type Candidate, measure } from './measure.ts';

const NAMES = [
  ...['house.yaml', 'weather.csv', 'units/quarkenfels-8.yaml', 'tariffs/flat.yaml', 'tariffs/night.yaml'],
  ...['tariffs/three-band.yaml', 'tariffs/half-hourly.yaml', 'tariffs/prices.csv'],
];
const SAMPLES = 31;
/** Work from a key to what is shown, at most, on a year whose weather is prepared; ms. */
const ASKED = 50;

/** The sheet from a key to all that it shows, without the drawing by the browser: what its worker does and hands over. */
export function benchSheet(say: (line: string) => void): void {
  const model = new SheetModel('bench');
  model.box.replace(
    NAMES.map((name) => ({ name, bytes: new Uint8Array(readFileSync(`data/demo/${name}`)) })),
    'house.yaml',
  );
  let count = 0;
  const key = (name: string, file: string, path: (string | number)[], least: number): Candidate => ({
    name,
    repeat: 1,
    run: () => {
      count++;
      const action: Action = { do: 'write', file, path, text: String(least + count / 1000), input: 'number' };
      act(model.box, action, englishBlank);
      return structuredClone(model.state()).files.length;
    },
  });
  const slider: Candidate = {
    name: 'sheet: a slider',
    repeat: 1,
    run: () => {
      count++;
      const changes = { flow: -count / 1000, rooms: 0, heatLoss: 0, size: 0, electricity: 0, fuel: 0 };
      return runVariant(model, changes)?.electricity ?? Number.NaN;
    },
  };
  say('');
  const measured = measure(
    [
      key('sheet: a key in the heat loss', 'house.yaml', ['house', 'heatLoss', 'value'], 195),
      key('sheet: a key in a price', 'tariffs/night.yaml', ['rates', 0, 'price'], 0.2),
      slider,
    ],
    SAMPLES,
  );
  for (const { name, least, median, most } of measured) {
    const figures = `${median.toFixed(1).padStart(8)} ms`;
    say(`${name.padEnd(32)} ${figures}   (${least.toFixed(1)} to ${most.toFixed(1)}; asked: at most ${ASKED})`);
  }
}
