import { valuesOfOption } from '../../src/batch/axes.ts';
import { baseName } from '../../src/batch/batchPlan.ts';
import { figureValues } from '../../src/batch/figureValues.ts';
import type { Row } from '../../src/batch/row.ts';
import { batchLine, type TableShape } from '../../src/report/batchCsv.ts';
import { batchJsonLine } from '../../src/report/batchJson.ts';
import type { ChunkDone, ChunkTask } from './chunk.ts';
import { HomesReader } from './homesFile.ts';
import type { PreparedBatch } from './preparedBatch.ts';

/** The row of a job that no worker could finish, in place of its result. */
export function lostJob(batch: PreparedBatch, shape: TableShape, task: ChunkTask, fault: unknown): ChunkDone {
  const { plan, options, setup } = batch;
  const values = valuesOfOption(plan.axes, task.first % options);
  const row: Row = {
    job: task.first + 1,
    ...homeOf(batch, task),
    axes: values.map(({ label }) => label),
    problems: [{ code: 'batch.worker-failed', severity: 'error', file: plan.file, found: reasonOf(fault) }],
  };
  return {
    chunk: task.chunk,
    rows: 1,
    failed: 1,
    csv: batchLine(row, shape),
    json: batchJsonLine(row, shape.axes),
    figures: Float64Array.from(figureValues(row, setup.tariffs)),
    inputs: [],
  };
}

function homeOf(
  { plan, survey, options }: PreparedBatch,
  { first, place }: ChunkTask,
): Pick<Row, 'home' | 'homesLine'> {
  if (survey === undefined || place === undefined) return { home: baseName(plan) };
  const wanted = Math.floor(first / options);
  for (const { index, home } of new HomesReader(survey.headerRow).homesFrom(place)) {
    if (index === wanted) return { home: home.name, ...(home.line === undefined ? {} : { homesLine: home.line }) };
  }
  return { home: `home ${wanted + 1}` };
}

function reasonOf(fault: unknown): string {
  const code = fault instanceof Error && 'code' in fault ? fault.code : undefined;
  if (code === 'ERR_WORKER_OUT_OF_MEMORY') return 'its worker ran out of memory';
  return fault instanceof Error ? (fault.message.split('\n')[0] ?? '') : String(fault);
}
