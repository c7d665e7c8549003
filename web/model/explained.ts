import { explainDocument } from '../../src/report/explainDocument.ts';
import type { ExplainDocument } from '../../src/report/explainSchema.ts';
import { civilStamps } from '../../src/report/hourStamps.ts';
import type { SheetModel } from './sheetModel.ts';

/**
 * How the figures of one hour come about.
 *
 * @param hour 0 … hours of the year − 1; nothing beyond, and nothing as long as there is no answer
 */
export function explained(model: SheetModel, hour: number): ExplainDocument | undefined {
  const { answer } = model.answer;
  if (answer === undefined || !Number.isInteger(hour) || hour < 0 || hour >= answer.columns.hours) return undefined;
  const text = civilStamps(answer.loaded.clock)[hour] ?? '';
  return explainDocument(answer, { hour, isBeginning: true, text }, model.version, model.messages.explained);
}
