import { CST, Lexer, Parser } from 'yaml';

/** Sections within sections that a file may hold; the formats here need about ten. */
const DEEPEST_NESTING = 64;

/** References (`*name`) that a file may hold; each costs a search through the file. */
const MOST_REFERENCES = 100;

/** What in a text must not reach the parser, and where. */
export interface Guarded {
  readonly what: 'too-deep' | 'tag' | 'alias';
  /** Offset in the text. */
  readonly offset: number;
  /** The tag as it stands, or how much there is of it. */
  readonly found: string;
}

/**
 * Looks through a YAML text without recursion, so that no text, however nested, can exhaust the stack of the parser.
 *
 * @param text any text
 * @returns the first nesting deeper than 64 levels or the first tag (`!…`, of no use in these formats), or the 101st
 * reference; undefined for none
 */
export function guardYaml(text: string): Guarded | undefined {
  const parser = new Parser();
  let inScalar = false;
  let references = 0;
  for (const lexeme of new Lexer().lex(text)) {
    const offset = parser.offset;
    const type = inScalar ? 'scalar' : CST.tokenType(lexeme);
    if (type === 'tag') return { what: 'tag', offset, found: lexeme };
    if (type === 'alias' && ++references > MOST_REFERENCES) {
      return { what: 'alias', offset, found: `more than ${MOST_REFERENCES} references` };
    }
    inScalar = lexeme === CST.SCALAR;
    drain(parser.next(lexeme));
    if (parser.stack.length > DEEPEST_NESTING) {
      return { what: 'too-deep', offset, found: `more than ${DEEPEST_NESTING} levels` };
    }
  }
  return undefined;
}

/** The tokens themselves are not wanted, only the stack of open ones that their making leaves. */
function drain(tokens: Iterator<CST.Token>): void {
  while (!tokens.next().done);
}
