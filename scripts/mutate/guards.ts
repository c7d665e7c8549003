import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, posix } from 'node:path';

/** Tests that may notice a change in a file: those that import it by themselves, and those that reach it. */
export interface Guards {
  readonly near: readonly string[];
  readonly far: readonly string[];
}

/** Folders of tests that hold a room, beside its own. */
const FOR_ALL_ROOMS = ['tests/reference/', 'tests/laws/'];

/**
 * Finds the tests of a file by what they import.
 *
 * @param root folder of the project
 * @param file path of a file in `src`, with slashes
 */
export function guardsOf(root: string, file: string): Guards {
  const room = file.split('/')[1];
  const folders = [`tests/unit/${room}/`, ...FOR_ALL_ROOMS];
  const tests = typescriptIn(root, 'tests').filter(
    (path) => path.endsWith('.test.ts') && folders.some((folder) => path.startsWith(folder)),
  );
  const near = tests.filter((path) => importsOf(root, path).includes(file));
  const far = tests.filter((path) => !near.includes(path) && reaches(root, path, file));
  return { near, far };
}

/** Paths of all TypeScript files below a folder of the project, with slashes. */
export function typescriptIn(root: string, folder: string): string[] {
  const names = readdirSync(join(root, folder), { recursive: true, encoding: 'utf8' });
  return names
    .map((name) => posix.join(folder, name.replaceAll('\\', '/')))
    .filter((path) => path.endsWith('.ts') && !path.endsWith('.d.ts'))
    .sort();
}

function reaches(root: string, from: string, file: string): boolean {
  const seen = new Set<string>();
  const open = [from];
  for (let path = open.pop(); path !== undefined; path = open.pop()) {
    if (path === file) return true;
    if (seen.has(path)) continue;
    seen.add(path);
    open.push(...importsOf(root, path));
  }
  return false;
}

const imports = new Map<string, readonly string[]>();

/** Files of the project that a file imports; types alone do not count. */
function importsOf(root: string, path: string): readonly string[] {
  const known = imports.get(path);
  if (known !== undefined) return known;
  const text = readFileSync(join(root, path), 'utf8');
  const names = [...text.matchAll(/^(?:import|export)(?! type)\b[^;]*?from '(\.[^']+\.ts)'/gm)];
  const found = names.map(([, name = '']) => posix.join(dirname(path), name));
  imports.set(path, found);
  return found;
}
