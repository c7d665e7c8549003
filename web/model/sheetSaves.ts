import { strToU8, zipSync } from 'fflate';
import { documentText } from '../../src/report/documentText.ts';
import { hourlyCsv } from '../../src/report/hourlyCsv.ts';
import { makeReport } from '../../src/report/html/makeReport.ts';
import { reportPage } from '../../src/report/html/reportPage.ts';
import { resultDocument } from '../../src/report/resultDocument.ts';
import { baseOf, type SheetFile } from './memorySource.ts';
import type { SheetModel } from './sheetModel.ts';

/** What can be saved beside the single files. */
export type SaveKind = 'scenario' | 'all' | 'result' | 'hours' | 'report';

/** All files of a package have the same time, so that the same files give the same bytes. */
const PACKED = new Date(2000, 0, 1);

/**
 * A file to be saved: the same bytes as the command line writes from the same files.
 *
 * @returns nothing where there is no answer to be written
 */
export function saved(model: SheetModel, kind: SaveKind): SheetFile | undefined {
  const { box } = model;
  const stem = baseOf(box.scenario).replace(/\.ya?ml$/i, '') || 'house';
  if (kind === 'scenario') return { name: baseOf(box.scenario), bytes: strToU8(box.text(box.scenario)) };
  if (kind === 'all') {
    const files = Object.fromEntries(box.all.map(({ name, bytes }) => [name.replace(/^(?:\.\.\/)+/, ''), bytes]));
    return { name: `${stem}.zip`, bytes: zipSync(files, { mtime: PACKED }) };
  }
  if (kind === 'report') return report(model, stem);
  const { answer } = model.answer;
  if (answer === undefined) return undefined;
  if (kind === 'hours') return { name: `${stem}-hours.csv`, bytes: strToU8([...hourlyCsv(answer)].join('')) };
  return { name: `${stem}-result.json`, bytes: strToU8(documentText(resultDocument(answer, model.version))) };
}

function report(model: SheetModel, stem: string): SheetFile | undefined {
  const { box, language, version } = model;
  const { input } = makeReport(box.scenario, box.source, { language, date: undefined, version });
  return input === undefined ? undefined : { name: `${stem}-report.html`, bytes: strToU8(reportPage(input)) };
}
