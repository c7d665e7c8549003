import { readFileSync } from 'node:fs';
import { DiskSource } from '../../cli/diskSource.ts';
import packageFile from '../../package.json' with { type: 'json' };
import { answerText } from '../../src/report/answerText.ts';
import { resultDocument } from '../../src/report/resultDocument.ts';
import { makeAnswer } from '../../src/scenario/answer/makeAnswer.ts';
import { loadScenario } from '../../src/scenario/loadScenario.ts';

const BEGIN = '<!-- demo answer: written by npm run generate -->\n';
const END = '<!-- end of the demo answer -->';

/** The README with the demo's answer in it as the program prints it. */
export function readmeWithAnswer(): string {
  const readme = readFileSync('README.md', 'utf8');
  const from = readme.indexOf(BEGIN) + BEGIN.length;
  const to = readme.indexOf(END);
  return `${readme.slice(0, from)}\n\`\`\`text\n${demoAnswer()}\`\`\`\n\n${readme.slice(to)}`;
}

function demoAnswer(): string {
  const { loaded, problems } = loadScenario('data/demo/house.yaml', new DiskSource());
  if (loaded === undefined) throw new Error('the demo house does not load');
  const { answer } = makeAnswer(loaded, problems);
  if (answer === undefined) throw new Error('the demo house has no answer');
  return answerText(resultDocument(answer, packageFile.version));
}
