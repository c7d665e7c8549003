import { makeReport } from '../../src/report/html/makeReport.ts';
import type { ReportInput } from '../../src/report/html/reportInput.ts';
import { reportPage } from '../../src/report/html/reportPage.ts';
import { reportText } from '../../src/report/html/reportText.ts';
import { LANGUAGES, type Language } from '../../src/report/language/languages.ts';
import { DiskSource } from '../diskSource.ts';
import { type CommandInput, EXIT, type Io, STDOUT } from '../io.ts';
import { type Outputs, withOutputs } from '../outputs.ts';
import { type PdfOutput, withPdf } from '../pdf/pdfOutput.ts';
import { printPdf } from '../pdf/printPdf.ts';
import { tellProblems } from '../tellProblems.ts';
import { wrongUse } from '../wrongUse.ts';

/** Writes the report of a scenario as HTML, and as PDF where that is asked for. */
export async function run({ files, options }: CommandInput, io: Io): Promise<number> {
  const { out, pdf, date } = options;
  if (out === undefined) return wrongUse('--out FILE is missing: the report (HTML)', 'report', io);
  if (pdf === STDOUT) return wrongUse('a PDF needs a file: name one behind --pdf', 'report', io);
  if (date !== undefined && !isDate(date)) return wrongUse(`'${date}' is no date such as 2025-03-31`, 'report', io);
  const language = LANGUAGES.find((known) => known === options.language) ?? 'en';
  return withOutputs([out], io, (outputs) =>
    withPdf(pdf, io, (printed) => report({ scenario: files[0], out, date, language, outputs, printed }, io)),
  );
}

/** A day that is on the calendar. */
function isDate(text: string): boolean {
  const day = /^\d{4}-\d{2}-\d{2}$/.test(text) ? new Date(`${text}T00:00:00Z`) : undefined;
  return day !== undefined && !Number.isNaN(day.getTime()) && day.toISOString().startsWith(text);
}

interface Asked {
  readonly scenario: string;
  readonly out: string;
  readonly date: string | undefined;
  readonly language: Language;
  readonly outputs: Outputs;
  readonly printed: PdfOutput | undefined;
}

async function report({ scenario, out, date, language, outputs, printed }: Asked, io: Io): Promise<number> {
  const source = new DiskSource();
  const { input, problems } = makeReport(scenario, source, { language, date, version: io.version });
  const clashes = [...outputs.overInputs(source.identities), ...(printed?.overFiles(source.identities, out) ?? [])];
  await tellProblems([...clashes, ...problems], io);
  if (input === undefined || clashes.length > 0) return EXIT.wrongInput;
  return write(input, { out, outputs, printed }, io);
}

async function write(
  input: ReportInput,
  { out, outputs, printed }: Pick<Asked, 'out' | 'outputs' | 'printed'>,
  io: Io,
): Promise<number> {
  const page = reportPage(input);
  const failure = printed === undefined ? undefined : await printPdf(page, printed);
  if (failure !== undefined) {
    await tellProblems([failure], io);
    return EXIT.notWritten;
  }
  await outputs.write(out, [page]);
  await outputs.finish();
  printed?.finish();
  if (!outputs.takesStdout) await io.stdout.write(reportText(input));
  return EXIT.done;
}
