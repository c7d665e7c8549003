import type { EntryPath } from '../../src/scenario/entries/pathText.ts';
import { entryOf } from '../../src/scenario/entries/schemaField.ts';
import { keptAnswer } from './keptAnswer.ts';
import { rawOf } from './sheetActions.ts';
import type { SheetModel } from './sheetModel.ts';
import { withEntry } from './yamlEdit.ts';

/** How a variant differs from the files: kelvins, and shares of today's. */
export interface Changes {
  readonly flow: number;
  readonly rooms: number;
  readonly heatLoss: number;
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
  let text: string | undefined = box.text(box.scenario);
  for (const { path, value } of edits.list) text = text && withEntry(text, path, value);
  if (text === undefined) return undefined;
  const { answer } = keptAnswer(box.scenario, box.sourceWith(text), model.kept);
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

interface EnergyCosts {
  readonly electricityEnergy: number;
  readonly fuelEnergy: number;
}

function dearer(cost: EnergyCosts, { electricity, fuel }: Changes): number {
  return electricity * cost.electricityEnergy + fuel * cost.fuelEnergy;
}

interface Edit {
  readonly path: EntryPath;
  readonly value: number | readonly (readonly number[])[];
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
    const value = at('house', 'heatLoss', 'value');
    const path = ['house', 'heatLoss', 'value'];
    tell('heatLoss', typeof value === 'number' ? [{ path, value: value * (1 + heatLoss) }] : []);
  }
  return { list, idle };
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
