/** Parts of a visit, in the order in which an assessor goes through a house. */
export const VISIT = [
  { id: 'house', entries: ['name', 'note', 'house'] },
  { id: 'place', entries: ['site', 'weather'] },
  { id: 'emitters', entries: ['flowTemperature', 'circulation'] },
  { id: 'heatPump', entries: ['heatPump', 'backup'] },
  { id: 'hotWater', entries: ['hotWater'] },
  { id: 'tariffs', entries: ['currency', 'tariffs', 'household', 'carbon'] },
  { id: 'boiler', entries: ['boiler', 'wholeLife'] },
] as const;

export type PartId = (typeof VISIT)[number]['id'];
