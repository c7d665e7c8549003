import { type Markup, markup } from '../charts/markup.ts';
import { backupByTemperature } from './backupByTemperature.ts';
import { coldSpell } from './coldSpell.ts';
import { boilerTable, carbonTable, priceTable, tariffsSideBySide, wholeLifeFigure } from './comparisonTables.ts';
import { costByMonth } from './costByMonth.ts';
import { factorTable, monthTable, runningTable } from './factorTables.ts';
import { loadDuration } from './loadDuration.ts';
import { monthlyEnergy } from './monthlyEnergy.ts';
import { ratesByMonth } from './ratesByMonth.ts';
import type { ReportInput } from './reportInput.ts';
import { whereSpent } from './whereSpent.ts';
import { yearCarpets } from './yearCarpets.ts';

/** For the professional: energy, sizing, the cold, the money. */
export function professionalPart(input: ReportInput): Markup {
  const { professional: said } = input.words;
  const section = (title: string, parts: readonly (Markup | undefined)[]) =>
    markup`<section><h3>${title}</h3>${parts}</section>`;
  const charts = (parts: readonly (Markup | undefined)[]) => markup`<div class="charts">${parts}</div>`;
  return markup`<section class="part" aria-labelledby="professional"><h2 id="professional">${said.title}</h2>${[
    section(said.energy, [
      charts([monthlyEnergy(input), ...yearCarpets(input)]),
      monthTable(input),
      factorTable(input),
      runningTable(input),
    ]),
    section(said.sizing, [
      charts([loadDuration(input), coldSpell(input), whereSpent(input), backupByTemperature(input)]),
    ]),
    section(said.money, [
      tariffsSideBySide(input),
      charts([...costByMonth(input), ...ratesByMonth(input), wholeLifeFigure(input)]),
      boilerTable(input),
      priceTable(input),
      carbonTable(input),
    ]),
  ]}</section>`;
}
