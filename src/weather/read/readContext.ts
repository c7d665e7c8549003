import type { ReadSettings } from '../readSettings.ts';
import type { Findings } from './findings.ts';
import type { Recognising } from './recognised.ts';

/** What the reader knows besides the text. */
export interface ReadContext {
  /** Name of the file, for messages. */
  readonly file: string;
  readonly settings: ReadSettings;
  /** The site's zone of the IANA list, if known. */
  readonly zone: string | undefined;
  /** Offset from UTC, minutes, of stamps that carry none, where neither settings nor header name one. */
  readonly defaultOffsetMinutes: number;
  /** Of the site, m above sea level: tells units of pressure apart. */
  readonly altitude: number;
}

/** Where a reading collects what it finds. */
export interface Reading {
  readonly known: Recognising;
  readonly findings: Findings;
}
