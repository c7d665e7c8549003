import { EXIT, type Io } from './io.ts';
import { OutputFault } from './outputFile.ts';

/**
 * Ends the program when a command has thrown: a result that cannot be written is told as a problem, all else as a fault
 * of our own. Never a stack trace.
 *
 * @returns the exit code
 */
export async function lastResort(fault: unknown, io: Io): Promise<number> {
  if (fault instanceof OutputFault) {
    const { tellProblems } = await import('./tellProblems.ts');
    await tellProblems([fault.problem], io).catch(() => {});
    return EXIT.notWritten;
  }
  const what = (fault instanceof Error ? fault.message : String(fault)).split('\n')[0];
  await io.stderr.write(`winterledger  this is a fault of the program, not of your files: ${what}\n`).catch(() => {});
  return EXIT.partlyDone;
}
