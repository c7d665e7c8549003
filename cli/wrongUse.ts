import { visibleText } from '../src/core/problem.ts';
import { EXIT, type Io } from './io.ts';

/** The program's name on the command line. */
export const NAME = 'winterledger';

/**
 * Tells of a wrong command line in two lines: what is wrong, with the nearest name where there is one, and where help is.
 *
 * @param message what is wrong
 * @param command name of the command that was meant; absent where none is known
 * @returns the exit code of wrong use
 */
export async function wrongUse(message: string, command: string | undefined, io: Io): Promise<number> {
  const what = visibleText(message.replace(/^error: /, '').replaceAll('\n', ' '));
  await io.stderr.write(
    `${NAME}  ${what}\n    → ${NAME}${command === undefined ? '' : ` ${command}`} --help shows what there is\n`,
  );
  return EXIT.wrongInput;
}
