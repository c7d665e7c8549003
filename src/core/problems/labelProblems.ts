/** Problems of what an energy label declares. */
export const labelProblems = {
  'label.needs-idle-powers': {
    says: '{path} declares a season, but no idle powers are given',
    cure: 'add idlePowers to the label: off, thermostatOff, standby and crankcase, in W, as the data sheet declares them',
  },
  'label.repeated-season': { says: '{path} is {found} once more; first in {allowed}', cure: 'keep one of the two' },
  'label.few-points': {
    says: '{path} has {found}; a season needs two different outdoor temperatures',
    cure: 'add points of the data sheet, or take the list out',
  },
  'label.repeated-point': {
    says: '{path} is {found} once more, with other values than {allowed}',
    cure: 'compare both with the data sheet and keep the right one',
  },
  'label.bivalent-below-limit': {
    says: '{path} is {found}, below the operating limit of {allowed}: the unit cannot carry the load where it does not run',
    cure: 'compare T_biv and TOL with the data sheet; they may be exchanged',
  },
  'label.bivalent-too-warm': {
    says: '{path} is {found}; in this climate Regulation (EU) 813/2013 allows at most {allowed}',
    cure: 'compare T_biv and the climate with the data sheet',
  },
  'label.limit-too-warm': {
    says: '{path} is {found}; in this climate Regulation (EU) 813/2013 allows at most {allowed}',
    cure: 'compare TOL and the climate with the data sheet',
  },
  'label.above-carnot': {
    says: '{path}: a COP of {found} is more than physics allows at this point ({allowed})',
    cure: 'look for a slip of the pen, and whether the outdoor temperature is the right one',
  },
  'label.capacity-below-load': {
    says: '{path} is {found} kW, more than 10 % below the part load of {allowed} kW, though it is not colder than T_biv',
    cure: 'compare the capacity, designLoad and bivalentTemperature with the data sheet',
  },
  'label.cop-falls-off': {
    says: '{path}: extended along the two warmest points, the COP comes to nothing in mild weather',
    cure: 'compare COP and capacity of the two warmest points with the data sheet',
  },
  'label.unknown-outlets': {
    says: 'the outlet temperatures of {found} are not known, so the map cannot be rated for it; known are {allowed}',
    cure: 'enter them in the label section, such as “outlets: [{ climate: warmer, application: 45, points: [[7, 38], [12, 30]] }]” with the values of EN 14825',
  },
  'label.outlet-at-design': {
    says: '{path} is at {found}; at the design temperature of {allowed} the outlet is the application’s own, and it is not colder than that',
    cure: 'write points above the design temperature, such as −7, 2, 7 and 12 °C',
  },
  'label.no-outlet-points': {
    says: '{path} has no point above the design temperature of {allowed}',
    cure: 'write the points of EN 14825 above it, such as −7, 2, 7 and 12 °C',
  },
} as const;
