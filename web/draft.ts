import type { Start } from './model/sheetCalls.ts';

/** The one place in this browser where the page keeps something. */
const PLACE = 'winterledger.sheet.draft';

interface Draft {
  readonly scenario: string;
  readonly files: readonly { readonly name: string; readonly bytes: string }[];
}

/** Keeps the files in this browser; false where there is no room, or the browser keeps nothing. */
export function keepDraft({ files, scenario = '' }: Start): boolean {
  const draft: Draft = { scenario, files: files.map(({ name, bytes }) => ({ name, bytes: lettersOf(bytes) })) };
  try {
    localStorage.setItem(PLACE, JSON.stringify(draft));
    return true;
  } catch {
    forgetDraft();
    return false;
  }
}

/** The files that were kept; nothing where there are none. */
export function keptDraft(): Start | undefined {
  try {
    const text = localStorage.getItem(PLACE);
    if (text === null) return undefined;
    const draft = JSON.parse(text) as Draft;
    const files = draft.files.map(({ name, bytes }) => ({
      name,
      bytes: Uint8Array.from(bytes, (c) => c.charCodeAt(0)),
    }));
    return { scenario: draft.scenario, files };
  } catch {
    return undefined;
  }
}

/** Removes what is kept. */
export function forgetDraft(): void {
  try {
    localStorage.removeItem(PLACE);
  } catch {
    // a browser that keeps nothing has nothing to forget
  }
}

const AT_ONCE = 8192;

/** Bytes as letters of one byte each. */
function lettersOf(bytes: Uint8Array): string {
  let text = '';
  for (let from = 0; from < bytes.length; from += AT_ONCE) {
    text += String.fromCharCode(...bytes.subarray(from, from + AT_ONCE));
  }
  return text;
}
