import * as z from 'zod';
import type { BlankWords } from '../../src/report/language/english/blankFiles.ts';
import type { EntryPath } from '../../src/scenario/entries/pathText.ts';
import { bare, choicesOf, entryOf, fieldAt } from '../../src/scenario/entries/schemaField.ts';
import { scenarioSchema } from '../../src/scenario/scenarioSchema.ts';
import { tariffSchema } from '../../src/scenario/tariffSchema.ts';
import { unitSchema } from '../../src/scenario/unitSchema.ts';
import { parseYaml } from '../../src/scenario/yaml/parseYaml.ts';
import { type FileBox, kindOf } from './fileBox.ts';
import { tableText } from './mapTables.ts';
import { blankTariff } from './startFiles.ts';
import { type ColumnUse, MAY_BE_UNUSED, type WeatherColumn } from './weatherColumns.ts';
import { type InputKind, writtenValue } from './writtenValue.ts';
import type { Written } from './yamlEdit.ts';

/** What a user does to an entry. */
export type Action =
  | {
      readonly do: 'write';
      readonly file: string;
      readonly path: EntryPath;
      readonly text: string;
      readonly input: InputKind;
    }
  | { readonly do: 'form'; readonly file: string; readonly path: EntryPath; readonly choice: string }
  | { readonly do: 'add'; readonly file: string; readonly path: EntryPath }
  | { readonly do: 'remove'; readonly file: string; readonly path: EntryPath }
  | { readonly do: 'text'; readonly file: string; readonly text: string }
  | {
      readonly do: 'table';
      readonly file: string;
      readonly path: EntryPath;
      readonly cells: readonly (readonly string[])[];
    }
  | { readonly do: 'second'; readonly file: string; readonly path: EntryPath; readonly quantity: 'cop' | 'inputPower' }
  | {
      /** What a column of the weather file is used for; nothing leaves it unused. */
      readonly do: 'column';
      readonly column: WeatherColumn;
      readonly use?: ColumnUse;
    }
  | { readonly do: 'addTariff' }
  | { readonly do: 'removeTariff'; readonly name: string };

/** Does to the files what a user asked for; what is added has the words of a language. */
export function act(box: FileBox, action: Action, words: BlankWords): void {
  if (action.do === 'write') box.write(action.file, action.path, writtenValue(action.text, action.input));
  else if (action.do === 'form') chooseForm(box, action);
  else if (action.do === 'add') addEntry(box, action);
  else if (action.do === 'remove') box.write(action.file, action.path, undefined);
  else if (action.do === 'text') box.setText(action.file, action.text);
  else if (action.do === 'table') writeTable(box, action);
  else if (action.do === 'second') renameSecond(box, action);
  else if (action.do === 'column') useColumn(box, action);
  else if (action.do === 'addTariff') addTariff(box, words);
  else removeTariff(box, action.name);
}

/** The values of a structured file; nothing where it cannot be parsed. */
export function rawOf(box: FileBox, file: string): unknown {
  const parsed = parseYaml({ name: file, bytes: new TextEncoder().encode(box.text(file)), sha256: '' });
  return 'yaml' in parsed ? parsed.yaml.raw : undefined;
}

function schemaOf(box: FileBox, file: string): z.ZodType {
  if (file === box.scenario) return scenarioSchema;
  const bytes = new TextEncoder().encode(box.text(file));
  return kindOf({ name: file, bytes }) === 'tariff' ? tariffSchema : unitSchema;
}

/** Another form of a section: what means the same in both is kept. */
function chooseForm(box: FileBox, { file, path, choice }: Extract<Action, { do: 'form' }>): void {
  const raw = rawOf(box, file);
  const section = path.slice(0, -1);
  const key = String(path.at(-1));
  const union = fieldAt(schemaOf(box, file), section, raw)?.schema;
  if (!(union instanceof z.ZodDiscriminatedUnion)) return;
  const old = section.reduce<unknown>((value, step) => entryOf(value, step), raw);
  const shapeOf = (word: unknown) => {
    const form = union.options.find((option) => choicesOf(option, key).includes(String(word)));
    return form instanceof z.ZodObject ? (form.shape as Record<string, z.core.$ZodType>) : {};
  };
  const [before, after] = [shapeOf(entryOf(old, key)), shapeOf(choice)];
  const kept = Object.keys(after).flatMap((name): [string, Written][] => {
    const value = entryOf(old, name);
    const same = name !== key && Object.hasOwn(before, name) && sameMeaning(before[name], after[name]);
    return same && value !== undefined ? [[name, value as Written]] : [];
  });
  box.write(file, section, Object.fromEntries([[key, choice], ...kept]));
}

