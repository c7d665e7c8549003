import { readdirSync, readFileSync } from 'node:fs';
import { join, relative, sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import ts from 'typescript';

/** The folder that holds everything. */
export const root = fileURLToPath(new URL('../../', import.meta.url));

const notOurs = new Set(['node_modules', 'dist', '.git', 'coverage']);

/** Paths of all files below a folder, from the root, with `/`; installed and built ones left out. */
export function filesIn(folder = '.'): string[] {
  const entries = readdirSync(join(root, folder), { withFileTypes: true });
  return entries.flatMap((entry) => {
    if (notOurs.has(entry.name)) return [];
    const path = join(folder, entry.name);
    if (entry.isDirectory()) return filesIn(path);
    return entry.isFile() ? [path.split(sep).join('/')] : [];
  });
}

/** Text of a file. */
export function textOf(path: string): string {
  return readFileSync(join(root, path), 'utf8');
}

/** A file of the product, parsed. */
export interface ParsedFile {
  readonly path: string;
  readonly text: string;
  readonly tree: ts.SourceFile;
}

/** Every TypeScript file of the given folders, parsed with parents. */
export function parsedFiles(...folders: string[]): ParsedFile[] {
  return folders
    .flatMap((folder) => filesIn(folder))
    .filter((path) => path.endsWith('.ts') && !path.endsWith('.d.ts'))
    .map((path) => {
      const text = textOf(path);
      return { path, text, tree: parse(path, text) };
    });
}

/** A text as TypeScript, with parents. */
export function parse(path: string, text: string): ts.SourceFile {
  return ts.createSourceFile(path, text, ts.ScriptTarget.ES2023, true);
}

/** All nodes below one, itself first. */
export function nodesOf(node: ts.Node): ts.Node[] {
  const list = [node];
  ts.forEachChild(node, (child) => {
    list.push(...nodesOf(child));
  });
  return list;
}

/** `src/sim/year.ts:12` of a node. */
export function placeOf({ path, tree }: Pick<ParsedFile, 'path' | 'tree'>, node: ts.Node): string {
  return `${relative('.', path)}:${tree.getLineAndCharacterOfPosition(node.getStart(tree)).line + 1}`;
}
