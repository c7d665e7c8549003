import type { EntryPath } from '../../src/scenario/entries/pathText.ts';
import { entryOf } from '../../src/scenario/entries/schemaField.ts';
import { keptAnswer } from './keptAnswer.ts';
import { folderOf, type SheetFile } from './memorySource.ts';
import { rawOf } from './sheetActions.ts';
import type { SheetModel } from './sheetModel.ts';
import { fileOf } from './startFiles.ts';
import { unitOfSize } from './unitOfSize.ts';
import { type Written, withEntry } from './yamlEdit.ts';

/** How a variant differs from the files: kelvins, and shares of today's. */
export interface Changes {
  readonly flow: number;
  readonly rooms: number;
  readonly heatLoss: number;
  readonly size: number;
  readonly electricity: number;
  readonly fuel: number;
}

/** What a variant comes to. */
export interface VariantResult {
  readonly electricity: number;
  readonly factor: number | 'no heat';
  readonly backupHours: number;
  readonly unmetHeat: number;
  /** On the first tariff; absent without one. */
  readonly cost?: number;
  readonly boilerCost?: number;
  readonly currency: string;
  /** What could not be changed, because nothing of the kind is entered. */
  readonly idle: readonly (keyof Changes)[];
}

/**
 * A year with other temperatures and heat loss, run anew; other prices scale what the kilowatt-hours cost with their taxes,
 * as the report's table of other prices does, and do not run the year anew.
 *
 * @returns nothing where the files give no answer, or the changed values are refused
 */
export function runVariant(model: SheetModel, changes: Changes): VariantResult | undefined {
  const { box } = model;
  const edits = scenarioEdits(rawOf(box, box.scenario), changes);
  const unit = changes.size === 0 ? undefined : sizedUnit(model, 1 + changes.size);
  if (unit !== undefined) edits.list.push({ path: ['heatPump', 'unit'], value: box.nameFromScenario(unit.name) });
  else if (changes.size !== 0) edits.idle.push('size');
  let text: string | undefined = box.text(box.scenario);
  for (const { path, value } of edits.list) text = text && withEntry(text, path, value);
  if (text === undefined) return undefined;
  const source = box.sourceOver([fileOf(box.scenario, text), ...(unit === undefined ? [] : [unit])]);
  const { answer } = keptAnswer(box.scenario, source, model.kept);
  if (answer === undefined) return undefined;
  const { totals, factors, costs } = answer;
  const [first] = costs;
  return {
    electricity: totals.annual.electricity,
    factor: factors.h4,
    backupHours: totals.hours.backup,
    unmetHeat: totals.annual.unmetHeat,
    ...(first === undefined ? {} : { cost: first.heatingCost + dearer(first.heating, changes) }),
    ...(first?.boiler === undefined || first.boilerCost === undefined
      ? {}
      : { boilerCost: first.boilerCost + dearer(first.boiler, changes) }),
    currency: first?.currency ?? answer.loaded.scenario.currency,
    idle: edits.idle,
  };
}

/** The unit in another size, as a file beside its own: its name says the size, so that each size is prepared once. */
function sizedUnit({ box }: SheetModel, factor: number): SheetFile | undefined {
  const name = entryOf(entryOf(rawOf(box, box.scenario), 'heatPump'), 'unit');
  const { source } = box;
  const unit = typeof name === 'string' ? source.find(name, box.scenario).file?.name : undefined;
  if (unit === undefined) return undefined;
  const textOf = (file: string) => {
    const found = source.find(file, unit).file;
    return found && box.text(found.name);
  };
  const text = unitOfSize(rawOf(box, unit), factor, textOf);
  const folder = folderOf(box.scenario);
  const sized = `unit of ${factor.toFixed(2)} times its size.yaml`;
  return text === undefined ? undefined : fileOf(folder === '' ? sized : `${folder}/${sized}`, text);
}

interface EnergyCosts {
  readonly electricityEnergy: number;
  readonly fuelEnergy: number;
}

function dearer(cost: EnergyCosts, { electricity, fuel }: Changes): number {
  return electricity * cost.electricityEnergy + fuel * cost.fuelEnergy;
}

interface Edit {
  readonly path: EntryPath;
  readonly value: Written;
}

function scenarioEdits(raw: unknown, { flow, rooms, heatLoss }: Changes): { list: Edit[]; idle: (keyof Changes)[] } {
  const at = (...path: EntryPath) => path.reduce<unknown>((value, step) => entryOf(value, step), raw);
  const shift = (path: EntryPath, by: number, otherwise?: number): Edit[] => {
    const value = at(...path) ?? otherwise;
    return typeof value === 'number' ? [{ path, value: value + by }] : [];
  };
  const list: Edit[] = [];
  const idle: (keyof Changes)[] = [];
  const tell = (kind: keyof Changes, edits: Edit[]) => {
    list.push(...edits);
    if (edits.length === 0) idle.push(kind);
  };
  if (flow !== 0) tell('flow', flowEdits(at('flowTemperature', 'points'), flow, shift));
  if (rooms !== 0) {
    const base = at('house', 'need', 'baseTemperature');
    const ofBase = base === undefined ? [] : shift(['house', 'need', 'baseTemperature'], rooms);
    tell('rooms', [...shift(['house', 'need', 'setPoint'], rooms, 20), ...ofBase]);
  }
  if (heatLoss !== 0) {
    const value = heatLossTimes(at('house', 'heatLoss'), 1 + heatLoss);
    tell('heatLoss', value === undefined ? [] : [{ path: ['house', 'heatLoss'], value }]);
  }
  return { list, idle };
}

/** A heat loss times a factor; of elements every area, length and volume grows, so that their shares stay. */
function heatLossTimes(heatLoss: unknown, factor: number): Written {
  if (typeof heatLoss !== 'object' || heatLoss === null) return undefined;
  const scaled = (entry: unknown, key: string): unknown => {
    const value = entryOf(entry, key);
    if (typeof entry !== 'object' || entry === null) return entry;
    return typeof value === 'number' ? { ...entry, [key]: value * factor } : entry;
  };
  const list = (key: string, of: string) => {
    const entries = entryOf(heatLoss, key);
    return Array.isArray(entries) ? { [key]: entries.map((entry) => scaled(entry, of)) } : {};
  };
  const air = entryOf(heatLoss, 'ventilation');
  const whole = { ...list('elements', 'area'), ...list('thermalBridges', 'length') };
  const changed = { ...heatLoss, ...whole, ...(air === undefined ? {} : { ventilation: scaled(air, 'volume') }) };
  return (Array.isArray(entryOf(heatLoss, 'elements')) ? changed : scaled(heatLoss, 'value')) as Written;
}

function flowEdits(points: unknown, by: number, shift: (path: EntryPath, by: number) => Edit[]): Edit[] {
  if (Array.isArray(points)) {
    const pairs = points.flatMap((point): [number, number][] => {
      const [outdoor, value] = [entryOf(point, 0), entryOf(point, 1)];
      return typeof outdoor === 'number' && typeof value === 'number' ? [[outdoor, value + by]] : [];
    });
    return [{ path: ['flowTemperature', 'points'], value: pairs }];
  }
  return [...shift(['flowTemperature', 'flow'], by), ...shift(['flowTemperature', 'return'], by)];
}
