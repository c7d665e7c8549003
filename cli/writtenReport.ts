import { EXIT, type Io } from './io.ts';
import type { Outputs } from './outputs.ts';
import type { Browser } from './pdf/findBrowser.ts';
import { printPdf } from './pdf/printPdf.ts';
import { tellProblems } from './tellProblems.ts';

/** Where a report goes. */
export interface ReportPlaces {
  readonly out: string;
  readonly outputs: Outputs;
  /** File of the PDF and the browser that prints it, where one is asked for. */
  readonly pdf: { readonly file: string; readonly browser: Browser } | undefined;
}

/**
 * Writes a report, prints it where that is asked for, and says it in short.
 *
 * @param page HTML
 * @param text for the terminal
 * @returns the exit code
 * @throws OutputFault
 */
export async function writeReport(
  { page, text }: { readonly page: string; readonly text: string },
  { out, outputs, pdf }: ReportPlaces,
  io: Io,
): Promise<number> {
  const printed = pdf === undefined ? undefined : await printPdf(page, pdf.browser, pdf.file);
  if (printed !== undefined && 'code' in printed) {
    await tellProblems([printed], io);
    return EXIT.notWritten;
  }
  if (pdf !== undefined && printed !== undefined) await outputs.writeBytes(pdf.file, printed);
  await outputs.write(out, [page]);
  await outputs.finish();
  if (!outputs.takesStdout) await io.stdout.write(text);
  return EXIT.done;
}
