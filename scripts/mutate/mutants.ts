import ts from 'typescript';

/** One change of one place in a file of source that breaks what it does. */
export interface Mutant {
  /** Path in the project, with slashes. */
  readonly file: string;
  /** Both counted from 1. */
  readonly line: number;
  readonly column: number;
  readonly from: number;
  readonly to: number;
  /** What stands there, and what is put there instead. */
  readonly was: string;
  readonly becomes: string;
  /** The line as it stands, without its indent. */
  readonly text: string;
}

const operators: Readonly<Record<string, string>> = {
  '+': '-',
  '-': '+',
  '*': '/',
  '/': '*',
  '%': '*',
  '<': '<=',
  '<=': '<',
  '>': '>=',
  '>=': '>',
  '===': '!==',
  '!==': '===',
  '&&': '||',
  '||': '&&',
  '&': '|',
  '|': '&',
  '+=': '-=',
  '-=': '+=',
  '*=': '/=',
  '/=': '*=',
  '|=': '&=',
  '++': '--',
  '--': '++',
};

const names: Readonly<Record<string, string>> = {
  min: 'max',
  max: 'min',
  floor: 'ceil',
  ceil: 'floor',
  round: 'trunc',
};

/** Calls that only make a message for people: their text is no figure of a result. */
const OF_MESSAGES = new Set(['toFixed', 'toPrecision', 'padStart', 'padEnd', 'shown']);

/**
 * All changes that can be made in a file: operators, bounds, constants, conditions. Comments, types, imports, texts and
 * messages stay as they are.
 *
 * @param file path in the project
 * @param text of the file
 */
export function mutantsOf(file: string, text: string): Mutant[] {
  const tree = ts.createSourceFile(file, text, ts.ScriptTarget.ES2023, true);
  const found: Mutant[] = [];
  const add = (node: { getStart(): number; end: number }, becomes: string): void => {
    const from = node.getStart();
    const { line: index, character } = tree.getLineAndCharacterOfPosition(from);
    const line = index + 1;
    const column = character + 1;
    const whole = text.split('\n')[line - 1] ?? '';
    found.push({
      file,
      line,
      column,
      from,
      to: node.end,
      was: text.slice(from, node.end),
      becomes,
      text: whole.trim(),
    });
  };
  const visit = (node: ts.Node): void => {
    if (isNoCode(node)) return;
    const change = changeOf(node);
    if (change !== undefined) add(change.at, change.becomes);
    ts.forEachChild(node, visit);
  };
  ts.forEachChild(tree, visit);
  return found;
}

function isNoCode(node: ts.Node): boolean {
  if (ts.isTypeNode(node) || ts.isImportDeclaration(node) || ts.isExportDeclaration(node)) return true;
  if (ts.isInterfaceDeclaration(node) || ts.isTypeAliasDeclaration(node)) return true;
  if (ts.isThrowStatement(node)) return true;
  return ts.isCallExpression(node) && OF_MESSAGES.has(calledName(node.expression));
}

function calledName(callee: ts.Expression): string {
  return ts.isPropertyAccessExpression(callee) ? callee.name.text : callee.getText();
}

function changeOf(node: ts.Node): { at: ts.Node; becomes: string } | undefined {
  if (ts.isBinaryExpression(node)) return swapped(node.operatorToken, operators);
  if (ts.isPostfixUnaryExpression(node) && ts.isExpressionStatement(node.parent)) {
    return {
      at: node,
      becomes: `${node.operand.getText()} ${node.operator === ts.SyntaxKind.PlusPlusToken ? '-' : '+'}= 1`,
    };
  }
  if (ts.isPrefixUnaryExpression(node)) return unary(node);
  if (ts.isNumericLiteral(node)) return { at: node, becomes: otherNumber(node) };
  if (node.kind === ts.SyntaxKind.TrueKeyword) return { at: node, becomes: 'false' };
  if (node.kind === ts.SyntaxKind.FalseKeyword) return { at: node, becomes: 'true' };
  if (ts.isPropertyAccessExpression(node) && node.expression.getText() === 'Math') return swapped(node.name, names);
  if (isBareCondition(node)) return { at: node, becomes: `!(${node.getText()})` };
  return undefined;
}

function swapped(
  token: ts.Node,
  pairs: Readonly<Record<string, string>>,
): { at: ts.Node; becomes: string } | undefined {
  const word = token.getText();
  return Object.hasOwn(pairs, word) ? { at: token, becomes: pairs[word] ?? word } : undefined;
}

function unary(node: ts.PrefixUnaryExpression): { at: ts.Node; becomes: string } | undefined {
  const isSign = node.operator === ts.SyntaxKind.MinusToken || node.operator === ts.SyntaxKind.ExclamationToken;
  return isSign ? { at: node, becomes: ` ${node.operand.getText()}` } : undefined;
}

/** A number that lies near enough to stay plausible, and far enough to matter. */
function otherNumber(node: ts.NumericLiteral): string {
  const value = Number(node.text);
  if (Number.isInteger(value) && value < 100) return String(value + 1);
  return String(Number((value * 1.01).toPrecision(12)));
}

/** A condition that is a name or a call: it has no operator of its own to be broken. */
function isBareCondition(node: ts.Node): boolean {
  const { parent } = node;
  const asked = ts.isIfStatement(parent)
    ? parent.expression
    : ts.isConditionalExpression(parent)
      ? parent.condition
      : undefined;
  return asked === node && (ts.isIdentifier(node) || ts.isCallExpression(node) || ts.isPropertyAccessExpression(node));
}
