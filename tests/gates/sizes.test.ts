import ts from 'typescript';
import { describe, expect, it } from 'vitest';
import { nodesOf, type ParsedFile, parse, parsedFiles } from './houseFiles.ts';

const FILE_LINES = 300;
const FUNCTION_LINES = 60;
const PARAMETERS = 4;
const NESTING = 3;

/**
 * Functions of the hourly loop: an object of parameters a call would be made 8760 times a year and more, so they take their
 * columns and figures one by one.
 */
const kernels: Readonly<Record<string, string>> = {
  'src/sim/backup.ts carryByBoiler': 'one hour of a hybrid',
  'src/sim/heatPumpMap.ts readMap': 'reads the map once an hour and flow; writes where it is told',
  'src/sim/hotWater.ts heatHotWater': 'one hour of the cylinder',
  'src/sim/hotWater.ts reheatWhereDue': 'one hour of the cylinder',
  'src/sim/hotWater.ts reheat': 'one hour of the cylinder',
  'src/sim/levels.ts readLevels': 'both levels of an hour',
  'src/sim/levels.ts readFrostFree': 'both levels of an hour',
  'src/sim/mapOnWeather.ts readHour': 'reads the map once an hour and flow; writes where it is told',
  'src/sim/roomWithMass.ts needOfRoom': 'one hour of the house with mass',
  'src/sim/roomWithMass.ts advanceRoom': 'one hour of the house with mass',
  'src/sim/spaceHeat.ts setFlow': 'one hour of the rooms',
  'src/sim/spaceHeat.ts giveSpaceHeat': 'one hour of the rooms',
  'src/sim/spaceHeat.ts leftWaiting': 'one hour of the rooms',
  'src/sim/spaceHeat.ts runAt': 'one hour of the rooms',
  'src/sim/roomsByStages.ts heatHour': 'one hour of the rooms',
  'src/sim/roomsByStages.ts runRoomsByStages': 'some hours of the rooms: which, and from what state',
  'src/sim/roomsKernel.ts runRooms': 'some hours of the rooms: which, and from what state',
  'src/sim/waterKernel.ts runHotWater': 'some hours of the cylinder: which',
};

/** Functions that are long because parting them costs speed that was measured; what they do stands in short ones beside them. */
const long: Readonly<Record<string, string>> = {
  'src/sim/roomsKernel.ts runRooms':
    'all stages of an hour in one loop, three times as fast; tests hold it to the stages, bit by bit',
};

/** Functions whose nesting says the matter better than a flat form would. */
const nested: Readonly<Record<string, string>> = {
  'src/sim/roomsKernel.ts runRooms': 'all stages of an hour in one loop',
  'src/scenario/readings/meterPeriods.ts meterPeriods': 'the running sum of a chain is carried from row to row',
};

type WithBody = ts.FunctionLikeDeclaration & { readonly body: ts.Node };

interface Measured {
  readonly name: string;
  readonly lines: number;
  readonly parameters: number;
  readonly nesting: number;
}

function functionsOf({ path, tree }: Pick<ParsedFile, 'path' | 'tree'>): Measured[] {
  return nodesOf(tree)
    .filter((node): node is WithBody => ts.isFunctionLike(node) && 'body' in node && node.body !== undefined)
    .map((node) => ({
      name: `${path} ${nameOf(node)}`,
      lines: lineOf(tree, node.end) - lineOf(tree, node.getStart(tree)) + 1,
      parameters: node.parameters.length,
      nesting: nestingOf(node.body),
    }));
}

const lineOf = (tree: ts.SourceFile, position: number) => tree.getLineAndCharacterOfPosition(position).line;

function nameOf(node: WithBody): string {
  if (node.name !== undefined) return node.name.getText();
  return ts.isVariableDeclaration(node.parent) ? node.parent.name.getText() : 'a function without a name';
}

/** How deep conditions, loops, switches and catches stand in one another; a chain of else-ifs is one; functions inside count by themselves. */
function nestingOf(node: ts.Node): number {
  let deepest = 0;
  ts.forEachChild(node, (child) => {
    if (ts.isFunctionLike(child)) return;
    deepest = Math.max(deepest, nestingOf(child) + (nests(child) ? 1 : 0));
  });
  return deepest;
}

function nests(node: ts.Node): boolean {
  if (ts.isIfStatement(node)) return !(ts.isIfStatement(node.parent) && node.parent.elseStatement === node);
  return ts.isIterationStatement(node, false) || ts.isSwitchStatement(node) || ts.isTryStatement(node);
}

const files = parsedFiles('src', 'cli');
const functions = files.flatMap(functionsOf);

describe('the sizes of the product', () => {
  it('are measured on all of it', () => {
    expect(files.length).toBeGreaterThan(250);
    expect(functions.length).toBeGreaterThan(1000);
  });

  it(`no file is longer than ${FILE_LINES} lines`, () => {
    const lines = ({ text }: ParsedFile) => text.split('\n').length - 1;
    expect(files.filter((file) => lines(file) > FILE_LINES).map((file) => `${file.path} ${lines(file)}`)).toEqual([]);
  });

  it(`no function is longer than ${FUNCTION_LINES} lines, but where it is argued`, () => {
    const over = functions.filter(({ lines }) => lines > FUNCTION_LINES);
    expect(over.filter(({ name }) => !Object.hasOwn(long, name))).toEqual([]);
  });

  it(`no function takes more than ${PARAMETERS} parameters, but the kernels of the hourly loop`, () => {
    const many = functions.filter(({ parameters }) => parameters > PARAMETERS).map(({ name }) => name);
    expect(many.filter((name) => !Object.hasOwn(kernels, name))).toEqual([]);
  });

  it(`nothing stands more than ${NESTING} deep, but where it is argued`, () => {
    const deep = functions.filter(({ nesting }) => nesting > NESTING).map(({ name }) => name);
    expect(deep.filter((name) => !Object.hasOwn(nested, name))).toEqual([]);
  });

  it('no exception outlives its reason', () => {
    const exceptions = [
      { list: long, holds: ({ lines }: Measured) => lines > FUNCTION_LINES },
      { list: kernels, holds: ({ parameters }: Measured) => parameters > PARAMETERS },
      { list: nested, holds: ({ nesting }: Measured) => nesting > NESTING },
    ];
    for (const { list, holds } of exceptions) {
      const needed = new Set(functions.filter(holds).map(({ name }) => name));
      expect(Object.keys(list).filter((name) => !needed.has(name))).toEqual([]);
    }
  });
});

describe('the measure itself', () => {
  const measured = (text: string) => functionsOf({ path: 'x.ts', tree: parse('x.ts', text) });

  it('counts lines, parameters and depth', () => {
    const text = `function f(a, b, c, d, e) {
      for (const x of a) {
        if (b) { while (c) { d(); } } else if (c) { e(); } else { f(); }
      }
    }`;
    expect(measured(text)).toEqual([{ name: 'x.ts f', lines: 5, parameters: 5, nesting: 3 }]);
  });

  it('sees arrow functions, methods and functions within functions', () => {
    const text =
      'const g = (a) => { if (a) return () => { if (a) { for (;;) a(); } }; };\nclass C { m(a, b) { return a; } }';
    expect(measured(text).map(({ name, nesting }) => [name, nesting])).toEqual([
      ['x.ts g', 1],
      ['x.ts a function without a name', 2],
      ['x.ts m', 0],
    ]);
  });
});
