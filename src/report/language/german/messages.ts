import type { Messages } from '../messages.ts';
import { germanAssumptions } from './assumptions.ts';
import { germanBlank } from './blankFiles.ts';
import { germanExplained } from './explained.ts';
import { germanField } from './fields.ts';
import { germanKeys } from './keys.ts';
import { germanProblems } from './problems.ts';
import { germanRecognised } from './recognised.ts';
import { germanRange, germanUnit } from './units.ts';
import { germanWarnings } from './warnings.ts';

/** What the program says beside the words of a report, in German. */
export const germanMessages: Messages = {
  problems: germanProblems,
  warnings: germanWarnings,
  assumptions: germanAssumptions,
  recognised: germanRecognised,
  explained: germanExplained,
  blank: germanBlank,
  keys: germanKeys,
  field: germanField,
  unit: germanUnit,
  range: germanRange,
};
