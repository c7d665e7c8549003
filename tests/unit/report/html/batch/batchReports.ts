import { criterionOf } from '../../../../../src/batch/ranking.ts';
import type { Row } from '../../../../../src/batch/row.ts';
import { figureColumns } from '../../../../../src/batch/rowColumns.ts';
import { batchJsonLine, rowOfJsonLine } from '../../../../../src/report/batchJson.ts';
import type { BatchManifest } from '../../../../../src/report/batchManifest.ts';
import type { BatchReportInput } from '../../../../../src/report/html/batch/batchReportInput.ts';
import { YearsGatherer } from '../../../../../src/report/html/batch/gatheredYears.ts';
import { inLanguage } from '../../../../../src/report/language/inLanguage.ts';
import type { Language } from '../../../../../src/report/language/languages.ts';

type Label = string | number | boolean;

/** What a year of an invented batch has: its figures, or why it failed. */
export interface InventedYear {
  readonly cost?: number;
  readonly saving?: number;
  readonly carbon?: number;
  readonly h4?: number | string;
  readonly backupHours?: number;
  readonly warnings?: readonly string[];
  readonly currency?: string;
  readonly fails?: boolean;
}

/** An invented batch, for tests alone. */
export interface InventedBatch {
  readonly homes?: number;
  readonly axes?: BatchManifest['axes'];
  readonly year: (home: number, labels: readonly Label[], job: number) => InventedYear;
  readonly homeName?: (home: number) => string;
  readonly plan?: string;
  readonly by?: string;
  readonly chosen?: readonly [string, string];
  readonly language?: Language;
  readonly manifest?: Partial<BatchManifest>;
  readonly date?: string;
}

/** What the report of an invented batch is made of; its rows go through the lines of JSON that hold them. */
export function batchReportOf(batch: InventedBatch): BatchReportInput {
  const axes = batch.axes ?? [];
  const names = axes.map(({ name }) => name);
  const options = axes.reduce((product, { values }) => product * values.length, 1);
  const homes = batch.homes ?? 1;
  const by = criterionOf(batch.by);
  const gatherer = new YearsGatherer(by);
  for (let job = 1; job <= homes * options; job++) {
    const row = rowOfJsonLine(batchJsonLine(rowOf(batch, job, options), names), names);
    if (row === undefined) throw new Error(`job ${job}`);
    gatherer.add(row);
  }
  const { years } = gatherer;
  const sizes = { homes, options, jobs: homes * options, rows: years.rows, failed: years.failed, tariffs: 1 };
  const manifest: BatchManifest = {
    ...{ version: '1.2.3', plan: batch.plan ?? 'Invented', planFile: 'plan.yaml', axes, ...sizes },
    ...{ columns: figureColumns(1), assumptions: [{ path: 'house.x', text: 'Taken as 1.' }] },
    inputs: [{ file: 'plan.yaml', role: 'plan', sha256: 'a'.repeat(64) }],
    ...batch.manifest,
  };
  const asked = { by, axes: batch.chosen, date: batch.date, version: '1.2.3' };
  return { manifest, years, ...asked, ...inLanguage(batch.language ?? 'en') };
}

/** Labels of a job, the last axis changing first: by counting on, as an odometer does. */
function labelsOf(axes: BatchManifest['axes'], option: number): Label[] {
  const at = axes.map(() => 0);
  for (let step = 0; step < option; step++) {
    for (let a = axes.length - 1; a >= 0; a--) {
      at[a]!++;
      if (at[a]! < axes[a]!.values.length) break;
      at[a] = 0;
    }
  }
  return axes.map(({ values }, a) => values[at[a]!]!);
}

function rowOf({ axes = [], year, homeName }: InventedBatch, job: number, options: number): Row {
  const home = Math.floor((job - 1) / options);
  const labels = labelsOf(axes, (job - 1) % options);
  const found = year(home, labels, job);
  const named = { job, home: homeName?.(home) ?? `home ${home + 1}`, homesLine: home + 2, axes: labels };
  if (found.fails === true) {
    const at = { file: 'homes.csv', line: home + 2, column: 2, path: 'house.heatLoss.value', found: '-5' };
    return { ...named, problems: [{ code: 'batch.worker-failed', severity: 'error', ...at }] };
  }
  const { cost, saving, carbon, h4, backupHours } = found;
  const figures = Object.entries({ h4, backupHours, carbonHeatPump: carbon }).flatMap(([name, value]) =>
    value === undefined ? [] : [[name, value] as const],
  );
  const tariff = { name: 'Flat', systemTotal: cost, ...(saving === undefined ? {} : { saving }) };
  const result = {
    currency: found.currency ?? 'EUR',
    figures: Object.fromEntries(figures),
    tariffs: cost === undefined ? [] : [tariff],
    warnings: found.warnings ?? [],
  };
  return { ...named, result, problems: [] };
}

/** Twelve homes with three units and two flow temperatures; two homes fail. */
export function sampleBatch(over: Partial<InventedBatch> = {}): BatchReportInput {
  return batchReportOf({
    homes: 12,
    axes: [
      { name: 'unit', values: ['units/small-6.yaml', 'units/middle-8.yaml', 'units/large-12.yaml'] },
      { name: 'flow', values: [35, 55] },
    ],
    year: (home, [unit, flow]) => {
      const more = (unit === 'units/small-6.yaml' ? 90 : 0) + (flow === 55 ? 250 : 0);
      const warnings = [...(flow === 55 ? ['map.outside'] : []), ...(home === 3 ? ['size.far-under'] : [])];
      return {
        ...{ cost: 900 + 40 * home + more, saving: 500 - 60 * home - more, carbon: 800 + 11 * home + more },
        ...{ h4: flow === 55 ? 2.8 : 3.6, backupHours: 12 * home, warnings, fails: home >= 10 },
      };
    },
    ...over,
  });
}
