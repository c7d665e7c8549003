import type { Problem } from '../src/core/problem.ts';
import { type FileIdentity, isSameFile } from './fileIdentity.ts';
import { removeOnInterruption } from './interruption.ts';
import { EXIT, type Io, STDOUT } from './io.ts';
import { type OutputFile, openOutput } from './outputFile.ts';
import { tellProblems } from './tellProblems.ts';
import type { TextSink } from './textSink.ts';

/** Where a result goes: a file, or the standard output. */
interface Target {
  readonly name: string;
  readonly file?: OutputFile;
}

/**
 * Runs a work with its outputs open. When they cannot be opened it does not begin; what it leaves unfinished is removed.
 *
 * @param names of the outputs; those that were not asked for are undefined
 * @param work gets the open outputs and gives the exit code
 * @returns the exit code: that of the work; 3 where a file cannot be written, 2 where two names mean one file
 */
export async function withOutputs(
  names: readonly (string | undefined)[],
  io: Io,
  work: (outputs: Outputs) => Promise<number>,
): Promise<number> {
  const outputs = await Outputs.open(names, io.stdout);
  if (!(outputs instanceof Outputs)) {
    await tellProblems(outputs, io);
    return outputs.every(({ code }) => code === 'file.output-twice') ? EXIT.wrongInput : EXIT.notWritten;
  }
  try {
    return await work(outputs);
  } finally {
    outputs.discard();
  }
}

/**
 * The results of one run: opened together before the work, given their names together after it, so that a failure leaves
 * nothing behind.
 */
export class Outputs {
  readonly #stdout: TextSink;
  readonly #targets: readonly Target[];

  private constructor(stdout: TextSink, targets: readonly Target[]) {
    this.#stdout = stdout;
    this.#targets = targets;
  }

  /**
   * Opens every output that the user asked for.
   *
   * @param names by the option's name; options that were not given are left out
   * @returns the open outputs; or the problems, and then nothing is left open
   */
  static async open(names: readonly (string | undefined)[], stdout: TextSink): Promise<Outputs | Problem[]> {
    const targets: Target[] = [];
    const outputs = new Outputs(stdout, targets);
    removeOnInterruption(outputs);
    const problems: Problem[] = [];
    for (const name of names) {
      if (name === undefined) continue;
      const opened = name === STDOUT ? undefined : await openOutput(name);
      if (opened !== undefined && 'code' in opened) problems.push(opened);
      else targets.push({ name, ...(opened === undefined ? {} : { file: opened }) });
    }
    problems.push(...outputs.#twice());
    if (problems.length === 0) return outputs;
    outputs.discard();
    return problems;
  }

  /** Whether a result takes the standard output, which must then hold nothing else. */
  get takesStdout(): boolean {
    return this.#targets.some((target) => target.file === undefined);
  }

  /** Outputs that would be written over a file that was read. */
  overInputs(inputs: readonly FileIdentity[]): Problem[] {
    return this.#targets.flatMap(({ file }) => {
      const input = inputs.find((read) => file !== undefined && isSameFile(read, file.identity));
      return input === undefined || file === undefined ? [] : [misuse('file.output-is-input', file.identity.name)];
    });
  }

  /**
   * Writes a result, piece by piece.
   *
   * @param name of the output as it was opened; nothing is written to one that was not asked for
   * @throws OutputFault
   */
  async write(name: string | undefined, pieces: Iterable<string>): Promise<void> {
    const target = this.#targets.find((known) => known.name === name);
    if (target === undefined) return;
    for (const piece of pieces) await (target.file ?? this.#stdout).write(piece);
  }

  /**
   * Writes a result of bytes into its file.
   *
   * @param name of the output as it was opened; one that is not text is never opened for the standard output
   * @throws OutputFault
   */
  async writeBytes(name: string, bytes: Uint8Array): Promise<void> {
    await this.#targets.find((known) => known.name === name)?.file?.write(bytes);
  }

  /** Gives every file its name. @throws OutputFault */
  async finish(): Promise<void> {
    for (const { file } of this.#targets) await file?.finish();
  }

  /** Removes what is not finished. */
  discard(): void {
    for (const { file } of this.#targets) file?.discard();
  }

  #twice(): Problem[] {
    return this.#targets.flatMap((target, i) => {
      const earlier = this.#targets.slice(0, i);
      return earlier.some((other) => isSameTarget(other, target)) ? [misuse('file.output-twice', target.name)] : [];
    });
  }
}

function isSameTarget(a: Target, b: Target): boolean {
  if (a.file === undefined || b.file === undefined) return a.file === b.file;
  return isSameFile(a.file.identity, b.file.identity);
}

function misuse(code: 'file.output-is-input' | 'file.output-twice', file: string): Problem {
  return { code, severity: 'error', file };
}
