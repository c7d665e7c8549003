import { join } from 'node:path';
import ts from 'typescript';
import { beforeAll, describe, expect, it } from 'vitest';
import { root } from './houseFiles.ts';

// The third net of three: src is compiled without the types of node and of the browser. It would tear unseen as soon as the
// types of a library brought those of node with them, so it is tried with files that break it, among all of src.

const planted: Readonly<Record<string, string>> = {
  'src/core/plantedProcess.ts': 'export const home = process.env.HOME;\n',
  'src/core/plantedTimer.ts': 'setTimeout(() => undefined, 1);\n',
  'src/core/plantedDom.ts': 'export const title = document.title;\n',
  'src/core/plantedConsole.ts': "console.log('a');\n",
  'src/core/plantedFiles.ts': "export { readFileSync } from 'node:fs';\n",
  'src/core/plantedBuffer.ts': "export const bytes = Buffer.from('a');\n",
  'src/core/plantedClean.ts': 'export const half: number = 1 / 2;\n',
};

/** The program of src/tsconfig.json with some files more, which exist in memory only. */
function programOfSource(more: Readonly<Record<string, string>>): ts.Program {
  const path = join(root, 'src/tsconfig.json');
  const { config } = ts.readConfigFile(path, ts.sys.readFile);
  const { options, fileNames } = ts.parseJsonConfigFileContent(config, ts.sys, join(root, 'src'));
  const texts = new Map(Object.entries(more).map(([name, text]) => [join(root, name), text]));
  const host = ts.createCompilerHost(options);
  const { readFile, fileExists, getSourceFile } = host;
  host.readFile = (name) => texts.get(name) ?? readFile(name);
  host.fileExists = (name) => texts.has(name) || fileExists(name);
  host.getSourceFile = (name, ...rest) => {
    const text = texts.get(name);
    return text === undefined ? getSourceFile(name, ...rest) : ts.createSourceFile(name, text, ts.ScriptTarget.ES2023);
  };
  return ts.createProgram([...fileNames, ...texts.keys()], options, host);
}

describe('src compiled without the types of node and of the browser', () => {
  let program: ts.Program;
  const faultsOf = (name: string) => {
    const file = program.getSourceFile(join(root, name));
    if (file === undefined) throw new Error(`${name} is not part of it`);
    return program
      .getSemanticDiagnostics(file)
      .map(({ messageText }) => ts.flattenDiagnosticMessageText(messageText, ' '));
  };

  beforeAll(() => {
    program = programOfSource(planted);
  });

  it('is all of src', () => {
    const ours = program.getSourceFiles().filter(({ fileName }) => fileName.startsWith(join(root, 'src/')));
    expect(ours.length).toBeGreaterThan(250);
  });

  it.each([
    ['src/core/plantedProcess.ts', 'process'],
    ['src/core/plantedTimer.ts', 'setTimeout'],
    ['src/core/plantedDom.ts', 'document'],
    ['src/core/plantedConsole.ts', 'console'],
    ['src/core/plantedFiles.ts', 'node:fs'],
    ['src/core/plantedBuffer.ts', 'Buffer'],
  ])('%s is refused for its %s', (name, word) => {
    const faults = faultsOf(name);
    expect(faults).toHaveLength(1);
    expect(faults[0]).toMatch(new RegExp(`Cannot find (?:name|module).*${word}`));
  });

  it('takes a file that knows nothing of them', () => {
    expect(faultsOf('src/core/plantedClean.ts')).toEqual([]);
  });
});
