import type { Finding, StageName } from '../sim/explain/stage.ts';
import { formulaWords } from './explainFormulas.ts';
import { figureLabels } from './explainLabels.ts';

/** Figures of a sentence, already written with their units. */
type Said = Readonly<Record<string, string>>;

const stages: Readonly<Record<StageName, string>> = {
  air: 'Outdoor air',
  need: 'Need of the rooms',
  hotWater: 'Hot water, draw and loss',
  hotWaterMap: 'Hot water, the map',
  reheat: 'Hot water, reheat',
  flow: 'Flow temperature',
  map: 'Map of the unit, full load',
  lowestMap: 'Map of the unit, lowest level',
  frost: 'Frost loss',
  levels: 'Full capacity and lowest level',
  running: 'Heat pump for the rooms',
  rate: 'Rate and electricity',
  backup: 'Backup for the rooms',
  rateLeft: 'Rate and electricity of what the boiler leaves',
  room: 'Rooms at the end of the hour',
  auxiliaries: 'Pump, standby, crankcase heater',
  sums: 'Electricity and fuel of the hour',
  money: 'Cost and carbon of the hour',
};

const findings: Readonly<Record<Finding, string>> = {
  humidityAssumed: 'The weather file has no humidity: the constant of the scenario is used.',
  pressureAssumed: 'The weather file has no pressure: that of the standard atmosphere is used.',
  noFrost: 'No frost grows on the coil.',
  heatingLimitHolds: 'The heating limit holds: no need.',
  noNeed: 'The rooms need no heat.',
  noHotWater: 'The scenario has no hot water.',
  hotWaterShort: 'Hot water runs short.',
  reheatNotDue: 'No reheat is due.',
  reheatNotAllowed: 'A reheat is due, but not allowed in this hour.',
  hygienePending: 'A hygiene run is pending.',
  reheatUnderWay: 'A reheat is under way from the hour before.',
  cylinderCool: 'The cylinder is colder than the temperature at which a reheat begins.',
  restsForWater: 'The heat pump rests: the heater or boiler does all.',
  cylinderAboveReach: 'The cylinder is warmer than the heat pump reaches: the heater or boiler does the rest.',
  reheatGoesOn: 'The reheat goes on in the next hour.',
  noHeatAsked: 'No space heat is asked: nothing to do.',
  emittersHarder: 'Hot water or waiting heat make the emitters run harder.',
  heldAtLowestFlow: 'Held at the lowest flow of the emitters.',
  heldAtHighestFlow: 'At the highest flow of the emitters.',
  tooCold: 'It is colder than the unit runs: the heat pump gives nothing.',
  restsByBackup: 'Below the switch temperature the heat pump rests: the backup carries all.',
  colderThanMap:
    'Colder than the coldest row: η of that row, κ at the true temperature; the capacity falls on by rule.',
  warmerThanMap: 'Warmer than the warmest row: held there, κ at most 5 K above it.',
  belowLowestFlow: 'Below the lowest column: the COP of that column and 2 % a kelvin.',
  hotterThanMap: 'Above the highest column: held there, κ at the true flow.',
  oneFlowColumn: 'The map has one column: nothing lies between columns.',
  insideMap: 'The point lies inside the map.',
  frostIncluded: 'The values of the map include defrosting: no further loss.',
  noFrostLoss: 'No frost loss in this hour.',
  singleSpeed: 'The lowest level is no lower than full capacity: a single-speed unit.',
  flowAboveLimit: 'The flow asked is above the highest flow of the unit.',
  quietHour: 'A quiet hour limits the capacity.',
  lastHour: 'The last hour of the year: nothing may wait.',
  heatPumpGivesNothing: 'The heat pump gives the rooms nothing.',
  cycling: 'The rate is below the lowest level: the compressor cycles.',
  noBackupNeeded: 'No backup is needed.',
  boilerCarries: 'The boiler is cheaper and carries the hour.',
  heatPumpCheaper: 'The heat pump is cheaper or as cheap.',
  unmet: 'The backup cannot give all that is asked.',
  roomNeedsNothing: 'The rooms need no heat of this hour.',
  compressorRuns: 'The compressor runs in this hour.',
  compressorIdle: 'The compressor does nothing in this hour.',
  noTariff: 'No tariff is named: no cost.',
  pricedByBlocks: 'The tariff is priced by blocks of use alone: an hour has no price of its own.',
  blocksNotSeen: 'Blocks of use come on top; they belong to no single hour.',
  carbonByHour: 'The carbon factor is not constant; the hour’s carbon is not shown.',
  noCarbonFactor: 'A carbon factor of the fuel is missing.',
};

/** Every word of an explained hour, in English. Another language is one more object of the same type. */
export const englishExplained = {
  title: (scenario: string) => `One hour of ${scenario}`,
  weekdays: ['Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday', 'Sunday'],
  hour: ({ weekday, civil, standard }: Said) =>
    `The hour that begins on ${weekday} at ${civil} civil time; in the standard time of the weather, ${standard}.`,
  within: ({ asked, civil }: Said) => `${asked} lies within this hour: it is explained from its beginning at ${civil}.`,
  rate: ({ tariff, rate, price }: Said) => `On ${tariff} the rate ${rate} holds at its beginning; price ${price}.`,
  rateWithoutPrice: ({ tariff, rate }: Said) => `On ${tariff} the rate ${rate} holds at its beginning.`,
  digits:
    'Figures have six significant digits here; simulate --hourly and explain --json hold every digit. Sections are those of docs/model.md.',
  formula: ({ section, says }: Said) => `section ${section}: ${says}`,
  source: (source: string) => ` (${source})`,
  stages,
  findings,
  labels: figureLabels,
  formulas: formulaWords,
};

/** The words of an explained hour in one language. */
export type ExplainWords = typeof englishExplained;
