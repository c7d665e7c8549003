import { EXIT, type Io } from '../io.ts';
import { tellProblems } from '../tellProblems.ts';
import { type Browser, findBrowser } from './findBrowser.ts';

/**
 * Runs a work with a browser that prints. Where there is none, the work does not begin.
 *
 * @param pdf file to be printed; absent where none is asked for, and then no browser is looked for
 * @param work gets the browser, and gives the exit code
 */
export async function withBrowser(
  pdf: string | undefined,
  io: Io,
  work: (browser: Browser | undefined) => Promise<number>,
): Promise<number> {
  if (pdf === undefined) return work(undefined);
  const browser = await findBrowser(process.env);
  if (browser === undefined) {
    await tellProblems([{ code: 'report.no-browser', severity: 'error', file: pdf }], io);
    return EXIT.notWritten;
  }
  try {
    return await work(browser);
  } finally {
    browser.leave();
  }
}
