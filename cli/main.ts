import { version } from '../package.json';
import { commandTable } from './commandTable.ts';
import type { Io } from './io.ts';
import { lastResort } from './lastResort.ts';
import { mayColour } from './mayColour.ts';
import { runProgram } from './program.ts';
import { expectShortRun } from './shortRun.ts';
import { showsPictures } from './showsPictures.ts';
import { textSink } from './textSink.ts';

const io: Io = {
  stdout: textSink(process.stdout, 'standard output'),
  stderr: textSink(process.stderr, 'standard error'),
  colour: mayColour(process.stderr, process.env),
  terminal: process.stderr.isTTY === true,
  pictures: showsPictures(process.stdout, process.env),
  version,
};

const [, , named] = process.argv;
if (commandTable.every(({ name, isLong }) => name !== named || isLong !== true)) expectShortRun();

process.exitCode = await runProgram(process.argv.slice(2), io).catch((fault: unknown) => lastResort(fault, io));
