import { existsSync } from 'node:fs';
import { basename, dirname, join, posix } from 'node:path';
import { describe, expect, it } from 'vitest';
import { commandTable } from '../../cli/commandTable.ts';
import { filesIn, root, textOf } from './houseFiles.ts';

const tree = filesIn();
const pages = tree.filter((path) => path.endsWith('.md') && !path.startsWith('scripts/'));
const names = new Set(tree.map((path) => basename(path)));
const { scripts } = JSON.parse(textOf('package.json')) as { readonly scripts: Readonly<Record<string, string>> };

/** Built or installed, so that they need not be there. */
const LATER = /^(?:dist|node_modules|coverage)(?:\/|$)/;
const ROOMS = /^(?:\.ci|bench|cli|data|docs|schemas|scripts|src|tests|web)\//;
/** Files that only a reader has: the examples of the formats and what commands of the examples write. */
const OF_THE_READER = /^(?:docs\/formats\.md)$/;

/** Passages in backticks on one line, fenced blocks left out. */
function inTicks(page: string): string[] {
  return [...withoutBlocks(page).matchAll(/`([^`\n]+)`/g)].map(([, passage = '']) => passage);
}

const withoutBlocks = (page: string) => textOf(page).replace(/^```[\s\S]*?^```/gm, '');

/** Whether a path with `*` and `<room>` in it names something: its part before them does. */
function isThere(path: string): boolean {
  const plain = path.replace(/\/$/, '');
  const open = plain.search(/[*<…]/);
  if (open < 0) return existsSync(join(root, plain));
  return existsSync(join(root, dirname(`${plain.slice(0, open)}x`)));
}

/** Paths that a page mentions and that lead nowhere. */
function deadPaths(page: string): string[] {
  return inTicks(page)
    .flatMap((passage) => passage.split(' '))
    .filter((word) => ROOMS.test(word) && /^[\w./*<>…-]+$/.test(word))
    .filter((word) => !LATER.test(word) && !isThere(word));
}

/** Names of files without their folder that no file has. */
function unknownFiles(page: string): string[] {
  if (OF_THE_READER.test(page)) return [];
  return inTicks(page).filter((word) => /^[\w.-]+\.(?:ts|mjs|cjs|md|json)$/.test(word) && !names.has(word));
}

/** Links of a page to other pages that lead nowhere. */
function deadLinks(page: string): string[] {
  return [...withoutBlocks(page).matchAll(/\]\(([^)\s]+)\)/g)]
    .map(([, target = '']) => target)
    .filter((target) => !/^(?:https?:|#)/.test(target))
    .filter((target) => !existsSync(join(root, posix.join(dirname(page), target.split('#')[0] as string))));
}

describe('the pages', () => {
  it('are all looked at', () => {
    expect(pages).toEqual(
      expect.arrayContaining(['README.md', 'DEVELOPERS.md', 'docs/architecture.md', 'docs/model.md']),
    );
    expect(pages.flatMap(inTicks).filter((word) => ROOMS.test(word)).length).toBeGreaterThan(60);
  });

  it.each(pages)('%s mentions only paths and files that are there', (page) => {
    expect([...deadPaths(page), ...unknownFiles(page)]).toEqual([]);
  });

  it.each(pages)('%s links only to what is there', (page) => {
    expect(deadLinks(page)).toEqual([]);
  });

  it.each(pages)('%s names only scripts that package.json has', (page) => {
    const asked = [...textOf(page).matchAll(/\bnpm (?:run )?([a-z]+)\b/g)].map(([, name = '']) => name);
    const ofNpm = new Set(['ci', 'install', 'run', 'version', 'test', 'init', 'audit', 'packages']);
    expect(asked.filter((name) => !ofNpm.has(name) && !Object.hasOwn(scripts, name))).toEqual([]);
  });
});

/** Lines and passages in which a page calls the program. */
function callsIn(page: string): string[] {
  const text = textOf(page);
  const blocks = [...text.matchAll(/^```\w*\n([\s\S]*?)^```/gm)].flatMap(([, block = '']) => block.split('\n'));
  const calls = [...blocks, ...inTicks(page)].flatMap((line) => /\bwinterledger ([^#|`]+.*)/.exec(line)?.[1] ?? []);
  return calls.map((call) => call.replace(/ #.*/, '').trim());
}

/** What a call has that the program does not: its command, or an option of it. */
function unknownIn(call: string): string[] {
  const [name = '', ...words] = call.replaceAll(/[[\]]/g, ' ').split(/\s+/);
  if (name === '…' || name.startsWith('--')) return /^--(?:help|version)$|^…$/.test(name) ? [] : [call];
  const command = commandTable.find((entry) => entry.name === name);
  if (command === undefined) return [call];
  const known = new Set(['--help', ...command.options.map((option) => `--${option.name}`)]);
  return words.filter((word) => word.startsWith('--') && !known.has(word)).map((word) => `${name} ${word}`);
}

describe('the commands that the pages show', () => {
  const calls = pages.flatMap(callsIn);

  it('exist, with their options', () => {
    expect(calls.length).toBeGreaterThanOrEqual(4);
    expect(calls.flatMap(unknownIn)).toEqual([]);
  });

  it('would be missed', () => {
    expect(unknownIn('simulate a.yaml --json -')).toEqual([]);
    expect(unknownIn('simulate a.yaml --jason -')).toEqual(['simulate --jason']);
    expect(unknownIn('simulated a.yaml')).toEqual(['simulated a.yaml']);
  });
});
