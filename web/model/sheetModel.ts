import * as z from 'zod';
import { hasErrors, type Problem, visibleText } from '../../src/core/problem.ts';
import { type ProblemLanguage, saidIn } from '../../src/core/problemText.ts';
import type { ReportInput } from '../../src/report/html/reportInput.ts';
import { inLanguage } from '../../src/report/language/inLanguage.ts';
import type { Language } from '../../src/report/language/languages.ts';
import type { Messages } from '../../src/report/language/messages.ts';
import { resultDocument } from '../../src/report/resultDocument.ts';
import type { Answer } from '../../src/scenario/answer/answer.ts';
import { bare, entryOf } from '../../src/scenario/entries/schemaField.ts';
import { isProblem } from '../../src/scenario/fileSource.ts';
import { Kept } from '../../src/scenario/kept.ts';
import { type LoadedUnit, loadUnit } from '../../src/scenario/loadUnit.ts';
import { weatherFrom, weathers } from '../../src/scenario/loadWeather.ts';
import { readSchema } from '../../src/scenario/readSchema.ts';
import { scenarioSchema } from '../../src/scenario/scenarioSchema.ts';
import { tariffSchema } from '../../src/scenario/tariffSchema.ts';
import { unitSchema } from '../../src/scenario/unitSchema.ts';
import { parseYaml } from '../../src/scenario/yaml/parseYaml.ts';
import type { YamlFile } from '../../src/scenario/yaml/yamlFile.ts';
import { recognisedLines } from '../../src/weather/read/recognisedLines.ts';
import { FileBox } from './fileBox.ts';
import type { FormNode, Told } from './formNode.ts';
import { childrenOf, type FormContext, formOf } from './formOf.ts';
import { keptAnswer } from './keptAnswer.ts';
import { keyNames } from './keyNames.ts';
import { type MapGrid, mapGrids } from './mapTables.ts';
import type { BesideState, SheetState, WeatherPreview, WeatherState } from './sheetState.ts';
import { shownAnswer } from './shownAnswer.ts';
import { VISIT } from './visit.ts';
import { COLUMN_USES, weatherColumns } from './weatherColumns.ts';

/** Keys that a unit shows as grids instead of fields. */
const SHOWN_AS_GRIDS = new Set(['map', 'label']);
const HEAD_LINES = 6;

/** The sheet without its looks: files in, fields and answer out. */
export class SheetModel {
  readonly box = new FileBox();
  readonly version: string;
  language: Language = 'en';
  /** Files of keys and values that were parsed, by their bytes. */
  readonly #parsed = new WeakMap<Uint8Array, YamlFile>();
  #kept = new Kept();
  #keptOf = -1;
  #answer: { of: string; answer?: Answer; problems: Problem[] } | undefined;
  #weather: { key: string; preview: WeatherPreview } | undefined;

  /** @param version of the program, as results name it */
  constructor(version: string) {
    z.config({ jitless: true });
    this.version = version;
  }

