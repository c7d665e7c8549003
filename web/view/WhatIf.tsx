import { signal } from '@preact/signals';
import { useEffect } from 'preact/hooks';
import { localFigures } from '../../src/report/language/localFigures.ts';
import { ask } from '../askWorker.ts';
import type { Changes, VariantResult } from '../model/whatIfRun.ts';
import { fault, language, revision, words } from '../sheet.ts';

const NOTHING: Changes = { flow: 0, rooms: 0, heatLoss: 0, size: 0, electricity: 0, fuel: 0 };
const MOST_KEPT = 4;

/** How far a slider goes, in the units that it shows, and what one of them means. */
const REACH = {
  flow: { least: -15, most: 15, unit: 1 },
  rooms: { least: -4, most: 4, unit: 1 },
  heatLoss: { least: -60, most: 60, unit: 0.01 },
  size: { least: -60, most: 100, unit: 0.01 },
  electricity: { least: -60, most: 100, unit: 0.01 },
  fuel: { least: -60, most: 100, unit: 0.01 },
} as const;

type Result = VariantResult | 'refused';

interface Variant {
  readonly number: number;
  readonly changes: Changes;
  readonly result: Result | undefined;
}

const changes = signal<Changes>(NOTHING);
const base = signal<Result | undefined>(undefined);
const present = signal<Result | undefined>(undefined);
const kept = signal<readonly Variant[]>([]);
let lastNumber = 0;

async function run(of: Changes): Promise<Result> {
  return (await ask('variant', of)) ?? 'refused';
}

/** Runs the files as they are and with the sliders; what came for sliders that have moved on is dropped. */
async function runSliders(of: Changes): Promise<void> {
  const [asFiled, now] = await Promise.all([run(NOTHING), run(of)]);
  base.value = asFiled;
  if (changes.value === of) present.value = now;
}

async function runKept({ number, changes: of }: Variant): Promise<void> {
  const result = await run(of);
  kept.value = kept.value.map((one) => (one.number === number ? { ...one, result } : one));
}

function tell(problem: unknown): void {
  fault.value = String(problem);
}

/** Sliders over the answer, and variants side by side. */
export function WhatIf() {
  const said = words.value;
  const of = changes.value;
  const files = revision.value;
  useEffect(() => {
    // files are named so that a change of theirs runs the variants anew
    void files;
    const later = setTimeout(() => {
      runSliders(of).catch(tell);
    }, 60);
    return () => clearTimeout(later);
  }, [of, files]);
  useEffect(() => {
    void files;
    for (const one of kept.value) runKept(one).catch(tell);
  }, [files]);
  const keep = () => {
    lastNumber++;
    const variant = { number: lastNumber, changes: of, result: undefined };
    kept.value = [...kept.value, variant].slice(-MOST_KEPT);
    runKept(variant).catch(tell);
  };
  return (
    <section class="whatif" aria-labelledby="whatif">
      <h3 id="whatif">{said.whatIf}</h3>
      <p class="says">{said.whatIfSays}</p>
      <div class="sliders">
        {(Object.keys(REACH) as (keyof Changes)[]).map((name) => (
          <Slider key={name} name={name} />
        ))}
      </div>
      <Compared />
      <p>
        <button type="button" onClick={keep}>
          {said.keep}
        </button>{' '}
        <button
          type="button"
          class="quiet"
          onClick={() => {
            changes.value = NOTHING;
          }}
        >
          {said.reset}
        </button>
      </p>
    </section>
  );
}

function Slider({ name }: { readonly name: keyof Changes }) {
  const { least, most, unit } = REACH[name];
  const shown = Math.round(changes.value[name] / unit);
  const value = shown > 0 ? `+${shown}` : String(shown).replace('-', '−');
  const id = `slider-${name}`;
  return (
    <div>
      <label for={id}>{words.value.sliders[name]}</label> <b aria-hidden="true">{value}</b>
      <input
        id={id}
        type="range"
        aria-valuetext={value}
        min={least}
        max={most}
        step={1}
        value={shown}
        onInput={(event) => {
          changes.value = { ...changes.value, [name]: event.currentTarget.valueAsNumber * unit };
        }}
      />
    </div>
  );
}

function Compared() {
  const said = words.value;
  const columns = [
    { name: said.asFiled, result: base.value },
    { name: said.now, result: present.value },
    ...kept.value.map((one) => ({ name: said.variant(one.number), result: one.result, variant: one })),
  ];
  const now = present.value;
  return (
    <>
      {/* biome-ignore lint/a11y/noNoninteractiveTabindex: a table that scrolls is reached by keys */}
      <section class="wide" tabIndex={0} aria-label={said.beside}>
        <table>
          <thead>
            <tr>
              <td />
              {columns.map(({ name, ...column }) => (
                <th scope="col" key={name}>
                  {name}
                  {'variant' in column && column.variant !== undefined && <About variant={column.variant} />}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {(Object.keys(said.rows) as (keyof typeof said.rows)[]).map((row) => (
              <tr key={row}>
                <th scope="row">{said.rows[row]}</th>
                {columns.map(({ name, result }, i) => (
                  <td key={name}>
                    {cellText(row, result)}
                    {i > 0 && <small class="difference">{differenceText(row, result, base.value)}</small>}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </section>
      {now === 'refused' && <p class="warning">{said.variantRefused}</p>}
      {now !== undefined && now !== 'refused' && now.idle.length > 0 && (
        <p class="warning">{said.idle(now.idle.map((name) => said.sliders[name]).join('; '))}</p>
      )}
    </>
  );
}

function About({ variant }: { readonly variant: Variant }) {
  const said = words.value;
  const parts = (Object.keys(REACH) as (keyof Changes)[]).flatMap((name) => {
    const shown = Math.round(variant.changes[name] / REACH[name].unit);
    return shown === 0 ? [] : [`${said.sliders[name]} ${shown > 0 ? '+' : '−'}${Math.abs(shown)}`];
  });
  return (
    <>
      <small>{parts.join('; ')}</small>
      <button
        type="button"
        class="quiet"
        aria-label={`${said.drop1}: ${said.variant(variant.number)}`}
        onClick={() => {
          kept.value = kept.value.filter((other) => other !== variant);
        }}
      >
        {said.drop1}
      </button>
    </>
  );
}

/** Decimals of each figure. */
const DECIMALS = { electricity: 0, factor: 2, backupHours: 0, unmetHeat: 0, cost: 0, boiler: 0 } as const;
type Row = keyof typeof DECIMALS;

function cellText(row: Row, result: Result | undefined): string {
  const value = figureOf(row, result);
  if (value === undefined || result === undefined || result === 'refused') return '–';
  const figures = localFigures(language.value === 'de' ? ',' : '.');
  const isMoney = row === 'cost' || row === 'boiler';
  return isMoney ? figures.money(value, result.currency) : figures.number(value, DECIMALS[row]);
}

/** How much more or less than as filed, with its sign; nothing where it prints as none. */
function differenceText(row: Row, result: Result | undefined, filed: Result | undefined): string {
  const [value, other] = [figureOf(row, result), figureOf(row, filed)];
  if (value === undefined || other === undefined) return '';
  const text = localFigures(language.value === 'de' ? ',' : '.').number(Math.abs(value - other), DECIMALS[row]);
  return /[1-9]/.test(text) ? `${value > other ? '+' : '−'}${text}` : '';
}

function figureOf(row: Row, result: Result | undefined): number | undefined {
  if (result === undefined || result === 'refused') return undefined;
  if (row === 'boiler') return result.boilerCost;
  if (row === 'factor') return typeof result.factor === 'number' ? result.factor : undefined;
  return result[row];
}
