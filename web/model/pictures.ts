import { whereSpent } from '../../src/report/html/whereSpent.ts';
import { yearCarpets } from '../../src/report/html/yearCarpets.ts';
import type { SheetModel } from './sheetModel.ts';

/** Drawings that are not made at every key: hours of the year, and the map with its contours. */
export interface Pictures {
  readonly carpets: readonly string[];
  readonly map: string;
}

/** The drawings of the answer; nothing as long as there is none. */
export function picturesOf(model: SheetModel): Pictures | undefined {
  const input = model.reportInput;
  if (input === undefined) return undefined;
  return { carpets: yearCarpets(input).map(({ text }) => text), map: whereSpent(input).text };
}
