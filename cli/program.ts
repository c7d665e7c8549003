import { Command, CommanderError, Option } from 'commander';
import { type CommandEntry, commandTable, type OptionEntry } from './commandTable.ts';
import { type CommandInput, EXIT, type Io, STDOUT } from './io.ts';
import { NAME, wrongUse } from './wrongUse.ts';

const SAYS =
  'What an air-to-water heat pump will do over a year in one surveyed house: electricity, backup hours, cost on each tariff, against the boiler.';
/** The help has the same lines wherever it is read. */
const HELP_WIDTH = 80;

/**
 * Understands a command line and runs its command.
 *
 * @param words what stands behind the program's name
 * @param io where to talk
 * @returns the exit code: 2 for wrong use, else that of the command
 */
export async function runProgram(words: readonly string[], io: Io): Promise<number> {
  const said: string[] = [];
  const asked: Asked[] = [];
  const program = describe(
    (text) => said.push(text),
    (command) => asked.push(command),
  );
  program.version(io.version, '--version', 'print the version');
  if (words.length === 0) {
    await io.stderr.write(program.helpInformation());
    return EXIT.wrongInput;
  }
  const meant = commandTable.find(({ name }) => name === words[0]);
  const nameless = noFileName(words, meant?.options ?? []);
  if (nameless !== undefined) return wrongUse(nameless, meant?.name, io);
  try {
    program.parse(words, { from: 'user' });
  } catch (fault) {
    if (!(fault instanceof CommanderError)) throw fault;
    if (fault.exitCode !== 0) return wrongUse(fault.message, meant?.name, io);
  }
  if (said.length > 0) await io.stdout.write(said.join(''));
  for (const { entry, input } of asked) {
    const { run } = await entry.load();
    return run(input, io);
  }
  return EXIT.done;
}

/** A command that the user asked for. */
interface Asked {
  readonly entry: CommandEntry;
  readonly input: CommandInput;
}

/** A name of a file that is none: empty, or the next option where the name was forgotten. */
function noFileName(words: readonly string[], options: readonly OptionEntry[]): string | undefined {
  if (words.includes('')) return 'the name of a file is empty';
  for (const { name } of options.filter(({ value }) => value === 'FILE')) {
    if (words.includes(`--${name}=`)) return `option '--${name}' needs the name of a file`;
    const next = words[words.indexOf(`--${name}`) + 1];
    if (words.includes(`--${name}`) && next?.startsWith('-') && next !== STDOUT) {
      return `option '--${name}' needs the name of a file; behind it stands '${next}'`;
    }
  }
  return undefined;
}

function describe(say: (text: string) => void, chosen: (asked: Asked) => void): Command {
  const program = new Command(NAME)
    .description(SAYS)
    .exitOverride()
    .configureHelp({ helpWidth: HELP_WIDTH })
    .configureOutput({ writeOut: say, writeErr: () => {}, outputError: () => {}, getOutHasColors: () => false })
    .helpOption('--help', 'show this help')
    .helpCommand(false)
    .addHelpText('after', `\n${NAME} COMMAND --help shows the options of a command, and an example.`);
  for (const entry of commandTable) program.addCommand(commandOf(entry, program, chosen));
  return program;
}

function commandOf(entry: CommandEntry, program: Command, chosen: (asked: Asked) => void): Command {
  const command = new Command(entry.name)
    .copyInheritedSettings(program)
    .description(entry.says)
    .helpOption('--help', 'show this help')
    .addHelpText('after', `\nExamples:\n${entry.examples.map((line) => `  ${line}`).join('\n')}`)
    .action(() => {
      const files = command.processedArgs.flat().filter((file) => typeof file === 'string');
      chosen({ entry, input: { files, options: asTexts(command.opts()) } });
    });
  if (entry.argument !== '') command.argument(`<${inCommander(entry.argument)}>`, entry.argumentSays);
  if (entry.further !== undefined) command.argument(`[${inCommander(entry.further.argument)}]`, entry.further.says);
  for (const { name, value, says, choices, usual } of entry.options) {
    const option = new Option(value === undefined ? `--${name}` : `--${name} <${value}>`, says);
    if (choices !== undefined) option.choices([...choices]);
    if (usual !== undefined) option.default(usual);
    command.addOption(option);
  }
  return command;
}

/** The name of an argument; where it may be repeated, with dots for `…`. */
function inCommander(argument: string): string {
  return argument.replace('…', '...');
}

/** Options as texts; a switch that was given has the text 'on'. */
function asTexts(options: Record<string, string | true | undefined>): Record<string, string | undefined> {
  return Object.fromEntries(Object.entries(options).map(([name, value]) => [name, value === true ? 'on' : value]));
}
