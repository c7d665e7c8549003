import { english, type ReportWords } from './english.ts';
import { german } from './german.ts';
import type { Language } from './languages.ts';
import { type LocalFigures, localFigures } from './localFigures.ts';

/** Words of a language, and its way of writing figures. */
export function inLanguage(language: Language): { words: ReportWords; figures: LocalFigures } {
  return language === 'de'
    ? { words: german, figures: localFigures(',') }
    : { words: english, figures: localFigures('.') };
}
