import { documentText } from '../../src/report/documentText.ts';
import { seasonDocument } from '../../src/report/seasonDocument.ts';
import { seasonText } from '../../src/report/seasonText.ts';
import type { Wanted } from '../../src/scenario/season/chooseRatings.ts';
import { loadLabel } from '../../src/scenario/season/loadLabel.ts';
import { makeSeasons } from '../../src/scenario/season/makeSeasons.ts';
import { APPLICATIONS, CLIMATES } from '../../src/scenario/season/outletsOf.ts';
import { DiskSource } from '../diskSource.ts';
import { type CommandInput, EXIT, type Io } from '../io.ts';
import { type Outputs, withOutputs } from '../outputs.ts';
import { tellProblems } from '../tellProblems.ts';

/** Rates a unit in the reference seasons of the energy label and holds it against what its label declares. */
export async function run({ files, options }: CommandInput, io: Io): Promise<number> {
  const { json } = options;
  // the command line admits no other words
  const climate = CLIMATES.find((each) => each === options.climate);
  const application = APPLICATIONS.find((each) => String(each) === options.application);
  const asked = { file: files[0], wanted: { climate, application }, bins: options.bins !== undefined, json };
  return withOutputs([json], io, (outputs) => rate({ ...asked, outputs }, io));
}

interface Asked {
  readonly file: string;
  readonly wanted: Wanted;
  readonly bins: boolean;
  readonly json: string | undefined;
  readonly outputs: Outputs;
}

async function rate({ file, wanted, bins, json, outputs }: Asked, io: Io): Promise<number> {
  const source = new DiskSource();
  const { loaded, problems } = loadLabel(file, source);
  const clashes = outputs.overInputs(source.identities);
  await tellProblems([...clashes, ...problems], io);
  if (loaded === undefined || clashes.length > 0) return EXIT.wrongInput;
  const made = makeSeasons(loaded, wanted);
  await tellProblems(made.problems, io);
  if (made.answer === undefined) return EXIT.wrongInput;
  const document = seasonDocument(made.answer, io.version);
  await outputs.write(json, [documentText(document)]);
  await outputs.finish();
  if (!outputs.takesStdout) await io.stdout.write(seasonText(document, { bins }));
  return EXIT.done;
}
