import { describe, expect, it } from 'vitest';
import { explained } from '../../../web/model/explained.ts';
import type { FormNode } from '../../../web/model/formNode.ts';
import { SheetModel } from '../../../web/model/sheetModel.ts';
import { fileOf } from '../../../web/model/startFiles.ts';
import { soundFiles } from '../../fuzz/soundFiles.ts';
import { englishLeft } from '../report/language/englishLeft.ts';

/** The house in which everything is on that a scenario can hold, in German. */
function fullModel(change: (text: string) => string = (text) => text): SheetModel {
  const model = new SheetModel('1.2.3');
  const files = Object.entries(soundFiles).filter(
    ([name]) => !['house.yaml', 'tables.yaml', 'plan.yaml'].includes(name),
  );
  model.box.replace(
    files.map(([name, text]) => fileOf(name, name === 'full.yaml' ? change(text) : text)),
    'full.yaml',
  );
  model.language = 'de';
  return model;
}

/** What a form shows in words: labels, sentences, units, ranges, choices. */
function shownWords(node: FormNode): string[] {
  const own = [node.label, node.says, ...node.problems.flatMap(({ says, cure }) => [says, cure])];
  if (node.kind === 'section') return [...own, ...node.children.flatMap(shownWords)];
  if (node.kind === 'list') return [...own, ...node.items.flatMap(({ children }) => children.flatMap(shownWords))];
  const { unit = '', usual = '', assumed = '', choices = [] } = node;
  return [...own, unit, usual, assumed, ...choices.map(({ label }) => label)];
}

const expectGerman = (texts: readonly string[]) => {
  expect(texts.filter((text) => englishLeft(text) !== undefined)).toEqual([]);
};

describe('the sheet in German', () => {
  const model = fullModel();
  const state = model.state();

  it('has every field, unit and choice in German', () => {
    const nodes = [...state.parts, state.unit!, ...state.tariffs].flatMap((part) => part.nodes);
    const words = nodes.flatMap(shownWords);
    expect(words.length).toBeGreaterThan(500);
    expectGerman(words);
  });

  it('has answer, warnings, assumptions and the reading of the weather in German', () => {
    const { answer, weather, problems } = state;
    expect(answer?.assumptions.length).toBeGreaterThan(20);
    expect(weather?.lines.length).toBeGreaterThan(8);
    // names of tariffs and rates are the files' own
    expectGerman([
      ...answer!.cautions.flatMap(({ text, remedy }) => [text, remedy]),
      ...answer!.assumptions.map(({ text }) => text),
      ...weather!.lines.map((line) => line.replace(/„[^“]*“/g, '')),
      ...problems.flatMap(({ says, cure }) => [says, cure]),
      ...answer!.tiles.map(({ name }) => name),
    ]);
  });

  it('explains an hour in German', () => {
    const found = explained(model, 400)!;
    expectGerman(
      found.stages.flatMap(({ title, findings, figures, formulas }) => [
        title,
        ...findings.map(({ says }) => says),
        ...figures.map(({ label }) => label),
        ...formulas.map(({ says }) => says),
      ]),
    );
  });

  it('says what is wrong in German, at the field and beside the answer', () => {
    const wrong = fullModel((text) =>
      text.replace('setPoint: 50', 'setPoint: 500').replace('volume: 250', 'volumen: 250'),
    ).state();
    const says = wrong.problems.map((told) => `${told.says} → ${told.cure}`);
    expect(says).toContain(
      'hotWater.setPoint ist 500; eine Temperatur liegt zwischen 30 und 80 °C → prüfen Sie den Wert und seine Einheit',
    );
    expect(says).toContain('hotWater.volumen ist hier nicht bekannt → vielleicht ist volume gemeint');
  });
});
