import { dirname, join } from 'node:path';
import ts from 'typescript';
import { nodesOf, type ParsedFile, parse, root } from './houseFiles.ts';

/** An example of a doc block: `@example expression // value`. */
export interface Example {
  readonly place: string;
  readonly expression: string;
  /** As written, with what may follow it in words. */
  readonly value: string;
  /** Whether the expression names something that the file exports. */
  readonly callsOwn: boolean;
}

/** What became of an example. */
export type Checked =
  | 'needs prepared objects'
  | 'is told in words'
  | { readonly found: unknown; readonly agrees: boolean };

/** The examples of a file's doc blocks. */
export function examplesOf({ path, tree }: ParsedFile): Example[] {
  const own = new Set(tree.statements.flatMap(exportedNames));
  return tree.statements.flatMap((statement) =>
    ts
      .getJSDocTags(statement)
      .filter((tag) => tag.tagName.text === 'example')
      .map((tag) => {
        const line = (ts.getTextOfJSDocComment(tag.comment) ?? '').split('\n')[0] as string;
        const [expression = '', ...value] = line.split(' // ');
        const callsOwn = namesRead(parse('example.ts', `(${expression})`)).some((name) => own.has(name));
        return { place: path, expression: expression.trim(), value: value.join(' // ').trim(), callsOwn };
      }),
  );
}

function exportedNames(statement: ts.Statement): string[] {
  const modifiers = ts.canHaveModifiers(statement) ? ts.getModifiers(statement) : undefined;
  if (!modifiers?.some(({ kind }) => kind === ts.SyntaxKind.ExportKeyword)) return [];
  if (ts.isFunctionDeclaration(statement)) return statement.name === undefined ? [] : [statement.name.text];
  return ts.isVariableStatement(statement)
    ? statement.declarationList.declarations.map(({ name }) => name.getText())
    : [];
}

/** Evaluates an example with the exports of its module and of those that the module imports. */
export async function checkExample(example: Example, { path, tree }: ParsedFile): Promise<Checked> {
  const wanted = wantedOf(example.value);
  if (wanted === undefined) return 'is told in words';
  const scope = await scopeOf(path, tree);
  const code = parse('example.ts', `(${example.expression})`);
  const known = (name: string) => name in scope || name in globalThis;
  if (!namesRead(code).every(known)) return 'needs prepared objects';
  const evaluate = new Function(...Object.keys(scope), `return (${example.expression});`);
  const found: unknown = evaluate(...Object.values(scope));
  return { found, agrees: wanted(found) };
}

/** Names of values that a text reads from outside itself. */
export function namesRead(code: ts.SourceFile): string[] {
  const names = nodesOf(code).filter(ts.isIdentifier);
  const own = new Set(names.filter(({ parent }) => ts.isParameter(parent)).map((name) => name.text));
  return names
    .filter((name) => isRead(name))
    .map((name) => name.text)
    .filter((name) => !own.has(name));
}

/** Whether an identifier names a value, and is not the name of a property. */
function isRead(node: ts.Identifier): boolean {
  const { parent } = node;
  if (ts.isPropertyAccessExpression(parent)) return parent.expression === node;
  return ts.isPropertyAssignment(parent) ? parent.initializer === node : true;
}

async function scopeOf(path: string, tree: ts.SourceFile): Promise<Record<string, unknown>> {
  const imported = tree.statements
    .filter(ts.isImportDeclaration)
    .filter(({ importClause }) => importClause?.phaseModifier !== ts.SyntaxKind.TypeKeyword)
    .map(({ moduleSpecifier }) => (moduleSpecifier as ts.StringLiteral).text)
    .filter((name) => name.startsWith('.'));
  const files = [...imported.map((name) => join(dirname(path), name)), path];
  const modules = await Promise.all(files.map((file) => import(/* @vite-ignore */ join(root, file))));
  return Object.assign({}, ...modules) as Record<string, unknown>;
}

type Test = (found: unknown) => boolean;

/** How a written value is held against a found one; nothing where it is told in words only. */
function wantedOf(value: string): Test | undefined {
  if (/^\d[\d.]*(?:, \d[\d.]*)+$/.test(value)) return listTest(value.split(', '));
  const number = /^(?:[^'{[]*= )?([-−]?\d[\d_,]*(?:\.\d+)?)(…?)(?:$|[,:;] |,$)/.exec(`${value} `.replace(/ $/, ''));
  if (number !== null) return numberTest(number[1] as string, number[2] !== '');
  const literal = /^(true|false|undefined)\b/.exec(value)?.[1] ?? value;
  return /^(?:'.*'|\{.*\}|\[.*\]|true|false|undefined)$/.test(literal) ? literalTest(literal) : undefined;
}

/** A number is met to the digits written; one that ends in … begins with them. */
function numberTest(written: string, goesOn: boolean): Test {
  const plain = written.replaceAll('−', '-').replaceAll(/[_,]/g, '');
  const decimals = plain.split('.')[1]?.length ?? 0;
  const unit = 10 ** -decimals;
  return (found) => {
    if (typeof found !== 'number') return false;
    const rounding = Math.abs(found) * 1e-12;
    if (goesOn)
      return Math.abs(Math.trunc(found / unit + Math.sign(found) * rounding) * unit - Number(plain)) < unit / 2;
    return Math.abs(found - Number(plain)) <= unit / 2 + rounding;
  };
}

function listTest(written: readonly string[]): Test {
  const tests = written.map((number) => numberTest(number, false));
  return (found) =>
    (Array.isArray(found) || ArrayBuffer.isView(found)) &&
    tests.length === Array.from(found as Float64Array).length &&
    tests.every((test, i) => test((found as Float64Array)[i]));
}

function literalTest(literal: string): Test {
  const expected: unknown = new Function(`return (${literal})`)();
  return (found) => same(found, expected);
}

/** Equal in depth; a row of numbers is one whatever holds it, and what is found may be a frozen or a typed one. */
function same(found: unknown, expected: unknown): boolean {
  if (typeof expected === 'number') return numberTest(String(expected), false)(found);
  if (typeof expected !== 'object' || expected === null) return Object.is(found, expected);
  if (typeof found !== 'object' || found === null) return false;
  const keys = Object.keys(expected);
  if (keys.length !== Object.keys(found).length) return false;
  return keys.every((key) => same(Reflect.get(found, key), Reflect.get(expected, key)));
}
