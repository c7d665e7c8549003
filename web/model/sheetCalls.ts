import type { ExplainDocument } from '../../src/report/explainSchema.ts';
import type { Language } from '../../src/report/language/languages.ts';
import { explained } from './explained.ts';
import type { SheetFile } from './memorySource.ts';
import { type Pictures, picturesOf } from './pictures.ts';
import { type Action, act } from './sheetActions.ts';
import { SheetModel } from './sheetModel.ts';
import { type SaveKind, saved } from './sheetSaves.ts';
import type { SheetState } from './sheetState.ts';
import { BLANK_SCENARIO, blankFiles } from './startFiles.ts';
import { takeFiles } from './takeFiles.ts';
import { type Changes, runVariant, type VariantResult } from './whatIfRun.ts';

/** A house to begin with. */
export interface Start {
  readonly files: readonly SheetFile[];
  readonly scenario?: string;
}

/** What the page asks of the worker. */
export interface SheetCalls {
  demo(): SheetState;
  blank(zone: string): SheetState;
  open(start: Start): SheetState;
  /** `isNew` where a scenario among the files took the place of the one before. */
  take(files: readonly SheetFile[]): { state: SheetState; refused: readonly string[]; isNew: boolean };
  /** Another of the scenarios that were opened together. */
  choose(scenario: string): SheetState;
  act(action: Action): SheetState;
  language(language: Language): SheetState;
  pictures(): Pictures;
  explain(hour: number): ExplainDocument | undefined;
  variant(changes: Changes): VariantResult | undefined;
  save(kind: SaveKind): SheetFile | undefined;
  /** All files, for the draft. */
  files(): Start;
}

/** The calls on a model of their own. */
export function sheetCalls(version: string, demo: readonly SheetFile[]): SheetCalls {
  const model = new SheetModel(version);
  const { box } = model;
  return {
    demo: () => {
      box.replace(demo, 'house.yaml');
      return model.state();
    },
    blank: (zone) => {
      box.replace(blankFiles(zone, model.messages.blank), BLANK_SCENARIO);
      return model.state();
    },
    open: ({ files, scenario }) => {
      box.replace(files, scenario);
      return model.state();
    },
    take: (files) => {
      const { refused, isNew } = takeFiles(box, files, model.messages.blank);
      return { state: model.state(), refused, isNew };
    },
    choose: (scenario) => {
      if (box.scenarios.includes(scenario)) box.scenario = scenario;
      return model.state();
    },
    act: (action) => {
      act(box, action, model.messages.blank);
      return model.state();
    },
    language: (language) => {
      model.language = language;
      return model.state();
    },
    pictures: () => picturesOf(model),
    explain: (hour) => explained(model, hour),
    variant: (changes) => runVariant(model, changes),
    save: (kind) => saved(model, kind),
    files: () => ({ files: box.all, scenario: box.scenario }),
  };
}
