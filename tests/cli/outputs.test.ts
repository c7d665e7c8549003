import {
  chmodSync,
  closeSync,
  existsSync,
  linkSync,
  mkdirSync,
  mkdtempSync,
  openSync,
  readFileSync,
  readSync,
  rmSync,
  statSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import type { Io } from '../../cli/io.ts';
import { lastResort } from '../../cli/lastResort.ts';
import { OutputFault } from '../../cli/outputFile.ts';
import { type Outputs, withOutputs } from '../../cli/outputs.ts';
import { makePipe, namesIn } from './program.ts';

const outer = mkdtempSync(join(tmpdir(), 'winterledger-'));
afterAll(() => rmSync(outer, { recursive: true, force: true }));
let folder = outer;
let said = { stdout: '', stderr: '' };
beforeEach(() => {
  folder = mkdtempSync(join(outer, 'each-'));
  said = { stdout: '', stderr: '' };
});
const at = (name: string) => join(folder, name);
const sink = (name: 'stdout' | 'stderr') => ({
  write: async (text: string) => {
    said[name] += text;
  },
});
const io: Io = { stdout: sink('stdout'), stderr: sink('stderr'), colour: false, version: '1' };

/** Writes one text to every output that is named. */
const writeTo = async (names: string[], text = 'result') =>
  withOutputs(names, io, async (outputs: Outputs) => {
    for (const name of names) await outputs.write(name, [text, '\n']);
    await outputs.finish();
    return 0;
  });

describe('an output', () => {
  it('has its name only when it is whole', async () => {
    let during: string[] = [];
    const code = await withOutputs([at('result.json')], io, async (outputs) => {
      await outputs.write(at('result.json'), ['part']);
      during = namesIn(folder);
      await outputs.finish();
      return 0;
    });
    expect(code).toBe(0);
    expect(during).not.toContain('result.json');
    expect(during.length).toBe(1);
    expect(namesIn(folder)).toEqual(['result.json']);
    expect(readFileSync(at('result.json'), 'utf8')).toBe('part');
  });

  it('takes the place of a file and keeps its rights, also through a link', async () => {
    writeFileSync(at('real.json'), 'old');
    chmodSync(at('real.json'), 0o640);
    symlinkSync(at('real.json'), at('link.json'));
    expect(await writeTo([at('link.json')])).toBe(0);
    expect(readFileSync(at('real.json'), 'utf8')).toBe('result\n');
    expect(statSync(at('real.json')).mode & 0o777).toBe(0o640);
    expect(namesIn(folder)).toEqual(['link.json', 'real.json']);
  });

  it('leaves what was there when the work ends without it', async () => {
    writeFileSync(at('result.json'), 'old');
    const code = await withOutputs([at('result.json')], io, async (outputs) => {
      await outputs.write(at('result.json'), ['new']);
      return 2;
    });
    expect(code).toBe(2);
    expect(readFileSync(at('result.json'), 'utf8')).toBe('old');
    expect(namesIn(folder)).toEqual(['result.json']);
  });

  it('is removed when the work throws', async () => {
    const work = withOutputs([at('result.json')], io, async () => {
      throw new Error('stop');
    });
    await expect(work).rejects.toThrow('stop');
    expect(namesIn(folder)).toEqual([]);
  });

  it('may be the standard output', async () => {
    expect(await writeTo(['-'])).toBe(0);
    expect(said.stdout).toBe('result\n');
    expect(namesIn(folder)).toEqual([]);
  });

  it('may be a pipe, which stays one', async () => {
    // A pipe of our own and no device: were the guard to break, a device of the machine would be replaced by a file.
    makePipe(at('pipe'));
    const reader = openSync(at('pipe'), 'r+');
    expect(await writeTo([at('pipe')])).toBe(0);
    expect(statSync(at('pipe')).isFIFO()).toBe(true);
    const bytes = Buffer.alloc(20);
    expect(bytes.toString('utf8', 0, readSync(reader, bytes))).toBe('result\n');
    closeSync(reader);
    expect(namesIn(folder)).toEqual(['pipe']);
  });
});

describe('an output that cannot be written', () => {
  const nowhere = async () => {
    throw new Error('the work began');
  };

  it.each([
    ['its folder does not exist', () => 'none/result.json', 'the file cannot be written: its folder does not exist'],
    ['a part of its path is a file', () => 'file/result.json', 'a part of its path is a file, not a folder'],
    ['it is a folder', () => 'inner', 'a result cannot be written here: this is a folder'],
    ['its name ends as that of a folder', () => 'none/', 'a result cannot be written here: this is a folder'],
    ['its name is too long', () => 'n'.repeat(300), 'the file cannot be written: its name is too long'],
  ])('is told before the work begins, with exit code 3: %s', async (_, name, message) => {
    writeFileSync(at('file'), '');
    mkdirSync(at('inner'));
    expect(await withOutputs([at('good.json'), `${folder}/${name()}`], io, nowhere)).toBe(3);
    expect(said.stderr).toContain(message);
    expect(namesIn(folder)).toEqual(['file', 'inner']);
  });

  it('is told when the disk is full, with exit code 3', async () => {
    const full = Object.assign(new Error('no space'), { code: 'ENOSPC' });
    expect(await lastResort(new OutputFault('result.json', full), io)).toBe(3);
    expect(said.stderr).toMatch(
      /^result\.json {2}the file cannot be written: the disk is full\n {4}→ make room on the disk.+\n$/,
    );
  });
});

describe('outputs that mean one file', () => {
  it.each(['same.json', './same.json', 'link.json', 'hard.json'])('are refused with exit code 2: %s', async (other) => {
    writeFileSync(at('same.json'), 'old');
    symlinkSync('same.json', at('link.json'));
    linkSync(at('same.json'), at('hard.json'));
    const code = await withOutputs([at('same.json'), `${folder}/${other}`], io, async () => 0);
    expect(code).toBe(2);
    expect(said.stderr).toContain('two results would be written to this same file');
    expect(readFileSync(at('same.json'), 'utf8')).toBe('old');
  });

  it('are refused when they are the standard output twice', async () => {
    expect(await withOutputs(['-', '-'], io, async () => 0)).toBe(2);
    expect(said.stdout).toBe('');
  });

  it('are refused when neither file exists yet', async () => {
    expect(await withOutputs([at('new.json'), `${folder}/./new.json`], io, async () => 0)).toBe(2);
    expect(existsSync(at('new.json'))).toBe(false);
  });
});

describe('a fault of the program', () => {
  it('is one line without a stack, with exit code 1', async () => {
    const code = await lastResort(new RangeError('heat is not a finite number\n    at somewhere'), io);
    expect(code).toBe(1);
    expect(said.stderr).toBe(
      'winterledger  this is a fault of the program, not of your files: heat is not a finite number\n',
    );
  });

  it('is told too when what was thrown is no error', async () => {
    expect(await lastResort('odd', io)).toBe(1);
    expect(said.stderr).toContain('not of your files: odd\n');
  });
});
