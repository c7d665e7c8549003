import { decodeText } from '../../src/core/decodeText.ts';
import type { Problem } from '../../src/core/problem.ts';
import { type DataBlock, readDataBlock } from '../../src/report/html/dataBlock.ts';
import { makeReport } from '../../src/report/html/makeReport.ts';
import { reportPage } from '../../src/report/html/reportPage.ts';
import { firstDifference, heldFigures, heldFiles } from '../../src/report/html/verification.ts';
import { holds, type Verification, verificationText } from '../../src/report/html/verificationText.ts';
import { isProblem } from '../../src/scenario/fileSource.ts';
import { DiskSource } from '../diskSource.ts';
import { EmbeddedScenario } from '../embeddedScenario.ts';
import { type CommandInput, EXIT, type Io } from '../io.ts';
import { tellProblems } from '../tellProblems.ts';

/** Makes a report again and says what of it holds: exit code 0 all, 1 not all, 2 where it cannot be made again. */
export async function run({ files }: CommandInput, io: Io): Promise<number> {
  const [file] = files;
  const disk = new DiskSource();
  const read = disk.read(file);
  if (isProblem(read)) {
    await tellProblems([read], io);
    return EXIT.wrongInput;
  }
  const page = decodeText(read.bytes).text;
  const block = readDataBlock(page);
  if (typeof block === 'string') {
    await tellProblems([unreadable(file, block)], io);
    return EXIT.wrongInput;
  }
  const { verification, problems } = verify({ file, page, block }, disk, io.version);
  // Warnings of the scenario stand in the report itself.
  await tellProblems(verification === undefined ? problems : [], io);
  if (verification === undefined) return EXIT.wrongInput;
  await io.stdout.write(verificationText(verification));
  return holds(verification) ? EXIT.done : EXIT.partlyDone;
}

function unreadable(file: string, why: 'absent' | 'broken'): Problem {
  return { code: why === 'absent' ? 'report.no-data' : 'report.broken-data', severity: 'error', file };
}

interface Report {
  readonly file: string;
  readonly page: string;
  readonly block: DataBlock;
}

function verify(
  { file, page, block }: Report,
  disk: DiskSource,
  version: string,
): { verification?: Verification; problems: Problem[] } {
  const { scenario, language, date, result } = block;
  const source = new EmbeddedScenario(scenario, disk);
  // The page is made under the version that it names, so that only what it says can differ.
  const { input, problems } = makeReport(scenario.file, source, { language, date, version: result.version });
  if (input === undefined) return { problems };
  const files = heldFiles(result.inputs, input.document.inputs);
  const figures = heldFigures(result, input.document);
  const rests = files.every(({ held }) => held) && figures.differences.length === 0;
  const verification: Verification = {
    file,
    scenario: scenario.file,
    version: { was: result.version, is: version },
    files,
    figures,
    page: rests ? firstDifference(page, reportPage(input)) : 'not looked at',
  };
  return { verification, problems };
}
