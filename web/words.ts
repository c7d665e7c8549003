import { englishSheet, type SheetWords } from '../src/report/language/english/sheet.ts';
import { germanSheet } from '../src/report/language/german/sheet.ts';
import type { Language } from '../src/report/language/languages.ts';

/** Words of the page in a language. */
export function sheetWords(language: Language): SheetWords {
  return language === 'de' ? germanSheet : englishSheet;
}
