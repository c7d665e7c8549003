import { whereSpent } from '../../src/report/html/whereSpent.ts';
import { yearCarpets } from '../../src/report/html/yearCarpets.ts';
import { inLanguage } from '../../src/report/language/inLanguage.ts';
import { mapPicture } from './mapPicture.ts';
import type { SheetModel } from './sheetModel.ts';

/** Drawings that are not made at every key: hours of the year, and the map with its contours. */
export interface Pictures {
  readonly carpets: readonly string[];
  /** The map of the unit; where there is an answer, with where the year is spent on it. */
  readonly map?: string;
}

/** The drawings of the answer; the map alone as long as there is none, nothing while its tables cannot be read. */
export function picturesOf(model: SheetModel): Pictures {
  const input = model.reportInput;
  if (input === undefined) {
    const unit = model.loadedUnit;
    return { carpets: [], ...(unit === undefined ? {} : { map: mapPicture(unit, inLanguage(model.language)) }) };
  }
  return { carpets: yearCarpets(input).map(({ text }) => text), map: whereSpent(input).text };
}
