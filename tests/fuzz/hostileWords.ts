import fc from 'fast-check';

/** Numbers as files may hold them that no quantity has, or that are written as no number should be. */
export const oddNumbers: readonly string[] = [
  ...['0', '-0', '0.0', '+0', '1', '-1', '1e400', '-1e400', '1e308', '-1e308', '1.7976931348623157e308', '1e-320'],
  ...['5e-324', '1e-9', '-1e-9', '1e15', '9007199254740993', '999999999999999999999', '0.1e1', '1E5', '1e+05', '00012'],
  ...['NaN', '.nan', '.NaN', '-.inf', '.inf', 'Infinity', '-Infinity', 'inf', '0x1F', '0o17', '0b11', '1_000', '1n'],
  ...[
    '1,5',
    '1.234,5',
    '1,234.5',
    "1'000",
    '1 000',
    '1\u00a0000',
    '1\u202f000',
    '.5',
    '5.',
    '1.2.3',
    '--5',
    '+-5',
    '5-',
  ],
  // full-width, Arabic-Indic and Devanagari digits; minus signs and dashes; a superscript; a Roman numeral
  ...['１２', '٣', '۳', '१२', '−5', '–5', '—5', '﹣5', '－5', '5²', 'Ⅻ', '½', '∞', '५.५', '1٫5'],
  ...[
    '400 %',
    '5 kW',
    '5kW',
    '€5',
    '5€',
    '1/2',
    '12:30',
    '24:00',
    '25:00',
    '12:60',
    '2025-02-30',
    '2025-02-29',
    '0-0-0',
  ],
];

/** Words that mean something to a parser, a language or a terminal. */
export const oddWords: readonly string[] = [
  ...[
    '"',
    "'",
    '[',
    ']',
    '{',
    '}',
    '[]',
    '{}',
    '&a',
    '*a',
    '!!map',
    '!!js/function',
    '|',
    '>',
    '|-',
    '- ',
    ': ',
    '? ',
    '#',
  ],
  ...[
    '%',
    '@',
    '`',
    '\t',
    '\n',
    '\r',
    '\r\n',
    '~',
    'null',
    'true',
    'no',
    '---',
    '...',
    '<<',
    '<<: *a',
    ',',
    ';',
    '\\',
    '/',
  ],
  ...['__proto__', 'constructor', 'prototype', 'toString', 'hasOwnProperty', 'valueOf', 'length', '0', '-1', 'NULL'],
  ...[
    '[[[[[[',
    '{a: {a: {a: ',
    '\u0000',
    '\u0007',
    '\u001b[31m',
    '\ufeff',
    '\u2028',
    '\u202e',
    '\ud800',
    '\ufffd',
    '💧',
  ],
  ...['é', 'e\u0301', '=1+1', '@SUM(A1)', '<b>', '&lt;', '</script>', '../../x', '/dev/null', 'con', 'x'.repeat(3000)],
];

/** Any of them, and numbers of every size. */
export const hostileWord: fc.Arbitrary<string> = fc.oneof(
  { weight: 4, arbitrary: fc.constantFrom(...oddNumbers) },
  { weight: 4, arbitrary: fc.constantFrom(...oddWords) },
  { weight: 2, arbitrary: fc.integer({ min: -100, max: 100 }).map(String) },
  { weight: 1, arbitrary: fc.double().map(String) },
  { weight: 1, arbitrary: fc.string({ unit: 'binary', maxLength: 6 }) },
);

/** What a number that stands in a file is multiplied by: most of these leave it plausible. */
export const factor = fc.constantFrom(0, -1, 0.01, 0.1, 0.5, 0.9, 1.001, 1.1, 2, 10, 1000, 1e9, 1e-9, 1 / 3);
