import type { Criterion } from '../../../batch/ranking.ts';
import type { BatchManifest } from '../../batchManifest.ts';
import type { ReportWords } from '../../language/english/report.ts';
import type { LocalFigures } from '../../language/localFigures.ts';
import type { GatheredYears } from './gatheredYears.ts';

/** Everything that the report of a batch is made of. */
export interface BatchReportInput {
  readonly manifest: BatchManifest;
  readonly years: GatheredYears;
  /** What the years are ranked by, and what the drawings show. */
  readonly by: Criterion;
  /** Names of the two axes of the heat map, the one that runs down first; chosen by the program when left out. */
  readonly axes: readonly [string, string] | undefined;
  readonly words: ReportWords;
  readonly figures: LocalFigures;
  /** Date that is printed, as the user wrote it. */
  readonly date: string | undefined;
  /** Version of the program that writes the report. */
  readonly version: string;
}
