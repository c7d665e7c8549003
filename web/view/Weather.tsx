import type { WeatherState } from '../model/sheetState.ts';
import { act, words } from '../sheet.ts';
import { Problems } from './Field.tsx';
import { fieldId } from './fieldId.ts';
import { Nodes } from './Nodes.tsx';

/** How the weather file was understood, and where that can be put right. */
export function Weather({ weather }: { readonly weather: WeatherState }) {
  const said = words.value;
  const { read, lines, head } = weather;
  return (
    <fieldset class="beside" id={fieldId(read.file, read.path)} tabIndex={-1}>
      <legend>
        {said.weatherLines} (<bdi>{weather.file}</bdi>)
      </legend>
      <Problems problems={read.problems} />
      <ul class="small">
        {lines.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
      {weather.columns.length > 0 && <Columns weather={weather} />}
      <details>
        <summary>{said.weatherHead}</summary>
        {/* biome-ignore lint/a11y/noNoninteractiveTabindex: a block that scrolls is reached by keys */}
        <pre tabIndex={0}>{head.join('\n')}</pre>
      </details>
      <Nodes nodes={read.children} />
    </fieldset>
  );
}

/** The first rows of the file, each column with what it is used for. */
function Columns({ weather: { columns, uses } }: { readonly weather: WeatherState }) {
  const said = words.value;
  const rows = columns[0]?.samples.length ?? 0;
  return (
    <>
      <p class="says">{said.columnsSay}</p>
      {/* biome-ignore lint/a11y/noNoninteractiveTabindex: a table that scrolls is reached by keys */}
      <section class="wide" tabIndex={0} aria-label={said.columns}>
        <table class="columns">
          <thead>
            <tr>
              {columns.map(({ name, key }, i) => (
                <th scope="col" key={key}>
                  <bdi>{name === '' ? said.column(i + 1) : name}</bdi>
                </th>
              ))}
            </tr>
            <tr>
              {columns.map((column, i) => (
                <td key={column.key}>
                  <select
                    aria-label={said.columnUse(column.name === '' ? said.column(i + 1) : column.name)}
                    value={column.use ?? ''}
                    onChange={(event) => {
                      const use = uses.find(({ value }) => value === event.currentTarget.value)?.value;
                      act({ do: 'column', column, ...(use === undefined ? {} : { use }) });
                    }}
                  >
                    <option value="">{said.unused}</option>
                    {uses.map(({ value, label }) => (
                      <option key={value} value={value}>
                        {label}
                      </option>
                    ))}
                  </select>
                </td>
              ))}
            </tr>
          </thead>
          <tbody>
            {Array.from({ length: rows }, (_, r) => (
              <tr key={r}>
                {columns.map(({ key, samples }) => (
                  <td key={key}>{samples[r]}</td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </section>
    </>
  );
}
