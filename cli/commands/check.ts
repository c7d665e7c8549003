import { hasErrors, visibleText } from '../../src/core/problem.ts';
import { type CheckedFile, checkFile } from '../../src/scenario/checkFile.ts';
import { DiskSource } from '../diskSource.ts';
import { type CommandInput, EXIT, type Io } from '../io.ts';
import { tellProblems } from '../tellProblems.ts';

const kindWords = {
  scenario: 'a scenario',
  unit: 'a heat-pump unit',
  tariff: 'a tariff',
  read: 'read settings',
  plan: 'a plan of a batch',
  weather: 'weather',
  priceSeries: 'a price series',
  carbonFactors: 'carbon factors of electricity',
  meter: 'the meter of a household',
  readings: 'meter readings',
  homes: 'a table of homes',
} as const;

/** Looks through input files: says what each was taken for, and lists all that is wrong with any of them. */
export async function run({ files }: CommandInput, io: Io): Promise<number> {
  const source = new DiskSource();
  let sound = true;
  for (const file of files) {
    const checked = await checkWhole(file, source);
    sound &&= !hasErrors(checked.problems);
    await io.stdout.write(statement(file, checked));
    await tellProblems(checked.problems, io);
  }
  return sound ? EXIT.done : EXIT.wrongInput;
}

/**
 * A plan is looked through with its base scenario, its homes and its first year, as a batch would; a table of homes alone has
 * the names of its columns and the length of its rows looked at.
 */
async function checkWhole(file: string, source: DiskSource): Promise<CheckedFile> {
  const checked = checkFile(file, source);
  if (hasErrors(checked.problems)) return checked;
  if (checked.kind === 'homes') {
    const { homesProblems } = await import('../batch/homesProblems.ts');
    return { ...checked, problems: homesProblems(file) };
  }
  if (checked.kind !== 'plan') return checked;
  const { prepareBatch } = await import('../batch/preparedBatch.ts');
  return { ...checked, problems: prepareBatch(file).problems };
}

/** `house.yaml  taken for a scenario: in order`, and below it what was recognised. */
function statement(file: string, { kind, about, problems }: CheckedFile): string {
  const taken = kind === undefined ? 'not recognised' : `taken for ${kindWords[kind]}`;
  const lines = about.map((line) => `    ${visibleText(line)}\n`);
  return `${visibleText(file)}  ${taken}: ${verdict(problems)}\n${lines.join('')}`;
}

function verdict(problems: CheckedFile['problems']): string {
  const errors = problems.filter(({ severity }) => severity === 'error').length;
  const warnings = problems.length - errors;
  if (problems.length === 0) return 'in order';
  return [counted(errors, 'fault'), counted(warnings, 'warning')].filter((part) => part !== '').join(', ');
}

function counted(count: number, what: string): string {
  return count === 0 ? '' : `${count} ${what}${count === 1 ? '' : 's'}`;
}
