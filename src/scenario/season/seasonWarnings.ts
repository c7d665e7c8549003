import type { Problem } from '../../core/problem.ts';
import type { LoadingWarning } from '../answer/warning.ts';
import { fromLoading } from '../answer/warnings.ts';
import { shownNumber } from '../entries/allowedText.ts';
import type { Deviation } from './compareSeason.ts';
import { LABEL_TOLERANCE, POINTS_TOLERANCE } from './compareSeason.ts';
import { lowestPermitted } from './lowestPermitted.ts';
import type { PointBesideMap } from './mapAtPoints.ts';
import type { SeasonRating, SeasonWarning } from './seasonAnswer.ts';

/** Share of the season's heating hours above which reading outside the map weighs on the result. */
const MUCH_OUTSIDE = 0.02;

/** What to look at before the label is believed, or the map; what was odd in the file first. */
export function seasonWarnings(
  seasons: readonly SeasonRating[],
  found: readonly Problem[],
): (SeasonWarning | LoadingWarning)[] {
  return [
    ...found.map(fromLoading),
    ...seasons.flatMap((season) => [
      ...disagreements(season),
      ...worstPoint(season),
      ...belowPermitted(season),
      ...extendedMap(season),
    ]),
  ];
}

/** A climate and application as sentences begin with it. */
function nameOf({ climate, application }: SeasonRating): string {
  return `${climate[0].toUpperCase()}${climate.slice(1)} climate, ${application} °C`;
}

function disagreements(season: SeasonRating): SeasonWarning[] {
  const { map, points } = season.comparison;
  const list: SeasonWarning[] = [];
  if (map !== undefined && !map.agrees) {
    list.push({
      code: 'season.map-off-label',
      text: `${nameOf(season)}: the map gives ${figures(map)}, more than the ${percent(LABEL_TOLERANCE, 0)} by which a unit may miss its declared efficiency.`,
      remedy: 'Compare map and label with the data sheet; the table of points shows where they part.',
    });
  }
  if (points !== undefined && !points.agrees) {
    list.push({
      code: 'season.points-off-label',
      text: `${nameOf(season)}: the declared points give ${figures(points)}; they should meet within ${percent(POINTS_TOLERANCE, 0)}.`,
      remedy:
        'Look for a slip of the pen in the points, designLoad, bivalentTemperature, degradation, the idle powers, reversible, and the label’s own figure.',
    });
  }
  return list;
}

function figures({ of, against, found, expected, share }: Deviation): string {
  const [what, unit, digits] = of === 'scop' ? ['a SCOP', '', 2] : ['an η_s', ' %', 0];
  const other = against === 'label' ? 'the label' : 'the declared points give';
  return `${what} of ${found.toFixed(Number(digits))}${unit}, ${other} ${expected.toFixed(Number(digits))}${unit} (${signed(share)})`;
}

/** Of points that do not fit: the one that lies farthest off the map, by COP or capacity. */
function worstPoint(season: SeasonRating): SeasonWarning[] {
  const { map, points } = season.comparison;
  if (map?.agrees !== false && points?.agrees !== false) return [];
  const worst = farthestOff(season.pointsBesideMap);
  if (worst === undefined) return [];
  const { point, of } = worst;
  const [what, declared, read] =
    of === 'cop'
      ? ['COP', point.declared.cop.toFixed(2), point.map.cop.toFixed(2)]
      : ['capacity', `${point.declared.capacity.toFixed(2)} kW`, `${point.map.capacity.toFixed(2)} kW`];
  const outlet = shownNumber(Number(point.outlet.toFixed(1)));
  return [
    {
      code: 'season.point-off-map',
      text: `${nameOf(season)}: of the declared points the ${what} at ${shownNumber(point.outdoor)} °C lies farthest off the map: ${declared} declared, ${read} from the map at ${outlet} °C outlet (${signed(worst.share)}).`,
      remedy: 'Compare this point, and the cells of the map around it, with the data sheet.',
    },
  ];
}

function farthestOff(points: readonly PointBesideMap[]) {
  const all = points.flatMap((point) => [
    { point, of: 'cop' as const, share: point.copDeviation },
    { point, of: 'capacity' as const, share: point.capacityDeviation },
  ]);
  return all.toSorted((a, b) => Math.abs(b.share) - Math.abs(a.share))[0];
}

/** By the label's own figure; where it gives none, by the points, else by the map. */
function belowPermitted(season: SeasonRating): SeasonWarning[] {
  const lowest = lowestPermitted(season);
  const { declared, points, map } = season;
  const efficiency = declared?.efficiency ?? points?.result.efficiency ?? map?.result.efficiency;
  if (lowest === undefined || efficiency === undefined || efficiency >= lowest) return [];
  return [
    {
      code: 'season.below-permitted',
      text: `${nameOf(season)}: an η_s of ${efficiency.toFixed(0)} % is below the ${lowest} % that Regulation (EU) 813/2013 has asked for since 26 September 2017.`,
      remedy: 'Compare it with the data sheet: such a unit could not be placed on the market.',
    },
  ];
}

function extendedMap(season: SeasonRating): SeasonWarning[] {
  if (season.map === undefined) return [];
  const { hours, result } = season.map;
  const all = result.bins.reduce((sum, bin) => sum + bin.hours, 0);
  const list: SeasonWarning[] = [];
  if (hours.belowLowestFlow > MUCH_OUTSIDE * all) {
    list.push({
      code: 'season.below-lowest-flow',
      text: `${nameOf(season)}: in ${hours.belowLowestFlow} of ${all} hours the outlet is cooler than the lowest flow of the map; its COP is raised by a rule of thumb there.`,
      remedy: `Ask the maker for a column of a lower flow temperature${season.points === undefined ? '' : '; until then trust the declared points more'}.`,
    });
  }
  if (hours.outsideMap > MUCH_OUTSIDE * all) {
    list.push({
      code: 'season.outside-map',
      text: `${nameOf(season)}: in ${hours.outsideMap} of ${all} hours the season is colder, warmer or hotter than the map reaches.`,
      remedy: 'Ask the maker for the missing rows or columns; the values there are extended by rule.',
    });
  }
  if (hours.aboveHighestFlow > 0) {
    list.push({
      code: 'season.above-highest-flow',
      text: `${nameOf(season)}: in ${hours.aboveHighestFlow} of ${all} hours the season asks for a hotter outlet than the unit can give; the map is read at its highest, which flatters it.`,
      remedy: 'Check limits.highestFlow, and whether the unit is rated for this application at all.',
    });
  }
  return list;
}

function percent(share: number, decimals: number): string {
  return `${(100 * share).toFixed(decimals)} %`;
}

function signed(share: number): string {
  return `${share < 0 ? '−' : '+'}${percent(Math.abs(share), 1)}`;
}
