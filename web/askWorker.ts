import type { SheetCalls } from './model/sheetCalls.ts';
import type { Asked, Told } from './sheetWorker.ts';
import SheetWorker from './sheetWorker.ts?worker&inline';

interface Waiting {
  readonly resolve: (result: unknown) => void;
  readonly reject: (fault: Error) => void;
}

const worker = new SheetWorker();
const waiting = new Map<number, Waiting>();
let last = 0;

worker.addEventListener('message', ({ data }: MessageEvent<Told>) => {
  const asker = waiting.get(data.id);
  waiting.delete(data.id);
  if ('fault' in data) asker?.reject(new Error(data.fault));
  else asker?.resolve(data.result);
});

/** Has the worker do something. */
export function ask<K extends keyof SheetCalls>(
  call: K,
  ...given: Parameters<SheetCalls[K]>
): Promise<ReturnType<SheetCalls[K]>> {
  last++;
  const asked: Asked<K> = { id: last, call, given };
  worker.postMessage(asked);
  return new Promise((resolve, reject) => {
    waiting.set(asked.id, { resolve: (result) => resolve(result as ReturnType<SheetCalls[K]>), reject });
  });
}
