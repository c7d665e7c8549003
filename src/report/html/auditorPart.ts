import { recognisedLines } from '../../weather/read/recognisedLines.ts';
import { type Markup, markup } from '../charts/markup.ts';
import { assumptionText } from '../language/assumptionWords.ts';
import { warningText } from '../language/warningWords.ts';
import { weatherLines } from '../weatherLines.ts';
import { dataTable, figureColumns, textColumns } from './dataTable.ts';
import { mapTables } from './mapTables.ts';
import { named, quoted } from './named.ts';
import { reportCommands } from './reportCommands.ts';
import type { ReportInput } from './reportInput.ts';

/** For the auditor: what the result rests on, by which formulas, and how to get it again. */
export function auditorPart(input: ReportInput): Markup {
  const { words } = input;
  const { auditor: said } = words;
  const section = (title: string, parts: readonly (Markup | undefined)[]) =>
    markup`<section><h3>${title}</h3>${parts}</section>`;
  return markup`<section class="part" aria-labelledby="auditor"><h2 id="auditor">${said.title}</h2>${[
    section(said.inputs, [inputTable(input), ...inputTexts(input)]),
    section(said.assumptions, [assumptionTable(input)]),
    section(said.warnings, [warningTable(input)]),
    section(said.weather, weatherParts(input)),
    section(said.map, mapTables(input)),
    section(said.formulas, [formulaTable(input)]),
    section(said.again, [markup`<p>${said.againSays}</p><pre>${reportCommands(input)}</pre>`]),
  ]}</section>`;
}

function inputTable({ document, words }: ReportInput): Markup {
  const { auditor: said } = words;
  return dataTable({
    caption: said.inputsCaption(document.version),
    columns: textColumns(said.file, said.role, 'SHA-256'),
    rows: document.inputs.map(({ file, role, sha256 }) => [
      named(file),
      words.roles[role] ?? role,
      markup`<code>${sha256}</code>`,
    ]),
  });
}

function inputTexts({ texts, words }: ReportInput): Markup[] {
  return texts.map(
    ({ file, text }) =>
      markup`<details class="printed"><summary>${words.auditor.textOf} ${named(file)}</summary>${quoted(text)}</details>`,
  );
}

function assumptionTable({ answer, words, messages }: ReportInput): Markup {
  const { auditor: said } = words;
  if (answer.assumptions.length === 0) return markup`<p>${said.noAssumptions}</p>`;
  return dataTable({
    caption: said.assumptionsCaption,
    columns: textColumns(said.place, said.assumed),
    rows: answer.assumptions.map((assumption) => [
      markup`<code>${named(assumption.path)}</code>`,
      named(assumptionText(assumption, messages.assumptions)),
    ]),
  });
}

function warningTable({ answer, words, messages }: ReportInput): Markup {
  const { auditor: said } = words;
  if (answer.warnings.length === 0) return markup`<p>${words.client.noWarnings}</p>`;
  return dataTable({
    caption: said.warningsCaption,
    columns: textColumns(said.kind, said.seen, said.remedy),
    rows: answer.warnings.map((warning) => {
      const { text, remedy } = warningText(warning, messages.warnings, messages.problems);
      return [markup`<code>${warning.code}</code>`, named(text), named(remedy)];
    }),
  });
}

function weatherParts({ answer, words, messages, figures }: ReportInput): Markup[] {
  const { auditor: said } = words;
  const { recognised } = answer.loaded.weather;
  const lines = recognisedLines(recognised, messages.recognised).map((line) => markup`<li>${named(line)}</li>`);
  const { repairs } = weatherLines(recognised);
  const mended =
    repairs.length === 0
      ? markup`<p>${said.noRepairs}</p>`
      : dataTable({
          caption: said.repairs,
          columns: figureColumns(said.quantity, [said.filled, said.longest, said.held]),
          rows: repairs.map(({ quantity, hours, longest, held }) => [
            messages.recognised.quantity(quantity),
            ...[hours, longest, held].map((value) => figures.number(value, 0)),
          ]),
        });
  return [markup`<ul>${lines}</ul>`, mended];
}

function formulaTable({ words }: ReportInput): Markup {
  const { auditor: said } = words;
  return dataTable({
    caption: said.formulasCaption,
    columns: textColumns(said.section, said.what, said.source),
    rows: words.formulas.map(({ section, what, source }) => [section, what, source]),
  });
}
