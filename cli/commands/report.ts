import { statSync } from 'node:fs';
import { makeReport } from '../../src/report/html/makeReport.ts';
import { reportPage } from '../../src/report/html/reportPage.ts';
import { reportText } from '../../src/report/html/reportText.ts';
import { LANGUAGES, type Language } from '../../src/report/language/languages.ts';
import { DiskSource } from '../diskSource.ts';
import { type CommandInput, EXIT, type Io, STDOUT } from '../io.ts';
import { withOutputs } from '../outputs.ts';
import { withBrowser } from '../pdf/withBrowser.ts';
import { tellProblems } from '../tellProblems.ts';
import { type ReportPlaces, writeReport } from '../writtenReport.ts';
import { wrongUse } from '../wrongUse.ts';

/** Writes the report of a scenario, or of a batch, as HTML, and as PDF where that is asked for. */
export async function run({ files, options }: CommandInput, io: Io): Promise<number> {
  const { out, pdf, date } = options;
  if (out === undefined) return wrongUse('--out FILE is missing: the report (HTML)', 'report', io);
  if (pdf === STDOUT) return wrongUse('a PDF needs a file: name one behind --pdf', 'report', io);
  if (date !== undefined && !isDate(date)) return wrongUse(`'${date}' is no date such as 2025-03-31`, 'report', io);
  const language = LANGUAGES.find((known) => known === options.language) ?? 'en';
  const [name] = files;
  const isBatch = isFolder(name);
  const foreign = (['by', 'axes'] as const).find((option) => !isBatch && options[option] !== undefined);
  if (foreign !== undefined) {
    return wrongUse(`--${foreign} is for the results of a batch, and '${name}' is no folder`, 'report', io);
  }
  return withOutputs([out, pdf], io, (outputs) =>
    withBrowser(pdf, io, async (browser) => {
      const printed = pdf === undefined || browser === undefined ? undefined : { file: pdf, browser };
      const places = { out, outputs, pdf: printed };
      if (!isBatch) return report({ scenario: name, date, language }, places, io);
      const { batchReport } = await import('./batchReport.ts');
      return batchReport({ folder: name, date, language, by: options.by, axes: options.axes }, places, io);
    }),
  );
}

/** Whether a name is that of a folder; what it is otherwise is told where it is read. */
function isFolder(name: string): boolean {
  try {
    return statSync(name).isDirectory();
  } catch {
    return false;
  }
}

/** A day that is on the calendar. */
function isDate(text: string): boolean {
  const day = /^\d{4}-\d{2}-\d{2}$/.test(text) ? new Date(`${text}T00:00:00Z`) : undefined;
  return day !== undefined && !Number.isNaN(day.getTime()) && day.toISOString().startsWith(text);
}

interface Asked {
  readonly scenario: string;
  readonly date: string | undefined;
  readonly language: Language;
}

async function report({ scenario, date, language }: Asked, places: ReportPlaces, io: Io): Promise<number> {
  const source = new DiskSource();
  const { input, problems } = makeReport(scenario, source, { language, date, version: io.version });
  const clashes = places.outputs.overInputs(source.identities);
  await tellProblems([...clashes, ...problems], io);
  if (input === undefined || clashes.length > 0) return EXIT.wrongInput;
  return writeReport({ page: reportPage(input), text: reportText(input) }, places, io);
}
