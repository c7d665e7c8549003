import { shown } from '../../core/problem.ts';
import { offsetText } from '../../core/stampText.ts';
import { quantityTexts } from './quantities.ts';
import type { FilledColumn, Recognised, RecognisedColumn, Recognising } from './recognised.ts';
import { stepText } from './timeStep.ts';

const unitWords: Readonly<Record<string, string>> = {
  C: '°C',
  F: '°F',
  K: 'K',
  '0.1C': 'tenths of a °C',
  percent: '%',
  fraction: '0 to 1',
  'W/m2': 'W/m²',
  'Wh/m2': 'Wh/m²',
  'kWh/m2': 'kWh/m²',
  'kJ/m2': 'kJ/m²',
  'MJ/m2': 'MJ/m²',
  'J/cm2': 'J/cm²',
};

const decidedWords = {
  settings: 'by the settings',
  name: 'by its name',
  content: 'by what it holds',
  position: 'the only column of numbers',
  header: 'unit from the header',
  values: 'unit judged by the values',
  assumed: 'unit assumed',
} as const;

const offsetWords = {
  settings: 'from the settings',
  stamps: 'from the stamps',
  header: 'from the header',
  zone: "standard time of the site's zone",
  site: "standard time of the site's zone, assumed",
} as const;

/** How a file was understood, in sentences for people. */
export function recognisedLines(known: Recognising): string[] {
  return [
    ...tableLines(known),
    ...known.columns.map(columnLine),
    ...stampLines(known),
    ...known.filled.flatMap(filledLines),
    ...known.empty.map((quantity) => `${quantityTexts[quantity].name}: the column is empty and was left out`),
  ];
}

function tableLines(known: Recognising): string[] {
  const lines: string[] = [];
  if (known.delimiter !== undefined) {
    lines.push(`cells are separated by ${known.delimiter}, the decimal mark is the ${known.decimal}`);
  }
  if (known.header !== undefined) {
    const head = known.header ? `the header is line ${known.headerLine}` : 'there is no header';
    lines.push(known.linesSkipped ? `${head}; ${counted(known.linesSkipped, 'line')} before it skipped` : head);
  }
  if (known.station !== undefined) lines.push(`station ${shown(known.station, 40)}`);
  if (known.rowsRead !== undefined) {
    const footer = known.footerRows ? `; ${counted(known.footerRows, 'line')} of remarks after them left out` : '';
    lines.push(`${counted(known.rowsRead, 'row')} read${footer}`);
  }
  return lines;
}

function columnLine(column: RecognisedColumn): string {
  const name = column.name === undefined ? '' : ` “${shown(column.name, 40)}”`;
  const unit = column.unit === undefined ? '' : `, ${unitWords[column.unit] ?? column.unit}`;
  const decided =
    column.unitDecidedBy === undefined
      ? ''
      : column.unitDecidedBy === 'settings'
        ? 'unit by the settings'
        : decidedWords[column.unitDecidedBy];
  const how = [decidedWords[column.decidedBy], decided].filter((words) => words !== '').join(', ');
  return `${column.use}: column ${column.number}${name}${unit} (${how})`;
}

function stampLines(known: Recognising): string[] {
  const lines: string[] = [];
  if (known.stampForm !== undefined) lines.push(`stamps: ${shown(known.stampForm)}`);
  if (known.stamps !== undefined) {
    lines.push(
      `each stamp marks the ${known.stamps === 'end' ? 'end' : 'beginning'} of its step (${howDecided(known.stampsDecidedBy)})`,
    );
  }
  if (known.stepMinutes !== undefined) lines.push(`one row every ${stepText(known.stepMinutes)}`);
  if (known.clock === 'local') {
    lines.push(`the clock changed in summer; converted to standard time (${howDecided(known.clockDecidedBy)})`);
  }
  if (known.offsetMinutes !== undefined && known.offsetFrom !== undefined) {
    lines.push(`offset ${offsetText(known.offsetMinutes)} (${offsetWords[known.offsetFrom]})`);
  }
  if (known.year !== undefined) lines.push(`the year ${known.year}`);
  if (known.sorted === true) lines.push('the rows were sorted by time');
  return lines;
}

function howDecided(how: Recognised['stampsDecidedBy']): string {
  return how === 'settings' ? 'by the settings' : (how ?? 'assumed');
}

function filledLines({ quantity, hours, longest, held }: FilledColumn): string[] {
  const { name, unit } = quantityTexts[quantity];
  const lines: string[] = [];
  if (hours > 0)
    lines.push(`${name}: ${counted(hours, 'hour')} interpolated, the longest gap ${counted(longest, 'hour')}`);
  if (held > 0)
    lines.push(`${name}: ${counted(held, 'value')} held at ${quantity === 'relativeHumidity' ? 100 : 0} ${unit}`);
  return lines;
}

function counted(count: number, what: string): string {
  return `${count} ${what}${count === 1 ? '' : 's'}`;
}
