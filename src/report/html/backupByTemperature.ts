import { MARK } from '../../sim/columns.ts';
import { type Markup, markup } from '../charts/markup.ts';
import { stackedBars } from '../charts/stackedBars.ts';
import { type Look, sample } from '../charts/texture.ts';
import { chartFigure } from './chartFigure.ts';
import { figureColumns } from './dataTable.ts';
import type { ReportInput } from './reportInput.ts';

/** Width of a class of outdoor temperature, K. */
const CLASS = 2;
const ROOMS: Look = { tone: 3, texture: 'falling' };
const WATER: Look = { tone: 2, texture: 'rising' };

/** Hours and heat of the backup in a class of outdoor temperature. */
export interface BackupClass {
  /** Colder edge, °C. */
  readonly from: number;
  /** All hours of the year in the class. */
  readonly hours: number;
  /** Hours in which the backup heats the rooms, and those in which it heats water alone. */
  readonly rooms: number;
  readonly waterAlone: number;
  /** kWh. */
  readonly heat: number;
}

/**
 * Backup hours by outdoor temperature.
 *
 * @returns classes of 2 K from the coldest hour of the year to the warmest one with backup; empty where it never runs
 */
export function backupClasses({ columns: c, plan }: ReportInput['answer']): BackupClass[] {
  const { temperature } = plan.weather;
  const classOf = (hour: number) => Math.floor(temperature[hour] / CLASS);
  const withBackup = Array.from(temperature.keys()).filter(
    (i) => (c.marks[i] & (MARK.backupForSpace | MARK.backupForWater)) !== 0,
  );
  if (withBackup.length === 0) return [];
  const coldest = Math.floor(temperature.reduce((low, value) => Math.min(low, value)) / CLASS);
  const warmest = withBackup.reduce((high, i) => Math.max(high, classOf(i)), coldest);
  return Array.from({ length: warmest - coldest + 1 }, (_, step) => {
    const number = coldest + step;
    const inside = withBackup.filter((i) => classOf(i) === number);
    const rooms = inside.filter((i) => (c.marks[i] & MARK.backupForSpace) !== 0).length;
    return {
      from: number * CLASS,
      hours: temperature.reduce((sum, value) => sum + (Math.floor(value / CLASS) === number ? 1 : 0), 0),
      rooms,
      waterAlone: inside.length - rooms,
      heat: inside.reduce((sum, i) => sum + c.backupSpaceHeat[i] + c.backupWaterHeat[i], 0),
    };
  });
}

/** The classes as a figure; a sentence where the backup never runs. */
export function backupByTemperature({ answer, words, figures }: ReportInput): Markup {
  const { backup: said } = words;
  const classes = backupClasses(answer);
  if (classes.length === 0) return markup`<p>${said.never}</p>`;
  const hours = classes.reduce((sum, { rooms, waterAlone }) => sum + rooms + waterAlone, 0);
  const heat = classes.reduce((sum, each) => sum + each.heat, 0);
  const says = said.says({ hours: figures.number(hours, 0), heat: figures.kWh(heat) });
  const water = classes.some(({ waterAlone }) => waterAlone > 0);
  const series = [
    { look: ROOMS, values: classes.map(({ rooms }) => rooms) },
    ...(water ? [{ look: WATER, values: classes.map(({ waterAlone }) => waterAlone) }] : []),
  ];
  const everySecond = classes.length > 10 ? 2 : 1;
  return chartFigure({
    title: said.title,
    chart: stackedBars({
      ...{ id: 'backup-hours', title: said.title, description: says, series, quantity: 'h', categories: said.outdoor },
      labels: classes.map(({ from }, i) => (i % everySecond === 0 ? figures.number(from, 0) : '')),
      written: figures.number,
    }),
    legend: [[sample(ROOMS), said.rooms], ...(water ? [[sample(WATER), said.waterAlone] as const] : [])],
    says,
    table: {
      caption: said.caption,
      columns: figureColumns(said.outdoor, [said.allHours, said.rooms, said.waterAlone, said.heat]),
      rows: classes.map((each) => [
        `${figures.number(each.from, 0)} … ${figures.number(each.from + CLASS, 0)}`,
        ...[each.hours, each.rooms, each.waterAlone, each.heat].map((value) => figures.number(value, 0)),
      ]),
    },
    figures: words.figures,
  });
}
