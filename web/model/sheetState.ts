import type { FormNode, SectionNode, Told } from './formNode.ts';
import type { MapGrid } from './mapTables.ts';
import type { PartId } from './visit.ts';
import type { ColumnUse, WeatherColumn } from './weatherColumns.ts';

/** One part of the visit with its fields. */
export interface PartState {
  readonly id: PartId;
  readonly nodes: readonly FormNode[];
}

/** A structured file that a part shows beside its own entries: the unit, or a tariff. */
export interface BesideState {
  readonly name: string;
  readonly nodes: readonly FormNode[];
  readonly text: string;
}

/** How the weather file was understood. */
export interface WeatherPreview {
  readonly file: string;
  readonly lines: readonly string[];
  /** The first lines of the file as they stand. */
  readonly head: readonly string[];
  readonly columns: readonly WeatherColumn[];
}

/** The weather file and how to read it. */
export interface WeatherState extends WeatherPreview {
  /** The entries of `weather.read`, whether or not any is written. */
  readonly read: SectionNode;
  /** What a column may be used for, in words. */
  readonly uses: readonly { readonly value: ColumnUse; readonly label: string }[];
}

/** What an answer says in short, ready to be shown. */
export interface ShownAnswer {
  readonly sentences: readonly string[];
  readonly tiles: readonly { readonly name: string; readonly value: string; readonly unit: string }[];
  readonly bars: readonly {
    readonly name: string;
    readonly value: string;
    readonly strip: string;
    readonly boiler: boolean;
  }[];
  readonly cautions: readonly { readonly text: string; readonly remedy: string }[];
  readonly assumptions: readonly { readonly path: string; readonly text: string }[];
  /** Days of the year: 365, or 366. */
  readonly days: number;
  /** Electricity by month, drawn. */
  readonly months: string;
}

/** Everything that the page shows beside its own words. */
export interface SheetState {
  readonly scenario: string;
  /** All scenarios that were opened together. */
  readonly scenarios: readonly string[];
  readonly text: string;
  readonly files: readonly { readonly name: string; readonly size: number; readonly changed: boolean }[];
  readonly parts: readonly PartState[];
  readonly unit?: BesideState;
  readonly tariffs: readonly BesideState[];
  readonly grids: readonly MapGrid[];
  readonly weather?: WeatherState;
  readonly problems: readonly Told[];
  readonly answer?: ShownAnswer;
}
