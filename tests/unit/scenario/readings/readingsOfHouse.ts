import { problemText } from '../../../../src/core/problemText.ts';
import { fitAnswer } from '../../../../src/scenario/fit/fitAnswer.ts';
import { loadScenario } from '../../../../src/scenario/loadScenario.ts';
import { loadReadings } from '../../../../src/scenario/readings/loadReadings.ts';
import { memoryFiles } from '../memoryFiles.ts';
import { sampleFiles, scenarioText } from '../sampleFiles.ts';

/** A scenario with a section of readings; all values invented. */
export function withReadings(section: string): string {
  return `${scenarioText}readings: ${section}\n`;
}

/** Weather of 2024 whose months have one temperature each, °C. */
export function monthlyWeather(means: readonly number[]): string {
  const lines = ['time,temperature °C'];
  for (let at = Date.UTC(2024, 0, 1); at < Date.UTC(2025, 0, 1); at += 3_600_000) {
    const date = new Date(at);
    lines.push(`${date.toISOString().slice(0, 16)},${means[date.getUTCMonth()]}`);
  }
  return `${lines.join('\n')}\n`;
}

/** Use of the months of 2024 by day, written at the first of the next month. */
export function monthlyUse(daily: readonly number[], first = 0): string {
  const lines = ['date,use kWh', `2024-${String(first + 1).padStart(2, '0')}-01,`];
  daily.forEach((use, i) => {
    const month = first + i;
    const days = new Date(Date.UTC(2024, month + 1, 0)).getUTCDate();
    lines.push(`${new Date(Date.UTC(2024, month + 1, 1)).toISOString().slice(0, 10)},${use * days}`);
  });
  return `${lines.join('\n')}\n`;
}

/** Loads readings on the sample scenario. */
export function load(changes: Record<string, string>) {
  const source = memoryFiles(sampleFiles(changes));
  const { loaded, problems } = loadScenario('house.yaml', source);
  if (loaded === undefined) throw new Error(problems.map(problemText).join('\n'));
  return { loaded, ...loadReadings('meter.csv', loaded, source) };
}

/** The answer on the sample scenario, and the text of all problems. */
export function answerOn(changes: Record<string, string>) {
  const { loaded, readings, problems } = load(changes);
  const fitted = readings === undefined ? { problems: [] } : fitAnswer(loaded, readings);
  return {
    answer: 'answer' in fitted ? fitted.answer : undefined,
    texts: [...problems, ...fitted.problems].map(problemText),
  };
}
