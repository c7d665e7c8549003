/** Problems of the tables of a heat-pump unit. */
export const mapProblems = {
  'map.no-table': {
    says: '{path} holds no table',
    cure: 'first row: flow temperatures; below it one row for each outdoor temperature, its values behind it',
  },
  'map.not-a-block': {
    says: '{path} stands on one line; a table keeps its lines only behind “|”',
    cure: 'write “|” behind the key, and the table indented on the lines below',
  },
  'map.axis': {
    says: '{path} has {found} on an axis; {allowed}',
    cure: 'the first row holds flow temperatures, the first column outdoor temperatures; turn the table if it lies on its side',
  },
  'map.repeated': { says: '{path} has {found} twice; first in {allowed}', cure: 'keep one of the two' },
  'map.unsorted': {
    says: 'in {path} the {found} temperatures stand out of order here; they were sorted',
    cure: 'check that this temperature is not mistyped',
  },
  'map.ragged': {
    says: 'in {path} this row has {found} values for {allowed} flow temperatures',
    cure: 'write a dash where there is no value',
  },
  'map.not-a-number': {
    says: '{path} is {found}; {allowed}',
    cure: 'write a number, or a dash where there is no value',
  },
  'map.out-of-range': { says: '{path} is {found}; {allowed}', cure: 'check the value' },
  'map.more': {
    says: '{found} more such faults in {path}',
    cure: 'correct those above first; they often have one cause',
  },
  'map.which-second': {
    says: '{path} has {found}; beside the capacity it needs either cop or inputPower',
    cure: 'give one of the two tables',
  },
  'map.axes-differ': {
    says: '{path} {found}, unlike {allowed}',
    cure: 'give both tables the same temperatures, with a dash where there is no value',
  },
  'map.sparse-column': {
    says: 'in {path} {found} has fewer than two points',
    cure: 'add a point, or take the column out',
  },
  'map.input-above-capacity': {
    says: '{path} is {found} kW, not below the capacity of {allowed} kW',
    cure: 'are the two tables exchanged, or is the power in W?',
  },
  'map.above-carnot': {
    says: '{path}: a COP of {found} is more than physics allows at this point ({allowed})',
    cure: 'look for a slip of the pen, and whether the row and the column are the right ones',
  },
  'map.lowest-above-carnot': {
    says: '{path}: {found} is more than physics allows there ({allowed})',
    cure: 'lower the multiple, or enter the lowest level as a table',
  },
  'map.lowest-above-full': {
    says: '{path} is {found} kW, more than the full load of {allowed} kW',
    cure: 'check that the two levels are not exchanged',
  },
  'map.looks-mistyped': {
    says: 'the {found} at {path} is far off the line of its neighbours, while the others fit',
    cure: 'compare it with the data sheet',
  },
  'map.rising-cop': {
    says: '{path}: the COP rises from {allowed} to {found} with a hotter flow',
    cure: 'compare both with the data sheet; a hotter flow costs COP',
  },
  'map.looks-integrated': {
    says: '{found} at {path} sags {allowed} below the line between its neighbours, as integrated values do: the loss by frost would count twice',
    cure: 'set defrost to method: included, or enter frost-free values',
  },
} as const;
