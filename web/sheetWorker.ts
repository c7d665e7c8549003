/// <reference lib="webworker" />
import { version } from '../package.json';
import { demoFiles } from './model/demoFiles.ts';
import { type SheetCalls, sheetCalls } from './model/sheetCalls.ts';

/** One call and its number, by which its answer is known. */
export interface Asked<K extends keyof SheetCalls = keyof SheetCalls> {
  readonly id: number;
  readonly call: K;
  readonly given: Parameters<SheetCalls[K]>;
}

/** What a call gave, or how it failed. */
export type Told = { readonly id: number; readonly result: unknown } | { readonly id: number; readonly fault: string };

type Calls = { readonly [K in keyof SheetCalls]: (...given: Parameters<SheetCalls[K]>) => unknown };

const calls: Calls = sheetCalls(version, demoFiles);

function doIt<K extends keyof SheetCalls>({ call, given }: Asked<K>): unknown {
  return calls[call](...given);
}

self.addEventListener('message', ({ data }: MessageEvent<Asked>) => {
  let told: Told;
  try {
    told = { id: data.id, result: doIt(data) };
  } catch (fault) {
    told = { id: data.id, fault: fault instanceof Error ? fault.message : String(fault) };
  }
  self.postMessage(told);
});
