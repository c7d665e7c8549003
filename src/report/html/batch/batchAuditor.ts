import { tariffColumn, tariffFigures } from '../../../batch/rowColumns.ts';
import { type Markup, markup } from '../../charts/markup.ts';
import { dataTable, textColumns } from '../dataTable.ts';
import { inEnglish } from '../named.ts';
import { quotedWord } from '../reportCommands.ts';
import type { BatchReportInput } from './batchReportInput.ts';
import { cellName } from './writtenFigures.ts';

/** Files and assumptions that are listed; the manifest has all of them. */
const MOST_LISTED = 60;

/** For the auditor: what the years rest on, what the columns mean, and how to get it again. */
export function batchAuditor(input: BatchReportInput): Markup {
  const { words } = input;
  const { auditor: said, batch } = words;
  const section = (title: string, parts: readonly (Markup | undefined)[]) =>
    markup`<section><h3>${title}</h3>${parts}</section>`;
  return markup`<section class="part" aria-labelledby="auditor"><h2 id="auditor">${said.title}</h2>${[
    section(said.inputs, [inputTable(input)]),
    section(said.assumptions, [assumptionTable(input)]),
    section(batch.columnsTitle, [columnTable(input)]),
    section(said.again, [markup`<p>${batch.again}</p><pre>${batchCommands(input)}</pre>`]),
  ]}</section>`;
}

function inputTable({ manifest, words, figures }: BatchReportInput): Markup {
  const { auditor: said, batch } = words;
  const table = dataTable({
    caption: batch.inputsCaption(manifest.version),
    columns: textColumns(said.file, said.role, 'SHA-256'),
    rows: manifest.inputs
      .slice(0, MOST_LISTED)
      .map(({ file, role, sha256 }) => [
        cellName(file),
        batch.roles[role] ?? words.roles[role] ?? cellName(role),
        markup`<code>${cellName(sha256)}</code>`,
      ]),
  });
  const rest = manifest.inputs.length - MOST_LISTED;
  return rest > 0 ? markup`${table}<p>${batch.moreInputs(figures.number(rest, 0))}</p>` : table;
}

function assumptionTable({ manifest, words, figures }: BatchReportInput): Markup {
  const { auditor: said, batch } = words;
  if (manifest.assumptions.length === 0) return markup`<p>${said.noAssumptions}</p>`;
  const table = dataTable({
    caption: said.assumptionsCaption,
    columns: textColumns(said.place, said.assumed),
    rows: manifest.assumptions
      .slice(0, MOST_LISTED)
      .map(({ path, text }) => [markup`<code>${cellName(path)}</code>`, inEnglish(text.slice(0, 400))]),
  });
  const rest = manifest.assumptions.length - MOST_LISTED;
  const more = rest > 0 ? markup`<p>${batch.moreAssumptions(figures.number(rest, 0))}</p>` : undefined;
  return markup`<p>${batch.assumptionsNote}</p>${table}${more}`;
}

/** Every column once; those of the tariffs for the first of them. */
function columnTable({ manifest, words }: BatchReportInput): Markup {
  const { batch: said } = words;
  const row = (name: string, unit: string, meaning: string | undefined) => [
    markup`<code>${cellName(name)}</code>`,
    unit === 'money' ? said.currencyUnit : unit,
    meaning ?? '',
  ];
  const ofTariffs = new Set(manifest.columns.filter(({ name }) => name.includes('.')).map(({ name }) => name));
  const plain = manifest.columns.filter(({ name }) => !ofTariffs.has(name)).slice(0, MOST_LISTED);
  const money = tariffFigures.filter((figure) => ofTariffs.has(tariffColumn(0, figure)));
  return dataTable({
    caption: said.columnsCaption,
    columns: textColumns(said.column, said.unit, said.meaning),
    rows: [
      ...['job', 'home', 'homesLine'].map((name) => row(name, '', said.columns[name])),
      ...plain.map(({ name, unit }) => row(name, unit, said.columns[name])),
      ...money.map((figure) => row(tariffColumn(0, figure), 'money', said.columns[figure])),
      ...['currency', 'warnings', 'problems'].map((name) => row(name, '', said.columns[name])),
    ],
  });
}

/** The commands that make the years and this report again, a line each. */
export function batchCommands({ manifest, by, axes, words, date }: Omit<BatchReportInput, 'figures'>): string {
  const options = [
    ...(by === 'cost' ? [] : [`--by ${by}`]),
    ...(axes === undefined ? [] : [`--axes ${quotedWord(axes.join(','))}`]),
    ...(words.language === 'en' ? [] : [`--language ${words.language}`]),
    ...(date === undefined ? [] : [`--date ${quotedWord(date)}`]),
  ];
  return [
    `winterledger batch ${quotedWord(manifest.planFile)} --out results`,
    ['winterledger report results --out report.html', ...options].join(' '),
    'sha256sum FILE',
  ].join('\n');
}
