/** What an assessor most often meant where the YAML parser stumbles, by the parser's code. */
const hints: Readonly<Record<string, string>> = {
  TAB_AS_INDENT: 'indent with spaces; a tab may not stand in front of a key',
  BLOCK_AS_IMPLICIT_KEY:
    'give each key its own line, all keys of a section indented alike; put a text that holds a colon in quotes',
  MULTILINE_IMPLICIT_KEY: 'write a colon and a space after the key',
  MISSING_CHAR: 'look for a quote, bracket or colon that is missing here or in a line above',
  UNEXPECTED_TOKEN: 'look for a stray character, or put the whole text in double quotes',
  BAD_INDENT: 'indent the lines of one section alike, and close every bracket',
  BAD_SCALAR_START: 'put the text in double quotes',
  BAD_DQ_ESCAPE: 'use single quotes for a text with a backslash',
  BAD_ALIAS: 'put a text that begins with * or & in double quotes',
};

/** A line that begins like a row of a table: an outdoor temperature with something behind it. */
const TABLE_ROW = /^\s*[AL]?[-−–]?\d+(?:[.,]\d+)?\s*[\s;,]/;

/**
 * Advice for a fault in the writing of a YAML file.
 *
 * @param code the parser's code for it
 * @param line the line on which it was found
 * @returns one sentence; undefined where the kind's own cure says all there is
 */
export function syntaxHint(code: string, line: string): string | undefined {
  if (TABLE_ROW.test(line)) {
    return 'no row of a table may be indented less than its first line: put a word such as outdoor into its corner';
  }
  return Object.hasOwn(hints, code) ? hints[code] : undefined;
}
