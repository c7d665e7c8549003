import { relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import { DiskSource } from '../../../cli/diskSource.ts';
import type { Answer } from '../../../src/scenario/answer/answer.ts';
import { makeAnswer } from '../../../src/scenario/answer/makeAnswer.ts';
import { type FileSource, isProblem } from '../../../src/scenario/fileSource.ts';
import { loadScenario } from '../../../src/scenario/loadScenario.ts';

// From the working folder, so that no result holds the place of this folder on the machine.
const HOUSE = relative(process.cwd(), fileURLToPath(new URL('../../../data/demo/house.yaml', import.meta.url)));

/** The demo's own hot water with its comment, up to the next section. */
const OWN_HOT_WATER = /# Hot water for three people[\s\S]*?(?=# Electric heater)/;

/** The answer of the demo as it is. */
export function wholeDemoAnswer(): Answer {
  return answerOf((text) => text);
}

/**
 * The answer of the demo without its hot water, with passages of its scenario replaced.
 *
 * @param changes passage and replacement; every passage stands in the scenario once
 */
export function demoAnswer(...changes: readonly [string, string][]): Answer {
  return answerOf((text) => changed(withoutHotWater(text), changes));
}

function withoutHotWater(text: string): string {
  const without = text.replace(OWN_HOT_WATER, '');
  if (without === text) throw new Error('the demo has no hot water to take out');
  return without;
}

function answerOf(change: (text: string) => string): Answer {
  const { loaded, problems } = loadScenario(HOUSE, changedSource(change));
  if (loaded === undefined) throw new Error(JSON.stringify(problems));
  const { answer } = makeAnswer(loaded, problems);
  if (answer === undefined) throw new Error('no answer');
  return answer;
}

function changedSource(change: (text: string) => string): FileSource {
  const disk = new DiskSource();
  return {
    read(name, from) {
      const read = disk.read(name, from);
      if (isProblem(read) || read.name !== HOUSE) return read;
      return { ...read, bytes: new TextEncoder().encode(change(new TextDecoder().decode(read.bytes))) };
    },
  };
}

function changed(text: string, changes: readonly [string, string][]): string {
  return changes.reduce((changing, [passage, by]) => {
    if (changing.split(passage).length !== 2) throw new Error(`'${passage}' does not stand in the scenario once`);
    return changing.replace(passage, by);
  }, text);
}

/** A cylinder with a profile, for the demo's house. */
export const HOT_WATER: [string, string] = [
  'backup:\n',
  'hotWater:\n  volume: 200\n  loss: { given: standingLoss, value: 1.8 }\n  draw: { given: profile, profile: L }\nbackup:\n',
];

/** The demo's house with mass instead of degree hours. */
export const WITH_MASS: [string, string] = ['model: degreeHours', 'model: lumped'];

/** Below freezing the unit rests and its crankcase heater runs. */
export const RESTING_IN_COLD: [string, string] = ['{ kind: parallel }', '{ kind: alternative, switchTemperature: 0 }'];
