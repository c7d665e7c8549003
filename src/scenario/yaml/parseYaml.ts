import { type Document, isScalar, LineCounter, parseDocument, type YAMLError } from 'yaml';
import { type Problem, shown } from '../../core/problem.ts';
import type { InputBytes } from '../fileSource.ts';
import { guardYaml } from './guardYaml.ts';
import { syntaxHint } from './syntaxHint.ts';
import { textOf } from './textOf.ts';
import { ParsedYamlFile, type YamlFile } from './yamlFile.ts';
import { type KeyFault, keyFaults } from './yamlKeys.ts';

/** Largest scenario, unit or tariff file that is read, bytes. */
const LARGEST_YAML_FILE = 1_000_000;

/** A file that could be parsed, or all that keeps it from being so. */
export type ParsedYaml = { readonly yaml: YamlFile; readonly problems: [] } | { readonly problems: Problem[] };

/**
 * Parses a YAML file of keys with values (YAML 1.2, core schema), whatever its bytes; never throws.
 *
 * @param input at most 1 MB is read
 * @returns the file with the places of its values; or problems with line and column
 */
export function parseYaml(input: InputBytes): ParsedYaml {
  const file = input.name;
  if (input.bytes.length > LARGEST_YAML_FILE) {
    const found = `${(input.bytes.length / 1e6).toFixed(1)} MB`;
    return { problems: [{ code: 'file.too-large', severity: 'error', file, found, allowed: '1 MB' }] };
  }
  const { text, problems } = textOf(input);
  if (text === undefined) return { problems };
  if (text.trim() === '') return { problems: [{ code: 'file.empty', severity: 'error', file }] };
  const lines = new LineCounter();
  const guarded = guardYaml(text);
  if (guarded) {
    lines.addNewLine(0);
    for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) lines.addNewLine(at + 1);
    const code = `yaml.${guarded.what}` as const;
    return { problems: [problemAt(file, lines, guarded.offset, { code, found: shown(guarded.found) })] };
  }
  return parseGuarded(file, text, lines);
}

function parseGuarded(file: string, text: string, lines: LineCounter): ParsedYaml {
  const document = parseDocument(text, {
    lineCounter: lines,
    prettyErrors: false,
    uniqueKeys: false,
    merge: false,
    version: '1.2',
    schema: 'core',
    logLevel: 'error',
  });
  const syntax = [...document.errors, ...document.warnings];
  if (syntax.length > 0)
    return { problems: firstOfEachLine(syntax.map((error) => syntaxProblem(file, text, lines, error))) };
  const keys = keyFaults(document).map((fault) => keyProblem(file, lines, fault));
  if (keys.length > 0) return { problems: keys };
  return valuesOf(file, { text, document, lines });
}

function valuesOf(file: string, parsed: { text: string; document: Document; lines: LineCounter }): ParsedYaml {
  let raw: unknown;
  try {
    raw = parsed.document.toJS({ maxAliasCount: 20 });
  } catch {
    return {
      problems: [{ code: 'yaml.alias', severity: 'error', file, line: 1, column: 1, found: 'the references (*)' }],
    };
  }
  if (typeof raw === 'object' && raw !== null && !Array.isArray(raw)) {
    return { yaml: new ParsedYamlFile(file, { ...parsed, raw }), problems: [] };
  }
  const { contents } = parsed.document;
  // a number beyond all numbers is shown as it is written
  const written = isScalar(contents) ? (contents.source ?? raw) : raw;
  const found = Array.isArray(raw) ? 'a list' : raw === null ? 'nothing but comments' : `only '${shown(written)}'`;
  const offset = raw === null ? 0 : (contents?.range?.[0] ?? 0);
  return { problems: [problemAt(file, parsed.lines, offset, { code: 'yaml.no-keys', found })] };
}

function syntaxProblem(file: string, text: string, lines: LineCounter, error: YAMLError): Problem {
  if (error.code === 'MULTIPLE_DOCS') return problemAt(file, lines, error.pos[0], { code: 'yaml.several-documents' });
  const hint = syntaxHint(error.code, text.split('\n')[lines.linePos(error.pos[0]).line - 1] ?? '');
  return problemAt(file, lines, error.pos[0], {
    code: 'yaml.syntax',
    found: shown(error.message.replace(/\s+/g, ' '), 120),
    ...(hint === undefined ? {} : { hint }),
  });
}

function keyProblem(file: string, lines: LineCounter, fault: KeyFault): Problem {
  const at = { path: fault.path, found: shown(fault.found) };
  if (fault.what === 'alias') return problemAt(file, lines, fault.offset, { ...at, code: 'yaml.alias' });
  if (fault.what === 'not-a-word') return problemAt(file, lines, fault.offset, { ...at, code: 'yaml.key-not-a-word' });
  const first = `line ${lines.linePos(fault.firstOffset ?? 0).line}`;
  return problemAt(file, lines, fault.offset, { ...at, found: first, code: 'yaml.repeated-key' });
}

function problemAt(
  file: string,
  lines: LineCounter,
  offset: number,
  rest: Pick<Problem, 'code'> & Partial<Problem>,
): Problem {
  const { line, col } = lines.linePos(offset);
  return { severity: 'error', file, line: Math.max(1, line), column: Math.max(1, col), ...rest };
}

/** One slip makes the parser stumble several times on its line; the first says what is wrong. */
function firstOfEachLine(problems: Problem[]): Problem[] {
  return problems.filter((p, i) => problems.findIndex((other) => other.line === p.line) === i);
}
