import * as z from 'zod';
import { hasErrors, type Problem, visibleText } from '../../src/core/problem.ts';
import { problemCure, problemSentence } from '../../src/core/problemText.ts';
import type { ReportInput } from '../../src/report/html/reportInput.ts';
import { inLanguage } from '../../src/report/language/inLanguage.ts';
import type { Language } from '../../src/report/language/languages.ts';
import { resultDocument } from '../../src/report/resultDocument.ts';
import type { Answer } from '../../src/scenario/answer/answer.ts';
import { bare, entryOf } from '../../src/scenario/entries/schemaField.ts';
import { isProblem } from '../../src/scenario/fileSource.ts';
import { Kept } from '../../src/scenario/kept.ts';
import { weatherFrom } from '../../src/scenario/loadWeather.ts';
import { readSchema } from '../../src/scenario/readSchema.ts';
import { scenarioSchema } from '../../src/scenario/scenarioSchema.ts';
import { tariffSchema } from '../../src/scenario/tariffSchema.ts';
import { unitSchema } from '../../src/scenario/unitSchema.ts';
import { parseYaml } from '../../src/scenario/yaml/parseYaml.ts';
import type { YamlFile } from '../../src/scenario/yaml/yamlFile.ts';
import { FileBox } from './fileBox.ts';
import type { FormNode, Told } from './formNode.ts';
import { childrenOf, type FormContext, formOf } from './formOf.ts';
import { keptAnswer } from './keptAnswer.ts';
import { keyNames } from './keyNames.ts';
import { type MapGrid, mapGrids } from './mapTables.ts';
import type { BesideState, SheetState, WeatherPreview } from './sheetState.ts';
import { shownAnswer } from './shownAnswer.ts';
import { VISIT } from './visit.ts';

/** Keys that a unit shows as grids instead of fields. */
const SHOWN_AS_GRIDS = new Set(['map', 'label']);
const HEAD_LINES = 6;

/** The sheet without its looks: files in, fields and answer out. */
export class SheetModel {
  readonly box = new FileBox();
  readonly version: string;
  language: Language = 'en';
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
    if (this.#keptOf !== othersChanged) this.#kept = new Kept();
    this.#keptOf = othersChanged;
    return this.#kept;
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

  /** Everything that is shown, made from the files. */
  state(): SheetState {
    const { box } = this;
    const { problems } = this.answer;
    const told = problems.map((problem) => this.#told(problem));
    const yaml = this.#yaml(box.scenario);
    const input = hasErrors(problems) ? undefined : this.reportInput;
    const unit = this.#beside(entryAt(yaml, 'heatPump', 'unit'), unitSchema, told);
    const weather = this.#preview(yaml);
    return {
      scenario: box.scenario,
      text: box.text(box.scenario),
      files: box.list,
      parts: VISIT.map(({ id, entries }) => ({ id, nodes: this.#nodes(yaml, entries, told) })),
      ...(unit === undefined ? {} : { unit }),
      tariffs: this.#tariffNames(yaml).flatMap((name) => this.#beside(name, tariffSchema, told) ?? []),
      grids: unit === undefined ? [] : this.#grids(unit.name, problems),
      ...(weather === undefined ? {} : { weather }),
      problems: told,
      ...(input === undefined ? {} : { answer: shownAnswer(input) }),
    };
  }

  /** What is wrong with the weather file is put right where it is said how to read it. */
  #told(problem: Problem): Told {
    const told = toldOf(problem);
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
    const parsed = parseYaml(read);
    return 'yaml' in parsed ? parsed.yaml : undefined;
  }

  #context(file: string, problems: readonly Told[]): FormContext {
    return {
      file,
      problems: problems.filter((told) => told.file === file),
      named: keyNames(this.language),
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

  #grids(name: string, problems: readonly Problem[]): MapGrid[] {
    const yaml = this.#yaml(name);
    return yaml === undefined ? [] : mapGrids(yaml, problems);
  }

  #preview(yaml: YamlFile | undefined): WeatherPreview | undefined {
    const name = entryAt(yaml, 'weather', 'file');
    const read = typeof name === 'string' ? this.box.source.read(name, this.box.scenario) : undefined;
    if (read === undefined || isProblem(read)) return undefined;
    const settings = readSchema.safeParse(entryAt(yaml, 'weather', 'read') ?? {});
    const zone = entryAt(yaml, 'site', 'zone');
    const site = typeof zone === 'string' ? { zone } : {};
    const key = JSON.stringify([read.name, read.sha256, settings.data, site]);
    if (this.#weather?.key === key) return this.#weather.preview;
    const known = this.answer.answer?.loaded.weather;
    const recognised =
      known?.file === read.name ? known.recognised : weatherFrom(read, settings.data ?? {}, site).recognised;
    const lines = this.box.text(this.box.pathOf(String(name))).split(/\r\n|\n|\r/, HEAD_LINES);
    const head = lines.map((line) => visibleText(line.replaceAll('\t', ' ⇥ ').slice(0, 200)));
    const preview = { file: read.name, lines: recognised?.lines ?? [], head };
    this.#weather = { key, preview };
    return preview;
  }
}

function toldOf(problem: Problem): Told {
  const { severity, file, line, column, path = '' } = problem;
  const place = [file, line, column].filter((part) => part !== undefined).join(':');
  return { severity, file: ownerOf(problem), place, path, says: problemSentence(problem), cure: problemCure(problem) };
}

/** The file whose entry is wrong: where a named file is missing, the one that names it. */
function ownerOf({ file, code, hint = '' }: Problem): string {
  const [, owner] = (code.startsWith('file.') && /^named in (.+) under /.exec(hint)) || [];
  return owner ?? file;
}

function entryAt(yaml: YamlFile | undefined, ...path: string[]): unknown {
  return path.reduce<unknown>((value, key) => entryOf(value, key), yaml?.raw);
}
