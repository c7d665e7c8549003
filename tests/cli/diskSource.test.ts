import { linkSync, mkdirSync, mkdtempSync, rmSync, symlinkSync, truncateSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { DiskSource } from '../../cli/diskSource.ts';
import { isSameFile } from '../../cli/fileIdentity.ts';
import { problemText } from '../../src/core/problemText.ts';
import { isProblem } from '../../src/scenario/fileSource.ts';
import { makePipe } from './program.ts';

const folder = mkdtempSync(join(tmpdir(), 'winterledger-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));
const at = (name: string) => join(folder, name);
const put = (name: string, text: string) => {
  writeFileSync(at(name), text);
  return at(name);
};

function refused(name: string): string {
  const result = new DiskSource().read(name);
  return isProblem(result) ? problemText(result) : 'was read';
}

describe('input files on the disk', () => {
  it('come with the SHA-256 of exactly their bytes', () => {
    const read = new DiskSource().read(put('abc.csv', 'abc'));
    expect(isProblem(read)).toBe(false);
    if (isProblem(read)) return;
    expect([...read.bytes]).toEqual([97, 98, 99]);
    // FIPS 180-4, the example of a message of one block: 'abc'.
    expect(read.sha256).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
  });

  it('are read once: what changes on the disk during a run does not change the run', () => {
    const source = new DiskSource();
    const name = put('twice.csv', 'first');
    const first = source.read(name);
    put('twice.csv', 'second');
    expect(source.read(name)).toEqual(first);
  });

  it('are looked for beside the file that names them', () => {
    mkdirSync(at('inner'), { recursive: true });
    writeFileSync(at('inner/tariff.yaml'), 'x');
    const read = new DiskSource().read('tariff.yaml', at('inner/house.yaml'));
    expect(read).toMatchObject({ name: at('inner/tariff.yaml') });
  });

  it('may be links, and a link is known for the file that it leads to', () => {
    const name = put('real.csv', 'x');
    symlinkSync(name, at('link.csv'));
    linkSync(name, at('hard.csv'));
    const source = new DiskSource();
    for (const each of ['real.csv', 'link.csv', 'hard.csv']) source.read(at(each));
    const [real, link, hard] = source.identities;
    expect(isSameFile(real!, link!)).toBe(true);
    expect(isSameFile(real!, hard!)).toBe(true);
    source.read(put('other.csv', 'x'));
    expect(isSameFile(real!, source.identities[3]!)).toBe(false);
  });

  it('are refused when there is no such file, whatever the name', () => {
    expect(refused(at('none.yaml'))).toContain('there is no such file');
    expect(refused(join(put('plain', 'x'), 'below.yaml'))).toContain('there is no such file');
    expect(refused('x\0y')).toContain('x\\u0000y  there is no such file');
    expect(refused('n'.repeat(5000))).toContain('there is no such file');
  });

  it('are refused when they are a folder, a pipe, a socket or a device', async () => {
    expect(refused(folder)).toContain('this is a folder, not a file');
    makePipe(at('pipe.csv'));
    expect(refused(at('pipe.csv'))).toContain('this is a pipe, not a file');
    expect(refused('/dev/null')).toContain('this is a device, not a file');
    const server = createServer();
    await new Promise<void>((resolve) => server.listen(at('socket'), resolve));
    expect(refused(at('socket'))).toContain('this is a socket, not a file');
    await new Promise((resolve) => server.close(resolve));
  });

  it('are refused when links lead in a circle', () => {
    symlinkSync(at('b.csv'), at('a.csv'));
    symlinkSync(at('a.csv'), at('b.csv'));
    expect(refused(at('a.csv'))).toContain('cannot be read: links lead in a circle');
  });

  it('are refused above their size, by kind, before a byte is read', () => {
    truncateSync(put('large.yaml', ''), 1_000_001);
    expect(refused(at('large.yaml'))).toContain('the file has 1.0 MB; at most 1 MB is read');
    truncateSync(put('large.csv', ''), 200_000_001);
    expect(refused(at('large.csv'))).toContain('the file has 200.0 MB; at most 200 MB is read');
  });

  it('may be as large as their kind allows', () => {
    truncateSync(put('full.yaml', ''), 1_000_000);
    const read = new DiskSource().read(at('full.yaml'));
    expect(isProblem(read) ? 0 : read.bytes.length).toBe(1_000_000);
  });
});
