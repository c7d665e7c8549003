import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { englishBlank } from '../../../src/report/language/english/blankFiles.ts';
import type { FileBox } from '../../../web/model/fileBox.ts';
import type { SheetFile } from '../../../web/model/memorySource.ts';
import { picturesOf } from '../../../web/model/pictures.ts';
import { type Action, act as actIn } from '../../../web/model/sheetActions.ts';
import { SheetModel } from '../../../web/model/sheetModel.ts';
import { blankFiles, fileOf } from '../../../web/model/startFiles.ts';
import { takeFiles as takeIn } from '../../../web/model/takeFiles.ts';
import { runVariant } from '../../../web/model/whatIfRun.ts';

function demoText(name: string): string {
  return readFileSync(fileURLToPath(new URL(`../../../data/demo/${name}`, import.meta.url)), 'utf8');
}

/** The demo on its flat tariff alone, which is quicker to run. */
function demoModel(changes: Readonly<Record<string, string>> = {}): SheetModel {
  const model = new SheetModel('1.2.3');
  const names = ['weather.csv', 'units/quarkenfels-8.yaml', 'tariffs/flat.yaml'];
  const files = {
    'house.yaml': demoText('house.yaml').replace(/ {2}- tariffs\/(?!flat).*\n/g, ''),
    ...Object.fromEntries(names.map((name) => [name, demoText(name)])),
    ...changes,
  };
  model.box.replace(Object.entries(files).map(([name, text]) => fileOf(name, text)));
  return model;
}

const act = (box: FileBox, action: Action) => actIn(box, action, englishBlank);
const takeFiles = (box: FileBox, files: readonly SheetFile[]) => takeIn(box, files, englishBlank);
const nothing = { flow: 0, rooms: 0, heatLoss: 0, size: 0, electricity: 0, fuel: 0 };
const UNIT = 'units/quarkenfels-8.yaml';

/** The unit with its full-load heat in a file of its own. */
function withOwnTable(): Record<string, string> {
  const unit = demoText(UNIT);
  const [, block = ''] = /fullLoad:[\s\S]*?capacity: \|\n((?: {6}.*\n)+)/.exec(unit) ?? [];
  return {
    [UNIT]: unit.replace(`capacity: |\n${block}`, 'capacity: { file: heat.csv }\n'),
    'units/heat.csv': block.replaceAll(/^ +/gm, ''),
  };
}

describe('what if', () => {
  it('scales a heat loss of elements as one in watts a kelvin', () => {
    const elements = `{ given: elements, elements: [{ name: all walls, area: 100, uValue: 1.2 }, { name: windows, kind: window, area: 20, uValue: 1.3 }],
      thermalBridges: [{ name: joints, length: 50, psi: 0.1 }], ventilation: { volume: 300, airChanges: 0.5 } }`;
    // 100·1.2 + 20·1.3 + 50·0.1 + 0.33·0.5·300 W/K, MODEL section 2
    const sum = 120 + 26 + 5 + 49.5;
    const lossOf = (text: string) =>
      demoModel({
        'house.yaml': demoModel().box.text('house.yaml').replace('{ given: coefficient, value: 195 }', text),
      });
    const ofElements = runVariant(lossOf(elements), { ...nothing, heatLoss: 0.3 });
    const ofSum = runVariant(lossOf(`{ given: coefficient, value: ${1.3 * sum} }`), nothing);
    // sums in another order
    expect(ofElements?.electricity).toBeCloseTo(ofSum?.electricity ?? 0, 6);
    expect(ofElements?.idle).toEqual([]);
  });

  it('gives a unit of another size the capacity of each point times the factor, and the same COP', () => {
    const model = demoModel();
    const filed = runVariant(model, nothing);
    const larger = runVariant(model, { ...nothing, size: 0.25 });
    const text = model.box.text(UNIT);
    const scaled = text.replaceAll(/capacity: \|\n((?: {6}.*\n)+)/g, (block) =>
      block.replaceAll(/(?<=,\s*)\d+\.\d+/g, (value) => String(Number(value) * 1.25)),
    );
    model.box.setText(UNIT, scaled);
    expect(larger?.electricity).toBe(runVariant(model, nothing)?.electricity);
    expect(larger?.backupHours).toBeLessThan(filed?.backupHours ?? 0);
    expect(larger?.idle).toEqual([]);
  });

  it('sizes a unit whose table stands in a file of its own', () => {
    const same = runVariant(demoModel(), { ...nothing, size: -0.2 });
    expect(runVariant(demoModel(withOwnTable()), { ...nothing, size: -0.2 })).toEqual(same);
  });
});

describe('the entries', () => {
  it('that a form needs stand before the fold, lists too', () => {
    const model = demoModel();
    act(model.box, { do: 'form', file: 'house.yaml', path: ['house', 'heatLoss', 'given'], choice: 'elements' });
    const house = model.state().parts[0].nodes.find(({ path }) => path[0] === 'house');
    const heatLoss = house?.kind === 'section' ? house.children.find(({ path }) => path[1] === 'heatLoss') : undefined;
    const inside = heatLoss?.kind === 'section' ? heatLoss.children : [];
    const shown = inside.filter(({ folded }) => !folded).map(({ path }) => path[2]);
    expect(shown).toEqual(['given', 'elements', 'thermalBridges', 'ventilation']);
    const { nodes = [] } = model.state().tariffs[0] ?? {};
    expect(nodes.find(({ path }) => path[0] === 'credits')?.folded).toBe(true);
  });
});

