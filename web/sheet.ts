import { computed, signal } from '@preact/signals';
import type { ExplainDocument } from '../src/report/explainSchema.ts';
import type { Language } from '../src/report/language/languages.ts';
import { ask } from './askWorker.ts';
import { forgetDraft, keepDraft, keptDraft } from './draft.ts';
import type { SheetFile } from './model/memorySource.ts';
import type { Pictures } from './model/pictures.ts';
import type { Action } from './model/sheetActions.ts';
import type { Start } from './model/sheetCalls.ts';
import type { SaveKind } from './model/sheetSaves.ts';
import type { SheetState } from './model/sheetState.ts';
import { sheetWords } from './words.ts';

/** What the page shows, as it last came from the worker. */
export const state = signal<SheetState | undefined>(undefined);
export const pictures = signal<Pictures | undefined>(undefined);
export const explainedHour = signal<ExplainDocument | undefined>(undefined);
export const language = signal<Language>(navigator.language.startsWith('de') ? 'de' : 'en');
export const words = computed(() => sheetWords(language.value));
/** Whether the invented house stands there as it came. */
export const isDemo = signal(true);
/** Whether a draft is kept: yes, no, or there is no room for it. */
export const draft = signal<'none' | 'kept' | 'full'>('none');
/** The sheet that was left for another one. */
export const left = signal<Start | undefined>(undefined);
export const refused = signal<readonly string[]>([]);
/** Whether the browser did not hand over what was dropped. */
export const unreadable = signal(false);
export const fault = signal<string | undefined>(undefined);
/** Counts the changes of the files, so that what rests on them is made anew. */
export const revision = signal(0);

/** Counts the sheets that were opened, so that nothing typed into one shows in the next. */
export const opened = signal(0);

/** Pictures wait for a pause in typing. */
const PAUSE = 250;
let later: ReturnType<typeof setTimeout> | undefined;

function show(next: SheetState): void {
  state.value = next;
  revision.value++;
  explainedHour.value = undefined;
  clearTimeout(later);
  later = setTimeout(() => void afterwards().catch(tell), PAUSE);
}

function showNew(next: SheetState): void {
  opened.value++;
  show(next);
}

async function afterwards(): Promise<void> {
  pictures.value = await ask('pictures');
  if (!isDemo.value) draft.value = keepDraft(await ask('files')) ? 'kept' : 'full';
}

function tell(problem: unknown): void {
  fault.value = problem instanceof Error ? problem.message : String(problem);
}

/** Does something and says where the program itself failed. */
function guarded(work: Promise<void>): void {
  void work.catch(tell);
}

/** The first view: the draft where one is kept, else the invented house. */
export function begin(): void {
  guarded(
    (async () => {
      const kept = keptDraft();
      isDemo.value = kept === undefined;
      draft.value = kept === undefined ? 'none' : 'kept';
      document.documentElement.lang = language.value;
      await ask('language', language.value);
      show(kept === undefined ? await ask('demo') : await ask('open', kept));
    })(),
  );
}

export function showDemo(): void {
  beginWith(() => ask('demo'), true);
}

export function startBlank(): void {
  beginWith(() => ask('blank', Intl.DateTimeFormat().resolvedOptions().timeZone ?? 'UTC'), false);
}

/** Goes back to the sheet that was left last. */
export function goBack(): void {
  const back = left.value;
  if (back !== undefined) beginWith(() => ask('open', back), false);
}

/** Begins another sheet; the one that is left can be had back, unless it is the invented house as it came. */
function beginWith(start: () => Promise<SheetState>, demo: boolean): void {
  guarded(
    (async () => {
      await keepLeft();
      isDemo.value = demo;
      pictures.value = undefined;
      showNew(await start());
    })(),
  );
}

async function keepLeft(): Promise<void> {
  left.value = isDemo.value ? undefined : await ask('files');
}

/** Shows another of the scenarios that were opened together. */
export function chooseScenario(name: string): void {
  guarded(ask('choose', name).then(showNew));
}

export function act(action: Action): void {
  isDemo.value = false;
  guarded(ask('act', action).then(show));
}

export function takeFiles(files: readonly SheetFile[]): void {
  if (files.length === 0) return;
  guarded(
    (async () => {
      const scenario = state.value?.scenario;
      const wasDemo = isDemo.value;
      const before = await ask('files');
      isDemo.value = false;
      const taken = await ask('take', files);
      refused.value = taken.refused;
      if (!wasDemo && taken.isNew && scenario !== undefined) left.value = before;
      if (taken.isNew) showNew(taken.state);
      else show(taken.state);
    })(),
  );
}

/** Takes files that are still being read; a folder that cannot be read is said, with another way. */
export function takeDropped(reading: Promise<readonly SheetFile[]>): void {
  unreadable.value = false;
  reading.then(takeFiles, () => {
    unreadable.value = true;
  });
}

export function speak(next: Language): void {
  language.value = next;
  document.documentElement.lang = next;
  guarded(ask('language', next).then(show));
}

export function explain(hour: number): void {
  guarded(
    ask('explain', hour).then((found) => {
      explainedHour.value = found;
    }),
  );
}

export function wipeDraft(): void {
  forgetDraft();
  draft.value = 'none';
}

/** Hands a file to the browser to be saved. */
export function save(kind: SaveKind): void {
  guarded(
    ask('save', kind).then((file) => {
      if (file === undefined) return;
      const link = document.createElement('a');
      link.href = URL.createObjectURL(new Blob([new Uint8Array(file.bytes)], { type: 'application/octet-stream' }));
      link.download = file.name;
      link.click();
      setTimeout(() => URL.revokeObjectURL(link.href), 60_000);
    }),
  );
}
