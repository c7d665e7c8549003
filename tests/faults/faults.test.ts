import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { appendFileSync, readFileSync, statSync, truncateSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { DiskSource } from '../../cli/diskSource.ts';
import { documentText } from '../../src/report/documentText.ts';
import { resultDocument } from '../../src/report/resultDocument.ts';
import type { ResultDocument } from '../../src/report/resultSchema.ts';
import { makeAnswer } from '../../src/scenario/answer/makeAnswer.ts';
import type { FileSource } from '../../src/scenario/fileSource.ts';
import { loadScenario } from '../../src/scenario/loadScenario.ts';
import { type Ended, folderWithDemo, namesIn, run, STACK_LINE, start } from '../cli/program.ts';
import { readOnlyFolder, smallDisk } from './smallDisk.ts';

const folder = folderWithDemo();
const main = fileURLToPath(new URL('../../dist/main.js', import.meta.url));
const house = 'data/demo/house.yaml';
const passing = (names: readonly string[]) => names.filter((name) => name.endsWith('.tmp'));

/** Runs a line of bash; the program is called by `winterledger`. */
function shell(line: string): Promise<Ended> {
  const script = `winterledger() { "${process.execPath}" "${main}" "$@"; }\n${line}`;
  const child = spawn('bash', ['-o', 'pipefail', '-c', script], { cwd: folder, stdio: ['ignore', 'pipe', 'pipe'] });
  const said = { stdout: '', stderr: '' };
  for (const stream of ['stdout', 'stderr'] as const) {
    child[stream].setEncoding('utf8').on('data', (piece: string) => {
      said[stream] += piece;
    });
  }
  return new Promise((resolve) => child.on('close', (code, signal) => resolve({ code, signal, ...said })));
}

describe('a disk that takes no more', () => {
  it('is told with exit code 3 where a file may not grow, and what was there before is there still', async () => {
    writeFileSync(join(folder, 'hours.csv'), 'old\n');
    // in blocks of 1024 bytes: the hourly file has 1.8 MB
    const { code, stdout, stderr } = await shell(`ulimit -f 200; winterledger simulate ${house} --hourly hours.csv`);
    expect({ code, stdout }).toEqual({ code: 3, stdout: '' });
    expect(stderr).toMatch(/^hours\.csv {2}the file cannot be written: the file would be too large for this disk\n/);
    expect(stderr).not.toMatch(STACK_LINE);
    expect(readFileSync(join(folder, 'hours.csv'), 'utf8')).toBe('old\n');
    expect(passing(namesIn(folder))).toEqual([]);
  });

  it('is told the same way where it is full, and nothing half-written stays on it', async () => {
    const disk = smallDisk(folder);
    // where no disk may be mounted the limit of a file stands for it
    const at = disk?.path ?? folder;
    const limit = disk === undefined ? 'ulimit -f 200; ' : '';
    const { code, stdout, stderr } = await shell(
      `${limit}winterledger simulate ${house} --json "${at}/result.json" --hourly "${at}/all.csv"`,
    );
    expect({ code, stdout }).toEqual({ code: 3, stdout: '' });
    expect(stderr).toContain(`all.csv  the file cannot be written: ${disk?.says ?? 'the file would be too large'}`);
    expect(namesIn(at).filter((name) => /tmp$|^result|^all/.test(name))).toEqual([]);
  });

  it('is told before the work begins where nothing may be written', async () => {
    const { path, says } = readOnlyFolder(folder);
    const { code, stdout, stderr } = await run(folder, 'simulate', 'none.yaml', '--json', join(path, 'result.json'));
    expect({ code, stdout }).toEqual({ code: 3, stdout: '' });
    expect(stderr).toContain(says);
    // the scenario that is missing was not looked for any more
    expect(stderr).not.toContain('none.yaml');
  });
});

describe('a reader that has seen enough', () => {
  it.each(['--hourly -', '--json -', ''])('is no fault: %s', async (option) => {
    const { code, stdout, stderr } = await shell(`winterledger simulate ${house} ${option} | head -n 1`);
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(stdout.split('\n')).toHaveLength(2);
  });
});

describe('an interruption', () => {
  it.each(['SIGINT', 'SIGTERM', 'SIGHUP'] as const)('leaves the old result or the new one: %s', async (signal) => {
    const old = 'old\n';
    for (const wait of [60, 200, 350, 600]) {
      writeFileSync(join(folder, 'year.csv'), old);
      const { child, ended } = start(folder, ['simulate', house, '--hourly', 'year.csv']);
      await new Promise((later) => setTimeout(later, wait));
      child.kill(signal);
      const end = await ended;
      const text = readFileSync(join(folder, 'year.csv'), 'utf8');
      if (end.code !== 0) expect(end.signal).toBe(signal);
      // the signal may come between the file's new name and the program's end
      if (end.code === 0 || text !== old) expect(text.trimEnd().split('\n')).toHaveLength(8761);
      expect(passing(namesIn(folder))).toEqual([]);
    }
  });
});

describe('files that change while a run reads them', () => {
  /** The disk, on which each file is spoilt as soon as it has been read. */
  function spoiling(spoil: (path: string) => void): FileSource {
    const disk = new DiskSource();
    return {
      read(name, from) {
        const result = disk.read(name, from);
        if (!('code' in result)) spoil(result.name);
        return result;
      },
    };
  }

  function documentOf(source: FileSource): ResultDocument {
    const { loaded, problems } = loadScenario(join(folder, house), source);
    const { answer } = loaded === undefined ? {} : makeAnswer(loaded, problems);
    if (answer === undefined) throw new Error('no answer');
    return resultDocument(answer, '0');
  }

  it.each([
    ['lengthened', (path: string) => appendFileSync(path, 'x: [')],
    ['cut', (path: string) => truncateSync(path, Math.floor(statSync(path).size / 2))],
    ['replaced', (path: string) => writeFileSync(path, '\u0000')],
  ])('are used as they were read, and it is their checksums that stand in the result: %s', (_, spoil) => {
    const sound = documentOf(new DiskSource());
    const kept = new Map(sound.inputs.map(({ file }) => [file, readFileSync(file)]));
    try {
      const document = documentOf(spoiling(spoil));
      expect(documentText(document)).toBe(documentText(sound));
      for (const { file, sha256 } of document.inputs) {
        expect(createHash('sha256').update(kept.get(file)!).digest('hex'), file).toBe(sha256);
        expect(readFileSync(file).equals(kept.get(file)!), file).toBe(false);
      }
      expect(document.inputs.length).toBeGreaterThanOrEqual(8);
    } finally {
      for (const [file, bytes] of kept) writeFileSync(file, bytes);
    }
  });
});

describe('several runs into one file', () => {
  it('leave one whole result', async () => {
    const words = ['simulate', house, '--json', 'shared.json'];
    const ends = await Promise.all([0, 1, 2].map(() => run(folder, ...words)));
    expect(ends.map(({ code, stderr }) => ({ code, stderr }))).toEqual(Array(3).fill({ code: 0, stderr: '' }));
    const alone = await run(folder, 'simulate', house, '--json', '-');
    expect(readFileSync(join(folder, 'shared.json'), 'utf8')).toBe(alone.stdout);
    expect(passing(namesIn(folder))).toEqual([]);
  });
});
