import { readFileSync } from 'node:fs';
import { request } from 'node:http';
import { type AddressInfo, createServer } from 'node:net';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { LOOPBACK } from '../../cli/sheetServer.ts';
import { folderWithDemo, PROBLEM_SHAPE, run, start } from './program.ts';

const folder = folderWithDemo();
const page = readFileSync(fileURLToPath(new URL('../../dist/sheet.html', import.meta.url)));

/** A server of the built program on a free port, and its address. */
async function serving() {
  const { child, ended } = start(folder, ['sheet', '--port', '0']);
  const line = await new Promise<string>((resolve) =>
    child.stdout.once('data', (piece: Buffer) => resolve(String(piece))),
  );
  const [, port = ''] = /^http:\/\/[\d.]+:(\d+)\/\n$/.exec(line) ?? [];
  return { child, ended, port: Number(port) };
}

interface Answered {
  readonly status: number | undefined;
  readonly headers: Readonly<Record<string, unknown>>;
  readonly body: Buffer;
}

function asked(port: number, { method = 'GET', path = '/', host = `${LOOPBACK}:${port}` } = {}): Promise<Answered> {
  return new Promise((resolve, reject) => {
    const sent = request({ host: LOOPBACK, port, method, path, headers: { Host: host } }, (answer) => {
      const pieces: Buffer[] = [];
      answer.on('data', (piece: Buffer) => pieces.push(piece));
      answer.on('end', () =>
        resolve({ status: answer.statusCode, headers: answer.headers, body: Buffer.concat(pieces) }),
      );
    });
    sent.on('error', reject);
    sent.end();
  });
}

describe('the served sheet', () => {
  it('is the page, to this machine alone, under its own names and methods, until it is interrupted', async () => {
    const { child, ended, port } = await serving();
    const own = await asked(port);
    expect({ status: own.status, same: own.body.equals(page) }).toEqual({ status: 200, same: true });
    expect(own.headers).toMatchObject({
      'content-type': 'text/html; charset=utf-8',
      'cache-control': 'no-store',
      'x-content-type-options': 'nosniff',
      'x-frame-options': 'DENY',
    });
    expect((await asked(port, { host: `localhost:${port}` })).status).toBe(200);
    const head = await asked(port, { method: 'HEAD' });
    expect([head.status, head.body.length]).toEqual([200, 0]);
    expect((await asked(port, { host: `example.org:${port}` })).status).toBe(421);
    expect((await asked(port, { host: LOOPBACK })).status).toBe(421);
    expect((await asked(port, { method: 'POST' })).status).toBe(405);
    for (const path of ['/main.js', '/../package.json', '//', '/?a']) {
      const other = await asked(port, { path });
      expect([path, other.status, other.body.length]).toEqual([path, 404, 0]);
    }
    child.kill('SIGINT');
    expect(await ended).toMatchObject({ code: 0, signal: null });
  });

  it('says that a port is in use, and ends with 3', async () => {
    const taken = createServer();
    await new Promise<void>((resolve) => taken.listen(0, LOOPBACK, resolve));
    const { port } = taken.address() as AddressInfo;
    const { code, stdout, stderr } = await run(folder, 'sheet', '--port', String(port));
    taken.close();
    expect({ code, stdout }).toEqual({ code: 3, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain('another program listens there already');
  });

  it.each(['x', '-1', '70000', '80.5'])('refuses %s as a port', async (port) => {
    const { code, stderr } = await run(folder, 'sheet', `--port=${port}`);
    expect(code).toBe(2);
    expect(stderr).toContain(`'${port}' is no port`);
  });

  it('is written to a file, byte for byte the page that is served', async () => {
    const { code } = await run(folder, 'sheet', '--out', 'sheet.html');
    expect(code).toBe(0);
    expect(readFileSync(join(folder, 'sheet.html')).equals(page)).toBe(true);
  });
});
