import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { documentText } from '../../../src/report/documentText.ts';
import { makeReport } from '../../../src/report/html/makeReport.ts';
import { reportPage } from '../../../src/report/html/reportPage.ts';
import { englishBlank } from '../../../src/report/language/english/blankFiles.ts';
import { resultDocument } from '../../../src/report/resultDocument.ts';
import { makeAnswer } from '../../../src/scenario/answer/makeAnswer.ts';
import { loadScenario } from '../../../src/scenario/loadScenario.ts';
import type { FileBox } from '../../../web/model/fileBox.ts';
import type { FormNode } from '../../../web/model/formNode.ts';
import type { SheetFile } from '../../../web/model/memorySource.ts';
import { type Action, act as actIn } from '../../../web/model/sheetActions.ts';
import { SheetModel } from '../../../web/model/sheetModel.ts';
import { saved } from '../../../web/model/sheetSaves.ts';
import { blankFiles, fileOf } from '../../../web/model/startFiles.ts';
import { takeFiles as takeIn } from '../../../web/model/takeFiles.ts';
import { runVariant } from '../../../web/model/whatIfRun.ts';

const NAMES = [
  'house.yaml',
  'weather.csv',
  'units/quarkenfels-8.yaml',
  'tariffs/flat.yaml',
  'tariffs/night.yaml',
  'tariffs/three-band.yaml',
  'tariffs/half-hourly.yaml',
  'tariffs/prices.csv',
];
const demo: SheetFile[] = NAMES.map((name) => ({
  name,
  bytes: new Uint8Array(readFileSync(fileURLToPath(new URL(`../../../data/demo/${name}`, import.meta.url)))),
}));

function demoModel(): SheetModel {
  const model = new SheetModel('1.2.3');
  model.box.replace(demo);
  return model;
}

/** The result of the same files by the way of the command line: everything made anew. */
function anew(model: SheetModel): string {
  const { loaded, problems } = loadScenario(model.box.scenario, model.box.source);
  const answer = loaded && makeAnswer(loaded, problems).answer;
  return answer === undefined ? 'no answer' : documentText(resultDocument(answer, model.version));
}

function resultOf(model: SheetModel): string {
  return new TextDecoder().decode(saved(model, 'result')?.bytes);
}

const act = (box: FileBox, action: Action) => actIn(box, action, englishBlank);
const takeFiles = (box: FileBox, files: readonly SheetFile[]) => takeIn(box, files, englishBlank);

const house = (...path: (string | number)[]) => ({ file: 'house.yaml', path });

