import type { BesideState, PartState, SheetState } from '../model/sheetState.ts';
import { act, pictures, state, words } from '../sheet.ts';
import { Drawn } from './Drawn.tsx';
import { Fold } from './Fold.tsx';
import { fieldId } from './fieldId.ts';
import { Grid } from './Grid.tsx';
import { hasProblem, Nodes } from './Nodes.tsx';
import { Weather } from './Weather.tsx';

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

/** Entries that stand with their files, or behind them. */
const STAND_ELSEWHERE = new Set(['tariffs', 'backup']);

function Part({ part, now }: { readonly part: PartState; readonly now: SheetState }) {
  const said = words.value;
  return (
    <section class="part" id={`part-${part.id}`} aria-labelledby={`title-${part.id}`}>
      <h3 id={`title-${part.id}`}>{said.parts[part.id]}</h3>
      {part.nodes.length === 0 && <p>{said.gone}</p>}
      {part.id === 'tariffs' && <Tariffs now={now} />}
      <Nodes nodes={part.nodes.filter(({ path }) => !STAND_ELSEWHERE.has(String(path[0])))} />
      {part.id === 'place' && now.weather !== undefined && <Weather weather={now.weather} />}
      {part.id === 'heatPump' && (
        <>
          <Unit now={now} />
          <Nodes nodes={part.nodes.filter(({ path }) => path[0] === 'backup')} />
        </>
      )}
    </section>
  );
}

function Unit({ now: { unit, grids } }: { readonly now: SheetState }) {
  const said = words.value;
  if (unit === undefined) return null;
  return (
    <fieldset class="beside">
      <legend>{unit.name}</legend>
      <p class="says">{said.grid.says}</p>
      <div class="grids">
        {grids.map((grid) => (
          <Grid key={grid.path.join('.')} grid={grid} all={grids} />
        ))}
      </div>
      {pictures.value?.map !== undefined && <Drawn html={pictures.value.map} class="map" />}
      <Nodes nodes={unit.nodes} />
      <FileText name={unit.name} text={unit.text} />
    </fieldset>
  );
}

function Tariffs({ now: { tariffs } }: { readonly now: SheetState }) {
  const said = words.value;
  return (
    <>
      {tariffs.map((tariff: BesideState) => (
        <Fold key={tariff.name} class="beside" name={titleOf(tariff)} wrong={tariff.nodes.some(hasProblem)}>
          <Nodes nodes={tariff.nodes} />
          <FileText name={tariff.name} text={tariff.text} />
          <button type="button" class="quiet" onClick={() => act({ do: 'removeTariff', name: tariff.name })}>
            {said.remove(tariff.name)}
          </button>
        </Fold>
      ))}
      <p>
        <button type="button" onClick={() => act({ do: 'addTariff' })}>
          {said.addTariff}
        </button>
      </p>
    </>
  );
}

/** What a tariff is called, and its file. */
function titleOf({ name, nodes }: BesideState): string {
  const title = nodes.find(({ path }) => path[0] === 'name');
  return title?.kind === 'field' && title.written !== '' ? `${title.written} (${name})` : name;
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
