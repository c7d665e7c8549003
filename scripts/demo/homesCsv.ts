import { seededDraws } from './seededDraws.ts';

/** The seed of the homes that are committed. */
export const HOMES_SEED = 'Nebelquellingen homes';

const STREETS = ['Brunnenweg', 'Am Quellgrund', 'Nebelgasse', 'Wiesensteig', 'Hinter der Mühle', 'Lerchenhang'];
/** Kinds of homes: heat loss in W/K, floor area in m², flow of the radiators at the design load in °C. */
const KINDS = [
  { name: 'terrace', heatLoss: 130, floorArea: 105, flow: 48 },
  { name: 'semi-detached', heatLoss: 185, floorArea: 135, flow: 52 },
  { name: 'detached', heatLoss: 250, floorArea: 165, flow: 55 },
];
/** Spread of heat loss and floor area among homes of a kind. */
const UNLIKENESS = 0.18;
/** Tapping profile by the number of people. */
const PROFILES = ['S', 'M', 'L', 'L'];

/**
 * The text of `data/demo/homes.csv`: invented homes, a row each; a column is a place in the scenario.
 *
 * @param homes how many, at least 1
 * @param seed any text
 * @returns lines ended by a line feed
 */
export function homesCsv(homes: number, seed: string): string {
  const draws = seededDraws(seed);
  const spread = () => Math.max(0.6, 1 + UNLIKENESS * draws.normal());
  const lines = [
    '# invented homes of the invented town Nebelquellingen – made by scripts/demo/homesCsv.ts',
    [
      ...['home', 'house.heatLoss.value', 'house.floorArea', 'house.need.setPoint', 'house.need.internalGains'],
      ...['flowTemperature.flow', 'flowTemperature.return', 'boiler.efficiency'],
      ...['hotWater.volume', 'hotWater.draw.profile'],
    ].join(','),
  ];
  for (let home = 0; home < homes; home++) {
    const street = STREETS[home % STREETS.length];
    const kind = KINDS[Math.floor(KINDS.length * draws.uniform())];
    const area = Math.round(kind.floorArea * spread());
    const flow = Math.round(kind.flow + 3 * draws.normal());
    const people = 1 + Math.floor(4 * draws.uniform());
    lines.push(
      [
        `${street} ${1 + Math.floor(home / STREETS.length)} (${kind.name})`,
        ...[Math.round(kind.heatLoss * spread()), area, (19.5 + 0.5 * Math.floor(5 * draws.uniform())).toFixed(1)],
        ...[Math.round(2.2 * area + 40 * people), flow, flow - 8, (0.82 + 0.1 * draws.uniform()).toFixed(2)],
        // an empty cell leaves what the base scenario says
        ...[people === 2 ? '' : 125 + 25 * people, PROFILES[people - 1]],
      ].join(','),
    );
  }
  return `${lines.join('\n')}\n`;
}
