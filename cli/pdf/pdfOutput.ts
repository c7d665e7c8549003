import { existsSync, realpathSync, renameSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import type { Problem } from '../../src/core/problem.ts';
import { faultText } from '../faultWords.ts';
import { type FileIdentity, isSameFile } from '../fileIdentity.ts';
import { removeOnInterruption } from '../interruption.ts';
import { EXIT, type Io, STDOUT } from '../io.ts';
import { OutputFault } from '../outputFile.ts';
import { tellProblems } from '../tellProblems.ts';
import { type Browser, findBrowser } from './findBrowser.ts';

/** A PDF that is being printed beside its place, and takes its name only when it is whole. */
export class PdfOutput {
  readonly browser: Browser;
  readonly #identity: FileIdentity;
  #passing: string | undefined;

  constructor(browser: Browser, identity: FileIdentity, passing: string) {
    this.browser = browser;
    this.#identity = identity;
    this.#passing = passing;
    removeOnInterruption(this);
  }

  /** As the user wrote it. */
  get name(): string {
    return this.#identity.name;
  }

  /** Whether it would be written over a file that was read, or over the HTML. */
  overFiles(inputs: readonly FileIdentity[], html: string): Problem[] {
    const file = this.#identity.name;
    const list: Problem[] = [];
    if (inputs.some((input) => isSameFile(input, this.#identity))) {
      list.push({ code: 'file.output-is-input', severity: 'error', file });
    }
    if (html !== STDOUT && isSameFile(identityOf(html), this.#identity)) {
      list.push({ code: 'file.output-twice', severity: 'error', file });
    }
    return list;
  }

  /** Takes the bytes of the PDF. @throws OutputFault */
  write(bytes: Uint8Array): void {
    this.#tried((passing) => writeFileSync(passing, bytes));
  }

  /** Gives the file its name. @throws OutputFault */
  finish(): void {
    this.#tried((passing) => renameSync(passing, this.#identity.path));
    this.#passing = undefined;
  }

  /** Removes what is not finished. */
  discard(): void {
    if (this.#passing !== undefined) rmSync(this.#passing, { force: true });
    this.#passing = undefined;
  }

  #tried(act: (passing: string) => void): void {
    try {
      if (this.#passing !== undefined) act(this.#passing);
    } catch (fault) {
      throw new OutputFault(this.#identity.name, fault);
    }
  }
}

function identityOf(name: string): FileIdentity {
  const path = existsSync(name) ? realpathSync(name) : join(realpathSync(dirname(name)), basename(name));
  const stats = existsSync(path) ? statSync(path) : undefined;
  return { name, path, inode: stats === undefined ? undefined : `${stats.dev}:${stats.ino}` };
}

/**
 * Runs a work with a place for a PDF. Where there is none, or no browser to print it, the work does not begin.
 *
 * @param name of the PDF; absent where none is asked for
 * @param work gets the place, and gives the exit code
 */
export async function withPdf(
  name: string | undefined,
  io: Io,
  work: (pdf: PdfOutput | undefined) => Promise<number>,
): Promise<number> {
  if (name === undefined) return work(undefined);
  const opened = await openPdf(name);
  if (!(opened instanceof PdfOutput)) {
    await tellProblems([opened], io);
    return EXIT.notWritten;
  }
  try {
    return await work(opened);
  } finally {
    opened.discard();
    opened.browser.leave();
  }
}

async function openPdf(name: string): Promise<PdfOutput | Problem> {
  try {
    if ((existsSync(name) && statSync(name).isDirectory()) || /[/\\]$/.test(name)) {
      return { code: 'file.output-is-folder', severity: 'error', file: name, path: join(name, 'report.pdf') };
    }
    const identity = identityOf(name);
    const passing = join(dirname(identity.path), `.winterledger-${process.pid}-pdf.tmp`);
    writeFileSync(passing, '', { flag: 'wx' });
    const browser = await findBrowser(process.env);
    if (browser !== undefined) return new PdfOutput(browser, identity, passing);
    rmSync(passing, { force: true });
    return { code: 'report.no-browser', severity: 'error', file: name };
  } catch (fault) {
    return { code: 'file.unwritable', severity: 'error', file: name, found: faultText(fault) };
  }
}
