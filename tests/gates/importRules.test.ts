import { execFile } from 'node:child_process';
import { cpSync, mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { root, textOf } from './houseFiles.ts';

// A tool that resolves nothing finds no fault either, so the rules are also tried on files that break every one of them.

interface Cruise {
  readonly modules: readonly { readonly source: string; readonly dependencies: readonly unknown[] }[];
  readonly summary: {
    readonly violations: readonly {
      readonly from: string;
      readonly to: string;
      readonly rule: { readonly name: string };
    }[];
  };
}

/** Runs the import rules as `npm run lint` does, in a folder. */
async function cruise(folder: string): Promise<Cruise> {
  const tool = join(root, 'node_modules/dependency-cruiser/bin/dependency-cruise.mjs');
  const options = ['--config', '.dependency-cruiser.cjs', '--output-type', 'json', 'src', 'cli'];
  const ran = promisify(execFile)(process.execPath, [tool, ...options], { cwd: folder, maxBuffer: 64 * 1024 * 1024 });
  // the tool ends with the number of faults, which is what the planted files are for
  const { stdout } = await ran.catch((fault: { readonly stdout: string }) => fault);
  return JSON.parse(stdout) as Cruise;
}

/** Rooms and what each may import, as the page of the architecture says. */
function roomsOfThePage(): Map<string, readonly string[]> {
  const rooms = new Map<string, readonly string[]>();
  for (const [, room = '', may = ''] of textOf('docs/architecture.md').matchAll(
    /^\| `src\/(\w+)` \|.*\| ([^|]+) \|$/gm,
  )) {
    if (may === 'nothing of ours') rooms.set(room, []);
    else if (may === 'all above') rooms.set(room, [...rooms.keys()]);
    else rooms.set(room, may.split(', '));
  }
  return rooms;
}

const rooms = roomsOfThePage();
const forbidden = [...rooms].flatMap(([room, allowed]) =>
  [...rooms.keys()].filter((other) => other !== room && !allowed.includes(other)).map((other) => ({ room, other })),
);

/** Files that break the rules, each by one import. */
const planted: Record<string, string> = {
  'cli/main.ts': "import 'vitest';\nexport const main = 1;\n",
  'src/core/pure.ts': "import 'node:fs';\n",
  'src/core/edge.ts': "import '../../cli/main.ts';\n",
  'src/core/chicken.ts': "export { egg as chicken } from './egg.ts';\n",
  'src/core/egg.ts': "export { chicken as egg } from './chicken.ts';\n",
  ...Object.fromEntries([...rooms.keys()].map((room) => [`src/${room}/index.ts`, `export const ${room} = 1;\n`])),
  ...Object.fromEntries(
    forbidden.map(({ room, other }) => [`src/${room}/of-${other}.ts`, `import '../${other}/index.ts';\n`]),
  ),
};

describe('the import rules', () => {
  const folder = mkdtempSync(join(tmpdir(), 'import-rules-'));
  let ours: Cruise;
  let broken: Cruise;

  beforeAll(async () => {
    for (const [path, text] of Object.entries(planted)) {
      mkdirSync(join(folder, dirname(path)), { recursive: true });
      writeFileSync(join(folder, path), text);
    }
    for (const path of ['.dependency-cruiser.cjs', 'package.json', 'tsconfig.json'])
      cpSync(join(root, path), join(folder, path));
    symlinkSync(join(root, 'node_modules'), join(folder, 'node_modules'), 'dir');
    [ours, broken] = await Promise.all([cruise(root), cruise(folder)]);
  });

  afterAll(() => rmSync(folder, { recursive: true }));

  it('see the modules of the product and what they import', () => {
    const own = ours.modules.filter(({ source }) => /^(?:src|cli)\//.test(source));
    expect(own.length).toBeGreaterThan(250);
    expect(own.reduce((sum, { dependencies }) => sum + dependencies.length, 0)).toBeGreaterThan(700);
  });

  it('find no fault in them', () => {
    expect(ours.summary.violations.map(({ rule, from, to }) => `${rule.name}: ${from} → ${to}`)).toEqual([]);
  });

  it('are those of the architecture: every import that its table does not allow is found, and no other', () => {
    expect(rooms.size).toBeGreaterThanOrEqual(7);
    const pairs = broken.summary.violations
      .filter(({ rule }) => /^src-\w+-imports$/.test(rule.name))
      .map(({ rule, from, to }) => `${rule.name}: ${from} → ${to}`);
    const expected = forbidden.map(
      ({ room, other }) => `src-${room}-imports: src/${room}/of-${other}.ts → src/${other}/index.ts`,
    );
    expect(expected.length).toBeGreaterThanOrEqual(24);
    expect(pairs.sort()).toEqual(expected.sort());
  });

  it.each([
    ['no-cycles', 'src/core/chicken.ts'],
    ['src-is-pure', 'src/core/pure.ts'],
    ['src-knows-no-edge', 'src/core/edge.ts'],
    ['no-dev-in-product', 'cli/main.ts'],
  ])('%s is found where it is broken', (name, from) => {
    const found = broken.summary.violations.filter(({ rule }) => rule.name === name);
    expect(found.map((violation) => violation.from)).toContain(from);
  });
});
