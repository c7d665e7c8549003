import { standardSeasons } from '../../weather/seasonBins.ts';
import type { DefaultAssumption } from '../answer/assumption.ts';
import { defaultAssumption } from '../answer/assumptions.ts';
import { shownNumber } from '../entries/allowedText.ts';
import type { LoadedLabel } from './loadLabel.ts';
import type { SeasonRating, SeasonRule } from './seasonAnswer.ts';
import { USUAL_DEGRADATION } from './undeclaredCase.ts';

/** Defaults of a unit file that a season never looks at: the years of a house do. */
const NOT_OF_SEASONS = ['cycling.', 'standbyPower', 'crankcase.'];

/** What the rating rests on: the defaults that were used, and the rules that filled a gap. */
export function seasonAssumptions(
  loaded: LoadedLabel,
  seasons: readonly SeasonRating[],
): (SeasonRule | DefaultAssumption)[] {
  const { label } = loaded.unit.unit;
  const used = loaded.defaults.filter(({ path }) => !NOT_OF_SEASONS.some((start) => path.startsWith(start)));
  const list: (SeasonRule | DefaultAssumption)[] = used.map(defaultAssumption);
  if (label === undefined) {
    list.push({ path: 'label.reversible', text: 'false, as no label is entered: the unit is taken to heat only.' });
  }
  if (label?.idlePowers === undefined && seasons.some(({ declared }) => declared === undefined)) {
    const { standbyPower, crankcase } = loaded.unit.unit;
    list.push({
      path: 'label.idlePowers',
      text: `${standbyPower} W in thermostat-off, standby and off mode and ${crankcase.power} W for the crankcase heater, as in the simulated year.`,
    });
  }
  return [...list, ...seasons.flatMap((season) => ofSeason(season, loaded))];
}

function ofSeason({ climate, application, declared, map }: SeasonRating, { unit }: LoadedLabel): SeasonRule[] {
  const path = `${climate} ${application} °C`;
  const list: SeasonRule[] = [];
  if (map === undefined) return list;
  const entered = unit.unit.label?.outlets.some((each) => each.climate === climate && each.application === application);
  if (!entered) {
    const points = map.outlets.map(([outdoor, outlet]) => `${shownNumber(outdoor)}/${outlet}`).join(', ');
    list.push({ path, text: `outlet temperatures of EN 14825 with variable outlet (outdoor/outlet, °C): ${points}.` });
  }
  if (declared === undefined) {
    const design = shownNumber(standardSeasons[climate].designTemperature);
    const limit = unit.unit.limits.lowestOutdoorTemperature;
    list.push(
      { path, text: `design load ${map.seasonCase.designLoad.toFixed(2)} kW, what the map gives at ${design} °C.` },
      {
        path,
        text:
          limit === undefined
            ? 'no operating limit: the unit runs however cold it is.'
            : `operating limit ${shownNumber(limit)} °C, from the limits of the unit.`,
      },
      { path, text: `degradation coefficient ${USUAL_DEGRADATION} below the lowest level.` },
    );
  }
  return list;
}
