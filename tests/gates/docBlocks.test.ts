import ts from 'typescript';
import { describe, expect, it } from 'vitest';
import { type Checked, checkExample, type Example, examplesOf } from './docExamples.ts';
import { nodesOf, parse, parsedFiles, placeOf } from './houseFiles.ts';

/** Examples that stand by themselves; there may be more, not fewer. */
const EVALUATED = 85;

const files = parsedFiles('src');

/** Exported functions of a file: declared, or an arrow kept in a constant. */
function exportedFunctions(tree: ts.SourceFile): ts.Statement[] {
  return tree.statements.filter((statement) => {
    const modifiers = ts.canHaveModifiers(statement) ? ts.getModifiers(statement) : undefined;
    if (!modifiers?.some(({ kind }) => kind === ts.SyntaxKind.ExportKeyword)) return false;
    if (ts.isFunctionDeclaration(statement)) return true;
    if (!ts.isVariableStatement(statement)) return false;
    return statement.declarationList.declarations.some(
      ({ initializer }) =>
        initializer !== undefined && (ts.isArrowFunction(initializer) || ts.isFunctionExpression(initializer)),
    );
  });
}

const functions = files.flatMap((file) => exportedFunctions(file.tree).map((statement) => ({ file, statement })));

/** The first sentence of a statement's doc block; empty without one. */
function firstSentence(statement: ts.Statement): string {
  const block = ts.getJSDocCommentsAndTags(statement).find(ts.isJSDoc);
  return (ts.getTextOfJSDocComment(block?.comment) ?? '').trim();
}

describe('the doc blocks of exported functions', () => {
  it('are looked for in all of src', () => {
    expect(functions.length).toBeGreaterThan(400);
  });

  it('say what each function is for', () => {
    const silent = functions.filter(({ statement }) => firstSentence(statement).length < 10);
    expect(silent.map(({ file, statement }) => placeOf(file, statement))).toEqual([]);
  });

  it('name no parameter that is not there', () => {
    const strangers = functions.flatMap(({ file, statement }) => {
      const written = ts
        .getJSDocTags(statement)
        .filter(ts.isJSDocParameterTag)
        .map(({ name }) => name.getText().split('.')[0] as string);
      const taken = new Set(
        nodesOf(statement)
          .filter(ts.isParameter)
          .filter(({ parent }) => parent === statement || ts.isArrowFunction(parent))
          .flatMap((parameter) =>
            nodesOf(parameter.name)
              .filter(ts.isIdentifier)
              .map((name) => name.text),
          ),
      );
      const takesParts = nodesOf(statement).some((node) => ts.isParameter(node) && !ts.isIdentifier(node.name));
      return takesParts
        ? []
        : written.filter((name) => !taken.has(name)).map((name) => `${placeOf(file, statement)} ${name}`);
    });
    expect(strangers).toEqual([]);
  });
});

const judged: { readonly example: Example; readonly checked: Checked }[] = [];
for (const file of files) {
  for (const example of examplesOf(file)) judged.push({ example, checked: await checkExample(example, file) });
}

describe('the examples of doc blocks', () => {
  const evaluated = judged.flatMap(({ example, checked }) =>
    typeof checked === 'string' ? [] : [{ example, ...checked }],
  );

  it('have the values that they show, to the digits that they show', () => {
    const wrong = evaluated.filter(({ agrees }) => !agrees);
    expect(wrong.map(({ example, found }) => `${textOfExample(example)}, but is ${JSON.stringify(found)}`)).toEqual([]);
  });

  // Those that need a prepared weather, tariff or house stay with the tests of their files.
  it('are evaluated wherever they stand by themselves', () => {
    expect(evaluated.length).toBeGreaterThanOrEqual(EVALUATED);
  });

  it('call something of their own file, and show its value', () => {
    const strange = judged.filter(({ example }) => example.value === '' || !example.callsOwn);
    expect(strange.map(({ example }) => textOfExample(example))).toEqual([]);
  });
});

const textOfExample = ({ place, expression, value }: Example) => `${place}: ${expression} // ${value}`;

describe('the reading of examples', () => {
  const judge = async (line: string) => {
    const text = `/** Half. @example ${line} */\nexport const half = (x) => x / 2;`;
    const file = { path: 'src/core/sum.ts', text, tree: parse('src/core/sum.ts', text) };
    const [example] = examplesOf(file);
    return checkExample(example!, file);
  };

  it.each([
    ['compensatedSum([2 / 3]) // 0.667', true],
    ['compensatedSum([2 / 3]) // 0.666', false],
    ['compensatedSum([2 / 3]) // 2/3 = 0.666…', true],
    ['compensatedSum([2 / 3]) // 0.667…', false],
    ['compensatedSum([-2 / 3]) // −0.667', true],
    ['compensatedSum([12500]) // 12,500', true],
    ['compensatedSum([12500]) // 12_501', false],
    ['compensatedSum([4]) // 4: four', true],
    ['[compensatedSum([1]), 2] // [1, 2]', true],
    ['[compensatedSum([1]), 2] // 1, 2', true],
    ['[compensatedSum([1]), 2] // 1, 3', false],
    ['({ a: compensatedSum([1]) }) // { a: 2 }', false],
    ["String(compensatedSum([1])) // '1'", true],
    ['compensatedSum([1]) === 1 // false', false],
    ['[1].map((x) => compensatedSum([x])) // [1]', true],
  ])('%s agrees: %s', async (line, agrees) => {
    expect(await judge(line)).toMatchObject({ agrees });
  });

  it('leaves to other tests what it cannot evaluate', async () => {
    expect(await judge('compensatedSum(column) // 3')).toBe('needs prepared objects');
    expect(await judge('compensatedSum([1]) // one kilowatt-hour')).toBe('is told in words');
  });
});