  /** What the files other than the scenario became; good for a variant of it too. */
  get kept(): Kept {
    const { othersChanged } = this.box;
    if (this.#keptOf !== othersChanged) this.#kept = this.#keptAnew();
    this.#keptOf = othersChanged;
    return this.#kept;
  }

  /** Nothing but the weather files that have not changed: reading one takes longer than all else together. */
  #keptAnew(): Kept {
    const kept = new Kept();
    const { source } = this.box;
    const changed = this.box.takeChanged();
    const isSame = ([key]: readonly [string, unknown]) => {
      const { file } = source.find(String(JSON.parse(key)[0]));
      return file !== undefined && !changed.has(file.name);
    };
    weathers.put(kept, weathers.entriesOf(this.#kept).filter(isSame));
    return kept;
  }

  /** The answer of the files as they are, with the problems of all of them. */
  get answer(): { answer?: Answer; problems: readonly Problem[] } {
    const { box } = this;
    const of = `${box.othersChanged} ${box.scenario} ${box.text(box.scenario)}`;
    if (this.#answer?.of === of) return this.#answer;
    this.#answer = { of, ...keptAnswer(box.scenario, box.source, this.kept) };
    return this.#answer;
  }

  /** What the report makes its parts of; absent as long as there is no answer. */
  get reportInput(): ReportInput | undefined {
    const { answer } = this.answer;
    const scenario = this.box.source.read(this.box.scenario);
    if (answer === undefined || isProblem(scenario)) return undefined;
    const document = resultDocument(answer, this.version);
    return { answer, document, scenario, texts: [], date: undefined, ...inLanguage(this.language) };
  }

  /** The unit from its own file, whether or not there is an answer. */
  get loadedUnit(): LoadedUnit | undefined {
    const { source, scenario } = this.box;
    const name = entryAt(this.#yaml(scenario), 'heatPump', 'unit');
    const { file } = typeof name === 'string' ? source.find(name, scenario) : {};
    return file && loadUnit(file.name, source).loaded;
  }

  get messages(): Messages {
    return inLanguage(this.language).messages;
  }

  /** Everything that is shown, made from the files. */
  state(): SheetState {
    const { box } = this;
    const { problems } = this.answer;
    const told = problems.map((problem) => this.#told(problem));
    const yaml = this.#yaml(box.scenario);
    const input = hasErrors(problems) ? undefined : this.reportInput;
    const unit = this.#beside(entryAt(yaml, 'heatPump', 'unit'), unitSchema, told);
    const weather = this.#weatherState(yaml, told);
    return {
      ...{ scenario: box.scenario, scenarios: box.scenarios },
      text: box.text(box.scenario),
      files: box.list,
      parts: VISIT.map(({ id, entries }) => ({
        ...{
          id,
          nodes: this.#nodes(yaml, entries, told).map((node) => (weather === undefined ? node : withoutRead(node))),
        },
      })),
      ...(unit === undefined ? {} : { unit }),
      tariffs: this.#tariffNames(yaml).flatMap((name) => this.#beside(name, tariffSchema, told) ?? []),
      grids: this.#grids(entryAt(yaml, 'heatPump', 'unit'), problems),
      ...(weather === undefined ? {} : { weather }),
      problems: told,
      ...(input === undefined ? {} : { answer: shownAnswer(input) }),
    };
  }

  /** What is wrong with the weather file is put right where it is said how to read it. */
  #told(problem: Problem): Told {
    const told = toldOf(problem, this.messages.problems);
    const weather = this.#weatherFile();
    return told.file === weather ? { ...told, file: this.box.scenario, path: 'weather.read' } : told;
  }

  #weatherFile(): string | undefined {
    const name = entryAt(this.#yaml(this.box.scenario), 'weather', 'file');
    return typeof name === 'string' ? this.box.source.find(name, this.box.scenario).path : undefined;
  }

  /** Files that the scenario names as tariffs, under the paths where they are held. */
  #tariffNames(yaml: YamlFile | undefined): string[] {
    const list = entryAt(yaml, 'tariffs');
    if (!Array.isArray(list)) return [];
    const supplies = (entry: unknown): unknown[] => {
      const parts = entryOf(entry, 'supplies');
      return Array.isArray(parts) ? parts.map((part: unknown) => entryOf(part, 'file')) : [entry];
    };
    return list.flatMap(supplies).filter((name) => typeof name === 'string');
  }

  #yaml(name: string): YamlFile | undefined {
    const read = this.box.source.read(name);
    if (isProblem(read)) return undefined;
    const known = this.#parsed.get(read.bytes);
    if (known?.file === read.name) return known;
    const parsed = parseYaml(read);
    if (!('yaml' in parsed)) return undefined;
    this.#parsed.set(read.bytes, parsed.yaml);
    return parsed.yaml;
  }

  #context(file: string, problems: readonly Told[]): FormContext {
    return {
      file,
      problems: problems.filter((told) => told.file === file),
      named: keyNames(this.messages.keys),
      said: this.messages,
      decimalSign: this.language === 'de' ? ',' : '.',
    };
  }

  #nodes(yaml: YamlFile | undefined, entries: readonly string[], problems: readonly Told[]): FormNode[] {
    if (yaml === undefined) return [];
    const context = this.#context(this.box.scenario, problems);
    return entries.map((key) =>
      formOf(scenarioSchema.shape[key as keyof typeof scenarioSchema.shape], entryOf(yaml.raw, key), [key], context),
    );
  }

