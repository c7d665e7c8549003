import type { OutletPoints } from '../../sim/season/outletTemperature.ts';
import type { SeasonResult } from '../../sim/season/seasonalSum.ts';
import type { Application, SeasonCase } from '../../sim/season/seasonCase.ts';
import type { SeasonName } from '../../weather/seasonBins.ts';
import type { DefaultAssumption } from '../answer/assumption.ts';
import type { LoadingWarning } from '../answer/warning.ts';
import type { InputRecord } from '../inputFiles.ts';
import type { DeclaredSeason } from '../labelSchema.ts';
import type { Comparison } from './compareSeason.ts';
import type { PointBesideMap } from './mapAtPoints.ts';

/** One climate and application of the label. */
export interface Rating {
  readonly climate: SeasonName;
  readonly application: Application;
}

/** A season, and what it is rated for. */
export interface CaseRating {
  readonly seasonCase: SeasonCase;
  readonly result: SeasonResult;
}

/** A season read from the map, and the hours in which the map had to be extended for it. */
export interface MapRating extends CaseRating {
  readonly outlets: OutletPoints;
  /** Degradation coefficient C_c below the lowest level. */
  readonly degradation: number;
  /** Hours of heat colder, warmer or hotter than the table, below its lowest flow, and above the unit's highest flow. */
  readonly hours: { readonly outsideMap: number; readonly belowLowestFlow: number; readonly aboveHighestFlow: number };
}

/** What the map and the declared points come to in one climate and application, beside the label. */
export interface SeasonRating extends Rating {
  readonly declared?: DeclaredSeason;
  /** Absent where the outlet temperatures are not known. */
  readonly map?: MapRating;
  /** Absent where the label has no points. */
  readonly points?: CaseRating;
  readonly pointsBesideMap: readonly PointBesideMap[];
  readonly comparison: Comparison;
}

/** What to look at before a label or a map is believed. */
export interface SeasonWarning {
  readonly code: string;
  readonly text: string;
  readonly remedy: string;
}

/** A rule that filled a gap of a label. */
export interface SeasonRule {
  readonly path: string;
  readonly text: string;
}

/** The label check of a unit. */
export interface SeasonAnswer {
  readonly unitName: string;
  readonly reversible: boolean;
  readonly seasons: readonly SeasonRating[];
  readonly warnings: readonly (SeasonWarning | LoadingWarning)[];
  readonly assumptions: readonly (SeasonRule | DefaultAssumption)[];
  readonly inputs: readonly InputRecord[];
}