describe('the model of the sheet', () => {
  it('gives the result of the command line to the last digit, after every kind of change too', () => {
    const model = demoModel();
    expect(model.box.scenario).toBe('house.yaml');
    expect(resultOf(model)).toBe(anew(model));
    act(model.box, { do: 'write', ...house('house', 'heatLoss', 'value'), text: '210,5', input: 'number' });
    expect(resultOf(model)).toBe(anew(model));
    act(model.box, { do: 'write', ...house('site', 'altitude'), text: '900', input: 'number' });
    expect(resultOf(model)).toBe(anew(model));
    const night = { file: 'tariffs/night.yaml', path: ['rates', 0, 'price'] };
    const before = resultOf(model);
    act(model.box, { do: 'write', ...night, text: '0.1', input: 'number' });
    expect(resultOf(model)).toBe(anew(model));
    expect(resultOf(model)).not.toBe(before);
  });

  it('saves the report that the command line writes', () => {
    const model = demoModel();
    model.language = 'de';
    const settings = { language: 'de', date: undefined, version: '1.2.3' } as const;
    const { input } = makeReport('house.yaml', model.box.source, settings);
    expect(new TextDecoder().decode(saved(model, 'report')?.bytes)).toBe(input && reportPage(input));
  });

  it('tells of an entry at its field, and has no answer then', () => {
    const model = demoModel();
    act(model.box, { do: 'write', ...house('house', 'heatLoss', 'value'), text: '-5', input: 'number' });
    const state = model.state();
    expect(state.answer).toBeUndefined();
    const node = fieldOf(
      state.parts.flatMap(({ nodes }) => nodes),
      'house.heatLoss.value',
    );
    expect(node?.problems.map(({ says }) => says)).toEqual([
      'house.heatLoss.value is -5; a heat loss lies between 1 and 100000 W/K',
    ]);
    expect(saved(model, 'result')).toBeUndefined();
  });

  it.each([
    ['site.zone', 'Nowhere/Land'],
    ['house.heatLoss.value', 'much'],
    ['house.design.outdoorTemperature', '40'],
    ['house.need.setPoint', '200'],
    ['flowTemperature.flow', '5'],
    ['flowTemperature.return', '99'],
    ['heatPump.unit', 'gone.yaml'],
    ['backup.power', '-1'],
    ['boiler.efficiency', '12'],
    ['boiler.fuel.price', '-0,1'],
    ['household.kWhPerYear', '-7'],
    ['weather.file', 'gone.csv'],
  ])('tells at %s that %s cannot be', (path, text) => {
    const model = demoModel();
    const node = fieldOf(
      model.state().parts.flatMap(({ nodes }) => nodes),
      path,
    );
    if (node?.kind !== 'field') throw new Error(`there is no field ${path}`);
    expect(node.problems).toEqual([]);
    act(model.box, { do: 'write', ...house(...node.path), text, input: node.input });
    const broken = fieldOf(
      model.state().parts.flatMap(({ nodes }) => nodes),
      path,
    );
    expect(broken?.problems.filter(({ severity }) => severity === 'error').length).toBeGreaterThan(0);
  });

  it('keeps what means the same in another form of a section', () => {
    const model = demoModel();
    act(model.box, { do: 'form', ...house('house', 'need', 'model'), choice: 'lumped' });
    const text = model.box.text('house.yaml');
    expect(text).toContain('model: lumped');
    expect(text).toContain('internalGains: 420');
    expect(resultOf(model)).toBe(anew(model));
    act(model.box, { do: 'form', ...house('house', 'heatLoss', 'given'), choice: 'load' });
    expect(model.box.text('house.yaml')).not.toContain('value: 195');
  });

  it('runs a variant as if the files said so', () => {
    const model = demoModel();
    const nothing = { flow: 0, rooms: 0, heatLoss: 0, size: 0, electricity: 0, fuel: 0 };
    const variant = runVariant(model, { ...nothing, heatLoss: 0.1, rooms: 1 });
    act(model.box, { do: 'write', ...house('house', 'heatLoss', 'value'), text: String(195 * 1.1), input: 'number' });
    act(model.box, { do: 'write', ...house('house', 'need', 'setPoint'), text: '21', input: 'number' });
    const filed = JSON.parse(resultOf(model));
    expect(variant?.electricity).toBe(filed.annual.electricity.total);
    expect(variant?.cost).toBe(filed.costs[0].systemTotal);
    const dearer = runVariant(model, { ...nothing, electricity: 0.2 });
    const { electricityEnergy } = model.answer.answer!.costs[0].heating;
    // one multiplication and one sum apart
    expect(dearer?.cost).toBeCloseTo(filed.costs[0].systemTotal + 0.2 * electricityEnergy, 9);
  });

  it('puts dropped files in the places that their content asks for', () => {
    const model = new SheetModel('1.2.3');
    model.box.replace(blankFiles('Europe/Berlin', englishBlank));
    const byName = new Map(demo.map((file) => [file.name, file]));
    const dropped = ['weather.csv', 'units/quarkenfels-8.yaml', 'tariffs/flat.yaml'].map((name) => byName.get(name)!);
    expect(takeFiles(model.box, dropped)).toEqual({ refused: [], isNew: false });
    const text = model.box.text('house.yaml');
    expect(text).toContain('file: weather.csv');
    expect(text).toContain('unit: quarkenfels-8.yaml');
    expect(text).toContain('flat.yaml');
    const state = model.state();
    expect(state.unit?.name).toBe('quarkenfels-8.yaml');
    expect(state.tariffs.map(({ name }) => name)).toEqual(['flat.yaml']);
    expect(state.weather?.lines.length).toBeGreaterThan(3);
  });

  it('finds the scenario of an opened folder, and files that were dropped without their folders', () => {
    const model = new SheetModel('1.2.3');
    takeFiles(
      model.box,
      demo.map((file) => ({ ...file, name: `my/demo/${file.name}` })),
    );
    expect(model.box.scenario).toBe('house.yaml');
    const loose = new SheetModel('1.2.3');
    takeFiles(
      loose.box,
      demo.map((file) => ({ ...file, name: file.name.slice(file.name.lastIndexOf('/') + 1) })),
    );
    expect(loose.answer.answer).toBeDefined();
    expect(resultOf(loose)).toBe(resultOf(model));
  });

  it('marks the cell of a map that is odd, and takes a pasted table with decimal commas', () => {
    const model = demoModel();
    const unit = 'units/quarkenfels-8.yaml';
    model.box.setText(unit, model.box.text(unit).replace('2,  3.88,', '2,  9.88,'));
    const grid = model.state().grids.find(({ level, quantity }) => level === 'fullLoad' && quantity === 'cop');
    const marked = grid?.cells.flatMap((row) => row.filter(({ told }) => told.length > 0).map(({ text }) => text));
    expect(marked).toContain('9.88');
    const cells = grid!.cells.map((row) => row.map(({ text }) => (text === '9.88' ? '3,88' : text)));
    act(model.box, { do: 'table', file: unit, path: grid!.path, cells });
    const mended = model.state().grids.find(({ level, quantity }) => level === 'fullLoad' && quantity === 'cop');
    expect(mended?.cells.flat().every(({ told }) => told.length === 0)).toBe(true);
    expect(mended?.cells[5][1].text).toBe('3.88');
  });

  it('keeps comments and the order of keys whatever is changed', () => {
    const model = demoModel();
    const comments = (text: string) => text.split('\n').filter((line) => line.trimStart().startsWith('#'));
    const before = comments(model.box.text('house.yaml'));
    act(model.box, { do: 'addTariff' });
    act(model.box, { do: 'add', ...house('readings') });
    act(model.box, { do: 'remove', ...house('readings') });
    act(model.box, { do: 'write', ...house('house', 'need', 'heatingLimit'), text: '16', input: 'number' });
    const text = model.box.text('house.yaml');
    expect(comments(text)).toEqual(before);
    expect(text).toContain('heatingLimit: 16');
    expect(text).toContain('- tariff-1.yaml');
  });

  it('shows a file that cannot be parsed as its text alone', () => {
    const model = new SheetModel('1.2.3');
    model.box.replace([fileOf('house.yaml', 'name: [1\n')], 'house.yaml');
    const state = model.state();
    expect(state.parts.every(({ nodes }) => nodes.length === 0)).toBe(true);
    expect(state.problems.length).toBeGreaterThan(0);
    expect(state.text).toBe('name: [1\n');
  });
});

/** The entry at a path of a form. */
function fieldOf(nodes: readonly FormNode[], path: string): FormNode | undefined {
  for (const node of nodes) {
    if (node.path.join('.') === path) return node;
    const inner = node.kind === 'section' ? fieldOf(node.children, path) : undefined;
    if (inner !== undefined) return inner;
  }
  return undefined;
}