  #beside(name: unknown, schema: z.ZodType, problems: readonly Told[]): BesideState | undefined {
    if (typeof name !== 'string') return undefined;
    const { path, file } = this.box.source.find(name, this.box.scenario);
    if (file === undefined) return undefined;
    // problems name the file by the scenario's path, which is another one where it was dropped without its folder
    const of = problems.map((told) => (told.file === path ? { ...told, file: file.name } : told));
    const raw = this.#yaml(file.name)?.raw;
    const context = this.#context(file.name, of);
    const nodes = raw === undefined ? [] : childrenOf(bare(schema), raw, { path: [], context });
    const shown = nodes.filter((node) => !SHOWN_AS_GRIDS.has(String(node.path[0])));
    return { name: file.name, nodes: shown, text: this.box.text(file.name) };
  }

  #grids(name: unknown, problems: readonly Problem[]): MapGrid[] {
    const { source, scenario } = this.box;
    const unit = typeof name === 'string' ? source.find(name, scenario) : undefined;
    const yaml = unit?.file && this.#yaml(unit.file.name);
    if (unit === undefined || yaml === undefined) return [];
    // problems name the file by the scenario's path, which is another one where it was dropped without its folder
    const of = problems.map((problem) => (problem.file === unit.path ? { ...problem, file: yaml.file } : problem));
    return mapGrids(yaml, of, this.messages.problems, (table) => {
      const { path, file } = source.find(table, unit.path);
      return file && { path, text: this.box.text(file.name) };
    });
  }

  #weatherState(yaml: YamlFile | undefined, problems: readonly Told[]): WeatherState | undefined {
    const preview = this.#preview(yaml);
    if (preview === undefined) return undefined;
    const context = this.#context(this.box.scenario, problems);
    const read = formOf(readSchema, entryAt(yaml, 'weather', 'read'), ['weather', 'read'], context);
    const uses = COLUMN_USES.map((value) => ({ value, label: context.named(value) }));
    return read.kind === 'section' ? { ...preview, read, uses } : undefined;
  }

  #preview(yaml: YamlFile | undefined): WeatherPreview | undefined {
    const name = entryAt(yaml, 'weather', 'file');
    const read = typeof name === 'string' ? this.box.source.read(name, this.box.scenario) : undefined;
    if (read === undefined || isProblem(read)) return undefined;
    const settings = readSchema.safeParse(entryAt(yaml, 'weather', 'read') ?? {});
    const zone = entryAt(yaml, 'site', 'zone');
    const site = typeof zone === 'string' ? { zone } : {};
    const key = JSON.stringify([this.language, read.name, read.sha256, settings.data, site]);
    if (this.#weather?.key === key) return this.#weather.preview;
    const known = this.answer.answer?.loaded.weather;
    const recognised =
      known?.file === read.name ? known.recognised : weatherFrom(read, settings.data ?? {}, site).recognised;
    const text = this.box.text(this.box.pathOf(String(name)));
    const lines = text.split(/\r\n|\n|\r/, HEAD_LINES);
    const head = lines.map((line) => visibleText(line.replaceAll('\t', ' ⇥ ').slice(0, 200)));
    const told = recognised === undefined ? [] : recognisedLines(recognised, this.messages.recognised);
    const columns = weatherColumns(text, settings.data ?? {}, recognised);
    const preview = { file: read.name, lines: told, head, columns };
    this.#weather = { key, preview };
    return preview;
  }
}

/** The weather without how it is read, which stands with the file's preview. */
function withoutRead(node: FormNode): FormNode {
  if (node.kind !== 'section' || node.path.join('.') !== 'weather') return node;
  return { ...node, children: node.children.filter(({ path }) => path[1] !== 'read') };
}

function toldOf(problem: Problem, language: ProblemLanguage): Told {
  const { severity, file, line, column, path = '' } = problem;
  const place = [file, line, column].filter((part) => part !== undefined).join(':');
  return { severity, file: ownerOf(problem), place, path, ...saidIn(language, problem) };
}

/** The file whose entry is wrong: where a named file is missing, the one that names it. */
function ownerOf({ file, code, hint = '' }: Problem): string {
  const [, owner] = (code.startsWith('file.') && /^named in (.+) under /.exec(hint)) || [];
  return owner ?? file;
}

function entryAt(yaml: YamlFile | undefined, ...path: string[]): unknown {
  return path.reduce<unknown>((value, key) => entryOf(value, key), yaml?.raw);
}
