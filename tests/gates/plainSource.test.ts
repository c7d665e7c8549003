import ts from 'typescript';
import { describe, expect, it } from 'vitest';
import { filesIn, nodesOf, parse, parsedFiles, placeOf, textOf } from './houseFiles.ts';

// What the linter holds (any, non-null marks, ts-ignore, unused things) is not held twice.

/** Marks that no file may hold, with why; the patterns are written so that they do not find themselves. */
const forbidden: readonly { readonly pattern: RegExp; readonly why: string }[] = [
  { pattern: /(?<![\w.])\/(?:work|root|home|Users|tmp|mnt)\//, why: 'a place on one machine' },
  { pattern: /\b[A-Z]:\\{1,2}[A-Za-z]/, why: 'a place on one machine' },
  { pattern: /\bregistry\.[a-z]|npm[j]s\.|\bpypi\.[a-z]|proxy\.golang/, why: 'the address of a registry' },
  { pattern: /\b(?:TO[D]O|FIX[M]E|HA[C]K)\b/, why: 'a job left undone' },
];

const kindsOfText = /\.(?:ts|mjs|cjs|js|json|md|ya?ml|html|css|txt|sh)$|^[^.]*$|^\.[^/]*$|\.ci\//;
/** Rows of numbers, and what npm writes. */
const leftOut = /\.csv$|(?:^|\/)package-lock\.json$/;

const texts = filesIn().filter((path) => kindsOfText.test(path) && !leftOut.test(path));

/** What of the forbidden a text holds, with its line. */
function found(path: string, text: string): string[] {
  return text
    .split('\n')
    .flatMap((line, i) =>
      forbidden.filter(({ pattern }) => pattern.test(line)).map(({ why }) => `${path}:${i + 1} ${why}: ${line.trim()}`),
    );
}

describe('the files of the house', () => {
  it('hold no place of one machine, no registry, and no job left undone', () => {
    expect(texts.length).toBeGreaterThan(400);
    expect(texts).toEqual(expect.arrayContaining(['README.md', 'LICENSE', '.npmrc', '.ci/run', 'src/sim/year.ts']));
    expect(texts.flatMap((path) => found(path, textOf(path)))).toEqual([]);
  });

  it.each([
    ['a place on one machine', `see ${'/wo'}rk/main`],
    ['a place on one machine', `'${'/ro'}ot/x'`],
    ['a place on one machine', `C${':\\'}Users`],
    ['the address of a registry', `https://registry${'.'}example.org`],
    ['a job left undone', `// TO${'DO'}: later`],
  ])('%s would be seen', (why, line) => {
    expect(found('x', line)).toEqual([`x:1 ${why}: ${line}`]);
  });

  it.each(['docs/work/plan.md', 'a/tmp/b', 'https://example.org/home/'])('%s is no place on a machine', (line) => {
    expect(found('x', line)).toEqual([]);
  });
});

/** Names of calls by which a test is left out; a focused one is seen by the linter. */
const LEAVING_OUT = /^(?:x(?:it|test|describe)|\w[\w.]*\.(?:skip|todo|skipIf|runIf|fails))\b/;

/** What exists on one system only is tried there; the runner of the project counts what did not run. */
const BY_SYSTEM = /^\w+\.(?:runIf|skipIf)\(process\.platform\b/;

/** Calls in a file of tests that leave tests out. */
function leavingOut(tree: ts.SourceFile): ts.Node[] {
  return nodesOf(tree).filter(
    (node) =>
      ts.isCallExpression(node) &&
      /^(?:it|test|describe|suite|x)/.test(node.expression.getText(tree)) &&
      LEAVING_OUT.test(node.expression.getText(tree)) &&
      !BY_SYSTEM.test(node.getText(tree)),
  );
}

describe('the tests', () => {
  const files = parsedFiles('tests');

  it('all run: none is skipped, put off, or expected to fail', () => {
    expect(files.length).toBeGreaterThan(100);
    expect(files.flatMap((file) => leavingOut(file.tree).map((node) => placeOf(file, node)))).toEqual([]);
  });

  it.each(
    ['test.skip("a", f)', 'describe.skip("a", f)', 'it.todo("a")', 'xit("a", f)'].concat([
      'it.skipIf(true)("a", f)',
      'test.runIf(x)("a", f)',
      'it.fails("a", f)',
      'describe.skip.each([1])("a", f)',
    ]),
  )('%s would be seen', (text) => {
    expect(leavingOut(parse('x.ts', text)).length).toBeGreaterThan(0);
  });

  it('may be bound to a system', () => {
    expect(leavingOut(parse('x.ts', "it.runIf(process.platform === 'linux')('a', f)"))).toEqual([]);
  });
});

/** `value as unknown as Type`, `value as never`: what would silence the type checker. */
function silencing(tree: ts.SourceFile): ts.Node[] {
  return nodesOf(tree).filter((node) => {
    if (!ts.isAssertionExpression(node)) return false;
    let inner = node.expression;
    while (ts.isParenthesizedExpression(inner)) inner = inner.expression;
    return ts.isAssertionExpression(inner) || node.type.kind === ts.SyntaxKind.NeverKeyword;
  });
}

describe('the product', () => {
  const files = parsedFiles('src', 'cli');

  it('casts no type by way of another', () => {
    expect(files.flatMap((file) => silencing(file.tree).map((node) => placeOf(file, node)))).toEqual([]);
  });

  it('switches no check of types off', () => {
    const off = new RegExp(['@ts-(?:ig', 'nore|no', 'check|expect-', 'error)'].join(''));
    expect(files.filter(({ text }) => off.test(text)).map(({ path }) => path)).toEqual([]);
  });

  it.each(['x as unknown as T', 'x as never', '(x as object) as T'])('%s would be seen', (text) => {
    expect(silencing(parse('x.ts', text)).length).toBe(1);
  });

  it('narrows a type as it likes', () => {
    expect(silencing(parse('x.ts', 'x as number; [1, 2] as const;'))).toEqual([]);
  });
});
