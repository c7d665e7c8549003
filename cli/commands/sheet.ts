import { readFileSync } from 'node:fs';
import type { Server } from 'node:http';
import { faultCode, faultText } from '../faultWords.ts';
import { type CommandInput, EXIT, type Io } from '../io.ts';
import { withOutputs } from '../outputs.ts';
import { LOOPBACK, listen, sheetServer } from '../sheetServer.ts';
import { tellProblems } from '../tellProblems.ts';
import { wrongUse } from '../wrongUse.ts';

const HIGHEST_PORT = 65_535;

/** Serves the sheet to the browser of this machine until it is interrupted, or writes it to a file. */
export async function run({ options }: CommandInput, io: Io): Promise<number> {
  const { port = '', out } = options;
  if (!/^\d{1,5}$/.test(port) || Number(port) > HIGHEST_PORT) {
    return wrongUse(
      `'${port}' is no port: a whole number from 0 to ${HIGHEST_PORT}, 0 for one that is free`,
      'sheet',
      io,
    );
  }
  const page = readPage();
  if (page === undefined) {
    await tellProblems(
      [{ code: 'file.missing', severity: 'error', file: 'sheet.html', hint: 'npm run build makes it' }],
      io,
    );
    return EXIT.wrongInput;
  }
  return out === undefined ? serve(page, Number(port), io) : write(page, out, io);
}

/** The page lies beside the program. */
function readPage(): Uint8Array | undefined {
  try {
    return readFileSync(new URL('./sheet.html', import.meta.url));
  } catch {
    return undefined;
  }
}

async function write(page: Uint8Array, out: string, io: Io): Promise<number> {
  return withOutputs([out], io, async (outputs) => {
    await outputs.write(out, [new TextDecoder().decode(page)]);
    await outputs.finish();
    if (!outputs.takesStdout) await io.stdout.write(`${out} holds the sheet; open it in any browser\n`);
    return EXIT.done;
  });
}

async function serve(page: Uint8Array, port: number, io: Io): Promise<number> {
  const server = sheetServer(page);
  const found = await listen(server, port);
  if (typeof found !== 'number') {
    const inUse = faultCode(found) === 'EADDRINUSE';
    const what = inUse ? 'another program listens there already' : faultText(found);
    const cure = inUse
      ? 'name another port behind --port, or 0 for one that is free'
      : 'name another port behind --port';
    await io.stderr.write(`port ${port}  the sheet cannot be served: ${what}\n    → ${cure}\n`);
    return EXIT.notWritten;
  }
  await io.stdout.write(`http://${LOOPBACK}:${found}/\n`);
  await io.stderr.write('The sheet is served to this machine alone; Ctrl-C ends it.\n');
  await interrupted(server);
  return EXIT.done;
}

/** Waits for Ctrl-C, then closes what is open. */
function interrupted(server: Server): Promise<void> {
  return new Promise((resolve) => {
    const end = () => {
      server.close(() => resolve());
      server.closeAllConnections();
    };
    process.once('SIGINT', end);
    process.once('SIGTERM', end);
  });
}