function sameMeaning(a: z.core.$ZodType, b: z.core.$ZodType): boolean {
  const [one, other] = [bare(a), bare(b)];
  return one.says === other.says && one.unit === other.unit;
}

/** A section, or one more in a list; a section with forms begins in the first of them. */
function addEntry(box: FileBox, { file, path }: Extract<Action, { do: 'add' }>): void {
  const raw = rawOf(box, file);
  const field = fieldAt(schemaOf(box, file), path, raw);
  const there = path.reduce<unknown>((value, step) => entryOf(value, step), raw);
  if (field?.schema instanceof z.ZodArray) {
    const at = Array.isArray(there) ? there.length : 0;
    box.write(file, [...path, at], firstForm(bare(field.schema.def.element).schema));
    return;
  }
  box.write(file, path, field === undefined ? {} : firstForm(field.schema));
}

function firstForm(schema: z.core.$ZodType): Written {
  if (!(schema instanceof z.ZodDiscriminatedUnion)) return {};
  const key = schema.def.discriminator;
  return { [key]: choicesOf(schema.options[0], key)[0] ?? '' };
}

/** The other table of the level takes over axes as long as nothing stands in it. */
function writeTable(box: FileBox, { file, path, cells }: Extract<Action, { do: 'table' }>): void {
  const level = path.slice(0, -1).reduce<unknown>((value, step) => entryOf(value, step), rawOf(box, file));
  const own = entryOf(entryOf(level, String(path.at(-1))), 'file');
  const table = typeof own === 'string' ? box.source.find(own, file).file : undefined;
  if (table !== undefined) {
    box.setText(table.name, tableText(cells));
    return;
  }
  box.write(file, path, tableText(cells));
  for (const other of ['capacity', 'cop', 'inputPower']) {
    const text = other === path.at(-1) ? undefined : entryOf(level, other);
    if (typeof text !== 'string' || !isEmptyTable(text)) continue;
    const axes = cells.map((row, r) => row.map((cell, c) => (r === 0 || c === 0 ? cell : '')));
    box.write(file, [...path.slice(0, -1), other], tableText(axes));
  }
}

/** A table with axes and nothing else. */
function isEmptyTable(text: string): boolean {
  const [, ...rows] = text.split('\n').filter((line) => line.trim() !== '');
  return rows.every((row) =>
    row
      .split(',')
      .slice(1)
      .every((cell) => cell.trim() === ''),
  );
}

/** The same figures under another name: what was taken for COP is input power, or the other way round. */
function renameSecond(box: FileBox, { file, path, quantity }: Extract<Action, { do: 'second' }>): void {
  const table = path.reduce<unknown>((value, step) => entryOf(value, step), rawOf(box, file));
  box.write(file, path, undefined);
  box.write(file, [...path.slice(0, -1), quantity], (table ?? '') as Written);
}

/** Names a column for a use; what it was used for before looks for another one, or stays unused. */
function useColumn(box: FileBox, { column, use }: Extract<Action, { do: 'column' }>): void {
  const columns = ['weather', 'read', 'columns'];
  const entries = columns.reduce<unknown>((value, key) => entryOf(value, key), rawOf(box, box.scenario));
  if (column.use !== undefined && column.use !== use) {
    const isNamed = entryOf(entries, column.use) !== undefined;
    if (use === undefined && MAY_BE_UNUSED.has(column.use)) box.write(box.scenario, [...columns, column.use], false);
    else if (isNamed) box.write(box.scenario, [...columns, column.use], undefined);
  }
  if (use !== undefined) box.write(box.scenario, [...columns, use], column.key);
}

/** A new tariff behind the others; returns its file. */
export function addTariff(box: FileBox, words: BlankWords): string {
  let number = 1;
  while (box.has(`tariff-${number}.yaml`)) number++;
  const name = `tariff-${number}.yaml`;
  box.setText(name, blankTariff(number, words));
  appendTariff(box, name);
  return name;
}

/** The tariffs of the scenario as they stand there. */
export function tariffList(box: FileBox): readonly unknown[] {
  const list = entryOf(rawOf(box, box.scenario), 'tariffs');
  return Array.isArray(list) ? list : [];
}

/** Names a file as a further tariff. */
export function appendTariff(box: FileBox, file: string): void {
  box.write(box.scenario, ['tariffs', tariffList(box).length], box.nameFromScenario(file));
}

function removeTariff(box: FileBox, file: string): void {
  const at = tariffList(box).findIndex((name) => typeof name === 'string' && box.pathOf(name) === file);
  if (at >= 0) box.write(box.scenario, ['tariffs', at], undefined);
}
