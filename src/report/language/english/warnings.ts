import type { SizeValues } from '../../../scenario/answer/warning.ts';
import type { WarningWords } from '../warningWords.ts';

const DEFER = 'Local codes and licensed practice decide.';

/** What warnings say, in English. */
export const englishWarnings: WarningWords = {
  'result.seasonal-factor': ({ factor, least, most }) => ({
    text: `The seasonal factor H4 of ${factor.toFixed(2)} lies outside ${least}–${most}, what homes have shown.`,
    remedy: 'Look at the flow temperatures, the COP table and the pump power for a slip of the pen.',
  }),
  'result.much-backup': ({ share, hours }) => ({
    text: `The backup gives ${(100 * share).toFixed(0)} % of the heat, in ${hours} hours.`,
    remedy: 'A larger unit, larger emitters for a lower flow, or less heat loss; check the switch temperature.',
  }),
  'result.unmet-heat': ({ heat, hours }) => ({
    text: `${heat.toFixed(0)} kWh of space heat could not be given (${hours} hours): rooms would get cold.`,
    remedy: 'More backup, a larger unit, or less heat loss. Do not sign a size that leaves the house cold.',
  }),
  'result.many-starts': ({ starts }) => ({
    text: `About ${(Math.round(starts / 100) * 100).toFixed(0)} compressor starts a year (an estimate).`,
    remedy: 'A unit with a lower lowest level, or more water in the circuit that it works on.',
  }),
  'map.outside': ({ hours }) => ({
    text: `In ${hours} hours the unit ran colder, warmer or hotter than its table reaches.`,
    remedy: 'Ask the maker for the missing rows or columns; the values there are extended by rule.',
  }),
  'map.flow-above-limit': ({ hours }) => ({
    text: `In ${hours} hours the rooms ask for a higher flow than the unit can give.`,
    remedy: 'Larger emitters or a lower heating curve; the backup lifts the rest.',
  }),
  'map.too-cold': ({ hours }) => ({
    text: `In ${hours} hours it is colder than the unit’s lowest outdoor temperature: it stands still.`,
    remedy: 'Make sure that the backup carries the house alone in those hours.',
  }),
  'weather.milder-than-design': (values) => ({
    text: `${coldestDay(values)}: the year is milder than the design.`,
    remedy: 'Fit for energy, not for sizing: do not conclude from it that a smaller unit is enough.',
  }),
  'weather.colder-than-design': (values) => ({
    text: `${coldestDay(values)}: the year is colder than the design.`,
    remedy: 'Check the place of the weather file and the design temperature.',
  }),
  'size.cannot-run': ({ outdoor, lowest, designLoad }) => ({
    text: `The unit cannot run at the design temperature: ${outdoor} °C is colder than its lowest, ${lowest} °C.`,
    remedy: `The backup must then carry the whole design load of ${designLoad.toFixed(1)} kW; else take a unit that runs in such cold.`,
  }),
  'size.far-under': (values) => ({
    text: `The unit is far smaller than the house needs: ${sizes(values)}.`,
    remedy: 'Take the next size, or make sure that backup power and cost are accepted.',
  }),
  'size.far-over': (values) => ({
    text: `The unit is far larger than the house needs: ${sizes(values)}.`,
    remedy: 'A smaller unit starts and stops less and costs less.',
  }),
  'hot-water.legionella': ({ setPoint, usual }) => ({
    text: `The cylinder is kept at ${setPoint} °C and no weekly hygiene run is entered.`,
    remedy: `Legionella can grow in warm water: enter a hygiene run to ${usual} °C or show another measure. ${DEFER}`,
  }),
  'hot-water.hygiene-run-cool': ({ reached, usual }) => ({
    text: `The hygiene run reaches ${reached} °C only.`,
    remedy: `Usual is ${usual} °C. ${DEFER}`,
  }),
  'hot-water.scalding': ({ hottest }) => ({
    text: `The cylinder reaches ${hottest} °C: water that hot scalds at the tap.`,
    remedy: `A thermostatic mixing valve is usual. ${DEFER}`,
  }),
  'hot-water.colder-than-use': ({ setPoint, use }) => ({
    text: `The cylinder is kept at ${setPoint} °C, colder than the ${use} °C of use.`,
    remedy: 'Raise the set point, or enter the litres at the temperature at which they are drawn.',
  }),
  'hot-water.short': ({ hours, heat, coolest }) => ({
    text: `In ${hours} hours hot water ran short (${heat.toFixed(0)} kWh a year; coolest ${coolest.toFixed(0)} °C).`,
    remedy: 'A larger cylinder, a higher set point, or longer reheat windows.',
  }),
};

function coldestDay({ coldest, design }: { readonly coldest: number; readonly design: number }): string {
  return `The coldest day of the weather has ${coldest.toFixed(1)} °C, the design temperature is ${design} °C`;
}

function sizes({ capacity, outdoor, flow, limited, designLoad }: SizeValues): string {
  const highest = limited ? ', the highest it gives there' : '';
  return `${capacity.toFixed(1)} kW at ${outdoor} °C and ${Number(flow.toFixed(1))} °C flow${highest}, the design load is ${designLoad.toFixed(1)} kW`;
}
