import { figure } from './figures.ts';
import { type Column, table } from './layout.ts';
import type { SeasonEntry } from './seasonSchema.ts';
import type { SeasonWords } from './seasonWords.ts';

/** Each declared point beside the map: capacity and COP, and how far they lie apart. */
export function pointsTable(points: SeasonEntry['pointsBesideMap'], { columns }: SeasonWords): string {
  const column = columnOf(points);
  return table([
    column(columns.outdoor, ({ outdoor }) => shortest(outdoor)),
    column(columns.outlet, ({ outlet }) => figure(outlet, 1)),
    column(columns.load, ({ partLoad }) => figure(partLoad, 2)),
    column(columns.capacity, ({ capacity }) => figure(capacity, 2)),
    column(columns.mapCapacity, ({ mapCapacity }) => figure(mapCapacity, 2)),
    column(columns.off, ({ capacityDeviation }) => signedPercent(capacityDeviation)),
    column(columns.cop, ({ cop }) => figure(cop, 2)),
    column(columns.mapCop, ({ mapCop }) => figure(mapCop, 2)),
    column(columns.off, ({ copDeviation }) => signedPercent(copDeviation)),
  ]);
}

type MapBin = Exclude<SeasonEntry['map'], string>['bins'][number];
type PointsBin = Exclude<SeasonEntry['points'], string>['bins'][number];

/** A season bin by bin, by the map and by the declared points as far as they are there. */
export function binTable({ map, points }: SeasonEntry, words: SeasonWords): string {
  const { columns } = words;
  const mapBins = typeof map === 'string' ? [] : map.bins;
  const pointBins = typeof points === 'string' ? [] : points.bins;
  const bins: readonly PointsBin[] = mapBins.length > 0 ? mapBins : pointBins;
  const common = columnOf(bins);
  const ofMap = columnOf<MapBin>(mapBins);
  const ofPoints = columnOf<PointsBin>(pointBins);
  return table([
    common(columns.outdoor, ({ outdoor }) => figure(outdoor, 0)),
    common(columns.hours, ({ hours }) => figure(hours, 0)),
    ...(mapBins.length === 0 ? [] : [ofMap(columns.outlet, ({ outlet }) => figure(outlet, 1))]),
    common(columns.load, ({ partLoad }) => figure(partLoad, 2)),
    ...(mapBins.length === 0
      ? []
      : [
          ofMap(columns.binMapCop, ({ cop }) => copText(cop)),
          ofMap(columns.binMapHeater, ({ supplementary }) => figure(supplementary, 2)),
          ofMap(columns.binMapElectricity, ({ electricity }) => figure(electricity, 1)),
        ]),
    ...(pointBins.length === 0
      ? []
      : [
          ofPoints(columns.binPointsCop, ({ cop }) => copText(cop)),
          ofPoints(columns.binPointsHeater, ({ supplementary }) => figure(supplementary, 2)),
          ofPoints(columns.binPointsElectricity, ({ electricity }) => figure(electricity, 1)),
        ]),
  ]);
}

/** A share as per cent with its sign. @example signedPercent(-0.0824) // '−8.2\u00a0%' */
export function signedPercent(share: number): string {
  const text = figure(100 * share, 1);
  return `${share > 0 && /[1-9]/.test(text) ? '+' : ''}${text}\u00a0%`;
}

function columnOf<Row>(rows: readonly Row[]) {
  return (heading: string, of: (row: Row) => string): Column => ({ heading, figures: true, cells: rows.map(of) });
}

function copText(cop: number | 'no heat'): string {
  return cop === 'no heat' ? '–' : figure(cop, 2);
}

/** A temperature as it was written: whole where it is whole. */
function shortest(value: number): string {
  return figure(value, Number.isInteger(value) ? 0 : 1);
}
