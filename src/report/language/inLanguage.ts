import { englishMessages } from './english/messages.ts';
import { english, type ReportWords } from './english/report.ts';
import { germanMessages } from './german/messages.ts';
import { german } from './german/report.ts';
import type { Language } from './languages.ts';
import { type LocalFigures, localFigures } from './localFigures.ts';
import type { Messages } from './messages.ts';

/** A language: the words of the report, what the program says beside them, and the way of writing figures. */
export interface InLanguage {
  readonly words: ReportWords;
  readonly messages: Messages;
  readonly figures: LocalFigures;
}

/** Everything that is said in a language. */
export function inLanguage(language: Language): InLanguage {
  return language === 'de'
    ? { words: german, messages: germanMessages, figures: localFigures(',') }
    : { words: english, messages: englishMessages, figures: localFigures('.') };
}
