import { visibleText } from '../../core/problem.ts';
import { heading, wrapped } from '../layout.ts';
import { clientSentences } from './clientSentences.ts';
import type { ReportInput } from './reportInput.ts';

/** What a report says in short, for the terminal: name and answer. */
export function reportText(input: ReportInput): string {
  return `${heading(visibleText(input.document.scenario))}\n${wrapped(clientSentences(input).join(' '))}\n`;
}
