/** Problems of structured files: how they are written, what stands in them, and what does not go together. */
export const scenarioProblems = {
  'yaml.not-text': {
    says: 'this is not a text file',
    cure: 'name a text file; a spreadsheet or a document must be exported first',
  },
  'yaml.syntax': { says: 'the file cannot be understood here: {found}', cure: 'look at this line and the one above' },
  'yaml.too-deep': { says: 'sections stand within sections, {found}', cure: 'close the brackets, or indent less' },
  'yaml.tag': { says: "'{found}' has no meaning here", cure: 'take it out, or put the text in quotes' },
  'yaml.alias': {
    says: "'{found}' cannot be used: a reference follows its anchor (&name), does not hold itself, and there are few of them",
    cure: 'write the values out',
  },
  'yaml.several-documents': {
    says: 'a second document begins here; one file holds one',
    cure: 'take out the line ---, or put the second part into a file of its own',
  },
  'yaml.no-keys': {
    says: 'the file holds {found}; it must hold keys with values',
    cure: 'begin with a line such as “name: My house”',
  },
  'yaml.key-not-a-word': { says: 'a key must be a word', cure: 'write a word, a colon and a space' },
  'yaml.repeated-key': { says: '{path} stands twice; first in {found}', cure: 'keep one of the two' },
  'entry.missing': { says: '{path} is missing; {allowed}', cure: 'add it' },
  'entry.empty': { says: '{path} has no value; {allowed}', cure: 'write a value, or take the line out' },
  'entry.unknown-key': { says: '{path} is not known here', cure: 'known here: {allowed}' },
  'entry.wrong-kind': { says: '{path} is {found}; {allowed}', cure: 'write it in that form' },
  'entry.out-of-range': { says: '{path} is {found}; {allowed}', cure: 'check the value and its unit' },
  'entry.not-a-choice': { says: '{path} is {found}; {allowed}', cure: 'write one of these words' },
  'entry.wrong-form': { says: '{path} is {found}; {allowed}', cure: 'write it in that form' },
  'entry.wrong-length': {
    says: '{path} has {found}; {allowed}',
    cure: 'add what is missing, or take out what is too much',
  },
  'scenario.hygiene-below-set-point': {
    says: '{path} is {found}, the set point is {allowed}: the weekly run goes to the set point and no further',
    cure: 'enter the temperature that the hygiene run reaches, or leave the run out',
  },
  'scenario.contradiction': { says: '{path} is {found}; {allowed}', cure: 'correct one of the two' },
  'scenario.points-not-rising': {
    says: '{path} is at {found}, not above the point before it at {allowed}',
    cure: 'write the points from the lowest temperature to the highest, each temperature once',
  },
  'scenario.no-heat-loss': {
    says: '{path} comes to {found}; a house loses heat',
    cure: 'check the thermal bridges below zero',
  },
  'scenario.needs-floor-area': {
    says: '{path} is lumped, which needs the floor area',
    cure: 'add floorArea to the house; its mass is counted by it',
  },
  'scenario.loss-shares': {
    says: '{path}: windows, opaque and ventilation add up to {found}, not to 1',
    cure: 'write the shares so that they add up to 1',
  },
  'scenario.base-and-gains': {
    says: '{path} is {found}, but a base temperature is entered, which holds the gains already',
    cure: 'take out baseTemperature, or the gains',
  },
  'scenario.set-back-needs-mass': {
    says: '{path} changes the room temperature within a day; degree hours know no mass and would overstate the electricity saved more than twofold',
    cure: 'write “model: lumped” for it, with its rules under schedule; degree hours take whole days, under days',
  },
  'scenario.empty-window': {
    says: '{path} is {found}, the same as its start',
    cure: 'leave both out for the whole day',
  },
  'scenario.half-a-period': { says: '{path} is missing beside the other end', cure: 'give both days, or neither' },
  'scenario.no-such-date': { says: '{path} is {found}, a day that does not exist', cure: 'correct the date' },
  'scenario.mixed-dates': {
    says: '{path} is {found}, but the period begins on {allowed}',
    cure: 'write the year in both dates, or in neither for every year',
  },
  'scenario.ends-before': {
    says: '{path} is {found}, before the beginning on {allowed}',
    cure: 'exchange the two days, or leave the years out for a period across the new year',
  },
  'scenario.other-year': {
    says: '{path} is {found}, but the calendar year is {allowed}: the rule never holds',
    cure: 'leave the year out, or write that of the calendar',
  },
  'scenario.rule-set-point': {
    says: '{path} has {found}; a rule has one of the two',
    cure: 'give setPoint for a temperature, or raise for a difference',
  },
  'scenario.rate-needs-tariff': {
    says: '{path} follows the rate of a tariff, but no tariff is named',
    cure: 'name a tariff file under tariffs; the first one counts',
  },
  'scenario.no-such-rate': {
    says: '{path} is {found}; the first tariff has {allowed}',
    cure: 'write the name of one of its rates',
  },
  'scenario.cheapest-needs-tariff': {
    says: '{path} compares electricity with fuel, but no tariff is named',
    cure: 'name a tariff file under tariffs; the first one counts',
  },
  'scenario.cheapest-needs-price': {
    says: '{path} compares prices by the hour, but the tariff {found} is priced by blocks alone',
    cure: 'put a tariff with rates or a price series first',
  },
  'scenario.no-shares': {
    says: '{path} are all zero',
    cure: 'write what is drawn in each hour, or leave the shares out',
  },
  'scenario.weekend-alone': {
    says: '{path} stands without the shares of the other days',
    cure: 'give shares too, on the same scale',
  },
  'scenario.boiler-needs-tariff': {
    says: '{path} is electricity without a price, which is on the household’s tariff, but no tariff is named',
    cure: 'name a tariff file under tariffs, or give the electricity a price of its own',
  },
  'scenario.cylinder-without-hot-water': {
    says: '{path} is {found} kWh a year, but no hot water is entered',
    cure: 'enter hotWater, so that both sides heat it, or take the loss out',
  },
  'scenario.carbon-needs-tariff': {
    says: '{path} go by the rates of a tariff, but no tariff is named',
    cure: 'name a tariff file under tariffs; the first one counts',
  },
  'scenario.carbon-no-such-rate': {
    says: '{path} is {found}; the first tariff has {allowed}',
    cure: 'write the name of one of its rates',
  },
  'scenario.carbon-rate-twice': {
    says: '{path} is {found}, which has a factor already',
    cure: 'keep one factor for each rate',
  },
  'scenario.carbon-rate-missing': {
    says: '{path} lack the rate {found} of the first tariff',
    cure: 'give every rate of the first tariff its factor',
  },
  'scenario.whole-life-needs-boiler': {
    says: '{path} compares a heat pump with a boiler over the years, but no boiler is entered',
    cure: 'enter the boiler, or take the section out',
  },
  'scenario.whole-life-needs-tariff': {
    says: '{path} needs the cost of a year, but no tariff is named',
    cure: 'name a tariff file under tariffs; the first one counts',
  },
  'scenario.taxes-differ': {
    says: 'the prices of this tariff {found}; those of the first tariff {allowed}: their bills are not alike',
    cure: 'state all tariffs in one way; they are ranked only among those stated alike',
  },
  'scenario.taxes-mixed': {
    says: 'the prices of this tariff {found}: its bill is like no other',
    cure: 'state the tariffs of all suppliers in one way',
  },
  'scenario.frozen-water': {
    says: '{path} is {found}, more than the mean of the cold water: it would freeze',
    cure: 'write half the swing between the coldest and the warmest water',
  },
  'scenario.sun-without-radiation': {
    says: '{path} is {found} m², but the weather file {allowed} has no radiation',
    cure: 'name a weather file with global radiation, or set the solar aperture to 0',
  },
  'scenario.currency': {
    says: '{path} is {found}, but the scenario counts in {allowed}',
    cure: 'state all prices in one currency',
  },
  'scenario.unknown-kind': {
    says: 'this is no scenario, unit, tariff, plan, read settings, and no table that is read here: {found}',
    cure: 'compare it with the examples in docs/formats.md',
  },
  'house.opaque-loss': {
    says: 'walls, roof and floor lose {found} {unit}, more than the mass of the lumped model can pass on ({allowed} {unit})',
    cure: 'check heat loss and floor area, or use the model degreeHours',
  },
} as const;
