import { describe, expect, it } from 'vitest';
import { answerText } from '../../src/report/answerText.ts';
import { resultDocument } from '../../src/report/resultDocument.ts';
import { wholeDemoAnswer } from '../unit/report/demoAnswer.ts';

/**
 * The layout alone: groups of digits become #, hashes h, runs of blanks and lines two, and prose stands on one line, for
 * where it is broken depends on its figures.
 */
function layoutOf(text: string): string {
  const masked = text
    .replace(/^[0-9a-f]{12} /gm, 'hhhhhhhhhhhh ')
    .replace(/[\d.\u202f]*\d/g, '#')
    .replace(/ {2,}/g, '  ')
    .replace(/─{2,}/g, '──');
  return masked
    .split('\n\n')
    .map((part) => (part.includes('──') ? part : part.replaceAll('\n', ' ')))
    .join('\n\n');
}

describe('the printed answer of the demo', () => {
  it('has the layout that was agreed', async () => {
    const text = layoutOf(answerText(resultDocument(wholeDemoAnswer(), '1')));
    await expect(text).toMatchFileSnapshot('printedAnswer.txt');
  });
});
