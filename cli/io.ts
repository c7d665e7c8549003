import type { TextSink } from './textSink.ts';

/** What a command may touch of the world beside files. */
export interface Io {
  /** Results. */
  readonly stdout: TextSink;
  /** Talk: warnings, problems. */
  readonly stderr: TextSink;
  /** Whether the talk may be coloured. */
  readonly colour: boolean;
  /** Whether the talk is read on a terminal, so that a line may be written anew; no when left out. */
  readonly terminal?: boolean;
  /** Whether the results are read on a terminal that shows block letters; no when left out. */
  readonly pictures?: boolean;
  /** Version of the program. */
  readonly version: string;
}

/** What the user wrote behind a command. */
export interface CommandInput {
  readonly files: readonly string[];
  /** By the option's long name; absent where it was not given. A switch that was given is 'on'. */
  readonly options: Readonly<Record<string, string | undefined>>;
}

/** A command: does its work and gives the exit code. @throws OutputFault where a result cannot be written */
export type Run = (input: CommandInput, io: Io) => Promise<number>;

/** How the program ends. A fault of the program itself ends with 1 too. */
export const EXIT = { done: 0, partlyDone: 1, wrongInput: 2, notWritten: 3 } as const;

/** Name that stands for the standard output where a result is asked for in a file. */
export const STDOUT = '-';
