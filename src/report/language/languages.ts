/** Languages a report can be written in, by their codes of ISO 639-1. */
export const LANGUAGES = ['en', 'de'] as const;

export type Language = (typeof LANGUAGES)[number];

/** One formula of the model with its source. */
export interface FormulaSource {
  readonly section: string;
  readonly what: string;
  readonly source: string;
}