describe('a map', () => {
  it('in a file of its own is a grid, whose cells are marked and written there', () => {
    const model = demoModel(withOwnTable());
    const gridOf = () =>
      model.state().grids.find(({ level, quantity }) => level === 'fullLoad' && quantity === 'capacity');
    const grid = gridOf();
    expect(grid?.own).toBe('units/heat.csv');
    const cells = (grid?.cells ?? []).map((row) => row.map(({ text }) => (text === '8.0' ? '80' : text)));
    act(model.box, { do: 'table', file: UNIT, path: ['map', 'fullLoad', 'capacity'], cells });
    expect(model.box.text('units/heat.csv')).toContain('80');
    expect(model.box.text(UNIT)).toContain('capacity: { file: heat.csv }');
    const marked = gridOf()?.cells.flatMap((row) => row.filter(({ told }) => told.length > 0).map(({ text }) => text));
    expect(marked).toContain('80');
  });

  it('is drawn with its contours before there is an answer, and not while it is empty', () => {
    const model = new SheetModel('1.2.3');
    model.box.replace(blankFiles('Europe/Berlin', englishBlank));
    expect(picturesOf(model)).toEqual({ carpets: [] });
    const cells = [
      ['', '35', '55'],
      ['-7', '6', '5'],
      ['7', '9', '8'],
    ];
    act(model.box, { do: 'table', file: 'unit.yaml', path: ['map', 'fullLoad', 'capacity'], cells });
    const cop = [
      ['', '35', '55'],
      ['-7', '2.9', '2.1'],
      ['7', '4.6', '3.1'],
    ];
    act(model.box, { do: 'table', file: 'unit.yaml', path: ['map', 'fullLoad', 'cop'], cells: cop });
    expect(model.answer.answer).toBeUndefined();
    expect(picturesOf(model).map).toContain('class="contour"');
  });
});

describe('the weather preview', () => {
  const odd = `when;roof °C;garden °C;rh\n${demoText('weather.csv')
    .split('\n')
    .slice(2, -1)
    .map((line) => line.split(','))
    .map(([stamp, t, rh]) => `${stamp};${t.replace('.', ',')};${t.replace('.', ',')};${rh}`)
    .join('\n')}\n`;

  it('shows each column with what it was taken for', () => {
    const columns = demoModel().state().weather?.columns ?? [];
    expect(columns.map(({ use }) => use)).toEqual([
      ...['stamp', 'temperature', 'relativeHumidity', 'globalRadiation', 'pressure'],
    ]);
    expect(columns[0].samples).toEqual(['2025-01-01T00:00', '2025-01-01T01:00', '2025-01-01T02:00']);
  });

  it('puts a column right where two could be meant', () => {
    const house = demoModel().box.text('house.yaml').replace('    solarAperture: 2.5\n', '');
    const model = demoModel({ 'house.yaml': house, 'weather.csv': odd });
    expect(model.state().answer).toBeUndefined();
    const columns = model.state().weather?.columns ?? [];
    expect(columns.map(({ name }) => name)).toEqual(['when', 'roof °C', 'garden °C', 'rh']);
    act(model.box, { do: 'column', column: columns[2], use: 'temperature' });
    expect(model.state().answer).toBeDefined();
    expect(model.state().weather?.columns.map(({ use }) => use)).toEqual([
      ...['stamp', undefined, 'temperature', 'relativeHumidity'],
    ]);
    expect(model.box.text('house.yaml')).toContain('garden °C');
  });

  it('leaves a column unused, and takes it back', () => {
    const model = demoModel();
    const humidity = () => model.state().weather?.columns[2];
    act(model.box, { do: 'column', column: humidity()! });
    expect(humidity()?.use).toBeUndefined();
    act(model.box, { do: 'column', column: humidity()!, use: 'relativeHumidity' });
    expect(humidity()?.use).toBe('relativeHumidity');
  });
});

describe('a dropped file', () => {
  const prices = 'time,price EUR/kWh\n2025-01-01T00:00Z,0.1\n2025-01-01T01:00Z,0.2\n';

  it('of prices takes the place of those that a tariff misses', () => {
    const model = demoModel();
    const tariff = 'name: market\nseries: { file: gone.csv, unit: perKWh }\n';
    takeFiles(model.box, [fileOf('market.yaml', tariff)]);
    takeFiles(model.box, [fileOf('spot.csv', prices)]);
    expect(model.box.text('market.yaml')).toContain('file: spot.csv');
    expect(model.state().tariffs.length).toBe(2);
  });

  it('of prices makes a tariff of its own where none misses any', () => {
    const model = demoModel();
    takeFiles(model.box, [fileOf('spot.csv', prices)]);
    const text = model.box.text('tariff-1.yaml');
    expect(text).toContain('file: spot.csv');
    expect(text).toContain('priceColumn: price EUR/kWh');
    expect(text).not.toContain('rates:');
  });

  it('that something names and misses goes there, whatever it looks like', () => {
    const own = withOwnTable();
    const model = demoModel({ [UNIT]: own[UNIT] });
    expect(model.state().answer).toBeUndefined();
    takeFiles(model.box, [fileOf('heat.csv', own['units/heat.csv'])]);
    expect(model.box.text('house.yaml')).toContain('file: weather.csv');
    expect(model.state().answer).toBeDefined();
  });

  it('of weather with another content is read anew', () => {
    const model = demoModel();
    const colder = demoText('weather.csv').replaceAll(/(?<=T\d\d:00,)[^,]+/g, (t) => (Number(t) - 2).toFixed(1));
    const before = model.answer.answer?.totals.annual.electricity ?? 0;
    act(model.box, {
      do: 'write',
      file: 'tariffs/flat.yaml',
      path: ['rates', 0, 'price'],
      text: '0.4',
      input: 'number',
    });
    expect(model.answer.answer?.totals.annual.electricity).toBe(before);
    takeFiles(model.box, [fileOf('weather.csv', colder)]);
    expect(model.answer.answer?.totals.annual.electricity).toBeGreaterThan(before * 1.05);
  });
});
