import type { BesideState, PartState, SheetState } from '../model/sheetState.ts';
import { act, pictures, state, words } from '../sheet.ts';
import { Drawn } from './Drawn.tsx';
import { fieldId } from './fieldId.ts';
import { Grid } from './Grid.tsx';
import { Nodes } from './Nodes.tsx';

/** The parts of the visit, each with its fields and the files that belong to it. */
export function Parts() {
  const now = state.value;
  if (now === undefined) return null;
  const said = words.value;
  return (
    <section class="entries" aria-labelledby="entries">
      <h2 id="entries">{said.entries}</h2>
      <nav aria-label={said.entries}>
        {now.parts.map(({ id }) => (
          <a key={id} href={`#part-${id}`}>
            {said.parts[id]}
          </a>
        ))}
      </nav>
      {now.parts.map((part) => (
        <Part key={part.id} part={part} now={now} />
      ))}
      <FileText name={now.scenario} text={now.text} />
    </section>
  );
}

function Part({ part, now }: { readonly part: PartState; readonly now: SheetState }) {
  const said = words.value;
  return (
    <section class="part" id={`part-${part.id}`} aria-labelledby={`title-${part.id}`}>
      <h3 id={`title-${part.id}`}>{said.parts[part.id]}</h3>
      {part.nodes.length === 0 && <p>{said.gone}</p>}
      {part.id === 'tariffs' && <Tariffs now={now} />}
      <Nodes nodes={part.nodes.filter(({ path }) => path[0] !== 'tariffs')} />
      {part.id === 'place' && <Weather now={now} />}
      {part.id === 'heatPump' && <Unit now={now} />}
    </section>
  );
}

function Weather({ now: { weather } }: { readonly now: SheetState }) {
  const said = words.value;
  if (weather === undefined) return null;
  return (
    <div class="beside">
      <h4>{said.weatherLines}</h4>
      <ul class="small" lang="en">
        {weather.lines.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
      <details>
        <summary>{said.weatherHead}</summary>
        {/* biome-ignore lint/a11y/noNoninteractiveTabindex: a block that scrolls is reached by keys */}
        <pre tabIndex={0}>{weather.head.join('\n')}</pre>
      </details>
    </div>
  );
}

function Unit({ now: { unit, grids } }: { readonly now: SheetState }) {
  const said = words.value;
  if (unit === undefined) return null;
  return (
    <fieldset class="beside">
      <legend>{unit.name}</legend>
      <p class="says">{said.grid.says}</p>
      {grids.map((grid) => (
        <Grid key={grid.path.join('.')} grid={grid} />
      ))}
      <Nodes nodes={unit.nodes} />
      {pictures.value !== undefined && <Drawn html={pictures.value.map} />}
      <FileText name={unit.name} text={unit.text} />
    </fieldset>
  );
}

function Tariffs({ now: { tariffs } }: { readonly now: SheetState }) {
  const said = words.value;
  return (
    <>
      {tariffs.map((tariff: BesideState) => (
        <fieldset class="beside" key={tariff.name}>
          <legend>{tariff.name}</legend>
          <Nodes nodes={tariff.nodes} />
          <FileText name={tariff.name} text={tariff.text} />
          <button type="button" class="quiet" onClick={() => act({ do: 'removeTariff', name: tariff.name })}>
            {said.remove(tariff.name)}
          </button>
        </fieldset>
      ))}
      <p>
        <button type="button" onClick={() => act({ do: 'addTariff' })}>
          {said.addTariff}
        </button>
      </p>
    </>
  );
}

function FileText({ name, text }: { readonly name: string; readonly text: string }) {
  const said = words.value;
  const id = `${fieldId(name, [])}text`;
  return (
    <details>
      <summary>{said.text(name)}</summary>
      <label for={id} class="says">
        {said.textSays}
      </label>
      <textarea
        id={id}
        spellcheck={false}
        rows={16}
        value={text}
        onInput={(event) => act({ do: 'text', file: name, text: event.currentTarget.value })}
      />
    </details>
  );
}
