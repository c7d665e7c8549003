import { pathOfText } from '../../src/scenario/entries/pathText.ts';
import type { Told } from '../model/formNode.ts';
import { state, words } from '../sheet.ts';
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
      <div aria-live="polite">
        {errors.length > 0 && <Faults title={said.noAnswer} told={errors} />}
        {now.answer?.sentences.map((sentence) => (
          <p class="sentence" key={sentence}>
            <bdi>{sentence}</bdi>
          </p>
        ))}
      </div>
      {warnings.length > 0 && <Faults title={said.warnings} told={warnings} />}
      <Figures />
    </section>
  );
}

function Faults({ title, told }: { readonly title: string; readonly told: readonly Told[] }) {
  return (
    <div class="faults">
      <h3>{title}</h3>
      <ul>
        {told.map(({ place, file, path, says, cure, severity }) => (
          <li key={place + path + says} class={severity} lang="en">
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
            {shown.cautions.map(({ plain, text, remedy }) => (
              <li key={text} class="warning">
                {plain} <span lang="en">{text}</span>{' '}
                <span class="cure" lang="en">
                  → {remedy}
                </span>
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
        <ul class="small" lang="en">
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
