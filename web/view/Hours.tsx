import { useState } from 'preact/hooks';
import type { ExplainDocument } from '../../src/report/explainSchema.ts';
import { explain, explainedHour, language, pictures, state, words } from '../sheet.ts';
import { Announced } from './Announced.tsx';
import { Drawn } from './Drawn.tsx';
import { hourOfClick } from './hourOfClick.ts';

/** The year as pictures; an hour that is clicked, or chosen below them, is explained. */
export function Hours() {
  const [day, setDay] = useState(15);
  const [hour, setHour] = useState(6);
  const said = words.value;
  const drawn = pictures.value;
  const days = state.value?.answer?.days;
  if (days === undefined || drawn === undefined || drawn.carpets.length === 0) return null;
  const click = (event: MouseEvent) => {
    const drawing = event.target instanceof Element ? event.target.closest('svg') : null;
    const matrix = drawing?.getScreenCTM();
    if (!matrix) return;
    const point = new DOMPoint(event.clientX, event.clientY).matrixTransform(matrix.inverse());
    const found = hourOfClick(point.x, point.y, days);
    if (found === undefined) return;
    setDay(Math.floor(found / 24) + 1);
    setHour(found % 24);
    explain(found);
  };
  return (
    <section class="hours" aria-labelledby="hours">
      <h3 id="hours">{said.hours}</h3>
      <p class="says">{said.pick}</p>
      {/* biome-ignore lint/a11y/noStaticElementInteractions lint/a11y/useKeyWithClickEvents: the fields below do the same by keys */}
      <div class="carpets" onClick={click}>
        {drawn.carpets.map((html) => (
          <Drawn key={html.slice(0, 200)} html={html} />
        ))}
      </div>
      <form
        class="pick"
        onSubmit={(event) => {
          event.preventDefault();
          explain(24 * (day - 1) + hour);
        }}
      >
        <label>
          {said.pickDay}
          <input type="number" min={1} max={days} value={day} onInput={(e) => setDay(e.currentTarget.valueAsNumber)} />
        </label>
        <label>
          {said.pickHour}
          <input type="number" min={0} max={23} value={hour} onInput={(e) => setHour(e.currentTarget.valueAsNumber)} />
        </label>
        <button type="submit">{said.show}</button>
      </form>
      <Announced text={explainedHour.value?.hour.civilTime ?? ''} />
      {explainedHour.value !== undefined && <Explained found={explainedHour.value} />}
    </section>
  );
}

function Explained({ found }: { readonly found: ExplainDocument }) {
  return (
    <div class="explained">
      <h4>{found.hour.civilTime}</h4>
      {found.stages.map((stage) => (
        <details key={stage.stage} open={stage.figures.length > 0 && stage.stage !== 'lowestMap'}>
          <summary>{stage.title}</summary>
          {stage.findings.map(({ says }) => (
            <p key={says}>{says}</p>
          ))}
          <dl>
            {stage.figures.map(({ name, label, value, unit }) => (
              <div key={name}>
                <dt>{label}</dt>
                <dd>
                  {sixDigits(value)} {unit === '1' ? '' : unit}
                </dd>
              </div>
            ))}
          </dl>
          {stage.formulas.map(({ says, section }) => (
            <p class="small" key={says}>
              {says} ({section})
            </p>
          ))}
        </details>
      ))}
    </div>
  );
}

function sixDigits(value: number): string {
  const text = String(Number(value.toPrecision(6))).replace('-', '−');
  return language.value === 'de' ? text.replace('.', ',') : text;
}
