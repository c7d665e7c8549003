import { resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import { openBrowser } from '../tests/browser/openBrowser.ts';

const OPENINGS = 9;
/** From opening the page to its first answer, at most, ms. */
const ASKED = 1500;
/** A sentence that stands in the answer alone. */
const ANSWERED = 'kWh of heat';

/** Times the sheet in a browser, from the opening of its file to the first answer of the demo house. Prints what it finds. */
export async function benchSheetOpening(say: (line: string) => void): Promise<void> {
  const browser = await openBrowser();
  try {
    const times: number[] = [];
    for (let k = 0; k < OPENINGS; k++) {
      const context = await browser.newContext({ locale: 'en-GB' });
      const page = await context.newPage();
      const begin = process.hrtime.bigint();
      await page.goto(pathToFileURL(resolve('dist/sheet.html')).href);
      await page.getByText(ANSWERED).first().waitFor();
      times.push(Number(process.hrtime.bigint() - begin) / 1e6);
      await context.close();
    }
    const median = times.toSorted((a, b) => a - b)[OPENINGS >> 1];
    say(
      `sheet: from opening it to the first answer ${median.toFixed(0)} ms, median of ${OPENINGS} (asked: at most ${ASKED})`,
    );
  } finally {
    await browser.close();
  }
}
