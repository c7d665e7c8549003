import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { parseArgs } from 'node:util';
import { drawMutants } from './draw.ts';
import { equivalents } from './equivalents.ts';
import { typescriptIn } from './guards.ts';
import { failureOf, judge, stages, type Verdict } from './judge.ts';
import { type Mutant, mutantsOf } from './mutants.ts';
import { privateCopy } from './privateCopy.ts';

/** Share of the broken lines that the tests must notice. */
const LEAST_SHARE = 0.95;

const { values } = parseArgs({
  options: {
    count: { type: 'string', default: '160' },
    seed: { type: 'string', default: '1' },
    // only files whose path holds this
    in: { type: 'string', default: '' },
  },
});

const folder = privateCopy(process.cwd());
const files = ['src/sim', 'src/tariffs'].flatMap((room) => typescriptIn(folder, room));
const asked = files.filter((file) => file.includes(values.in));
const all = asked.flatMap((file) => mutantsOf(file, readFileSync(join(folder, file), 'utf8')));
const drawn = drawMutants(all, Number(values.count), Number(values.seed));

const tests = new Set(drawn.flatMap(({ file }) => stages(folder, file).flatMap(([, found]) => found)));
if (failureOf(folder, [...tests], 'shown') !== undefined) {
  console.error('the tests do not pass on the sound code: nothing can be said of broken code');
  process.exit(2);
}

console.log(`${drawn.length} of ${all.length} changes in ${asked.length} files, seed ${values.seed}`);
const verdicts: Verdict[] = [];
for (const mutant of drawn) {
  const argued = equivalentOf(mutant);
  if (argued !== undefined) {
    console.log(`${placeOf(mutant)}  changes nothing: ${argued}`);
    continue;
  }
  const verdict = judge(folder, mutant);
  verdicts.push(verdict);
  console.log(`${placeOf(mutant)}  ${verdict.noticedBy ?? 'SURVIVED'}`);
}

const survivors = verdicts.filter(({ noticedBy }) => noticedBy === undefined);
const share = verdicts.length === 0 ? 1 : 1 - survivors.length / verdicts.length;
console.log(`\n${verdicts.length - survivors.length} of ${verdicts.length} noticed, ${(100 * share).toFixed(1)} %`);
for (const { mutant } of survivors) console.log(`survived: ${placeOf(mutant)}\n    ${mutant.text}`);
process.exitCode = share >= LEAST_SHARE ? 0 : 1;

function placeOf({ file, line, column, was, becomes }: Mutant): string {
  return `${file}:${line}:${column}  ${was.trim()} → ${becomes.trim()}`;
}

function equivalentOf(mutant: Mutant): string | undefined {
  const same = equivalents.find(
    ({ file, text, was, becomes }) =>
      file === mutant.file && text === mutant.text && was === mutant.was.trim() && becomes === mutant.becomes.trim(),
  );
  return same?.why;
}
