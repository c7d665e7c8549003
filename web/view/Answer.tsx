import { pathOfText } from '../../src/scenario/entries/pathText.ts';
import type { Told } from '../model/formNode.ts';
import type { ShownAnswer } from '../model/sheetState.ts';
import { state, words } from '../sheet.ts';
import { Announced } from './Announced.tsx';
import { Drawn } from './Drawn.tsx';
import { fieldId } from './fieldId.ts';
import { Hours } from './Hours.tsx';
import { WhatIf } from './WhatIf.tsx';

/** The answer beside the fields: sentences, figures, costs, months, and what to look at. */
export function AnswerPane() {
  const now = state.value;
  if (now === undefined) return null;
  const said = words.value;
  const errors = now.problems.filter(({ severity }) => severity === 'error');
  const warnings = now.problems.filter(({ severity }) => severity === 'warning');
  return (
    <section class="answer" id="answer" aria-labelledby="answer-title" tabIndex={-1}>
      <h2 id="answer-title">{said.answer}</h2>
      {errors.length > 0 && <Faults title={said.noAnswer} told={errors} />}
      {now.answer?.sentences.map((sentence, i) => (
        <p class="sentence" key={i}>
          <bdi>{sentence}</bdi>
        </p>
      ))}
      <Announced text={errors.length > 0 ? `${said.noAnswer} ${errors[0].says}` : sentencesOf(now.answer)} />
      {warnings.length > 0 && <Faults title={said.warnings} told={warnings} />}
      <Figures />
    </section>
  );
}

/** On a narrow window the answer stands above the entries: this line keeps it in sight while they are changed. */
export function Shortcut() {
  const now = state.value;
  if (now === undefined) return null;
  const said = words.value;
  const figures = now.answer?.tiles.filter(({ unit }, i) => i === 0 || (i === 3 && unit !== '')) ?? [];
  const text = figures.map(({ value, unit }) => `${value}\u00a0${unit}`).join(' · ');
  return (
    <nav class="shortcut" aria-label={said.shortcut}>
      <a href="#answer">{text === '' ? said.answer : text}</a>
      <a href="#entries">{said.entries}</a>
    </nav>
  );
}

function sentencesOf(answer: ShownAnswer | undefined): string {
  return answer?.sentences.join(' ') ?? '';
}

function Faults({ title, told }: { readonly title: string; readonly told: readonly Told[] }) {
  return (
    <div class="faults">
      <h3>{title}</h3>
      <ul>
        {told.map(({ place, file, path, says, cure, severity }) => (
          <li key={place + path + says} class={severity}>
            <a href={`#${fieldId(file, pathOfText(path))}`}>{place}</a> <bdi>{says}</bdi>{' '}
            <span class="cure">→ {cure}</span>
          </li>
        ))}
      </ul>
    </div>
  );
}

function Figures() {
  const shown = state.value?.answer;
  if (shown === undefined) return null;
  const said = words.value;
  return (
    <>
      <dl class="tiles">
        {shown.tiles.map(({ name, value, unit }) => (
          <div key={name}>
            <dt>{name}</dt>
            <dd>
              {value} <small>{unit}</small>
            </dd>
          </div>
        ))}
      </dl>
      <ul class="bars">
        {shown.bars.map(({ name, value, strip }, i) => (
          <li key={`${i} ${name}`}>
            <bdi>{name}</bdi> <b>{value}</b>
            <Drawn html={strip} class="bar" />
          </li>
        ))}
      </ul>
      {shown.cautions.length > 0 && (
        <div class="faults">
          <h3>{said.warnings}</h3>
          <ul>
            {shown.cautions.map(({ text, remedy }) => (
              <li key={text} class="warning">
                <span>{text}</span> <span class="cure">→ {remedy}</span>
              </li>
            ))}
          </ul>
        </div>
      )}
      <Drawn html={shown.months} class="months" />
      <WhatIf />
      <Hours />
      <details>
        <summary>{said.assumptions}</summary>
        <ul class="small">
          {shown.assumptions.map(({ path, text }) => (
            <li key={path + text}>
              <code>{path}</code> {text}
            </li>
          ))}
        </ul>
      </details>
    </>
  );
}
