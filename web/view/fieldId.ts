import { type EntryPath, pathText } from '../../src/scenario/entries/pathText.ts';

/** The id of a field in the page. */
export function fieldId(file: string, path: EntryPath): string {
  return `f-${`${file}-${pathText(path)}`.replace(/[^A-Za-z0-9]+/g, '-')}`;
}
